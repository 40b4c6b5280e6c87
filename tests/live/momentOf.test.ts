import { describe, expect, it } from 'vitest';
import { momentOf } from '../../src/lib/live/momentOf';
import { events } from '../show/support/content';

describe('momentOf', () => {
	const list = events([10_000, { kind: 'begin' }]);

	it('is the clock, also while the last event is not due yet', () => {
		expect(momentOf([], 5)).toBe(5);
		expect(momentOf(list, 9960)).toBe(9960);
		expect(momentOf(list, 12_000)).toBe(12_000);
	});

	it('is the last event where the clock is far behind it', () => {
		expect(momentOf(list, 2000)).toBe(10_000);
	});
});
