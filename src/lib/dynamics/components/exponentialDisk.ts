import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { addExponentialSheetAcceleration, exponentialSheetPotential } from './exponentialSheet';
import { freemanFunctions } from './freemanFunctions';
import { lengthParameter, zeroParameter } from './parameters';
import { sheetFrequencySquared } from './sheetFrequency';

/** (k − 1)/k! by index k. */
const massSeries = [0, 0];
for (let k = 2, factorial = 2; k <= 16; factorial *= ++k) massSeries[k] = (k - 1) / factorial;

/** 1 − (1 + x) e^-x. Below 0.5 by its series Σ (−1)^k x^k (k − 1)/k! from k = 2 to x^16. */
function massFunction(x: number): number {
	if (x >= 0.5) return 1 - (1 + x) * Math.exp(-x);
	let sum = 0;
	for (let k = 16; k >= 2; k--) sum = massSeries[k] - x * sum;
	return x * x * sum;
}

/**
 * Razor-thin disc Σ = Σ0 e^(−R/Rd); Rd = scaleLength. In the plane by Bessel functions of
 * y = R/(2Rd): v² = 4πGΣ0Rd y² [I0K0 − I1K1], Φ = −πGΣ0R [I0K1 − I1K0]; off it by quadrature,
 * which takes some tens of microseconds a point: tabulate it before using it per star and frame.
 * Frequencies grow as a logarithm towards R = 0 and are Infinity there; the speed is 0.
 * In the plane itself the pulls of the two faces cancel: the vertical acceleration is 0 at z = 0
 * and jumps to ∓2πGΣ on either side.
 * Freeman 1970, ApJ 160, 811; Binney and Tremaine 2008, Sec. 2.6.1.
 */
export const exponentialDisk: ComponentMaker = {
	info: {
		kind: 'exponential-disk',
		label: 'Exponential disc',
		help: 'A thin disc that fades by the same share every step outward, as the light of spiral galaxies does.',
		lit: true,
		shape: 'disc',
		parameterSets: [
			{
				id: 'surface-density',
				label: 'Surface density and size',
				parameters: [
					{
						name: 'surfaceDensity',
						label: 'Central surface density',
						unit: 'Msun/kpc²',
						min: 1,
						max: 1e13,
						usualMin: 1e6,
						usualMax: 1e10,
						step: 1e5,
						scale: 'log',
						initial: 8e8,
						optional: false,
						help: 'Mass over each square kiloparsec of the disc in the middle.'
					},
					lengthParameter({
						initial: 2.5,
						usualMin: 0.2,
						help: 'Over this distance the disc fades to 37 %.'
					}),
					zeroParameter({
						name: 'scaleHeight',
						label: 'Scale height',
						unit: 'kpc',
						initial: 0,
						help: 'Thickness of the disc; 0 is paper-thin, the only choice in this version.'
					}),
					zeroParameter({
						name: 'vertical',
						label: 'Vertical profile',
						unit: '',
						initial: 0,
						help: 'How a thick disc thins out upward; without thickness there is only 0.'
					}),
					zeroParameter({
						name: 'holeRadius',
						label: 'Hole radius',
						unit: 'kpc',
						initial: 0,
						help: 'Size of an empty middle; 0 is none, the only choice in this version.'
					})
				]
			}
		],
		source: 'Freeman 1970, ApJ 160, 811'
	},
	make({ surfaceDensity, scaleLength: Rd }) {
		const gSigma = G * surfaceDensity;
		const frequency = (Math.PI * gSigma) / Rd;
		const own = { frequency: 0, epicycle: 0, potential: 0 };
		const sheetDensity = (R: number) => surfaceDensity * Math.exp(-R / Rd);
		return {
			circularVelocitySquared(R) {
				if (R === 0) return 0;
				freemanFunctions(R / (2 * Rd), own);
				return R * R * frequency * own.frequency;
			},
			addFrequenciesSquared(R, scale, sheetHeight, sums) {
				freemanFunctions(R / (2 * Rd), own);
				const omega = frequency * own.frequency;
				const kappa = frequency * own.epicycle;
				sums.omega += scale * omega;
				sums.kappa += scale * kappa;
				sums.nu += scale * sheetFrequencySquared(sheetDensity(R), sheetHeight, omega, kappa);
			},
			enclosedMass: (R) => 2 * Math.PI * surfaceDensity * Rd * Rd * massFunction(R / Rd),
			potential(R, z) {
				if (z !== 0) return exponentialSheetPotential(gSigma, Rd, R, z);
				freemanFunctions(R / (2 * Rd), own);
				return -2 * Math.PI * gSigma * Rd * own.potential;
			},
			addAcceleration(R, z, scale, out) {
				if (z !== 0) {
					addExponentialSheetAcceleration(gSigma, Rd, R, z, scale, out);
				} else if (R > 0) {
					freemanFunctions(R / (2 * Rd), own);
					out.R -= scale * R * frequency * own.frequency;
				}
			},
			density: (R, z) => (z === 0 && sheetDensity(R) > 0 ? Infinity : 0),
			sheetDensity,
			escapable: true
		};
	}
};
