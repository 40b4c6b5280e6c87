const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** Digits of a number for reading: plain where short, a power of ten where long. */
export function number(value: number, digits = 4): string {
	if (!Number.isFinite(value)) return '–';
	const size = Math.abs(value);
	if (size === 0 || (size >= 0.001 && size < 100_000)) {
		return String(Number(value.toPrecision(digits)));
	}
	const [front, exponent] = value.toExponential(digits - 1).split('e');
	const power = exponent
		.replace('+', '')
		.replace('-', '⁻')
		.replace(/\d/g, (digit) => superscripts[Number(digit)]);
	return `${Number(front)} × 10${power}`;
}

export const quantity = (value: number, unit: string): string => `${number(value)} ${unit}`.trim();

/**
 * A value with its standard error, both to the error's second digit: "19.6 ± 1.4 kpc".
 * Powers of ten are shared: "(8.54 ± 0.21) × 10⁶ Msun/kpc³".
 */
export function valueWithError(value: number, error: number | null, unit: string): string {
	if (error === null || !(error > 0) || !Number.isFinite(error)) return quantity(value, unit);
	const size = Math.max(Math.abs(value), error);
	const far = size >= 100_000 || size < 0.001;
	const power = far ? Math.floor(Math.log10(size)) : 0;
	const scale = 10 ** power;
	const places = Math.min(8, Math.max(0, 1 - Math.floor(Math.log10(error / scale))));
	const both = `${(value / scale).toFixed(places)} ± ${(error / scale).toFixed(places)}`;
	if (!far) return `${both} ${unit}`.trim();
	const raised = String(power)
		.replace('-', '⁻')
		.replace(/\d/g, (digit) => superscripts[Number(digit)]);
	return `(${both}) × 10${raised} ${unit}`.trim();
}

/** χ² as the head of the panel says it. */
export function chiSquaredWords(chiSquared: number, points: number, free: number): string {
	const degrees = points - free;
	const each =
		degrees > 0
			? `, ${number(chiSquared / degrees, 3)} for each of ${degrees} degrees of freedom`
			: '';
	return `χ² ${number(chiSquared)} at ${points} points${each}`;
}

/** What a reduced χ² says, in a sentence. */
export function fitQuality(reduced: number): string {
	if (!Number.isFinite(reduced))
		return 'There are as many parameters as points, so nothing is tested.';
	if (reduced < 0.3)
		return 'The curve passes closer to the points than their errors would let it: the errors may be too large, or too much is free.';
	if (reduced <= 2) return 'The curve passes the points about as closely as their errors allow.';
	if (reduced <= 6)
		return 'Some points are missed by more than their errors: real galaxies have streams, bars and warps that a smooth model has not.';
	return 'The model misses the points by far more than their errors. It is not a description of this galaxy.';
}
