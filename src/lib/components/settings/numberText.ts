import type { NumberRange } from '$lib/show/editingControls';

/** A number as a field shows it: no thousands, a power of ten where it is long, no needless zeros. */
export function numberText(value: number): string {
	const size = Math.abs(value);
	const rounded = Number(value.toPrecision(6));
	return size !== 0 && (size >= 1e6 || size < 1e-3)
		? rounded.toExponential().replace('+', '')
		: String(rounded);
}

/** Reads what people type: a comma may stand for the point, blanks are left out. NaN for the rest. */
export function parseNumber(text: string): number {
	const clean = text.replace(/[\s  ]/g, '').replace(',', '.');
	return /^[-+−]?(\d+\.?\d*|\.\d+)(e[-+−]?\d+)?$/i.test(clean)
		? Number(clean.replaceAll('−', '-'))
		: NaN;
}

const logSteps = 400;

/** Steps of the slider from its lower end to its upper. */
export const sliderSteps = (range: NumberRange): number =>
	range.scale === 'log'
		? logSteps
		: Math.max(1, Math.round((range.sliderMax - range.sliderMin) / range.step));

/** Where a value stands on the slider, in steps; kept within its ends. */
export function toSlider(range: NumberRange, value: number): number {
	const { sliderMin: low, sliderMax: high } = range;
	const inside = Math.min(high, Math.max(low, value));
	const share =
		range.scale === 'log' && low > 0
			? Math.log(inside / low) / Math.log(high / low)
			: (inside - low) / (high - low);
	return Math.round(share * sliderSteps(range));
}

/** The value of a place on the slider: whole steps, on a log scale three digits. */
export function fromSlider(range: NumberRange, position: number): number {
	const { sliderMin: low, sliderMax: high, step } = range;
	const share = position / sliderSteps(range);
	if (range.scale === 'log' && low > 0) {
		const value = Number((low * (high / low) ** share).toPrecision(3));
		return Math.min(high, Math.max(low, value));
	}
	const value = low + position * step;
	return Math.min(high, Number(value.toPrecision(12)));
}
