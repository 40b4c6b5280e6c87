import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { directionFromFilm, domeProjection, filmFromDirection } from '../../src/lib/dome';
import { makeCamera, setCamera } from '../../src/lib/picture/camera';
import { FilmCamera } from '../../src/lib/picture/filmCamera';
import type { View } from '../../src/lib/picture/frame';

const view = (more: Partial<View>): View => ({
	distance: 10,
	inclination: 0,
	turn: 0,
	centreAltitude: 0,
	...more
});

/** A galaxy point (kpc) as the eye sees it: right, front, up; rounded to the digits that matter. */
function seen(v: View, [x, y, z]: [number, number, number]): number[] {
	const { matrix: m, shift } = setCamera(v, makeCamera());
	return [0, 1, 2].map((row) => {
		const value = m[3 * row] * x + m[3 * row + 1] * y + m[3 * row + 2] * z + shift[row];
		return Math.round(value * 1e12) / 1e12 + 0;
	});
}

describe('setCamera', () => {
	it.each<[string, Partial<View>, [number, number, number], [number, number, number]]>([
		// View, galaxy point, and by hand: right, front, up.
		['the centre straight in front', {}, [0, 0, 0], [0, 10, 0]],
		['the centre at its altitude', { centreAltitude: 90 }, [0, 0, 0], [0, 0, 10]],
		['face-on, x to the right', {}, [1, 0, 0], [1, 10, 0]],
		['face-on, y up', {}, [0, 1, 0], [0, 10, 1]],
		['face-on, the pole toward the eye', {}, [0, 0, 1], [0, 9, 0]],
		['edge-on, the pole up', { inclination: 90 }, [0, 0, 1], [0, 10, 1]],
		['edge-on, y away from the eye', { inclination: 90 }, [0, 1, 0], [0, 11, 0]],
		['edge-on, x still to the right', { inclination: 90 }, [1, 0, 0], [1, 10, 0]],
		['turned by a quarter, x up', { turn: 90 }, [1, 0, 0], [0, 10, 1]],
		['turned by a quarter, y to the left', { turn: 90 }, [0, 1, 0], [-1, 10, 0]],
		['at the zenith, y toward the back', { centreAltitude: 90 }, [0, 1, 0], [0, -1, 10]]
	])('shows %s', (_, v, point, expected) => {
		expect(seen(view(v), point)).toEqual(expected);
	});

	it('turns without stretching or mirroring, for every view', () => {
		const angle = (min: number, max: number) => fc.double({ min, max, noNaN: true });
		fc.assert(
			fc.property(angle(0, 180), angle(-180, 180), angle(0, 90), (inclination, turn, altitude) => {
				const { matrix: m } = setCamera(
					view({ inclination, turn, centreAltitude: altitude }),
					makeCamera()
				);
				const dot = (a: number, b: number) =>
					m[a] * m[b] + m[a + 1] * m[b + 1] + m[a + 2] * m[b + 2];
				for (const [a, b] of [
					[0, 3],
					[0, 6],
					[3, 6]
				])
					expect(Math.abs(dot(a, b))).toBeLessThan(1e-12);
				for (const a of [0, 3, 6]) expect(Math.abs(dot(a, a) - 1)).toBeLessThan(1e-12);
				const volume =
					m[0] * (m[4] * m[8] - m[5] * m[7]) -
					m[1] * (m[3] * m[8] - m[5] * m[6]) +
					m[2] * (m[3] * m[7] - m[4] * m[6]);
				expect(Math.abs(volume - 1)).toBeLessThan(1e-12);
			})
		);
	});
});

describe('FilmCamera', () => {
	it('leads to the same film point as the room’s camera and the dome’s projection', () => {
		const geometry = { apertureDegrees: 210, tiltDegrees: 25 };
		const v = view({ distance: 30, inclination: 55, turn: 40, centreAltitude: 35 });
		const camera = new FilmCamera();
		camera.set(v, geometry);
		const { matrix: m, shift: t, rim } = camera;
		const axial = [0, 3, 6].map((r, i) => m[r] * 4 + m[r + 1] * -7 + m[r + 2] * 0.5 + t[i]);
		const across = Math.hypot(axial[0], axial[1]);
		const share = Math.atan2(across, axial[2]) / rim / across;
		const room = seen(v, [4, -7, 0.5]);
		const length = Math.hypot(...room);
		const film = filmFromDirection(
			domeProjection(geometry),
			{ x: room[0] / length, y: room[1] / length, z: room[2] / length },
			{ x: 0, y: 0 }
		);
		expect(axial[0] * share).toBeCloseTo(film.x, 10);
		expect(axial[1] * share).toBeCloseTo(film.y, 10);
		const back = directionFromFilm(domeProjection(geometry), film, { x: 0, y: 0, z: 0 });
		expect(back.z * length).toBeCloseTo(room[2], 10);
	});
});
