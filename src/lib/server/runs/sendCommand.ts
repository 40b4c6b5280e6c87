import { and, eq } from 'drizzle-orm';
import { z } from 'zod';
import { playbackAt, runCommandSchema } from '../../show/playback';
import { audit, inTransaction, requireRole, type Context } from '../context';
import { runEvents, runs } from '../db/schema';
import { isId } from '../domes/isId';
import { AppError, notFound } from '../errors';
import { runChanged } from './channels';
import { editionOf } from './editionOf';
import { fitCommand } from './fitCommand';
import { allEvents } from './runEvents';

/**
 * A command takes effect this long after it arrives, so that every screen has it before it is due
 * and all change in the same tick. Small against the 100 ms in which a press must be seen.
 */
export const leadMs = 50;

export const sentCommandSchema = z.strictObject({
	command: runCommandSchema,
	/** The sender's own key for this press; sent again with it, the command is applied once. */
	idempotencyKey: z.string().min(8).max(100)
});

export interface CommandAnswer {
	/** False where there was nothing to do, such as a second press on a scene that has gone. */
	applied: boolean;
	/** Number of the event that holds the command; the last of the run where not applied. */
	number: number;
}

/**
 * Puts one command into the run's numbered list. The row of the run is locked, so that commands of
 * any number of consoles and processes stand in one order and the numbers have no gap.
 * @throws AppError invalid, precondition, or not-found also for a run of another venue
 */
export async function sendCommand(
	ctx: Context,
	input: { runId: string; command: unknown; idempotencyKey: unknown }
): Promise<CommandAnswer> {
	requireRole(ctx, 'run.command');
	const { runId, ...body } = input;
	if (!isId(runId)) throw notFound('run');
	const result = sentCommandSchema.safeParse(body);
	if (!result.success) {
		const [issue] = result.error.issues;
		throw new AppError('invalid', `${issue.path.join('.') || 'The command'}: ${issue.message}`);
	}
	const { command, idempotencyKey } = result.data;
	return inTransaction(ctx, async (tx) => {
		const [run] = await tx
			.select()
			.from(runs)
			.where(and(eq(runs.id, runId), eq(runs.venueId, ctx.venueId)))
			.for('update');
		if (!run) throw notFound('run');
		const [twin] = await tx
			.select({ number: runEvents.number })
			.from(runEvents)
			.where(and(eq(runEvents.runId, runId), eq(runEvents.idempotencyKey, idempotencyKey)));
		if (twin) return { applied: true, number: twin.number };
		if (run.endedAt) return { applied: false, number: run.lastEvent };
		const { content } = await editionOf(tx, run.editionId);
		const events = await allEvents(tx, runId);
		const at = Math.max(Date.now() + leadMs, events.at(-1)?.at ?? 0);
		const kept = fitCommand(playbackAt(content, events, at), command);
		if (!kept) return { applied: false, number: run.lastEvent };
		const number = run.lastEvent + 1;
		await tx
			.insert(runEvents)
			.values({ runId, number, at, command: kept, actorId: ctx.userId, idempotencyKey });
		const ends = kept.kind === 'end';
		await tx
			.update(runs)
			.set({ lastEvent: number, ...(ends ? { endedAt: new Date(at) } : {}) })
			.where(eq(runs.id, runId));
		if (ends) await audit(tx, ctx, { action: 'run.end', subjectKind: 'run', subjectId: runId });
		await tx.execute(runChanged(runId));
		return { applied: true, number };
	});
}
