import type { ConsoleRun } from '$lib/live/ConsoleRun.svelte';
import { keyCommand } from '$lib/live/consoleCommands';

/** Fields in which letters are written. */
const keepsLetters =
	'select, textarea, input:not([type="radio"], [type="checkbox"], [type="range"])';
/** Sliders and choices move with the arrows, and choices with the space bar. */
const keepsArrows = 'input, select, textarea';
/** A focused button answers the space bar itself. */
const keepsSpace = 'button, a, summary, input';

/** Whether what has the focus has a use of its own for the key. */
function keeps(target: Element, key: string): boolean {
	if (key.startsWith('Arrow')) return target.closest(keepsArrows) !== null;
	if (key === ' ') return target.closest(keepsSpace) !== null;
	return target.closest(keepsLetters) !== null;
}

/** Turns a key of the page into a command of the run, where nothing else has a use for it. */
export function keyCommands(live: ConsoleRun, event: KeyboardEvent): void {
	if (event.defaultPrevented || event.repeat) return;
	if (event.ctrlKey || event.metaKey || event.altKey) return;
	if (document.querySelector('dialog[open]')) return;
	const target = event.target instanceof Element ? event.target : null;
	if (target && keeps(target, event.key)) return;
	const command = keyCommand(event.key, live.playback);
	if (!command) return;
	event.preventDefault();
	live.send(command);
}
