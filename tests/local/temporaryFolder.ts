import { chmodSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { onTestFinished } from 'vitest';

/** A folder that others may pass through, removed when the test ends. Its path holds a space. */
export function temporaryFolder(): string {
	const folder = mkdtempSync(join(tmpdir(), 'farwheel local '));
	chmodSync(folder, 0o711);
	onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
	return folder;
}
