import { statSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { secrets } from '../../src/local/secrets.js';
import { temporaryFolder } from './temporaryFolder';

test('secrets are made once, kept, and closed to others', () => {
	const folder = temporaryFolder();
	const made = secrets(folder);
	expect(made.authSecret.length).toBeGreaterThanOrEqual(32);
	expect(secrets(folder)).toEqual(made);
	expect(statSync(join(folder, 'secrets.json')).mode & 0o777).toBe(0o600);
	expect(secrets(temporaryFolder())).not.toEqual(made);
});
