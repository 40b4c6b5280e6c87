import type { Playback, RunCommand } from '../show/playback';

/** The command behind the wide button; null where it opens the question whether to end. */
export function mainCommand(playback: Playback): RunCommand | null {
	if (playback.status === 'waiting') return { kind: 'begin' };
	return playback.nextScene ? { kind: 'advance', from: playback.scene.id } : null;
}

/** Words on the wide button. */
export function mainWords(playback: Playback): string {
	if (playback.status === 'waiting') return 'Begin the show';
	return playback.nextScene ? `Next: ${playback.nextScene.title}` : 'End the show';
}

/**
 * The command of a single key at this moment: space or → next, ← back, R rest picture and back,
 * H hold and go on. Nothing of it ends a show.
 */
export function keyCommand(key: string, playback: Playback): RunCommand | null {
	if (playback.status === 'ended') return null;
	const running = playback.status === 'running';
	switch (key.length === 1 ? key.toLowerCase() : key) {
		case ' ':
		case 'ArrowRight':
			return mainCommand(playback);
		case 'ArrowLeft':
			return running && playback.sceneIndex > 0 ? { kind: 'back', from: playback.scene.id } : null;
		case 'r':
			return running ? { kind: playback.resting ? 'resume' : 'rest' } : null;
		case 'h':
			return running ? { kind: playback.held ? 'go-on' : 'hold' } : null;
		default:
			return null;
	}
}
