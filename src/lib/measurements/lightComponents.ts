import type { ComponentSpec } from '../dynamics/types';
import type { MeasuredPoint } from './types';

const parts = [
	{ role: 'gas', name: 'Gas', massToLight: 1 },
	{ role: 'disc', name: 'Disc', massToLight: 0.5 },
	{ role: 'bulge', name: 'Bulge', massToLight: 0.5 }
] as const;
type Part = (typeof parts)[number]['role'];

/** Points of one component; a longer table is thinned, its last point kept. */
const mostPoints = 400;

/** Speeds of one part by rising radius; where two points share a radius the first counts. */
function curveOf(points: readonly MeasuredPoint[], role: Part) {
	const known = points
		.flatMap(({ radius, [role]: speed }) => (speed === undefined ? [] : [{ radius, speed }]))
		.sort((a, b) => a.radius - b.radius)
		.filter(({ radius }, i, all) => i === 0 || radius > all[i - 1].radius);
	if (known.length < 2 || known.every(({ speed }) => speed === 0)) return null;
	if (known.length <= mostPoints) return known;
	const step = (known.length - 1) / (mostPoints - 1);
	return Array.from({ length: mostPoints }, (_, i) => known[Math.round(i * step)]);
}

/**
 * What the light in a table would pull by itself: one tabulated component each for gas, disc and
 * bulge where the table has them. Stars weigh 0.5 Msun for each Lsun of near-infrared light to begin
 * with (Lelli, McGaugh and Schombert 2016, AJ 152, 157: 0.5 for discs at 3.6 μm, from memory; bulges
 * are often given 0.7); gas is counted as mass already. Points that were left out count too: their
 * light was measured all the same.
 * @param points kpc, km/s @param newId makes the components' ids
 */
export function lightComponents(
	points: readonly MeasuredPoint[],
	newId: () => string
): ComponentSpec[] {
	return parts.flatMap(({ role, name, massToLight }) => {
		const curve = curveOf(points, role);
		if (!curve) return [];
		const component: ComponentSpec = {
			id: newId(),
			kind: 'tabulated',
			name: `${name}, measured`,
			lit: true,
			parameters: {
				massToLight,
				radii: curve.map(({ radius }) => radius),
				speeds: curve.map(({ speed }) => speed)
			}
		};
		return [component];
	});
}
