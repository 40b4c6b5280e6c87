/** One question to the server's clock; local times in milliseconds of `localNow`. */
export interface ClockSample {
	sent: number;
	received: number;
	/** The server's clock, milliseconds since 1970, somewhere between the two. */
	server: number;
}

export interface Offset {
	/** Milliseconds to add to the local clock. */
	offset: number;
	/** The offset is wrong by at most this: half the round trip. */
	error: number;
}

/**
 * The offset of the sample with the least round trip, taking both ways as equally long: the less
 * time there was, the less of it can be on one side.
 * @throws Error without a sample
 */
export function offsetFrom(samples: readonly ClockSample[]): Offset {
	if (samples.length === 0) throw new Error('An offset needs at least one sample.');
	const best = samples.reduce((a, b) => (b.received - b.sent < a.received - a.sent ? b : a));
	const half = (best.received - best.sent) / 2;
	return { offset: best.server - (best.sent + half), error: half };
}

/** Milliseconds since 1970 that never jump while the page lives, whatever is done to its clock. */
const localNow = () => performance.timeOrigin + performance.now();

/** The server's clock as this browser knows it. */
export class ServerClock {
	readonly #ask: () => Promise<number>;
	readonly #local: () => number;
	#known: Offset | null = null;

	/** @param ask asks the server for its clock once */
	constructor(ask: () => Promise<number>, local = localNow) {
		this.#ask = ask;
		this.#local = local;
	}

	/** Milliseconds since 1970 by the server; by this browser before anything is known. */
	now(): number {
		return this.#local() + (this.#known?.offset ?? 0);
	}

	get known(): Offset | null {
		return this.#known;
	}

	/** An offset kept from before, for a page that comes back while the server is away. */
	remember(offset: Offset): void {
		this.#known ??= offset;
	}

	/**
	 * Asks a few times and takes the best answer. An offset that agrees with the known one within
	 * both errors replaces it only where it is better, so that the picture is not moved for nothing.
	 * @throws what `ask` throws where no question was answered
	 */
	async measure(times = 5): Promise<Offset> {
		const samples: ClockSample[] = [];
		let failure: unknown;
		for (let i = 0; i < times; i++) {
			const sent = this.#local();
			try {
				const server = await this.#ask();
				samples.push({ sent, received: this.#local(), server });
			} catch (error) {
				failure = error;
			}
		}
		if (samples.length === 0) throw failure;
		const found = offsetFrom(samples);
		const known = this.#known;
		const agrees =
			known !== null && Math.abs(found.offset - known.offset) <= found.error + known.error;
		this.#known = agrees && known.error <= found.error ? known : found;
		return this.#known;
	}
}

/** Asks `/api/time`. */
export async function askServerTime(): Promise<number> {
	const response = await fetch('/api/time', { cache: 'no-store' });
	if (!response.ok) throw new Error(`The server's clock answered ${response.status}.`);
	const { now } = (await response.json()) as { now: number };
	return now;
}
