import { json } from '@sveltejs/kit';
import { z } from 'zod';
import { queryable } from '$lib/server/context';
import { sessionToken } from '$lib/server/auth/cookie';
import { readSession } from '$lib/server/auth/readSession';
import { answering, problem } from '$lib/server/http/problem';
import { readRun, readRunEdition, sendCommand } from '$lib/server/runs';
import { channels } from '$lib/server/runs/channels';
import { notices } from '$lib/server/runs/notices';
import { readBody } from '$lib/server/http/readBody';
import { readPosition, runEventStream } from '$lib/server/runs/runEventStream';
import type { RequestHandler } from './$types';

const signInFirst = () => problem(401, 'Sign in to follow or command a run.');

/** Everything that happens in a run, as server-sent events; see runEventStream for the protocol. */
export const GET: RequestHandler = (event) =>
	answering(async () => {
		const { locals, params, request } = event;
		const { ctx } = locals;
		const token = sessionToken(event) ?? '';
		if (!ctx) return signInFirst();
		const run = await readRun(ctx, params.id);
		const { hash } = await readRunEdition(ctx, run);
		return runEventStream({
			db: queryable(ctx),
			notices: notices(),
			from: readPosition(request, run.id),
			followed: {
				run: async () => ({ id: run.id, editionId: run.editionId, hash }),
				announcesRuns: false,
				// Whoever is signed out, disabled or removed stops hearing of the run at the next beat.
				stillGood: async () => {
					const session = await readSession(token);
					return session?.memberships.some(({ venueId }) => venueId === ctx.venueId) ?? false;
				},
				concerns: ({ channel, id }) => channel === channels.runs && id === run.id
			}
		});
	});

const bodySchema = z.strictObject({ command: z.unknown(), idempotencyKey: z.unknown() });

/** One command of a console: {command, idempotencyKey}. */
export const POST: RequestHandler = ({ locals, params, request }) =>
	answering(async () => {
		const { ctx } = locals;
		if (!ctx) return signInFirst();
		const body = bodySchema.safeParse(await readBody(request));
		if (!body.success) {
			return problem(400, 'A command is {"command": …, "idempotencyKey": "…"} and nothing else.');
		}
		return json(await sendCommand(ctx, { runId: params.id, ...body.data }));
	});
