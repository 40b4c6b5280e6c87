import { G } from '../../units';

/**
 * ν² of a disc whose own field is that of a razor-thin sheet, (km/s/kpc)².
 * Poisson's equation in the plane reads ν² = 4πGρ + 2Ω² − κ². Lending the sheet an exponential
 * scale height h makes the first term 2πGΣ/h; the rest keeps its razor-thin value. Good to about h
 * over the scale length. When h is not small against it the sum could fall below Ω², which no
 * flattened body does, so Ω² is the least.
 * @param sheetDensity Σ, Msun/kpc²
 * @param sheetHeight h, kpc; 0 keeps the sheet razor-thin: Infinity wherever Σ > 0
 */
export function sheetFrequencySquared(
	sheetDensity: number,
	sheetHeight: number,
	omegaSquared: number,
	kappaSquared: number
): number {
	const own = sheetDensity > 0 ? (2 * Math.PI * G * sheetDensity) / sheetHeight : 0;
	const sum = own + 2 * omegaSquared - kappaSquared;
	// Written so that the centre of an exponential disc, Infinity less Infinity, gives Ω².
	return sum > omegaSquared ? sum : omegaSquared;
}
