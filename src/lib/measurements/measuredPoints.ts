import { DEGREE, kpcFromLightYears } from '../units';
import type { MeasuredPoint, MeasuredRows, RadiusUnit, SpeedUnit } from './types';

/** km/s in one unit of speed. */
export const kmsIn = (unit: SpeedUnit): number => (unit === 'm/s' ? 0.001 : 1);

/**
 * kpc in one unit of radius. An angle needs the distance: small angles, radius = distance × angle.
 * @param distance Mpc @returns NaN for an angle without a distance
 */
export function kpcIn(unit: RadiusUnit, distance: number | null): number {
	const radian = distance === null ? NaN : 1000 * distance;
	switch (unit) {
		case 'kpc':
			return 1;
		case 'pc':
			return 0.001;
		case 'light-years':
			return kpcFromLightYears(1);
		case 'arcmin':
			return (radian * DEGREE) / 60;
		case 'arcsec':
			return (radian * DEGREE) / 3600;
	}
}

/** The rows of a table in kpc and km/s; those of an angle without a distance are not to be had: none. */
export function measuredPoints(table: MeasuredRows): MeasuredPoint[] {
	const length = kpcIn(table.radiusUnit, table.distance?.value ?? null);
	const speed = kmsIn(table.speedUnit);
	if (!(length > 0)) return [];
	// Most tables are in these units already; then not even the last digit changes.
	if (length === 1 && speed === 1) return table.rows.map((row) => ({ ...row }));
	const scaled = (value: number | undefined) => (value === undefined ? undefined : value * speed);
	return table.rows.map((row) => ({
		...row,
		radius: row.radius * length,
		speed: row.speed * speed,
		error: row.error * speed,
		...(row.gas === undefined ? {} : { gas: scaled(row.gas) }),
		...(row.disc === undefined ? {} : { disc: scaled(row.disc) }),
		...(row.bulge === undefined ? {} : { bulge: scaled(row.bulge) })
	}));
}
