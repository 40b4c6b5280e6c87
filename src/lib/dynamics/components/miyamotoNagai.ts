import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { lengthParameter, massParameter } from './parameters';

/**
 * Mass inside the cylinder R. By Gauss's law on that cylinder it is
 * (M R² / 2) ∫ dz / (R² + (a + √(z² + b²))²)^(3/2); with z = b sinh u the integrand is analytic for
 * |Im u| < π/2, where the trapezoidal rule with step 0.25 errs by about exp(−4π²).
 */
function massInCylinder(mass: number, a: number, b: number, R: number): number {
	if (R === 0) return 0;
	const step = 0.25;
	const R2 = R * R;
	const end = Math.acosh(1 + (1e9 * (R + a + b)) / b);
	let sum = 0;
	for (let u = 0; u < end; u += step) {
		const height = b * Math.cosh(u);
		const s2 = R2 + (a + height) ** 2;
		sum += (u === 0 ? 0.5 : 1) * (height / (s2 * Math.sqrt(s2)));
	}
	return mass * R2 * step * sum;
}

/**
 * Φ = −G M / √(R² + (a + √(z² + b²))²); a = scaleLength, b = scaleHeight. With a = 0 this is the
 * Plummer sphere, though its enclosed mass is still counted in the cylinder.
 * Miyamoto and Nagai 1975, PASJ 27, 533.
 */
export const miyamotoNagai: ComponentMaker = {
	info: {
		kind: 'miyamoto-nagai',
		label: 'Miyamoto–Nagai disc',
		help: 'A thick disc with smooth edges and a simple formula, quick to compute everywhere.',
		lit: true,
		shape: 'disc',
		parameterSets: [
			{
				id: 'mass',
				label: 'Mass and size',
				parameters: [
					massParameter({
						initial: 6.8e10,
						help: 'Mass of the whole disc, in units of the mass of the Sun.'
					}),
					lengthParameter({
						initial: 3,
						min: 0,
						usualMin: 0,
						usualMax: 10,
						scale: 'linear',
						help: 'How far the disc spreads outward; 0 makes it a ball.'
					}),
					lengthParameter({
						name: 'scaleHeight',
						label: 'Scale height',
						initial: 0.28,
						min: 1e-6,
						usualMin: 0.05,
						usualMax: 2,
						help: 'How thick the disc is.'
					})
				]
			}
		],
		source: 'Miyamoto and Nagai 1975, PASJ 27, 533'
	},
	make({ mass, scaleLength: a, scaleHeight: b }) {
		const gm = G * mass;
		return {
			circularVelocitySquared(R) {
				const s2 = R * R + (a + b) ** 2;
				return (gm * R * R) / (s2 * Math.sqrt(s2));
			},
			addFrequenciesSquared(R, scale, _sheetHeight, sums) {
				const D2 = (a + b) ** 2;
				const s2 = R * R + D2;
				const omega = (scale * gm) / (s2 * Math.sqrt(s2));
				sums.omega += omega;
				sums.kappa += (omega * (R * R + 4 * D2)) / s2;
				sums.nu += (omega * (a + b)) / b;
			},
			enclosedMass: (r) => massInCylinder(mass, a, b, r),
			potential: (R, z) => -gm / Math.hypot(R, a + Math.hypot(z, b)),
			addAcceleration(R, z, scale, out) {
				const height = Math.hypot(z, b);
				const D = a + height;
				const s2 = R * R + D * D;
				const pull = (scale * gm) / (s2 * Math.sqrt(s2));
				out.R -= pull * R;
				out.z -= (pull * z * D) / height;
			},
			density(R, z) {
				const height = Math.hypot(z, b);
				const D = a + height;
				const s2 = R * R + D * D;
				const shape = (a * R * R + (a + 3 * height) * D * D) / (s2 * s2 * Math.sqrt(s2));
				return ((mass * b * b) / (4 * Math.PI)) * (shape / height ** 3);
			},
			sheetDensity: () => 0,
			escapable: true
		};
	}
};
