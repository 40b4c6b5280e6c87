import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { lengthParameter, massParameter } from './parameters';
import { sphericalComponent } from './sphericalComponent';

/**
 * Φ = −G M / √(r² + b²), ρ = 3 M b² / (4π (r² + b²)^(5/2)); b = scaleLength.
 * Plummer 1911, MNRAS 71, 460; Binney and Tremaine 2008, Sec. 2.2.2.
 */
export const plummer: ComponentMaker = {
	info: {
		kind: 'plummer',
		label: 'Plummer sphere',
		help: 'A round ball of stars with a soft centre, good for a small bulge or a star cluster.',
		lit: true,
		shape: 'sphere',
		parameterSets: [
			{
				id: 'mass',
				label: 'Mass and size',
				parameters: [
					massParameter({
						initial: 1e10,
						help: 'Mass of the whole ball, in units of the mass of the Sun.'
					}),
					lengthParameter({
						initial: 0.5,
						usualMin: 0.05,
						usualMax: 10,
						help: 'Size of the soft centre; half of the mass is inside 1.3 times this.'
					})
				]
			}
		],
		source: 'Plummer 1911, MNRAS 71, 460'
	},
	make({ mass, scaleLength }) {
		const gm = G * mass;
		const b2 = scaleLength * scaleLength;
		return sphericalComponent({
			circularVelocitySquared(r) {
				const s2 = r * r + b2;
				return (gm * r * r) / (s2 * Math.sqrt(s2));
			},
			circularFrequencySquared(r) {
				const s2 = r * r + b2;
				return gm / (s2 * Math.sqrt(s2));
			},
			enclosedMass(r) {
				const s2 = r * r + b2;
				return (mass * r * r * r) / (s2 * Math.sqrt(s2));
			},
			density(r) {
				const s2 = r * r + b2;
				return (3 * mass * b2) / (4 * Math.PI * s2 * s2 * Math.sqrt(s2));
			},
			potential: (r) => -gm / Math.sqrt(r * r + b2),
			escapable: true
		});
	}
};
