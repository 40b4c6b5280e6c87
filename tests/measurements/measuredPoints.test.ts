import { describe, expect, it } from 'vitest';
import { measuredPoints } from '../../src/lib/measurements/measuredPoints';
import type { MeasuredRows, RadiusUnit } from '../../src/lib/measurements/types';

const table = (radiusUnit: RadiusUnit, radius: number): MeasuredRows => ({
	radiusUnit,
	speedUnit: 'km/s',
	distance: { value: 10, error: null },
	inclination: null,
	rows: [{ radius, speed: 100, error: 5 }]
});
const close = (value: number, wanted: number) => {
	expect(Math.abs(value / wanted - 1), `${value} for ${wanted}`).toBeLessThan(1e-9);
};

describe('measuredPoints', () => {
	it('turns every unit of radius into kpc', () => {
		// One kpc is 1000/10 Mpc × 648000/π arcsec seen from 10 Mpc, and 3261.563777… light years
		// (IAU 2015 B2 for the parsec; light year of 365.25 days).
		const arcsec = ((1 / 10_000) * 648_000) / Math.PI;
		for (const [unit, radius] of [
			['kpc', 1],
			['pc', 1000],
			['arcsec', arcsec],
			['arcmin', arcsec / 60],
			['light-years', 3261.563777167433]
		] as const) {
			close(measuredPoints(table(unit, radius))[0].radius, 1);
		}
	});

	it('turns m/s into km/s, errors and parts too, and keeps the reason', () => {
		const [point] = measuredPoints({
			...table('kpc', 2),
			speedUnit: 'm/s',
			rows: [{ radius: 2, speed: 1e5, error: 5e3, gas: -1e4, disc: 2e4, leftOut: 'Warp' }]
		});
		expect(point).toEqual({
			radius: 2,
			speed: 100,
			error: 5,
			gas: -10,
			disc: 20,
			leftOut: 'Warp'
		});
	});

	it('has no points from angles without a distance', () => {
		expect(measuredPoints({ ...table('arcsec', 10), distance: null })).toEqual([]);
	});
});
