/** A number as tables write it; D is Fortran's sign for a power of ten. */
const pointed = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eEdD][+-]?\d+)?$/;
const withComma = /^[+-]?(?:\d+,?\d*|,\d+)(?:[eEdD][+-]?\d+)?$/;
/** A comma between digits, and a point between digits: they tell which of them parts the decimals. */
const commaInside = /^[+-]?\d*,\d+(?:[eEdD][+-]?\d+)?$/;
const pointInside = /^[+-]?\d*\.\d*(?:[eEdD][+-]?\d+)?$/;

/** Longer cells are no numbers. */
const longestNumber = 60;

const missing = new Set([
	'',
	'-',
	'--',
	'---',
	'–',
	'—',
	'...',
	'na',
	'n/a',
	'nan',
	'null',
	'none'
]);

export const isMissing = (cell: string): boolean =>
	cell.length <= longestNumber && missing.has(cell.trim().toLowerCase());

/** @returns NaN for what is no number; infinite for what is too large to be one */
export function numberIn(cell: string, decimalComma: boolean): number {
	const text = cell
		.trim()
		.replace(/^−/, '-')
		.replace(/([eEdD])−/, '$1-');
	if (!(decimalComma ? withComma : pointed).test(text)) return NaN;
	return Number(text.replace(',', '.').replace(/[dD]/, 'e'));
}

/** Whether it is a number by either way of writing decimals. */
export const isNumeric = (cell: string): boolean =>
	!Number.isNaN(numberIn(cell, false)) || !Number.isNaN(numberIn(cell, true));

/** Whether cells part their decimals by a comma: some do, and none by a point. */
export function usesDecimalComma(cells: Iterable<string>): boolean {
	let commas = 0;
	for (const cell of cells) {
		const text = cell.trim();
		if (pointInside.test(text)) return false;
		if (commaInside.test(text)) commas++;
	}
	return commas > 0;
}
