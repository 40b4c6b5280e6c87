import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, onTestFinished, test } from 'vitest';
import { endProcess, identify, stillRuns } from '../../src/local/processes.js';
import { claim, record, release, runningNow } from '../../src/local/running.js';
import { temporaryFolder } from './temporaryFolder';

async function otherProcess() {
	const child = spawn(process.execPath, ['-e', 'setInterval(() => {}, 1000)']);
	await once(child, 'spawn');
	onTestFinished(() => {
		child.kill('SIGKILL');
	});
	return identify(child.pid ?? 0);
}

const write = (folder: string, starter: object) =>
	writeFileSync(
		join(folder, 'running.json'),
		JSON.stringify({ starter, address: 'http://127.0.0.1:4180' })
	);

test('a second start finds the first and its address', async () => {
	const folder = temporaryFolder();
	const other = await otherProcess();
	write(folder, other);
	expect(await claim(folder)).toEqual({
		taken: false,
		record: { starter: other, address: 'http://127.0.0.1:4180' }
	});
});

test('a start takes over from one that was killed, and gets its record', async () => {
	const folder = temporaryFolder();
	const other = await otherProcess();
	write(folder, other);
	await endProcess(other, { signal: 'SIGKILL' });
	expect(await claim(folder)).toMatchObject({ taken: true, leftover: { starter: other } });
});

test('a process of today is not taken for one of an earlier boot with the same number', async () => {
	const folder = temporaryFolder();
	const other = await otherProcess();
	write(folder, { ...other, boot: 'an earlier boot' });
	expect(runningNow(folder)).toBeNull();
	expect(stillRuns(other)).toBe(true);
	write(folder, { ...other, tick: '1' });
	expect(await claim(folder)).toMatchObject({ taken: true });
});

test('a half-written record does not stand in the way', async () => {
	const folder = temporaryFolder();
	writeFileSync(join(folder, 'running.json'), '{"starter": {"pi');
	expect(await claim(folder)).toEqual({ taken: true, leftover: null });
});

test('the record is for its owner only and is gone after release', async () => {
	const folder = temporaryFolder();
	await claim(folder);
	record(folder, { address: 'http://127.0.0.1:4180' });
	expect(statSync(join(folder, 'running.json')).mode & 0o777).toBe(0o600);
	expect(runningNow(folder)?.address).toBe('http://127.0.0.1:4180');
	release(folder);
	expect(runningNow(folder)).toBeNull();
});

test('endProcess ends a process that ignores the request, and its children', async () => {
	const code = `
		process.on('SIGTERM', () => {});
		require('node:child_process').spawn(process.execPath, ['-e', 'setInterval(() => {}, 1000)']);
		console.log('up');
		setInterval(() => {}, 1000);`;
	const child = spawn(process.execPath, ['-e', code], { stdio: ['ignore', 'pipe', 'ignore'] });
	await once(child.stdout, 'data');
	const { descendants } = await import('../../src/local/processes.js');
	const family = [identify(child.pid ?? 0), ...descendants(child.pid ?? 0)];
	expect(family.map(stillRuns)).toEqual([true, true]);
	await endProcess(family[0], { patience: 200 });
	expect(family.map(stillRuns)).toEqual([false, false]);
});
