import { describe, expect, it } from 'vitest';
import { massModel } from '../../src/lib/dynamics';
import { GalaxyPicture } from '../../src/lib/picture/galaxyPicture';
import { initialLook, type GalaxyDocument } from '../../src/lib/show/galaxy';
import { TICKS_PER_SECOND, timeFromMyr } from '../../src/lib/units';

const document: GalaxyDocument = {
	version: 1,
	name: 'Test',
	model: {
		components: [
			{
				id: 'stars',
				kind: 'exponential-disk',
				parameters: { surfaceDensity: 5e8, scaleLength: 2.8 },
				lit: true
			},
			{ id: 'halo', kind: 'nfw', parameters: { density: 1e7, scaleRadius: 18 }, lit: false }
		]
	},
	look: initialLook,
	sources: '',
	readingRadius: 8
};
const withHalo = (density: number): GalaxyDocument => ({
	...document,
	model: {
		components: document.model.components.map((c) =>
			c.lit ? c : { ...c, parameters: { ...c.parameters, density } }
		)
	}
});
const withScale = (scaleLength: number): GalaxyDocument => ({
	...document,
	model: {
		components: document.model.components.map((c) =>
			c.lit ? { ...c, parameters: { ...c.parameters, scaleLength } } : c
		)
	}
});
const view = { distance: 30, inclination: 35, turn: 0, centreAltitude: 90 };
const geometry = { apertureDegrees: 90, tiltDegrees: 0 };
const options = { seed: 7, starCount: 2000, ringCount: 128 };
const frameOf = (picture: GalaxyPicture) => picture.frame(geometry, view, 'light');

describe('GalaxyPicture', () => {
	it('turns every ring by its own speed', () => {
		const picture = new GalaxyPicture(document, options);
		picture.advance(90, 4);
		const model = massModel(document.model);
		const { radii, phase } = picture.rings;
		const time = (90 / TICKS_PER_SECOND) * timeFromMyr(4);
		for (let k = 0; k < radii.length; k++) {
			const expected = model.circularFrequency(radii[k]) * time;
			expect(Math.abs(phase[k] - expected)).toBeLessThan(1e-9 * expected);
		}
	});

	it('takes a new halo without moving a star, and goes on at the new speeds', () => {
		const picture = new GalaxyPicture(document, options);
		picture.advance(600, 5);
		const [before] = frameOf(picture).layers;
		const phases = before.rings.phase.slice();
		const slow = before.rings.omega[100];
		picture.setDocument(withHalo(4e7));
		picture.settle();
		const [after] = frameOf(picture).layers;
		expect(after.stars).toBe(before.stars);
		expect([...after.rings.phase]).toEqual([...phases]);
		expect(after.rings.omega[100]).toBeGreaterThan(1.2 * slow);
	});

	it('places stars anew only when told, each ring keeping its angle', () => {
		const picture = new GalaxyPicture(document, options);
		picture.advance(600, 5);
		const { stars } = frameOf(picture).layers[0];
		const phases = picture.rings.phase.slice();
		picture.setDocument(withScale(4));
		expect(picture.settled).toBe(false);
		expect(frameOf(picture).layers[0].stars).toBe(stars);
		picture.settle();
		expect(picture.settled).toBe(true);
		expect(frameOf(picture).layers[0].stars).not.toBe(stars);
		expect([...picture.rings.phase]).toEqual([...phases]);
	});

	it('keeps the angle of a radius when the galaxy is drawn further out', () => {
		const picture = new GalaxyPicture(document, options);
		picture.advance(600, 5);
		const at = (R: number) => {
			const { radii, phase } = picture.rings;
			const k = radii.findIndex((r) => r > R);
			const share = (R - radii[k - 1]) / (radii[k] - radii[k - 1]);
			return phase[k - 1] + share * (phase[k] - phase[k - 1]);
		};
		const before = at(8);
		picture.setDocument({ ...document, look: { ...document.look, outerRadius: 40 } });
		picture.settle();
		expect(Math.abs(at(8) - before)).toBeLessThan(0.002 * before);
	});

	it('refuses a model that cannot be computed and stays as it was', () => {
		const picture = new GalaxyPicture(document, options);
		const omega = picture.rings.omega.slice();
		expect(() => picture.setDocument(withHalo(-1))).toThrow('density');
		expect([...picture.rings.omega]).toEqual([...omega]);
		expect(picture.settled).toBe(true);
	});

	it('without lit matter there is no star, and none is asked for', () => {
		const picture = new GalaxyPicture(
			{ ...document, model: { components: document.model.components.slice(1) } },
			options
		);
		expect(frameOf(picture).layers).toEqual([]);
	});
});
