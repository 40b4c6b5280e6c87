import { mostColumns } from './limits';
import type { Separator } from './reading';

const signs: Record<Exclude<Separator, 'blanks'>, string> = {
	tab: '\t',
	semicolon: ';',
	comma: ',',
	bar: '|'
};

export interface SplitLine {
	/** Without their quotes and the blanks around them; at most one more than a table may have. */
	cells: string[];
	/** A quoted cell does not end on this line. */
	open: boolean;
}

const blankCell = /"(?:[^"]|"")*"|\S+/g;

function splitAtBlanks(line: string): SplitLine {
	const cells: string[] = [];
	for (const [cell] of line.matchAll(blankCell)) {
		const quoted = cell.length > 1 && cell.startsWith('"') && cell.endsWith('"');
		cells.push(quoted ? cell.slice(1, -1).replaceAll('""', '"') : cell);
		if (cells.length > mostColumns) break;
	}
	return { cells, open: false };
}

/** Where a quoted cell that begins at `start` ends: the place of its last quote, or -1. */
function closingQuote(line: string, start: number): number {
	for (let at = line.indexOf('"', start + 1); at !== -1; at = line.indexOf('"', at + 2)) {
		if (line[at + 1] !== '"') return at;
	}
	return -1;
}

/** Cells of one line (RFC 4180: a quoted cell may hold the separator, and "" for a quote). */
export function splitLine(line: string, separator: Separator): SplitLine {
	if (separator === 'blanks') return splitAtBlanks(line);
	const sign = signs[separator];
	const cells: string[] = [];
	let at = 0;
	while (cells.length <= mostColumns) {
		let start = at;
		while (line[start] === ' ') start++;
		if (line[start] === '"') {
			const close = closingQuote(line, start);
			if (close === -1) return { cells, open: true };
			const next = line.indexOf(sign, close + 1);
			const after = line.slice(close + 1, next === -1 ? undefined : next).trim();
			const inside = line.slice(start + 1, close).replaceAll('""', '"');
			cells.push(after === '' ? inside : `"${inside}"${after}`);
			if (next === -1) return { cells, open: false };
			at = next + 1;
			continue;
		}
		const next = line.indexOf(sign, at);
		cells.push(line.slice(at, next === -1 ? undefined : next).trim());
		if (next === -1) return { cells, open: false };
		at = next + 1;
	}
	return { cells, open: false };
}
