import type { Scene } from '../../show/document';
import type { EditionContent } from '../../show/edition';
import type { RunEvent } from '../../show/playback';
import { initialState, type PlaybackState } from '../../show/playback/state';
import { advanceTo, tickAt, transition } from '../../show/playback/transition';
import { expectedSeconds } from '../../show/timing';
import { TICKS_PER_SECOND } from '../../units';

export interface SceneEntry {
	kind: 'scene';
	/** Milliseconds since 1970. */
	at: number;
	title: string;
	/** Place in the show, 1, 2, 3 … */
	place: number;
	/** Seconds until the next scene came on or the run ended; null while it is on. */
	seconds: number | null;
	expectedSeconds: number;
	/** Null where the scene came on by itself. */
	actor: string | null;
}

export interface ActEntry {
	kind: 'act';
	at: number;
	/** Such as "Rest picture" or "Halo mass set to 0.4". */
	words: string;
	actor: string | null;
}

export interface RunLog {
	beganAt: number | null;
	endedAt: number | null;
	/** From begin to end, or so far; null before the run began. */
	seconds: number | null;
	entries: (SceneEntry | ActEntry)[];
}

/** Values of one control closer together than this are one movement of the slider. */
const movementMs = 2000;

const actWords: Partial<Record<RunEvent['command']['kind'], string>> = {
	hold: 'Held',
	'go-on': 'Went on',
	rest: 'Rest picture',
	resume: 'Picture back',
	end: 'Ended'
};

/** Tick at which the scene that is on goes on by itself; Infinity where it does not. */
function ownEnd(content: EditionContent, state: PlaybackState): number {
	const scene = content.show.scenes[state.sceneIndex];
	const last = state.sceneIndex === content.show.scenes.length - 1;
	if (last || state.held || state.resting || scene.pace.kind !== 'timed') return Infinity;
	return state.tick + Math.round(scene.pace.seconds * TICKS_PER_SECOND) - state.sceneTicks;
}

/**
 * What happened in a run, in order: scenes with the seconds they were on, and what was done in them.
 * @param now milliseconds since 1970, for a run that is still open
 */
export function runLog(content: EditionContent, events: readonly RunEvent[], now: number): RunLog {
	const log: RunLog = { beganAt: null, endedAt: null, seconds: null, entries: [] };
	let state = initialState;
	const leave = (at: number) => {
		const on = log.entries.findLast((entry) => entry.kind === 'scene');
		if (on) on.seconds = (at - on.at) / 1000;
	};
	const enter = (scene: Scene, at: number, actor: string | null) => {
		leave(at);
		log.entries.push({
			kind: 'scene',
			at,
			title: scene.title,
			place: content.show.scenes.indexOf(scene) + 1,
			seconds: null,
			expectedSeconds: expectedSeconds(scene),
			actor
		});
	};
	const passTime = (until: number) => {
		const tick = tickAt(state, until);
		for (let end = ownEnd(content, state); end <= tick; end = ownEnd(content, state)) {
			if (state.status !== 'running') return;
			state = advanceTo(content, state, end);
			const at = (state.beganAt ?? 0) + (end * 1000) / TICKS_PER_SECOND;
			enter(content.show.scenes[state.sceneIndex], at, null);
		}
	};
	for (const event of events) {
		if (state.status === 'running') passTime(event.at);
		const before = state;
		state = transition(content, state, event);
		const { command } = event;
		if (command.kind === 'begin' && before.status === 'waiting') log.beganAt = event.at;
		const entered =
			before.status === 'waiting' ? state.status === 'running' : state.left !== before.left;
		if (entered) enter(content.show.scenes[state.sceneIndex], event.at, event.actor);
		if (command.kind === 'control') addControl(log, content, event);
		const words = actWords[command.kind];
		if (words) log.entries.push({ kind: 'act', at: event.at, words, actor: event.actor });
		if (command.kind === 'end') {
			log.endedAt = event.at;
			leave(event.at);
		}
	}
	if (state.status === 'running') passTime(now);
	if (log.beganAt !== null) log.seconds = ((log.endedAt ?? now) - log.beganAt) / 1000;
	return log;
}

/** One movement of a slider is one line: the value it came to rest at. */
function addControl(log: RunLog, content: EditionContent, event: RunEvent): void {
	const { command } = event;
	if (command.kind !== 'control') return;
	const scene = content.show.scenes.find((s) => s.id === command.scene);
	const control = scene?.controls.find((c) => c.id === command.control);
	if (!control) return;
	const begin = `${control.label} set to `;
	const value = Number(command.value.toPrecision(3)).toLocaleString('en-GB');
	const entry: ActEntry = {
		kind: 'act',
		at: event.at,
		words: begin + value,
		actor: event.actor
	};
	const last = log.entries.at(-1);
	const sameMovement =
		last?.kind === 'act' &&
		last.words.startsWith(begin) &&
		last.actor === event.actor &&
		event.at - last.at < movementMs;
	if (sameMovement) log.entries[log.entries.length - 1] = entry;
	else log.entries.push(entry);
}
