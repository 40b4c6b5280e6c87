import { describe, expect, it } from 'vitest';
import { PlainPainter } from '../../src/lib/picture/plainPainter';
import type { Frame } from '../../src/lib/picture/frame';
import { initialLook } from '../../src/lib/show/galaxy';
import { choosePainter } from '../../src/lib/stage/choosePainter';
import { makeRenderer } from '../../src/lib/stage/webgl/makeRenderer';
import { WebglStarPainter } from '../../src/lib/stage/webgl/WebglStarPainter';
import { createRingTable, sampleBackground, sampleStars } from '../../src/lib/starfield';
import { centroid, loneStars, makeFrame } from '../picture/support';
import { galaxy } from '../show/support/content';

const size = 512;

function webglPixels(gl: WebGLRenderingContext | WebGL2RenderingContext): Uint8Array {
	const upside = new Uint8Array(size * size * 4);
	gl.readPixels(0, 0, size, size, gl.RGBA, gl.UNSIGNED_BYTE, upside);
	const pixels = new Uint8Array(upside.length);
	for (let j = 0; j < size; j++) {
		pixels.set(upside.subarray((size - 1 - j) * size * 4, (size - j) * size * 4), j * size * 4);
	}
	return pixels;
}

/** One renderer for all: browsers allow few contexts. */
const renderer = makeRenderer(document.createElement('canvas'));
const webgl = new WebglStarPainter(renderer, size);

function both(frame: Frame) {
	const plain = new PlainPainter(size);
	plain.paint(frame);
	webgl.paint(frame);
	return { plain: plain.pixels, webgl: webglPixels(renderer.getContext()) };
}

const turned = (angle: number) => {
	const rings = createRingTable(25, 256);
	rings.phase.fill(angle);
	rings.omega.fill(20);
	return rings;
};

describe('the two star painters', () => {
	it.each([
		['in the middle', { R: 0 }, 0, {}, {}],
		['at 8 kpc', { R: 8 }, 0.7, {}, {}],
		['far out and high', { R: 22, z: 1 }, 4, { inclination: 75, turn: -140 }, {}],
		['edge-on, low', { R: 15 }, 2.2, { inclination: 90, centreAltitude: 10 }, {}],
		[
			'on a tilted dome of 220 degrees',
			{ R: 12 },
			5,
			{ inclination: 20, turn: 60, distance: 20 },
			{ geometry: { apertureDegrees: 220, tiltDegrees: 25 } }
		],
		['after many turns', { R: 3 }, 900.25, {}, {}],
		['as a large soft spot', { R: 10, size: 24, light: 2 }, 1, {}, {}]
	])('put a star %s at the same place within a pixel', (_, star, angle, view, more) => {
		const frame = makeFrame([loneStars([{ light: 0.9, ...star }], turned(angle))], view, more);
		const { plain, webgl } = both(frame);
		const [a, b] = [centroid(plain, size), centroid(webgl, size)];
		if (!a || !b)
			throw new Error(`no star: plain ${JSON.stringify(a)}, WebGL ${JSON.stringify(b)}`);
		expect(Math.abs(a.x - b.x), `x ${a.x} and ${b.x}`).toBeLessThan(1);
		expect(Math.abs(a.y - b.y), `y ${a.y} and ${b.y}`).toBeLessThan(1);
		// Light within 5 %: each rounds to eight bits in its own way.
		expect(Math.abs(a.light / b.light - 1), `light ${a.light} and ${b.light}`).toBeLessThan(0.05);
	});

	it('leave out the same half of the dome', () => {
		const ring = Array.from({ length: 12 }, (_, i) => ({
			R: 9,
			azimuth: (i * Math.PI) / 6,
			light: 1
		}));
		for (const half of ['left', 'right'] as const) {
			const { plain, webgl } = both(makeFrame([{ ...loneStars(ring, turned(0.3)), half }]));
			const [a, b] = [centroid(plain, size), centroid(webgl, size)];
			expect(Math.abs((a?.x ?? 0) - (b?.x ?? 1e9))).toBeLessThan(1);
			expect((a?.x ?? 0) < size / 2).toBe(half === 'left');
		}
	});

	it('give a whole galaxy, by light and by speed, the same colours', () => {
		const rings = turned(0.4);
		const stars = sampleStars(galaxy.model, initialLook, {
			count: 4000,
			seed: 9,
			radii: rings.radii
		});
		for (let k = 0; k < rings.radii.length; k++) rings.omega[k] = 200 / (1 + rings.radii[k]);
		const layer = { stars, rings, look: initialLook, patternAngle: 0.2, half: 'whole' as const };
		for (const colour of ['light', 'speed'] as const) {
			const frame = makeFrame([layer], {}, { colour, background: sampleBackground(4, 300) });
			const { plain, webgl } = both(frame);
			for (let c = 0; c < 3; c++) {
				let [a, b] = [0, 0];
				for (let at = c; at < plain.length; at += 4) {
					a += plain[at];
					b += webgl[at];
				}
				expect(a).toBeGreaterThan(1000);
				expect(Math.abs(a / b - 1), `${colour}, channel ${c}: ${a} and ${b}`).toBeLessThan(0.05);
			}
		}
	});
});

describe('WebglStarPainter', () => {
	it('paints again after its context was lost and given back', async () => {
		const canvas = document.createElement('canvas');
		const own = makeRenderer(canvas);
		const painter = new WebglStarPainter(own, size);
		const frame = makeFrame([loneStars([{ R: 8, light: 1 }], turned(0.5))]);
		painter.paint(frame);
		const before = centroid(webglPixels(own.getContext()), size);
		const restored = new Promise((resolve) =>
			canvas.addEventListener('webglcontextrestored', resolve)
		);
		own.forceContextLoss();
		await new Promise((resolve) => setTimeout(resolve, 100));
		own.forceContextRestore();
		await restored;
		painter.paint(frame);
		expect(before).not.toBeNull();
		expect(centroid(webglPixels(own.getContext()), size)).toEqual(before);
		painter.dispose();
		own.dispose();
	});
});

describe('choosePainter', () => {
	it('measures both and keeps the faster, with the reason', () => {
		sessionStorage.clear();
		const choice = choosePainter('auto', 256);
		const { plainMs, webglMs } = choice;
		if (plainMs === null || webglMs === null) throw new Error('nothing was measured');
		expect(choice.painter).toBe(webglMs < plainMs ? 'webgl' : 'plain');
		expect(choice.reason).toContain('ms a frame');
	});
	it('does not measure again in the same tab, so that a reload is quick', () => {
		sessionStorage.clear();
		const first = choosePainter('auto', 256);
		expect(choosePainter('auto', 256)).toEqual(first);
	});
	it('keeps to what the dome sets', () => {
		expect(choosePainter('plain', 256)).toMatchObject({ painter: 'plain', plainMs: null });
		expect(choosePainter('webgl', 256)).toMatchObject({ painter: 'webgl', webglMs: null });
	});
	it('takes the plain painter where there is no WebGL, whatever was set, and says so', () => {
		const original = HTMLCanvasElement.prototype.getContext;
		HTMLCanvasElement.prototype.getContext = (() => null) as typeof original;
		try {
			const choice = choosePainter('webgl', 256);
			expect(choice.painter).toBe('plain');
			expect(choice.reason).toContain('no WebGL');
		} finally {
			HTMLCanvasElement.prototype.getContext = original;
		}
	});
});
