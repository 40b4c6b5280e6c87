import type { EditionContent } from '../show/edition';
import type { RunEvent } from '../show/playback';
import { controlNumber } from './controlWords';

/**
 * What an event did, as the console's status line says it. Names who did it, unless it was the
 * reader, whose own presses need no name.
 */
export function eventWords(content: EditionContent, event: RunEvent, reader: string): string {
	const { command } = event;
	const { scenes } = content.show;
	const by = event.actor === reader ? '' : ` (${event.actor ?? 'somebody'})`;
	const title = (id: string) => scenes.find((scene) => scene.id === id)?.title ?? 'a scene';
	const beside = (id: string, step: number) => {
		const index = scenes.findIndex((scene) => scene.id === id);
		return scenes[index + step]?.title ?? 'a scene';
	};
	switch (command.kind) {
		case 'begin':
			return `The show began${by}.`;
		case 'advance':
			return `On to ${beside(command.from, 1)}${by}.`;
		case 'back':
			return `Back to ${beside(command.from, -1)}${by}.`;
		case 'jump':
			return `Jumped to ${title(command.to)}${by}.`;
		case 'hold':
			return `Held${by}.`;
		case 'go-on':
			return `Going on${by}.`;
		case 'rest':
			return `Rest picture${by}.`;
		case 'resume':
			return `The picture is back${by}.`;
		case 'end':
			return `The show ended${by}.`;
		case 'control': {
			const control = scenes
				.find((scene) => scene.id === command.scene)
				?.controls.find((c) => c.id === command.control);
			return control ? `${control.label} ${controlNumber(control, command.value)}${by}.` : '';
		}
	}
}
