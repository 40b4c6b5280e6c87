import { json } from '@sveltejs/kit';
import { sql } from 'drizzle-orm';
import { database } from '$lib/server/db/database';
import { answering } from '$lib/server/http/problem';

/** 200 once the app serves and its database answers; for the start command and for monitors. */
export const GET = () =>
	answering(async () => {
		await database().execute(sql`select 1`);
		return json({ ok: true });
	});
