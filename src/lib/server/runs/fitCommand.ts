import type { Playback, RunCommand } from '../../show/playback';
import { clampControl } from '../../show/settings';
import { AppError } from '../errors';

/**
 * Whether a command changes anything at this moment of the run.
 * @returns the command as it will be kept (a control's value inside its limits), or null where there
 * is nothing to do: somebody else was faster, or it is so already
 * @throws AppError invalid for a scene or control that the edition or the scene does not have
 */
export function fitCommand(playback: Playback, command: RunCommand): RunCommand | null {
	const { content, scene, sceneIndex, status } = playback;
	if (status === 'ended') return null;
	if (command.kind === 'begin') return status === 'waiting' ? command : null;
	if (command.kind === 'end') return command;
	if (command.kind === 'jump' && !content.show.scenes.some((s) => s.id === command.to)) {
		throw new AppError('invalid', 'The edition has no such scene to jump to.');
	}
	if (status === 'waiting') {
		throw new AppError('precondition', 'The show has not begun. Begin it first.');
	}
	switch (command.kind) {
		case 'advance':
			return command.from === scene.id && playback.nextScene ? command : null;
		case 'back':
			return command.from === scene.id && sceneIndex > 0 ? command : null;
		case 'jump':
			return command;
		case 'hold':
			return playback.held ? null : command;
		case 'go-on':
			return playback.held ? command : null;
		case 'rest':
			return playback.resting ? null : command;
		case 'resume':
			return playback.resting ? command : null;
		case 'control':
			return fitControl(playback, command);
	}
}

function fitControl(
	playback: Playback,
	command: Extract<RunCommand, { kind: 'control' }>
): RunCommand | null {
	const named = playback.content.show.scenes.find((scene) => scene.id === command.scene);
	const control = named?.controls.find((c) => c.id === command.control);
	if (!control) throw new AppError('invalid', 'The scene has no such live control.');
	// The slider was still moving when the scene changed.
	if (command.scene !== playback.scene.id) return null;
	const value = clampControl(control, command.value);
	return playback.controls[control.id] === value ? null : { ...command, value };
}
