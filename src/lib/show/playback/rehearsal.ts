import type { EditionContent } from '../edition';
import { sceneStarts } from '../timing';
import type { RunCommand, RunEvent } from './messages';

const event = (number: number, at: number, command: RunCommand): RunEvent => ({
	number,
	at,
	command,
	actor: null
});

/**
 * Events of a run in which every scene lasts as long as expected, from time 0 in milliseconds:
 * what a preview plays and seeks in.
 */
export function rehearsalEvents(content: EditionContent): RunEvent[] {
	const { scenes } = content.show;
	const starts = sceneStarts(content.show);
	const events = [event(1, 0, { kind: 'begin' })];
	scenes.forEach((scene, i) => {
		const last = i === scenes.length - 1;
		if (scene.pace.kind === 'presenter' && !last) {
			events.push(
				event(events.length + 1, starts[i + 1] * 1000, { kind: 'advance', from: scene.id })
			);
		}
	});
	return events;
}

/**
 * Events that put one scene on at time 0, held out of the flow of the show: for the composer.
 * @throws Error where the content has no such scene
 */
export function sceneEvents(content: EditionContent, sceneId: string): RunEvent[] {
	if (!content.show.scenes.some((scene) => scene.id === sceneId)) {
		throw new Error(`The show has no scene ${sceneId}.`);
	}
	return [event(1, 0, { kind: 'begin' }), event(2, 0, { kind: 'jump', to: sceneId })];
}
