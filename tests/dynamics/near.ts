import { expect } from 'vitest';

/** |actual − expected| ≤ tolerance × |expected|, both printed where it fails; NaN never passes. */
export function near(actual: number, expected: number, tolerance: number, where = ''): void {
	const close =
		actual === expected || Math.abs(actual - expected) <= tolerance * Math.abs(expected);
	expect(
		close,
		`${where} ${actual} should be ${expected}, off by ${(actual - expected) / expected} of ${tolerance}`
	).toBe(true);
}
