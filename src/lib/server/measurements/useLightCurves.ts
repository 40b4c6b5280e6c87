import { lightComponents } from '../../measurements/lightComponents';
import { measuredPoints } from '../../measurements/measuredPoints';
import { newId } from '../../show/editing';
import { audit, inTransaction, requireRole, type Context } from '../context';
import { AppError } from '../errors';
import { findGalaxy } from '../galaxies/findGalaxy';
import { saveGalaxy } from '../galaxies/saveGalaxy';
import { findMeasurements, type TableAddress } from './findMeasurements';

/**
 * Gives a galaxy the measured pull of gas, disc and bulge from a table, as tabulated components.
 * @param replace takes the galaxy's other lit components out, or the same light counts twice
 * @returns names of the components that were added
 * @throws AppError precondition where the table has none of these columns, or the galaxy is archived
 */
export async function useLightCurves(
	ctx: Context,
	address: TableAddress,
	{ replace }: { replace: boolean }
): Promise<string[]> {
	requireRole(ctx, 'galaxy.edit');
	return inTransaction(ctx, async (tx, inside) => {
		const galaxy = await findGalaxy(tx, ctx, address.galaxyId, { lock: true });
		const table = await findMeasurements(tx, ctx, address);
		const added = lightComponents(measuredPoints(table), newId);
		if (added.length === 0) {
			throw new AppError(
				'precondition',
				'The table has no gas, disc or bulge speeds at two radii or more, so nothing was added.'
			);
		}
		const { document } = galaxy;
		const kept = document.model.components.filter((component) => !replace || !component.lit);
		const sources = document.sources.includes(table.source)
			? document.sources
			: `${document.sources.trimEnd()}\n${table.source}`.trim();
		await saveGalaxy(inside, {
			id: galaxy.id,
			baseRevision: galaxy.revision,
			document: {
				...document,
				model: { ...document.model, components: [...added, ...kept] },
				sources: sources.length <= 4000 ? sources : document.sources
			}
		});
		await audit(tx, ctx, {
			action: 'galaxy.measurements.use-light',
			subjectKind: 'galaxy',
			subjectId: galaxy.id,
			details: { table: table.id, replace, components: added.map(({ name }) => name) }
		});
		return added.map(({ name = '' }) => name);
	});
}
