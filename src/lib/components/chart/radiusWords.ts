import { lightYearsFromKpc } from '$lib/units';

/** @param kpc @returns the radius in both units, such as "9.20 kpc · 30.0 kly" */
export function radiusWords(kpc: number): string {
	const digits = kpc < 10 ? 2 : 1;
	const kly = lightYearsFromKpc(kpc) / 1000;
	return `${kpc.toFixed(digits)} kpc · ${kly.toFixed(kly < 10 ? 2 : 1)} kly`;
}
