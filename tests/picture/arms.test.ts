import { describe, expect, it } from 'vitest';
import { massModel } from '../../src/lib/dynamics';
import { PlainPainter } from '../../src/lib/picture/plainPainter';
import { initialLook } from '../../src/lib/show/galaxy';
import { advance, armPhase, createRingTable, sampleStars, setModel } from '../../src/lib/starfield';
import { timeFromMyr } from '../../src/lib/units';
import { galaxy } from '../show/support/content';
import { centroid, loneStars, makeFrame } from './support';

const size = 512;
const view = { inclination: 0, centreAltitude: 90, distance: 30 };
const { arms, patternSpeed } = initialLook.spiral;
const model = massModel(galaxy.model);
const rings = createRingTable(initialLook.outerRadius);
setModel(rings, model);
const stars = sampleStars(galaxy.model, initialLook, {
	count: 40_000,
	seed: 7,
	radii: rings.radii
});

/**
 * Mean arm phase of a painted galaxy's light between two radii, and how sharply it stands there: 1
 * were all light on the ridges, about 0 where the light follows no such spiral.
 * @param sense 1 for the galaxy's own spiral, −1 for its mirror image
 */
function spiralOnFilm(pixels: ArrayLike<number>, [from, to]: number[], sense: 1 | -1 = 1) {
	let [cosine, sine, light] = [0, 0, 0];
	for (let j = 0; j < size; j++) {
		for (let i = 0; i < size; i++) {
			const x = i + 0.5 - size / 2;
			const y = size / 2 - j - 0.5;
			const R = view.distance * Math.tan((Math.hypot(x, y) / (size / 2)) * (Math.PI / 2));
			if (R < from || R > to) continue;
			const phase = armPhase(initialLook, R, sense * Math.atan2(y, x));
			// Blue, where the young stars are.
			const w = pixels[4 * (j * size + i) + 2];
			cosine += w * Math.cos(phase);
			sine += w * Math.sin(phase);
			light += w;
		}
	}
	return { phase: Math.atan2(sine, cosine), sharpness: Math.hypot(cosine, sine) / light };
}

describe('the density wave on the painted film', () => {
	it('turns at its own speed and stays as sharp: arms do not wind up', () => {
		const painter = new PlainPainter(size);
		for (const myr of [0, 200, 600, 1500]) {
			const time = timeFromMyr(myr);
			rings.phase.fill(0);
			advance(rings, time);
			const patternAngle = patternSpeed * time;
			painter.paint(
				makeFrame([{ stars, rings, look: initialLook, patternAngle, half: 'whole' }], view)
			);
			for (const [from, to] of [
				[4, 8],
				[8, 14]
			]) {
				const where = `after ${myr} Myr, ${from} to ${to} kpc`;
				const { phase, sharpness } = spiralOnFilm(painter.pixels, [from, to]);
				const mirrored = spiralOnFilm(painter.pixels, [from, to], -1).sharpness;
				const off = Math.atan2(
					Math.sin(phase - arms * patternAngle),
					Math.cos(phase - arms * patternAngle)
				);
				expect(sharpness, where).toBeGreaterThan(0.1);
				expect(mirrored, where).toBeLessThan(0.06);
				// The dust on the inner edge moves the middle of the light a little outward.
				expect(Math.abs(off), `off by ${off} ${where}`).toBeLessThan(0.4);
			}
		}
		// In that time the stars themselves have wound the two radii apart by whole turns.
		expect(rings.phase[300] - rings.phase[700]).toBeGreaterThan(4 * Math.PI);
	}, 60_000);

	it('lets stars stream through: one star lights up in an arm and fades between', () => {
		const layer = { ...loneStars([{ R: 8, light: 0.3 }]), look: { ...initialLook, dust: 0 } };
		layer.stars.population[0] = 2;
		const painter = new PlainPainter(size);
		const lights = Array.from({ length: 24 }, (_, i) => {
			layer.rings.phase.fill((i * Math.PI) / 12);
			painter.paint(makeFrame([layer], view));
			return centroid(painter.pixels, size)?.light ?? 0;
		});
		expect(Math.max(...lights)).toBeGreaterThan(3 * Math.min(...lights));
		// Twice bright in one turn about a galaxy of two arms.
		const middle = (Math.max(...lights) + Math.min(...lights)) / 2;
		const entries = lights.filter((l, i) => l > middle && lights[(i + 23) % 24] <= middle);
		expect(entries.length).toBe(arms);
	});
});
