import { expect, test } from 'vitest';
import { betaBelow, betaBetween, betaSeam } from '../../src/lib/dynamics/incompleteBeta';
import {
	gammaFraction,
	gammaSeries,
	gammaShare,
	lnGamma
} from '../../src/lib/dynamics/incompleteGamma';
import { csvFixture } from './fixtures';
import { near } from './near';

const rows = csvFixture('incompleteFunctions.csv');
type Numbers = { a: number; b: number; x: number; top: number };
const functions: Record<string, (given: Numbers) => number> = {
	lnGamma: ({ a }) => lnGamma(a),
	gammaShare: ({ a, x }) => gammaShare(a, x),
	gammaSeries: ({ a, x }) => gammaSeries(a, x),
	gammaFraction: ({ a, x }) => gammaFraction(a, x),
	betaBelow: ({ a, b, x }) => betaBelow(a, b, x),
	betaBetween: ({ a, b, x, top }) => betaBetween(a, b, x, top)
};

test.each(Object.keys(functions))('%s agrees with 40 digits to 1e-12', (name) => {
	const own = rows.filter((row) => row.function === name);
	expect(own.length).toBeGreaterThan(8);
	for (const row of own) {
		const [a, b, x, top] = [row.a, row.b, row.x, row.top].map(Number);
		const where = `${name} of a ${a}, b ${b}, x ${x}:`;
		const expected = Number(row.value);
		// lnGamma has zeros at 1 and 2, where only the difference counts.
		if (Math.abs(expected) < 1e-3 && name === 'lnGamma') {
			expect(Math.abs(lnGamma(a) - expected), where).toBeLessThan(1e-14);
		} else near(functions[name]({ a, b, x, top }), expected, 1e-12, where);
	}
});

test('nothing lies below 0, and the seam is a half for a small b and a tenth for a large one', () => {
	expect(gammaShare(2, 0)).toBe(0);
	expect(betaBelow(2, 3, 0)).toBe(0);
	expect([1, 4, 8, 100].map(betaSeam)).toEqual([0.5, 0.5, 0.25, 0.1]);
});
