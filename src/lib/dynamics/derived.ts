import { myrFromTime, TAU } from '../units';
import type { MassModel } from './types';

/** @param R kpc @returns time of one turn on a circular orbit, million years */
export function orbitTimeMyr(model: MassModel, R: number): number {
	return myrFromTime(TAU / model.circularFrequency(R));
}

export interface MassBreakdown {
	/** Msun. */
	lit: number;
	/** Msun. */
	unlit: number;
	/** Unlit over lit: Infinity without lit matter, NaN where there is nothing at all. */
	ratio: number;
}

/**
 * What the components hold themselves: round ones inside the sphere r, discs inside the cylinder r.
 * This is not the dynamical mass v²R/G that a speed implies.
 * @param r kpc
 */
export function massBreakdown(model: MassModel, r: number): MassBreakdown {
	const lit = model.lit().enclosedMass(r);
	const unlit = model.unlit().enclosedMass(r);
	return { lit, unlit, ratio: unlit / lit };
}
