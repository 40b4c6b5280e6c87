import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Context } from '../../../src/lib/server/context';
import type { Database } from '../../../src/lib/server/db/database';
import {
	archiveDome,
	createDome,
	initialDomeSettings,
	listDomes,
	readDome,
	updateDome
} from '../../../src/lib/server/domes';
import { startRun } from '../../../src/lib/server/runs';
import { contextFor, makeEdition, makeVenue, openDatabase } from '../runs/support';

let db: Database;
let close: () => Promise<void>;
let technician: Context;
let presenter: Context;
let stranger: Context;
const settings = { ...initialDomeSettings, name: 'Great Dome' };

beforeAll(async () => {
	({ db, close } = await openDatabase());
	const venue = await makeVenue(db);
	technician = await contextFor(db, venue, ['technician']);
	presenter = await contextFor(db, venue, ['presenter']);
	stranger = await contextFor(db, await makeVenue(db, 'Other'), ['manager']);
});
afterAll(() => close());

describe('domes', () => {
	it('are made, changed and listed in their venue only', async () => {
		const dome = await createDome(technician, { ...settings, tiltDegrees: '15' });
		expect(dome.tiltDegrees).toBe(15);
		await updateDome(technician, dome.id, { ...settings, filmSize: 4096, painter: 'plain' });
		expect(await readDome(presenter, dome.id)).toMatchObject({ filmSize: 4096, painter: 'plain' });
		expect((await listDomes(presenter)).map((d) => d.id)).toContain(dome.id);
		expect(await listDomes(stranger)).toEqual([]);
		for (const tried of [
			() => readDome(stranger, dome.id),
			() => updateDome(stranger, dome.id, settings),
			() => archiveDome(stranger, dome.id)
		]) {
			await expect(tried()).rejects.toMatchObject({ code: 'not-found' });
		}
		await expect(createDome(presenter, settings)).rejects.toMatchObject({ code: 'forbidden' });
	});

	it('refuse a value out of range at its field, with the range', async () => {
		await expect(
			createDome(technician, { ...settings, apertureDegrees: 400, filmSize: 1000 })
		).rejects.toMatchObject({
			code: 'invalid',
			details: {
				fields: {
					apertureDegrees: 'The aperture must be at most 230 degrees.',
					filmSize: 'Choose a size from the list.'
				}
			}
		});
		await expect(
			createDome(technician, { ...settings, diameterMetres: 'wide' })
		).rejects.toMatchObject({
			details: { fields: { diameterMetres: 'The diameter must be a number.' } }
		});
	});

	it('are not archived while a run is open in them', async () => {
		const dome = await createDome(technician, settings);
		const edition = await makeEdition(db, technician.venueId);
		await startRun(presenter, { editionId: edition.id, domeId: dome.id });
		await expect(archiveDome(technician, dome.id)).rejects.toMatchObject({ code: 'conflict' });
		const other = await createDome(technician, settings);
		await archiveDome(technician, other.id);
		const ids = async (archived: boolean) =>
			(await listDomes(technician, { archived })).map((d) => d.id);
		expect(await ids(false)).not.toContain(other.id);
		expect(await ids(true)).toContain(other.id);
		await archiveDome(technician, other.id, false);
		expect(await ids(false)).toContain(other.id);
	});
});
