import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { roles, type Role } from '../../../src/lib/roles';
import type { Context } from '../../../src/lib/server/context';
import { auditLog, editions, galaxies, shows } from '../../../src/lib/server/db/schema';
import { AppError } from '../../../src/lib/server/errors';
import {
	archiveShow,
	copyShow,
	createShow,
	freezeEdition,
	listEditions,
	listShows,
	readEdition,
	readShow,
	restoreShow,
	saveShow,
	showFilterSchema
} from '../../../src/lib/server/shows';
import { canonicalJson, sha256Hex } from '../../../src/lib/show/hash';
import { joinVenue, makeDocument, makeGalaxy, makeVenue, useDatabase } from './support';

const db = useDatabase();
const all = showFilterSchema.parse({});

/** The coded error a promise fails with. */
async function refusal(work: Promise<unknown>): Promise<AppError> {
	const thrown = await work.then(
		() => null,
		(error: unknown) => error
	);
	if (!(thrown instanceof AppError)) throw new Error(`no AppError but ${String(thrown)}`);
	return thrown;
}

/** A venue with a galaxy and a saved show of two scenes at revision 2. */
async function withShow(title = 'Test show') {
	const ctx = await makeVenue(db.current);
	const galaxyId = await makeGalaxy(ctx);
	const id = await createShow(ctx, { title });
	const document = makeDocument(galaxyId, 2, title);
	await saveShow(ctx, { id, baseRevision: 1, document });
	return { ctx, galaxyId, id, document };
}

describe('shows', () => {
	it('a new show is empty, listed, and can be read back', async () => {
		const ctx = await makeVenue(db.current);
		const id = await createShow(ctx, { title: '  The first  ' });
		const show = await readShow(ctx, id);
		expect(show).toMatchObject({ revision: 1, updatedByName: ctx.userName, edition: null });
		expect(show.document).toMatchObject({ title: 'The first', scenes: [] });
		const [row] = await listShows(ctx, all);
		expect(row).toMatchObject({ id, title: 'The first', sceneCount: 0, edition: null });
	});

	it('a title of blanks is refused at its field', async () => {
		const ctx = await makeVenue(db.current);
		const error = await refusal(createShow(ctx, { title: '   ' }));
		expect(error.code).toBe('invalid');
		expect(error.details.issues).toEqual([{ path: 'title', message: 'Give the show a title.' }]);
	});

	it('the list is searched, filtered and sorted', async () => {
		const ctx = await makeVenue(db.current);
		const galaxyId = await makeGalaxy(ctx);
		for (const [title, count] of [
			['Ash 100%', 3],
			['birch', 1],
			['Cedar', 2]
		] as const) {
			const id = await createShow(ctx, { title });
			await saveShow(ctx, { id, baseRevision: 1, document: makeDocument(galaxyId, count, title) });
			if (title === 'Cedar') await freezeEdition(ctx, { showId: id });
		}
		const titles = async (filter: Record<string, string>) =>
			(await listShows(ctx, showFilterSchema.parse(filter))).map((row) => row.title);
		expect(await titles({})).toEqual(['Cedar', 'birch', 'Ash 100%']);
		expect(await titles({ sort: 'title' })).toEqual(['Ash 100%', 'birch', 'Cedar']);
		expect(await titles({ sort: 'length', order: 'down' })).toEqual(['Ash 100%', 'Cedar', 'birch']);
		expect(await titles({ search: 'BIR' })).toEqual(['birch']);
		expect(await titles({ search: '%' })).toEqual(['Ash 100%']);
		expect(await titles({ search: '_' })).toEqual([]);
		expect(await titles({ state: 'edition' })).toEqual(['Cedar']);
		expect(await titles({ state: 'draft', sort: 'title' })).toEqual(['Ash 100%', 'birch']);
		expect(await titles({ audience: 'under 5' })).toEqual([]);
		expect(await titles({ sort: 'nonsense', state: 'nonsense' })).toHaveLength(3);
	});

	it('archived shows leave the list, refuse saves and come back whole', async () => {
		const { ctx, id, document } = await withShow();
		await archiveShow(ctx, id);
		expect(await listShows(ctx, all)).toEqual([]);
		expect(await listShows(ctx, showFilterSchema.parse({ state: 'archived' }))).toHaveLength(1);
		const changed = { ...document, summary: 'Changed.' };
		const error = await refusal(saveShow(ctx, { id, baseRevision: 2, document: changed }));
		expect(error.code).toBe('precondition');
		expect((await refusal(freezeEdition(ctx, { showId: id }))).code).toBe('precondition');
		await restoreShow(ctx, id);
		expect((await readShow(ctx, id)).document).toEqual(document);
	});

	it('a copy is a show of its own', async () => {
		const { ctx, id, document } = await withShow();
		const copyId = await copyShow(ctx, { id });
		const copy = await readShow(ctx, copyId);
		expect(copy.document).toEqual({ ...document, title: 'Test show (copy)' });
		await saveShow(ctx, { id: copyId, baseRevision: 1, document: { ...document, summary: 'x' } });
		expect((await readShow(ctx, id)).document).toEqual(document);
		const kept = await copyShow(ctx, { id, document: { ...document, title: 'Mine' } });
		expect((await readShow(ctx, kept)).document.title).toBe('Mine');
	});
});

describe('saveShow', () => {
	it('raises the revision and writes the columns of the list', async () => {
		const { ctx, id, document } = await withShow();
		const saved = await saveShow(ctx, {
			id,
			baseRevision: 2,
			document: { ...document, title: 'New title', audience: 'adults' }
		});
		expect(saved.revision).toBe(3);
		const [row] = await listShows(ctx, all);
		expect(row).toMatchObject({ title: 'New title', audience: 'adults', lengthSeconds: 120 });
	});

	it('a stale save is refused and keeps both versions', async () => {
		const { ctx, id, document } = await withShow();
		const other = await joinVenue(db.current, ctx, ['producer']);
		const theirs = { ...document, summary: 'Theirs.' };
		await saveShow(other, { id, baseRevision: 2, document: theirs });
		const mine = { ...document, summary: 'Mine.' };
		const error = await refusal(saveShow(ctx, { id, baseRevision: 2, document: mine }));
		expect(error.code).toBe('conflict');
		expect(error.details).toMatchObject({ theirs, revision: 3, by: other.userName });
		expect((await readShow(ctx, id)).document).toEqual(theirs);
	});

	it('of many saves from one revision exactly one is taken', async () => {
		const { ctx, id, document } = await withShow();
		const results = await Promise.allSettled(
			Array.from({ length: 8 }, (_, i) =>
				saveShow(ctx, { id, baseRevision: 2, document: { ...document, summary: `Save ${i}` } })
			)
		);
		expect(results.filter((r) => r.status === 'fulfilled')).toHaveLength(1);
		expect((await readShow(ctx, id)).revision).toBe(3);
	});

	it('the same save again after a lost answer is answered as saved', async () => {
		const { ctx, id, document } = await withShow();
		expect(await saveShow(ctx, { id, baseRevision: 1, document })).toMatchObject({ revision: 2 });
	});

	it('refuses unknown fields, numbers out of range and a missing revision by path', async () => {
		const { ctx, id, document } = await withShow();
		const [first, second] = document.scenes;
		const refused = async (change: unknown, baseRevision: unknown = 2) =>
			(await refusal(saveShow(ctx, { id, baseRevision, document: change }))).details.issues;
		expect(await refused({ ...document, scenes: [first, { ...second, extra: 1 }] })).toEqual([
			{ path: 'scenes.1.extra', message: 'There is no such field in a show document.' }
		]);
		expect(
			await refused({ ...document, scenes: [{ ...first, view: { ...first.view, distance: 2 } }] })
		).toMatchObject([{ path: 'scenes.0.view.distance' }]);
		expect(await refused(document, 'two')).toMatchObject([{ path: 'baseRevision' }]);
		expect(await refused(null)).toMatchObject([{ path: '' }]);
		expect((await readShow(ctx, id)).revision).toBe(2);
	});

	it('writes its audit row with the change', async () => {
		const { ctx, id } = await withShow();
		const rows = await db.current.select().from(auditLog).where(eq(auditLog.subjectId, id));
		expect(rows.map((row) => [row.action, row.actorId])).toEqual([
			['show.create', ctx.userId],
			['show.save', ctx.userId]
		]);
	});
});

describe('freezeEdition', () => {
	it('holds the show, its galaxies and their measured points under a hash of all of it', async () => {
		const { ctx, id, document, galaxyId } = await withShow();
		const frozen = await freezeEdition(ctx, { showId: id, note: ' For the opening. ' });
		expect(frozen).toMatchObject({ number: 1, isNew: true });
		const edition = await readEdition(ctx, frozen.id);
		expect(edition.note).toBe('For the opening.');
		expect(edition.content.show).toEqual(document);
		expect(edition.content.galaxies[galaxyId].measured).toHaveLength(1);
		expect(edition.hash).toBe(await sha256Hex(canonicalJson(edition.content)));
		expect(edition.frozenByName).toBe(ctx.userName);
	});

	it('an unchanged show gives the edition it has; a changed galaxy gives a new one', async () => {
		const { ctx, id, galaxyId } = await withShow();
		const first = await freezeEdition(ctx, { showId: id });
		expect(await freezeEdition(ctx, { showId: id })).toEqual({ ...first, isNew: false });
		const [row] = await db.current.select().from(galaxies).where(eq(galaxies.id, galaxyId));
		const document = { ...row.document, sources: 'Other sources.' };
		await db.current.update(galaxies).set({ document }).where(eq(galaxies.id, galaxyId));
		expect(await freezeEdition(ctx, { showId: id })).toMatchObject({ number: 2, isNew: true });
		const before = await readEdition(ctx, first.id);
		expect(before.content.galaxies[galaxyId].document.sources).toBe('Made for tests.');
		expect((await listEditions(ctx, id)).editions.map((e) => e.number)).toEqual([2, 1]);
	});

	it('two freezes at once give one edition', async () => {
		const { ctx, id } = await withShow();
		const both = await Promise.all([1, 2, 3].map(() => freezeEdition(ctx, { showId: id })));
		expect(new Set(both.map((edition) => edition.id)).size).toBe(1);
		expect((await listEditions(ctx, id)).editions).toHaveLength(1);
	});

	it('refuses with a reason for each broken scene', async () => {
		const { ctx, id, document, galaxyId } = await withShow();
		const [first, second] = document.scenes;
		const broken = { ...document, scenes: [first, { ...second, script: '{speed at noon}' }] };
		await saveShow(ctx, { id, baseRevision: 2, document: broken });
		const error = await refusal(freezeEdition(ctx, { showId: id }));
		expect(error.code).toBe('precondition');
		expect(error.details.reasons).toMatchObject([{ sceneId: second.id, sceneNumber: 2 }]);
		await db.current
			.update(galaxies)
			.set({ archivedAt: new Date() })
			.where(eq(galaxies.id, galaxyId));
		const archived = await refusal(freezeEdition(ctx, { showId: id }));
		expect(JSON.stringify(archived.details.reasons)).toContain('“Test wheel” is archived');
	});

	it("refuses a galaxy of another venue as if it weren't there", async () => {
		const { ctx, id, document } = await withShow();
		const elsewhere = await makeGalaxy(await makeVenue(db.current));
		const [first] = document.scenes;
		const scenes = [{ ...first, subject: { kind: 'galaxy' as const, galaxyId: elsewhere } }];
		await saveShow(ctx, { id, baseRevision: 2, document: { ...document, scenes } });
		const error = await refusal(freezeEdition(ctx, { showId: id }));
		expect(JSON.stringify(error.details.reasons)).toContain('not in the library of this venue');
		expect((await readShow(ctx, id)).galaxies).not.toHaveProperty(elsewhere);
	});

	it('refuses to freeze what the person has not seen', async () => {
		const { ctx, id } = await withShow();
		expect((await refusal(freezeEdition(ctx, { showId: id, revision: 1 }))).code).toBe('conflict');
		expect(await freezeEdition(ctx, { showId: id, revision: 2 })).toMatchObject({ number: 1 });
	});

	it('an edition cannot be changed afterwards, not even in the database', async () => {
		const { ctx, id } = await withShow();
		const frozen = await freezeEdition(ctx, { showId: id });
		const change = db.current.update(editions).set({ note: 'x' }).where(eq(editions.id, frozen.id));
		await expect(change).rejects.toThrow();
		expect((await readEdition(ctx, frozen.id)).note).toBe('');
	});

	it('the list says which edition a show has and whether it has changed since', async () => {
		const { ctx, id, document } = await withShow();
		await freezeEdition(ctx, { showId: id });
		expect(await listShows(ctx, all)).toMatchObject([{ edition: 1, changedSince: false }]);
		await saveShow(ctx, { id, baseRevision: 2, document: { ...document, summary: 'x' } });
		expect(await listShows(ctx, all)).toMatchObject([{ edition: 1, changedSince: true }]);
	});
});

describe('who may', () => {
	type Verb = (ctx: Context, ids: { show: string; edition: string }) => Promise<unknown>;
	const verbs: Record<string, { work: Verb; may: Role[] }> = {
		listShows: { work: (ctx) => listShows(ctx, all), may: [...roles] },
		readShow: { work: (ctx, { show }) => readShow(ctx, show), may: [...roles] },
		listEditions: { work: (ctx, { show }) => listEditions(ctx, show), may: [...roles] },
		readEdition: { work: (ctx, { edition }) => readEdition(ctx, edition), may: [...roles] },
		createShow: {
			work: (ctx) => createShow(ctx, { title: 'New' }),
			may: ['producer', 'manager']
		},
		copyShow: {
			work: (ctx, { show }) => copyShow(ctx, { id: show }),
			may: ['producer', 'manager']
		},
		archiveShow: { work: (ctx, { show }) => archiveShow(ctx, show), may: ['producer', 'manager'] },
		restoreShow: { work: (ctx, { show }) => restoreShow(ctx, show), may: ['producer', 'manager'] },
		saveShow: {
			work: async (ctx, { show }) => {
				const [row] = await db.current.select().from(shows).where(eq(shows.id, show));
				return saveShow(ctx, { id: show, baseRevision: row.revision, document: row.document });
			},
			may: ['producer', 'manager']
		},
		freezeEdition: {
			work: (ctx, { show }) => freezeEdition(ctx, { showId: show }),
			may: ['producer', 'manager']
		}
	};

	for (const [name, { work, may }] of Object.entries(verbs)) {
		it(`${name}: ${may.length === roles.length ? 'every role' : may.join(' and ')}; elsewhere not found`, async () => {
			const { ctx, id } = await withShow();
			const { id: edition } = await freezeEdition(ctx, { showId: id });
			const ids = { show: id, edition };
			for (const role of roles) {
				const person = await joinVenue(db.current, ctx, [role]);
				const outcome = await work(person, ids).then(
					() => 'done',
					(error: unknown) => (error instanceof AppError ? error.code : String(error))
				);
				expect(`${role}: ${outcome}`).toBe(`${role}: ${may.includes(role) ? 'done' : 'forbidden'}`);
			}
			if (name === 'listShows') {
				expect(await work(await makeVenue(db.current), ids)).toEqual([]);
				return;
			}
			if (name === 'createShow') return;
			const stranger = await makeVenue(db.current, ['manager']);
			expect((await refusal(work(stranger, ids))).code).toBe('not-found');
			const odd = { show: 'not-an-id', edition: 'not-an-id' };
			if (name !== 'saveShow') expect((await refusal(work(ctx, odd))).code).toBe('not-found');
		});
	}
});
