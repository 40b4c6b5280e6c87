import { expect, test } from 'vitest';
import { massModel, type ComponentKind } from '../../src/lib/dynamics/index';
import { G } from '../../src/lib/units';
import { csvFixture } from './fixtures';
import { near } from './near';
import { oneComponent } from './oneComponent';

const rows = csvFixture('wideParameters.csv');
const shapes = [...new Set(rows.map((row) => `${row.kind} ${row.parameters}`))];

const parse = (text: string): Record<string, number> =>
	Object.fromEntries(
		text.split(' ').map((pair) => [pair.split('=')[0], Number(pair.split('=')[1])])
	);

test.each(shapes)('%s agrees with 40 digits to 1e-11 at the ends of what is allowed', (shape) => {
	let checked = 0;
	for (const row of rows.filter((one) => `${one.kind} ${one.parameters}` === shape)) {
		const model = oneComponent(row.kind as ComponentKind, parse(row.parameters));
		const [r, M, Phi, rho] = [row.r_kpc, row.M, row.Phi, row.rho].map(Number);
		near(model.enclosedMass(r), M, 1e-11, `mass inside ${r}:`);
		near(model.potential(r, 0), Phi, 1e-11, `potential at ${r}:`);
		// Densities of 1e-300 and below have fewer digits, and none at 0.
		if (rho > 1e-290) near(model.density(r, 0), rho, 1e-11, `density at ${r}:`);
		const omega2 = (G * M) / r ** 3;
		near(model.circularFrequency(r) ** 2, omega2, 1e-11, `Ω² at ${r}:`);
		near(model.epicycleFrequency(r) ** 2, omega2 + 4 * Math.PI * G * rho, 1e-11, `κ² at ${r}:`);
		checked++;
	}
	expect(checked).toBeGreaterThan(4);
});

const steep: [ComponentKind, Record<string, number>][] = [
	['dehnen', { mass: 1e10, scaleLength: 1, gamma: 2.5 }],
	['double-power-law', { density: 1e7, scaleRadius: 10, alpha: 1, beta: 3, gamma: 2.5 }]
];

test.each(steep)(
	'a %s steeper than 2 has no speed limit at its centre and no mass there',
	(kind, p) => {
		const model = oneComponent(kind, p);
		expect(model.circularVelocity(0)).toBe(Infinity);
		expect(model.circularFrequency(0)).toBe(Infinity);
		expect(model.epicycleFrequency(0)).toBe(Infinity);
		expect(model.potential(0, 0)).toBe(-Infinity);
		expect(model.escapeVelocity(0)).toBe(Infinity);
		expect(model.enclosedMass(0)).toBe(0);
		expect(model.density(0, 0)).toBe(Infinity);
		expect(model.acceleration(0, 0, { R: 1, z: 1 })).toEqual({ R: 0, z: 0 });
		expect(model.circularVelocity(1e-8)).toBeGreaterThan(10 * model.circularVelocity(1e-3));
	}
);

test('mass without end lets stars escape as long as the outer slope is above 2', () => {
	const p = { density: 1e7, scaleRadius: 10, alpha: 1, beta: 2.5, gamma: 1 };
	const model = oneComponent('double-power-law', p);
	expect(model.enclosedMass(1e6)).toBeGreaterThan(10 * model.enclosedMass(1e3));
	const escape = model.escapeVelocity(10);
	expect(escape).toBeLessThan(Infinity);
	near(escape ** 2, -2 * model.potential(10, 0), 1e-13, 'escape speed');
	expect(model.potential(1e9, 0) / model.potential(10, 0)).toBeLessThan(1e-3);
});

const refused: [ComponentKind, Record<string, number>, string][] = [
	['dehnen', { mass: 1e10, scaleLength: 1, gamma: 3 }, 'gamma'],
	['double-power-law', { density: 1e7, scaleRadius: 10, alpha: 1, beta: 3, gamma: 3 }, 'gamma'],
	['double-power-law', { density: 1e7, scaleRadius: 10, alpha: 1, beta: 2, gamma: 1 }, 'beta'],
	['double-power-law', { density: 1e7, scaleRadius: 10, alpha: 0, beta: 3, gamma: 1 }, 'alpha'],
	['sersic', { mass: 1e10, effectiveRadius: 1, index: 0.2 }, 'index'],
	['einasto', { density: 1e6, scaleRadius: 20, index: 0 }, 'index']
];

test.each(refused)('a %s of %o is refused by the name of %s', (kind, parameters, name) => {
	const make = () => massModel({ components: [{ id: 'it', kind, parameters, lit: true }] });
	expect(make).toThrow(new RegExp(`\\(${name}\\)|\\b${name}\\b`));
	expect(make).toThrow(/Allowed: /);
});
