import { z } from 'zod';
import { massModelSpecSchema } from '../dynamics/schema';

const finite = (min: number, max: number) => z.number().min(min).max(max);

export const galaxyLookSchema = z.strictObject({
	spiral: z.strictObject({
		arms: z.number().int().min(0).max(6),
		pitchDegrees: finite(5, 40),
		patternSpeed: finite(0, 100),
		strength: finite(0, 1)
	}),
	dust: finite(0, 1),
	gasClouds: z.number().int().min(0).max(1000),
	outerRadius: finite(1, 200),
	bulgeTemperature: finite(2500, 12000),
	discTemperature: finite(2500, 12000),
	armTemperature: finite(2500, 30000)
});

/** A galaxy as it is kept and frozen: how it moves, how it looks, where it comes from. */
export const galaxyDocumentSchema = z.strictObject({
	version: z.literal(1),
	name: z.string().min(1, 'Give the galaxy a name.').max(120),
	model: massModelSpecSchema,
	look: galaxyLookSchema,
	/** Citations and statements such as "Invented for this venue", one a line. */
	sources: z.string().max(4000),
	/** kpc; where the reading line of the tuning page rests. */
	readingRadius: finite(0.1, 200)
});
export type GalaxyDocument = z.infer<typeof galaxyDocumentSchema>;

export const initialLook: z.infer<typeof galaxyLookSchema> = {
	spiral: { arms: 2, pitchDegrees: 16, patternSpeed: 22, strength: 0.8 },
	dust: 0.7,
	gasClouds: 300,
	outerRadius: 25,
	bulgeTemperature: 4300,
	discTemperature: 5600,
	armTemperature: 14000
};
