import { mkdirSync, utimesSync, writeFileSync } from 'node:fs';
import { createHash } from 'node:crypto';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { nodeIsNewEnough, packagesAreStale } from '../../src/local/install.js';
import { temporaryFolder } from './temporaryFolder';

const lock = '{"lockfileVersion":3}';

/** A project whose lock is so many seconds newer than its packages. */
function project(newerBy: number): string {
	const root = temporaryFolder();
	mkdirSync(join(root, 'node_modules'));
	writeFileSync(join(root, 'package-lock.json'), lock);
	writeFileSync(join(root, 'node_modules/.package-lock.json'), '{}');
	const now = Date.now() / 1000;
	utimesSync(join(root, 'node_modules/.package-lock.json'), now, now);
	utimesSync(join(root, 'package-lock.json'), now + newerBy, now + newerBy);
	return root;
}

test('packages are stale where node_modules is missing or was cut off', () => {
	const root = temporaryFolder();
	writeFileSync(join(root, 'package-lock.json'), lock);
	expect(packagesAreStale(root)).toBe(true);
	mkdirSync(join(root, 'node_modules'));
	expect(packagesAreStale(root)).toBe(true);
});

test('packages are stale where they are older than the lock', () => {
	expect(packagesAreStale(project(10))).toBe(true);
	expect(packagesAreStale(project(-10))).toBe(false);
});

test('packages are fresh where a checkout only touched the lock they were installed from', () => {
	const root = project(10);
	const hash = createHash('sha256').update(lock).digest('hex');
	writeFileSync(join(root, 'node_modules/.farwheel-lock'), hash);
	expect(packagesAreStale(root)).toBe(false);
	writeFileSync(join(root, 'package-lock.json'), '{"lockfileVersion":3,"changed":true}');
	utimesSync(join(root, 'package-lock.json'), Date.now() / 1000 + 20, Date.now() / 1000 + 20);
	expect(packagesAreStale(root)).toBe(true);
});

test('nodeIsNewEnough knows the first version that will do', () => {
	const versions = ['18.20.4', '20.18.3', '20.19.0', '22.1.0'];
	expect(versions.map(nodeIsNewEnough)).toEqual([false, false, true, true]);
});
