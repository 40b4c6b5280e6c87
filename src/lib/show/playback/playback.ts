import { TICKS_PER_SECOND } from '../../units';
import type { Scene } from '../document';
import type { EditionContent } from '../edition';
import type { ControlValues } from '../settings';
import { expectedSeconds } from '../timing';
import type { RunEvent } from './messages';
import { initialState, type PlaybackState } from './state';
import { advanceTo, tickAt, transition } from './transition';

/** A moment of a run as pages and painters read it. */
export interface Playback {
	readonly status: PlaybackState['status'];
	readonly state: PlaybackState;
	readonly content: EditionContent;
	readonly sceneIndex: number;
	/** The scene that is on; the first one before the run begins. */
	readonly scene: Scene;
	readonly nextScene: Scene | null;
	/** Seconds the scene has played, holds and rests left out. */
	readonly sceneSeconds: number;
	/** Seconds the scene is expected to last. */
	readonly expectedSeconds: number;
	/** Seconds since the run began, holds and rests counted; stands still after the end. */
	readonly elapsedSeconds: number;
	readonly held: boolean;
	readonly resting: boolean;
	readonly controls: ControlValues;
	/** Ticks of 1/60 s since the run began. */
	readonly tick: number;
}

/** Folded events of a content, kept so that a frame costs the new events only. Never a truth. */
const folded = new WeakMap<EditionContent, { events: RunEvent[]; state: PlaybackState }>();

function fold(content: EditionContent, events: readonly RunEvent[], now: number): PlaybackState {
	let due = events.length;
	while (due > 0 && events[due - 1].at > now) due--;
	const kept = folded.get(content);
	const count = kept?.events.length ?? 0;
	const usable = kept && count <= due && kept.events.every((event, i) => event === events[i]);
	let state = usable ? kept.state : initialState;
	for (let i = usable ? count : 0; i < due; i++) state = transition(content, state, events[i]);
	if (!usable || due > count) folded.set(content, { events: events.slice(0, due), state });
	return state;
}

/**
 * The moment of a run at `now`: a pure function of edition, events and time.
 * Events later than `now` have not happened yet.
 * @param content must have at least one scene
 * @param events in the order of their numbers
 * @param now milliseconds since 1970 by the server's clock
 * @throws Error where the edition has no scene
 */
export function playbackAt(
	content: EditionContent,
	events: readonly RunEvent[],
	now: number
): Playback {
	if (content.show.scenes.length === 0)
		throw new Error('An edition without scenes cannot be played.');
	const after = fold(content, events, now);
	const state = advanceTo(content, after, tickAt(after, now));
	const scene = content.show.scenes[state.sceneIndex];
	return {
		status: state.status,
		state,
		content,
		sceneIndex: state.sceneIndex,
		scene,
		nextScene: content.show.scenes[state.sceneIndex + 1] ?? null,
		sceneSeconds: state.sceneTicks / TICKS_PER_SECOND,
		expectedSeconds: expectedSeconds(scene),
		elapsedSeconds: (state.status === 'ended' ? state.endTick : state.tick) / TICKS_PER_SECOND,
		held: state.held,
		resting: state.resting,
		controls: state.controls,
		tick: state.tick
	};
}
