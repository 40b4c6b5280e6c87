import { TICKS_PER_SECOND } from '../../units';
import type { Scene } from '../document';
import type { EditionContent } from '../edition';
import { clampControl, restingValues } from '../settings';
import type { RunEvent } from './messages';
import { initialState, restFadeTicks, type MotionStretch, type PlaybackState } from './state';

/** Ticks of a timed scene; Infinity where it waits for the presenter. */
const sceneLimit = (scene: Scene): number =>
	scene.pace.kind === 'timed' ? Math.round(scene.pace.seconds * TICKS_PER_SECOND) : Infinity;

/** Tick of the run at a moment of the server's clock, never before the run began. */
export function tickAt(state: PlaybackState, at: number): number {
	if (state.beganAt === null) return 0;
	return Math.max(0, Math.floor(((at - state.beganAt) * TICKS_PER_SECOND) / 1000));
}

/** The running stretch as a closed one. */
export const openStretch = (content: EditionContent, state: PlaybackState): MotionStretch => ({
	before: state.closed,
	scene: content.show.scenes[state.sceneIndex],
	controls: state.controls,
	ticks: state.openTicks,
	opensScene: state.opensScene
});

const sameGalaxy = (a: Scene, b: Scene): boolean =>
	a.subject.kind === 'galaxy' &&
	b.subject.kind === 'galaxy' &&
	a.subject.galaxyId === b.subject.galaxyId;

/** Whether the stars of `next` go on from where `scene` left them. */
export const goesOn = (scene: Scene, next: Scene): boolean =>
	next.motion.begin === 'go-on' && sameGalaxy(scene, next);

const isComingOn = ({ entrance }: Scene, { tick, enteredTick }: PlaybackState): boolean =>
	entrance.kind === 'fade' && tick - enteredTick < entrance.seconds * TICKS_PER_SECOND;

/**
 * The tick from which the rest picture comes or goes, so that a turn in the middle of the way begins
 * where the picture is: what had gone so far is what is left to go.
 */
function restTurned(state: PlaybackState): number {
	const gone = Math.min(restFadeTicks, state.tick - state.restTick);
	return state.tick - (restFadeTicks - gone);
}

function enterScene(content: EditionContent, state: PlaybackState, index: number): PlaybackState {
	const scene = content.show.scenes[index];
	const motion = openStretch(content, state);
	return {
		...state,
		sceneIndex: index,
		sceneTicks: 0,
		enteredTick: state.tick,
		controls: restingValues(scene),
		closed: goesOn(motion.scene, scene) ? motion : null,
		openTicks: 0,
		opensScene: true,
		left: {
			index: state.sceneIndex,
			motion,
			enteredTick: state.enteredTick,
			left: isComingOn(motion.scene, state) ? state.left : null
		}
	};
}

/**
 * Lets time pass up to a tick of the run: stars move, timed scenes go on to the next by themselves.
 * The last scene stays until somebody ends the run.
 */
export function advanceTo(
	content: EditionContent,
	state: PlaybackState,
	tick: number
): PlaybackState {
	if (state.status === 'waiting' || tick <= state.tick) return state;
	// After the end only the clock goes on: the rest picture comes up by it.
	if (state.status === 'ended') return { ...state, tick };
	if (state.held || state.resting) return { ...state, tick };
	let now = state;
	while (now.tick < tick) {
		const last = now.sceneIndex === content.show.scenes.length - 1;
		const left = last ? Infinity : sceneLimit(content.show.scenes[now.sceneIndex]) - now.sceneTicks;
		const step = Math.max(0, Math.min(tick - now.tick, left));
		now = {
			...now,
			tick: now.tick + step,
			sceneTicks: now.sceneTicks + step,
			openTicks: now.openTicks + step
		};
		if (step === left) now = enterScene(content, now, now.sceneIndex + 1);
	}
	return now;
}

function setControl(
	content: EditionContent,
	state: PlaybackState,
	id: string,
	value: number
): PlaybackState {
	const scene = content.show.scenes[state.sceneIndex];
	const control = scene.controls.find((c) => c.id === id);
	if (!control) return state;
	const controls = { ...state.controls, [id]: clampControl(control, value) };
	// Where no tick has passed there is no stretch to close.
	if (state.openTicks === 0) return { ...state, controls };
	return {
		...state,
		controls,
		closed: openStretch(content, state),
		openTicks: 0,
		opensScene: false
	};
}

/**
 * The state after one event. Pure; an event that does not fit the state (advance from a scene that
 * is no longer on, a second begin) changes nothing but the time.
 */
export function transition(
	content: EditionContent,
	before: PlaybackState,
	event: RunEvent
): PlaybackState {
	const { command } = event;
	const { scenes } = content.show;
	if (command.kind === 'begin') {
		if (before.status !== 'waiting' || scenes.length === 0) return before;
		return {
			...initialState,
			status: 'running',
			beganAt: event.at,
			controls: restingValues(scenes[0])
		};
	}
	if (before.status !== 'running') return before;
	const state = advanceTo(content, before, tickAt(before, event.at));
	const here = scenes[state.sceneIndex];
	switch (command.kind) {
		case 'advance':
			if (command.from !== here.id || state.sceneIndex + 1 >= scenes.length) return state;
			return enterScene(content, { ...state, held: false }, state.sceneIndex + 1);
		case 'back':
			if (command.from !== here.id || state.sceneIndex === 0) return state;
			return enterScene(content, { ...state, held: false }, state.sceneIndex - 1);
		case 'jump': {
			const index = scenes.findIndex((scene) => scene.id === command.to);
			return index < 0 ? state : enterScene(content, { ...state, held: false }, index);
		}
		case 'hold':
			return { ...state, held: true };
		case 'go-on':
			return { ...state, held: false };
		case 'rest':
			return state.resting ? state : { ...state, resting: true, restTick: restTurned(state) };
		case 'resume':
			return state.resting ? { ...state, resting: false, restTick: restTurned(state) } : state;
		case 'control':
			return command.scene === here.id
				? setControl(content, state, command.control, command.value)
				: state;
		case 'end':
			// The rest picture comes up, or stays where it was on its way.
			return {
				...state,
				status: 'ended',
				endTick: state.tick,
				restTick: state.resting ? state.restTick : restTurned(state)
			};
	}
}
