import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { spreadLabels } from '../../../src/lib/components/chart/spreadLabels';

describe('spreadLabels', () => {
	it('leaves alone what does not touch', () => {
		expect(spreadLabels([100, 10, 50], 16, 0, 200)).toEqual([100, 10, 50]);
	});
	it('shares the displacement of two that touch', () => {
		expect(spreadLabels([50, 50], 16, 0, 200)).toEqual([42, 58]);
	});
	it('keeps the gap, the order and the ends for any labels that fit', () => {
		fc.assert(
			fc.property(
				fc.array(fc.double({ min: -50, max: 450, noNaN: true }), { maxLength: 14 }),
				(wanted) => {
					const placed = spreadLabels(wanted, 16, 0, 400);
					const order = wanted.map((_, i) => i).sort((a, b) => wanted[a] - wanted[b] || a - b);
					const sorted = order.map((i) => placed[i]);
					expect([...sorted].sort((a, b) => a - b)).toEqual(sorted);
					for (let k = 1; k < sorted.length; k++) {
						expect(sorted[k] - sorted[k - 1]).toBeGreaterThan(16 - 1e-9);
					}
					for (const at of sorted) {
						expect(at).toBeGreaterThanOrEqual(-1e-9);
						expect(at).toBeLessThanOrEqual(400 + 1e-9);
					}
				}
			)
		);
	});
});
