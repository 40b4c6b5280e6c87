import { domeProjection, filmFromDirection } from '../dome/projection';
import type { FilmPoint, SkyDirection } from '../dome/types';
import type { BackgroundSky } from '../starfield/types';
import { clearRect, emptyRect, joinRect, setRect, type DirtyRect } from './dirtyRect';
import { FilmCamera } from './filmCamera';
import type { Frame } from './frame';
import { paintLayer } from './layerPainter';
import { addPoint, addPointInside } from './splat';
import { backgroundBrightness } from './starLight';

/** Opaque black as one word; the same in either byte order but for the place of alpha. */
const black = new Uint32Array(new Uint8Array([0, 0, 0, 255]).buffer)[0];

/**
 * The star painter that needs no GPU. It keeps a film of RGBA bytes, paints stars additively and
 * clears only what it painted the time before. Runs in Node, a worker and a page alike.
 */
export class PlainPainter {
	readonly size: number;
	/** RGBA, row by row from the top, always opaque. Valid until the next `paint`. */
	readonly pixels: Uint8ClampedArray<ArrayBuffer>;
	readonly #words: Uint32Array;
	readonly #camera = new FilmCamera();
	readonly #whole: DirtyRect;
	/** What the galaxy covered in the last frame, and what the last call changed in all. */
	readonly #galaxy = emptyRect();
	readonly #changed = emptyRect();
	readonly #film: { size: number; pixels: Uint8ClampedArray };
	#sky: BackgroundSky | null = null;
	#skyKey = '';
	/** Background stars on the film: x, y in pixels; outside the rim −1. */
	#skyPlaces = new Float32Array(0);

	/** @param size pixels across the film, 16 to 8192 @throws RangeError outside of that */
	constructor(size: number) {
		if (!Number.isInteger(size) || size < 16 || size > 8192) {
			throw new RangeError(`A film is 16 to 8192 pixels across, not ${size}.`);
		}
		this.size = size;
		this.pixels = new Uint8ClampedArray(size * size * 4);
		this.#words = new Uint32Array(this.pixels.buffer);
		this.#words.fill(black);
		this.#whole = { left: 0, top: 0, right: size - 1, bottom: size - 1 };
		this.#film = { size, pixels: this.pixels };
	}

	/**
	 * Paints one frame over the last.
	 * @returns the part of the film that may have changed; the object is reused
	 */
	paint(frame: Frame): Readonly<DirtyRect> {
		const newSky = this.#placeSky(frame);
		if (newSky) setRect(this.#galaxy, this.#whole);
		const cleared = this.#galaxy;
		this.#clear(cleared);
		this.#paintSky(frame, cleared);
		setRect(this.#changed, cleared);
		clearRect(this.#galaxy);
		this.#camera.set(frame.view, frame.geometry);
		for (const layer of frame.layers) {
			paintLayer(this.#film, this.#camera, frame, layer, this.#galaxy);
		}
		joinRect(this.#changed, this.#galaxy);
		return this.#changed;
	}

	#clear({ left, top, right, bottom }: DirtyRect): void {
		for (let j = top; j <= bottom; j++) {
			this.#words.fill(black, j * this.size + left, j * this.size + right + 1);
		}
	}

	/** Finds the background's places where sky, dome or light have changed. @returns whether they had */
	#placeSky({ background, geometry, exposure }: Frame): boolean {
		const key = `${geometry.apertureDegrees} ${geometry.tiltDegrees} ${exposure}`;
		if (background === this.#sky && key === this.#skyKey) return false;
		this.#sky = background;
		this.#skyKey = key;
		if (this.#skyPlaces.length !== 2 * background.count) {
			this.#skyPlaces = new Float32Array(2 * background.count);
		}
		const projection = domeProjection(geometry);
		const direction: SkyDirection = { x: 0, y: 0, z: 0 };
		const point: FilmPoint = { x: 0, y: 0 };
		for (let i = 0; i < background.count; i++) {
			direction.x = background.directions[3 * i];
			direction.y = background.directions[3 * i + 1];
			direction.z = background.directions[3 * i + 2];
			filmFromDirection(projection, direction, point);
			const inside = point.x * point.x + point.y * point.y < 0.999;
			this.#skyPlaces[2 * i] = inside ? ((point.x + 1) * this.size) / 2 : -1;
			this.#skyPlaces[2 * i + 1] = inside ? ((point.y + 1) * this.size) / 2 : -1;
		}
		return true;
	}

	/** Paints the background again in the cleared part, and only there: elsewhere it still stands. */
	#paintSky({ background, exposure }: Frame, cleared: DirtyRect): void {
		const { left, top, right, bottom } = cleared;
		for (let i = 0; i < background.count; i++) {
			const x = this.#skyPlaces[2 * i];
			const y = this.#skyPlaces[2 * i + 1];
			if (x < 1 || x < left - 1 || x > right + 2 || y < top - 1 || y > bottom + 2) continue;
			const L = (background.light[i] * backgroundBrightness * exposure) / 255;
			const { colour } = background;
			const r = colour[3 * i] * L;
			const g = colour[3 * i + 1] * L;
			const b = colour[3 * i + 2] * L;
			const whole = x >= left + 1 && x <= right && y >= top + 1 && y <= bottom;
			if (whole) addPoint(this.#film, x, y, r, g, b);
			else addPointInside(this.#film, x, y, r, g, b, cleared);
		}
	}
}
