import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { runLog, saveLog, startRun, readRun } from '../../../src/lib/server/runs';
import type { Context } from '../../../src/lib/server/context';
import type { Database } from '../../../src/lib/server/db/database';
import type { RunCommand } from '../../../src/lib/show/playback';
import { makeContent, makeScene, uuid } from '../../show/support/content';
import { contextFor, makeDome, makeEdition, makeVenue, openDatabase } from './support';

const control = uuid(501);
const content = makeContent([
	makeScene(1, { pace: { kind: 'timed', seconds: 10 } }),
	makeScene(2, {
		controls: [
			{
				id: control,
				label: 'Halo mass',
				target: { kind: 'halo-factor' },
				min: 0,
				max: 2,
				rest: 1
			}
		]
	}),
	makeScene(3)
]);
const begin = 1_700_000_000_000;
const happened = (...list: [number, RunCommand][]) =>
	list.map(([seconds, command], i) => ({
		number: i + 1,
		at: begin + seconds * 1000,
		command,
		actor: 'Petra'
	}));

describe('runLog', () => {
	it('lists scenes with their seconds, those that went on by themselves too', () => {
		const events = happened(
			[0, { kind: 'begin' }],
			[25, { kind: 'advance', from: uuid(2) }],
			[40, { kind: 'end' }]
		);
		const log = runLog(content, events, begin + 999_000);
		expect([log.beganAt, log.endedAt, log.seconds]).toEqual([begin, begin + 40_000, 40]);
		const scenes = log.entries.flatMap((e) =>
			e.kind === 'scene' ? [[e.place, (e.at - begin) / 1000, e.seconds, e.actor]] : []
		);
		expect(scenes).toEqual([
			[1, 0, 10, 'Petra'],
			[2, 10, 15, null],
			[3, 25, 15, 'Petra']
		]);
	});

	it('holds a timed scene as long as it was held', () => {
		const events = happened([0, { kind: 'begin' }], [4, { kind: 'hold' }], [9, { kind: 'go-on' }]);
		const log = runLog(content, events, begin + 20_000);
		expect(log.entries.flatMap((e) => (e.kind === 'scene' ? [(e.at - begin) / 1000] : []))).toEqual(
			[0, 15]
		);
		expect(log.endedAt).toBeNull();
	});

	it('writes one movement of a slider as one line with the value it came to', () => {
		const set = (value: number): RunCommand => ({
			kind: 'control',
			scene: uuid(2),
			control,
			value
		});
		const events = happened(
			[0, { kind: 'begin' }],
			[12, set(0.8)],
			[12.1, set(0.5)],
			[12.2, set(0.25)],
			[30, set(1)]
		);
		const words = runLog(content, events, begin + 31_000).entries.flatMap((e) =>
			e.kind === 'act' ? [e.words] : []
		);
		expect(words).toEqual(['Halo mass set to 0.25', 'Halo mass set to 1']);
	});

	it('is empty before the show begins', () => {
		expect(runLog(content, [], begin)).toEqual({
			beganAt: null,
			endedAt: null,
			seconds: null,
			entries: []
		});
	});
});

describe('saveLog', () => {
	let db: Database;
	let close: () => Promise<void>;
	let presenter: Context;
	let runId: string;

	beforeAll(async () => {
		({ db, close } = await openDatabase());
		const venue = await makeVenue(db);
		presenter = await contextFor(db, venue, ['presenter']);
		const edition = await makeEdition(db, venue.id);
		const dome = await makeDome(db, venue.id);
		({ runId } = await startRun(presenter, { editionId: edition.id, domeId: dome.id }));
	});
	afterAll(() => close());

	it('keeps head-count and remarks and refuses a head-count that cannot be', async () => {
		await saveLog(presenter, runId, { headCount: '57', remarks: 'Late coach.' });
		await expect(saveLog(presenter, runId, { headCount: '-1', remarks: '' })).rejects.toMatchObject(
			{ code: 'invalid', details: { field: 'headCount' } }
		);
		expect(await readRun(presenter, runId)).toMatchObject({
			headCount: 57,
			remarks: 'Late coach.'
		});
		await saveLog(presenter, runId, { headCount: null, remarks: '' });
		expect(await readRun(presenter, runId)).toMatchObject({ headCount: null });
	});

	it('knows no run of another venue', async () => {
		const stranger = await contextFor(db, await makeVenue(db, 'Other'), ['manager']);
		await expect(saveLog(stranger, runId, { headCount: 1, remarks: '' })).rejects.toMatchObject({
			code: 'not-found'
		});
	});
});
