import type { HandleServerError } from '@sveltejs/kit';
import { isDatabaseAway } from '../db/databaseAway';
import { databaseAwayMessage } from '../http/problem';
import { log } from '../log';
import { noteDatabaseAway } from './databaseAway';

/** Logs what nobody expected under the request's id, which the page shows; nothing else leaves. */
export const reportError: HandleServerError = ({ error, event, status, message }) => {
	const id = event.locals.requestId;
	if (status === 404) return { message: 'There is no such page.', id };
	if (isDatabaseAway(error)) {
		noteDatabaseAway(event.locals);
		log.warn({ err: error, requestId: id, route: event.route.id }, 'the database is away');
		return { message: databaseAwayMessage, id, retry: true };
	}
	if (status < 500) return { message, id };
	log.error({ err: error, requestId: id, route: event.route.id }, 'a request failed');
	return {
		message: 'Something went wrong on our side. Nothing was changed that is not shown.',
		id
	};
};
