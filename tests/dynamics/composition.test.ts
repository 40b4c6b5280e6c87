import * as fc from 'fast-check';
import { expect, test } from 'vitest';
import {
	massBreakdown,
	massModel,
	orbitTimeMyr,
	rotationCurve,
	tabulateFrequencies,
	type MassModel,
	type MassModelSpec
} from '../../src/lib/dynamics/index';
import { G } from '../../src/lib/units';
import { near } from './near';
import { oneComponent } from './oneComponent';
import { anyComponent, anySpec } from './randomSpecs';

const squares = (model: MassModel, R: number) => {
	const sums = { omega: 0, kappa: 0, nu: 0 };
	model.addFrequenciesSquared(R, 0.3, sums);
	return sums;
};

const anyRadius = fc.double({ min: -4, max: 4, noNaN: true }).map((t) => 10 ** t);

test('a model is the sum of its components', () => {
	fc.assert(
		fc.property(anySpec, anyRadius, (spec, R) => {
			const model = massModel(spec);
			const parts = spec.components.map((one) => massModel({ components: [one] }));
			const sum = (of: (part: (typeof parts)[number]) => number) =>
				parts.reduce((total, part) => total + of(part), 0);
			near(
				model.circularVelocity(R) ** 2,
				sum((p) => p.circularVelocity(R) ** 2),
				1e-12
			);
			const whole = squares(model, R);
			const partly = parts.map((part) => squares(part, R));
			for (const name of ['omega', 'kappa', 'nu'] as const) {
				const size = partly.reduce((total, one) => total + Math.abs(one[name]), 0);
				const added = partly.reduce((total, one) => total + one[name], 0);
				near(whole[name] + size, added + size, 1e-12, name);
			}
			near(
				model.enclosedMass(R),
				sum((p) => p.enclosedMass(R)),
				1e-12
			);
			near(
				model.potential(R, 0),
				sum((p) => p.potential(R, 0)),
				1e-9
			);
			near(
				model.density(R, 0.1 * R),
				sum((p) => p.density(R, 0.1 * R)),
				1e-12
			);
		}),
		{ numRuns: 200 }
	);
});

test('lit and unlit make the whole, in v² and in mass', () => {
	fc.assert(
		fc.property(anySpec, anyRadius, (spec, R) => {
			const model = massModel(spec);
			const lit = model.lit();
			const unlit = model.unlit();
			near(
				lit.circularVelocity(R) ** 2 + unlit.circularVelocity(R) ** 2,
				model.circularVelocity(R) ** 2,
				1e-12
			);
			near(lit.enclosedMass(R) + unlit.enclosedMass(R), model.enclosedMass(R), 1e-12);
			expect(lit.spec.components.every((one) => one.lit)).toBe(true);
			expect(unlit.spec.components.some((one) => one.lit)).toBe(false);
		}),
		{ numRuns: 200 }
	);
});

test('over all allowed parameters speeds are numbers and stable orbits have frequencies', () => {
	fc.assert(
		fc.property(anyComponent, anyRadius, (component, R) => {
			const model = massModel({ components: [{ ...component, factor: 1 }] });
			expect(model.circularVelocity(R)).toBeGreaterThan(0);
			expect(model.circularVelocity(R)).toBeLessThan(Infinity);
			near(model.circularFrequency(R) * R, model.circularVelocity(R), 1e-12);
			// A table may fall as fast as it likes; every other shape has stable orbits everywhere.
			if (component.kind !== 'tabulated') {
				const ratio = model.epicycleFrequency(R) / model.circularFrequency(R);
				expect(ratio).toBeGreaterThan(0.5);
				expect(ratio).toBeLessThanOrEqual(2 + 1e-9);
			}
			expect(model.verticalFrequency(R, 0.3)).toBeGreaterThan(0);
			expect(model.enclosedMass(R)).toBeGreaterThan(0);
			expect(Number.isFinite(model.potential(R, 0.3))).toBe(true);
			const pull = model.acceleration(R, 0.3, { R: 0, z: 0 });
			expect(pull.R).toBeLessThan(0);
			expect(pull.z).toBeLessThan(0);
		}),
		{ numRuns: 500 }
	);
});

test('a factor of 0 takes a component away, whatever it was', () => {
	fc.assert(
		fc.property(anySpec, anyRadius, (spec, R) => {
			const model = massModel(spec).withFactor('c0', 0);
			const rest = massModel({ components: spec.components.slice(1) });
			expect(model.circularVelocity(R)).toBe(rest.circularVelocity(R));
			expect(model.potential(0, 0)).toBe(rest.potential(0, 0));
			expect(model.escapeVelocity(R)).toBe(rest.escapeVelocity(R));
		})
	);
});

test('withFactor leaves the old model and the given spec alone', () => {
	const spec: MassModelSpec = {
		components: [
			{ id: 'a', kind: 'plummer', parameters: { mass: 1e10, scaleLength: 1 }, lit: true },
			{ id: 'b', kind: 'nfw', parameters: { density: 8e6, scaleRadius: 20 }, lit: false }
		]
	};
	const model = massModel(spec);
	const before = model.circularVelocity(8);
	const heavier = model.withFactor('b', 2);
	expect(model.circularVelocity(8)).toBe(before);
	expect(heavier.circularVelocity(8)).toBeGreaterThan(before);
	expect(heavier.spec.components.map((one) => one.factor)).toEqual([1, 2]);
	expect(massModel(heavier.spec).circularVelocity(8)).toBe(heavier.circularVelocity(8));
	spec.components[0].parameters = { mass: 5e10, scaleLength: 1 };
	expect(model.spec.components[0].parameters.mass).toBe(1e10);
});

test('mixed multiplies what is lit and what is not', () => {
	const model = massModel({
		components: [
			{
				id: 'a',
				kind: 'plummer',
				parameters: { mass: 1e10, scaleLength: 1 },
				lit: true,
				factor: 2
			},
			{ id: 'b', kind: 'nfw', parameters: { density: 8e6, scaleRadius: 20 }, lit: false }
		]
	});
	const mixed = model.mixed({ lit: 1.5, unlit: 0 });
	expect(mixed.spec.components.map((one) => one.factor)).toEqual([3, 0]);
	expect(mixed.unlit().circularVelocity(8)).toBe(0);
	expect(() => model.mixed({ lit: 6, unlit: 1 })).toThrow(/"a": factor .* from 0 to 10/);
});

test('a model without components pulls nothing', () => {
	const empty = massModel({ components: [] });
	expect(empty.circularVelocity(8)).toBe(0);
	expect(empty.escapeVelocity(8)).toBe(0);
	expect(massBreakdown(empty, 8).ratio).toBeNaN();
});

test('tables hold what the model says at each radius', () => {
	const model = massModel({
		components: [
			{
				id: 'a',
				kind: 'exponential-disk',
				parameters: { surfaceDensity: 8e8, scaleLength: 2.5 },
				lit: true
			},
			{ id: 'b', kind: 'nfw', parameters: { density: 8e6, scaleRadius: 20 }, lit: false }
		]
	});
	const radii = Float64Array.from({ length: 100 }, (_, i) => 0.1 + 0.3 * i);
	const make = () => new Float64Array(radii.length).fill(NaN);
	const out = { omega: make(), kappa: make(), nu: make() };
	expect(tabulateFrequencies(model, radii, out)).toBe(out);
	const speeds = rotationCurve(model, radii, make());
	radii.forEach((R, i) => {
		expect(out.omega[i]).toBe(model.circularFrequency(R));
		expect(out.kappa[i]).toBe(model.epicycleFrequency(R));
		expect(out.nu[i]).toBe(model.verticalFrequency(R, 0.3));
		expect(speeds[i]).toBe(model.circularVelocity(R));
	});
});

test('a lent scale height gives ν near that of a disc as thick', () => {
	// Miyamoto–Nagai with b is about a Kuzmin disc whose midplane density is that of the thick one.
	const [mass, a, b] = [5e10, 3, 0.1];
	const thick = oneComponent('miyamoto-nagai', { mass, scaleLength: a, scaleHeight: b });
	const thin = oneComponent('kuzmin-disk', { mass, scaleLength: a + b });
	for (const R of [1, 3, 8]) {
		const height = thin.sheetDensity(R) / (2 * thick.density(R, 0));
		near(thin.verticalFrequency(R, height), thick.verticalFrequency(R), 1e-9);
	}
});

test('orbit time and mass breakdown follow from the model', () => {
	const model = massModel({
		components: [
			{ id: 'a', kind: 'point-mass', parameters: { mass: 2e10 }, lit: true },
			{ id: 'b', kind: 'plummer', parameters: { mass: 6e10, scaleLength: 1e-3 }, lit: false }
		]
	});
	// 2π √(r³/GM) at 8 kpc, and 977.792 Myr in a kpc/(km/s).
	near(orbitTimeMyr(model, 8), 2 * Math.PI * Math.sqrt(512 / (G * 8e10)) * 977.7922, 1e-6);
	const masses = massBreakdown(model, 50);
	near(masses.lit, 2e10, 1e-12);
	near(masses.unlit, 6e10, 1e-6);
	near(masses.ratio, 3, 1e-6);
});
