import { readdirSync, writeFileSync } from 'node:fs';
import { request } from 'node:http';
import { join } from 'node:path';
import { createTransport } from 'nodemailer';
import { expect, onTestFinished, test } from 'vitest';
import { startMailCatcher } from '../../src/local/mail.js';
import { temporaryFolder } from './temporaryFolder';

async function catcher(dataFolder = temporaryFolder()) {
	const mail = await startMailCatcher({ dataFolder, pagePort: null });
	onTestFinished(mail.stop);
	const transport = createTransport(mail.smtpUrl);
	const send = (subject: string, text: string) =>
		transport.sendMail({ from: 'app@example.org', to: 'pia@example.org', subject, text });
	return { ...mail, dataFolder, send };
}

test('a mail that is sent is listed, newest first, and shown with its links', async () => {
	const { send, page } = await catcher();
	await send('First', 'one');
	await send('Join <Lantern Hill>', 'Open http://127.0.0.1:4180/join/a?b=1&c=2 to join.');
	const list = await (await fetch(`${page}/messages.json`)).json();
	expect(list).toMatchObject([
		{ subject: 'Join <Lantern Hill>', to: ['pia@example.org'], from: 'app@example.org' },
		{ subject: 'First' }
	]);
	const html = await (await fetch(page)).text();
	expect(html).toContain('href="http://127.0.0.1:4180/join/a?b=1&#38;c=2"');
	expect(html).toContain('Join &#60;Lantern Hill&#62;');
});

test('only the last 200 mails are kept', async () => {
	const dataFolder = temporaryFolder();
	const { send } = await catcher(dataFolder);
	for (let i = 0; i < 205; i++) {
		writeFileSync(join(dataFolder, 'mail', `${String(i).padStart(15, '0')}.json`), '{"to":[]}');
	}
	await send('Latest', 'text');
	const files = readdirSync(join(dataFolder, 'mail')).sort();
	expect(files).toHaveLength(200);
	expect(files[0]).toBe('000000000000006.json');
});

test('the page answers to loopback names only', async () => {
	const { page } = await catcher();
	const status = await new Promise((resolve, reject) => {
		request(page, { headers: { host: 'mail.example.org' } }, (answer) => {
			answer.resume();
			resolve(answer.statusCode);
		})
			.on('error', reject)
			.end();
	});
	expect(status).toBe(421);
	expect((await fetch(`${page}/other`)).status).toBe(404);
});
