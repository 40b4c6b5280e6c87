import { and, eq } from 'drizzle-orm';
import { z } from 'zod';
import { audit, inTransaction, requireRole, type Context } from '../context';
import { runs } from '../db/schema';
import { isId } from '../domes/isId';
import { AppError, notFound } from '../errors';

export const runLogSchema = z.object({
	/** Null where nobody counted. */
	headCount: z.coerce
		.number('The head-count must be a whole number.')
		.int('The head-count must be a whole number.')
		.min(0, 'The head-count cannot be below 0.')
		.max(5000, 'The head-count must be at most 5,000.')
		.nullable(),
	remarks: z.string().max(4000, 'At most 4,000 characters.')
});

/** Head-count and remarks, written by whoever ran the show, as often as needed. */
export async function saveLog(
	ctx: Context,
	id: string,
	input: { headCount: unknown; remarks: unknown }
): Promise<void> {
	requireRole(ctx, 'run.log');
	if (!isId(id)) throw notFound('run');
	const result = runLogSchema.safeParse(input);
	if (!result.success) {
		const [issue] = result.error.issues;
		throw new AppError('invalid', issue.message, { field: issue.path.join('.') });
	}
	await inTransaction(ctx, async (tx) => {
		const [run] = await tx
			.update(runs)
			.set(result.data)
			.where(and(eq(runs.id, id), eq(runs.venueId, ctx.venueId)))
			.returning({ id: runs.id });
		if (!run) throw notFound('run');
		await audit(tx, ctx, {
			action: 'run.log',
			subjectKind: 'run',
			subjectId: id,
			details: { headCount: result.data.headCount }
		});
	});
}
