import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Context } from '../../../src/lib/server/context';
import type { Database } from '../../../src/lib/server/db/database';
import { roles } from '../../../src/lib/roles';
import { eventsAfter, readRun, sendCommand, startRun } from '../../../src/lib/server/runs';
import type { RunCommand } from '../../../src/lib/show/playback';
import { uuid } from '../../show/support/content';
import {
	contextFor,
	controlId,
	makeDome,
	makeEdition,
	makeVenue,
	openDatabase,
	sceneIds
} from './support';

let db: Database;
let close: () => Promise<void>;
let presenter: Context;
let second: Context;
let stranger: Context;
let venue: Awaited<ReturnType<typeof makeVenue>>;
let editionId: string;

beforeAll(async () => {
	({ db, close } = await openDatabase());
	venue = await makeVenue(db);
	presenter = await contextFor(db, venue, ['presenter']);
	second = await contextFor(db, venue, ['presenter']);
	stranger = await contextFor(db, await makeVenue(db, 'Other'), ['manager']);
	editionId = (await makeEdition(db, venue.id)).id;
});
afterAll(() => close());

async function openRun() {
	const dome = await makeDome(db, venue.id);
	const { runId } = await startRun(presenter, { editionId, domeId: dome.id });
	return { runId, domeId: dome.id };
}
const send = (
	runId: string,
	command: RunCommand,
	{ ctx = presenter, key = randomUUID() as string } = {}
) => sendCommand(ctx, { runId, command, idempotencyKey: key });

describe('sendCommand', () => {
	it('applies the same key once and answers with the same number', async () => {
		const { runId } = await openRun();
		const key = randomUUID();
		const first = await send(runId, { kind: 'begin' }, { key });
		const again = await send(runId, { kind: 'begin' }, { key });
		expect([first, again]).toEqual([
			{ applied: true, number: 1 },
			{ applied: true, number: 1 }
		]);
		expect(await eventsAfter(db, runId, 0)).toHaveLength(1);
	});

	it('moves once when two consoles press at the same time', async () => {
		const { runId } = await openRun();
		await send(runId, { kind: 'begin' });
		const advance: RunCommand = { kind: 'advance', from: sceneIds[0] };
		const answers = await Promise.all([
			send(runId, advance),
			send(runId, advance, { ctx: second }),
			send(runId, advance)
		]);
		expect(answers.filter((a) => a.applied)).toHaveLength(1);
		expect((await eventsAfter(db, runId, 0)).map((e) => e.command.kind)).toEqual([
			'begin',
			'advance'
		]);
	});

	it('numbers twenty commands at once without a gap and in order of time', async () => {
		const { runId } = await openRun();
		await send(runId, { kind: 'begin' });
		await send(runId, { kind: 'advance', from: sceneIds[0] });
		const answers = await Promise.all(
			Array.from({ length: 20 }, (_, i) =>
				send(runId, { kind: 'control', scene: sceneIds[1], control: controlId, value: i / 100 })
			)
		);
		expect(answers.every((a) => a.applied)).toBe(true);
		const events = await eventsAfter(db, runId, 0);
		expect(events.map((e) => e.number)).toEqual(Array.from({ length: 22 }, (_, i) => i + 1));
		expect(events.every((e, i) => i === 0 || e.at >= events[i - 1].at)).toBe(true);
		expect((await readRun(presenter, runId)).lastEvent).toBe(22);
	});

	it('keeps a control inside its limits and refuses one that the scene does not have', async () => {
		const { runId } = await openRun();
		await send(runId, { kind: 'begin' });
		await send(runId, { kind: 'advance', from: sceneIds[0] });
		const control = { kind: 'control', scene: sceneIds[1], control: controlId } as const;
		await send(runId, { ...control, value: 7 });
		expect((await eventsAfter(db, runId, 2))[0].command).toEqual({ ...control, value: 2 });
		await expect(send(runId, { ...control, control: uuid(777), value: 1 })).rejects.toMatchObject({
			code: 'invalid'
		});
		// A slider of a scene that is no longer on changes nothing.
		await send(runId, { kind: 'advance', from: sceneIds[1] });
		expect(await send(runId, { ...control, value: 0.5 })).toEqual({ applied: false, number: 4 });
	});

	it('answers applied: false where there is nothing to do', async () => {
		const { runId } = await openRun();
		await expect(send(runId, { kind: 'hold' })).rejects.toMatchObject({ code: 'precondition' });
		await send(runId, { kind: 'begin' });
		const nothing: RunCommand[] = [
			{ kind: 'begin' },
			{ kind: 'go-on' },
			{ kind: 'resume' },
			{ kind: 'back', from: sceneIds[0] },
			{ kind: 'advance', from: sceneIds[2] }
		];
		for (const command of nothing) {
			expect([command.kind, await send(runId, command)]).toEqual([
				command.kind,
				{ applied: false, number: 1 }
			]);
		}
		await expect(send(runId, { kind: 'jump', to: uuid(777) })).rejects.toMatchObject({
			code: 'invalid'
		});
	});

	it('closes the run with the command end, after which nothing is added', async () => {
		const { runId, domeId } = await openRun();
		await send(runId, { kind: 'begin' });
		await send(runId, { kind: 'end' });
		expect((await readRun(presenter, runId)).endedAt).toBeInstanceOf(Date);
		expect(await send(runId, { kind: 'hold' })).toEqual({ applied: false, number: 2 });
		const next = await startRun(presenter, { editionId, domeId });
		expect(next.runId).not.toBe(runId);
	});

	it('refuses what is not a command by saying which part', async () => {
		const { runId } = await openRun();
		for (const command of [
			{ kind: 'dance' },
			{ kind: 'advance' },
			{ kind: 'hold', extra: 1 },
			{ kind: 'control', scene: sceneIds[1], control: controlId, value: Infinity }
		]) {
			await expect(
				sendCommand(presenter, { runId, command, idempotencyKey: randomUUID() })
			).rejects.toMatchObject({ code: 'invalid' });
		}
		await expect(
			sendCommand(presenter, { runId, command: { kind: 'begin' }, idempotencyKey: 'x' })
		).rejects.toMatchObject({ code: 'invalid' });
	});

	it('knows no run of another venue', async () => {
		const { runId } = await openRun();
		await expect(send(runId, { kind: 'begin' }, { ctx: stranger })).rejects.toMatchObject({
			code: 'not-found'
		});
		await expect(readRun(stranger, runId)).rejects.toMatchObject({ code: 'not-found' });
		await expect(
			startRun(stranger, { editionId, domeId: (await makeDome(db, stranger.venueId)).id })
		).rejects.toMatchObject({ code: 'not-found' });
	});

	it('lets presenters and managers command and start, and nobody else', async () => {
		const { runId } = await openRun();
		const allowed: string[] = [];
		for (const role of roles) {
			const ctx = await contextFor(db, venue, [role]);
			const dome = await makeDome(db, venue.id, `Dome of ${role}`);
			const tries = await Promise.allSettled([
				send(runId, { kind: 'begin' }, { ctx }),
				startRun(ctx, { editionId, domeId: dome.id })
			]);
			const done = tries.map((t) => t.status === 'fulfilled');
			expect(done[0]).toBe(done[1]);
			if (done[0]) allowed.push(role);
			else
				for (const refused of tries)
					expect(refused).toMatchObject({ reason: { code: 'forbidden' } });
		}
		expect(allowed).toEqual(['presenter', 'manager']);
	});
});

describe('startRun', () => {
	it('opens one run a dome when two start at once, and names the open one', async () => {
		const dome = await makeDome(db, venue.id);
		const tries = await Promise.allSettled([
			startRun(presenter, { editionId, domeId: dome.id }),
			startRun(second, { editionId, domeId: dome.id })
		]);
		const opened = tries.flatMap((t) => (t.status === 'fulfilled' ? [t.value.runId] : []));
		expect(opened).toHaveLength(1);
		expect(tries.find((t) => t.status === 'rejected')).toMatchObject({
			reason: {
				code: 'conflict',
				details: { runId: opened[0], href: `/runs/${opened[0]}/console` }
			}
		});
	});
});
