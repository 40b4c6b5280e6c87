import type { GalaxyDocument } from '../../show/galaxy';
import { audit, inTransaction, requireRole, type Context } from '../context';
import type { Queryable } from '../db/database';
import { galaxies, measurements } from '../db/schema';
import { AppError } from '../errors';
import { findGalaxy } from './findGalaxy';
import { measurementsOf } from '../measurements/measurementsOf';
import { parseGalaxy } from './parseGalaxy';
import { readShelf } from './shelf';
import { startingShapes } from './startingShapes';

async function insertGalaxy(
	tx: Queryable,
	ctx: Context,
	document: GalaxyDocument,
	action: string,
	details: Record<string, unknown>
): Promise<string> {
	const [galaxy] = await tx
		.insert(galaxies)
		.values({ venueId: ctx.venueId, name: document.name, document, updatedBy: ctx.userId })
		.returning({ id: galaxies.id });
	await audit(tx, ctx, {
		action,
		subjectKind: 'galaxy',
		subjectId: galaxy.id,
		details: { name: document.name, ...details }
	});
	return galaxy.id;
}

/** A galaxy from one of the starting shapes. @returns its id */
export async function createGalaxy(
	ctx: Context,
	{ name, shape }: { name: string; shape: string }
): Promise<string> {
	requireRole(ctx, 'galaxy.edit');
	const from = startingShapes.find((one) => one.id === shape);
	if (!from) {
		const message = `Choose a shape to begin with: ${startingShapes.map((s) => s.label).join(', ')}.`;
		throw new AppError('invalid', message, { issues: [{ path: 'shape', message }] });
	}
	const document = parseGalaxy(from.make(name.trim()));
	return inTransaction(ctx, (tx) => insertGalaxy(tx, ctx, document, 'galaxy.create', { shape }));
}

/**
 * A galaxy of its own from another, with the other's measured points. @returns its id
 * @param document what the copy holds where it is not what is stored: a version kept from a conflict
 */
export async function copyGalaxy(
	ctx: Context,
	{ id, document }: { id: string; document?: unknown }
): Promise<string> {
	requireRole(ctx, 'galaxy.edit');
	const given = document === undefined ? undefined : parseGalaxy(document);
	return inTransaction(ctx, async (tx) => {
		const from = await findGalaxy(tx, ctx, id);
		const copy = given ?? { ...from.document, name: `${from.name.slice(0, 113)} (copy)` };
		const made = await insertGalaxy(tx, ctx, copy, 'galaxy.copy', { from: id });
		for (const { id: _, rows, ...table } of await measurementsOf(tx, id)) {
			await tx.insert(measurements).values({
				...table,
				rows: [...rows],
				venueId: ctx.venueId,
				galaxyId: made,
				createdBy: ctx.userId
			});
		}
		return made;
	});
}

/**
 * A galaxy of the venue's own from the reference shelf. @returns its id
 * @param document what was tried on the shelf's page; the shelf's own where missing
 */
export async function copyFromShelf(
	ctx: Context,
	{ shelfId, document }: { shelfId: string; document?: unknown }
): Promise<string> {
	requireRole(ctx, 'galaxy.edit');
	const copy = parseGalaxy(document ?? readShelf(shelfId).document);
	return inTransaction(ctx, (tx) =>
		insertGalaxy(tx, ctx, copy, 'galaxy.copy', { shelf: readShelf(shelfId).id })
	);
}
