import { and, asc, eq, isNull } from 'drizzle-orm';
import { audit, inTransaction, queryable, requireRole, type Context } from '../context';
import { database, type Database } from '../db/database';
import { domes, screens } from '../db/schema';
import { notFound } from '../errors';
import { screenRevoked } from '../runs/channels';
import { isId } from './isId';
import { hashSecret } from './pairingCode';

export type Screen = typeof screens.$inferSelect;

/** A screen says something at least every 15 seconds; three misses and it counts as out of touch. */
export const inTouchSeconds = 45;

export const isInTouch = (screen: Pick<Screen, 'lastSeenAt'>, now = Date.now()): boolean =>
	screen.lastSeenAt !== null && now - screen.lastSeenAt.getTime() <= inTouchSeconds * 1000;

/** Fields of a screen that pages may see: never the token's hash. */
const shown = {
	id: screens.id,
	domeId: screens.domeId,
	name: screens.name,
	pairedAt: screens.pairedAt,
	lastSeenAt: screens.lastSeenAt,
	painter: screens.painter
};
export type ScreenShown = Pick<Screen, keyof typeof shown>;

/** Paired screens of the venue, or of one of its domes. */
export async function listScreens(ctx: Context, domeId?: string): Promise<ScreenShown[]> {
	requireRole(ctx, 'dome.read');
	return queryable(ctx)
		.select(shown)
		.from(screens)
		.where(
			and(
				eq(screens.venueId, ctx.venueId),
				isNull(screens.revokedAt),
				domeId ? eq(screens.domeId, domeId) : undefined
			)
		)
		.orderBy(asc(screens.name), asc(screens.pairedAt));
}

/** Ends a screen's token at once; its page shows a pairing code again. */
export async function revokeScreen(ctx: Context, id: string): Promise<void> {
	requireRole(ctx, 'screen.revoke');
	if (!isId(id)) throw notFound('screen');
	await inTransaction(ctx, async (tx) => {
		const [screen] = await tx
			.update(screens)
			.set({ revokedAt: new Date() })
			.where(and(eq(screens.id, id), eq(screens.venueId, ctx.venueId), isNull(screens.revokedAt)))
			.returning({ id: screens.id, name: screens.name });
		if (!screen) throw notFound('screen');
		await tx.execute(screenRevoked(id));
		await audit(tx, ctx, {
			action: 'screen.revoke',
			subjectKind: 'screen',
			subjectId: id,
			details: { name: screen.name }
		});
	});
}

/** Who a screen's token stands for, with the dome it belongs to; null once it is revoked. */
export async function screenByToken(
	token: string,
	db: Database = database()
): Promise<{ screen: Screen; dome: typeof domes.$inferSelect } | null> {
	const [row] = await db
		.select({ screen: screens, dome: domes })
		.from(screens)
		.innerJoin(domes, eq(domes.id, screens.domeId))
		.where(and(eq(screens.tokenHash, hashSecret(token)), isNull(screens.revokedAt)));
	return row ?? null;
}

/**
 * Notes that a screen is in touch, and the painter it says it uses.
 * @returns false once the screen is revoked
 */
export async function screenSeen(
	id: string,
	painter?: string,
	db: Database = database()
): Promise<boolean> {
	const rows = await db
		.update(screens)
		.set({ lastSeenAt: new Date(), ...(painter ? { painter } : {}) })
		.where(and(eq(screens.id, id), isNull(screens.revokedAt)))
		.returning({ id: screens.id });
	return rows.length > 0;
}
