import type { Role } from '../roles';
import { auditLog } from './db/schema';
import { database, type Database, type Queryable } from './db/database';
import { AppError } from './errors';
import { may, type Permission } from './permissions';

/** Who acts, where, and under which request. Verbs take this and nothing of HTTP. */
export interface Context {
	userId: string;
	userName: string;
	venueId: string;
	venueName: string;
	/** IANA name of the venue's time zone. */
	timeZone: string;
	roles: readonly Role[];
	requestId: string;
	/** A transaction to join; without it a verb opens its own. */
	tx?: Queryable;
	/** The database of tests; the app's own where missing. */
	db?: Database;
}

/** @throws AppError forbidden, in words that say which roles may */
export function requireRole(ctx: Context, verb: Permission): void {
	if (may(ctx.roles, verb)) return;
	throw new AppError(
		'forbidden',
		'Your roles in this venue do not allow this. Ask a manager of the venue.'
	);
}

/** The transaction of the context, or the database. For reads. */
export const queryable = (ctx: Pick<Context, 'tx' | 'db'>): Queryable =>
	ctx.tx ?? ctx.db ?? database();

/** Runs `work` in the context's transaction, or in one of its own. */
export async function inTransaction<C extends Pick<Context, 'tx' | 'db'>, T>(
	ctx: C,
	work: (tx: Queryable, ctx: C) => Promise<T>
): Promise<T> {
	if (ctx.tx) return work(ctx.tx, ctx);
	return (ctx.db ?? database()).transaction((tx) => work(tx, { ...ctx, tx }));
}

export interface AuditEntry {
	/** Such as "show.create". */
	action: string;
	subjectKind: string;
	subjectId?: string | null;
	details?: Record<string, unknown>;
}

/** Writes the audit row in the transaction of the change; if this fails, so does the change. */
export async function audit(
	tx: Queryable,
	who: { userId: string | null; venueId: string | null; requestId: string },
	entry: AuditEntry
): Promise<void> {
	await tx.insert(auditLog).values({
		actorId: who.userId,
		venueId: who.venueId,
		requestId: who.requestId,
		action: entry.action,
		subjectKind: entry.subjectKind,
		subjectId: entry.subjectId ?? null,
		details: entry.details ?? {}
	});
}
