import { eq } from 'drizzle-orm';
import { z } from 'zod';
import { nameSchema, reasonSchema, sourceSchema } from '../../measurements/tableSchema';
import type { MeasuredPoint } from '../../measurements/types';
import { audit, inTransaction, requireRole, type Context } from '../context';
import { measurements } from '../db/schema';
import { AppError } from '../errors';
import { parseOrRefuse } from '../parseOrRefuse';
import { findMeasurements, type TableAddress } from './findMeasurements';
import { galaxyToChange } from './galaxyToChange';

const describeSchema = z.strictObject({ name: nameSchema, source: sourceSchema });

/** Gives a table another name and citation. */
export async function citeMeasurements(
	ctx: Context,
	address: TableAddress,
	input: unknown
): Promise<void> {
	requireRole(ctx, 'galaxy.edit');
	const to = parseOrRefuse(describeSchema, input, 'table');
	await inTransaction(ctx, async (tx) => {
		await galaxyToChange(tx, ctx, address.galaxyId);
		const { name, source } = await findMeasurements(tx, ctx, address, { lock: true });
		if (name === to.name && source === to.source) return;
		await tx.update(measurements).set(to).where(eq(measurements.id, address.id));
		await audit(tx, ctx, {
			action: 'galaxy.measurements.cite',
			subjectKind: 'galaxy',
			subjectId: address.galaxyId,
			details: { table: address.id, from: { name, source }, to }
		});
	});
}

const rowSchema = z.number().int().min(0);

/** Changes one point under the table's lock. */
async function changePoint(
	ctx: Context,
	address: TableAddress,
	row: unknown,
	action: string,
	change: (point: MeasuredPoint) => { point: MeasuredPoint; details: Record<string, unknown> }
): Promise<void> {
	const at = parseOrRefuse(rowSchema, row, 'number of the row');
	await inTransaction(ctx, async (tx) => {
		await galaxyToChange(tx, ctx, address.galaxyId);
		const { rows } = await findMeasurements(tx, ctx, address, { lock: true });
		const before = rows[at];
		if (!before) {
			const message = `The table has ${rows.length} points; there is none with this number.`;
			throw new AppError('invalid', message, { issues: [{ path: 'row', message }] });
		}
		const { point, details } = change(before);
		await tx
			.update(measurements)
			.set({ rows: rows.with(at, point) })
			.where(eq(measurements.id, address.id));
		await audit(tx, ctx, {
			action,
			subjectKind: 'galaxy',
			subjectId: address.galaxyId,
			details: { table: address.id, row: at, radius: before.radius, ...details }
		});
	});
}

/**
 * Leaves a point out of fits and shows, with a reason; it stays in the table.
 * @param row its place in the table, from 0
 */
export async function leavePointOut(
	ctx: Context,
	address: TableAddress,
	{ row, reason }: { row: unknown; reason: unknown }
): Promise<void> {
	requireRole(ctx, 'galaxy.edit');
	const why = parseOrRefuse(reasonSchema, reason, 'reason');
	await changePoint(ctx, address, row, 'galaxy.measurements.leave-out', (point) => {
		if (point.leftOut !== undefined) {
			throw new AppError('conflict', `The point is left out already: ${point.leftOut}`);
		}
		return { point: { ...point, leftOut: why }, details: { reason: why } };
	});
}

/** Lets a point count again. */
export async function putPointBack(
	ctx: Context,
	address: TableAddress,
	row: unknown
): Promise<void> {
	requireRole(ctx, 'galaxy.edit');
	await changePoint(ctx, address, row, 'galaxy.measurements.put-back', (before) => {
		const { leftOut, ...point } = before;
		if (leftOut === undefined) throw new AppError('conflict', 'The point counts already.');
		return { point, details: { reason: leftOut } };
	});
}
