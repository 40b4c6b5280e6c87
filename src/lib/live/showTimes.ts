import type { Playback } from '../show/playback';
import { clockText, sceneStarts, totalSeconds } from '../show/timing';

export interface ShowTimes {
	elapsed: string;
	/** Where the show should be by now: the scene's expected start and what of it has played. */
	planned: string;
	total: string;
	scene: string;
	sceneExpected: string;
	/** Such as "on time", "1:20 behind", "0:40 ahead". */
	words: string;
	state: 'on-time' | 'behind' | 'ahead';
}

/** Less than this apart counts as on time, seconds. */
const onTimeSeconds = 15;

/** The times of the console. "Behind" means that the show takes longer than planned. */
export function showTimes(playback: Playback): ShowTimes {
	const { content, sceneIndex, sceneSeconds, expectedSeconds, elapsedSeconds } = playback;
	const start = sceneStarts(content.show)[sceneIndex];
	const plannedSeconds = start + Math.min(sceneSeconds, expectedSeconds);
	const difference = elapsedSeconds - plannedSeconds;
	const state =
		Math.abs(difference) < onTimeSeconds ? 'on-time' : difference > 0 ? 'behind' : 'ahead';
	return {
		elapsed: clockText(elapsedSeconds),
		planned: clockText(plannedSeconds),
		total: clockText(totalSeconds(content.show)),
		scene: clockText(sceneSeconds),
		sceneExpected: clockText(expectedSeconds),
		words: state === 'on-time' ? 'on time' : `${clockText(Math.abs(difference))} ${state}`,
		state
	};
}
