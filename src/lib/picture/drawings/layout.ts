import { inSafeBand, safeBand } from '../../dome/altAz';
import type { AltAz } from '../../dome/types';
import { DEGREE } from '../../units';
import type { Drawings } from '../frame';
import { inks, letterHeight, type TextStyle } from './FilmPen';
import { wrapWords } from './wrapWords';

/** A field of the dome in degrees: azimuths of its sides, altitudes of its foot and head. */
export interface Field {
	left: number;
	right: number;
	foot: number;
	head: number;
}

/** One line of words with its place and the field it covers. */
export interface PlacedWords {
	text: string;
	at: AltAz;
	style: TextStyle;
	field: Field;
}

/** @returns degrees of arc along the horizontal */
export type MeasureText = (text: string, style: TextStyle) => number;

export interface DrawingsLayout {
	letter: number;
	/** Between the axes of the chart. */
	chart: Field;
	/** The chart with its figures, units and names. */
	chartGround: Field;
	/** The bar of the colour scale. */
	scale: Field;
	words: PlacedWords[];
}

export const overlap = (a: Field, b: Field): boolean =>
	a.left < b.right && b.left < a.right && a.foot < b.head && b.foot < a.head;

export const fieldInSafeBand = (f: Field): boolean =>
	inSafeBand({ azimuth: f.left, altitude: f.foot }) &&
	inSafeBand({ azimuth: f.right, altitude: f.head });

function placed(text: string, at: AltAz, style: TextStyle, width: MeasureText): PlacedWords {
	const wide = width(text, style) / Math.cos(at.altitude * DEGREE);
	const before = style.align === 'right' ? wide : style.align === 'left' ? 0 : wide / 2;
	return {
		text,
		at,
		style,
		field: {
			left: at.azimuth - before,
			right: at.azimuth - before + wide,
			foot: at.altitude - 0.35 * style.height,
			head: at.altitude + 1.15 * style.height
		}
	};
}

/** Degrees between a ring's label and other words. */
const clear = 0.6;
const wider = ({ left, right, foot, head }: Field): Field => ({
	left: left - clear,
	right: right + clear,
	foot: foot - clear,
	head: head + clear
});

/**
 * A label for a ring: under its lowest point, or at the next higher point where it hides nothing.
 * @returns null where the ring has no such place: words on words could not be read
 */
function ringLabel(
	text: string,
	points: readonly AltAz[],
	style: TextStyle,
	width: MeasureText,
	taken: readonly Field[]
): PlacedWords | null {
	const upward = [...points].sort((a, b) => a.altitude - b.altitude);
	const middle = (upward[0].altitude + (upward.at(-1)?.altitude ?? 0)) / 2;
	for (const { altitude, azimuth } of upward) {
		const beside = altitude <= middle ? -1.9 * style.height : 0.9 * style.height;
		const words = placed(text, { altitude: altitude + beside, azimuth }, style, width);
		const around = wider(words.field);
		if (fieldInSafeBand(words.field) && !taken.some((other) => overlap(around, other)))
			return words;
	}
	return null;
}

/**
 * Where everything stands, all inside the safe band and nothing on top of another: the chart low on the
 * left; the caption lowest in the middle, or right of the chart; above it the names of the halves, the
 * galaxy's name and the colour scale. Places do not depend on how long the caption is, so that nothing
 * jumps when it changes.
 * @param ringPoints for each ring its points on the dome, as many as there may be places for its label
 */
export function layOutDrawings(
	drawings: Drawings,
	filmSize: number,
	width: MeasureText,
	ringPoints: readonly (readonly AltAz[])[]
): DrawingsLayout {
	const letter = letterHeight(filmSize);
	const { azimuth: side, lowest } = safeBand;
	const chart: Field = { left: -side + 7.5, right: -13, foot: 16, head: 33 };
	const chartGround: Field = { left: -side, right: 1, foot: lowest, head: 36.4 };
	const withChart = drawings.chart !== undefined;
	const caption = withChart
		? { azimuth: 25, widest: 44, lines: 3 }
		: { azimuth: 0, widest: 62, lines: 2 };
	const captionFoot = lowest + 0.8;
	const captionHead = captionFoot + (caption.lines - 1) * letter * 1.9 + 1.15 * letter;
	const large = letter * 1.2;
	const halves = withChart
		? { altitude: chartGround.head + letter, azimuth: 37 }
		: { altitude: captionHead + 0.8 * letter, azimuth: 24 };
	const nameFoot = withChart ? captionHead + letter : halves.altitude + large * 1.15 + letter;
	const scaleFoot = nameFoot + large * 1.15 + letter;
	const scale: Field = { left: 14, right: side - 5, foot: scaleFoot, head: scaleFoot + 1 };

	const words: PlacedWords[] = [];
	const put = (text: string, at: AltAz, style: TextStyle) =>
		words.push(placed(text, at, style, width));
	const fit = (text: string, widest: number, lines: number, style: TextStyle) =>
		wrapWords(text, widest, lines, (line) => width(line, style));

	if (drawings.name) {
		const style: TextStyle = { height: large, colour: inks.ink, align: 'right', bold: true };
		for (const line of fit(drawings.name, 42, 1, style)) {
			put(line, { altitude: nameFoot, azimuth: side - 3 }, style);
		}
	}
	if (drawings.title) {
		const style: TextStyle = { height: letter * 1.6, colour: inks.ink, bold: true };
		const lines = fit(drawings.title, 76, 2, style);
		lines.forEach((line, i) => {
			put(line, { altitude: 33 + (lines.length - 1 - i) * letter * 3, azimuth: 0 }, style);
		});
	}
	drawings.halves?.forEach((label, i) => {
		const azimuth = i === 0 ? -halves.azimuth : halves.azimuth;
		put(label, { altitude: halves.altitude, azimuth }, { height: large, colour: inks.ink });
	});
	if (drawings.caption) {
		const style: TextStyle = { height: letter, colour: inks.ink };
		const lines = fit(drawings.caption, caption.widest, caption.lines, style);
		lines.forEach((line, i) => {
			const altitude = captionFoot + (lines.length - 1 - i) * letter * 1.9;
			put(line, { altitude, azimuth: caption.azimuth }, style);
		});
	}
	if (drawings.scale) {
		const [low, high] = drawings.scale;
		const style = { height: letter, colour: inks.ink, mono: true } as const;
		const altitude = scale.head + 0.8;
		put(String(low), { altitude, azimuth: scale.left }, { ...style, align: 'left' });
		put(`${high} km/s`, { altitude, azimuth: scale.right }, { ...style, align: 'right' });
	}
	const taken = words.map(({ field }) => field);
	if (withChart) taken.push(chartGround);
	if (drawings.scale) taken.push(scale);
	drawings.rings.forEach(({ label }, i) => {
		const style: TextStyle = { height: letter, colour: inks.soft };
		const made = ringLabel(label, ringPoints[i], style, width, taken);
		if (!made) return;
		words.push(made);
		taken.push(made.field);
	});
	return { letter, chart, chartGround, scale, words };
}
