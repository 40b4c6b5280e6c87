import { and, eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { readMeasurements } from '../../../src/lib/measurements/readMeasurements';
import type { MeasurementsInput } from '../../../src/lib/measurements/types';
import { roles } from '../../../src/lib/roles';
import type { Context } from '../../../src/lib/server/context';
import { auditLog } from '../../../src/lib/server/db/schema';
import { AppError } from '../../../src/lib/server/errors';
import { archiveGalaxy, createGalaxy } from '../../../src/lib/server/galaxies';
import {
	addMeasurements,
	citeMeasurements,
	exportMeasurements,
	leavePointOut,
	listMeasurements,
	listVenueMeasurements,
	measurementFilterSchema,
	putPointBack,
	readMeasurementTable
} from '../../../src/lib/server/measurements';
import { joinVenue, makeVenue, useDatabase } from '../shows/support';

const db = useDatabase();
const all = measurementFilterSchema.parse({});
const table: MeasurementsInput = {
	name: 'Wheel, radio',
	source: 'Invented for tests.',
	radiusUnit: 'arcsec',
	speedUnit: 'm/s',
	distance: { value: 9.5, error: 0.5 },
	inclination: { value: 61, error: null },
	rows: [
		{ radius: 10, speed: 100_000, error: 5_000, gas: -3_000 },
		{ radius: 20, speed: 120_000, error: 5_000 },
		{ radius: 30, speed: 121_000, error: 4_000, leftOut: 'Warp' }
	]
};

async function refusal(work: Promise<unknown>): Promise<AppError> {
	const thrown = await work.then(
		() => null,
		(error: unknown) => error
	);
	if (!(thrown instanceof AppError)) throw new Error(`no AppError but ${String(thrown)}`);
	return thrown;
}

async function withTable() {
	const ctx = await makeVenue(db.current);
	const galaxyId = await createGalaxy(ctx, { name: 'Test galaxy', shape: 'disc-and-halo' });
	const id = await addMeasurements(ctx, galaxyId, table);
	return { ctx, galaxyId, address: { galaxyId, id } };
}
const rowsOf = async (ctx: Context, address: { galaxyId: string; id: string }) =>
	(await readMeasurementTable(ctx, address)).rows;

describe('measurements', () => {
	it('are kept as they came, and exported so that reading gives them back', async () => {
		const { ctx, galaxyId, address } = await withTable();
		expect(await listMeasurements(ctx, galaxyId)).toEqual([{ ...table, id: address.id }]);
		expect(await readMeasurementTable(ctx, address)).toMatchObject({
			...table,
			createdByName: ctx.userName
		});
		const { fileName, csv } = await exportMeasurements(ctx, address);
		expect(fileName).toBe('Wheel-radio.csv');
		const read = readMeasurements(csv);
		expect(read).toMatchObject({
			problem: null,
			name: table.name,
			source: table.source,
			distance: table.distance,
			inclination: table.inclination
		});
		expect(read.rows).toEqual(table.rows);
	});

	it('are refused at the field that is wrong', async () => {
		const { ctx, galaxyId } = await withTable();
		for (const [bad, path] of [
			[{ ...table, name: '' }, 'name'],
			[{ ...table, source: ' ' }, 'source'],
			[{ ...table, source: 'a\u0000b' }, 'source'],
			[{ ...table, distance: null }, 'distance'],
			[{ ...table, distance: { value: -1, error: null } }, 'distance.value'],
			[{ ...table, inclination: { value: 91, error: null } }, 'inclination.value'],
			[{ ...table, radiusUnit: 'furlong' }, 'radiusUnit'],
			[{ ...table, rows: [] }, 'rows'],
			[{ ...table, rows: [{ radius: 1, speed: 3e6, error: 1 }] }, 'rows.0.speed'],
			[{ ...table, rows: [{ radius: 1, speed: 1, error: 0 }] }, 'rows.0.error'],
			[{ ...table, rows: [{ radius: 1, speed: 1, error: 1, leftOut: '' }] }, 'rows.0.leftOut'],
			[{ ...table, rows: [{ radius: 1, speed: 1, error: 1, mass: 1 }] }, 'rows.0.mass']
		] as const) {
			const { code, details } = await refusal(addMeasurements(ctx, galaxyId, bad));
			expect(code).toBe('invalid');
			expect(details.issues).toMatchObject([{ path }]);
		}
		expect(await listMeasurements(ctx, galaxyId)).toHaveLength(1);
	});

	it('a point is left out with a reason and put back; the others stay as they are', async () => {
		const { ctx, address } = await withTable();
		await leavePointOut(ctx, address, { row: 0, reason: ' Beam smearing ' });
		expect(await rowsOf(ctx, address)).toEqual([
			{ ...table.rows[0], leftOut: 'Beam smearing' },
			...table.rows.slice(1)
		]);
		expect((await refusal(leavePointOut(ctx, address, { row: 0, reason: 'x' }))).code).toBe(
			'conflict'
		);
		await putPointBack(ctx, address, 0);
		expect(await rowsOf(ctx, address)).toEqual(table.rows);
		expect((await refusal(putPointBack(ctx, address, 0))).code).toBe('conflict');
		for (const bad of [
			() => leavePointOut(ctx, address, { row: 0, reason: ' ' }),
			() => leavePointOut(ctx, address, { row: 3, reason: 'x' }),
			() => leavePointOut(ctx, address, { row: -1, reason: 'x' }),
			() => leavePointOut(ctx, address, { row: 'one', reason: 'x' }),
			() => putPointBack(ctx, address, 0.5)
		]) {
			expect((await refusal(bad())).code).toBe('invalid');
		}
		expect(await rowsOf(ctx, address)).toEqual(table.rows);
	});

	it('two people who leave out two points at once both are heard', async () => {
		const { ctx, address } = await withTable();
		await Promise.all([
			leavePointOut(ctx, address, { row: 0, reason: 'First' }),
			leavePointOut(ctx, address, { row: 1, reason: 'Second' })
		]);
		const rows = await rowsOf(ctx, address);
		expect(rows.map(({ leftOut }) => leftOut)).toEqual(['First', 'Second', 'Warp']);
	});

	it('the venue’s list has source, galaxy, rows, who and when, and finds by words', async () => {
		const { ctx, galaxyId, address } = await withTable();
		const second = await addMeasurements(ctx, galaxyId, { ...table, name: 'Älter 100%' });
		const [newest, first] = await listVenueMeasurements(ctx, all);
		expect(newest.id).toBe(second);
		expect(first).toMatchObject({
			id: address.id,
			name: table.name,
			source: table.source,
			galaxyId,
			galaxyName: 'Test galaxy',
			rows: 3,
			leftOut: 1,
			createdByName: ctx.userName
		});
		const named = (search: string) =>
			listVenueMeasurements(ctx, { ...all, search }).then((rows) => rows.length);
		expect(await Promise.all(['radio', '100%', 'test gal', 'nowhere'].map(named))).toEqual([
			1, 1, 2, 0
		]);
		const byName = await listVenueMeasurements(ctx, { ...all, sort: 'name', order: 'up' });
		expect(byName).toHaveLength(2);
		expect(measurementFilterSchema.parse({ sort: 'odd', order: 'sideways' })).toEqual(all);
	});

	it('name and citation change together and are never empty', async () => {
		const { ctx, address } = await withTable();
		await citeMeasurements(ctx, address, { name: 'New', source: 'A paper.\nIts table 2.' });
		expect(await readMeasurementTable(ctx, address)).toMatchObject({
			name: 'New',
			source: 'A paper.\nIts table 2.',
			rows: table.rows
		});
		const { details } = await refusal(citeMeasurements(ctx, address, { name: 'New', source: '' }));
		expect(details.issues).toMatchObject([{ path: 'source' }]);
	});

	it('nothing of an archived galaxy changes, and all of it can still be read', async () => {
		const { ctx, galaxyId, address } = await withTable();
		await archiveGalaxy(ctx, galaxyId);
		for (const verb of [
			() => addMeasurements(ctx, galaxyId, table),
			() => citeMeasurements(ctx, address, { name: 'a', source: 'b' }),
			() => leavePointOut(ctx, address, { row: 0, reason: 'x' }),
			() => putPointBack(ctx, address, 2)
		]) {
			expect((await refusal(verb())).code).toBe('precondition');
		}
		expect(await rowsOf(ctx, address)).toEqual(table.rows);
		expect(await listVenueMeasurements(ctx, all)).toHaveLength(1);
	});

	it('another venue, another galaxy and what is no id find nothing', async () => {
		const { ctx, galaxyId, address } = await withTable();
		const stranger = await makeVenue(db.current);
		const other = await createGalaxy(ctx, { name: 'Other', shape: 'swarm' });
		const verbs = (who: Context, at: { galaxyId: string; id: string }) => [
			() => readMeasurementTable(who, at),
			() => exportMeasurements(who, at),
			() => citeMeasurements(who, at, { name: 'a', source: 'b' }),
			() => leavePointOut(who, at, { row: 0, reason: 'x' }),
			() => putPointBack(who, at, 2)
		];
		for (const verb of [
			...verbs(stranger, address),
			...verbs(ctx, { galaxyId: other, id: address.id }),
			...verbs(ctx, { galaxyId, id: 'no-id' }),
			() => listMeasurements(stranger, galaxyId),
			() => addMeasurements(stranger, galaxyId, table)
		]) {
			expect((await refusal(verb())).code).toBe('not-found');
		}
		expect(await listVenueMeasurements(stranger, all)).toEqual([]);
	});

	it('every role reads and exports; producers and managers change', async () => {
		const { ctx, galaxyId, address } = await withTable();
		for (const role of roles) {
			const member = await joinVenue(db.current, ctx, [role]);
			expect((await exportMeasurements(member, address)).csv).toContain('Invented');
			expect(await listVenueMeasurements(member, all)).toHaveLength(1);
			if (role === 'producer' || role === 'manager') continue;
			for (const verb of [
				() => addMeasurements(member, galaxyId, table),
				() => citeMeasurements(member, address, { name: 'a', source: 'b' }),
				() => leavePointOut(member, address, { row: 0, reason: 'x' }),
				() => putPointBack(member, address, 2)
			]) {
				expect((await refusal(verb())).code, role).toBe('forbidden');
			}
		}
	});

	it('every change has its audit row, with what was and what is', async () => {
		const { ctx, galaxyId, address } = await withTable();
		await citeMeasurements(ctx, address, { name: 'New', source: 'Paper.' });
		await leavePointOut(ctx, address, { row: 1, reason: 'Warp' });
		await putPointBack(ctx, address, 1);
		const rows = await db.current
			.select({ action: auditLog.action, details: auditLog.details })
			.from(auditLog)
			.where(and(eq(auditLog.subjectId, galaxyId), eq(auditLog.venueId, ctx.venueId)));
		const of = (action: string) => rows.find((row) => row.action === action)?.details;
		expect(of('galaxy.measurements.add')).toMatchObject({ table: address.id, points: 3 });
		expect(of('galaxy.measurements.cite')).toMatchObject({
			from: { name: table.name },
			to: { name: 'New', source: 'Paper.' }
		});
		expect(of('galaxy.measurements.leave-out')).toMatchObject({ row: 1, reason: 'Warp' });
		expect(of('galaxy.measurements.put-back')).toMatchObject({ row: 1, reason: 'Warp' });
	});
});
