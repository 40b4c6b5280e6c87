import { G } from '../../units';

/** What follows from the mass, concentration and Hubble constant of an NFW halo. */
export interface NfwHalo {
	/** Characteristic density ρ0, Msun/kpc³. */
	density: number;
	/** rs, kpc. */
	scaleRadius: number;
	/** r200, kpc: the mean density inside is 200 times the critical one. */
	radius200: number;
	/** Circular speed at r200, km/s. */
	speed200: number;
}

/** @param hubble km/s/Mpc @returns 3 H² / (8πG), Msun/kpc³ */
export function criticalDensity(hubble: number): number {
	const h = hubble / 1000;
	return (3 * h * h) / (8 * Math.PI * G);
}

/**
 * m(x) = ln(1 + x) − x/(1 + x). Below 0.05 the two terms nearly cancel, so there the series
 * Σ (−1)^k x^k (k − 1)/k from k = 2 is summed to x^13 (relative error below 1e-15).
 */
export function nfwMassFunction(x: number): number {
	if (x >= 0.05) return Math.log1p(x) - x / (1 + x);
	let sum = 0;
	for (let k = 13; k >= 2; k--) sum = (k - 1) / k - x * sum;
	return x * x * sum;
}

/**
 * @param mass200 Msun inside r200
 * @param concentration r200 / rs
 * @param hubble km/s/Mpc
 * Navarro, Frenk and White 1997, ApJ 490, 493.
 */
export function nfwHalo(mass200: number, concentration: number, hubble: number): NfwHalo {
	const radius200 = Math.cbrt((3 * mass200) / (800 * Math.PI * criticalDensity(hubble)));
	const scaleRadius = radius200 / concentration;
	return {
		density: mass200 / (4 * Math.PI * scaleRadius ** 3 * nfwMassFunction(concentration)),
		scaleRadius,
		radius200,
		speed200: Math.sqrt((G * mass200) / radius200)
	};
}
