import { Linter } from 'eslint';
import { describe, expect, it } from 'vitest';
import { importsOneWay } from '../../.config/houseRules.js';

const messages = (file: string, code: string): string[] =>
	new Linter({ configType: 'flat', cwd: '/' })
		.verify(
			code,
			{
				files: ['**/*.js', '**/*.ts'],
				plugins: { house: { rules: { 'imports-one-way': importsOneWay } } },
				rules: { 'house/imports-one-way': 'error' }
			},
			{ filename: file }
		)
		.map((m) => m.message);

describe('imports-one-way', () => {
	it.each([
		['/app/src/lib/dynamics/a.js', "import { G } from '../units';"],
		['/app/src/lib/dynamics/components/a.js', "import { G } from '../../units';"],
		['/app/src/lib/picture/a.js', "import { x } from '../show/document';"],
		[
			'/app/src/lib/stage/a.js',
			"import { x } from '../picture/frame'; import * as T from 'three';"
		],
		['/app/src/lib/server/shows/a.js', "import { x } from '../../show/document';"]
	])('lets %s read lower floors', (file, code) => {
		expect(messages(file, code)).toEqual([]);
	});

	it.each([
		['/app/src/lib/dynamics/a.js', "import { x } from '../show/document';", 'one way'],
		['/app/src/lib/show/a.js', "import { x } from '../picture/frame';", 'one way'],
		['/app/src/lib/show/a.js', "export { x } from '../server/log';", 'one way'],
		['/app/src/lib/picture/a.js', "import { x } from '$lib/units';", 'relative path'],
		['/app/src/lib/dome/a.js', "import * as T from 'three';", 'pure room'],
		['/app/src/lib/starfield/a.js', "const x = import('svelte');", 'pure room'],
		['/app/src/lib/show/a.js', "import fs from 'node:fs';", 'pure room'],
		['/app/src/lib/live/a.js', "import { x } from '$lib/server/log';", 'one floor'],
		['/app/src/lib/live/a.js', "import { x } from '../stage/chooseStarPainter';", 'one floor'],
		['/app/src/lib/server/a.js', "import { x } from '../stage/chooseStarPainter';", 'one floor'],
		['/app/src/lib/show/a.js', "import { x } from '../../routes/+page.svelte';", 'routes']
	])('stops %s reading upward', (file, code, words) => {
		const found = messages(file, code);
		expect(found).toHaveLength(1);
		expect(found[0]).toContain(words);
	});
});
