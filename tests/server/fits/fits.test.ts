import { and, eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { chiSquaredOf, massModel } from '../../../src/lib/dynamics';
import type { FitRecord } from '../../../src/lib/measurements/fitRecord';
import type { Context } from '../../../src/lib/server/context';
import { auditLog, measurements } from '../../../src/lib/server/db/schema';
import { AppError } from '../../../src/lib/server/errors';
import { keepFit, listFits, readFit } from '../../../src/lib/server/fits';
import { createGalaxy, readGalaxy } from '../../../src/lib/server/galaxies';
import { joinVenue, makeVenue, useDatabase } from '../shows/support';

const db = useDatabase();

const rows = [
	{ radius: 2, speed: 120, error: 5 },
	{ radius: 6, speed: 180, error: 4 },
	{ radius: 12, speed: 205, error: 6 },
	{ radius: 18, speed: 90, error: 6, leftOut: 'Beside a companion.' }
];

async function withTable() {
	const ctx = { ...(await makeVenue(db.current)), db: db.current };
	const galaxyId = await createGalaxy(ctx, { name: 'Fitted', shape: 'disc-and-halo' });
	const [table] = await db.current
		.insert(measurements)
		.values({
			venueId: ctx.venueId,
			galaxyId,
			name: 'Speeds',
			source: 'Invented for tests.',
			rows,
			createdBy: ctx.userId
		})
		.returning();
	const { document } = await readGalaxy(ctx, galaxyId);
	return { ctx, galaxyId, tableId: table.id, model: document.model };
}

function recordFor({ tableId, model }: Awaited<ReturnType<typeof withTable>>): FitRecord {
	const halo = model.components.find(({ lit }) => !lit);
	if (!halo) throw new Error('no halo to fit');
	const chiSquared = chiSquaredOf(model, rows.slice(0, 3));
	return {
		version: 1,
		computedBy: 'somebody',
		measurements: { id: tableId, name: 'Speeds', source: 'Invented for tests.' },
		points: { used: 3, leftOut: 1, innermost: 2, outermost: 12 },
		start: model,
		result: model,
		free: [
			{
				componentId: halo.id,
				component: halo.name ?? halo.id,
				parameter: 'density',
				label: 'Density',
				unit: 'Msun/kpc³',
				min: 1,
				max: 1e14,
				value: 8e6,
				error: 2e6,
				atBound: null
			}
		],
		correlation: [[1]],
		chiSquared,
		degreesOfFreedom: 2,
		reducedChiSquared: chiSquared / 2,
		converged: true,
		starts: 12,
		seed: 1,
		undecided: null,
		inside: { lit: 1, unlit: 2, dynamical: massModel(model).dynamicalMass(12) }
	};
}

async function refusal(work: Promise<unknown>): Promise<AppError> {
	const thrown = await work.then(
		() => null,
		(error: unknown) => error
	);
	if (!(thrown instanceof AppError)) throw new Error(`no AppError but ${String(thrown)}`);
	return thrown;
}

describe('kept fits', () => {
	it('are kept as they are, say which version computed them, and leave an audit row', async () => {
		const made = await withTable();
		const record = recordFor(made);
		const id = await keepFit(made.ctx, made.galaxyId, record);
		const fit = await readFit(made.ctx, made.galaxyId, id);
		expect(fit.record).toEqual({ ...record, computedBy: expect.stringMatching(/^\d+\.\d+/) });
		expect(fit.createdByName).toBe(made.ctx.userName);
		expect((await listFits(made.ctx, made.galaxyId)).map((one) => one.id)).toEqual([id]);
		const [row] = await db.current
			.select()
			.from(auditLog)
			.where(and(eq(auditLog.action, 'galaxy.fit.keep'), eq(auditLog.subjectId, made.galaxyId)));
		expect(row.details).toMatchObject({ fit: id });
	});

	it('are refused where the kept points give another χ², left-out points not among them', async () => {
		const made = await withTable();
		const record = recordFor(made);
		const wrong = { ...record, chiSquared: record.chiSquared * 0.9 };
		expect(await refusal(keepFit(made.ctx, made.galaxyId, wrong))).toMatchObject({
			code: 'conflict',
			message: expect.stringMatching(/points have changed since the fit: with 3 points/)
		});
		const all = { ...record, points: { ...record.points, used: 4 } };
		expect((await refusal(keepFit(made.ctx, made.galaxyId, all))).code).toBe('conflict');
		expect(await listFits(made.ctx, made.galaxyId)).toEqual([]);
	});

	it('are refused by the field where the record is not whole, and for a table of another galaxy', async () => {
		const made = await withTable();
		const record = recordFor(made);
		const { seed: _, ...without } = record;
		const issue = await refusal(keepFit(made.ctx, made.galaxyId, without));
		expect(issue).toMatchObject({ code: 'invalid' });
		expect(issue.message).toMatch(/seed/);
		const other = await withTable();
		const stray = { ...record, measurements: { ...record.measurements, id: other.tableId } };
		expect(await refusal(keepFit(made.ctx, made.galaxyId, stray))).toMatchObject({
			code: 'invalid',
			message: expect.stringMatching(/does not belong to the galaxy/)
		});
	});

	it('are kept by producers, read by everybody of the venue and by nobody else', async () => {
		const made = await withTable();
		const id = await keepFit(made.ctx, made.galaxyId, recordFor(made));
		const adviser: Context = {
			...(await joinVenue(db.current, made.ctx, ['adviser'])),
			db: db.current
		};
		expect((await readFit(adviser, made.galaxyId, id)).id).toBe(id);
		const forbidden = await refusal(keepFit(adviser, made.galaxyId, recordFor(made)));
		expect(forbidden.code).toBe('forbidden');
		const stranger = { ...(await makeVenue(db.current)), db: db.current };
		expect((await refusal(readFit(stranger, made.galaxyId, id))).code).toBe('not-found');
		expect((await refusal(listFits(stranger, made.galaxyId))).code).toBe('not-found');
		const another = await withTable();
		expect((await refusal(readFit(another.ctx, another.galaxyId, id))).code).toBe('not-found');
		expect((await refusal(readFit(made.ctx, made.galaxyId, 'seven'))).code).toBe('not-found');
	});
});
