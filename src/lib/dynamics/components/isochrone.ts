import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { lengthParameter, massParameter } from './parameters';
import { sphericalComponent } from './sphericalComponent';

/**
 * Φ = −G M/(b + s), s = √(r² + b²); M(r) = M r³/((b + s)² s), ρ = M b (b + 2s)/(4π (b + s)² s³);
 * b = scaleLength. Hénon 1959, Ann. d'Astrophys. 22, 126.
 */
export const isochrone: ComponentMaker = {
	info: {
		kind: 'isochrone',
		label: 'Isochrone sphere',
		help: 'A round body with a flat middle, in which every orbit is known by a formula.',
		lit: true,
		shape: 'sphere',
		parameterSets: [
			{
				id: 'mass',
				label: 'Mass and size',
				parameters: [
					massParameter({
						initial: 1e11,
						help: 'Mass of the whole body, in units of the mass of the Sun.'
					}),
					lengthParameter({
						initial: 2,
						help: 'Size of the flat middle; a quarter of the mass is inside 1.5 times this.'
					})
				]
			}
		],
		source: 'Hénon 1959, Annales d’Astrophysique 22, 126'
	},
	make({ mass, scaleLength: b }) {
		const gm = G * mass;
		const root = (r: number) => Math.hypot(r, b);
		const frequency = (s: number) => 1 / ((b + s) * (b + s) * s);
		return sphericalComponent({
			circularVelocitySquared: (r) => gm * r * r * frequency(root(r)),
			circularFrequencySquared: (r) => gm * frequency(root(r)),
			enclosedMass: (r) => mass * r * r * r * frequency(root(r)),
			density(r) {
				const s = root(r);
				return (mass * b * (b + 2 * s) * frequency(s)) / (4 * Math.PI * s * s);
			},
			potential: (r) => -gm / (b + root(r)),
			escapable: true
		});
	}
};
