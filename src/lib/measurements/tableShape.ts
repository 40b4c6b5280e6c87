import { usesDecimalComma } from './cells';
import { roleByName } from './columnNames';
import { findHeader, type FoundHeader } from './findHeader';
import { findSeparator, mostCommon, withoutEmptyEnd } from './findSeparator';
import { mostRows } from './limits';
import type { ReadChoices, Separator } from './reading';
import { recordsOf, type TableRecord } from './records';
import type { TextLines } from './splitText';

/** How a table is written: what parts its cells, what names them, how many there are. */
export interface TableShape {
	separator: Separator;
	header: FoundHeader;
	/** Lines under the headings; at most some more than a table may have. */
	table: TableRecord[];
	/** The first of them that are whole. */
	first: TableRecord[];
	/** Cells a row may have, and those it must have. */
	count: number;
	least: number;
	decimalComma: boolean;
}

/** Lines that are looked at to find out how the table is written, and how much of each. */
const looked = 200;
const lookedLength = 2000;

function recordsUpTo(lines: TextLines['lines'], separator: Separator): TableRecord[] {
	const records: TableRecord[] = [];
	for (const record of recordsOf(lines, separator)) {
		records.push(record);
		if (records.length > mostRows + looked) break;
	}
	return records;
}

/** Finds how the lines of a text are written, as far as `choices` leave it open. */
export function tableShape({ lines, comments }: TextLines, choices: ReadChoices): TableShape {
	const top = lines.slice(0, looked).map(({ text }) => text.slice(0, lookedLength));
	const separator = choices.separator ?? findSeparator(top);
	const records = recordsUpTo(lines, separator);
	const sample = records.slice(0, looked);
	const filledOf = ({ cells }: TableRecord) => withoutEmptyEnd(cells).length;
	const usual = mostCommon(sample.filter(({ fault }) => fault === null).map(filledOf));
	const header = findHeader(sample, comments, separator, usual, choices.header);
	const table = records.slice(header.before);
	const first = table.filter(({ fault }) => fault === null).slice(0, looked);
	const length = mostCommon(first.map(({ cells }) => cells.length));
	const filled = first.reduce((most, record) => Math.max(most, filledOf(record)), 0);
	const count = Math.max(header.headings?.length ?? 0, Math.min(length, filled));
	// A reason may be “1,5”: words say nothing of how numbers are written.
	const isWords = (column: number) =>
		roleByName(header.headings?.[column]?.name ?? '')?.role === 'left out';
	const numbers = first.flatMap(({ cells }) => cells.filter((_, i) => !isWords(i)));
	return {
		separator,
		header,
		table,
		first,
		count,
		least: Math.min(count, length),
		decimalComma: choices.decimalComma ?? usesDecimalComma(numbers)
	};
}
