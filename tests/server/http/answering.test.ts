import { error, redirect } from '@sveltejs/kit';
import { describe, expect, it } from 'vitest';
import { AppError } from '../../../src/lib/server/errors';
import { readBody } from '../../../src/lib/server/http/readBody';
import { answering } from '../../../src/lib/server/http/problem';

const answerOf = (work: () => Promise<Response>) => answering(work);
const post = (body: string, headers: Record<string, string> = {}) =>
	new Request('http://farwheel.test/api', { method: 'POST', body, headers });

describe('answering', () => {
	it('turns a coded error into its status, with its details', async () => {
		const answer = await answerOf(async () => {
			throw new AppError('conflict', 'Too late.', { revision: 3 });
		});
		expect(answer.headers.get('content-type')).toBe('application/problem+json');
		expect(await answer.json()).toMatchObject({ status: 409, detail: 'Too late.', revision: 3 });
	});
	it('names what nobody expected by an id, and says nothing else of it', async () => {
		const answer = await answerOf(async () => {
			throw new Error('the secret of the house');
		});
		expect(answer.status).toBe(500);
		const body = await answer.text();
		expect(body).not.toContain('secret');
		expect(JSON.parse(body).id).toMatch(/^[0-9a-f-]{36}$/);
	});
	it('keeps statuses that were thrown on purpose and lets redirects pass', async () => {
		const gone = await answerOf(async () => error(404, { message: 'There is no such page.' }));
		expect([gone.status, (await gone.json()).detail]).toEqual([404, 'There is no such page.']);
		await expect(answerOf(async () => redirect(303, '/shows'))).rejects.toMatchObject({
			location: '/shows'
		});
	});
});

describe('readBody', () => {
	it('reads JSON and refuses what is none', async () => {
		expect(await readBody(post('{"a":1}'))).toEqual({ a: 1 });
		await expect(readBody(post('{"a":'))).rejects.toMatchObject({ code: 'invalid' });
	});
	it('refuses more than it may be, by its announced and by its real length', async () => {
		const large = JSON.stringify('x'.repeat(20_000));
		await expect(readBody(post(large))).rejects.toMatchObject({ code: 'too-large' });
		await expect(readBody(post('{}', { 'content-length': '20000' }))).rejects.toMatchObject({
			code: 'too-large'
		});
	});
	it('says so in its own words where the server in front cuts a body off', async () => {
		const cut = new Request('http://farwheel.test/api', {
			method: 'POST',
			duplex: 'half',
			body: new ReadableStream({
				start: (controller) => controller.error(Object.assign(new Error('cut'), { status: 413 }))
			})
		} as RequestInit);
		await expect(readBody(cut)).rejects.toMatchObject({
			code: 'too-large',
			message: expect.stringContaining('16 kB')
		});
	});
});
