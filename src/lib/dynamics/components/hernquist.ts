import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { lengthParameter, massParameter } from './parameters';
import { sphericalComponent } from './sphericalComponent';

/**
 * Φ = −G M / (r + a), M(r) = M r² / (r + a)², ρ = M a / (2π r (r + a)³); a = scaleLength.
 * A cusp: density and frequencies are Infinity at r = 0, speed and potential are finite.
 * Hernquist 1990, ApJ 356, 359.
 */
export const hernquist: ComponentMaker = {
	info: {
		kind: 'hernquist',
		label: 'Hernquist bulge',
		help: 'A round bulge that grows denser all the way to its centre, as most bulges do.',
		lit: true,
		shape: 'sphere',
		parameterSets: [
			{
				id: 'mass',
				label: 'Mass and size',
				parameters: [
					massParameter({
						initial: 1e10,
						help: 'Mass of the whole bulge, in units of the mass of the Sun.'
					}),
					lengthParameter({
						initial: 0.6,
						usualMin: 0.05,
						usualMax: 10,
						help: 'Size of the bulge; half of the mass is inside 2.4 times this.'
					})
				]
			}
		],
		source: 'Hernquist 1990, ApJ 356, 359'
	},
	make({ mass, scaleLength: a }) {
		const gm = G * mass;
		return sphericalComponent({
			circularVelocitySquared: (r) => (gm * r) / (r + a) ** 2,
			circularFrequencySquared: (r) => gm / (r * (r + a) ** 2),
			enclosedMass: (r) => (mass * r * r) / (r + a) ** 2,
			density: (r) => (mass * a) / (2 * Math.PI * r * (r + a) ** 3),
			potential: (r) => -gm / (r + a),
			escapable: true
		});
	}
};
