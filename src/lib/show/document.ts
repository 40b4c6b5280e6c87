import { z } from 'zod';

/** Version of the show document written by this program. Older ones go through `upgrades`. */
export const documentVersion = 1;

const finite = (min: number, max: number) => z.number().min(min).max(max);
const text = (max: number) => z.string().max(max);

/** What one live control moves. */
export const controlTargetSchema = z.discriminatedUnion('kind', [
	/** Multiplies every unlit component of the scene's galaxy. */
	z.strictObject({ kind: z.literal('halo-factor') }),
	/** Multiplies every lit component. */
	z.strictObject({ kind: z.literal('star-factor') }),
	/** Million years that pass in one second. */
	z.strictObject({ kind: z.literal('rate') }),
	/** One parameter of one component. */
	z.strictObject({
		kind: z.literal('parameter'),
		componentId: text(60).min(1),
		parameter: text(60).min(1)
	})
]);
export type ControlTarget = z.infer<typeof controlTargetSchema>;

export const liveControlSchema = z
	.strictObject({
		id: z.uuid(),
		label: text(60).min(1, 'Give the control a name the presenter will know.'),
		target: controlTargetSchema,
		min: z.number(),
		max: z.number(),
		rest: z.number()
	})
	.refine((c) => c.min < c.max, {
		path: ['max'],
		message: 'The upper limit must be above the lower one.'
	})
	.refine((c) => c.rest >= c.min && c.rest <= c.max, {
		path: ['rest'],
		message: 'The resting value must lie between the limits.'
	});
export type LiveControl = z.infer<typeof liveControlSchema>;

export const paceSchema = z.discriminatedUnion('kind', [
	z.strictObject({ kind: z.literal('timed'), seconds: finite(1, 3600) }),
	z.strictObject({ kind: z.literal('presenter'), expectedSeconds: finite(1, 3600) })
]);

export const subjectSchema = z.discriminatedUnion('kind', [
	z.strictObject({ kind: z.literal('galaxy'), galaxyId: z.uuid() }),
	/** Black with the faint background sky and an optional name. */
	z.strictObject({ kind: z.literal('dark'), name: text(80) })
]);

export const viewSchema = z.strictObject({
	/** kpc from the centre to the eye. */
	distance: finite(5, 400),
	/** Degrees: 0 face-on, 90 edge-on. */
	inclination: finite(0, 180),
	/** Degrees: turns the picture about the line of sight. */
	turn: finite(-180, 180),
	/** Degrees above the room's horizon at which the centre stands, in front. */
	centreAltitude: finite(0, 90)
});

export const drawingsSchema = z.strictObject({
	/** Speed chart, and which of its curves. */
	chart: z.boolean(),
	chartLit: z.boolean(),
	chartTotal: z.boolean(),
	chartMeasured: z.boolean(),
	/** Radii of marked rings, kpc. */
	rings: z.array(finite(0.1, 200)).max(6),
	/** Name of the galaxy under the picture. */
	name: z.boolean(),
	/** Colour scale, useful when stars are coloured by speed. */
	scale: z.boolean(),
	/** A line that the dome itself shows, low in front; figures in braces are computed. */
	caption: text(200)
});

export const sceneSchema = z.strictObject({
	id: z.uuid(),
	title: text(120).min(1, 'Give the scene a title.'),
	pace: paceSchema,
	subject: subjectSchema,
	mix: z.strictObject({ haloFactor: finite(0, 2), starFactor: finite(0, 3) }),
	/** halves: same stars, left without the halo, right with it. */
	comparison: z.enum(['none', 'halves']),
	motion: z.strictObject({
		/** Million years in one second of show time; 0 stands still. */
		rate: finite(0, 100),
		begin: z.enum(['fresh', 'go-on'])
	}),
	view: viewSchema,
	colour: z.enum(['light', 'speed']),
	drawings: drawingsSchema,
	/** Words for the presenter; figures in braces are computed from the scene's galaxy. */
	script: text(8000),
	/** A note to the presenter that is not spoken. */
	note: text(2000),
	controls: z.array(liveControlSchema).max(6),
	entrance: z.discriminatedUnion('kind', [
		z.strictObject({ kind: z.literal('cut') }),
		z.strictObject({ kind: z.literal('fade'), seconds: finite(0.5, 20) })
	])
});
export type Scene = z.infer<typeof sceneSchema>;

export const audiences = [
	'under 5',
	'5 to 7',
	'7 to 11',
	'11 to 14',
	'14 to 18',
	'adults',
	'mixed family'
] as const;

export const showDocumentSchema = z.strictObject({
	version: z.literal(documentVersion),
	title: text(120).min(1, 'Give the show a title.'),
	audience: z.enum(audiences),
	summary: text(1000),
	targetMinutes: finite(1, 180),
	/** Seed of the sky and of every star; same seed, same sky, everywhere. */
	seed: z.number().int().min(1).max(2147483647),
	scenes: z.array(sceneSchema).max(200)
});
export type ShowDocument = z.infer<typeof showDocumentSchema>;
