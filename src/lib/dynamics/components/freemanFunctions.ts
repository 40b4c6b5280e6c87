import { scaledI, scaledK } from '../bessel';

/**
 * The three combinations of Bessel functions of y = R/(2Rd) that a razor-thin exponential disc
 * needs in its plane.
 */
export interface FreemanFunctions {
	/** B = I0K0 − I1K1: Ω² = πGΣ0/Rd · B. */
	frequency: number;
	/** C = y B' + 4B: κ² = πGΣ0/Rd · C. */
	epicycle: number;
	/** P = y (I0K1 − I1K0): Φ = −2πGΣ0Rd · P. */
	potential: number;
}

/** From here on the asymptotic series; its least term there is about e^-40. */
const FAR = 20;
const TERMS = 22;

/**
 * Coefficients b_k of B = (1/2y) Σ b_k (2y)^-2k from k = 1. The products I0K0 and I1K1 both begin
 * with 1/(2y), which cancels; taking the difference term by term keeps all digits where the
 * difference of the functions would lose them as 2y². Abramowitz and Stegun 1964, 9.7.5.
 */
const series = new Float64Array(TERMS);
let product0 = 1;
let product1 = 1;
for (let k = 1; k < TERMS; k++) {
	const odd = 2 * k - 1;
	product0 *= (odd / (2 * k)) * odd * odd;
	product1 *= (odd / (2 * k)) * (odd * odd - 4);
	series[k] = product0 - product1;
}

// Written and read within one call; kept here so that filling a table allocates nothing.
const scratchI = { i0: 0, i1: 0 };
const scratchK = { k0: 0, k1: 0 };

/** @param y not negative; at 0 the first two are Infinity (a logarithm) and the third is 1 */
export function freemanFunctions(y: number, out: FreemanFunctions): void {
	if (y >= FAR) {
		// The potential follows term by term from P' = −2yB.
		const w = 1 / (4 * y * y);
		let frequency = 0;
		let epicycle = 0;
		let potential = 0;
		for (let k = TERMS - 1; k >= 1; k--) {
			frequency = series[k] + w * frequency;
			epicycle = series[k] * (3 - 2 * k) + w * epicycle;
			potential = series[k] / (2 * k - 1) + w * potential;
		}
		out.frequency = (0.5 / y) * w * frequency;
		out.epicycle = (0.5 / y) * w * epicycle;
		out.potential = y * w * potential;
		return;
	}
	if (y === 0) {
		out.frequency = Infinity;
		out.epicycle = Infinity;
		out.potential = 1;
		return;
	}
	scaledI(y, scratchI);
	scaledK(y, scratchK);
	const { i0, i1 } = scratchI;
	const { k0, k1 } = scratchK;
	const cross = y * (i0 * k1 - i1 * k0);
	out.frequency = i0 * k0 - i1 * k1;
	out.epicycle = 4 * i0 * k0 - 2 * i1 * k1 - 2 * cross;
	out.potential = cross;
}
