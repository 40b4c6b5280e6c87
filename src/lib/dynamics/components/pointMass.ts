import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { massParameter } from './parameters';
import { sphericalComponent } from './sphericalComponent';

/**
 * All mass in one point: Φ = −G M / r.
 * Speeds, frequencies and density are Infinity at r = 0 and the potential −Infinity there.
 */
export const pointMass: ComponentMaker = {
	info: {
		kind: 'point-mass',
		label: 'Point mass',
		help: 'All the mass in one point, such as a central black hole or the Sun.',
		lit: true,
		shape: 'sphere',
		parameterSets: [
			{
				id: 'mass',
				label: 'Mass',
				parameters: [
					massParameter({
						initial: 4.3e6,
						usualMin: 1e5,
						usualMax: 1e12,
						help: 'How much there is, in units of the mass of the Sun.'
					})
				]
			}
		],
		source: 'Newton 1687, Principia'
	},
	make({ mass }) {
		const gm = G * mass;
		return sphericalComponent({
			circularVelocitySquared: (r) => gm / r,
			circularFrequencySquared: (r) => gm / (r * r * r),
			enclosedMass: () => mass,
			density: (r) => (r === 0 ? Infinity : 0),
			potential: (r) => -gm / r,
			escapable: true
		});
	}
};
