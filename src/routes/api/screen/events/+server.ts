import { database } from '$lib/server/db/database';
import { screenSeen } from '$lib/server/domes';
import { notPaired } from '$lib/server/domes/notPaired';
import { screenOf } from '$lib/server/domes/screenOf';
import { answering } from '$lib/server/http/problem';
import { openRunOf } from '$lib/server/runs';
import { channels } from '$lib/server/runs/channels';
import { domeOfRun } from '$lib/server/runs/domeOfRun';
import { notices } from '$lib/server/runs/notices';
import { readPosition, runEventStream } from '$lib/server/runs/runEventStream';
import type { RequestHandler } from './$types';

/** Whatever runs in the screen's dome, as server-sent events; see runEventStream. */
export const GET: RequestHandler = (event) =>
	answering(async () => {
		const known = await screenOf(event);
		if (!known) return notPaired();
		const { screen, dome } = known;
		const db = database();
		return runEventStream({
			db,
			notices: notices(),
			from: readPosition(event.request, null),
			followed: {
				run: () => openRunOf(db, dome.id),
				announcesRuns: true,
				concerns: async ({ channel, id }) =>
					channel === channels.screens ? id === screen.id : (await domeOfRun(db, id)) === dome.id,
				stillGood: () => screenSeen(screen.id)
			}
		});
	});
