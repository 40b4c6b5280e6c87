import { and, eq, gt, isNull, lt } from 'drizzle-orm';
import { z } from 'zod';
import { audit, inTransaction, queryable, requireRole, type Context } from '../context';
import { database, type Database } from '../db/database';
import { domes, pairings, screens } from '../db/schema';
import { AppError, notFound } from '../errors';
import { hashSecret, makeCode, makeSecret, normalCode } from './pairingCode';
import { countTry, giveBackTry, requireTriesLeft, type TryLimit } from './tries';

export const pairingMinutes = 10;
const wrongTries = 5;
/** Codes one address may ask for in ten minutes: enough for every screen of a large house. */
const requestsPerAddress = 200;

export interface RequestedPairing {
	code: string;
	/** Kept by the browser that asked; it alone can fetch the token. */
	claim: string;
	expiresAt: Date;
}

/** A new code for an unpaired dome page. @param address of the visitor, for the limit */
export async function requestPairing(
	address: string,
	db: Database = database()
): Promise<RequestedPairing> {
	const limit: TryLimit = {
		key: `pairing-request:${address}`,
		points: requestsPerAddress,
		windowSeconds: 600
	};
	await requireTriesLeft(db, limit, 'Too many codes were asked for from this address.');
	await countTry(db, limit);
	const now = new Date();
	const claim = makeSecret();
	const expiresAt = new Date(now.getTime() + pairingMinutes * 60_000);
	await db.delete(pairings).where(and(isNull(pairings.screenId), lt(pairings.expiresAt, now)));
	// Two open pairings never share a code; a clash is drawn again.
	for (let draw = 0; draw < 20; draw++) {
		const [made] = await db
			.insert(pairings)
			.values({ code: makeCode(), claimHash: hashSecret(claim), expiresAt })
			.onConflictDoNothing()
			.returning({ code: pairings.code });
		if (made) return { code: made.code, claim, expiresAt };
	}
	throw new AppError('unavailable', 'No free pairing code was found. Try again in a moment.');
}

export type ClaimAnswer =
	{ status: 'waiting' } | { status: 'expired' } | { status: 'paired'; token: string };

/**
 * What became of a code. Once a technician has typed it, the browser that holds the claim gets a
 * token; asking again replaces the token, so that a lost answer does not lose the screen.
 */
export async function claimPairing(claim: string, db: Database = database()): Promise<ClaimAnswer> {
	return db.transaction(async (tx) => {
		const [pairing] = await tx
			.select()
			.from(pairings)
			.where(eq(pairings.claimHash, hashSecret(claim)))
			.for('update');
		const now = new Date();
		if (!pairing || pairing.expiresAt < now) return { status: 'expired' };
		if (!pairing.screenId) return { status: 'waiting' };
		const token = makeSecret();
		await tx
			.update(screens)
			.set({ tokenHash: hashSecret(token), lastSeenAt: now })
			.where(eq(screens.id, pairing.screenId));
		await tx.update(pairings).set({ claimedAt: now }).where(eq(pairings.id, pairing.id));
		return { status: 'paired', token };
	});
}

const typedSchema = z.object({
	code: z.string().max(40),
	domeId: z.uuid(),
	name: z.string().trim().min(1, 'Give the screen a name.').max(60, 'At most 60 characters.')
});

/**
 * A technician types the code that a dome page shows, and so makes that browser a screen of a dome.
 * @throws AppError too-many after five wrong codes in ten minutes; invalid for a wrong or old code
 */
export async function typePairingCode(
	ctx: Context,
	input: { code: string; domeId: string; name: string }
): Promise<{ screenId: string }> {
	requireRole(ctx, 'screen.pair');
	const result = typedSchema.safeParse(input);
	if (!result.success) throw new AppError('invalid', result.error.issues[0].message);
	const { domeId, name } = result.data;
	const limit: TryLimit = {
		key: `pairing-code:${ctx.userId}`,
		points: wrongTries,
		windowSeconds: pairingMinutes * 60
	};
	const outside = queryable({ db: ctx.db });
	const tooMany = `Five wrong codes in ${pairingMinutes} minutes.`;
	await requireTriesLeft(outside, limit, tooMany);
	// Counted before it is tried, so that codes sent side by side cannot pass together.
	const tries = await countTry(outside, limit);
	if (tries > wrongTries) await requireTriesLeft(outside, limit, tooMany);
	const screenId = await inTransaction(ctx, async (tx) => {
		const [dome] = await tx
			.select({ id: domes.id, archivedAt: domes.archivedAt })
			.from(domes)
			.where(and(eq(domes.id, domeId), eq(domes.venueId, ctx.venueId)));
		if (!dome || dome.archivedAt) throw notFound('dome');
		const [pairing] = await tx
			.select({ id: pairings.id })
			.from(pairings)
			.where(
				and(
					eq(pairings.code, normalCode(result.data.code)),
					isNull(pairings.screenId),
					gt(pairings.expiresAt, new Date())
				)
			)
			.for('update');
		if (!pairing) return null;
		const [screen] = await tx
			.insert(screens)
			.values({ venueId: ctx.venueId, domeId, name, pairedBy: ctx.userId })
			.returning({ id: screens.id });
		await tx.update(pairings).set({ screenId: screen.id }).where(eq(pairings.id, pairing.id));
		await audit(tx, ctx, {
			action: 'screen.pair',
			subjectKind: 'screen',
			subjectId: screen.id,
			details: { domeId, name }
		});
		return screen.id;
	}).catch(async (thrown: unknown) => {
		await giveBackTry(outside, limit);
		throw thrown;
	});
	if (screenId) {
		await giveBackTry(outside, limit);
		return { screenId };
	}
	const left = Math.max(0, wrongTries - tries);
	throw new AppError(
		'invalid',
		`No dome page shows this code now. Codes last ${pairingMinutes} minutes; read it again from the screen. ` +
			`${left} ${left === 1 ? 'try' : 'tries'} left.`,
		{ field: 'code', triesLeft: left }
	);
}
