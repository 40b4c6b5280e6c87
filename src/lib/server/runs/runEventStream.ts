/*
 * Server-sent events of runs: one writer for consoles and screens.
 *
 * Frames
 *   event: event   data: one RunEvent as JSON.   id: "<run>:<number>"
 *   event: run     data: {"runId","editionId","hash"}, or null when no run is open in the dome;
 *                  screens only, before the first event of that run.   id: "<run>:0" or "none:0"
 *   event: revoked data: null; screens only: the token is no longer good. The stream ends.
 *   : a comment    every 15 seconds, so that proxies and readers know the line is alive.
 *   retry: 500     once, at the start.
 *
 * Numbers rise by one within a run and are never stepped over: a frame that would leave a gap is
 * not sent; the rows are read again instead. `Last-Event-ID` wins over `?after=`; both take
 * "<run>:<number>" or, where the run is known from the address, the number alone. Events behind it
 * are replayed, then the stream goes on with what happens.
 *
 * The stream ends after its lifetime (readers come back with the last id), when a screen is revoked,
 * or when the reader leaves; listeners are removed on every path. While the database is away the
 * stream stays open, tries again, and goes on from where it was.
 */
import type { RunEvent } from '../../show/playback/messages';
import type { Queryable } from '../db/database';
import { isDatabaseAway } from '../http/problem';
import { log } from '../log';
import { channels } from './channels';
import type { Notice, Notices } from './notices';
import { eventsAfter } from './runEvents';

export const heartbeatMs = 15_000;
export const lifetimeMs = 10 * 60_000;
const retryMs = 1000;

export interface FollowedRun {
	id: string;
	editionId: string;
	hash: string;
}

export interface Position {
	runId: string;
	number: number;
}

/** What the stream follows: a console one run, a screen whichever run is open in its dome. */
export interface Followed {
	/** The run to follow now. Called again after every notice. */
	run(): Promise<FollowedRun | null>;
	/** Whether `run` frames announce openings and closings. */
	announcesRuns: boolean;
	/** Whether a notice concerns this stream; a needless yes costs one read. */
	concerns(notice: NonNullable<Notice>): boolean | Promise<boolean>;
	/** Called at every heartbeat; false ends the stream with `revoked`. */
	stillGood?(): Promise<boolean>;
}

export interface StreamOptions {
	db: Queryable;
	notices: Notices;
	followed: Followed;
	/** Where the reader is, from `readPosition`. */
	from: Position | null;
	heartbeatMs?: number;
	lifetimeMs?: number;
}

/**
 * Reads where a reader left off.
 * @param runId the run of the address, for a number alone
 * @returns null where the reader has nothing yet, or says something unreadable
 */
export function readPosition(request: Request, runId: string | null): Position | null {
	const text =
		request.headers.get('last-event-id') ?? new URL(request.url).searchParams.get('after');
	const match = /^(?:([0-9a-f-]{36}|none):)?(\d{1,9})$/.exec(text ?? '');
	if (!match) return null;
	const run = match[1] ?? runId;
	return run ? { runId: run, number: Number(match[2]) } : null;
}

const frame = (event: string, id: string | null, data: unknown) =>
	`${id === null ? '' : `id: ${id}\n`}event: ${event}\ndata: ${JSON.stringify(data)}\n\n`;

/** @returns the answer to send, streaming until one of the ends named above */
export function runEventStream(options: StreamOptions): Response {
	const writer = new RunStreamWriter(options);
	return new Response(
		new ReadableStream<Uint8Array>({
			start: (controller) => writer.start(controller),
			cancel: () => writer.stop()
		}),
		{
			headers: {
				'content-type': 'text/event-stream; charset=utf-8',
				'cache-control': 'no-cache, no-transform',
				'x-accel-buffering': 'no'
			}
		}
	);
}

class RunStreamWriter {
	readonly #options: StreamOptions;
	readonly #encoder = new TextEncoder();
	#controller: ReadableStreamDefaultController<Uint8Array> | null = null;
	#unsubscribe: (() => void) | null = null;
	#timers: ReturnType<typeof setTimeout>[] = [];
	#retry: ReturnType<typeof setTimeout> | undefined;
	/** The run whose events are being sent; undefined until the first look. */
	#current: FollowedRun | null | undefined;
	#number = 0;
	/** One pass at a time; a wake during a pass asks for one more. */
	#busy = false;
	#again = false;

	constructor(options: StreamOptions) {
		this.#options = options;
	}

	start(controller: ReadableStreamDefaultController<Uint8Array>): void {
		this.#controller = controller;
		this.#send('retry: 500\n\n');
		// Subscribed before the first read, so that nothing falls between replay and tail.
		this.#unsubscribe = this.#options.notices.subscribe((notice) => void this.#heard(notice));
		this.#timers = [
			setInterval(() => void this.#beat(), this.#options.heartbeatMs ?? heartbeatMs),
			setTimeout(() => this.#close(), this.#options.lifetimeMs ?? lifetimeMs)
		];
		void this.#wake();
		void this.#beat();
	}

	stop(): void {
		this.#controller = null;
		this.#unsubscribe?.();
		this.#unsubscribe = null;
		for (const timer of this.#timers) clearTimeout(timer);
		clearTimeout(this.#retry);
	}

	#send(text: string): void {
		this.#controller?.enqueue(this.#encoder.encode(text));
	}

	#close(): void {
		const controller = this.#controller;
		this.stop();
		controller?.close();
	}

	async #heard(notice: Notice): Promise<void> {
		const { followed } = this.#options;
		await this.#trying(async () => {
			if (!notice) {
				await this.#checkGood();
				await this.#wake();
			} else if (await followed.concerns(notice)) {
				if (notice.channel === channels.screens) await this.#checkGood();
				else await this.#wake();
			}
		});
	}

	async #beat(): Promise<void> {
		this.#send(': still here\n\n');
		await this.#trying(() => this.#checkGood());
		// A look without a notice costs one read and makes a lost notice a delay and never a loss.
		await this.#wake();
	}

	async #checkGood(): Promise<void> {
		const good = (await this.#options.followed.stillGood?.()) ?? true;
		if (good || !this.#controller) return;
		this.#send(frame('revoked', null, null));
		this.#close();
	}

	async #wake(): Promise<void> {
		this.#again = true;
		if (this.#busy) return;
		this.#busy = true;
		while (this.#again && this.#controller) {
			this.#again = false;
			await this.#trying(() => this.#pass());
		}
		this.#busy = false;
	}

	/** Runs work on the database; while it is away, wakes again in a second. */
	async #trying(work: () => Promise<void>): Promise<void> {
		try {
			await work();
		} catch (error) {
			if (!isDatabaseAway(error)) log.error({ err: error }, 'a run stream could not read');
			clearTimeout(this.#retry);
			if (this.#controller) this.#retry = setTimeout(() => void this.#wake(), retryMs);
		}
	}

	async #pass(): Promise<void> {
		const { followed, from } = this.#options;
		const run = await followed.run();
		if (run?.id !== this.#current?.id || this.#current === undefined) {
			// The run that closes is told to its end before the next one is announced.
			if (this.#current) await this.#sendEvents(this.#current.id);
			const first = this.#current === undefined;
			this.#current = run;
			this.#number = first && run && from?.runId === run.id ? from.number : 0;
			if (followed.announcesRuns) {
				this.#send(frame('run', `${run?.id ?? 'none'}:${this.#number}`, run && announced(run)));
			}
		}
		if (run) await this.#sendEvents(run.id);
	}

	async #sendEvents(runId: string): Promise<void> {
		const events: RunEvent[] = await eventsAfter(this.#options.db, runId, this.#number);
		for (const event of events) {
			if (event.number !== this.#number + 1) {
				throw new Error(`Run ${runId} has no event ${this.#number + 1} before ${event.number}.`);
			}
			this.#number = event.number;
			this.#send(frame('event', `${runId}:${event.number}`, event));
		}
	}
}

const announced = ({ id, editionId, hash }: FollowedRun) => ({ runId: id, editionId, hash });
