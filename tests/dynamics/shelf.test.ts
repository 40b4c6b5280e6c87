import { expect, test } from 'vitest';
import {
	massBreakdown,
	massModel,
	massModelSpecSchema,
	milkyWayMcMillan2017,
	orbitTimeMyr
} from '../../src/lib/dynamics/index';
import { csvFixture } from './fixtures';
import { near } from './near';

const galaxy = milkyWayMcMillan2017();
const model = massModel(galaxy.spec);
const rows = csvFixture('mcMillan2017.csv');
const said = galaxy.approximations.join(' ');

/** The published model's own value, by quadrature. */
function published(quantity: string, R: number): number {
	const row = rows.find((one) => one.quantity === quantity && Number(one.R_kpc) === R);
	return Number(row?.value);
}

/** Relative deviations of the speed from the published model, by radius. */
const deviations = rows
	.filter((row) => row.quantity === 'vc')
	.map((row) => {
		const R = Number(row.R_kpc);
		return { R, off: model.circularVelocity(R) / Number(row.value) - 1 };
	});
const largestFrom = (R: number) =>
	Math.max(...deviations.filter((one) => one.R >= R).map((one) => Math.abs(one.off)));
const speedOf = (id: string, R: number) =>
	massModel({
		components: galaxy.spec.components.filter((one) => one.id === id)
	}).circularVelocity(R);

test('the Milky Way of the shelf is a sound model with its source named', () => {
	expect(massModelSpecSchema.safeParse(galaxy.spec).success).toBe(true);
	expect(galaxy.sources.join(' ')).toContain('McMillan 2017, MNRAS 465, 76');
	expect(deviations.length).toBe(16);
});

test('halo and published speed agree with the quadrature of the paper, which gives 233.1 km/s', () => {
	near(published('vc', 8.21), 233.1, 1e-4);
	for (const R of [2, 5, 8.21, 20]) near(speedOf('halo', R) ** 2, published('v2_halo', R), 1e-6);
});

test('its approximations say how far the speed is off', () => {
	const here = model.circularVelocity(8.21);
	expect(said).toContain(`${here.toFixed(1)} km/s at 8.21 kpc`);
	expect(said).toContain(
		`${((here / 233.1 - 1) * 100).toFixed(1)} % above the published 233.1 km/s`
	);
	expect(said).toContain(
		`From 1 to 30 kpc the speed is never more than ${percent(largestFrom(1))} % off`
	);
	expect(said).toContain(`beyond 10 kpc never more than ${percent(largestFrom(10))} %`);
});

test('its approximations say how far discs and bulge are off', () => {
	const faster = (id: string, column: string) =>
		Math.round((speedOf(id, 8.21) / Math.sqrt(published(column, 8.21)) - 1) * 100);
	const [thin, thick] = [faster('thin-disc', 'v2_thin'), faster('thick-disc', 'v2_thick')];
	expect(said).toContain(`${thin} and ${thick} % faster at 8.21 kpc`);
	const bulge = [0.5, 1, 2, 3, 4, 5, 6, 8].map((R) =>
		Math.abs(speedOf('bulge', R) / Math.sqrt(published('v2_bulge', R)) - 1)
	);
	expect(said).toContain(`within ${Math.ceil(Math.max(...bulge) * 100)} % of the published ones`);
});

// Round figures of the trade (common practice, no source): about 200 km/s, one turn about 200
// million years, about 1e11 solar masses inside the Sun's path.
test('it lands near the round figures people are told', () => {
	expect(orbitTimeMyr(model, 8.2)).toBeGreaterThan(190);
	expect(orbitTimeMyr(model, 8.2)).toBeLessThan(240);
	expect(model.dynamicalMass(8.2)).toBeGreaterThan(0.8e11);
	expect(model.dynamicalMass(8.2)).toBeLessThan(1.3e11);
	const far = massBreakdown(model, 100);
	expect(far.ratio).toBeGreaterThan(5);
	expect(far.ratio).toBeLessThan(20);
});

/** One decimal, rounded up, as a bound must be. */
function percent(fraction: number): string {
	return (Math.ceil(fraction * 1000) / 10).toFixed(1);
}
