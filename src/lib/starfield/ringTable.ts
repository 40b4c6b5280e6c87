import type { MassModel } from '../dynamics/types';
import type { RingTable } from './types';

export const defaultRingCount = 1024;
/** Share of the linear term in the spacing of rings: finer toward the centre, never empty there. */
const linearShare = 0.25;

/**
 * Rings of stars that share one angle. With 1,024 rings to 25 kpc they lie 25 pc apart at 8 kpc, so
 * a star's speed is that of a radius at most 0.16 % off its own.
 * @param outerRadius kpc @returns angles at zero, speeds not yet set
 */
export function createRingTable(
	outerRadius: number,
	ringCount: number = defaultRingCount
): RingTable {
	const radii = Float64Array.from({ length: ringCount }, (_, k) => {
		const s = (k + 0.5) / ringCount;
		return outerRadius * s * (linearShare + (1 - linearShare) * s);
	});
	return { radii, omega: new Float64Array(ringCount), phase: new Float64Array(ringCount) };
}

/** @returns index of the ring nearest to R (kpc) */
export function ringOf(radii: ArrayLike<number>, R: number): number {
	let low = 0;
	let high = radii.length - 1;
	while (high - low > 1) {
		const middle = (low + high) >> 1;
		if (radii[middle] <= R) low = middle;
		else high = middle;
	}
	return R - radii[low] <= radii[high] - R ? low : high;
}

/** Takes Ω from a model; the angles go on from where they are. 0 where the net pull is outward. */
export function setModel(table: RingTable, model: Pick<MassModel, 'circularFrequency'>): void {
	for (let k = 0; k < table.radii.length; k++) {
		table.omega[k] = model.circularFrequency(table.radii[k]) || 0;
	}
}

/** Lets time pass. @param time kpc/(km/s) */
export function advance(table: RingTable, time: number): void {
	for (let k = 0; k < table.phase.length; k++) table.phase[k] += table.omega[k] * time;
}
