import { describe, expect, test } from 'vitest';
import { accelerationScale, gravityLaws, massModel } from '../../src/lib/dynamics';
import { pullUnder } from '../../src/lib/dynamics/laws';
import type { ComponentSpec, GravityLaw } from '../../src/lib/dynamics/types';
import { G } from '../../src/lib/units';
import { near } from './near';

const a = accelerationScale;
const lit: ComponentSpec[] = [
	{ id: 'bulge', kind: 'hernquist', parameters: { mass: 8e9, scaleLength: 0.5 }, lit: true },
	{
		id: 'disc',
		kind: 'miyamoto-nagai',
		parameters: { mass: 6e10, scaleLength: 3, scaleHeight: 0.3 },
		lit: true
	}
];
const others = gravityLaws.map(({ law }) => law).filter((law) => law !== 'newton');
const pull = (law: GravityLaw, newton: number) =>
	pullUnder(law, newton, { pull: 0, slope: 0 }).pull;

test('1.2e-10 m/s² is 3702.81 (km/s)²/kpc', () => {
	// By hand: 1.2e-10 × 3.0856775814913673e19 / 1e6, the IAU parsec.
	near(a, 3702.8130977896406, 1e-12);
});

describe('closed values where the pull is the scale itself', () => {
	test.each<[GravityLaw, number]>([
		// 1/(1 − 1/e); the golden ratio from g² = g + 1; √((1 + √5)/2) from g⁴ = g² + 1.
		['radial-acceleration', 1 / (1 - Math.exp(-1))],
		['modified-simple', (1 + Math.sqrt(5)) / 2],
		['modified-standard', Math.sqrt((1 + Math.sqrt(5)) / 2)]
	])('%s', (law, times) => near(pull(law, a), times * a, 1e-14));
});

describe.each(others)('%s', (law) => {
	const model = massModel({ components: lit, law });
	const newton = massModel({ components: lit });

	test('strong pulls are Newton’s, weak ones go as √(gN a)', () => {
		near(pull(law, 1e4 * a), 1e4 * a, 2e-4);
		near(pull(law, 1e-8 * a), 1e-4 * a, 1e-3);
	});

	test('the slope is the derivative of the pull', () => {
		for (const x of [1e-6, 1e-3, 0.1, 1, 7, 300]) {
			const at = pullUnder(law, x * a, { pull: 0, slope: 0 }).slope;
			const step = 1e-5 * x * a;
			near(at, (pull(law, x * a + step) - pull(law, x * a - step)) / (2 * step), 1e-8);
		}
	});

	test('far out the speed goes to (G M a)^¼, the same at every radius', () => {
		const speed = (G * 6.8e10 * a) ** 0.25;
		near(model.circularVelocity(5e4), speed, 2e-3);
		near(model.circularVelocity(5e5), speed, 2e-4);
	});

	test('κ² is R dΩ²/dR + 4Ω², by differences of the speeds', () => {
		for (const R of [0.3, 2, 8, 25]) {
			const square = (r: number) => model.circularFrequency(r) ** 2;
			const step = 1e-4 * R;
			const slope = (square(R + step) - square(R - step)) / (2 * step);
			near(model.epicycleFrequency(R), Math.sqrt(R * slope + 4 * square(R)), 1e-6);
		}
	});

	test('speed, frequency and pull in the plane agree; ν follows the vertical pull', () => {
		for (const R of [0.3, 2, 8, 25]) {
			const out = model.acceleration(R, 0, { R: 0, z: 0 });
			near(model.circularVelocity(R), Math.sqrt(-out.R * R), 1e-12);
			near(model.circularVelocity(R), R * model.circularFrequency(R), 1e-12);
			const z = 1e-5;
			const above = model.acceleration(R, z, { R: 0, z: 0 }).z;
			near(model.verticalFrequency(R), Math.sqrt(-above / z), 1e-6);
		}
	});

	test('nothing escapes, and there is no potential to ask for', () => {
		expect(model.escapeVelocity(8)).toBe(Infinity);
		expect(model.potential(8, 0)).toBeNaN();
	});

	test('is kept by the spec and by every model made from it', () => {
		expect(model.spec.law).toBe(law);
		near(
			model.withFactor('disc', 2).circularVelocity(8),
			massModel({
				components: [lit[0], { ...lit[1], factor: 2 }],
				law
			}).circularVelocity(8),
			1e-14
		);
		expect(model.lit().circularVelocity(8)).toBe(model.circularVelocity(8));
		expect(model.circularVelocity(8)).toBeGreaterThan(newton.circularVelocity(8));
	});
});
