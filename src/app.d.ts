import type { Context } from '$lib/server/context';

declare global {
	namespace App {
		interface Error {
			message: string;
			/** Given to unexpected failures; everything about them is logged under it. */
			id?: string;
			/** The database was away: the same page may work in a moment. */
			retry?: boolean;
		}
		interface Locals {
			requestId: string;
			/** The signed-in person, with the session's public id. */
			person: { id: string; name: string; email: string; sessionId: string } | null;
			/** Set where the person holds a role in the venue of the session. */
			ctx: Context | null;
			/** Venues the person may switch to. */
			venues: { id: string; name: string }[];
		}
	}
}

export {};
