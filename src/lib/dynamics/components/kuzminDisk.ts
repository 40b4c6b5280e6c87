import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { lengthParameter, massParameter } from './parameters';
import { sheetFrequencySquared } from './sheetFrequency';

/**
 * Razor-thin disc: Φ = −G M / √(R² + (a + |z|)²), Σ = M a / (2π (R² + a²)^(3/2)); a = scaleLength.
 * In the plane itself the pulls of the two faces cancel: the vertical acceleration is 0 at z = 0
 * and jumps to ∓2πGΣ on either side.
 * Kuzmin 1956, Astron. Zh. 33, 27; Binney and Tremaine 2008, Sec. 2.3.1.
 */
export const kuzminDisk: ComponentMaker = {
	info: {
		kind: 'kuzmin-disk',
		label: 'Kuzmin disc',
		help: 'A paper-thin disc with a simple formula, spread wider than an exponential one.',
		lit: true,
		shape: 'disc',
		parameterSets: [
			{
				id: 'mass',
				label: 'Mass and size',
				parameters: [
					massParameter({
						initial: 5e10,
						help: 'Mass of the whole disc, in units of the mass of the Sun.'
					}),
					lengthParameter({
						initial: 3.5,
						usualMin: 0.2,
						help: 'How far the disc spreads; half of the mass is inside 1.7 times this.'
					})
				]
			}
		],
		source: 'Kuzmin 1956, Astron. Zh. 33, 27'
	},
	make({ mass, scaleLength: a }) {
		const gm = G * mass;
		const sheetDensity = (R: number) => {
			const s2 = R * R + a * a;
			return (mass * a) / (2 * Math.PI * s2 * Math.sqrt(s2));
		};
		return {
			circularVelocitySquared(R) {
				const s2 = R * R + a * a;
				return (gm * R * R) / (s2 * Math.sqrt(s2));
			},
			addFrequenciesSquared(R, scale, sheetHeight, sums) {
				const s2 = R * R + a * a;
				const omega = gm / (s2 * Math.sqrt(s2));
				const kappa = (omega * (R * R + 4 * a * a)) / s2;
				sums.omega += scale * omega;
				sums.kappa += scale * kappa;
				sums.nu += scale * sheetFrequencySquared(sheetDensity(R), sheetHeight, omega, kappa);
			},
			enclosedMass(R) {
				const s = Math.hypot(R, a);
				return (mass * R * R) / (s * (s + a));
			},
			potential: (R, z) => -gm / Math.hypot(R, a + Math.abs(z)),
			addAcceleration(R, z, scale, out) {
				const D = a + Math.abs(z);
				const s2 = R * R + D * D;
				const pull = (scale * gm) / (s2 * Math.sqrt(s2));
				out.R -= pull * R;
				out.z -= pull * D * Math.sign(z);
			},
			density: (R, z) => (z === 0 && sheetDensity(R) > 0 ? Infinity : 0),
			sheetDensity,
			escapable: true
		};
	}
};
