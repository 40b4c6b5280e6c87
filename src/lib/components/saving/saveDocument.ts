import { links } from '$lib/links';
import { showDocumentSchema, type ShowDocument } from '$lib/show/document';
import { z } from 'zod';
import type { Conflict } from './AutoSave.svelte';

export type SaveAnswer<D = ShowDocument> =
	| { kind: 'saved'; revision: number; at: string }
	| { kind: 'failed'; why: string }
	| { kind: 'conflict'; conflict: Conflict<D> };

const savedSchema = z.object({ revision: z.number(), at: z.string() });
const conflictSchema = <D>(document: z.ZodType<D>) =>
	z.object({
		theirs: document,
		revision: z.number(),
		by: z.string().nullable(),
		at: z.string()
	});
const problemSchema = z.object({ detail: z.string() });

const json = (method: string, body: unknown): RequestInit => ({
	method,
	headers: { 'content-type': 'application/json' },
	body: JSON.stringify(body)
});

const whyOffline =
	'The server cannot be reached. Your work is kept in this browser and is saved when it is back.';

/** What went wrong, as the server says it. */
async function whyNot(response: Response): Promise<string> {
	const body = problemSchema.safeParse(await response.json().catch(() => null));
	if (body.success) return body.data.detail;
	return response.status === 401 || response.redirected
		? 'You are signed out. Sign in again in another tab, then try again here; your work is kept in this browser.'
		: `The server answered with an error (${response.status}). Your work is kept in this browser; try again.`;
}

/** A request that answers null where the server cannot be reached. */
async function reach(url: string, init: RequestInit): Promise<Response | null> {
	try {
		return await fetch(url, init);
	} catch (thrown) {
		if (thrown instanceof TypeError) return null;
		throw thrown;
	}
}

/** Sends one save and says what became of it. */
export const saveDocument = (
	showId: string,
	baseRevision: number,
	document: ShowDocument
): Promise<SaveAnswer> =>
	putDocument(links.showDocument(showId), baseRevision, document, showDocumentSchema);

/** The same for a document of any kind. @param url takes {baseRevision, document} by PUT */
export async function putDocument<D>(
	url: string,
	baseRevision: number,
	document: D,
	schema: z.ZodType<D>
): Promise<SaveAnswer<D>> {
	const response = await reach(url, json('PUT', { baseRevision, document }));
	if (!response) return { kind: 'failed', why: whyOffline };
	if (response.status === 409) {
		const conflict = conflictSchema(schema).safeParse(
			await response
				.clone()
				.json()
				.catch(() => null)
		);
		if (conflict.success) return { kind: 'conflict', conflict: conflict.data };
	}
	if (!response.ok || response.redirected) return { kind: 'failed', why: await whyNot(response) };
	return { kind: 'saved', ...savedSchema.parse(await response.json()) };
}

/** Keeps a document as a show of its own. @returns its id, or why not */
export const saveAsCopy = (
	showId: string,
	document: ShowDocument
): Promise<{ id: string } | { why: string }> => postCopy(links.showDocument(showId), document);

/** The same for a document of any kind. @param url takes {document} by POST */
export async function postCopy(
	url: string,
	document: unknown
): Promise<{ id: string } | { why: string }> {
	const response = await reach(url, json('POST', { document }));
	if (!response) return { why: whyOffline };
	if (!response.ok || response.redirected) return { why: await whyNot(response) };
	return z.object({ id: z.string() }).parse(await response.json());
}

const faultSchema = z.object({
	sceneId: z.string().nullable(),
	sceneNumber: z.number().nullable(),
	sceneTitle: z.string(),
	what: z.string(),
	remedy: z.string()
});
const frozenSchema = z.object({ id: z.string(), number: z.number(), isNew: z.boolean() });

export type FreezeAnswer =
	| ({ kind: 'frozen' } & z.infer<typeof frozenSchema>)
	| { kind: 'refused'; why: string; reasons: z.infer<typeof faultSchema>[] };

/** Freezes the saved show. */
export async function freeze(
	showId: string,
	note: string,
	revision: number
): Promise<FreezeAnswer> {
	const response = await reach(links.showFreeze(showId), json('POST', { note, revision }));
	if (!response) return { kind: 'refused', why: whyOffline, reasons: [] };
	if (!response.ok || response.redirected) {
		const body = z.object({ reasons: z.array(faultSchema) }).safeParse(
			await response
				.clone()
				.json()
				.catch(() => null)
		);
		return {
			kind: 'refused',
			why: await whyNot(response),
			reasons: body.success ? body.data.reasons : []
		};
	}
	return { kind: 'frozen', ...frozenSchema.parse(await response.json()) };
}
