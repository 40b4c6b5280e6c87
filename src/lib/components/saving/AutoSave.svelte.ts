import type { ShowDocument } from '$lib/show/document';
import type { Draft, DraftStore } from './drafts';
import type { SaveAnswer } from './saveDocument';

/** The other version of a save that came too late. */
export interface Conflict<D = ShowDocument> {
	theirs: D;
	revision: number;
	by: string | null;
	/** ISO 8601. */
	at: string;
}

/** How a conflict is settled; each way keeps both versions. */
export type Settlement = 'mine' | 'theirs' | 'both';

export type SaveStatus<D = ShowDocument> =
	| { kind: 'saved'; at: string }
	| { kind: 'waiting' }
	| { kind: 'saving' }
	| { kind: 'failed'; why: string }
	| { kind: 'conflict'; conflict: Conflict<D> };

export interface AutoSaveOptions<D = ShowDocument> {
	document: D;
	revision: number;
	/** When that revision was saved; ISO 8601. */
	at: string;
	send: (baseRevision: number, document: D) => Promise<SaveAnswer<D>>;
	drafts: DraftStore<D>;
	/** Milliseconds without a change before a save; the pause a typing person makes. */
	delay?: number;
	/** Milliseconds after which a failed save is tried again by itself. */
	retry?: number;
}

const unexpected = (thrown: unknown): string =>
	`The server's answer could not be read (${thrown instanceof Error ? thrown.message : String(thrown)}). Your work is kept in this browser and is sent again.`;

/**
 * Saves a document by itself, one save at a time. What is not yet on the server is kept as a draft
 * in the browser from the moment it is written until it is saved.
 */
export class AutoSave<D = ShowDocument> {
	#status: SaveStatus<D>;
	#revision: number;
	#saved: D;
	#wanted: D;
	#running: Promise<void> | null = null;
	#timer: ReturnType<typeof setTimeout> | undefined;
	readonly #options: AutoSaveOptions<D>;

	constructor(options: AutoSaveOptions<D>) {
		this.#options = options;
		this.#saved = options.document;
		this.#wanted = options.document;
		this.#revision = $state(options.revision);
		this.#status = $state.raw({ kind: 'saved', at: options.at });
	}

	get status(): SaveStatus<D> {
		return this.#status;
	}

	/** Revision the next save begins from. */
	get revision(): number {
		return this.#revision;
	}

	get unsaved(): boolean {
		return this.#status.kind !== 'saved';
	}

	/** The document has changed: a draft at once, a save after the pause. */
	schedule(document: D): void {
		if (document === this.#wanted) return;
		this.#wanted = document;
		this.#keepDraft();
		if (this.#status.kind === 'conflict') return;
		if (this.#status.kind !== 'failed') this.#status = { kind: 'waiting' };
		clearTimeout(this.#timer);
		this.#timer = setTimeout(() => void this.flush(), this.#options.delay ?? 800);
	}

	/** A field was left: what waits is saved without waiting longer. */
	blurred(): void {
		if (this.#status.kind === 'waiting') void this.flush();
	}

	/** Saves now what is not saved; resolves when nothing is left to do or a save has failed. */
	async flush(): Promise<boolean> {
		clearTimeout(this.#timer);
		if (this.#status.kind === 'conflict') return false;
		this.#running ??= this.#run().finally(() => (this.#running = null));
		await this.#running;
		return this.#status.kind === 'saved';
	}

	/** Goes on from another revision, after a conflict is settled or a draft is brought back. */
	rebase(revision: number, saved: D, at: string): void {
		this.#revision = revision;
		this.#saved = saved;
		this.#wanted = saved;
		this.#status = { kind: 'saved', at };
		this.#options.drafts.remove();
	}

	/** Takes a document as unsaved work that began from an older revision. */
	resume(draft: Draft<D>): void {
		this.#revision = draft.baseRevision;
		this.schedule(draft.document);
	}

	stop(): void {
		clearTimeout(this.#timer);
	}

	async #run(): Promise<void> {
		while (this.#wanted !== this.#saved) {
			const document = this.#wanted;
			this.#status = { kind: 'saving' };
			const answer = await this.#options
				.send(this.#revision, document)
				.catch((thrown: unknown): SaveAnswer<D> => ({ kind: 'failed', why: unexpected(thrown) }));
			if (answer.kind !== 'saved') {
				this.#status = answer;
				if (answer.kind === 'failed') {
					clearTimeout(this.#timer);
					this.#timer = setTimeout(() => void this.flush(), this.#options.retry ?? 15_000);
				}
				return;
			}
			this.#saved = document;
			this.#revision = answer.revision;
			this.#status = { kind: 'saved', at: answer.at };
		}
		this.#options.drafts.remove();
	}

	#keepDraft(): void {
		this.#options.drafts.write({ baseRevision: this.#revision, document: this.#wanted });
	}
}
