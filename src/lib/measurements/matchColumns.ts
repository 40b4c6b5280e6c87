import { isMissing, numberIn } from './cells';
import { roleByName } from './columnNames';
import type { FoundHeader } from './findHeader';
import type { ColumnRole } from './reading';

export interface ColumnMatch {
	role: ColumnRole | null;
	why: string;
}

/** Numbers of one column; empty where some of its cells are none. */
function numbersOf(rows: readonly (readonly string[])[], column: number, comma: boolean): number[] {
	const cells = rows.map((cells) => cells[column] ?? '').filter((cell) => !isMissing(cell));
	const numbers = cells
		.map((cell) => numberIn(cell, comma))
		.filter((value) => !Number.isNaN(value));
	return numbers.length * 10 < cells.length * 9 ? [] : numbers;
}

const middle = (values: readonly number[]): number =>
	values.map(Math.abs).sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;

const rises = (values: readonly number[]): boolean =>
	values.length > 0 &&
	values.every((value) => value >= 0) &&
	(values.length < 3 ||
		(values[values.length - 1] > values[0] &&
			values.filter((value, i) => i > 0 && value < values[i - 1]).length * 20 <= values.length));

/** Roles by what the headings say. The surest name wins where two say the same. */
function byName(headings: FoundHeader['headings'], count: number): ColumnMatch[] {
	const matches = Array.from({ length: count }, (_, i) => roleByName(headings?.[i]?.name ?? ''));
	return matches.map((match, i) => {
		const name = headings?.[i]?.name ?? '';
		if (!match) {
			return {
				role: null,
				why: name ? `“${name}” is no name that is known here` : 'No heading'
			};
		}
		const surer = matches.findIndex(
			(other, k) =>
				other?.role === match.role &&
				(other.rank < match.rank || (other.rank === match.rank && k < i))
		);
		return surer === -1
			? { role: match.role, why: `Its heading is “${name}”` }
			: { role: null, why: `“${headings?.[surer]?.name}” is the surer name for it` };
	});
}

/**
 * What each column is: by its heading first; radius, speed and error also by their numbers.
 * @param rows cells of the first rows
 */
export function matchColumns(
	headings: FoundHeader['headings'],
	rows: readonly (readonly string[])[],
	count: number,
	comma: boolean
): ColumnMatch[] {
	const columns = byName(headings, count);
	const numbers = columns.map((_, i) => numbersOf(rows, i, comma));
	const has = (role: ColumnRole) => columns.some((column) => column.role === role);
	const free = () =>
		columns.flatMap(({ role }, i) => (role === null && numbers[i].length > 0 ? [i] : []));
	const take = (column: number | undefined, role: ColumnRole, why: string) => {
		if (column !== undefined) columns[column] = { role, why };
	};
	// Where headings name both, what they leave open is none of the three.
	const guess = headings === null || !has('radius') || !has('speed');
	if (!guess) return columns;
	if (!has('radius')) {
		take(
			free().find((i) => rises(numbers[i])),
			'radius',
			'Its numbers rise from line to line, as radii do'
		);
	}
	if (!has('speed')) {
		const [first, second] = free();
		const larger =
			second !== undefined && middle(numbers[second]) > 2 * middle(numbers[first]) ? second : first;
		take(larger, 'speed', 'The first column of larger numbers beside the radius');
	}
	if (!has('error')) {
		const speed = columns.findIndex(({ role }) => role === 'speed');
		const half = speed === -1 ? 0 : middle(numbers[speed]) / 2;
		take(
			free().find((i) => numbers[i].every((value) => value > 0) && middle(numbers[i]) < half),
			'error',
			'Its numbers are positive and small beside the speeds'
		);
	}
	return columns;
}
