import type { StarList } from './types';

/** One star before it is put into the list. Lengths in kpc, angles in radians. */
export interface StarDraft {
	ring: number;
	x: number;
	y: number;
	z: number;
	armPhase: number;
	light: number;
	colour: readonly [number, number, number];
	size: number;
	/** Index in `populations`. */
	population: number;
}

/** Puts stars into arrays, sorted by ring (and otherwise in the order given). */
export function makeStarList(drafts: readonly StarDraft[], ringCount: number, seed = 0): StarList {
	const count = drafts.length;
	const ringStart = new Uint32Array(ringCount + 1);
	for (const { ring } of drafts) ringStart[ring + 1]++;
	for (let k = 0; k < ringCount; k++) ringStart[k + 1] += ringStart[k];
	const next = ringStart.slice();
	const list: StarList = {
		count,
		seed,
		ring: new Uint16Array(count),
		x0: new Float32Array(count),
		y0: new Float32Array(count),
		z: new Float32Array(count),
		armCos: new Float32Array(count),
		armSin: new Float32Array(count),
		light: new Float32Array(count),
		colour: new Uint8Array(3 * count),
		size: new Float32Array(count),
		population: new Uint8Array(count),
		ringStart
	};
	for (const star of drafts) {
		const i = next[star.ring]++;
		list.ring[i] = star.ring;
		list.x0[i] = star.x;
		list.y0[i] = star.y;
		list.z[i] = star.z;
		list.armCos[i] = Math.cos(star.armPhase);
		list.armSin[i] = Math.sin(star.armPhase);
		list.light[i] = star.light;
		list.colour.set(star.colour, 3 * i);
		list.size[i] = star.size;
		list.population[i] = star.population;
	}
	return list;
}
