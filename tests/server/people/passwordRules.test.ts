import { describe, expect, test } from 'vitest';
import { passwordProblem } from '../../../src/lib/server/people';

const own = ['pia.overton@lanternhill.example.org', 'Pia Overton', 'Lantern Hill Science Centre'];

describe('passwordProblem', () => {
	test.each([
		'seven quiet herons fishing',
		'lanterns over the far hill',
		'zwölf blaue Teekannen am Deich',
		'7Gq!v0 xL2#mPz9&',
		'a'.repeat(7) + ' bottle of green ink',
		'x7'.repeat(3) + 'w'.repeat(200) + 'unusual'
	])('lets %s pass', (password) => {
		expect(passwordProblem(password, own)).toBeNull();
	});

	test.each([
		['', /at least 15/],
		['fourteen chars', /at least 15/],
		['a'.repeat(257), /at most 256/],
		['aaaaaaaaaaaaaaaaa', /pattern/],
		['abcabcabcabcabcabc', /pattern/],
		['123456789012345', /pattern/],
		['qwertyuiopasdfghjkl', /pattern/],
		['passwordpassword1', /common/],
		['P@ssw0rd-W3lcome!', /common/],
		['letmein letmein 2026', /common/],
		['piaovertonpiaoverton', /common/],
		['LanternHillPassword!', /common/],
		['Farwheel-Farwheel-1', /common/]
	])('refuses %s', (password, why) => {
		expect(passwordProblem(password, own)).toMatch(why);
	});

	test('counts characters and not code units', () => {
		expect(passwordProblem('🛶'.repeat(14))).toMatch(/at least 15/);
	});
});
