import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { documentVersion } from '../../src/lib/show/document';
import { readDocument } from '../../src/lib/show/readDocument';

const saved = (version: number): unknown =>
	JSON.parse(readFileSync(new URL(`fixtures/document-${version}.json`, import.meta.url), 'utf8'));

describe('readDocument', () => {
	it.each(Array.from({ length: documentVersion }, (_, i) => i + 1))(
		'reads a saved document of version %d',
		(version) => {
			const document = readDocument(saved(version));
			expect(document.version).toBe(documentVersion);
			expect(document.scenes.length).toBeGreaterThan(0);
		}
	);
	it('names a version it does not know', () => {
		expect(() => readDocument({ version: 99 })).toThrow('version 99');
		expect(() => readDocument({})).toThrow('no version');
	});
	it('names the field that is damaged', () => {
		const document = saved(1) as { scenes: { view: { distance: number } }[] };
		document.scenes[0].view.distance = -3;
		expect(() => readDocument(document)).toThrow('scenes.0.view.distance');
	});
});
