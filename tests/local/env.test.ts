import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { environmentSchema } from '../../src/lib/server/env';

test('.env.example lists exactly the variables that the app declares', () => {
	const listed = [...readFileSync('.env.example', 'utf8').matchAll(/^# ([A-Z][A-Z_]+)=/gm)];
	expect(listed.map((match) => match[1]).sort()).toEqual(
		Object.keys(environmentSchema.shape).sort()
	);
});
