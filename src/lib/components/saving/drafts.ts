import type { z } from 'zod';
import { showDocumentSchema, type ShowDocument } from '$lib/show/document';

/** Work on a document that the server has not taken yet. */
export interface Draft<D = ShowDocument> {
	baseRevision: number;
	document: D;
}

export interface KeptDraft<D = ShowDocument> extends Draft<D> {
	/** When it was last written; ISO 8601. */
	at: string;
}

export interface DraftStore<D = ShowDocument> {
	write(draft: Draft<D>): void;
	/** @returns null where there is none or it cannot be read */
	read(): KeptDraft<D> | null;
	remove(): void;
}

/** Drafts of one show in the browser's own storage, which outlives the tab and the connection. */
export const browserDrafts = (showId: string, storage: Storage): DraftStore =>
	draftsOf(showId, storage, showDocumentSchema);

/** The same for a document of any kind. @param id of what is edited; ids are unique over all kinds */
export function draftsOf<D>(id: string, storage: Storage, schema: z.ZodType<D>): DraftStore<D> {
	const key = `farwheel draft ${id}`;
	return {
		write(draft) {
			try {
				storage.setItem(key, JSON.stringify({ ...draft, at: new Date().toISOString() }));
			} catch (thrown) {
				// Storage full or switched off: the save itself goes on and the page still warns on leaving.
				if (!(thrown instanceof DOMException)) throw thrown;
			}
		},
		read() {
			const text = storage.getItem(key);
			if (text === null) return null;
			const draft = parse(text);
			const document = schema.safeParse(draft?.document);
			if (!document.success || typeof draft?.baseRevision !== 'number') return null;
			return {
				baseRevision: draft.baseRevision,
				document: document.data,
				at: String(draft.at)
			};
		},
		remove: () => storage.removeItem(key)
	};
}

function parse(text: string): Partial<Record<keyof KeptDraft, unknown>> | null {
	try {
		return JSON.parse(text);
	} catch (thrown) {
		if (thrown instanceof SyntaxError) return null;
		throw thrown;
	}
}
