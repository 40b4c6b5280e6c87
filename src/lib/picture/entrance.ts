import type { Playback } from '../show/playback';
import { goesOn } from '../show/playback/transition';
import { TICKS_PER_SECOND } from '../units';
import type { View } from './frame';

/** Seconds in which the rest picture comes and goes: 0.8, never a flash. House rule, no source. */
const restFadeSeconds = 0.8;
/** Share of an entrance in which the scene that leaves goes dark. */
const leavingShare = 0.4;

const clamp01 = (x: number) => Math.min(1, Math.max(0, x));
/** Eased 0…1 with no speed at either end. */
export const smooth = (x: number) => {
	const t = clamp01(x);
	return t * t * (3 - 2 * t);
};

export interface Entrance {
	/** Which scene is seen: the new one, or for its first moments the one that leaves. */
	shows: 'scene' | 'left';
	/** 0 dark to 1 full. */
	exposure: number;
	/** 0 at the old view, 1 at the new one; below 1 only where the stars go on. */
	viewShare: number;
}

/**
 * How a scene comes on. A cut is there at once. A fade darkens what was there and lights what
 * comes; where the same galaxy goes on it stays lit and the view eases over.
 */
export function entranceAt(playback: Playback): Entrance {
	const { scene, state } = playback;
	const done: Entrance = { shows: 'scene', exposure: 1, viewShare: 1 };
	if (scene.entrance.kind === 'cut' || playback.status === 'waiting') return done;
	const share = (state.tick - state.enteredTick) / TICKS_PER_SECOND / scene.entrance.seconds;
	if (share >= 1) return done;
	if (!state.left) return { ...done, exposure: smooth(share) };
	if (goesOn(state.left.motion.scene, scene)) return { ...done, viewShare: smooth(share) };
	return share < leavingShare
		? { shows: 'left', exposure: 1 - smooth(share / leavingShare), viewShare: 1 }
		: {
				shows: 'scene',
				exposure: smooth((share - leavingShare) / (1 - leavingShare)),
				viewShare: 1
			};
}

/** 1 where the rest picture is fully there, 0 where the scene is. */
export function restShare(playback: Playback): number {
	const { state } = playback;
	if (playback.status === 'waiting') return 1;
	if (playback.status === 'ended') {
		if (playback.resting) return 1;
		return smooth((state.tick - state.endTick) / TICKS_PER_SECOND / restFadeSeconds);
	}
	const share = smooth((state.tick - state.restTick) / TICKS_PER_SECOND / restFadeSeconds);
	return playback.resting ? share : 1 - share;
}

const between = (a: number, b: number, share: number) => a + (b - a) * share;

/** The view part of the way from `a` to `b`; distances go by ratio, turns the short way round. */
export function viewBetween(a: View, b: View, share: number): View {
	if (share >= 1) return b;
	const turn = ((b.turn - a.turn + 540) % 360) - 180;
	return {
		distance: Math.exp(between(Math.log(a.distance), Math.log(b.distance), share)),
		inclination: between(a.inclination, b.inclination, share),
		turn: a.turn + turn * share,
		centreAltitude: between(a.centreAltitude, b.centreAltitude, share)
	};
}
