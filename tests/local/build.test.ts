import { mkdirSync, utimesSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { buildIsStale, sourceHash } from '../../src/local/build.js';
import { temporaryFolder } from './temporaryFolder';

function project(): string {
	const root = temporaryFolder();
	for (const folder of ['src/lib', 'static', 'build']) {
		mkdirSync(join(root, folder), { recursive: true });
	}
	writeFileSync(join(root, 'src/lib/a.ts'), 'export const a = 1;');
	writeFileSync(join(root, 'package-lock.json'), '{}');
	return root;
}

function stamp(root: string): void {
	writeFileSync(join(root, 'build/index.js'), '');
	writeFileSync(join(root, 'build/source.sha256'), sourceHash(root));
}

test('a project without a build is stale, one with a fresh build is not', () => {
	const root = project();
	expect(buildIsStale(root)).toBe(true);
	stamp(root);
	expect(buildIsStale(root)).toBe(false);
});

test('a changed, added or renamed source makes the build stale', () => {
	const root = project();
	const changes = [
		() => writeFileSync(join(root, 'src/lib/a.ts'), 'export const a = 2;'),
		() => writeFileSync(join(root, 'src/lib/b.ts'), ''),
		() => writeFileSync(join(root, 'static/mark.svg'), '<svg/>'),
		() => writeFileSync(join(root, 'package-lock.json'), '{"a":1}'),
		() => writeFileSync(join(root, 'vite.config.ts'), 'export default {};')
	];
	for (const change of changes) {
		stamp(root);
		change();
		expect(buildIsStale(root), change.toString()).toBe(true);
	}
});

test('a touched source with the same content leaves the build fresh', () => {
	const root = project();
	stamp(root);
	const later = new Date(Date.now() + 60_000);
	utimesSync(join(root, 'src/lib/a.ts'), later, later);
	expect(buildIsStale(root)).toBe(false);
});

test('a build that was cut off before its stamp is stale', () => {
	const root = project();
	writeFileSync(join(root, 'build/index.js'), '');
	expect(buildIsStale(root)).toBe(true);
});
