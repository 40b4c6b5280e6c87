import { links } from '$lib/links';
import type { MeasurementsInput } from '$lib/measurements/types';

/** Sends a table to be saved. @returns its id, or why it was not saved */
export async function sendTable(
	galaxyId: string,
	table: MeasurementsInput
): Promise<{ id: string } | { why: string }> {
	try {
		const response = await fetch(links.galaxyMeasurements(galaxyId), {
			method: 'POST',
			headers: { 'content-type': 'application/json', accept: 'application/json' },
			body: JSON.stringify({ table })
		});
		const answer: { id?: unknown; detail?: unknown } = await response.json();
		if (response.ok && typeof answer.id === 'string') return { id: answer.id };
		return {
			why:
				typeof answer.detail === 'string'
					? answer.detail
					: `The table was not saved: the server answered ${response.status}. Try again.`
		};
	} catch (error) {
		const why = error instanceof Error ? error.message : String(error);
		return { why: `The table was not saved: the server could not be reached (${why}). Try again.` };
	}
}
