import { measuredPoints } from '$lib/measurements/measuredPoints';
import { readFit } from '$lib/server/fits';
import { readGalaxy } from '$lib/server/galaxies';
import { contextOf } from '$lib/server/http/contextOf';
import { orError } from '$lib/server/http/problem';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const ctx = contextOf(locals);
	const [fit, galaxy] = await orError(
		Promise.all([readFit(ctx, params.id, params.fitId), readGalaxy(ctx, params.id)])
	);
	const table = galaxy.measurements.find(({ id }) => id === fit.record.measurements.id);
	return {
		galaxy: { id: galaxy.id, name: galaxy.document.name },
		fit: { ...fit, createdAt: fit.createdAt.toISOString() },
		points: table ? measuredPoints(table) : [],
		venueName: ctx.venueName,
		timeZone: ctx.timeZone
	};
};
