import { contextOf } from '$lib/server/http/contextOf';
import { answering } from '$lib/server/http/problem';
import { exportMeasurements } from '$lib/server/measurements';
import type { RequestHandler } from './$types';

/** The table as a CSV file. */
export const GET: RequestHandler = ({ locals, params }) =>
	answering(async () => {
		const address = { galaxyId: params.id, id: params.tableId };
		const { fileName, csv } = await exportMeasurements(contextOf(locals), address);
		return new Response(csv, {
			headers: {
				'content-type': 'text/csv; charset=utf-8',
				'content-disposition': `attachment; filename="${fileName}"`,
				'cache-control': 'no-store'
			}
		});
	});
