import { closeDatabase } from '../db/database';
import { runMigrations } from '../db/migrate';
import { waitForDatabase } from '../db/waitForDatabase';
import { environment } from '../env';
import { log } from '../log';
import { BossMailQueue, useMailQueue } from '../mail/mailQueue';
import { smtpTransport } from '../mail/transport';
import { closeNotices } from '../runs/notices';

let mail: BossMailQueue | undefined;

/** Before the first request: settings, database, schema, and the demo where it is wanted. */
export async function startUp(): Promise<void> {
	const { DATABASE_URL, MIGRATIONS_FOLDER, FARWHEEL_DEMO } = environment();
	await waitForDatabase(DATABASE_URL);
	await runMigrations(DATABASE_URL, MIGRATIONS_FOLDER);
	mail = new BossMailQueue(DATABASE_URL);
	await mail.start(smtpTransport());
	useMailQueue(mail);
	if (FARWHEEL_DEMO) {
		const { seedDemo } = await import('../demo/seed');
		if (await seedDemo()) log.info('the empty database was filled with the demo');
	}
}

/** The server has answered its last request: close what it holds. */
export async function shutDown(): Promise<void> {
	await mail?.stop();
	await closeNotices();
	await closeDatabase();
}
