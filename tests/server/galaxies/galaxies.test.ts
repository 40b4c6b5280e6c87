import { and, eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { roles, type Role } from '../../../src/lib/roles';
import type { Context } from '../../../src/lib/server/context';
import { auditLog, shows } from '../../../src/lib/server/db/schema';
import { AppError } from '../../../src/lib/server/errors';
import {
	archiveGalaxy,
	copyFromShelf,
	copyGalaxy,
	createGalaxy,
	galaxyFilterSchema,
	listGalaxies,
	readGalaxy,
	renameGalaxy,
	restoreGalaxy,
	saveGalaxy,
	shelf,
	startingShapes
} from '../../../src/lib/server/galaxies';
import { addMeasurements, listMeasurements } from '../../../src/lib/server/measurements';
import { galaxyDocumentSchema } from '../../../src/lib/show/galaxy';
import { joinVenue, makeDocument, makeVenue, useDatabase } from '../shows/support';

const db = useDatabase();
const all = galaxyFilterSchema.parse({});
const points = { name: 'Speeds', source: 'Invented for tests.', rows: [] as object[] };
const table = { ...points, rows: [{ radius: 8, speed: 210, error: 5 }] };

/** The coded error a promise fails with. */
async function refusal(work: Promise<unknown>): Promise<AppError> {
	const thrown = await work.then(
		() => null,
		(error: unknown) => error
	);
	if (!(thrown instanceof AppError)) throw new Error(`no AppError but ${String(thrown)}`);
	return thrown;
}

async function withGalaxy(name = 'Test galaxy', given: readonly Role[] = ['producer']) {
	const ctx = await makeVenue(db.current, given);
	const id = await createGalaxy(ctx, { name, shape: 'disc-and-halo' });
	const { document } = await readGalaxy(ctx, id);
	return { ctx, id, document };
}

const inUse = (ctx: Context, galaxyId: string, title: string) => {
	const document = makeDocument(galaxyId, 2, title);
	return db.current.insert(shows).values({
		venueId: ctx.venueId,
		title,
		audience: document.audience,
		lengthSeconds: 60,
		document
	});
};

describe('galaxies', () => {
	it('every starting shape makes a whole document that can be read back', async () => {
		const ctx = await makeVenue(db.current);
		for (const { id: shape, label } of startingShapes) {
			const id = await createGalaxy(ctx, { name: `  ${label} `, shape });
			const galaxy = await readGalaxy(ctx, id);
			expect(galaxyDocumentSchema.parse(galaxy.document)).toEqual(galaxy.document);
			expect(galaxy).toMatchObject({ revision: 1, updatedByName: ctx.userName, usedBy: [] });
			expect(galaxy.document.name).toBe(label);
		}
	});

	it('a name of blanks and an unknown shape are refused at their fields', async () => {
		const ctx = await makeVenue(db.current);
		const blank = await refusal(createGalaxy(ctx, { name: '  ', shape: 'swarm' }));
		expect(blank.details.issues).toEqual([{ path: 'name', message: 'Give the galaxy a name.' }]);
		const odd = await refusal(createGalaxy(ctx, { name: 'A', shape: 'banana' }));
		expect(odd.details.issues).toMatchObject([{ path: 'shape' }]);
		expect(await listGalaxies(ctx, all)).toEqual([]);
	});

	it('the list says speeds, components and use, and is searched and sorted', async () => {
		const { ctx, id } = await withGalaxy('Ash 100%');
		await createGalaxy(ctx, { name: 'birch', shape: 'small-disc' });
		await inUse(ctx, id, 'One show');
		const names = async (filter: Record<string, string>) =>
			(await listGalaxies(ctx, galaxyFilterSchema.parse(filter))).map((row) => row.name);
		expect(await names({})).toEqual(['Ash 100%', 'birch']);
		expect(await names({ sort: 'peak', order: 'up' })).toEqual(['birch', 'Ash 100%']);
		expect(await names({ sort: 'shows' })).toEqual(['Ash 100%', 'birch']);
		expect(await names({ search: '0%' })).toEqual(['Ash 100%']);
		expect(await names({ search: '0_' })).toEqual([]);
		const [row] = await listGalaxies(ctx, all);
		expect(row).toMatchObject({ litCount: 3, unlitCount: 1, usedBy: ['One show'] });
		expect(row.peakSpeed).toBeGreaterThan(180);
		expect(row.peakSpeed).toBeLessThan(280);
		expect(row.outerSpeed).toBeLessThanOrEqual(row.peakSpeed);
	});

	it('a save is taken on its revision only, and a late one gets both versions', async () => {
		const { ctx, id, document } = await withGalaxy();
		const second = await joinVenue(db.current, ctx, ['producer']);
		const mine = { ...document, sources: 'Mine.' };
		const theirs = { ...document, sources: 'Theirs.' };
		expect(await saveGalaxy(second, { id, baseRevision: 1, document: theirs })).toMatchObject({
			revision: 2
		});
		const late = await refusal(saveGalaxy(ctx, { id, baseRevision: 1, document: mine }));
		expect(late.code).toBe('conflict');
		expect(late.details).toMatchObject({ theirs, revision: 2, by: second.userName });
		// The same save again, its answer having been lost.
		const again = await saveGalaxy(second, { id, baseRevision: 1, document: theirs });
		expect(again.revision).toBe(2);
		expect((await readGalaxy(ctx, id)).document).toEqual(theirs);
	});

	it('of two saves at once from one revision, one is taken', async () => {
		const { ctx, id, document } = await withGalaxy();
		const results = await Promise.allSettled(
			['a', 'b'].map((sources) =>
				saveGalaxy(ctx, { id, baseRevision: 1, document: { ...document, sources } })
			)
		);
		expect(results.map((r) => r.status).sort()).toEqual(['fulfilled', 'rejected']);
		expect((await readGalaxy(ctx, id)).revision).toBe(2);
	});

	it.each([
		['out of range', { density: -1, scaleRadius: 18 }, 'density'],
		['not a number', { density: 'much', scaleRadius: 18 }, 'density'],
		['missing', { density: 9e6 }, 'scaleRadius']
	])('a parameter that is %s is refused at its field', async (_, parameters, at) => {
		const { ctx, id, document } = await withGalaxy();
		const components = document.model.components.map((c) =>
			c.id === 'halo' ? { ...c, parameters } : c
		);
		const broken = { ...document, model: { components } };
		const error = await refusal(saveGalaxy(ctx, { id, baseRevision: 1, document: broken }));
		expect(error.code).toBe('invalid');
		expect(error.details.issues).toMatchObject([{ path: `model.components.3.parameters.${at}` }]);
		expect((await readGalaxy(ctx, id)).document).toEqual(document);
	});

	it('unknown fields are refused by name', async () => {
		const { ctx, id, document } = await withGalaxy();
		const odd = { ...document, look: { ...document.look, glitter: 1 } };
		const error = await refusal(saveGalaxy(ctx, { id, baseRevision: 1, document: odd }));
		expect(error.details.issues).toEqual([
			{ path: 'look.glitter', message: 'There is no such field in a galaxy.' }
		]);
	});

	it('archiving names the shows that use it; an archived galaxy takes no save until restored', async () => {
		const { ctx, id, document } = await withGalaxy('Away');
		await inUse(ctx, id, 'Using it');
		expect(await archiveGalaxy(ctx, id)).toMatchObject({
			name: 'Away',
			usedBy: [{ title: 'Using it' }]
		});
		expect(await listGalaxies(ctx, all)).toEqual([]);
		expect(await listGalaxies(ctx, { ...all, state: 'archived' })).toHaveLength(1);
		const save = () =>
			saveGalaxy(ctx, { id, baseRevision: 1, document: { ...document, sources: 'x' } });
		expect((await refusal(save())).code).toBe('precondition');
		expect((await refusal(renameGalaxy(ctx, id, 'New'))).code).toBe('precondition');
		await restoreGalaxy(ctx, id);
		expect((await save()).revision).toBe(2);
	});

	it('a copy has the points too and goes its own way', async () => {
		const { ctx, id, document } = await withGalaxy('First');
		await addMeasurements(ctx, id, table);
		const copy = await copyGalaxy(ctx, { id });
		expect((await readGalaxy(ctx, copy)).document.name).toBe('First (copy)');
		expect(await listMeasurements(ctx, copy)).toMatchObject([{ rows: table.rows }]);
		const kept = await copyGalaxy(ctx, { id, document: { ...document, name: 'Kept' } });
		expect((await readGalaxy(ctx, kept)).document.name).toBe('Kept');
	});

	it('everything on the shelf can be copied with its sources', async () => {
		const ctx = await makeVenue(db.current);
		for (const { id: shelfId, document, approximations } of shelf()) {
			const id = await copyFromShelf(ctx, { shelfId });
			const made = await readGalaxy(ctx, id);
			expect(made.document).toEqual(galaxyDocumentSchema.parse(document));
			for (const line of approximations) expect(made.document.sources).toContain(line);
		}
		expect((await refusal(copyFromShelf(ctx, { shelfId: 'none' }))).code).toBe('not-found');
	});

	it('a rename keeps everything else', async () => {
		const { ctx, id, document } = await withGalaxy('Old');
		expect(await renameGalaxy(ctx, id, ' New ')).toMatchObject({ revision: 2 });
		expect((await readGalaxy(ctx, id)).document).toEqual({ ...document, name: 'New' });
		expect((await refusal(renameGalaxy(ctx, id, ''))).details.issues).toMatchObject([
			{ path: 'name' }
		]);
	});

	it('measured points are checked', async () => {
		const { ctx, id } = await withGalaxy();
		for (const [bad, path] of [
			[points, 'rows'],
			[{ ...table, source: ' ' }, 'source'],
			[{ ...table, rows: [{ radius: 8, speed: 210, error: 0 }] }, 'rows.0.error'],
			[{ ...table, rows: [{ radius: 8, speed: NaN, error: 1 }] }, 'rows.0.speed']
		] as const) {
			expect((await refusal(addMeasurements(ctx, id, bad))).details.issues).toMatchObject([
				{ path }
			]);
		}
		expect(await listMeasurements(ctx, id)).toEqual([]);
	});

	it('another venue finds nothing, and an id that is none is not found', async () => {
		const { id, document } = await withGalaxy();
		const stranger = await makeVenue(db.current);
		const verbs = (galaxy: string) => [
			() => readGalaxy(stranger, galaxy),
			() => saveGalaxy(stranger, { id: galaxy, baseRevision: 1, document }),
			() => renameGalaxy(stranger, galaxy, 'Mine'),
			() => copyGalaxy(stranger, { id: galaxy }),
			() => archiveGalaxy(stranger, galaxy),
			() => restoreGalaxy(stranger, galaxy),
			() => listMeasurements(stranger, galaxy),
			() => addMeasurements(stranger, galaxy, table)
		];
		for (const verb of [...verbs(id), ...verbs('not-an-id')]) {
			expect((await refusal(verb())).code).toBe('not-found');
		}
		expect(await listGalaxies(stranger, all)).toEqual([]);
	});

	it('every role reads; producers and managers edit', async () => {
		const { ctx, id, document } = await withGalaxy();
		for (const role of roles) {
			const member = await joinVenue(db.current, ctx, [role]);
			expect((await readGalaxy(member, id)).id).toBe(id);
			expect(await listGalaxies(member, all)).toHaveLength(1);
			if (role === 'producer' || role === 'manager') continue;
			for (const verb of [
				() => createGalaxy(member, { name: 'A', shape: 'swarm' }),
				() => copyGalaxy(member, { id }),
				() => copyFromShelf(member, { shelfId: shelf()[0].id }),
				() => saveGalaxy(member, { id, baseRevision: 1, document }),
				() => renameGalaxy(member, id, 'B'),
				() => archiveGalaxy(member, id),
				() => restoreGalaxy(member, id),
				() => addMeasurements(member, id, table)
			]) {
				expect((await refusal(verb())).code, role).toBe('forbidden');
			}
		}
		const manager = await joinVenue(db.current, ctx, ['manager']);
		await renameGalaxy(manager, id, 'By the manager');
	});

	it('every change has its audit row', async () => {
		const { ctx, id, document } = await withGalaxy();
		await saveGalaxy(ctx, { id, baseRevision: 1, document: { ...document, sources: 'x' } });
		await renameGalaxy(ctx, id, 'New');
		await addMeasurements(ctx, id, table);
		await archiveGalaxy(ctx, id);
		await restoreGalaxy(ctx, id);
		const rows = await db.current
			.select({ action: auditLog.action })
			.from(auditLog)
			.where(and(eq(auditLog.subjectId, id), eq(auditLog.venueId, ctx.venueId)));
		expect(rows.map((row) => row.action).sort()).toEqual([
			'galaxy.archive',
			'galaxy.create',
			'galaxy.measurements.add',
			'galaxy.rename',
			'galaxy.restore',
			'galaxy.save'
		]);
	});
});
