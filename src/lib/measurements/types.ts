/** One observed speed: radius in kpc, speed and its one standard error in km/s. */
export interface MeasuredPoint {
	radius: number;
	speed: number;
	error: number;
	/** Speeds that gas, disc and bulge alone would give, km/s, stars at mass-to-light 1; negative: outward. */
	gas?: number;
	disc?: number;
	bulge?: number;
	/** Why the point does not count; missing where it does. */
	leftOut?: string;
}

export const radiusUnits = ['kpc', 'pc', 'arcsec', 'arcmin', 'light-years'] as const;
export type RadiusUnit = (typeof radiusUnits)[number];

export const speedUnits = ['km/s', 'm/s'] as const;
export type SpeedUnit = (typeof speedUnits)[number];

/** A value with its one standard error; null where none is given. */
export interface Measured {
	value: number;
	error: number | null;
}

/** Observed speeds as they came: the rows keep the units of their source. */
export interface MeasuredRows {
	radiusUnit: RadiusUnit;
	speedUnit: SpeedUnit;
	/** Mpc; angles need it. */
	distance: Measured | null;
	/** Degrees, 90 is edge-on. */
	inclination: Measured | null;
	/** As `MeasuredPoint`, in the units above. */
	rows: readonly MeasuredPoint[];
}

/** A whole table as it is saved and exported: what was measured, by whom, in which units. */
export interface MeasurementsInput extends MeasuredRows {
	name: string;
	/** Citation, or a plain statement that the points are invented. Never empty. */
	source: string;
}
