import { describe, expect, it } from 'vitest';
import { radiusAt, ringPath } from '../../src/routes/(office)/galaxies/tuning/ringPath';

describe('the ring on the film', () => {
	const view = { distance: 50, inclination: 52, turn: 0, centreAltitude: 90 };
	const geometry = { apertureDegrees: 56, tiltDegrees: 0 };
	it('is where the radius under the pointer is read', () => {
		for (const R of [1, 8, 20]) {
			const points = ringPath(R, view, geometry).slice(1, -1).split('L');
			for (const point of points) {
				const [u, v] = point.split(',').map(Number);
				expect(Math.abs((radiusAt(u, v, view, geometry) ?? NaN) - R)).toBeLessThan(0.01);
			}
		}
	});
	it('reads nothing outside the film or beside an edge-on disc', () => {
		expect(radiusAt(0.9, 0.9, view, geometry)).toBeNull();
		expect(radiusAt(0, -0.9, { ...view, inclination: 90 }, geometry)).toBeNull();
	});
});
