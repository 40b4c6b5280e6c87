/** Milliseconds of wall clock. */
export interface Times {
	medianMs: number;
	p99Ms: number;
}

/**
 * Runs a piece of work again and again and takes the middle and the slowest hundredth.
 * @param runs at least 1 @param warmUp runs before the clock is read, so that the engine has compiled
 */
export function timesOf(work: () => void, runs: number, warmUp: number): Times {
	if (!(runs >= 1)) throw new RangeError('A measurement needs at least one run.');
	for (let i = 0; i < warmUp; i++) work();
	const times = new Float64Array(runs);
	for (let i = 0; i < runs; i++) {
		const from = performance.now();
		work();
		times[i] = performance.now() - from;
	}
	times.sort();
	return {
		medianMs: times[runs >> 1],
		p99Ms: times[Math.min(runs - 1, Math.ceil(runs * 0.99) - 1)]
	};
}
