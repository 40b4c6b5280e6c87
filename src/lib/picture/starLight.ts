import { populations, type GalaxyLook } from '../starfield/types';

/** Entries of one population's table: 128 for the front of an arm and 128 for its inner edge. */
export const tableSize = 256;
const half = tableSize / 2;

/** How narrow the arms of each population are: young stars and gas hug the ridge. */
const sharpness = { bulge: 0, disc: 1.1, arm: 2.6, 'gas-cloud': 5 } as const;
/** Light between the arms, as a share of that on the ridge at full strength. */
const floor = { bulge: 1, disc: 0.42, arm: 0.07, 'gas-cloud': 0 } as const;
/** The dust lane runs this far behind the ridge (radians of arm phase) and is this wide. */
const laneAt = -1.05;
const laneWidth = 0.3;
/** How much of each population's light the lane takes: gas clouds lie in front of it. */
const laneTakes = { bulge: 0.25, disc: 0.85, arm: 0.95, 'gas-cloud': 0.3 } as const;

/**
 * Index of an arm phase in a table: by its cosine, and by the sign of its sine. No arc tangent in
 * the frame; the GLSL painter computes the same index.
 */
export const lightIndex = (cosine: number, sine: number): number =>
	Math.min(half - 1, ((cosine + 1) * 0.5 * half) | 0) + (sine < 0 ? half : 0);

/**
 * Light of a star by where it stands in the density wave: four tables of 256, in the order of
 * `populations`. 1 is the light on the ridge of an arm; without arms everything is 1.
 */
export function lightTables(look: GalaxyLook): Float32Array {
	const tables = new Float32Array(populations.length * tableSize).fill(1);
	const { arms, strength } = look.spiral;
	if (arms === 0) return tables;
	populations.forEach((population, p) => {
		for (let i = 0; i < tableSize; i++) {
			const cosine = (((i % half) + 0.5) / half) * 2 - 1;
			const phase = Math.acos(cosine) * (i < half ? 1 : -1);
			const ridge = Math.exp((cosine - 1) * sharpness[population]);
			const low = 1 - (1 - floor[population]) * strength;
			const wave = low + (1 - low) * ridge;
			const lane = Math.exp(-(((phase - laneAt) / laneWidth) ** 2));
			tables[p * tableSize + i] = wave * (1 - look.dust * laneTakes[population] * lane);
		}
	});
	return tables;
}

/** Film across and star count at which a star of light 1 has the brightness below. */
const referenceFilm = 2048;
const referenceCount = 100_000;
/** Brightness (of 255, summed over its pixels) of a star of light 1 at the reference. */
const starBrightness = 145;

/**
 * Brightness of a star of light 1. Few stars on a large film must each give more and many on a small
 * one less, so that the galaxy keeps its surface brightness; not in full where they are few, since
 * single stars would glare. Kept within what eight bits can show.
 * @param filmSize pixels across @param count stars of the galaxy
 */
export function starGain(filmSize: number, count: number): number {
	const spread = (filmSize / referenceFilm) ** 2 * (referenceCount / Math.max(1, count));
	const share = spread < 1 ? Math.max(0.12, spread ** 0.85) : Math.min(2.4, spread ** 0.6);
	return starBrightness * share;
}

/** Radius in pixels of a sprite of size 1 is one; larger ones grow with the film. */
export const spriteRadius = (size: number, filmSize: number): number =>
	Math.max(1, (size * filmSize) / referenceFilm);

/** Light of a background star of light 1, of 255. */
export const backgroundBrightness = 110;

/** Brightness in the middle of a soft spot against that of a point of the same light. */
export const spotShare = 0.2;

/** Stars that would add less than this share of white are left out; eight bits cannot hold them. */
export const dimmestLight = 0.004;

/**
 * A near star is brighter, by the square of its distance, up to four times; at the reference
 * distance (twice the outer radius) it is 1, and the surface keeps its brightness as it shrinks.
 * @param reference2 and @param distance2 squared distances, kpc²
 */
export const nearnessLight = (reference2: number, distance2: number): number =>
	Math.min(4, reference2 / distance2);

/**
 * By population, the power with which a layer seen aslant is dimmed. Edge-on the light of a disc falls
 * on few pixels and would only be white; real discs hide themselves there, round bulges do not.
 */
export const slantLight = [0.15, 0.7, 0.55, 0.3] as const;

/** Share of the light where colour tells speed: hues must not run into white. */
export const speedShare = 0.85;

/**
 * The thin sheet of dust in the plane, which dims what lies behind it: hardly anything face-on, a dark
 * lane across the middle edge-on. Lengths in kpc, or as a share of the outer radius.
 */
export const dustScreen = {
	halfHeight: 0.13,
	reach: 0.55,
	/** Optical depth straight through, at full dust. */
	depth: 0.16,
	/** Sine of the least angle between sheet and line of sight; it is never quite flat. */
	leastSlope: 0.035,
	leastLight: 0.1
} as const;
