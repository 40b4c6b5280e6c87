import { contextOf } from '$lib/server/http/contextOf';
import { orError } from '$lib/server/http/problem';
import { listVenueMeasurements, measurementFilterSchema } from '$lib/server/measurements';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	const ctx = contextOf(locals);
	const filter = measurementFilterSchema.parse(Object.fromEntries(url.searchParams));
	return {
		filter,
		tables: await orError(listVenueMeasurements(ctx, filter)),
		timeZone: ctx.timeZone
	};
};
