import { describe, expect, test } from 'vitest';
import { awayAnswer } from '../../../src/lib/server/hooks/awayAnswer';

const asked = (headers: Record<string, string>, isDataRequest = false, method = 'GET') =>
	awayAnswer({
		isDataRequest,
		route: { id: '/(office)/shows' },
		request: new Request('http://farwheel.test/shows', { headers, method })
	});

describe('awayAnswer', () => {
	test('gives a reader a page that says why and offers to try again', async () => {
		const answer = asked({ accept: 'text/html' });
		expect(answer.status).toBe(503);
		expect(answer.headers.get('content-type')).toContain('text/html');
		const text = await answer.text();
		expect(text).toContain('The database does not answer.');
		expect(text).toMatch(/<a href="">\s*Try again/);
		expect(text).not.toContain('%sveltekit');
	});

	test('gives the app’s own scripts what they read: an error, or an action’s result', async () => {
		const error = {
			message: expect.stringContaining('database does not answer'),
			retry: true
		};
		const data = asked({}, true);
		expect([data.status, await data.json()]).toEqual([503, error]);
		const action = asked({ accept: 'application/json', 'x-sveltekit-action': 'true' });
		expect([action.status, await action.json()]).toEqual([
			503,
			{ type: 'error', status: 503, error }
		]);
	});

	test('gives a script that saves problem details, whatever it accepts', async () => {
		const answer = asked({ accept: '*/*' }, false, 'PUT');
		expect(answer.status).toBe(503);
		expect(answer.headers.get('content-type')).toBe('application/problem+json');
		expect(await answer.json()).toMatchObject({ status: 503, retry: true });
	});
});
