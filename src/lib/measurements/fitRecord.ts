import { z } from 'zod';
import { massModelSpecSchema } from '../dynamics/schema';

const words = (most: number) => z.string().max(most);
const size = z.number().min(0);

/** One parameter that was free, with what was found. */
const freeParameterSchema = z.strictObject({
	componentId: words(64),
	/** What people call the component. */
	component: words(120),
	parameter: words(64),
	label: words(120),
	/** Empty for a pure number. */
	unit: words(32),
	min: z.number(),
	max: z.number(),
	value: z.number(),
	/** One standard error; null where the data say nothing of it. */
	error: size.nullable(),
	atBound: z.enum(['min', 'max']).nullable()
});

/**
 * A fit as it is kept with its galaxy and printed: which data, with which settings, and what came out.
 * Lengths kpc, speeds km/s, masses Msun.
 */
export const fitRecordSchema = z.strictObject({
	version: z.literal(1),
	/** Version of Farwheel that computed it. */
	computedBy: words(32),
	measurements: z.strictObject({ id: z.uuid(), name: words(120), source: words(1000) }),
	points: z.strictObject({
		used: z.number().int().min(1),
		leftOut: z.number().int().min(0),
		innermost: size,
		outermost: size
	}),
	start: massModelSpecSchema,
	result: massModelSpecSchema,
	free: z.array(freeParameterSchema).min(1).max(32),
	/** Correlation of the free parameters; null where it could not be had. */
	correlation: z.array(z.array(z.number().min(-1.001).max(1.001))).nullable(),
	chiSquared: size,
	degreesOfFreedom: z.number().int(),
	/** Null without degrees of freedom. */
	reducedChiSquared: size.nullable(),
	converged: z.boolean(),
	starts: z.number().int().min(1),
	seed: z.number().int(),
	/** Why the data cannot decide between values; null where they can. */
	undecided: words(1000).nullable(),
	/** Inside the outermost point that was used. */
	inside: z.strictObject({ lit: size, unlit: size, dynamical: size })
});
export type FitRecord = z.infer<typeof fitRecordSchema>;
export type FreeParameterRecord = FitRecord['free'][number];
