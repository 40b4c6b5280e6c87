import { expect, test } from 'vitest';
import { readable } from '../../src/local/app.js';

test("readable turns the app's JSON lines into words and leaves others as they are", () => {
	const time = new Date(2026, 0, 2, 13, 4, 5).getTime();
	const line = (level: number, rest: object) => JSON.stringify({ level, time, ...rest });
	expect(readable(line(30, { msg: 'migrated' }))).toBe('13:04:05 migrated');
	expect(readable(line(40, { msg: 'slow' }))).toBe('13:04:05 warning slow');
	expect(readable(line(50, { msg: 'lost', err: { message: 'gone' } }))).toBe(
		'13:04:05 error lost: gone'
	);
	expect(readable('{not JSON')).toBe('{not JSON');
	expect(readable('Listening on http://127.0.0.1:4180')).toBe('Listening on http://127.0.0.1:4180');
});
