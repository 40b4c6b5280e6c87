import { safeBand } from '../../dome/altAz';
import { letterHeight } from './FilmPen';

/** A field of the dome in degrees: azimuths of its sides, altitudes of its foot and head. */
export interface Field {
	left: number;
	right: number;
	foot: number;
	head: number;
}

/**
 * Where things stand, all inside the safe band: the chart low on the left, names low on the right, the
 * caption lowest in the middle, or right of the chart, names of the halves above it.
 */
export function drawingsLayout(filmSize: number, withChart: boolean) {
	const letter = letterHeight(filmSize);
	const chart: Field = { left: -safeBand.azimuth + 7, right: -13, foot: 16, head: 33 };
	return {
		letter,
		chart,
		caption: withChart
			? { altitude: safeBand.lowest + 0.8, azimuth: 22, widest: 44, lines: 3 }
			: { altitude: safeBand.lowest + 0.8, azimuth: 0, widest: 62, lines: 2 },
		name: { altitude: 18, azimuth: safeBand.azimuth - 3 },
		scale: { left: 14, right: safeBand.azimuth - 5, foot: 23.2, head: 24.2 } satisfies Field,
		halves: { altitude: 16.5, azimuth: 24 },
		title: { altitude: 33, azimuth: 0 }
	};
}

/**
 * Cuts words into lines no wider than `widest`; what does not fit in `lines` ends in an ellipsis.
 * @param width measures a line, in the unit of `widest`
 */
export function wrapWords(
	text: string,
	widest: number,
	lines: number,
	width: (line: string) => number
): string[] {
	const out: string[] = [];
	let line = '';
	for (const word of text.split(/\s+/).filter(Boolean)) {
		const longer = line ? `${line} ${word}` : word;
		if (!line || width(longer) <= widest) line = longer;
		else {
			out.push(line);
			line = word;
		}
	}
	if (line) out.push(line);
	if (out.length <= lines) return out;
	const kept = out.slice(0, lines);
	let last = kept[lines - 1];
	while (last.includes(' ') && width(`${last} …`) > widest)
		last = last.slice(0, last.lastIndexOf(' '));
	kept[lines - 1] = `${last} …`;
	return kept;
}
