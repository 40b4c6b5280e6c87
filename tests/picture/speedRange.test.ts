import { describe, expect, it } from 'vitest';
import { speedRange } from '../../src/lib/picture/speedRange';

describe('speedRange', () => {
	const radii = Float64Array.from({ length: 100 }, (_, i) => (i + 1) / 4);
	it('is set by the disc and not by a point mass in its middle', () => {
		const speeds = radii.map((R) => 210 + (R < 1 ? 3000 / R : 0));
		expect(speedRange(radii, (k) => speeds[k])).toEqual([0, 250]);
	});
	it('never closes, and counts an outward pull as standing still', () => {
		expect(speedRange(radii, () => NaN)).toEqual([0, 50]);
	});
});
