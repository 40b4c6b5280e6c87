import { expect, test } from 'vitest';
import {
	criticalDensity,
	nfwHalo,
	type ComponentKind,
	type MassModel
} from '../../src/lib/dynamics/index';
import { csvFixture, jsonFixture } from './fixtures';
import { near } from './near';
import { oneComponent } from './oneComponent';

interface Case {
	kind: ComponentKind;
	parameters: Record<string, number>;
	rows: number;
}

const cases = jsonFixture('massModelCases.json') as Case[];
const rows = csvFixture('massModels.csv');
/** Peak of the NFW speed in scale radii, as the table has it. */
const nfwPeak = 2.16258158706461;

type Quantity = (model: MassModel, R: number, z: number) => number;
const quantities: Record<string, Quantity> = {
	vc: (model, R) => model.circularVelocity(R),
	M: (model, R) => model.enclosedMass(R),
	Phi: (model, R, z) => model.potential(R, z),
	Omega: (model, R) => model.circularFrequency(R),
	kappa: (model, R) => model.epicycleFrequency(R),
	nu: (model, R) => model.verticalFrequency(R),
	vesc: (model, R) => model.escapeVelocity(R),
	rho: (model, R, z) => model.density(R, z),
	Sigma: (model, R) => model.sheetDensity(R),
	FR: (model, R, z) => model.acceleration(R, z, { R: 0, z: 0 }).R,
	Fz: (model, R, z) => model.acceleration(R, z, { R: 0, z: 0 }).z
};

/** Quantities that belong to no radius: the whole mass, and those of an NFW halo given by mass. */
const haloQuantities: Record<string, (parameters: Record<string, number>) => number> = {
	r200: (p) => halo(p).radius200,
	rs: (p) => halo(p).scaleRadius,
	rho0: (p) => halo(p).density,
	v200: (p) => halo(p).speed200,
	rho_crit: (p) => criticalDensity(p.hubble),
	rmax: (p) => nfwPeak * halo(p).scaleRadius,
	vmax: (p) => oneComponent('nfw', p).circularVelocity(nfwPeak * halo(p).scaleRadius)
};
const halo = (p: Record<string, number>) => nfwHalo(p.mass200, p.concentration, p.hubble);

const described = cases.map(
	(one, index) => [`${one.kind} ${JSON.stringify(one.parameters)}`, one, index] as const
);

test.each(described)('%s agrees with all its rows to 1e-9', (_title, one, index) => {
	const model = oneComponent(one.kind, one.parameters);
	const own = rows.filter((row) => row.case === String(index));
	let checked = 0;
	for (const row of own) {
		const actual =
			row.R_kpc === ''
				? row.quantity === 'Mtot'
					? model.enclosedMass(1e12)
					: haloQuantities[row.quantity](one.parameters)
				: quantities[row.quantity](model, Number(row.R_kpc), Number(row.z_kpc));
		near(actual, Number(row.value), 1e-9, `${row.quantity} at ${row.R_kpc}, ${row.z_kpc}:`);
		checked++;
	}
	expect(checked).toBe(one.rows);
});

test('the table has the 6447 rows of 16 kinds', () => {
	expect(rows.length).toBe(6447);
	expect(cases.reduce((sum, one) => sum + one.rows, 0)).toBe(6447);
	expect(new Set(cases.map((one) => one.kind)).size).toBe(16);
});
