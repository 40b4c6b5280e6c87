import { redirect } from '@sveltejs/kit';
import { links } from '$lib/links';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = ({ locals }) => {
	if (!locals.person) redirect(303, links.signIn());
	if (locals.ctx) redirect(303, links.home());
	return { email: locals.person.email };
};
