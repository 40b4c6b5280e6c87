import { createServer } from 'node:http';
import { mkdirSync, readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { readJson, writePrivateJson } from './folders.js';
import { mailPage } from './mailPage.js';
import { freePort } from './ports.js';

/**
 * A caught mail, as kept in the data folder and as `messages.json` of the mail page lists it.
 * @typedef {{ id: string, at: string, from: string, to: string[], subject: string, text: string }} CaughtMail
 */

const kept = 200;

/** The mails of a folder, one JSON file each, named so that names sort by time. */
class MailStore {
	#last = 0;

	/** @param {string} folder */
	constructor(folder) {
		this.folder = folder;
		mkdirSync(folder, { recursive: true, mode: 0o700 });
	}

	/** @returns {string[]} oldest first */
	#files() {
		return readdirSync(this.folder)
			.filter((name) => /^\d+\.json$/.test(name))
			.sort();
	}

	/** @param {Omit<CaughtMail, 'id' | 'at'>} mail */
	add(mail) {
		const now = new Date();
		// Two mails within a millisecond still have two names.
		this.#last = Math.max(now.getTime(), this.#last + 1);
		const id = String(this.#last).padStart(15, '0');
		writePrivateJson(join(this.folder, `${id}.json`), { id, at: now.toISOString(), ...mail });
		for (const old of this.#files().slice(0, -kept)) rmSync(join(this.folder, old));
	}

	/** @returns {CaughtMail[]} newest first */
	list() {
		return this.#files()
			.reverse()
			.map((name) => /** @type {CaughtMail | undefined} */ (readJson(join(this.folder, name))))
			.filter((mail) => mail !== undefined);
	}
}

/** @param {import('node:net').Server | SMTPServer} server @param {number} port @returns {Promise<void>} */
const listen = (server, port) =>
	new Promise((resolve, reject) => {
		server.once('error', reject);
		server.listen(port, '127.0.0.1', () => resolve());
	});

/**
 * Starts the stand-in for a mail service: an SMTP server on loopback that delivers nothing, keeps
 * the last 200 mails, and shows them on a page of its own.
 * @param {{ dataFolder: string, pagePort: number | null }} options pagePort: wanted, the next free one is taken
 * @returns {Promise<{ smtpUrl: string, page: string, stop: () => Promise<void> }>}
 */
export async function startMailCatcher({ dataFolder, pagePort }) {
	const store = new MailStore(join(dataFolder, 'mail'));
	const smtp = new SMTPServer({
		disabledCommands: ['AUTH', 'STARTTLS'],
		size: 1024 * 1024,
		// A client that holds its connection open must not hold up a stop.
		closeTimeout: 1000,
		onData(stream, session, callback) {
			simpleParser(stream).then(
				(mail) => {
					store.add({
						from: mail.from?.text ?? '',
						to: session.envelope.rcptTo.map((recipient) => recipient.address),
						subject: mail.subject ?? '',
						text: mail.text ?? ''
					});
					callback();
				},
				(error) => callback(error)
			);
		}
	});
	const page = createServer((request, response) => {
		// A page elsewhere must not read mails through a name that it points at this machine.
		if (!/^(127\.0\.0\.1|localhost)(:\d+)?$/.test(request.headers.host ?? '')) {
			response.writeHead(421).end();
			return;
		}
		const path = new URL(request.url ?? '/', 'http://localhost').pathname;
		const json = path === '/messages.json';
		if (request.method !== 'GET' || (!json && path !== '/')) {
			response.writeHead(404, { 'content-type': 'text/plain' }).end('There is no such page.\n');
			return;
		}
		response.writeHead(200, {
			'content-type': json ? 'application/json' : 'text/html; charset=utf-8',
			'content-security-policy': "default-src 'none'; style-src 'unsafe-inline'",
			'cache-control': 'no-store'
		});
		response.end(json ? JSON.stringify(store.list()) : mailPage(store.list()));
	});
	const ports = { smtp: await freePort(null), page: await freePort(pagePort) };
	await listen(smtp, ports.smtp);
	await listen(page, ports.page);
	// Once it listens, a client that breaks off is no reason to stop.
	smtp.on('error', (error) => console.log(`mail catcher: ${error.message}`));
	return {
		smtpUrl: `smtp://127.0.0.1:${ports.smtp}`,
		page: `http://127.0.0.1:${ports.page}`,
		async stop() {
			page.closeAllConnections();
			await Promise.all([
				new Promise((resolve) => page.close(resolve)),
				new Promise((resolve) => smtp.close(() => resolve(undefined)))
			]);
		}
	};
}
