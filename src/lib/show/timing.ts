import type { Scene, ShowDocument } from './document';

/** Seconds the scene is expected to last, whether it goes on by itself or waits for the presenter. */
export const expectedSeconds = (scene: Scene): number =>
	scene.pace.kind === 'timed' ? scene.pace.seconds : scene.pace.expectedSeconds;

/** Expected seconds of the whole show. */
export const totalSeconds = (document: Pick<ShowDocument, 'scenes'>): number =>
	document.scenes.reduce((sum, scene) => sum + expectedSeconds(scene), 0);

/** Expected start of each scene, seconds from the beginning. */
export function sceneStarts(document: Pick<ShowDocument, 'scenes'>): number[] {
	let sum = 0;
	return document.scenes.map((scene) => {
		const start = sum;
		sum += expectedSeconds(scene);
		return start;
	});
}

/** @param seconds may be negative @returns such as "4:10", "-0:05" or "1:02:03" */
export function clockText(seconds: number): string {
	const whole = Math.round(Math.abs(seconds));
	const sign = seconds < 0 && whole > 0 ? '-' : '';
	const two = (n: number) => String(n).padStart(2, '0');
	const hours = Math.floor(whole / 3600);
	const minutes = Math.floor(whole / 60) % 60;
	return hours > 0
		? `${sign}${hours}:${two(minutes)}:${two(whole % 60)}`
		: `${sign}${minutes}:${two(whole % 60)}`;
}
