import { DEGREE, LIGHT_SPEED } from '../units';

/** Rest frequency of the 21 cm line of hydrogen, MHz (from memory; Hellwig et al. 1970). */
export const hydrogenLine = 1420.405751768;

/**
 * Frequency at which a telescope hears hydrogen that turns with a speed, on the side of the disc that
 * comes toward us (above 0) or goes away (below): f = f0 √((1 + β)/(1 − β)), β = v sin i / c.
 * @param speed km/s, above 0 toward us @param inclination degrees, 90 is edge-on @returns MHz
 */
export function lineFrequency(speed: number, inclination: number): number {
	const beta = (speed * Math.sin(inclination * DEGREE)) / LIGHT_SPEED;
	return hydrogenLine * Math.sqrt((1 + beta) / (1 - beta));
}

/**
 * The shift f − f0, MHz. For small speeds f0 v sin i / c; taken so that no digit is lost there.
 * @param speed km/s, above 0 toward us @param inclination degrees
 */
export function lineShift(speed: number, inclination: number): number {
	const beta = (speed * Math.sin(inclination * DEGREE)) / LIGHT_SPEED;
	return hydrogenLine * Math.expm1(Math.atanh(beta));
}
