import { z } from 'zod';
import { mostRows } from './limits';
import { faultOf } from './readRow';
import { radiusUnits, speedUnits } from './types';

/** Signs that no database and no CSV carries through, and lines within what is one line. */
const unfit = /[\p{Cc}\p{Cs}\p{Zl}\p{Zp}]/u;
const unfitButLines = /(?!\n)[\p{Cc}\p{Cs}\p{Zl}\p{Zp}]/u;

const oneLine = (most: number, empty: string) =>
	z
		.string()
		.trim()
		.min(1, empty)
		.max(most)
		.refine((text) => !unfit.test(text), 'There are signs in this that cannot be shown.');

export const nameSchema = oneLine(120, 'Give the table a name.');
export const reasonSchema = oneLine(300, 'Say why the point does not count.');
export const sourceSchema = z
	.string()
	.trim()
	.min(1, 'Say where the points come from.')
	.max(1000)
	.refine((text) => !unfitButLines.test(text), 'There are signs in this that cannot be shown.');

const number = z.number();
const rowSchema = z.strictObject({
	radius: number,
	speed: number,
	error: number,
	gas: number.optional(),
	disc: number.optional(),
	bulge: number.optional(),
	leftOut: reasonSchema.optional()
});

const spread = z.number().gt(0).nullable();
/** Mpc. */
export const distanceSchema = z.strictObject({
	value: z.number().gt(0, 'The distance must be more than 0 Mpc.').max(20_000),
	error: spread
});
/** Degrees, 90 is edge-on. */
export const inclinationSchema = z.strictObject({
	value: z.number().gt(0).max(90, 'The inclination is between 0 and 90 degrees; 90 is edge-on.'),
	error: spread
});

/** A whole table as somebody wants to save it; rows in the units it names. */
export const tableSchema = z
	.strictObject({
		name: nameSchema,
		source: sourceSchema,
		radiusUnit: z.enum(radiusUnits).default('kpc'),
		speedUnit: z.enum(speedUnits).default('km/s'),
		distance: distanceSchema.nullable().default(null),
		inclination: inclinationSchema.nullable().default(null),
		rows: z
			.array(rowSchema)
			.min(1, 'A table needs at least one point.')
			.max(mostRows, `A table may have at most ${mostRows.toLocaleString('en-GB')} points.`)
	})
	.superRefine((table, refinement) => {
		const angle = table.radiusUnit === 'arcsec' || table.radiusUnit === 'arcmin';
		if (angle && table.distance === null) {
			refinement.addIssue({
				code: 'custom',
				path: ['distance'],
				message: 'Give the distance: an angle on the sky becomes a radius in kpc only with it.'
			});
		}
		for (const [i, row] of table.rows.entries()) {
			for (const role of ['radius', 'speed', 'error', 'gas', 'disc', 'bulge'] as const) {
				const value = row[role];
				const fault = value === undefined ? null : faultOf(role, value, table);
				if (!fault) continue;
				refinement.addIssue({ code: 'custom', path: ['rows', i, role], message: fault });
				return;
			}
		}
	});
