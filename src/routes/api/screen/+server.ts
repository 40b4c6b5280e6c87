import { json } from '@sveltejs/kit';
import { z } from 'zod';
import { database } from '$lib/server/db/database';
import { screenSeen } from '$lib/server/domes';
import { notPaired } from '$lib/server/domes/notPaired';
import { screenOf } from '$lib/server/domes/screenOf';
import { answering, problem } from '$lib/server/http/problem';
import { openRunOf } from '$lib/server/runs';
import { readBody } from '$lib/server/http/readBody';
import type { RequestHandler } from './$types';

/** Who am I: the screen, the geometry of its dome, and the run that is open there. */
export const GET: RequestHandler = (event) =>
	answering(async () => {
		const known = await screenOf(event);
		if (!known) return notPaired();
		const { screen, dome } = known;
		const [run] = await Promise.all([openRunOf(database(), dome.id), screenSeen(screen.id)]);
		return json(
			{
				screen: { id: screen.id, name: screen.name },
				dome: {
					id: dome.id,
					name: dome.name,
					apertureDegrees: dome.apertureDegrees,
					tiltDegrees: dome.tiltDegrees,
					filmSize: dome.filmSize,
					painter: dome.painter
				},
				run: run && { runId: run.id, editionId: run.editionId, hash: run.hash }
			},
			{ headers: { 'cache-control': 'no-store' } }
		);
	});

const bodySchema = z.strictObject({ painter: z.enum(['plain', 'webgl']) });

/** A screen says which painter it uses. */
export const PUT: RequestHandler = (event) =>
	answering(async () => {
		const known = await screenOf(event);
		if (!known) return notPaired();
		const body = bodySchema.safeParse(await readBody(event.request));
		if (!body.success) return problem(400, 'The painter is "plain" or "webgl".');
		await screenSeen(known.screen.id, body.data.painter);
		return new Response(null, { status: 204 });
	});
