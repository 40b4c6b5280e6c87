import type { Letter } from '../../../src/lib/server/mail/Letter';
import { useMailQueue } from '../../../src/lib/server/mail/mailQueue';

/** Settings that the verbs read; nothing is sent to these addresses. */
export function useTestEnvironment(): void {
	process.env.DATABASE_URL ??= 'postgres://nobody@127.0.0.1:1/none';
	process.env.SMTP_URL ??= 'smtp://127.0.0.1:1';
	process.env.ORIGIN ??= 'http://farwheel.example.org';
	process.env.AUTH_SECRET ??= 'a secret for tests, of enough length';
}

/** Letters that verbs enqueue, newest last. */
export function recordLetters(): Letter[] {
	useTestEnvironment();
	const letters: Letter[] = [];
	useMailQueue({
		enqueue: async (letter) => {
			letters.push(letter);
		}
	});
	return letters;
}

export const visitor = { address: '203.0.113.5', userAgent: 'Test browser' };
export const goodPassword = 'seven quiet herons fishing';
