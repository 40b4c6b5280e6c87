import { longestLine } from './limits';
import type { Separator } from './reading';
import { splitLine } from './splitLine';
import type { TextLine } from './splitText';

/** A line, or several that one quoted cell holds together, as cells. */
export interface TableRecord {
	/** Where it begins, from 1. */
	line: number;
	text: string;
	cells: string[];
	/** Why it can be no row; null where it can. */
	fault: string | null;
}

/** Lines one quoted cell may run over. */
const mostJoined = 20;

function readRecord(
	lines: readonly TextLine[],
	at: number,
	separator: Separator
): { record: TableRecord; next: number } {
	const { number: line, text } = lines[at];
	const record: TableRecord = { line, text, cells: [], fault: null };
	if (text.length > longestLine) {
		record.fault = `The line is ${text.length.toLocaleString('en-GB')} characters long, which no row of a table is.`;
		return { record, next: at + 1 };
	}
	let joined = text;
	for (let next = at + 1; next <= at + mostJoined; next++) {
		const split = splitLine(joined, separator);
		if (!split.open) {
			record.cells = split.cells;
			record.text = joined;
			return { record, next };
		}
		if (next >= lines.length || joined.length > longestLine) break;
		joined += `\n${lines[next].text}`;
	}
	record.fault = 'A quote is opened and never closed.';
	return { record, next: at + 1 };
}

/** Lines as cells, one after the other, so that nobody reads more of them than needed. */
export function* recordsOf(
	lines: readonly TextLine[],
	separator: Separator
): Generator<TableRecord> {
	for (let at = 0; at < lines.length;) {
		const { record, next } = readRecord(lines, at, separator);
		yield record;
		at = next;
	}
}
