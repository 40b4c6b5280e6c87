import type { Scene } from '../document';
import type { ControlValues } from '../settings';

/**
 * A stretch of motion under unchanging settings. Stretches form a list from the last fresh start
 * of the galaxy; the angles of the stars are the sum over it, so that any replay gives the same.
 */
export interface MotionStretch {
	readonly before: MotionStretch | null;
	readonly scene: Scene;
	readonly controls: ControlValues;
	readonly ticks: number;
	/** True for the first stretch of a scene: the halves of a comparison part here. */
	readonly opensScene: boolean;
}

/**
 * Where the picture came from, for the seconds of an entrance. A scene that is left while it was
 * still coming on remembers where it came from in its turn, so that nothing jumps into light.
 */
export interface LeftScene {
	readonly index: number;
	readonly motion: MotionStretch;
	/** Tick of the run at which that scene had come on. */
	readonly enteredTick: number;
	readonly left: LeftScene | null;
}

/** Ticks in which the rest picture comes and goes: 0.8 s, never a flash. House rule, no source. */
export const restFadeTicks = 48;

/** Times in ticks of 1/60 s since the run began. */
export interface PlaybackState {
	readonly status: 'waiting' | 'running' | 'ended';
	/** Milliseconds since 1970; null before the run begins. */
	readonly beganAt: number | null;
	readonly tick: number;
	readonly sceneIndex: number;
	/** Ticks the scene has played, holds and rests left out. */
	readonly sceneTicks: number;
	/** Tick of the run at which the scene came on. */
	readonly enteredTick: number;
	readonly held: boolean;
	readonly resting: boolean;
	/** Tick at which the rest picture last came or went; -Infinity before. */
	readonly restTick: number;
	/** Tick at which the run ended. */
	readonly endTick: number;
	readonly controls: ControlValues;
	/** Closed stretches since the galaxy's last fresh start. */
	readonly closed: MotionStretch | null;
	/** Ticks of the stretch that is running. */
	readonly openTicks: number;
	/** Whether the running stretch is the first of its scene. */
	readonly opensScene: boolean;
	readonly left: LeftScene | null;
}

export const initialState: PlaybackState = {
	status: 'waiting',
	beganAt: null,
	tick: 0,
	sceneIndex: 0,
	sceneTicks: 0,
	enteredTick: 0,
	held: false,
	resting: false,
	restTick: -Infinity,
	endTick: 0,
	controls: {},
	closed: null,
	openTicks: 0,
	opensScene: true,
	left: null
};
