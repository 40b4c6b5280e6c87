/**
 * Constants and conversions of the one unit system of the core: kpc, km/s, Msun, radian.
 * The unit of time is kpc/(km/s); million years appear only at the edges.
 */

/** kpc (km/s)² / Msun. Nominal solar mass parameter (IAU 2015 resolution B3) and the IAU parsec. */
export const G = 4.300917270036279e-6;

/** 1 km/s in kpc/Gyr. Julian year, IAU parsec. */
export const KPC_PER_GYR_IN_KM_S = 1.0227121650537077;

/** Million years in one kpc/(km/s): 1000 / 1.0227121650537077 = 977.792. */
export const MYR_PER_TIME_UNIT = 1000 / KPC_PER_GYR_IN_KM_S;

/** Light years in one kpc. IAU parsec, Julian light year. */
export const LIGHT_YEARS_PER_KPC = 3261.563777;

/** Metres in one kpc: the IAU parsec, 648 000/π au (IAU 2015 resolution B2), au of IAU 2012 B2. */
export const METRES_IN_KPC = (1000 * 648_000 * 149_597_870_700) / Math.PI;

/** km/s, exact by the definition of the metre (SI, 1983). */
export const LIGHT_SPEED = 299_792.458;

/** Playback ticks in one second of show time. */
export const TICKS_PER_SECOND = 60;

export const DEGREE = Math.PI / 180;
export const TAU = 2 * Math.PI;

/** @param myr million years @returns the same time in kpc/(km/s) */
export const timeFromMyr = (myr: number): number => myr / MYR_PER_TIME_UNIT;

/** @param time kpc/(km/s) @returns the same time in million years */
export const myrFromTime = (time: number): number => time * MYR_PER_TIME_UNIT;

/** @param kpc kiloparsec @returns light years */
export const lightYearsFromKpc = (kpc: number): number => kpc * LIGHT_YEARS_PER_KPC;

/** @param lightYears light years @returns kpc */
export const kpcFromLightYears = (lightYears: number): number => lightYears / LIGHT_YEARS_PER_KPC;
