import type { Frame, StarLayer, View } from '../../src/lib/picture/frame';
import { initialLook } from '../../src/lib/show/galaxy';
import {
	createRingTable,
	makeStarList,
	ringOf,
	sampleBackground,
	type GalaxyLook,
	type RingTable
} from '../../src/lib/starfield';

/** No arms and no dust: a star's light does not depend on where it is. */
export const plainLook: GalaxyLook = {
	...initialLook,
	spiral: { ...initialLook.spiral, arms: 0 },
	dust: 0
};

export const emptySky = sampleBackground(1, 0);

export interface LoneStar {
	R: number;
	azimuth?: number;
	z?: number;
	light?: number;
	size?: number;
	colour?: [number, number, number];
}

/** A layer of a few white stars at given places, on a ring table of its own. */
export function loneStars(list: LoneStar[], rings: RingTable = createRingTable(25)): StarLayer {
	return {
		stars: makeStarList(
			list.map(({ R, azimuth = 0, z = 0, light = 1, size = 1, colour = [255, 255, 255] }) => ({
				ring: ringOf(rings.radii, R),
				x: R * Math.cos(azimuth),
				y: R * Math.sin(azimuth),
				z,
				armPhase: 0,
				light,
				colour,
				size,
				population: 1
			})),
			rings.radii.length
		),
		rings,
		look: plainLook,
		patternAngle: 0,
		half: 'whole'
	};
}

export const makeFrame = (
	layers: StarLayer[],
	view: Partial<View> = {},
	more: Partial<Frame> = {}
): Frame => ({
	geometry: { apertureDegrees: 180, tiltDegrees: 0 },
	view: { distance: 45, inclination: 30, turn: 0, centreAltitude: 45, ...view },
	layers,
	background: emptySky,
	colour: 'light',
	speedRange: [0, 300],
	exposure: 1,
	...more
});

/** Middle of the light of a film in pixels, pixel centres at half numbers; null where it is black. */
export function centroid(
	pixels: ArrayLike<number>,
	size: number
): { x: number; y: number; light: number } | null {
	let light = 0;
	let x = 0;
	let y = 0;
	for (let j = 0; j < size; j++) {
		for (let i = 0; i < size; i++) {
			const at = 4 * (j * size + i);
			const w = pixels[at] + pixels[at + 1] + pixels[at + 2];
			if (w === 0) continue;
			light += w;
			x += w * (i + 0.5);
			y += w * (j + 0.5);
		}
	}
	return light === 0 ? null : { x: x / light, y: y / light, light };
}
