const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** A number for a message: plain where short, with a power of ten where long. */
export function numberWords(value: number): string {
	const size = Math.abs(value);
	if (!Number.isFinite(value)) return Number.isNaN(value) ? 'not a number' : 'infinite';
	if (size === 0 || (size >= 0.001 && size < 100_000)) return String(value);
	const [digits, exponent] = value.toExponential().split('e');
	const power = exponent
		.replace('+', '')
		.replace('-', '⁻')
		.replace(/\d/g, (digit) => superscripts[Number(digit)]);
	return digits === '1' ? `10${power}` : `${digits} × 10${power}`;
}

/** "from 0.001 to 1000 kpc", or "0 kpc (range 0 to 0)" where only one value is allowed. */
export function rangeWords(range: { min: number; max: number; unit: string }): string {
	const unit = range.unit === '' ? '' : ` ${range.unit}`;
	const words = `from ${numberWords(range.min)} to ${numberWords(range.max)}${unit}`;
	return range.min === range.max
		? `only ${numberWords(range.min)}${unit} in this version (${words})`
		: words;
}
