import type { MassModel } from '../types';
import type { Particles } from './particles';

/**
 * Energy of each particle for each unit of its mass, (km/s)²: v²/2 + Φ in the model as it is now.
 * @param out at least as long; filled and returned
 */
export function energies(
	model: MassModel,
	{ x, y, z, vx, vy, vz }: Particles,
	out: Float64Array
): Float64Array {
	for (let i = 0; i < x.length; i++) {
		const kinetic = 0.5 * (vx[i] * vx[i] + vy[i] * vy[i] + vz[i] * vz[i]);
		out[i] = kinetic + model.potential(Math.hypot(x[i], y[i]), z[i]);
	}
	return out;
}

/**
 * How many particles the model holds for ever: those whose energy is below that of a star at rest
 * infinitely far away. All of them where nothing escapes.
 */
export function countBound(model: MassModel, particles: Particles): number {
	const count = particles.x.length;
	if (model.escapeVelocity(1) === Infinity) return count;
	const energy = energies(model, particles, new Float64Array(count));
	let bound = 0;
	for (const one of energy) if (one < 0) bound++;
	return bound;
}
