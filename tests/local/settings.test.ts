import { expect, test } from 'vitest';
import { readSettings } from '../../src/local/settings.js';

const real = {
	DATABASE_URL: 'postgres://farwheel@db.example.org/farwheel',
	AUTH_SECRET: 'x'.repeat(32),
	ORIGIN: 'https://farwheel.example.org'
};

test('an empty environment brings stand-ins and the demo, on loopback', () => {
	expect(readSettings({}, { dev: false })).toEqual({
		standInDatabase: true,
		standInMail: true,
		demo: true,
		host: '127.0.0.1',
		port: 4180,
		portIsFixed: false,
		origin: null
	});
});

test('a database of its own means no stand-in for it and no demo', () => {
	expect(readSettings(real, { dev: false })).toMatchObject({
		standInDatabase: false,
		standInMail: true,
		demo: false,
		portIsFixed: true
	});
	expect(readSettings({ SMTP_URL: 'smtp://mail.example.org' }, { dev: false })).toMatchObject({
		standInDatabase: true,
		standInMail: false,
		demo: true
	});
});

test.each([
	['ORIGIN', { ...real, ORIGIN: '' }, /needs ORIGIN/],
	['AUTH_SECRET', { ...real, AUTH_SECRET: undefined }, /needs AUTH_SECRET/],
	['a short secret', { ...real, AUTH_SECRET: 'short' }, /has 5 characters and needs at least 32/],
	['an origin with a path', { ...real, ORIGIN: 'https://example.org/x' }, /ORIGIN is/],
	['a port out of range', { PORT: '70000' }, /PORT is "70000"/],
	['demo on a real database', { ...real, FARWHEEL_DEMO: '1' }, /stand-in database only/]
])('a start is refused by name: %s', (_name, env, words) => {
	const lines = readSettings(env, { dev: false });
	expect(lines).toEqual([expect.stringMatching(words)]);
});

test('development on a real database needs neither secret nor origin', () => {
	expect(readSettings({ DATABASE_URL: real.DATABASE_URL }, { dev: true })).toMatchObject({
		standInDatabase: false,
		demo: false
	});
});
