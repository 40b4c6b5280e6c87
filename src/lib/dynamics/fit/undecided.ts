import { numberWords } from '../rangeWords';
import type { Coordinate } from './Problem';
import type { FittedParameter } from './types';

/** Correlation from which two parameters move as one; it matters where their errors are large too. */
const traded = 0.95;
/** Standard error over value from which such a pair is not told apart. */
const vague = 0.4;
/** Standard error over value from which the data hardly fix a parameter. */
const loose = 1;

/**
 * Why the data cannot decide between values, in plain sentences; null where they can.
 * @param correlation NaN for parameters at a bound
 */
export function undecidedWords(
	coordinates: readonly Coordinate[],
	found: readonly FittedParameter[],
	correlation: readonly number[][],
	nameOf: (componentId: string) => string
): string | null {
	const called = (i: number) =>
		`${coordinates[i].info.label.toLowerCase()} of “${nameOf(coordinates[i].componentId)}”`;
	const isVague = (i: number) => found[i].error > vague * Math.abs(found[i].value);
	const lines: string[] = [];
	found.forEach(({ atBound, value, error, unit }, i) => {
		if (atBound) {
			const limit = `${numberWords(Number(value.toPrecision(4)))} ${unit}`.trim();
			const side = atBound === 'min' ? 'lower' : 'upper';
			lines.push(`The ${called(i)} ran to its ${side} limit, ${limit}: the data do not hold it.`);
		} else if (!(error < loose * Math.abs(value))) {
			lines.push(
				`The ${called(i)} may as well be half or twice as much: its error is as large as it is.`
			);
		}
	});
	for (let i = 0; i < found.length; i++) {
		for (let j = 0; j < i; j++) {
			if (!(Math.abs(correlation[i][j]) > traded && isVague(i) && isVague(j))) continue;
			const way = correlation[i][j] > 0 ? 'more of both' : 'more of one and less of the other';
			lines.push(
				`The ${called(j)} and the ${called(i)} are hardly told apart: ${way} fits nearly as well.`
			);
		}
	}
	return lines.length === 0 ? null : lines.join(' ');
}
