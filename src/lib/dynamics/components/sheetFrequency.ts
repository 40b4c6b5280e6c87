import { G } from '../../units';

/**
 * ν² of a disc whose own field is that of a razor-thin sheet, (km/s/kpc)².
 * Poisson's equation in the plane reads ν² = 4πGρ + 2Ω² − κ². Lending the sheet an exponential
 * scale height h makes the first term 2πGΣ/h; the rest keeps its razor-thin value, and is dropped
 * where negative so that ν² stays positive when h is not small. Good to about h over the scale length.
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
	const rest = 2 * omegaSquared - kappaSquared;
	return rest > 0 ? own + rest : own;
}
