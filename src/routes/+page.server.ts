import { redirect } from '@sveltejs/kit';
import { links } from '$lib/links';
import type { PageServerLoad } from './$types';

/** The front door: straight to the work of whoever comes in. */
export const load: PageServerLoad = ({ locals }) => {
	if (!locals.person) redirect(303, links.signIn());
	if (!locals.ctx) redirect(303, links.noVenue());
	const presentsOnly = locals.ctx.roles.every((role) => role === 'presenter');
	redirect(303, presentsOnly ? links.runs() : links.shows());
};
