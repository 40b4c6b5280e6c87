import { eventParser, type StreamEvent } from './eventParser';
import { pause } from './pause';

export type LinkState = 'connecting' | 'open' | 'lost' | 'refused';

export interface FollowOptions {
	url: string;
	/** Returning false refuses the event: the line is opened anew from the last one taken. */
	onEvent: (event: StreamEvent) => boolean | void;
	/** `refused` is final: the server says 401, 403 or 404. */
	onState?: (state: LinkState, status: number | null) => void;
	/** Id of the last event this reader has from before. */
	lastEventId?: string;
	signal: AbortSignal;
	fetch?: typeof fetch;
	/** Nothing for so long, not even a comment, and the line counts as dead. */
	stallMs?: number;
	firstWaitMs?: number;
	longestWaitMs?: number;
}

const final = new Set([401, 403, 404]);

/**
 * Follows a stream of server-sent events until `signal` ends it or the server refuses. Comes back by
 * itself with growing waits, and says with Last-Event-ID what it has, so that nothing is missed.
 * It reads by fetch and not by EventSource because a screen must notice a line that died silently.
 */
export async function followEvents(options: FollowOptions): Promise<void> {
	const { signal, firstWaitMs = 250, longestWaitMs = 5000 } = options;
	let lastEventId = options.lastEventId ?? '';
	let waitMs = firstWaitMs;
	const take = (event: StreamEvent): boolean => {
		if (options.onEvent(event) === false) return false;
		lastEventId = event.id;
		return true;
	};
	while (!signal.aborted) {
		options.onState?.('connecting', null);
		const end = await readOnce(options, lastEventId, take, () => {
			waitMs = firstWaitMs;
			options.onState?.('open', 200);
		});
		if (signal.aborted) return;
		if (end.status !== null && final.has(end.status)) {
			options.onState?.('refused', end.status);
			return;
		}
		options.onState?.('lost', end.status);
		await pause(end.retry ?? waitMs, signal);
		waitMs = Math.min(longestWaitMs, waitMs * 2);
	}
}

/** What a promise of the network gives, or null where the line breaks. */
const orBroken = <T>(work: Promise<T>): Promise<T | null> => work.catch(() => null);

/** One connection from its opening to its end, whatever ends it. */
async function readOnce(
	options: FollowOptions,
	lastEventId: string,
	take: (event: StreamEvent) => boolean,
	onOpen: () => void
): Promise<{ status: number | null; retry: number | null }> {
	const { url, signal, stallMs = 40_000 } = options;
	const ending = new AbortController();
	const end = () => ending.abort();
	signal.addEventListener('abort', end, { once: true });
	let stall = setTimeout(end, stallMs);
	try {
		const response = await orBroken(
			(options.fetch ?? fetch)(url, {
				headers: {
					accept: 'text/event-stream',
					...(lastEventId ? { 'last-event-id': lastEventId } : {})
				},
				cache: 'no-store',
				signal: ending.signal
			})
		);
		if (!response?.ok || !response.body) return { status: response?.status ?? null, retry: null };
		onOpen();
		const parser = eventParser((event) => {
			if (!ending.signal.aborted && !take(event)) end();
		});
		const decoder = new TextDecoder();
		const reader = response.body.getReader();
		for (;;) {
			const part = await orBroken(reader.read());
			if (!part) return { status: null, retry: null };
			if (part.done) return { status: response.status, retry: parser.retry };
			clearTimeout(stall);
			stall = setTimeout(end, stallMs);
			parser.push(decoder.decode(part.value, { stream: true }));
		}
	} finally {
		clearTimeout(stall);
		signal.removeEventListener('abort', end);
		ending.abort();
	}
}
