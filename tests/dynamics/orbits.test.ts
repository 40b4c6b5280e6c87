import { describe, expect, test } from 'vitest';
import {
	countBound,
	energies,
	integrateOrbits,
	makeParticles,
	massModel,
	usualStep,
	type MassModelSpec,
	type Particles
} from '../../src/lib/dynamics';
import { TAU, timeFromMyr } from '../../src/lib/units';
import { csvFixture, jsonFixture } from './fixtures';

const rows = csvFixture('orbits.csv');
const models = jsonFixture('orbitModels.json') as Record<string, MassModelSpec>;
const places = ['x', 'y', 'z', 'vx', 'vy', 'vz'] as const;

function startOf(row: Record<string, string>): Particles {
	const particles = makeParticles(1);
	for (const place of places) particles[place][0] = Number(row[`${place}0`]);
	return particles;
}

describe('against scipy DOP853 at rtol 1e-13, 500 Myr', () => {
	const at500 = rows.filter((row) => row.t_Myr === '500');
	test('the table has 16 orbits', () => expect(at500).toHaveLength(16));
	test.each(
		at500.map((row) => [`${row.model} from ${row.x0} kpc, ${row.vx0} ${row.vy0}`, row] as const)
	)('%s', (_name, row) => {
		const model = massModel(models[row.model]);
		const particles = startOf(row);
		integrateOrbits(model, particles, { time: timeFromMyr(500) });
		const off = Math.hypot(
			...(['x', 'y', 'z'] as const).map((place) => particles[place][0] - Number(row[place]))
		);
		expect(off, `${off} kpc`).toBeLessThan(1e-4);
		const energy = energies(model, particles, new Float64Array(1))[0];
		const drift = Math.abs(energy / Number(row.energy) - 1);
		expect(drift, `energy off by ${drift}`).toBeLessThan(2e-6);
	});
});

test('without the halo the inner disc stays and the outer leaves, as in the table', () => {
	const starts = rows.filter((row) => row.model === 'disc-alone' && row.t_Myr === '50');
	const alone = massModel(models['disc-alone']);
	const together = makeParticles(starts.length);
	starts.forEach((row, i) => places.forEach((p) => (together[p][i] = Number(row[`${p}0`]))));
	const stays = starts.map((row) => Number(row.energy) < 0);
	expect(stays).toEqual([true, true, true, true, false, false, false]);
	expect(countBound(alone, together)).toBe(4);
	integrateOrbits(alone, together, { time: timeFromMyr(1000) });
	starts.forEach((row, i) => {
		const far = Math.hypot(together.x[i], together.y[i]);
		const before = Number(row.x0);
		// Who is bound turns back; who is not is several times as far out and goes on outward.
		const outward = together.x[i] * together.vx[i] + together.y[i] * together.vy[i];
		if (!stays[i]) {
			expect(far).toBeGreaterThan(3 * before);
			expect(outward).toBeGreaterThan(0);
		} else expect(far).toBeLessThan(15 * before);
	});
});

test('energy drifts less than 1e-5 in 100 turns at the usual step', () => {
	const model = massModel(models['miyamoto_nagai-and-nfw']);
	const particles = makeParticles(1);
	particles.x[0] = 3;
	particles.vx[0] = 30;
	particles.vy[0] = 0.9 * model.circularVelocity(3);
	particles.vz[0] = 20;
	const before = energies(model, particles, new Float64Array(1))[0];
	integrateOrbits(model, particles, { time: (100 * TAU) / model.circularFrequency(3) });
	const after = energies(model, particles, new Float64Array(1))[0];
	expect(Math.abs(after / before - 1), `${before} to ${after}`).toBeLessThan(1e-5);
});

test('goes back the way it came', () => {
	const model = massModel(models.log_halo);
	const particles = startOf(rows.filter((row) => row.model === 'log_halo')[0]);
	const start = structuredClone(particles);
	const step = usualStep(model, particles);
	integrateOrbits(model, particles, { time: 0.3, step });
	expect(Math.abs(particles.x[0] - start.x[0])).toBeGreaterThan(1);
	integrateOrbits(model, particles, { time: -0.3, step });
	for (const place of places) {
		expect(Math.abs(particles[place][0] - start[place][0])).toBeLessThan(1e-7);
	}
});

test('a circle is a circle', () => {
	const model = massModel(models['miyamoto_nagai-and-nfw']);
	const particles = makeParticles(1);
	particles.x[0] = 8;
	particles.vy[0] = model.circularVelocity(8);
	integrateOrbits(model, particles, { time: 1.7 });
	expect(Math.abs(Math.hypot(particles.x[0], particles.y[0]) - 8)).toBeLessThan(1e-5);
});

test('takes no step where there is no time, and refuses what is no number', () => {
	const model = massModel({ components: [] });
	const particles = makeParticles(2);
	particles.vx[1] = 10;
	expect(integrateOrbits(model, particles, { time: 0 })).toBe(0);
	// Nothing pulls: straight on, 10 km/s for one kpc/(km/s).
	integrateOrbits(model, particles, { time: 1 });
	expect(particles.x[1]).toBe(10);
	expect(() => integrateOrbits(model, particles, { time: NaN })).toThrow(/time must be a number/);
	expect(() => integrateOrbits(model, particles, { time: 1, step: 0 })).toThrow(
		/step must be above 0/
	);
});
