import type { Acceleration, MassModel } from '../types';
import type { Particles } from './particles';

export interface OrbitOptions {
	/** How long, kpc/(km/s); below 0 goes back in time. */
	time: number;
	/** Longest step, kpc/(km/s); `usualStep` where missing. */
	step?: number;
}

/**
 * Share of the shortest time √(r/|a|) among the particles that one step lasts. On a circle that is
 * 1/12566 of a turn; the phase then runs ahead by step²/24 of itself, 1e-8.
 */
const share = 0.0005;

/**
 * A step short enough for every particle where it is now, kpc/(km/s): energies then stay within 1e-5
 * over 100 turns, and places within 1e-4 kpc over 500 Myr at the Sun's distance (tested). Orbits that
 * plunge to the centre later need a shorter one.
 */
export function usualStep(model: MassModel, particles: Particles): number {
	const pull: Acceleration = { R: 0, z: 0 };
	let shortest = Infinity;
	for (let i = 0; i < particles.x.length; i++) {
		const { x, y, z } = particles;
		const R = Math.hypot(x[i], y[i]);
		model.acceleration(R, z[i], pull);
		const size = Math.hypot(pull.R, pull.z);
		if (size > 0) shortest = Math.min(shortest, Math.sqrt(Math.hypot(R, z[i]) / size));
	}
	return share * shortest;
}

/**
 * Moves particles in place by kick, drift, kick (leapfrog), in equal steps. Time-reversible and
 * without drift of the energy on the average. Verlet 1967, Phys. Rev. 159, 98;
 * Binney and Tremaine 2008, Sec. 3.4.1.
 * @returns how many steps were taken
 * @throws RangeError where time or step is no number or the step is not above 0
 */
export function integrateOrbits(
	model: MassModel,
	particles: Particles,
	{ time, step = usualStep(model, particles) }: OrbitOptions
): number {
	if (!Number.isFinite(time)) throw new RangeError(`The time must be a number, not ${time}.`);
	if (!(step > 0)) throw new RangeError(`The step must be above 0 kpc/(km/s), not ${step}.`);
	if (time === 0) return 0;
	// Where nothing pulls, one step is as good as many.
	const steps = Math.max(1, Math.ceil(Math.abs(time) / Math.min(step, Math.abs(time))));
	const h = time / steps;
	const { x, y, z, vx, vy, vz } = particles;
	const pull: Acceleration = { R: 0, z: 0 };
	for (let i = 0; i < x.length; i++) {
		let [px, py, pz, ux, uy, uz] = [x[i], y[i], z[i], vx[i], vy[i], vz[i]];
		let R = Math.sqrt(px * px + py * py);
		model.acceleration(R, pz, pull);
		for (let k = 0; k < steps; k++) {
			let along = R > 0 ? (0.5 * h * pull.R) / R : 0;
			ux += along * px;
			uy += along * py;
			uz += 0.5 * h * pull.z;
			px += h * ux;
			py += h * uy;
			pz += h * uz;
			R = Math.sqrt(px * px + py * py);
			model.acceleration(R, pz, pull);
			along = R > 0 ? (0.5 * h * pull.R) / R : 0;
			ux += along * px;
			uy += along * py;
			uz += 0.5 * h * pull.z;
		}
		x[i] = px;
		y[i] = py;
		z[i] = pz;
		vx[i] = ux;
		vy[i] = uy;
		vz[i] = uz;
	}
	return steps;
}
