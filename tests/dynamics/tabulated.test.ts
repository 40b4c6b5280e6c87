import { describe, expect, test } from 'vitest';
import { massModel, type ComponentSpec } from '../../src/lib/dynamics';
import { monotoneCurve } from '../../src/lib/dynamics/components/monotoneCurve';
import { G } from '../../src/lib/units';
import { near } from './near';
import { oneComponent } from './oneComponent';

const radii = [0.5, 1, 2, 4, 8, 16];
const gas = [-4, -6, 3, 14, 20, 18];

describe('a monotone curve', () => {
	test('passes its points and makes no wave between them', () => {
		const [x, y] = [
			[0, 1, 2, 3, 4, 6],
			[0, 0, 1, 1, 5, 4]
		];
		const curve = monotoneCurve(x, y);
		const out = { value: NaN, slope: NaN };
		x.forEach((at, i) => {
			curve.at(at, out);
			near(out.value, y[i], 1e-14);
		});
		for (let i = 0; i < x.length - 1; i++) {
			const [low, high] = [Math.min(y[i], y[i + 1]), Math.max(y[i], y[i + 1])];
			for (let t = 0; t <= 1; t += 0.05) {
				curve.at(x[i] + t * (x[i + 1] - x[i]), out);
				expect(out.value).toBeGreaterThanOrEqual(low - 1e-12);
				expect(out.value).toBeLessThanOrEqual(high + 1e-12);
			}
		}
	});
	test('is exact for a straight line, at any order of asking', () => {
		const curve = monotoneCurve([0, 1, 4, 9], [1, 3, 9, 19]);
		const out = { value: NaN, slope: NaN };
		for (const at of [8.5, 0.2, 5, 0, 9, 1]) {
			curve.at(at, out);
			near(out.value, 1 + 2 * at, 1e-14);
			near(out.slope, 2, 1e-14);
		}
	});
});

describe('tabulated light', () => {
	const model = oneComponent('tabulated', { radii, speeds: gas, massToLight: 1 });

	test('gives its own speeds at the points and 0 where the pull is outward', () => {
		radii.forEach((R, i) => near(model.circularVelocity(R), Math.max(0, gas[i]), 1e-12));
		expect(model.acceleration(1, 0, { R: 0, z: 0 }).R).toBeGreaterThan(0);
		expect(model.circularFrequency(1)).toBe(0);
	});

	test('adds V|V|: an outward pull takes away from the rest', () => {
		const rest: ComponentSpec = {
			id: 'rest',
			kind: 'point-mass',
			parameters: { mass: 1e9 },
			lit: true
		};
		const own: ComponentSpec = {
			id: 'gas',
			kind: 'tabulated',
			parameters: { radii, speeds: gas, massToLight: 1 },
			lit: true
		};
		const both = massModel({ components: [rest, own] });
		// By hand: G 1e9/1 − 6² and G 1e9/8 + 20².
		near(both.circularVelocity(1), Math.sqrt(G * 1e9 - 36), 1e-12);
		near(both.circularVelocity(8), Math.sqrt((G * 1e9) / 8 + 400), 1e-12);
	});

	test('scales with the square root of the mass-to-light ratio', () => {
		const heavy = oneComponent('tabulated', { radii, speeds: gas, massToLight: 2.25 });
		for (const R of [2, 3.3, 8, 40]) {
			near(heavy.circularVelocity(R), 1.5 * model.circularVelocity(R), 1e-12);
		}
	});

	test('is a point mass beyond its last point', () => {
		for (const R of [16, 20, 100, 1e4]) {
			near(model.circularVelocity(R), 18 * Math.sqrt(16 / R), 1e-12);
			near(model.potential(R, 0), (-324 * 16) / R, 1e-12);
			near(model.enclosedMass(R), (324 * 16) / G, 1e-12);
		}
	});

	test('its pull is minus the gradient of its potential, and κ² is R dΩ²/dR + 4Ω²', () => {
		for (const R of [0.3, 0.8, 2.6, 6, 12]) {
			const h = 1e-4 * R;
			const slope = (model.potential(R + h, 0) - model.potential(R - h, 0)) / (2 * h);
			near(model.acceleration(R, 0, { R: 0, z: 0 }).R, -slope, 1e-5, `at ${R}`);
			const sums = (r: number) => {
				const out = { omega: 0, kappa: 0, nu: 0 };
				model.addFrequenciesSquared(r, 0, out);
				return out;
			};
			const change = (sums(R + h).omega - sums(R - h).omega) / (2 * h);
			near(sums(R).kappa, R * change + 4 * sums(R).omega, 1e-5, `κ² at ${R}`);
		}
	});

	test('a finely tabulated sphere is that sphere', () => {
		const sphere = oneComponent('plummer', { mass: 1e10, scaleLength: 1 });
		const fine = Array.from({ length: 400 }, (_, i) => 0.05 * (i + 1));
		const table = oneComponent('tabulated', {
			radii: fine,
			speeds: fine.map((R) => sphere.circularVelocity(R)),
			massToLight: 1
		});
		for (const R of [0.33, 1.01, 2.5, 7.77, 15]) {
			near(table.circularVelocity(R), sphere.circularVelocity(R), 1e-5);
			near(table.epicycleFrequency(R), sphere.epicycleFrequency(R), 1e-3);
			near(table.enclosedMass(R), sphere.enclosedMass(R), 5e-5);
		}
	});

	test.each([
		[{ radii: [1, 2], speeds: [3] }, /speeds.*has 1 numbers|list of 2/],
		[{ radii: [2, 1], speeds: [3, 4] }, /above the one before/],
		[
			{ radii: [1, 2], speeds: [3, 4000] },
			/number 2: allowed are numbers from -2000 to 2000 km\/s/
		],
		[{ radii: 'many', speeds: [3, 4] }, /radii.*must be a list of 2 to 5000/]
	])('%j is refused by name', (lists, why) => {
		expect(() => oneComponent('tabulated', { massToLight: 1, ...lists })).toThrow(why);
	});
});
