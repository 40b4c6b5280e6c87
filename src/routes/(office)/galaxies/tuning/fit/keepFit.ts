import { links } from '$lib/links';
import type { FitRecord } from '$lib/measurements/fitRecord';

/** Sends a fit to be kept. @returns its id, or why it was not kept */
export async function keepFit(
	galaxyId: string,
	record: FitRecord
): Promise<{ id: string } | { why: string }> {
	try {
		const response = await fetch(links.galaxyFits(galaxyId), {
			method: 'POST',
			headers: { 'content-type': 'application/json', accept: 'application/json' },
			body: JSON.stringify({ record })
		});
		const answer: { id?: unknown; detail?: unknown } = await response.json();
		if (response.ok && typeof answer.id === 'string') return { id: answer.id };
		const detail =
			typeof answer.detail === 'string' ? answer.detail : `It answered ${response.status}.`;
		return { why: `The fit was not kept. ${detail}` };
	} catch (error) {
		const why = error instanceof Error ? error.message : String(error);
		return { why: `The fit was not kept: the app could not be reached (${why}). Try again.` };
	}
}
