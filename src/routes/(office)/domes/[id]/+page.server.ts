import { fail, redirect } from '@sveltejs/kit';
import { links } from '$lib/links';
import {
	archiveDome,
	filmSizes,
	isInTouch,
	listScreens,
	readDome,
	revokeScreen,
	typePairingCode,
	updateDome
} from '$lib/server/domes';
import { fieldsOrError } from '$lib/server/http/fieldsOrError';
import { orError } from '$lib/server/http/problem';
import { may } from '$lib/server/permissions';
import { contextOf } from '$lib/server/http/contextOf';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, params }) => {
	const ctx = contextOf(locals);
	const dome = await orError(readDome(ctx, params.id));
	const screens = await orError(listScreens(ctx, dome.id));
	const { id, name, diameterMetres, seats, apertureDegrees, tiltDegrees, filmSize, painter } = dome;
	return {
		dome: {
			...{ id, name, diameterMetres, seats, apertureDegrees, tiltDegrees, filmSize, painter },
			archived: dome.archivedAt !== null
		},
		screens: screens.map((screen) => ({ ...screen, inTouch: isInTouch(screen) })),
		filmSizes,
		timeZone: ctx.timeZone,
		mayEdit: may(ctx.roles, 'dome.edit') && dome.archivedAt === null,
		mayRestore: may(ctx.roles, 'dome.edit'),
		mayPair: may(ctx.roles, 'screen.pair') && dome.archivedAt === null
	};
};

export const actions: Actions = {
	save: async ({ locals, params, request }) => {
		const settings = Object.fromEntries(await request.formData()) as Record<string, string>;
		const { problems } = await fieldsOrError(updateDome(contextOf(locals), params.id, settings));
		if (problems) return fail(400, { settings, problems });
		return { saved: true };
	},
	pair: async ({ locals, params, request }) => {
		const form = await request.formData();
		const typed = { code: String(form.get('code') ?? ''), name: String(form.get('name') ?? '') };
		const { problems } = await fieldsOrError(
			typePairingCode(contextOf(locals), { domeId: params.id, ...typed })
		);
		if (problems) return fail(400, { typed, pairing: Object.values(problems)[0] });
		return { paired: typed.name };
	},
	revoke: async ({ locals, request }) => {
		const id = String((await request.formData()).get('screen') ?? '');
		await orError(revokeScreen(contextOf(locals), id));
		return { revoked: true };
	},
	archive: async ({ locals, params }) => {
		const { problems } = await fieldsOrError(archiveDome(contextOf(locals), params.id));
		if (problems) return fail(409, { archiving: problems.form });
		redirect(303, links.domes());
	},
	restore: async ({ locals, params }) => {
		await orError(archiveDome(contextOf(locals), params.id, false));
		return { restored: true };
	}
};
