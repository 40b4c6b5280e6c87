import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { knownFolder } from '../../src/local/postgresFolder.js';
import { temporaryFolder } from './temporaryFolder';

/** A data folder whose cluster lives elsewhere, noted there as the one of `owner`. */
function clusterElsewhere(owner: (dataFolder: string) => string) {
	const dataFolder = temporaryFolder();
	const folder = temporaryFolder();
	writeFileSync(join(folder, 'data-folder'), owner(dataFolder));
	writeFileSync(join(dataFolder, 'postgres.json'), JSON.stringify({ folder, port: 5432 }));
	return { dataFolder, folder };
}

test('a cluster elsewhere is found again', () => {
	const { dataFolder, folder } = clusterElsewhere((own) => own);
	expect(knownFolder(dataFolder)).toBe(folder);
});

test('a moved checkout takes its cluster along, a copied one does not', () => {
	const moved = clusterElsewhere(() => '/where/it/was/before');
	expect(knownFolder(moved.dataFolder)).toBe(moved.folder);
	const original = temporaryFolder();
	const copied = clusterElsewhere(() => original);
	expect(knownFolder(copied.dataFolder)).toBeNull();
});

test('a cluster in the data folder comes before one that is noted elsewhere', () => {
	const { dataFolder } = clusterElsewhere((own) => own);
	mkdirSync(join(dataFolder, 'postgres'));
	expect(knownFolder(dataFolder)).toBe(join(dataFolder, 'postgres'));
});
