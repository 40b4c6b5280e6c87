import type { MassModel } from './types';

/** km/s/kpc, one entry a radius. */
export interface FrequencyTable {
	omega: Float64Array;
	kappa: Float64Array;
	nu: Float64Array;
}

/** Scale height (kpc) lent to razor-thin discs: that of the Milky Way's thin disc. */
export const defaultSheetHeight = 0.3;

/**
 * Fills the three tables a star ring needs. κ or ν is NaN where the orbit is unstable.
 * Razor-thin discs count with a scale height for ν, which would else be Infinity.
 * @param radii kpc; above 0, since cusps turn infinitely fast at the centre
 * @param out each at least as long as `radii`; filled and returned
 * @param sheetHeight kpc, above 0
 */
export function tabulateFrequencies(
	model: MassModel,
	radii: ArrayLike<number>,
	out: FrequencyTable,
	sheetHeight: number = defaultSheetHeight
): FrequencyTable {
	const { omega, kappa, nu } = out;
	const sums = { omega: 0, kappa: 0, nu: 0 };
	for (let i = 0; i < radii.length; i++) {
		sums.omega = 0;
		sums.kappa = 0;
		sums.nu = 0;
		model.addFrequenciesSquared(radii[i], sheetHeight, sums);
		omega[i] = Math.sqrt(Math.max(0, sums.omega));
		kappa[i] = Math.sqrt(sums.kappa);
		nu[i] = Math.sqrt(sums.nu);
	}
	return out;
}
