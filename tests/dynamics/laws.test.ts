import { describe, expect, test } from 'vitest';
import { massModel, type MassModel } from '../../src/lib/dynamics/index';
import { G } from '../../src/lib/units';
import { near } from './near';
import { oneComponent } from './oneComponent';

interface Law {
	name: string;
	model: MassModel;
	sphere: boolean;
	/** Razor-thin: matter only at z = 0. */
	thin?: boolean;
	/** Frequencies are Infinity at the centre. */
	cusp?: boolean;
	/** The speed and the potential too. */
	singular?: boolean;
	/** The speed goes to a value above 0 at the centre, the potential to minus infinity. */
	flatCentre?: boolean;
	/** The mass has no end and nothing escapes. */
	endless?: boolean;
	/** (km/s)², where it has no end; 0 where missing. */
	centralPotential?: number;
}

/** A new kind is one line here. */
const models: Law[] = [
	{
		name: 'point mass',
		model: oneComponent('point-mass', { mass: 1e11 }),
		sphere: true,
		cusp: true,
		singular: true
	},
	{
		name: 'Plummer',
		model: oneComponent('plummer', { mass: 1e10, scaleLength: 0.5 }),
		sphere: true
	},
	{
		name: 'Hernquist',
		model: oneComponent('hernquist', { mass: 1e10, scaleLength: 0.6 }),
		sphere: true,
		cusp: true
	},
	{
		name: 'NFW by density',
		model: oneComponent('nfw', { density: 8.5e6, scaleRadius: 19 }),
		sphere: true,
		cusp: true
	},
	{
		name: 'NFW by mass',
		model: oneComponent('nfw', { mass200: 1e12, concentration: 10, hubble: 70 }),
		sphere: true,
		cusp: true
	},
	{
		name: 'pseudo-isothermal',
		model: oneComponent('pseudo-isothermal', { density: 3e7, coreRadius: 2.5 }),
		sphere: true,
		endless: true
	},
	{
		name: 'Burkert',
		model: oneComponent('burkert', { density: 2e7, coreRadius: 8 }),
		sphere: true
	},
	{
		name: 'Jaffe',
		model: oneComponent('jaffe', { mass: 1e10, scaleLength: 1.2 }),
		sphere: true,
		cusp: true,
		flatCentre: true
	},
	{
		name: 'isochrone',
		model: oneComponent('isochrone', { mass: 1e11, scaleLength: 2 }),
		sphere: true
	},
	{
		name: 'Dehnen, flat core',
		model: oneComponent('dehnen', { mass: 1e10, scaleLength: 1, gamma: 0 }),
		sphere: true
	},
	{
		name: 'Dehnen, steep',
		model: oneComponent('dehnen', { mass: 1e10, scaleLength: 1, gamma: 1.2 }),
		sphere: true,
		cusp: true
	},
	{
		name: 'Sérsic',
		model: oneComponent('sersic', { mass: 2e10, effectiveRadius: 1.5, index: 3 }),
		sphere: true,
		cusp: true
	},
	{
		name: 'Einasto',
		model: oneComponent('einasto', { density: 2.1e6, scaleRadius: 20, index: 5.5 }),
		sphere: true
	},
	{
		name: 'double power law',
		model: oneComponent('double-power-law', {
			density: 1e7,
			scaleRadius: 10,
			alpha: 1.5,
			beta: 3.2,
			gamma: 0.6
		}),
		sphere: true,
		cusp: true
	},
	{
		name: 'round flat-curve halo',
		model: oneComponent('logarithmic', { speed: 200, coreRadius: 5, axisRatio: 1 }),
		sphere: true,
		endless: true,
		centralPotential: 200 ** 2 * Math.log(5)
	},
	{
		name: 'Miyamoto–Nagai',
		model: oneComponent('miyamoto-nagai', { mass: 6.8e10, scaleLength: 3, scaleHeight: 0.28 }),
		sphere: false
	},
	{
		name: 'Miyamoto–Nagai ball',
		model: oneComponent('miyamoto-nagai', { mass: 6.8e10, scaleLength: 0, scaleHeight: 0.5 }),
		sphere: false
	},
	{
		name: 'Kuzmin',
		model: oneComponent('kuzmin-disk', { mass: 5e10, scaleLength: 3.5 }),
		sphere: false,
		thin: true
	},
	{
		name: 'thin exponential',
		model: oneComponent('exponential-disk', { surfaceDensity: 8e8, scaleLength: 2.5 }),
		sphere: false,
		thin: true,
		cusp: true
	},
	{
		name: 'bulge, disc and halo',
		sphere: false,
		thin: true,
		cusp: true,
		model: massModel({
			components: [
				{ id: 'bulge', kind: 'hernquist', parameters: { mass: 1e10, scaleLength: 0.5 }, lit: true },
				{
					id: 'disc',
					kind: 'exponential-disk',
					parameters: { surfaceDensity: 8e8, scaleLength: 2.5 },
					lit: true,
					factor: 0.8
				},
				{
					id: 'halo',
					kind: 'burkert',
					parameters: { density: 2e7, coreRadius: 8 },
					lit: false,
					factor: 1.4
				}
			]
		})
	}
];

const places: [number, number][] = [
	[0.3, 0.4],
	[1, 0.2],
	[3, -2],
	[8, 0.5],
	[8, -5],
	[25, 9],
	[0.6, 12]
];
const radii = [0.05, 0.4, 1, 2.2, 5, 8.2, 15, 40, 120];

/** Derivative of f at x by central differences of order h⁸. */
function derivative(f: (x: number) => number, x: number, h: number): number {
	const weights = [4 / 5, -1 / 5, 4 / 105, -1 / 280];
	return weights.reduce((sum, w, i) => sum + w * (f(x + (i + 1) * h) - f(x - (i + 1) * h)), 0) / h;
}

describe.each(models)('$name', (law) => {
	const { model, sphere, thin, cusp, singular, endless, flatCentre, centralPotential = 0 } = law;
	const at = { R: 0, z: 0 };

	test('the pull is minus the gradient of the potential', () => {
		for (const [R, z] of places) {
			const step = 0.02 * Math.min(Math.abs(z), R);
			const pull = model.acceleration(R, z, at);
			const size = Math.hypot(pull.R, pull.z);
			const alongR = -derivative((x) => model.potential(x, z), R, step);
			const alongZ = -derivative((x) => model.potential(R, x), z, step);
			expect(Math.abs(pull.R - alongR), `R at ${R}, ${z}: ${pull.R} ${alongR}`).toBeLessThan(
				1e-8 * size
			);
			expect(Math.abs(pull.z - alongZ), `z at ${R}, ${z}: ${pull.z} ${alongZ}`).toBeLessThan(
				1e-8 * size
			);
		}
	});

	test('the divergence of the pull is −4πG times the density', () => {
		for (const [R, z] of places) {
			const step = 0.02 * Math.min(Math.abs(z), R);
			const radial = derivative((x) => x * model.acceleration(x, z, at).R, R, step) / R;
			const vertical = derivative((x) => model.acceleration(R, x, at).z, z, step);
			const expected = -4 * Math.PI * G * model.density(R, z);
			const size = Math.abs(radial) + Math.abs(vertical);
			expect(
				Math.abs(radial + vertical - expected),
				`at ${R}, ${z}: ${radial + vertical} should be ${expected}`
			).toBeLessThan(1e-7 * size);
		}
	});

	test('speed, Ω and κ belong to the pull in the plane', () => {
		for (const R of radii) {
			const omega = model.circularFrequency(R);
			near(model.circularVelocity(R), omega * R, 1e-13, `speed at ${R}`);
			near(-model.acceleration(R, 0, at).R, omega * omega * R, 1e-12, `pull at ${R}`);
			const slope = derivative((x) => model.circularFrequency(x) ** 2, R, 0.02 * R);
			near(model.epicycleFrequency(R) ** 2, R * slope + 4 * omega ** 2, 1e-8, `κ² at ${R}`);
			near(model.dynamicalMass(R), (R * (omega * R) ** 2) / G, 1e-12, `mass at ${R}`);
		}
	});

	test('ν belongs to the pull towards the plane', () => {
		for (const R of radii) {
			if (thin) {
				expect(model.verticalFrequency(R)).toBe(Infinity);
				// Just above a sheet the pull has jumped by −2πGΣ.
				const jump = -2 * Math.PI * G * model.sheetDensity(R);
				if (R < 10) near(model.acceleration(R, 1e-9, at).z, jump, 1e-6, `jump at ${R}`);
				const lent = model.verticalFrequency(R, 0.3);
				expect(lent).toBeGreaterThan(0);
				expect(lent).toBeLessThan(Infinity);
			} else {
				const slope = derivative((z) => model.acceleration(R, z, at).z, 0, 0.001);
				near(model.verticalFrequency(R) ** 2, -slope, 1e-7, `ν² at ${R}`);
				expect(model.sheetDensity(R)).toBe(0);
			}
		}
	});

	test('κ lies between Ω and 2 Ω in a sphere', () => {
		for (const R of radii) {
			const ratio = model.epicycleFrequency(R) / model.circularFrequency(R);
			// A disc's edge may fall more steeply than around a point.
			expect(ratio, `κ/Ω at ${R}`).toBeGreaterThanOrEqual(sphere ? 1 - 1e-12 : 0);
			expect(ratio, `κ/Ω at ${R}`).toBeLessThanOrEqual(2 + 1e-12);
		}
	});

	test('at the centre everything is finite that should be', () => {
		if (flatCentre) {
			near(model.circularVelocity(0), model.circularVelocity(1e-9), 1e-8);
			expect(model.potential(0, 0)).toBe(-Infinity);
			return;
		}
		expect(model.circularVelocity(0)).toBe(singular ? Infinity : 0);
		expect(model.enclosedMass(0)).toBe(singular ? 1e11 : 0);
		expect(model.dynamicalMass(0)).toBe(singular ? 1e11 : 0);
		expect(model.acceleration(0, 0, at)).toEqual({ R: 0, z: 0 });
		expect(Number.isFinite(model.potential(0, 0))).toBe(!singular);
		expect(model.escapeVelocity(0)).toBe(
			singular || endless ? Infinity : Math.sqrt(-2 * model.potential(0, 0))
		);
		for (const frequency of [
			model.circularFrequency(0),
			model.epicycleFrequency(0),
			model.verticalFrequency(0, 0.3)
		]) {
			expect(frequency).toBeGreaterThan(0);
			expect(Number.isFinite(frequency) || cusp).toBe(true);
		}
		expect(Number.isFinite(model.circularFrequency(0))).toBe(!cusp);
		if (!singular) {
			const change = model.potential(1e-9, 0) - model.potential(0, 0);
			expect(change).toBeGreaterThanOrEqual(0);
			expect(change).toBeLessThan(1e-6 * model.circularVelocity(5) ** 2);
		}
		// On the axis there is no sideways pull, and the rest stays finite.
		const onAxis = model.acceleration(0, 2, at);
		expect(Math.abs(onAxis.R)).toBe(0);
		expect(onAxis.z).toBeLessThan(0);
		expect(Number.isFinite(model.potential(0, 2))).toBe(true);
		near(model.potential(1e-6, 2), model.potential(0, 2), 1e-9);
	});

	test('far away pull, density and frequencies die, and the potential has its zero', () => {
		const pullAt = (R: number) => Math.abs(model.acceleration(R, 0, at).R);
		expect(pullAt(1e6)).toBeLessThan(1e-2 * pullAt(1e3));
		expect(model.density(1e5, 1)).toBeLessThanOrEqual(1e-4 * model.density(10, 1));
		expect(model.circularFrequency(1e6)).toBeLessThan(1e-2 * model.circularFrequency(1e3));
		if (endless) {
			near(model.potential(0, 0), centralPotential, 1e-12);
			expect(model.potential(1e6, 0)).toBeGreaterThan(model.potential(1e3, 0));
		} else {
			expect(model.potential(1e6, 0)).toBeLessThan(0);
			expect(model.potential(1e6, 0)).toBeGreaterThan(0.02 * model.potential(1e3, 0));
		}
	});

	test('mass inside grows with the radius, and in a sphere it is the dynamical mass', () => {
		let before = 0;
		for (const R of radii) {
			const mass = model.enclosedMass(R);
			expect(mass).toBeGreaterThanOrEqual(before);
			if (sphere) near(mass, model.dynamicalMass(R), 1e-12, `mass inside ${R}`);
			before = mass;
		}
	});

	test('twice the mass is twice every square', () => {
		const id = model.spec.components[0].id;
		const only = massModel({ components: [{ ...model.spec.components[0], factor: 1 }] });
		const double = only.withFactor(id, 2);
		for (const R of radii) {
			near(double.circularVelocity(R) ** 2, 2 * only.circularVelocity(R) ** 2, 1e-14);
			near(double.epicycleFrequency(R) ** 2, 2 * only.epicycleFrequency(R) ** 2, 1e-14);
			near(double.verticalFrequency(R, 0.2) ** 2, 2 * only.verticalFrequency(R, 0.2) ** 2, 1e-14);
			near(double.enclosedMass(R), 2 * only.enclosedMass(R), 1e-14);
			near(double.potential(R, 1), 2 * only.potential(R, 1), 1e-14);
			near(double.density(R, 1), 2 * only.density(R, 1), 1e-14);
			near(double.sheetDensity(R), 2 * only.sheetDensity(R), 1e-14);
		}
	});
});
