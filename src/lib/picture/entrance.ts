import type { Playback } from '../show/playback';
import { restFadeTicks, type LeftScene, type MotionStretch } from '../show/playback/state';
import { goesOn, openStretch } from '../show/playback/transition';
import { TICKS_PER_SECOND } from '../units';
import type { View } from './frame';

/** Share of an entrance in which the scene that leaves goes dark. */
const leavingShare = 0.4;

const clamp01 = (x: number) => Math.min(1, Math.max(0, x));
/** Eased 0…1 with no speed at either end. */
export const smooth = (x: number) => {
	const t = clamp01(x);
	return t * t * (3 - 2 * t);
};

/** What is seen of a scene that comes on, or of the one that leaves for it. */
export interface Entrance {
	/** The stretch of motion that is seen; its scene says what is shown. */
	motion: MotionStretch;
	/** 0 dark to 1 full. */
	exposure: number;
	view: View;
}

/** A scene and how it came. */
interface Coming {
	motion: MotionStretch;
	enteredTick: number;
	left: LeftScene | null;
}

function comingAt({ motion, enteredTick, left }: Coming, tick: number): Entrance {
	const { scene } = motion;
	const there: Entrance = { motion, exposure: 1, view: scene.view };
	if (scene.entrance.kind === 'cut') return there;
	const share = (tick - enteredTick) / TICKS_PER_SECOND / scene.entrance.seconds;
	if (share >= 1) return there;
	if (!left) return { ...there, exposure: smooth(share) };
	// What was seen when this scene was called: the one it left, or still the one before that.
	const from = comingAt(left, enteredTick);
	if (from.motion === left.motion && goesOn(left.motion.scene, scene)) {
		return {
			...there,
			exposure: between(from.exposure, 1, smooth(share)),
			view: viewBetween(from.view, scene.view, smooth(share))
		};
	}
	return share < leavingShare
		? { ...from, exposure: from.exposure * (1 - smooth(share / leavingShare)) }
		: { ...there, exposure: smooth((share - leavingShare) / (1 - leavingShare)) };
}

/**
 * How a scene comes on. A cut is there at once. A fade darkens what was there and lights what
 * comes; where the same galaxy goes on it stays lit and the view eases over. Whatever is pressed on
 * the way begins at the light and the view that are there.
 */
export function entranceAt({ content, state, status }: Playback): Entrance {
	const motion = openStretch(content, state);
	return status === 'waiting'
		? { motion, exposure: 1, view: motion.scene.view }
		: comingAt({ motion, enteredTick: state.enteredTick, left: state.left }, state.tick);
}

/** 1 where the rest picture is fully there, 0 where the scene is. */
export function restShare({ status, resting, state }: Playback): number {
	if (status === 'waiting') return 1;
	const share = smooth((state.tick - state.restTick) / restFadeTicks);
	return resting || status === 'ended' ? share : 1 - share;
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
