import { describe, expect, it } from 'vitest';
import { massModel } from '../../src/lib/dynamics';
import { initialLook } from '../../src/lib/show/galaxy';
import {
	advance,
	armPhase,
	createRingTable,
	populations,
	ringOf,
	sampleBackground,
	sampleStars,
	seededRandom,
	setModel,
	temperatureColour
} from '../../src/lib/starfield';
import { galaxy } from '../show/support/content';

const stars = sampleStars(galaxy.model, initialLook, { count: 20_000, seed: 5 });
const radius = (i: number) => Math.hypot(stars.x0[i], stars.y0[i]);
const indices = Array.from({ length: stars.count }, (_, i) => i);

describe('sampleStars', () => {
	it('gives the same sky for the same seed and another for another', () => {
		const [first, again, other] = [5, 5, 6].map((seed) =>
			sampleStars(galaxy.model, initialLook, { count: 2000, seed })
		);
		expect(again).toEqual(first);
		expect(other.x0).not.toEqual(first.x0);
	});
	it('sorts by ring, and ringStart names the first of each', () => {
		const { radii } = createRingTable(initialLook.outerRadius);
		expect(stars.ringStart[radii.length]).toBe(stars.count);
		for (let k = 0; k < radii.length; k++) {
			for (let i = stars.ringStart[k]; i < stars.ringStart[k + 1]; i++)
				expect(stars.ring[i]).toBe(k);
		}
		for (const i of indices.slice(0, 2000)) expect(stars.ring[i]).toBe(ringOf(radii, radius(i)));
	});
	it('keeps to the outer radius and lies in a flat disc', () => {
		for (const i of indices) expect(radius(i)).toBeLessThanOrEqual(initialLook.outerRadius);
		const far = indices
			.filter((i) => radius(i) > 5 && populations[stars.population[i]] !== 'bulge')
			.map((i) => Math.abs(stars.z[i]));
		const mean = far.reduce((a, b) => a + b, 0) / far.length;
		expect(mean).toBeGreaterThan(0.05);
		expect(mean).toBeLessThan(0.4);
	});
	it('has every population, and gas clouds as many as asked for', () => {
		const counts = populations.map(
			(_, p) => indices.filter((i) => stars.population[i] === p).length
		);
		for (const count of counts) expect(count).toBeGreaterThan(0);
		expect(counts[3]).toBe(initialLook.gasClouds);
	});
	it('gives a galaxy without a bulge no bulge stars, and fades at the rim', () => {
		const discOnly = { components: galaxy.model.components.filter((c) => c.id === 'disc') };
		const flat = sampleStars(discOnly, initialLook, { count: 4000, seed: 5 });
		expect(flat.population.includes(populations.indexOf('bulge'))).toBe(false);
		const { outerRadius } = initialLook;
		const between = (from: number, to: number) =>
			indices.filter((i) => radius(i) > from * outerRadius && radius(i) < to * outerRadius).length;
		expect(between(0.95, 1)).toBeLessThan(between(0.85, 0.9) / 1.5);
	});
	it('follows lit matter only', () => {
		const dark = { components: galaxy.model.components.filter((c) => !c.lit) };
		expect(() => sampleStars(dark, initialLook, { count: 10, seed: 1 })).toThrow('lit component');
		const halved = {
			components: galaxy.model.components.map((c) => (c.lit ? c : { ...c, factor: 0.5 }))
		};
		const few = { count: 2000, seed: 5 };
		expect(sampleStars(halved, initialLook, few)).toEqual(
			sampleStars(galaxy.model, initialLook, few)
		);
	});
	it('thins out with radius', () => {
		const within = (a: number, b: number) =>
			indices.filter((i) => radius(i) >= a && radius(i) < b).length / (b * b - a * a);
		expect(within(0, 2)).toBeGreaterThan(within(4, 6));
		expect(within(4, 6)).toBeGreaterThan(within(10, 14));
		expect(within(10, 14)).toBeGreaterThan(within(18, 24));
	});
});

describe('armPhase', () => {
	it('trails: the ridge lags behind as the radius grows', () => {
		const ridge = (R: number) => -armPhase(initialLook, R, 0) / initialLook.spiral.arms;
		expect(ridge(10)).toBeLessThan(ridge(5));
		// A logarithmic spiral keeps its pitch: tan(pitch) = dR / (R dφ).
		const pitch = Math.atan(Math.log(10 / 5) / (ridge(5) - ridge(10)));
		expect((pitch * 180) / Math.PI).toBeCloseTo(initialLook.spiral.pitchDegrees, 10);
	});
});

describe('the ring table', () => {
	const table = createRingTable(25);
	it('puts a star at 8 kpc on a ring less than 0.2 % off its speed', () => {
		const k = ringOf(table.radii, 8);
		const spacing = table.radii[k + 1] - table.radii[k - 1];
		expect(spacing / 4 / 8).toBeLessThan(0.002);
		expect(table.radii[0]).toBeGreaterThan(0);
		expect(table.radii.every((R, i) => i === 0 || R > table.radii[i - 1])).toBe(true);
	});
	it('goes on from its angles when the model changes', () => {
		const model = massModel(galaxy.model);
		setModel(table, model);
		advance(table, 0.1);
		const before = table.phase.slice();
		setModel(table, model.lit());
		expect(table.phase).toEqual(before);
		advance(table, 0.1);
		const k = ringOf(table.radii, 8);
		const expected =
			0.1 *
			(model.circularFrequency(table.radii[k]) + model.lit().circularFrequency(table.radii[k]));
		expect(table.phase[k]).toBeCloseTo(expected, 12);
	});
	it('stands still where the net pull is outward', () => {
		setModel(table, { circularFrequency: () => NaN });
		expect(table.omega.every((omega) => omega === 0)).toBe(true);
	});
});

describe('sampleBackground', () => {
	it('spreads unit vectors evenly', () => {
		const sky = sampleBackground(3, 4000);
		let up = 0;
		for (let i = 0; i < sky.count; i++) {
			const [x, y, z] = sky.directions.subarray(3 * i, 3 * i + 3);
			expect(Math.hypot(x, y, z)).toBeCloseTo(1, 5);
			if (z > 0) up++;
		}
		// Half of 4,000 within five standard deviations (32 each).
		expect(Math.abs(up - 2000)).toBeLessThan(160);
	});
});

describe('seededRandom', () => {
	it('has the mean and the spread of a uniform and of a normal stream', () => {
		const random = seededRandom(11);
		const many = Array.from({ length: 20_000 }, () => random.next());
		const mean = many.reduce((a, b) => a + b) / many.length;
		expect(Math.abs(mean - 0.5)).toBeLessThan(0.01);
		const normals = Array.from({ length: 20_000 }, () => random.normal());
		const variance = normals.reduce((sum, x) => sum + x * x, 0) / normals.length;
		expect(Math.abs(variance - 1)).toBeLessThan(0.05);
	});
});

describe('temperatureColour', () => {
	it('goes from orange over white to blue', () => {
		const [cool, white, hot] = [3500, 6600, 15000].map(temperatureColour);
		expect(cool[0]).toBe(255);
		expect(cool[2]).toBeLessThan(170);
		// Near 6,600 K a black body has the colour of the sRGB white point, D65.
		expect(Math.min(...white)).toBeGreaterThan(240);
		expect(hot[2]).toBe(255);
		expect(hot[0]).toBeLessThan(200);
	});
});
