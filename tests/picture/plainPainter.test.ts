import { describe, expect, it } from 'vitest';
import { PlainPainter } from '../../src/lib/picture/plainPainter';
import { speedRamp } from '../../src/lib/picture/speedRamp';
import { initialLook } from '../../src/lib/show/galaxy';
import { createRingTable, sampleBackground, sampleStars } from '../../src/lib/starfield';
import { galaxy } from '../show/support/content';
import { centroid, loneStars, makeFrame } from './support';

const size = 512;
const painted = (frame: Parameters<PlainPainter['paint']>[0]) => {
	const painter = new PlainPainter(size);
	painter.paint(frame);
	return painter;
};

describe('PlainPainter', () => {
	it('puts the galaxy’s centre straight in front at its altitude', () => {
		const star = centroid(
			painted(makeFrame([loneStars([{ R: 0, light: 0.7 }])], { centreAltitude: 30 })).pixels,
			size
		);
		// Eight bits a channel round the light, so the middle is known to a fifth of a pixel.
		expect(Math.abs((star?.x ?? 0) - size / 2)).toBeLessThan(0.2);
		// Altitude 30° of a 180° film is at two thirds of its radius.
		expect(Math.abs((star?.y ?? 0) - (size / 2) * (5 / 3))).toBeLessThan(0.2);
	});

	it('shows a face-on star to the right where it is, and counter-clockwise turning', () => {
		const at = (azimuth: number) =>
			centroid(
				painted(
					makeFrame([loneStars([{ R: 10, azimuth, light: 4 }])], {
						inclination: 0,
						centreAltitude: 90
					})
				).pixels,
				size
			);
		const right = at(0);
		const quarter = at(Math.PI / 2);
		expect((right?.x ?? 0) - size / 2).toBeGreaterThan(30);
		expect(Math.abs((right?.y ?? 0) - size / 2)).toBeLessThan(0.2);
		// At the zenith the top of the picture is away from front: up on the film.
		expect((quarter?.y ?? 0) - size / 2).toBeLessThan(-30);
	});

	it('clears only what it painted and leaves no trace', () => {
		const painter = new PlainPainter(size);
		const sky = sampleBackground(2, 400);
		const frame = (azimuth: number) =>
			makeFrame([loneStars([{ R: 9, azimuth, light: 3 }])], {}, { background: sky });
		painter.paint(frame(0));
		for (let i = 1; i < 40; i++) painter.paint(frame(i * 0.16));
		const rect = painter.paint(frame(1));
		expect(rect.right - rect.left).toBeLessThan(size / 2);
		expect(
			Buffer.compare(
				Buffer.from(painter.pixels.buffer),
				Buffer.from(painted(frame(1)).pixels.buffer)
			)
		).toBe(0);
	});

	it('paints halves on their own side of the film', () => {
		const all = Array.from({ length: 24 }, (_, i) => ({
			R: 9,
			azimuth: (i * Math.PI) / 12,
			light: 3
		}));
		const pixels = painted(makeFrame([{ ...loneStars(all), half: 'left' }])).pixels;
		let right = 0;
		let left = 0;
		for (let at = 0; at < pixels.length; at += 4) {
			if (pixels[at] === 0) continue;
			// A star in the middle may reach one pixel over.
			if ((at / 4) % size > size / 2 + 1) right++;
			else left++;
		}
		expect(left).toBeGreaterThan(20);
		expect(right).toBe(0);
	});

	it('colours by speed with the ramp', () => {
		const rings = createRingTable(25);
		const layer = loneStars([{ R: 8, light: 0.8 }], rings);
		rings.omega.fill(300 / 8);
		const pixels = painted(makeFrame([layer], {}, { colour: 'speed' })).pixels;
		const sums = [0, 0, 0];
		for (let at = 0; at < pixels.length; at += 4)
			for (let c = 0; c < 3; c++) sums[c] += pixels[at + c];
		const top = Array.from(speedRamp.subarray(3 * 255, 3 * 256));
		expect(sums[2] / sums[0]).toBeCloseTo(top[2] / top[0], 1);
		expect(sums[1] / sums[0]).toBeCloseTo(top[1] / top[0], 1);
	});

	it('goes dark with the exposure', () => {
		const frame = makeFrame([loneStars([{ R: 8, light: 3 }])], {}, { exposure: 0 });
		expect(centroid(painted(frame).pixels, size)).toBeNull();
	});

	it('keeps a whole galaxy well under a tenth of white in the mean', () => {
		const rings = createRingTable(initialLook.outerRadius);
		const stars = sampleStars(galaxy.model, initialLook, {
			count: 100_000,
			seed: 7,
			radii: rings.radii
		});
		const pixels = painted(
			makeFrame([{ stars, rings, look: initialLook, patternAngle: 0, half: 'whole' }])
		).pixels;
		let sum = 0;
		for (let at = 0; at < pixels.length; at += 4) sum += pixels[at + 1];
		const mean = sum / (size * size) / 255;
		expect(mean).toBeGreaterThan(0.001);
		expect(mean).toBeLessThan(0.1);
	});

	it('refuses a film of a senseless size', () => {
		expect(() => new PlainPainter(7)).toThrow('16 to 8192');
		expect(() => new PlainPainter(100.5)).toThrow('16 to 8192');
	});
});

describe('the speed ramp', () => {
	it('rises in lightness all the way, so that it reads without colour', () => {
		// Relative luminance of WCAG 2.2.
		const linear = (byte: number) => {
			const c = byte / 255;
			return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
		};
		const luminance = (i: number) =>
			0.2126 * linear(speedRamp[3 * i]) +
			0.7152 * linear(speedRamp[3 * i + 1]) +
			0.0722 * linear(speedRamp[3 * i + 2]);
		for (let i = 8; i < 256; i++) expect(luminance(i)).toBeGreaterThan(luminance(i - 8));
		expect(luminance(255) / luminance(0)).toBeGreaterThan(4);
	});
});
