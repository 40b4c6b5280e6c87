import { directionFromAltAz } from '../../dome/altAz';
import { domeProjection, filmFromDirection, type DomeProjection } from '../../dome/projection';
import type { AltAz, DomeGeometry, FilmPoint, SkyDirection } from '../../dome/types';

/** The part of a 2D context the drawings use: a page's, a worker's and Node's all have it. */
export type FilmContext = Pick<
	CanvasRenderingContext2D,
	| 'save'
	| 'restore'
	| 'beginPath'
	| 'moveTo'
	| 'lineTo'
	| 'closePath'
	| 'stroke'
	| 'fill'
	| 'arc'
	| 'setTransform'
	| 'fillText'
	| 'strokeText'
	| 'measureText'
	| 'setLineDash'
	| 'clearRect'
	| 'font'
	| 'fillStyle'
	| 'strokeStyle'
	| 'lineWidth'
	| 'lineCap'
	| 'lineJoin'
	| 'textAlign'
	| 'textBaseline'
	| 'globalAlpha'
>;

export const inks = {
	lit: '#F2B84B',
	unlit: '#5AA9E6',
	ink: '#ECEEF3',
	soft: '#A4ABBA',
	ground: '#05070B'
} as const;

const words = "'Atkinson Hyperlegible', sans-serif";
const figures = "'Atkinson Hyperlegible Mono', monospace";
/** A letter stays with its accents. */
const letters = new Intl.Segmenter('en', { granularity: 'grapheme' });
/** Height of a capital as a share of the font size: 0.67 for both faces. */
const capital = 0.67;

/** Degrees: capitals of 1.5° on films below 4,096 pixels, 1° from there on; lines of 0.15°. */
export const letterHeight = (filmSize: number): number => (filmSize >= 4096 ? 1 : 1.5);
export const lineWidth = 0.15;

export interface TextStyle {
	/** Height of capitals, degrees. */
	height: number;
	colour: string;
	align?: 'left' | 'centre' | 'right';
	mono?: boolean;
	bold?: boolean;
}

/**
 * Draws on a film by altitude and azimuth. Lines bend as the dome does; letters stand upright for
 * somebody who faces front, each in its own place, stretched so that the dome shows them true.
 */
export class FilmPen {
	readonly #projection: DomeProjection;
	readonly #direction: SkyDirection = { x: 0, y: 0, z: 0 };
	readonly #point: FilmPoint = { x: 0, y: 0 };
	/** Film pixels in one degree from the middle outward. */
	readonly perDegree: number;

	constructor(
		readonly context: FilmContext,
		readonly filmSize: number,
		geometry: DomeGeometry
	) {
		this.#projection = domeProjection(geometry);
		this.perDegree = filmSize / geometry.apertureDegrees;
	}

	/** @returns pixels, valid until the next call */
	place(at: AltAz): FilmPoint {
		filmFromDirection(this.#projection, directionFromAltAz(at, this.#direction), this.#point);
		this.#point.x = ((this.#point.x + 1) * this.filmSize) / 2;
		this.#point.y = ((this.#point.y + 1) * this.filmSize) / 2;
		return this.#point;
	}

	/** Pixels of a direction, or null beyond the rim. */
	placeDirection(direction: SkyDirection): FilmPoint | null {
		filmFromDirection(this.#projection, direction, this.#point);
		if (this.#point.x ** 2 + this.#point.y ** 2 > 1) return null;
		this.#point.x = ((this.#point.x + 1) * this.filmSize) / 2;
		this.#point.y = ((this.#point.y + 1) * this.filmSize) / 2;
		return this.#point;
	}

	/** Begins a path through places; long steps must be cut small by the caller. */
	path(places: Iterable<AltAz>): void {
		this.context.beginPath();
		let first = true;
		for (const at of places) {
			const { x, y } = this.place(at);
			if (first) this.context.moveTo(x, y);
			else this.context.lineTo(x, y);
			first = false;
		}
	}

	/** Strokes the current path. @param width degrees */
	stroke(colour: string, width = lineWidth, dash: readonly number[] = []): void {
		const { context } = this;
		context.strokeStyle = colour;
		context.lineWidth = Math.max(1, width * this.perDegree);
		context.lineCap = 'round';
		context.lineJoin = 'round';
		context.setLineDash(dash.map((d) => d * this.perDegree));
		context.stroke();
		context.setLineDash([]);
	}

	#font({ height, mono, bold }: TextStyle): string {
		const size = (height / capital) * this.perDegree;
		return `${bold ? '700 ' : ''}${size.toFixed(2)}px ${mono ? figures : words}`;
	}

	/** @returns degrees of arc along the horizontal */
	textWidth(text: string, style: TextStyle): number {
		this.context.font = this.#font(style);
		return this.context.measureText(text).width / this.perDegree;
	}

	/** Writes one line whose baseline runs level at an altitude. */
	text(text: string, at: AltAz, style: TextStyle): void {
		const { context } = this;
		const level = Math.max(0.2, Math.cos((at.altitude * Math.PI) / 180));
		const width = this.textWidth(text, style);
		const start = style.align === 'right' ? -width : style.align === 'left' ? 0 : -width / 2;
		context.save();
		context.fillStyle = style.colour;
		context.textAlign = 'left';
		context.textBaseline = 'alphabetic';
		context.strokeStyle = inks.ground;
		context.lineWidth = style.height * 0.3 * this.perDegree;
		context.lineJoin = 'round';
		const glyphs: { letter: string; azimuth: number; halfWidth: number }[] = [];
		let before = 0;
		for (const { segment, index } of letters.segment(text)) {
			const upTo = this.textWidth(text.slice(0, index + segment.length), style);
			const azimuth = at.azimuth + (start + (before + upTo) / 2) / level;
			if (segment !== ' ')
				glyphs.push({ letter: segment, azimuth, halfWidth: (upTo - before) / 2 });
			before = upTo;
		}
		// A dark rim under all letters first, so that words can be read over stars.
		for (const how of ['strokeText', 'fillText'] as const) {
			for (const { letter, azimuth, halfWidth } of glyphs)
				this.#glyph(how, letter, at.altitude, azimuth, halfWidth);
		}
		context.restore();
	}

	/** One letter, its middle at the azimuth, in the frame of the dome at that place. */
	#glyph(
		how: 'strokeText' | 'fillText',
		letter: string,
		altitude: number,
		azimuth: number,
		halfWidth: number
	): void {
		const { x, y } = this.place({ altitude, azimuth });
		const step = 0.05;
		const up = this.place({ altitude: altitude + step, azimuth });
		const ux = (up.x - x) / step / this.perDegree;
		const uy = (up.y - y) / step / this.perDegree;
		const level = Math.max(0.05, Math.cos((altitude * Math.PI) / 180));
		const side = this.place({ altitude, azimuth: azimuth + step / level });
		const rx = (side.x - x) / step / this.perDegree;
		const ry = (side.y - y) / step / this.perDegree;
		this.context.setTransform(rx, ry, -ux, -uy, x, y);
		this.context[how](letter, -halfWidth * this.perDegree, 0);
	}
}
