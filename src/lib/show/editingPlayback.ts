import { TICKS_PER_SECOND } from '../units';
import type { Scene } from './document';
import type { EditionContent } from './edition';
import type { MotionStretch, Playback } from './playback';
import { initialState } from './playback/state';
import { restingValues } from './settings';
import { expectedSeconds } from './timing';

/** How far the stars of the composer's open row have come. */
export interface SceneMotion {
	/** Closed stretches under earlier settings; null at a fresh start. */
	closed: MotionStretch | null;
	/** Ticks of 1/60 s under the settings of `scene`. */
	ticks: number;
	scene: Scene;
}

export const freshMotion = (scene: Scene): SceneMotion => ({ closed: null, ticks: 0, scene });

/**
 * The motion with the scene as it is now: where a setting changed, the stars go on from where they
 * were, as they do in a run. Another galaxy starts fresh.
 */
export function motionWith(motion: SceneMotion, scene: Scene): SceneMotion {
	if (scene === motion.scene) return motion;
	const before = motion.scene;
	if (
		scene.subject.kind !== 'galaxy' ||
		before.subject.kind !== 'galaxy' ||
		scene.subject.galaxyId !== before.subject.galaxyId
	) {
		return freshMotion(scene);
	}
	// Words, views and colours leave the motion as it is; documents share what did not change.
	const same = (['mix', 'motion', 'controls'] as const).every((key) => scene[key] === before[key]);
	if (same || motion.ticks === 0) return { ...motion, scene };
	return { closed: stretch(motion), ticks: 0, scene };
}

const stretch = ({ closed, ticks, scene }: SceneMotion): MotionStretch => ({
	before: closed,
	scene,
	controls: restingValues(scene),
	ticks,
	opensScene: closed === null
});

/** A moment of one scene, out of the flow of the show: its entrance is over, its controls at rest. */
export function scenePlayback(content: EditionContent, motion: SceneMotion): Playback {
	const { scene, closed, ticks } = motion;
	const controls = restingValues(scene);
	return {
		status: 'running',
		state: {
			...initialState,
			status: 'running',
			beganAt: 0,
			enteredTick: -Infinity,
			tick: ticks,
			sceneTicks: ticks,
			controls,
			closed,
			openTicks: ticks,
			opensScene: closed === null
		},
		content: { ...content, show: { ...content.show, scenes: [scene] } },
		sceneIndex: 0,
		scene,
		nextScene: null,
		sceneSeconds: ticks / TICKS_PER_SECOND,
		expectedSeconds: expectedSeconds(scene),
		elapsedSeconds: ticks / TICKS_PER_SECOND,
		held: false,
		resting: false,
		controls,
		tick: ticks
	};
}
