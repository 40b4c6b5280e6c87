import { measuredPoints } from '$lib/measurements/measuredPoints';
import { listFits } from '$lib/server/fits';
import { readGalaxy } from '$lib/server/galaxies';
import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { contextOf } from '$lib/server/http/contextOf';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params, depends }) => {
	// Named by whoever keeps a fit, so that the list shows it.
	depends('farwheel:fits');
	const ctx = contextOf(locals);
	const [galaxy, fits] = await orError(
		Promise.all([readGalaxy(ctx, params.id), listFits(ctx, params.id)])
	);
	const archived = galaxy.archivedAt !== null;
	return {
		galaxy: {
			id: galaxy.id,
			document: galaxy.document,
			revision: galaxy.revision,
			savedAt: galaxy.updatedAt.toISOString(),
			archived,
			measurements: galaxy.measurements.map((table) => ({
				id: table.id,
				name: table.name,
				source: table.source,
				points: measuredPoints(table)
			})),
			usedBy: galaxy.usedBy
		},
		fits: fits.map(({ id, name, record, createdAt, createdByName }) => ({
			id,
			name,
			record,
			at: createdAt.toISOString(),
			by: createdByName
		})),
		mayEdit: may(ctx.roles, 'galaxy.edit') && !archived,
		mayCopy: may(ctx.roles, 'galaxy.edit'),
		timeZone: ctx.timeZone
	};
};
