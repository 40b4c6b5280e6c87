import { expect, test } from 'vitest';
import { scaledI, scaledK } from '../../src/lib/dynamics/bessel';
import { freemanFunctions } from '../../src/lib/dynamics/components/freemanFunctions';
import { csvFixture } from './fixtures';
import { near } from './near';

const rows = csvFixture('specialFunctions.csv');

function value(name: string, x: number): number {
	const I = { i0: 0, i1: 0 };
	const K = { k0: 0, k1: 0 };
	scaledI(x, I);
	scaledK(x, K);
	const freeman = { frequency: 0, epicycle: 0, potential: 0 };
	freemanFunctions(x, freeman);
	const values: Record<string, number> = {
		I0: I.i0 * Math.exp(x),
		I1: I.i1 * Math.exp(x),
		K0: K.k0 * Math.exp(-x),
		K1: K.k1 * Math.exp(-x),
		I0e: I.i0,
		I1e: I.i1,
		K0e: K.k0,
		K1e: K.k1,
		'I0K0-I1K1': freeman.frequency,
		'I0K1-I1K0': freeman.potential / x
	};
	return values[name];
}

test.each(['I0', 'I1', 'K0', 'K1', 'I0e', 'I1e', 'K0e', 'K1e'])('%s agrees to 1e-14', (name) => {
	const own = rows.filter((row) => row.function === name);
	expect(own.length).toBeGreaterThanOrEqual(66);
	for (const row of own) {
		const x = Number(row.argument);
		near(value(name, x), Number(row.value), 1e-14, `${name}(${x})`);
	}
});

test.each(['I0K0-I1K1', 'I0K1-I1K0'])('%s agrees to 1e-12 where it cancels too', (name) => {
	const own = rows.filter((row) => row.function === name);
	expect(own.length).toBe(73);
	for (const row of own) {
		const x = Number(row.argument);
		near(value(name, x), Number(row.value), 1e-12, `${name}(${x})`);
	}
});

test('no row of the fixture is left out', () => {
	const names = 'I0 I1 K0 K1 I0e I1e K0e K1e I0K0-I1K1 I0K1-I1K0'.split(' ');
	expect(rows.filter((row) => names.includes(row.function)).length).toBe(702);
	expect(rows.length).toBe(702);
});

test('both ways of computing the disc functions meet where they change over', () => {
	const below = { frequency: 0, epicycle: 0, potential: 0 };
	const above = { frequency: 0, epicycle: 0, potential: 0 };
	freemanFunctions(20 * (1 - 1e-15), below);
	freemanFunctions(20, above);
	near(below.frequency, above.frequency, 1e-12);
	near(below.epicycle, above.epicycle, 1e-11);
	near(below.potential, above.potential, 1e-13);
});

test('the scaled functions have their limits at 0', () => {
	const I = { i0: NaN, i1: NaN };
	const K = { k0: NaN, k1: NaN };
	scaledI(0, I);
	scaledK(0, K);
	expect(I).toEqual({ i0: 1, i1: 0 });
	expect(K).toEqual({ k0: Infinity, k1: Infinity });
});
