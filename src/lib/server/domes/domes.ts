import { and, asc, eq, isNotNull, isNull, sql } from 'drizzle-orm';
import { audit, inTransaction, queryable, requireRole, type Context } from '../context';
import { domes, runs, screens } from '../db/schema';
import { AppError, notFound } from '../errors';
import { screenRevoked } from '../runs/channels';
import { isId } from './isId';
import { domeSettingsSchema, type DomeSettings } from './domeSettings';

export type Dome = typeof domes.$inferSelect;

export interface DomeListed extends Dome {
	/** Screens that are paired and not revoked. */
	screenCount: number;
	/** The run that is open in it. */
	openRunId: string | null;
}

/** Domes of the venue by name; archived ones only where asked for. */
export async function listDomes(
	ctx: Context,
	{ archived = false }: { archived?: boolean } = {}
): Promise<DomeListed[]> {
	requireRole(ctx, 'dome.read');
	const rows = await queryable(ctx)
		.select({
			dome: domes,
			screenCount: sql<number>`(select count(*)::int from ${screens} where ${screens.domeId} = ${domes.id} and ${screens.revokedAt} is null)`,
			openRunId: sql<
				string | null
			>`(select ${runs.id} from ${runs} where ${runs.domeId} = ${domes.id} and ${runs.endedAt} is null)`
		})
		.from(domes)
		.where(
			and(
				eq(domes.venueId, ctx.venueId),
				archived ? isNotNull(domes.archivedAt) : isNull(domes.archivedAt)
			)
		)
		.orderBy(asc(domes.name), asc(domes.id));
	return rows.map(({ dome, ...rest }) => ({ ...dome, ...rest }));
}

/** @throws AppError not-found also for a dome of another venue */
export async function readDome(ctx: Context, id: string): Promise<Dome> {
	requireRole(ctx, 'dome.read');
	if (!isId(id)) throw notFound('dome');
	const [dome] = await queryable(ctx)
		.select()
		.from(domes)
		.where(and(eq(domes.id, id), eq(domes.venueId, ctx.venueId)));
	if (!dome) throw notFound('dome');
	return dome;
}

/** @throws AppError invalid with one message a field */
function parsed(input: unknown): DomeSettings {
	const result = domeSettingsSchema.safeParse(input);
	if (result.success) return result.data;
	const fields = Object.fromEntries(
		result.error.issues.map((issue) => [issue.path.join('.'), issue.message])
	);
	throw new AppError('invalid', result.error.issues[0].message, { fields });
}

export async function createDome(ctx: Context, input: unknown): Promise<Dome> {
	requireRole(ctx, 'dome.edit');
	const settings = parsed(input);
	return inTransaction(ctx, async (tx) => {
		const [dome] = await tx
			.insert(domes)
			.values({ ...settings, venueId: ctx.venueId })
			.returning();
		await audit(tx, ctx, {
			action: 'dome.create',
			subjectKind: 'dome',
			subjectId: dome.id,
			details: { name: dome.name }
		});
		return dome;
	});
}

export async function updateDome(ctx: Context, id: string, input: unknown): Promise<Dome> {
	requireRole(ctx, 'dome.edit');
	if (!isId(id)) throw notFound('dome');
	const settings = parsed(input);
	return inTransaction(ctx, async (tx) => {
		const [dome] = await tx
			.update(domes)
			.set({ ...settings, updatedAt: new Date() })
			.where(and(eq(domes.id, id), eq(domes.venueId, ctx.venueId)))
			.returning();
		if (!dome) throw notFound('dome');
		await audit(tx, ctx, {
			action: 'dome.edit',
			subjectKind: 'dome',
			subjectId: id,
			details: { ...settings }
		});
		return dome;
	});
}

/** Archives a dome and revokes its screens, or brings it back without them. */
export async function archiveDome(ctx: Context, id: string, archived = true): Promise<void> {
	requireRole(ctx, 'dome.edit');
	if (!isId(id)) throw notFound('dome');
	await inTransaction(ctx, async (tx) => {
		const [dome] = await tx
			.select({ id: domes.id })
			.from(domes)
			.where(and(eq(domes.id, id), eq(domes.venueId, ctx.venueId)))
			.for('update');
		if (!dome) throw notFound('dome');
		if (archived) {
			const [open] = await tx
				.select({ id: runs.id })
				.from(runs)
				.where(and(eq(runs.domeId, id), isNull(runs.endedAt)));
			if (open) {
				throw new AppError(
					'conflict',
					'A run is open in this dome. End it, then archive the dome.'
				);
			}
			const revoked = await tx
				.update(screens)
				.set({ revokedAt: new Date() })
				.where(and(eq(screens.domeId, id), isNull(screens.revokedAt)))
				.returning({ id: screens.id });
			for (const screen of revoked) await tx.execute(screenRevoked(screen.id));
		}
		await tx
			.update(domes)
			.set({ archivedAt: archived ? new Date() : null })
			.where(eq(domes.id, id));
		await audit(tx, ctx, {
			action: archived ? 'dome.archive' : 'dome.restore',
			subjectKind: 'dome',
			subjectId: id
		});
	});
}
