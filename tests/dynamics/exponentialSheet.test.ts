import { expect, test } from 'vitest';
import { G } from '../../src/lib/units';
import { csvFixture } from './fixtures';
import { near } from './near';
import { oneComponent } from './oneComponent';

const rows = csvFixture('exponentialSheet.csv');
const disc = oneComponent('exponential-disk', { surfaceDensity: 8e8, scaleLength: 2.5 });

test('a thin exponential disc off its plane agrees with the Hankel integral to 1e-9', () => {
	for (const row of rows) {
		const R = Number(row.R_kpc);
		const z = Number(row.z_kpc);
		const pull = disc.acceleration(R, z, { R: 0, z: 0 });
		const actual = { Phi: disc.potential(R, z), FR: pull.R, Fz: pull.z }[row.quantity] ?? NaN;
		near(actual, Number(row.value), 1e-9, `${row.quantity} at ${R}, ${z}:`);
	}
	expect(rows.length).toBe(33);
});

test('above and below the plane are mirror images', () => {
	for (const R of [0.2, 4, 30]) {
		const above = disc.acceleration(R, 0.7, { R: 0, z: 0 });
		const below = disc.acceleration(R, -0.7, { R: 0, z: 0 });
		expect(below.R).toBe(above.R);
		expect(below.z).toBe(-above.z);
		expect(disc.potential(R, -0.7)).toBe(disc.potential(R, 0.7));
	}
});

test('close to the plane the field goes over into that of the plane', () => {
	for (const R of [0.001, 0.5, 2.5, 8, 25, 75, 120, 400]) {
		const inPlane = disc.acceleration(R, 0, { R: 0, z: 0 });
		const close = disc.acceleration(R, 1e-7, { R: 0, z: 0 });
		near(disc.potential(R, 1e-7), disc.potential(R, 0), 1e-6, `potential at ${R}`);
		near(close.R, inPlane.R, R < 0.1 ? 1e-3 : 1e-5, `radial at ${R}`);
		if (R < 20) near(close.z, -2 * Math.PI * G * disc.sheetDensity(R), 1e-5, `vertical at ${R}`);
	}
});

test('far away it is a point mass', () => {
	const mass = 2 * Math.PI * 8e8 * 2.5 ** 2;
	for (const [R, z] of [
		[0, 9000],
		[3000, 9000],
		[9000, 40]
	]) {
		const r = Math.hypot(R, z);
		const pull = disc.acceleration(R, z, { R: 0, z: 0 });
		near(disc.potential(R, z), (-G * mass) / r, 2e-6);
		near(Math.hypot(pull.R, pull.z), (G * mass) / (r * r), 2e-6);
	}
});
