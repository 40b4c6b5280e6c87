import type { RunEvent } from '../show/playback';

/**
 * A run's events with one more. An event that is there already changes nothing.
 * @returns null where the event would leave a gap: the reader must ask again from what it has
 */
export function appendEvent(
	events: readonly RunEvent[],
	event: RunEvent
): readonly RunEvent[] | null {
	const last = events.at(-1)?.number ?? 0;
	if (event.number <= last) return events;
	return event.number === last + 1 ? [...events, event] : null;
}
