import { spawnSync } from 'node:child_process';
import { expect, test } from 'vitest';

test('the first-venue command without its options says how it is used and ends with 1', () => {
	const { status, stderr } = spawnSync(
		process.execPath,
		['--import', 'tsx', 'src/local/firstVenue.ts', '--venue', 'Lantern Hill'],
		{ encoding: 'utf8', timeout: 20_000 }
	);
	expect(stderr.trim()).toMatch(/^Usage: npm run first-venue -- --venue "Name" --zone/);
	expect(status).toBe(1);
});
