import type { DomeScreen } from '$lib/live/DomeScreen.svelte';
import type { LinkState } from '$lib/live/followEvents';

/** What the tab says to a technician: the dome, what is on, and the state of the line. */
export function titleWords(
	phase: DomeScreen['phase'],
	link: LinkState,
	status: 'waiting' | 'running' | 'ended' | null,
	domeName: string | null
): string {
	if (phase !== 'paired') return 'Dome screen, not paired – Farwheel';
	const on = status === 'running' ? 'running' : 'ready';
	const line = link === 'open' ? 'connected' : 'no connection, going on by itself';
	return `${domeName ?? 'Dome'}: ${on}, ${line} – Farwheel`;
}
