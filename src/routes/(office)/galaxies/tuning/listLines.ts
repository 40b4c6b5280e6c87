import type { ListInfo, Parameters } from '$lib/dynamics/types';
import { wordAndListIssues } from '$lib/dynamics/wordAndListIssues';
import { parseNumber } from '$lib/components/settings/numberText';

/** The lists side by side as lines of text, tabs between the columns. */
export function linesOf(lists: readonly ListInfo[], parameters: Parameters): string {
	const columns = lists.map(({ name }) => {
		const value = parameters[name];
		return Array.isArray(value) ? value : [];
	});
	return columns[0].map((_, i) => columns.map((column) => column[i]).join('\t')).join('\n');
}

/** Reads such lines: columns apart by blanks, tabs or semicolons. Says which line is at fault and why. */
export function readLines(
	lists: readonly ListInfo[],
	text: string
): { lists: Record<string, number[]> } | { problem: string } {
	const read: Record<string, number[]> = Object.fromEntries(lists.map(({ name }) => [name, []]));
	for (const [at, line] of text.split(/\r?\n/).entries()) {
		if (line.trim() === '') continue;
		const cells = line.trim().split(/[\s;]+/);
		if (cells.length !== lists.length) {
			return { problem: `Line ${at + 1} has ${cells.length} numbers; ${lists.length} are needed.` };
		}
		for (const [column, { name }] of lists.entries()) {
			const value = parseNumber(cells[column]);
			if (Number.isNaN(value)) {
				return { problem: `Line ${at + 1}: “${cells[column]}” is not a number.` };
			}
			read[name].push(value);
		}
	}
	const [issue] = wordAndListIssues(
		{ id: '', label: '', parameters: [], lists: [...lists] },
		read,
		'These points'
	);
	return issue ? { problem: issue.message } : { lists: read };
}
