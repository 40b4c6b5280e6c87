/** Populations, in the order of the numbers in `StarList.population`. */
export const populations = ['bulge', 'disc', 'arm', 'gas-cloud'] as const;
export type Population = (typeof populations)[number];

/**
 * Stars sampled once from the lit components, sorted by ring. All arrays have `count` entries.
 * Galaxy frame: the disc lies in z = 0 and turns counter-clockwise seen from +z; kpc.
 */
export interface StarList {
	count: number;
	seed: number;
	/** Index into the ring table. */
	ring: Uint16Array;
	/** Position at angle zero: x0 = r cos φ0, y0 = r sin φ0, z; kpc. */
	x0: Float32Array;
	y0: Float32Array;
	z: Float32Array;
	/** cos and sin of the star's arm phase at angle zero (`armPhase`); a ring turns it by m(Φ − pattern). */
	armCos: Float32Array;
	armSin: Float32Array;
	/** Linear light of the star, relative; 1 is a typical disc star. */
	light: Float32Array;
	/** Three bytes a star, sRGB at full light. */
	colour: Uint8Array;
	/** Sprite diameter relative to the smallest star, 1 to 12. */
	size: Float32Array;
	population: Uint8Array;
	/** First star of each ring; ringStart[K] = count. */
	ringStart: Uint32Array;
}

export interface SpiralPattern {
	/** Number of arms, 2 to 6; 0 means none. */
	arms: number;
	/** Pitch angle, degrees, 5 to 40. */
	pitchDegrees: number;
	/** Pattern speed, km/s/kpc: the arms turn at this rate whatever the stars do. */
	patternSpeed: number;
	/** 0 to 1: how much the arms stand out. */
	strength: number;
}

/**
 * What every star of one radius shares. Angles are radians and go on when the mass model changes.
 */
export interface RingTable {
	/** K radii, kpc, rising. */
	radii: Float64Array;
	/** Ω of the model in force, km/s/kpc. 0 where the net pull is outward. */
	omega: Float64Array;
	/** Angle turned so far, Φ(r) = ∫Ω dt, radians, not wrapped. */
	phase: Float64Array;
}

/** How a galaxy looks; the mass model says how it moves. Kept with the galaxy. */
export interface GalaxyLook {
	spiral: SpiralPattern;
	/** 0 to 1: depth of the dust lanes on the inner edge of the arms. */
	dust: number;
	/** Pink gas clouds in the arms, 0 to 1000. */
	gasClouds: number;
	/** kpc; stars are sampled and rings kept out to here. */
	outerRadius: number;
	/** Colour temperatures, K: the old bulge, the old disc, the young arm stars. */
	bulgeTemperature: number;
	discTemperature: number;
	armTemperature: number;
}

/** Faint stars of our own sky behind the galaxy: fixed sky directions, not part of any model. */
export interface BackgroundSky {
	count: number;
	/** Unit vectors in the room's frame (see dome/types), three numbers a star. */
	directions: Float32Array;
	light: Float32Array;
	colour: Uint8Array;
}
