import { describe, expect, it } from 'vitest';
import { directionFromFilm, domeProjection } from '../../src/lib/dome';
import { massModel } from '../../src/lib/dynamics';
import { makeCamera, setCamera } from '../../src/lib/picture/camera';
import { PlainPainter } from '../../src/lib/picture/plainPainter';
import { advance, createRingTable, setModel } from '../../src/lib/starfield';
import { timeFromMyr } from '../../src/lib/units';
import { galaxy } from '../show/support/content';
import { centroid, loneStars, makeFrame } from './support';

const size = 2048;

/** From a pixel of the film back to an azimuth in the galaxy's plane: film, sky, ray, plane z = 0. */
function azimuthInPlane(
	pixel: { x: number; y: number },
	frame: ReturnType<typeof makeFrame>
): number {
	const film = { x: (2 * pixel.x) / size - 1, y: (2 * pixel.y) / size - 1 };
	const ray = directionFromFilm(domeProjection(frame.geometry), film, { x: 0, y: 0, z: 0 });
	const { matrix: m, shift: t } = setCamera(frame.view, makeCamera());
	// p = Mᵀ (s d − t); z = 0 gives s.
	const back = (v: readonly number[]) => [
		m[0] * v[0] + m[3] * v[1] + m[6] * v[2],
		m[1] * v[0] + m[4] * v[1] + m[7] * v[2],
		m[2] * v[0] + m[5] * v[1] + m[8] * v[2]
	];
	const d = back([ray.x, ray.y, ray.z]);
	const eye = back([t[0], t[1], t[2]]);
	const s = eye[2] / d[2];
	return Math.atan2(s * d[1] - eye[1], s * d[0] - eye[0]);
}

describe('a star on the painted film', () => {
	const whole = massModel(galaxy.model);
	it.each([
		['with the halo', whole],
		['without the halo', whole.lit()]
	])(
		'at 8 kpc turns at the computed angular speed within 0.5 % %s',
		(_, model) => {
			const rings = createRingTable(25);
			setModel(rings, model);
			const frame = makeFrame(
				[loneStars([{ R: 8, light: 4 }], rings)],
				{ inclination: 35, turn: 20 },
				{
					geometry: { apertureDegrees: 200, tiltDegrees: 12 }
				}
			);
			const painter = new PlainPainter(size);
			const tick = timeFromMyr(4) / 60;
			let turned = 0;
			let last: number | null = null;
			const ticks = 1800;
			for (let i = 0; i <= ticks; i += 60) {
				painter.paint(frame);
				const star = centroid(painter.pixels, size);
				if (!star) throw new Error('no star on the film');
				const azimuth = azimuthInPlane(star, frame);
				if (last !== null) turned += ((azimuth - last + 3 * Math.PI) % (2 * Math.PI)) - Math.PI;
				last = azimuth;
				advance(rings, 60 * tick);
			}
			const measured = turned / (ticks * tick);
			const computed = model.circularFrequency(8);
			expect(turned).toBeGreaterThan(1.5);
			expect(Math.abs(measured / computed - 1)).toBeLessThan(0.005);
		},
		60_000
	);

	it('turns measurably slower without the halo', () => {
		expect(whole.lit().circularFrequency(8) / whole.circularFrequency(8)).toBeLessThan(0.95);
	});
});
