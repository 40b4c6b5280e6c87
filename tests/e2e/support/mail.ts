import type { CaughtMail } from '../../../src/local/mail.js';

/** @returns the mails the catcher holds for an address, newest first */
export async function mailsTo(address: string): Promise<CaughtMail[]> {
	const page = process.env.FARWHEEL_TEST_MAIL_PAGE;
	if (!page) throw new Error('FARWHEEL_TEST_MAIL_PAGE is not set: run npm test -- --only e2e');
	const answer = await fetch(`${page}/messages.json`);
	if (!answer.ok) throw new Error(`the mail catcher answered ${answer.status}`);
	const mails: CaughtMail[] = await answer.json();
	return mails.filter((mail) => mail.to.includes(address));
}

/**
 * Waits for a mail that was sent after `since`.
 * @param options within: milliseconds
 * @throws Error naming the subjects that did come
 */
export async function nextMail(
	address: string,
	options: { since?: Date; subject?: RegExp; within?: number } = {}
): Promise<CaughtMail> {
	const { since = new Date(0), subject = /./, within = 15_000 } = options;
	const end = Date.now() + within;
	for (;;) {
		const mails = await mailsTo(address);
		const found = mails.find((mail) => new Date(mail.at) >= since && subject.test(mail.subject));
		if (found) return found;
		if (Date.now() > end) {
			const came = mails.map((mail) => mail.subject).join('; ') || 'none';
			throw new Error(`no mail to ${address} matching ${subject} came; there are: ${came}`);
		}
		await new Promise((resolve) => setTimeout(resolve, 200));
	}
}

/** @returns the first link in a mail @throws Error where it has none */
export function linkIn(mail: CaughtMail): string {
	const link = /https?:\/\/\S+/.exec(mail.text)?.[0];
	if (!link) throw new Error(`there is no link in the mail "${mail.subject}"`);
	return link;
}
