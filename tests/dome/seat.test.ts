import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { domePointFromSeat, seats } from '../../src/lib/dome';

const out = () => ({ x: 0, y: 0, z: 0 });

describe('domePointFromSeat', () => {
	it('sees the direction itself from the middle', () => {
		const looking = { x: 0.6, y: 0, z: 0.8 };
		expect(domePointFromSeat({ x: 0, y: 0, z: 0 }, looking, out())).toEqual(looking);
	});
	it('sees the front nearer from the front, by hand', () => {
		// From (0, 0.5, 0) straight up: the dome stands at height sqrt(1 - 0.25).
		const up = domePointFromSeat({ x: 0, y: 0.5, z: 0 }, { x: 0, y: 0, z: 1 }, out());
		expect(up.y).toBeCloseTo(0.5, 12);
		expect(up.z).toBeCloseTo(Math.sqrt(0.75), 12);
	});
	it('always lands on the dome, ahead of the eye', () => {
		fc.assert(
			fc.property(
				fc.constantFrom(...Object.values(seats)),
				fc.double({ min: -1, max: 1, noNaN: true }),
				fc.double({ min: 0, max: 6.28, noNaN: true }),
				({ seat }, z, azimuth) => {
					const level = Math.sqrt(1 - z * z);
					const looking = { x: level * Math.sin(azimuth), y: level * Math.cos(azimuth), z };
					const point = domePointFromSeat(seat, looking, out());
					expect(Math.hypot(point.x, point.y, point.z)).toBeCloseTo(1, 10);
					const ahead =
						(point.x - seat.x) * looking.x +
						(point.y - seat.y) * looking.y +
						(point.z - seat.z) * looking.z;
					expect(ahead).toBeGreaterThan(0);
				}
			)
		);
	});
	it('refuses a seat outside of the dome', () => {
		expect(() => domePointFromSeat({ x: 0, y: 1.2, z: 0 }, { x: 0, y: 1, z: 0 }, out())).toThrow(
			'inside'
		);
	});
});
