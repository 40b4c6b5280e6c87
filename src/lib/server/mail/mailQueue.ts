import { sql, type SQL } from 'drizzle-orm';
import PgBoss from 'pg-boss';
import { database, type Queryable } from '../db/database';
import { log } from '../log';
import { deliverLetter } from './deliverLetter';
import type { Letter } from './Letter';
import type { MailTransport } from './transport';

const queue = {
	name: 'mail',
	// Waits double from some 5 seconds, together at least 5 hours: a mail server may be away so long.
	retryLimit: 12,
	retryDelay: 5,
	retryBackoff: true,
	expireInMinutes: 2
};

/** Where verbs put letters, in the transaction of the change they tell of. */
export interface MailQueue {
	enqueue(letter: Letter, tx: Queryable): Promise<void>;
}

/** pg-boss writes numbered parameters; Drizzle numbers its own. */
export function numbered(text: string, values: readonly unknown[]): SQL {
	const pieces = text.split(/\$(\d+)/);
	return sql.join(
		pieces.map((piece, i) => (i % 2 === 0 ? sql.raw(piece) : sql.param(values[Number(piece) - 1])))
	);
}

/** Background work over PostgreSQL; every app process takes its share. */
export class BossMailQueue implements MailQueue {
	readonly #boss: PgBoss;
	readonly #db: () => Queryable;

	constructor(url: string, db: () => Queryable = database) {
		this.#db = db;
		this.#boss = new PgBoss({ connectionString: url, max: 3, schedule: false });
		this.#boss.on('error', (error) => log.warn({ err: error }, 'the mail queue had a failure'));
	}

	/** Makes the queue where it is missing, and takes letters from it where there is a transport. */
	async start(transport: MailTransport | null): Promise<void> {
		await this.#boss.start();
		await this.#boss.createQueue(queue.name, queue);
		// Where it was there already, with the settings of an earlier version.
		await this.#boss.updateQueue(queue.name, queue);
		if (!transport) return;
		await this.#boss.work<Letter>(queue.name, { pollingIntervalSeconds: 1 }, async (jobs) => {
			for (const { data } of jobs) await deliverLetter(data, transport, this.#db());
		});
	}

	async enqueue(letter: Letter, tx: Queryable): Promise<void> {
		const id = await this.#boss.send(queue.name, letter, {
			db: {
				executeSql: async (text, values) => ({
					rows: (await tx.execute(numbered(text, values))).rows
				})
			}
		});
		if (!id) throw new Error('The mail queue did not take the letter.');
	}

	stop(): Promise<void> {
		return this.#boss.stop({ graceful: true, timeout: 2000 });
	}
}

let current: MailQueue | undefined;

/** The queue of this process: set at start-up, and by tests. */
export function useMailQueue(queue: MailQueue): void {
	current = queue;
}

export function mailQueue(): MailQueue {
	if (!current) throw new Error('No mail queue is in use: start-up has not run.');
	return current;
}
