/** A seeded stream of numbers. The same seed gives the same numbers in every engine. */
export interface Random {
	/** 0 ≤ x < 1, 32 bits. */
	next(): number;
	/** Standard normal, by Box and Muller (1958). */
	normal(): number;
}

/**
 * A 32-bit counter put through the finaliser of MurmurHash3 (A. Appleby, public domain): each step
 * adds the golden-ratio constant and mixes. Integer arithmetic only, so no engine differs.
 * @param seed whole number
 */
export function seededRandom(seed: number): Random {
	let counter = seed | 0;
	const next = () => {
		counter = (counter + 0x9e3779b9) | 0;
		let x = counter;
		x = Math.imul(x ^ (x >>> 16), 0x85ebca6b);
		x = Math.imul(x ^ (x >>> 13), 0xc2b2ae35);
		return ((x ^ (x >>> 16)) >>> 0) / 4294967296;
	};
	return {
		next,
		normal: () => Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next())
	};
}
