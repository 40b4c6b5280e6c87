import type { RunEvent } from '../show/playback';

/** Events lie a little ahead; further than this, and the clock that says so is wrong. Milliseconds. */
const mostAheadMs = 1000;

/**
 * The moment to play: the server's clock as known here. An event that seems to lie far ahead says
 * that the clock is not measured yet; the event has happened, so its own time counts then.
 * @param now milliseconds since 1970 by the server's clock as known here
 */
export function momentOf(events: readonly RunEvent[], now: number): number {
	const last = events.at(-1)?.at ?? -Infinity;
	return last - now > mostAheadMs ? last : now;
}
