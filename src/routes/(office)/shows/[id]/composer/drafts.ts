import { showDocumentSchema, type ShowDocument } from '$lib/show/document';

/** Work on a show that the server has not taken yet. */
export interface Draft {
	baseRevision: number;
	document: ShowDocument;
}

export interface KeptDraft extends Draft {
	/** When it was last written; ISO 8601. */
	at: string;
}

export interface DraftStore {
	write(draft: Draft): void;
	/** @returns null where there is none or it cannot be read */
	read(): KeptDraft | null;
	remove(): void;
}

/** Drafts of one show in the browser's own storage, which outlives the tab and the connection. */
export function browserDrafts(showId: string, storage: Storage): DraftStore {
	const key = `farwheel draft ${showId}`;
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
			const document = showDocumentSchema.safeParse(draft?.document);
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
