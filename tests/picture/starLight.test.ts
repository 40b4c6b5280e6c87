import { describe, expect, it } from 'vitest';
import { FilmCamera } from '../../src/lib/picture/filmCamera';
import { lightIndex, lightTables, starGain, tableSize } from '../../src/lib/picture/starLight';
import { makeViewLight, setViewLight } from '../../src/lib/picture/viewLight';
import { initialLook } from '../../src/lib/show/galaxy';
import { populations, type GalaxyLook } from '../../src/lib/starfield';
import { loneStars, makeFrame } from './support';

const at = (look: GalaxyLook, population: (typeof populations)[number], phase: number) =>
	lightTables(look)[
		populations.indexOf(population) * tableSize + lightIndex(Math.cos(phase), Math.sin(phase))
	];

describe('lightTables', () => {
	it('lights young stars on the ridge of an arm and hardly between', () => {
		expect(at(initialLook, 'arm', 0)).toBeGreaterThan(3 * at(initialLook, 'arm', Math.PI));
		expect(at(initialLook, 'disc', 0)).toBeGreaterThan(1.3 * at(initialLook, 'disc', Math.PI));
		expect(at(initialLook, 'disc', Math.PI)).toBeGreaterThan(at(initialLook, 'arm', Math.PI));
	});
	it('shows gas clouds in the arms only', () => {
		const strong = { ...initialLook, spiral: { ...initialLook.spiral, strength: 1 } };
		expect(at(strong, 'gas-cloud', 0)).toBeGreaterThan(0.9);
		expect(at(strong, 'gas-cloud', 2)).toBeLessThan(0.01);
	});
	it('darkens the inner edge by dust, and that edge only', () => {
		for (const population of ['disc', 'arm'] as const) {
			const clear = { ...initialLook, dust: 0 };
			expect(at(initialLook, population, -1.05) / at(clear, population, -1.05)).toBeLessThan(0.5);
			expect(at(initialLook, population, 1.05)).toBeCloseTo(at(clear, population, 1.05), 6);
			expect(at(clear, population, -1.05)).toBeCloseTo(at(clear, population, 1.05), 6);
		}
	});
	it('leaves a galaxy without arms even', () => {
		const even = { ...initialLook, spiral: { ...initialLook.spiral, arms: 0 } };
		expect(lightTables(even).every((light) => light === 1)).toBe(true);
	});
	it('never gives more than the light of the star nor less than none', () => {
		for (const light of lightTables({ ...initialLook, dust: 1 })) {
			expect(light).toBeGreaterThanOrEqual(0);
			expect(light).toBeLessThanOrEqual(1);
		}
	});
});

describe('starGain', () => {
	it('gives each star more where they are few or the film is large', () => {
		expect(starGain(2048, 20_000)).toBeGreaterThan(starGain(2048, 100_000));
		expect(starGain(4096, 100_000)).toBeGreaterThan(starGain(2048, 100_000));
	});
});

describe('setViewLight', () => {
	const lit = (inclination: number, dust = 1, colour: 'light' | 'speed' = 'light') => {
		const layer = { ...loneStars([{ R: 8 }]), look: { ...initialLook, dust } };
		const frame = makeFrame([layer], { inclination }, { colour });
		const camera = new FilmCamera();
		camera.set(frame.view, frame.geometry);
		return setViewLight(camera, frame, layer, 2048, makeViewLight());
	};
	it('hides much behind the dust edge-on and little face-on', () => {
		expect(lit(0).screen).toBeCloseTo(Math.exp(-0.16), 6);
		expect(lit(60).screen).toBeCloseTo(Math.exp(-0.32), 6);
		expect(lit(90).screen).toBeLessThan(0.2);
		expect(lit(90, 0).screen).toBe(1);
	});
	it('knows the side of the eye: beyond 90 degrees it looks from below', () => {
		expect(lit(30).side).toBe(1);
		expect(lit(150).side).toBe(-1);
		expect(lit(150).faceZ).toBe(-lit(30).faceZ);
		// At 45° the line of sight leans one kpc for each kpc of height.
		expect(Math.hypot(lit(45).leanX, lit(45).leanY)).toBeCloseTo(1, 6);
	});
	it('dims a disc seen edge-on, more than a bulge', () => {
		const [face, edge] = [lit(0), lit(90)];
		const bulge = edge.gains[0] / face.gains[0];
		const disc = edge.gains[1] / face.gains[1];
		expect(disc).toBeLessThan(0.4);
		expect(bulge).toBeGreaterThan(2 * disc);
	});
	it('keeps light back where colour tells speed', () => {
		expect(lit(0, 1, 'speed').gains[1]).toBeLessThan(lit(0).gains[1]);
	});
});
