import { createRequire } from 'node:module';
import { createCanvas, GlobalFonts, type SKRSContext2D } from '@napi-rs/canvas';
import { beforeAll, describe, expect, it } from 'vitest';
import { altAzFromDirection } from '../../src/lib/dome/altAz';
import { directionFromFilm, domeProjection } from '../../src/lib/dome/projection';
import type { AltAz, DomeGeometry } from '../../src/lib/dome/types';
import { drawOnFilm, FilmPen, type FilmContext } from '../../src/lib/picture/drawings';
import type { Drawings } from '../../src/lib/picture/frame';

const size = 1024;
const view = { distance: 45, inclination: 40, turn: -20, centreAltitude: 45 };
const upright: DomeGeometry = { apertureDegrees: 180, tiltDegrees: 0 };

beforeAll(() => {
	const { resolve } = createRequire(import.meta.url);
	const faces = [
		['atkinson-hyperlegible', '400', 'Atkinson Hyperlegible'],
		['atkinson-hyperlegible', '700', 'Atkinson Hyperlegible'],
		['atkinson-hyperlegible-mono', '400', 'Atkinson Hyperlegible Mono']
	];
	for (const [name, weight, family] of faces) {
		const file = `@fontsource/${name}/files/${name}-latin-${weight}-normal.woff2`;
		expect(GlobalFonts.registerFromPath(resolve(file), family), file).not.toBeNull();
	}
});

/** A canvas of Node and its context in the shape the drawings ask for. */
function film(): { own: SKRSContext2D; context: FilmContext } {
	const own = createCanvas(size, size).getContext('2d');
	return { own, context: own as unknown as FilmContext };
}

/** Places in the room of all pixels that are drawn on, with their colour. */
function drawnOn(context: SKRSContext2D, geometry: DomeGeometry) {
	const { data } = context.getImageData(0, 0, size, size);
	const projection = domeProjection(geometry);
	const direction = { x: 0, y: 0, z: 0 };
	const found: (AltAz & { colour: [number, number, number]; alpha: number })[] = [];
	for (let j = 0; j < size; j++) {
		for (let i = 0; i < size; i++) {
			const at = 4 * (j * size + i);
			if (data[at + 3] < 40) continue;
			const point = { x: (2 * (i + 0.5)) / size - 1, y: (2 * (j + 0.5)) / size - 1 };
			directionFromFilm(projection, point, direction);
			found.push({
				...altAzFromDirection(direction, { altitude: 0, azimuth: 0 }),
				colour: [data[at], data[at + 1], data[at + 2]],
				alpha: data[at + 3]
			});
		}
	}
	return found;
}

const radii = Array.from({ length: 60 }, (_, i) => (25 * (i + 1)) / 60);
const full: Drawings = {
	chart: {
		maxRadius: 25,
		maxSpeed: 300,
		curves: [
			{ name: 'light alone', role: 'lit', radii, speeds: radii.map((r) => 400 / (1 + r / 4)) },
			{ name: 'halo alone', role: 'unlit', radii, speeds: radii.map((r) => (180 * r) / (r + 5)) },
			{ name: 'with the halo', role: 'total', radii, speeds: radii.map(() => 220) }
		],
		points: [{ radius: 12, speed: 60, error: 30 }]
	},
	rings: [],
	name: 'Harrow Wheel',
	caption:
		'Measured by the light of its gas, this wheel turns as fast as far out as anybody can see.',
	scale: [0, 250],
	halves: ['without halo', 'with halo']
};

// Skia draws letter by letter here: seconds on a busy machine.
describe('drawOnFilm, in Node', { timeout: 30_000 }, () => {
	it.each([
		upright,
		{ apertureDegrees: 180, tiltDegrees: 25 },
		{ apertureDegrees: 220, tiltDegrees: 10 }
	])('draws all inside the safe band of a dome %o', (geometry) => {
		const { own, context } = film();
		drawOnFilm(context, size, geometry, view, full);
		const drawn = drawnOn(own, geometry);
		expect(drawn.length).toBeGreaterThan(5000);
		const altitudes = drawn.map(({ altitude }) => altitude);
		const azimuths = drawn.map(({ azimuth }) => Math.abs(azimuth));
		const reach = (of: number[]) =>
			of.reduce((a, b) => [Math.min(a[0], b), Math.max(a[1], b)], [1e9, -1e9]);
		// A pixel is about a fifth of a degree wide here.
		expect(reach(altitudes)[0], 'lowest altitude').toBeGreaterThan(9.6);
		expect(reach(altitudes)[1], 'highest altitude').toBeLessThan(60);
		expect(reach(azimuths)[1], 'widest azimuth').toBeLessThan(50.4);
	});

	it('draws lit matter in amber, unlit in azure, and nothing brighter than ink', () => {
		const { own, context } = film();
		drawOnFilm(context, size, upright, view, { ...full, scale: undefined });
		const drawn = drawnOn(own, upright).filter(({ alpha }) => alpha > 250);
		const near =
			([r, g, b]: number[]) =>
			(one: { colour: number[] }) =>
				Math.max(...one.colour.map((c, i) => Math.abs(c - [r, g, b][i]))) < 12;
		expect(drawn.filter(near([0xf2, 0xb8, 0x4b])).length).toBeGreaterThan(50);
		expect(drawn.filter(near([0x5a, 0xa9, 0xe6])).length).toBeGreaterThan(50);
		expect(Math.max(...drawn.map(({ colour }) => Math.min(...colour)))).toBeLessThanOrEqual(0xec);
	});

	it('leaves a gap where a curve runs above the chart', () => {
		const speeds = radii.map((r) => (r > 8 && r < 17 ? 1000 : 200));
		const lit = { name: '', role: 'lit' as const, radii, speeds };
		const { own, context } = film();
		drawOnFilm(context, size, upright, view, {
			rings: [],
			chart: { maxRadius: 25, maxSpeed: 300, curves: [lit], points: [] }
		});
		const amber = drawnOn(own, upright).filter(
			({ colour: [r, , b], alpha }) => alpha > 200 && r - b > 80
		);
		const at = (radius: number) => -42.5 + (29.5 * radius) / 25;
		const within = (from: number, to: number) =>
			amber.filter(({ azimuth }) => azimuth > at(from) && azimuth < at(to)).length;
		expect(within(2, 7)).toBeGreaterThan(20);
		expect(within(9.5, 15.5)).toBe(0);
		expect(within(18, 24)).toBeGreaterThan(20);
	});

	it('draws a measured point as an open ring with a bar as long as its error', () => {
		const { own, context } = film();
		drawOnFilm(context, size, upright, view, {
			rings: [],
			chart: { ...chartOf([{ radius: 12.5, speed: 150, error: 60 }]) }
		});
		const middle = -42.5 + 29.5 / 2;
		const bar = drawnOn(own, upright)
			.filter(({ azimuth, colour }) => Math.abs(azimuth - middle) < 0.25 && colour[0] > 150)
			.map(({ altitude }) => altitude)
			.filter((altitude) => altitude > 17);
		const degreesPerSpeed = 17 / 300;
		expect(Math.min(...bar)).toBeCloseTo(16 + 90 * degreesPerSpeed, 0);
		expect(Math.max(...bar)).toBeCloseTo(16 + 210 * degreesPerSpeed, 0);
		// The ring is open: dark in the middle.
		const core = 16 + 150 * degreesPerSpeed;
		expect(bar.filter((altitude) => Math.abs(altitude - core) < 0.1)).toEqual([]);
	});

	it('wipes what was drawn before', () => {
		const { own, context } = film();
		drawOnFilm(context, size, upright, view, full);
		drawOnFilm(context, size, upright, view, { rings: [] });
		expect(drawnOn(own, upright)).toEqual([]);
	});
});

const chartOf = (points: { radius: number; speed: number; error: number }[]) => ({
	maxRadius: 25,
	maxSpeed: 300,
	curves: [],
	points
});

describe('FilmPen', () => {
	it.each([-45, 0, 30])('writes capitals of 1.5° that stand upright at azimuth %d', (azimuth) => {
		const { own, context } = film();
		const pen = new FilmPen(context, size, upright);
		pen.text('I', { altitude: 20, azimuth }, { height: 1.5, colour: '#ECEEF3' });
		const letter = drawnOn(own, upright).filter(({ colour }) => colour[0] > 140);
		const altitudes = letter.map(({ altitude }) => altitude);
		// From edge to edge of the outermost pixels, not from middle to middle.
		const tall = Math.max(...altitudes) - Math.min(...altitudes) + 180 / size;
		expect(tall).toBeGreaterThan(1.3);
		expect(tall).toBeLessThan(1.7);
		expect(Math.min(...altitudes)).toBeGreaterThan(19.75);
		// Upright: its foot and its head have the same azimuth.
		const mean = (of: typeof letter) => of.reduce((sum, one) => sum + one.azimuth, 0) / of.length;
		const foot = mean(letter.filter(({ altitude }) => altitude < 20.6));
		const head = mean(letter.filter(({ altitude }) => altitude > 20.9));
		expect(Math.abs(foot - head), `foot ${foot}, head ${head}`).toBeLessThan(0.15);
		expect(Math.abs(foot - azimuth), `foot ${foot}`).toBeLessThan(0.2);
	});
});
