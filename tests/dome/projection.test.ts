import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	altAzFromDirection,
	angleBetween,
	directionFromAltAz,
	directionFromFilm,
	domeProjection,
	filmFromDirection,
	inSafeBand
} from '../../src/lib/dome';

const film = (tilt: number, aperture: number, altitude: number, azimuth: number) =>
	filmFromDirection(
		domeProjection({ apertureDegrees: aperture, tiltDegrees: tilt }),
		directionFromAltAz({ altitude, azimuth }, { x: 0, y: 0, z: 0 }),
		{ x: 0, y: 0 }
	);

const geometry = fc.record({
	apertureDegrees: fc.double({ min: 90, max: 230, noNaN: true }),
	tiltDegrees: fc.double({ min: 0, max: 45, noNaN: true })
});

describe('filmFromDirection', () => {
	it.each([
		// Tilt, aperture, altitude, azimuth, film x, film y: worked by hand.
		['the zenith in the middle', 0, 180, 90, 0, 0, 0],
		['the front horizon at the bottom', 0, 180, 0, 0, 0, 1],
		['the right horizon at the right', 0, 180, 0, 90, 1, 0],
		['the back horizon at the top', 0, 180, 0, 180, 0, -1],
		['the front horizon of a dome tilted by 30 degrees inside the rim', 30, 180, 0, 0, 0, 2 / 3],
		['the zenith of a dome tilted by 30 degrees toward the back', 30, 180, 90, 0, 0, -1 / 3],
		['the horizon of a 220 degree film inside its rim', 0, 220, 0, 90, 90 / 110, 0]
	])('puts %s', (_, tilt, aperture, altitude, azimuth, x, y) => {
		const point = film(tilt, aperture, altitude, azimuth);
		expect(point.x).toBeCloseTo(x, 12);
		expect(point.y).toBeCloseTo(y, 12);
	});

	it.each([
		// r = (90° − altitude) / 90°, trade handbook values for a 180° film.
		[10, 0.889],
		[30, 0.667],
		[45, 0.5],
		[60, 0.333]
	])('puts altitude %d° at radius %d', (altitude, r) => {
		expect(film(0, 180, altitude, 0).y).toBeCloseTo(r, 3);
	});

	it('goes there and back for every dome', () => {
		fc.assert(
			fc.property(
				geometry,
				fc.double({ min: 0, max: 1, noNaN: true }),
				fc.double({ min: 0, max: 2 * Math.PI, noNaN: true }),
				(dome, r, angle) => {
					const projection = domeProjection(dome);
					const point = { x: r * Math.cos(angle), y: r * Math.sin(angle) };
					const direction = directionFromFilm(projection, point, { x: 0, y: 0, z: 0 });
					expect(Math.hypot(direction.x, direction.y, direction.z)).toBeCloseTo(1, 12);
					const back = filmFromDirection(projection, direction, { x: 0, y: 0 });
					expect(Math.abs(back.x - point.x)).toBeLessThan(1e-9);
					expect(Math.abs(back.y - point.y)).toBeLessThan(1e-9);
				}
			)
		);
	});

	it('keeps angles from the dome axis', () => {
		fc.assert(
			fc.property(geometry, fc.double({ min: 0, max: 1, noNaN: true }), (dome, r) => {
				const projection = domeProjection(dome);
				const at = (x: number) => directionFromFilm(projection, { x, y: 0 }, { x: 0, y: 0, z: 0 });
				expect(angleBetween(at(0), at(r))).toBeCloseTo((r * dome.apertureDegrees) / 2, 5);
			})
		);
	});
});

describe('altAzFromDirection', () => {
	it('goes there and back', () => {
		fc.assert(
			fc.property(
				fc.double({ min: -89.9, max: 89.9, noNaN: true }),
				fc.double({ min: -179.9, max: 179.9, noNaN: true }),
				(altitude, azimuth) => {
					const direction = directionFromAltAz({ altitude, azimuth }, { x: 0, y: 0, z: 0 });
					const back = altAzFromDirection(direction, { altitude: 0, azimuth: 0 });
					expect(Math.abs(back.altitude - altitude)).toBeLessThan(1e-9);
					expect(Math.abs(back.azimuth - azimuth)).toBeLessThan(1e-9);
				}
			)
		);
	});
	it('gives the zenith azimuth 0', () => {
		expect(altAzFromDirection({ x: 0, y: 0, z: 1 }, { altitude: 0, azimuth: 9 })).toEqual({
			altitude: 90,
			azimuth: 0
		});
	});
});

describe('inSafeBand', () => {
	it('holds azimuth ±50° and altitude 10° to 60°', () => {
		expect(inSafeBand({ altitude: 10, azimuth: -50 })).toBe(true);
		expect(inSafeBand({ altitude: 60, azimuth: 50 })).toBe(true);
		expect(inSafeBand({ altitude: 9.9, azimuth: 0 })).toBe(false);
		expect(inSafeBand({ altitude: 30, azimuth: 50.1 })).toBe(false);
	});
});
