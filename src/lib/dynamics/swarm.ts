import { G } from '../units';

/**
 * What the estimate takes for granted, for whoever reads the number.
 * Wolf et al. 2010, MNRAS 406, 1220 (from memory).
 */
export const wolfAssumptions =
	'A swarm of stars at rest as a whole and in balance, round, and of about the same dispersion everywhere. Then the mass inside the half-light radius hardly depends on which way the stars move. Streams, binaries and turning are not allowed for.';

/**
 * Mass inside the 3D half-light radius of a swarm held up by its own motions: 3 σ² r / G.
 * Wolf et al. 2010, MNRAS 406, 1220.
 * @param dispersion σ along the line of sight, km/s
 * @param halfLightRadius in three dimensions, kpc; about 4/3 of the one on the sky
 * @returns Msun
 */
export const wolfMass = (dispersion: number, halfLightRadius: number): number =>
	(3 * dispersion * dispersion * halfLightRadius) / G;

/** The 3D half-light radius from the one on the sky, in the same unit: 4/3, good to 2 % (same source). */
export const halfLightRadius3d = (onTheSky: number): number => (4 / 3) * onTheSky;

/**
 * The virial mass k σ² r / G of a whole swarm.
 * @param k 5 for a uniform sphere and its radius; others by the profile
 */
export const virialMass = (dispersion: number, radius: number, k = 5): number =>
	(k * dispersion * dispersion * radius) / G;
