import { parseArgs } from 'node:util';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { defaultDataFolder, root } from './folders.js';
import { runningNow } from './running.js';
import { secrets } from './secrets.js';

/**
 * Makes the first venue of an installation and invites its manager by mail.
 *
 *   npm run first-venue -- --venue "Name" --zone Europe/London --email manager@example.org
 */
const usage =
	'Usage: npm run first-venue -- --venue "Name" --zone Europe/London --email manager@example.org';

/** Takes the variables of the start that runs now, where the environment has none of its own. */
function joinRunningStart(): void {
	const running = runningNow(defaultDataFolder);
	if (process.env.DATABASE_URL || !running?.databaseUrl) return;
	process.env.DATABASE_URL = running.databaseUrl;
	process.env.SMTP_URL ??= running.smtpUrl;
	process.env.ORIGIN ??= running.address;
	process.env.AUTH_SECRET ??= secrets(defaultDataFolder).authSecret;
}

async function main(): Promise<number> {
	const { values } = parseArgs({
		options: { venue: { type: 'string' }, zone: { type: 'string' }, email: { type: 'string' } }
	});
	const { venue, zone, email } = values;
	if (!venue || !zone || !email) {
		console.error(usage);
		return 1;
	}
	if (existsSync(join(root, '.env'))) process.loadEnvFile(join(root, '.env'));
	joinRunningStart();
	const missing = ['DATABASE_URL', 'SMTP_URL', 'ORIGIN', 'AUTH_SECRET'].filter(
		(name) => !process.env[name]
	);
	if (missing.length > 0) {
		console.error(
			`Not set: ${missing.join(', ')}. Set them as for the app (see .env.example), or start the app on this machine first.`
		);
		return 1;
	}
	const { createFirstVenue } = await import('../lib/server/people/firstVenue');
	const { invitationUrl } = await createFirstVenue({
		venueName: venue,
		timeZone: zone,
		email,
		origin: process.env.ORIGIN ?? ''
	});
	console.log(`${venue} is made. An invitation for its manager is on its way to ${email}:`);
	console.log(`  ${invitationUrl}`);
	return 0;
}

// Set, not called: output and open connections end first.
process.exitCode = await main().catch((error: unknown) => {
	console.error(error instanceof Error ? error.message : error);
	return 1;
});
