import { isMissing, isNumeric } from './cells';
import { roleByName } from './columnNames';
import { splitHeading } from './headingUnits';
import { separators, type Separator } from './reading';
import { splitLine } from './splitLine';

/** What occurs most often; 0 for none. */
export function mostCommon(counts: readonly number[]): number {
	const times = new Map<number, number>();
	for (const count of counts) times.set(count, (times.get(count) ?? 0) + 1);
	let best = 0;
	for (const [count, n] of times) if (n > (times.get(best) ?? 0)) best = count;
	return best;
}

/** Whether some line names two columns or more: that is no accident. */
const namesColumns = (split: readonly string[][]): boolean =>
	split.some((cells) => cells.filter((cell) => roleByName(splitHeading(cell).name)).length >= 2);

/** Share of the cells that are numbers, over lines of the usual length, and 1 more for headings. */
function score(lines: readonly string[], separator: Separator): number {
	const split = lines.map((line) => withoutEmptyEnd(splitLine(line, separator).cells));
	const usual = mostCommon(split.map((cells) => cells.length));
	if (usual < 2) return 0;
	const kept = split.filter((cells) => cells.length === usual);
	const good = kept.map((cells) => {
		const filled = cells.filter((cell) => !isMissing(cell));
		const numbers = filled.filter(isNumeric).length;
		return numbers < 2 ? 0 : numbers / filled.length;
	});
	const named = namesColumns(split.slice(0, 20)) ? 1 : 0;
	return named + good.reduce((sum, share) => sum + share, 0) / lines.length;
}

/** Cells without the empty ones at the end, which stray separators leave. */
export function withoutEmptyEnd(cells: readonly string[]): string[] {
	let end = cells.length;
	while (end > 0 && cells[end - 1].trim() === '') end--;
	return cells.slice(0, end);
}

/** The separator that makes the most numbers of some lines; on a tie the one that is no accident. */
export function findSeparator(lines: readonly string[]): Separator {
	let best: Separator = 'comma';
	let most = 0;
	for (const separator of separators) {
		const reached = score(lines, separator);
		if (reached > most + 1e-9) [best, most] = [separator, reached];
	}
	return best;
}
