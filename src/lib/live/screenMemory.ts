import type { EditionContent } from '../show/edition';
import type { RunEvent } from '../show/playback';
import type { FollowedRun, ScreenIdentity } from './screenTypes';

/** What a screen needs to go on by itself after a reload while the server is away. */
export interface Remembered {
	identity: ScreenIdentity;
	run: FollowedRun | null;
	events: readonly RunEvent[];
	/** Milliseconds from this browser's clock to the server's, and its error. */
	offset: { offset: number; error: number } | null;
}

const stateKey = 'farwheel.screen';
const contentKey = 'farwheel.screen.edition';

function read<T>(storage: Storage, key: string): T | null {
	const text = storage.getItem(key);
	if (text === null) return null;
	try {
		return JSON.parse(text) as T;
	} catch (error) {
		// Half written when the power went: worth nothing, and the server has it all.
		if (!(error instanceof SyntaxError)) throw error;
		storage.removeItem(key);
		return null;
	}
}

function write(storage: Storage, key: string, value: unknown): void {
	try {
		storage.setItem(key, JSON.stringify(value));
	} catch (error) {
		// A full store costs the picture only where the server is away as well.
		if (!(error instanceof DOMException)) throw error;
		storage.removeItem(key);
	}
}

/** The screen's own memory in the browser. */
export const screenMemory = (storage: Storage) => ({
	read: () => read<Remembered>(storage, stateKey),
	write: (state: Remembered) => write(storage, stateKey, state),
	/** The content of an edition, where it is the one that is kept. */
	readContent(hash: string): EditionContent | null {
		const kept = read<{ hash: string; content: EditionContent }>(storage, contentKey);
		return kept?.hash === hash ? kept.content : null;
	},
	writeContent: (hash: string, content: EditionContent) =>
		write(storage, contentKey, { hash, content }),
	forget(): void {
		storage.removeItem(stateKey);
		storage.removeItem(contentKey);
	}
});
