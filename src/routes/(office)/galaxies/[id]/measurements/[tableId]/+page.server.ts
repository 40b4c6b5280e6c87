import { fail } from '@sveltejs/kit';
import { lightComponents } from '$lib/measurements/lightComponents';
import { measuredPoints } from '$lib/measurements/measuredPoints';
import { readGalaxy } from '$lib/server/galaxies';
import { contextOf } from '$lib/server/http/contextOf';
import { orError } from '$lib/server/http/problem';
import { tried } from '$lib/server/http/tried';
import {
	citeMeasurements,
	leavePointOut,
	putPointBack,
	readMeasurementTable,
	useLightCurves
} from '$lib/server/measurements';
import { may } from '$lib/server/permissions';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const ctx = contextOf(locals);
	const address = { galaxyId: params.id, id: params.tableId };
	const [table, galaxy] = await orError(
		Promise.all([readMeasurementTable(ctx, address), readGalaxy(ctx, params.id)])
	);
	const { document } = galaxy;
	return {
		table: { ...table, createdAt: table.createdAt.toISOString() },
		galaxy: {
			id: galaxy.id,
			name: document.name,
			model: document.model,
			outerRadius: document.look.outerRadius
		},
		drawnInShows: galaxy.measurements[0]?.id === table.id,
		light: lightComponents(measuredPoints(table), () => '').map(({ name = '' }) => name),
		mayEdit: may(ctx.roles, 'galaxy.edit') && galaxy.archivedAt === null,
		timeZone: ctx.timeZone
	};
};

/** The number of a row in a form; NaN, which is refused, for what is none. */
const rowIn = (data: FormData) => {
	const text = data.get('row');
	return typeof text === 'string' && /^\d+$/.test(text) ? Number(text) : NaN;
};

export const actions: Actions = {
	cite: async ({ locals, params, request }) => {
		const data = await request.formData();
		const typed = {
			name: String(data.get('name') ?? ''),
			source: String(data.get('source') ?? '')
		};
		const input = { ...typed, source: typed.source.replaceAll('\r\n', '\n') };
		const address = { galaxyId: params.id, id: params.tableId };
		const done = await tried(citeMeasurements(contextOf(locals), address, input));
		return 'refused' in done
			? fail(400, { typed, refused: done.refused.message })
			: { done: 'Name and source are saved.' };
	},
	leaveOut: async ({ locals, params, request }) => {
		const data = await request.formData();
		const point = { row: rowIn(data), reason: data.get('reason') };
		const address = { galaxyId: params.id, id: params.tableId };
		const done = await tried(leavePointOut(contextOf(locals), address, point));
		return 'refused' in done
			? fail(400, { refused: done.refused.message })
			: { done: 'The point is left out. It stays in the table.' };
	},
	putBack: async ({ locals, params, request }) => {
		const row = rowIn(await request.formData());
		const address = { galaxyId: params.id, id: params.tableId };
		const done = await tried(putPointBack(contextOf(locals), address, row));
		return 'refused' in done
			? fail(400, { refused: done.refused.message })
			: { done: 'The point counts again.' };
	},
	useLight: async ({ locals, params, request }) => {
		const replace = (await request.formData()).get('replace') === 'yes';
		const address = { galaxyId: params.id, id: params.tableId };
		const done = await tried(useLightCurves(contextOf(locals), address, { replace }));
		return 'refused' in done
			? fail(400, { refused: done.refused.message })
			: { done: `Added to the galaxy: ${done.value.join('; ')}.` };
	}
};
