import { roleByName } from './columnNames';
import { isMissing, isNumeric } from './cells';
import { withoutEmptyEnd } from './findSeparator';
import { isUnitCell, splitHeading } from './headingUnits';
import type { Separator } from './reading';
import type { TableRecord } from './records';
import { splitLine } from './splitLine';
import type { TextLine } from './splitText';

export interface FoundHeader {
	/** Name and unit of each column; null without a heading. */
	headings: { text: string; name: string; unit: string | null }[] | null;
	/** How many of the records stand before the first row. */
	before: number;
	/** Those of them that are neither headings nor words, but broken rows. */
	broken: TableRecord[];
}

const numbersIn = (cells: readonly string[]) => cells.filter(isNumeric).length;
const rolesIn = (cells: readonly string[]) =>
	cells.filter((cell) => roleByName(splitHeading(cell).name)).length;
const isUnits = (cells: readonly string[]) =>
	cells.some(isUnitCell) &&
	cells.every((cell) => isMissing(cell) || !isNumeric(cell)) &&
	cells.filter((cell) => isUnitCell(cell) || isMissing(cell)).length * 2 >= cells.length;

const headingsFrom = (cells: readonly string[], units: readonly string[] = []) =>
	cells.map((text, i) => {
		const split = splitHeading(text);
		const below = (units[i] ?? '').trim().replace(/^[([{]|[)\]}]$/g, '');
		return { text, name: split.name, unit: split.unit ?? (below === '' ? null : below) };
	});

/** Headings that stand in the comments above the first row, as archives often have them. */
function inComments(
	comments: readonly TextLine[],
	separator: Separator,
	columns: number,
	firstRow: number
): FoundHeader['headings'] {
	const rows = comments
		.filter(({ number }) => number < firstRow)
		.slice(-50)
		.map(({ text }) => withoutEmptyEnd(splitLine(text, separator).cells))
		.filter((cells) => cells.length === columns);
	const at = rows.findLastIndex((cells) => rolesIn(cells) >= 2);
	if (at === -1) return null;
	const units = rows.slice(at + 1).find(isUnits);
	return headingsFrom(rows[at], units);
}

/**
 * Finds what names the columns: the first lines without numbers, or the comments.
 * @param records the first ones of the table @param columns cells of a usual row
 * @param asked whether a person says that the first line is, or is not, a heading
 */
export function findHeader(
	records: readonly TableRecord[],
	comments: readonly TextLine[],
	separator: Separator,
	columns: number,
	asked?: boolean
): FoundHeader {
	const cellsOf = (record: TableRecord) => withoutEmptyEnd(record.cells);
	if (asked === false) return { headings: null, before: 0, broken: [] };
	const isBroken = (one: TableRecord) => one.fault !== null || numbersIn(one.cells) > 0;
	const isRow = (record: TableRecord) => numbersIn(record.cells) >= 2;
	let before = records.findIndex(isRow);
	if (before === -1) before = records.length;
	if (asked) before = Math.max(1, before);
	const above = records.slice(0, before);
	let at = asked ? 0 : above.findLastIndex((one) => !one.fault && rolesIn(one.cells) > 0);
	if (at === -1) {
		at = above.findLastIndex(
			(one) => !one.fault && numbersIn(one.cells) === 0 && one.cells.length === columns
		);
	}
	if (at === -1) {
		const firstRow = records[before]?.line ?? Infinity;
		const headings = inComments(comments, separator, columns, firstRow);
		return { headings, before, broken: above.filter(isBroken) };
	}
	const units = above.findIndex((record, i) => i > at && isUnits(record.cells));
	const broken = above.filter(
		(record, i) => i !== at && i !== units && (i > at || isBroken(record))
	);
	const headings = headingsFrom(
		cellsOf(above[at]),
		units === -1 ? undefined : cellsOf(above[units])
	);
	return { headings, before, broken };
}
