import pg from 'pg';
import { environment } from '../env';
import { log } from '../log';
import { channels } from './channels';

/** `null` after a reconnect: something may have been missed, so look at everything. */
export type Notice = { channel: string; id: string } | null;
export type Listener = (notice: Notice) => void;

const firstWaitMs = 100;
const longestWaitMs = 5000;

/**
 * One connection of this process that LISTENs for changes. It comes back by itself with growing
 * waits, and then wakes every subscriber, so that a lost notice delays nothing: whoever is woken
 * reads the rows behind the number it has.
 */
export class Notices {
	readonly #url: string;
	readonly #listeners = new Set<Listener>();
	#client: pg.Client | null = null;
	#timer: ReturnType<typeof setTimeout> | null = null;
	#waitMs = firstWaitMs;
	#closed = false;

	constructor(url: string) {
		this.#url = url;
	}

	/** @returns the function that ends the subscription */
	subscribe(listener: Listener): () => void {
		this.#listeners.add(listener);
		if (!this.#client && !this.#timer) void this.#connect();
		return () => this.#listeners.delete(listener);
	}

	/** How many listen: tests look for leaks with it. */
	get size(): number {
		return this.#listeners.size;
	}

	async close(): Promise<void> {
		this.#closed = true;
		if (this.#timer) clearTimeout(this.#timer);
		await this.#client?.end();
	}

	async #connect(): Promise<void> {
		this.#timer = null;
		if (this.#closed) return;
		const client = new pg.Client({
			connectionString: this.#url,
			connectionTimeoutMillis: 3000,
			keepAlive: true,
			application_name: 'farwheel notices'
		});
		this.#client = client;
		client.on('notification', ({ channel, payload }) => this.#wake({ channel, id: payload ?? '' }));
		client.on('error', (error) => this.#lost(client, error));
		client.on('end', () => this.#lost(client));
		try {
			await client.connect();
			for (const channel of Object.values(channels)) await client.query(`listen ${channel}`);
			this.#waitMs = firstWaitMs;
			this.#wake(null);
		} catch (error) {
			this.#lost(client, error);
		}
	}

	#lost(client: pg.Client, error?: unknown): void {
		if (this.#client !== client) return;
		this.#client = null;
		client.end().catch(() => log.debug('the lost connection was closed already'));
		if (this.#closed) return;
		log.warn({ err: error }, 'the connection that listens for notices was lost');
		this.#timer = setTimeout(() => void this.#connect(), this.#waitMs);
		this.#waitMs = Math.min(longestWaitMs, this.#waitMs * 2);
	}

	#wake(notice: Notice): void {
		for (const listener of [...this.#listeners]) listener(notice);
	}
}

let shared: Notices | undefined;

/** The app's one listening connection, made on first use. */
export function notices(): Notices {
	shared ??= new Notices(environment().DATABASE_URL);
	return shared;
}

/** Closes it at shutdown. */
export async function closeNotices(): Promise<void> {
	await shared?.close();
	shared = undefined;
}
