import { may } from '$lib/server/permissions';
import type { LayoutServerLoad } from './$types';

/** What the frame shows. The guard is in the hooks, not here. */
export const load: LayoutServerLoad = ({ locals: { person, ctx, venues } }) => ({
	person: person && { name: person.name, email: person.email },
	venue: ctx && { id: ctx.venueId, name: ctx.venueName, timeZone: ctx.timeZone },
	venues,
	roles: ctx ? [...ctx.roles] : [],
	mayReadPeople: ctx ? may(ctx.roles, 'people.read') : false
});
