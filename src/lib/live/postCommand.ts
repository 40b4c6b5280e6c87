import { links } from '../links';
import type { QueuedCommand, SendResult } from './commandQueue';

/** Longer than this without an answer, and the same command is sent again with the same key. */
const answerMs = 5000;

/** Sends one command of a console and says what became of it. */
export async function postCommand(runId: string, queued: QueuedCommand): Promise<SendResult> {
	const { command, idempotencyKey } = queued;
	let response: Response;
	try {
		response = await fetch(links.apiRunEvents(runId), {
			method: 'POST',
			headers: { 'content-type': 'application/json' },
			body: JSON.stringify({ command, idempotencyKey }),
			signal: AbortSignal.timeout(answerMs)
		});
	} catch (error) {
		// Fetch rejects only where no answer came: no network, no server, or no patience left.
		if (error instanceof Error) return { kind: 'unreached' };
		throw error;
	}
	if (response.status >= 500 || response.status === 429) return { kind: 'unreached' };
	if (!response.ok) {
		const { detail } = (await response.json()) as { detail?: string };
		return { kind: 'refused', detail: detail ?? `The server answered ${response.status}.` };
	}
	const { applied } = (await response.json()) as { applied: boolean };
	return { kind: 'done', applied };
}
