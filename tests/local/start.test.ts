import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { temporaryFolder } from './temporaryFolder';

function start(env: NodeJS.ProcessEnv, ...args: string[]) {
	return spawnSync(process.execPath, ['src/local/start.js', '--no-env-file', ...args], {
		env: { PATH: process.env.PATH, ...env },
		encoding: 'utf8',
		timeout: 20_000
	});
}

test('a production start without ORIGIN and secret ends with 1 and one line for each', () => {
	const data = join(temporaryFolder(), 'data');
	const env = { DATABASE_URL: 'postgres://nobody@127.0.0.1:1/none' };
	const { status, stderr, stdout } = start(env, '--data', data);
	expect(status).toBe(1);
	expect(stdout).toBe('');
	expect(stderr.trim().split('\n')).toEqual([
		expect.stringContaining('needs ORIGIN: the address people type'),
		expect.stringContaining('needs AUTH_SECRET: at least 32 random characters')
	]);
	expect(existsSync(data)).toBe(false);
});

test('an unknown option is refused by name', () => {
	const { status, stderr } = start({}, '--fast');
	expect(status).toBe(1);
	expect(stderr).toContain('Unknown option --fast');
});
