import type { ConsoleRun } from '$lib/live/ConsoleRun.svelte';
import { keyCommand } from '$lib/live/consoleCommands';

/** Keys belong to what has the focus first: sliders, lists, open questions and fields. */
const keepsKeys = 'input, select, textarea, dialog, [role="listbox"]';
/** A focused button answers the space bar itself. */
const keepsSpace = 'button, a, summary';

/** Turns a key of the page into a command of the run, where nothing else has a use for it. */
export function keyCommands(live: ConsoleRun, event: KeyboardEvent): void {
	if (event.defaultPrevented || event.repeat) return;
	if (event.ctrlKey || event.metaKey || event.altKey) return;
	if (document.querySelector('dialog[open]')) return;
	const target = event.target instanceof Element ? event.target : null;
	if (target?.closest(keepsKeys)) return;
	if (event.key === ' ' && target?.closest(keepsSpace)) return;
	const command = keyCommand(event.key, live.playback);
	if (!command) return;
	event.preventDefault();
	live.send(command);
}
