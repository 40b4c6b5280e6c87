import { eq, sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { connect, type Database } from '../../../src/lib/server/db/database';
import { mailsSent, venues } from '../../../src/lib/server/db/schema';
import { deliverLetter } from '../../../src/lib/server/mail/deliverLetter';
import { FakeMailTransport } from '../../../src/lib/server/mail/FakeMailTransport';
import { BossMailQueue, useMailQueue } from '../../../src/lib/server/mail/mailQueue';
import { mailText } from '../../../src/lib/server/mail/mailText';
import { secretToken } from '../../../src/lib/server/mail/secretTokens';
import { invite, withdrawInvitation } from '../../../src/lib/server/people';
import { makeVenue } from '../shows/support';
import { freshDatabase } from '../support/database';
import { useTestEnvironment } from './support';

let db: Database;
let queue: BossMailQueue;
let close = async () => {};
const transport = new FakeMailTransport();

beforeAll(async () => {
	useTestEnvironment();
	const fresh = await freshDatabase();
	const made = connect(fresh.url);
	db = made.db;
	queue = new BossMailQueue(fresh.url, () => db);
	await queue.start(transport);
	useMailQueue(queue);
	close = async () => {
		await queue.stop();
		await made.pool.end();
		await fresh.close();
	};
});
afterAll(() => close());

const jobsFor = async (id: string) =>
	(await db.execute(sql`select 1 from pgboss.job where name = 'mail' and data->>'id' = ${id}`)).rows
		.length;

async function sentTo(address: string) {
	await expect
		.poll(() => transport.sent.filter(({ to }) => to === address).length, { timeout: 15_000 })
		.toBe(1);
	return transport.sent.filter(({ to }) => to === address)[0];
}

describe('the mail queue', () => {
	test('sends the letter of a change that was made', async () => {
		const ctx = { ...(await makeVenue(db, ['manager'])), db };
		await db.update(venues).set({ name: 'Mill & Moon' }).where(eq(venues.id, ctx.venueId));
		const id = await invite(ctx, { email: 'nova@example.org', roles: ['presenter'] });
		const mail = await sentTo('nova@example.org');
		expect(mail.subject).toBe('Join Mill & Moon on Farwheel');
		expect(mail.text).toContain(`${process.env.ORIGIN}/join/${secretToken('invitation', id)}`);
		expect(mail.html).toContain('Mill &amp; Moon');
		// The job that carried it knows no token.
		const { rows } = await db.execute<{ data: object }>(
			sql`select data from pgboss.job where data->>'id' = ${id}`
		);
		expect(rows).toEqual([{ data: { kind: 'invitation', id } }]);
	});

	test('forgets the letter of a change that was rolled back', async () => {
		const ctx = await makeVenue(db, ['manager']);
		let id = '';
		const failed = db.transaction(async (tx) => {
			id = await invite({ ...ctx, tx }, { email: 'rolled@example.org', roles: ['adviser'] });
			throw new Error('the change fails after all');
		});
		await expect(failed).rejects.toThrow('after all');
		expect(id).not.toBe('');
		expect(await jobsFor(id)).toBe(0);
	});

	test('tries again after a refusal and then sends once', async () => {
		transport.refusals = 1;
		const ctx = { ...(await makeVenue(db, ['manager'])), db };
		await invite(ctx, { email: 'twice@example.org', roles: ['adviser'] });
		await sentTo('twice@example.org');
	}, 40_000);
});

describe('deliverLetter', () => {
	test('sends once, however often and by however many it is tried', async () => {
		const ctx = { ...(await makeVenue(db, ['manager'])), db };
		const id = await invite(ctx, { email: 'once@example.org', roles: ['adviser'] });
		await sentTo('once@example.org');
		const letter = { kind: 'invitation', id } as const;
		const own = new FakeMailTransport();
		await db.delete(mailsSent).where(eq(mailsSent.key, `invitation:${id}`));
		const tried = await Promise.all([1, 2, 3, 4].map(() => deliverLetter(letter, own, db)));
		expect(tried.filter(Boolean)).toHaveLength(1);
		expect(own.sent).toHaveLength(1);
	});

	test('sends what a worker claimed and died over, and leaves a fresh claim alone', async () => {
		const ctx = { ...(await makeVenue(db, ['manager'])), db };
		const id = await invite(ctx, { email: 'orphan@example.org', roles: ['adviser'] });
		await sentTo('orphan@example.org');
		const own = new FakeMailTransport();
		const claim = (ageSeconds: number) =>
			db
				.update(mailsSent)
				.set({ sentAt: null, claimedAt: new Date(Date.now() - ageSeconds * 1000) })
				.where(eq(mailsSent.key, `invitation:${id}`));
		await claim(20);
		expect(await deliverLetter({ kind: 'invitation', id }, own, db)).toBe(false);
		await claim(110);
		expect(await deliverLetter({ kind: 'invitation', id }, own, db)).toBe(true);
		expect(own.sent).toHaveLength(1);
	});

	test('sends nothing for an invitation that was withdrawn meanwhile', async () => {
		const ctx = { ...(await makeVenue(db, ['manager'])), db };
		const own = new FakeMailTransport();
		const id = await invite(ctx, { email: 'gone@example.org', roles: ['adviser'] });
		await withdrawInvitation(ctx, id);
		expect(await deliverLetter({ kind: 'invitation', id }, own, db)).toBe(false);
		expect(own.sent).toEqual([]);
	});

	test('sends a sign-in link while it works and not once it is over', async () => {
		const own = new FakeMailTransport();
		const letter = { kind: 'sign-in', email: 'late@example.org', next: '/' } as const;
		const over = { ...letter, id: 'over', until: Date.now() - 1 };
		expect(await deliverLetter(over, own, db)).toBe(false);
		expect(own.sent).toEqual([]);
		const works = { ...letter, id: 'works', until: Date.now() + 60_000 };
		expect(await deliverLetter(works, own, db)).toBe(true);
		expect(own.sent[0].text).toContain(`${process.env.ORIGIN}/sign-in/link?email=late%40example`);
	});
});

test('mailText escapes words and keeps one link in the text', () => {
	const { text, html } = mailText('S', {
		before: ['<b>&"'],
		link: 'http://a.example/x?a=1&b=2',
		button: 'Go',
		after: []
	});
	expect(html).toContain('&lt;b&gt;&amp;&quot;');
	expect(html).not.toContain('<b>');
	expect(text.match(/https?:\/\/\S+/g)).toEqual(['http://a.example/x?a=1&b=2']);
});
