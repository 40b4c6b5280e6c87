import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Context } from '../../../src/lib/server/context';
import type { Database } from '../../../src/lib/server/db/database';
import { openRunOf, sendCommand, startRun } from '../../../src/lib/server/runs';
import { channels } from '../../../src/lib/server/runs/channels';
import { domeOfRun } from '../../../src/lib/server/runs/domeOfRun';
import { Notices } from '../../../src/lib/server/runs/notices';
import {
	readPosition,
	runEventStream,
	type Followed,
	type StreamOptions
} from '../../../src/lib/server/runs/runEventStream';
import type { RunCommand } from '../../../src/lib/show/playback';
import { contextFor, makeDome, makeEdition, makeVenue, openDatabase, sceneIds } from './support';

let db: Database;
let url: string;
let close: () => Promise<void>;
let notices: Notices;
let presenter: Context;
let editionId: string;
let venueId: string;
const open: FrameReader[] = [];

/** Reads a stream frame by frame, as it would go over the wire. */
class FrameReader {
	readonly response: Response;
	readonly #reader: ReadableStreamDefaultReader<Uint8Array>;
	readonly #decoder = new TextDecoder();
	#text = '';

	constructor(response: Response) {
		this.response = response;
		if (!response.body) throw new Error('the answer has no body');
		this.#reader = response.body.getReader();
		open.push(this);
	}

	/** The next frame without its blank line, or null at the end. */
	async next(): Promise<string | null> {
		for (;;) {
			const end = this.#text.indexOf('\n\n');
			if (end >= 0) {
				const frame = this.#text.slice(0, end);
				this.#text = this.#text.slice(end + 2);
				return frame;
			}
			const { done, value } = await this.#reader.read();
			if (done) return null;
			this.#text += this.#decoder.decode(value, { stream: true });
		}
	}

	/** The next frame that carries something. */
	async nextEvent(): Promise<{ id: string | null; event: string; data: unknown } | null> {
		for (let frame = await this.next(); frame !== null; frame = await this.next()) {
			if (frame.startsWith(':') || frame.startsWith('retry:')) continue;
			const line = (name: string) => new RegExp(`^${name}: (.*)$`, 'm').exec(frame)?.[1] ?? null;
			return { id: line('id'), event: line('event') ?? '', data: JSON.parse(line('data') ?? '') };
		}
		return null;
	}

	leave = () => this.#reader.cancel();
}

beforeAll(async () => {
	({ db, url, close } = await openDatabase());
	notices = new Notices(url);
	const venue = await makeVenue(db);
	venueId = venue.id;
	presenter = await contextFor(db, venue, ['presenter']);
	editionId = (await makeEdition(db, venue.id)).id;
});
afterEach(async () => {
	for (const reader of open.splice(0)) await reader.leave();
});
afterAll(async () => {
	await notices.close();
	await close();
});

async function openRun() {
	const dome = await makeDome(db, venueId);
	const { runId } = await startRun(presenter, { editionId, domeId: dome.id });
	return { runId, domeId: dome.id };
}
const send = (runId: string, command: RunCommand) =>
	sendCommand(presenter, { runId, command, idempotencyKey: randomUUID() });

const consoleOf = (runId: string): Followed => ({
	run: async () => ({ id: runId, editionId, hash: 'x' }),
	announcesRuns: false,
	concerns: ({ channel, id }) => channel === channels.runs && id === runId
});
const screenOf = (domeId: string): Followed => ({
	run: () => openRunOf(db, domeId),
	announcesRuns: true,
	concerns: async ({ id }) => (await domeOfRun(db, id)) === domeId
});
const follow = (followed: Followed, more: Partial<StreamOptions> = {}) =>
	new FrameReader(runEventStream({ db, notices, followed, from: null, ...more }));

describe('runEventStream', () => {
	it('replays from the start and goes on with what happens', async () => {
		const { runId } = await openRun();
		await send(runId, { kind: 'begin' });
		const reader = follow(consoleOf(runId));
		expect(await reader.next()).toBe('retry: 500');
		expect(await reader.nextEvent()).toMatchObject({
			id: `${runId}:1`,
			event: 'event',
			data: { number: 1, command: { kind: 'begin' }, actor: presenter.userName }
		});
		await send(runId, { kind: 'hold' });
		expect(await reader.nextEvent()).toMatchObject({ id: `${runId}:2`, data: { number: 2 } });
	});

	it('replays from Last-Event-ID, which wins over ?after=, frame by frame', async () => {
		const { runId } = await openRun();
		for (const kind of ['begin', 'hold', 'go-on', 'rest'] as const) await send(runId, { kind });
		const request = new Request(`http://localhost/?after=${runId}:1`, {
			headers: { 'last-event-id': `${runId}:2` }
		});
		const reader = follow(consoleOf(runId), { from: readPosition(request, runId) });
		const ids = [await reader.nextEvent(), await reader.nextEvent()].map((frame) => frame?.id);
		expect(ids).toEqual([`${runId}:3`, `${runId}:4`]);
		expect(readPosition(new Request('http://localhost/?after=3'), runId)).toEqual({
			runId,
			number: 3
		});
		expect(readPosition(new Request('http://localhost/?after=drop'), runId)).toBeNull();
	});

	it('sends every number once and in order while twenty commands arrive', async () => {
		const { runId } = await openRun();
		await send(runId, { kind: 'begin' });
		const reader = follow(consoleOf(runId));
		const jumps = Array.from({ length: 20 }, () => send(runId, { kind: 'jump', to: sceneIds[1] }));
		const numbers: unknown[] = [];
		while (numbers.length < 21) {
			const frame = await reader.nextEvent();
			numbers.push((frame?.data as { number: number }).number);
		}
		await Promise.all(jumps);
		expect(numbers).toEqual(Array.from({ length: 21 }, (_, i) => i + 1));
	});

	it('tells a screen when a run opens in its dome and when it closes', async () => {
		const dome = await makeDome(db, venueId);
		const reader = follow(screenOf(dome.id));
		expect(await reader.nextEvent()).toEqual({ id: 'none:0', event: 'run', data: null });
		const { runId } = await startRun(presenter, { editionId, domeId: dome.id });
		expect(await reader.nextEvent()).toEqual({
			id: `${runId}:0`,
			event: 'run',
			data: { runId, editionId, hash: 'ab'.repeat(32) }
		});
		await send(runId, { kind: 'begin' });
		expect(await reader.nextEvent()).toMatchObject({ id: `${runId}:1`, event: 'event' });
		await send(runId, { kind: 'end' });
		expect(await reader.nextEvent()).toMatchObject({
			id: `${runId}:2`,
			data: { command: { kind: 'end' } }
		});
		expect(await reader.nextEvent()).toEqual({ id: 'none:0', event: 'run', data: null });
	});

	it('goes on after the listening connection was killed, with nothing lost', async () => {
		const { runId } = await openRun();
		const reader = follow(consoleOf(runId));
		await send(runId, { kind: 'begin' });
		expect(await reader.nextEvent()).toMatchObject({ data: { number: 1 } });
		const other = new pg.Client({ connectionString: url });
		await other.connect();
		const { rowCount } = await other.query(
			`select pg_terminate_backend(pid) from pg_stat_activity
			 where application_name = 'farwheel notices' and datname = current_database()`
		);
		expect(rowCount).toBe(1);
		// Sent while nobody listens: only the wake after the reconnect can bring it.
		await send(runId, { kind: 'rest' });
		await other.end();
		expect(await reader.nextEvent()).toMatchObject({ data: { number: 2 } });
		await send(runId, { kind: 'resume' });
		expect(await reader.nextEvent()).toMatchObject({ data: { number: 3 } });
	});

	it('stays open while the database cannot be read and goes on when it can', async () => {
		const { runId } = await openRun();
		await send(runId, { kind: 'begin' });
		let away = true;
		const followed = consoleOf(runId);
		const run = followed.run;
		followed.run = () =>
			away ? Promise.reject(Object.assign(new Error('away'), { code: 'ECONNREFUSED' })) : run();
		const reader = follow(followed);
		expect(await reader.next()).toBe('retry: 500');
		setTimeout(() => (away = false), 300);
		expect(await reader.nextEvent()).toMatchObject({ data: { number: 1 } });
	});

	it('writes a comment at every heartbeat and ends after its lifetime', async () => {
		const { runId } = await openRun();
		const reader = follow(consoleOf(runId), { heartbeatMs: 20, lifetimeMs: 110 });
		const frames: string[] = [];
		for (let frame = await reader.next(); frame !== null; frame = await reader.next())
			frames.push(frame);
		expect(frames.filter((frame) => frame === ': still here').length).toBeGreaterThanOrEqual(3);
		expect(notices.size).toBe(0);
	});

	it('ends with revoked once a screen is no longer good', async () => {
		const dome = await makeDome(db, venueId);
		let good = true;
		const followed = { ...screenOf(dome.id), stillGood: async () => good };
		const reader = follow(followed, { heartbeatMs: 20 });
		expect(await reader.nextEvent()).toMatchObject({ event: 'run' });
		good = false;
		expect(await reader.nextEvent()).toEqual({ id: null, event: 'revoked', data: null });
		expect(await reader.nextEvent()).toBeNull();
		expect(notices.size).toBe(0);
	});

	it('removes its listener when the reader leaves and says not to buffer', async () => {
		const { runId } = await openRun();
		const reader = follow(consoleOf(runId));
		expect(notices.size).toBe(1);
		expect(Object.fromEntries(reader.response.headers)).toMatchObject({
			'content-type': 'text/event-stream; charset=utf-8',
			'cache-control': 'no-cache, no-transform',
			'x-accel-buffering': 'no'
		});
		await reader.leave();
		expect(notices.size).toBe(0);
	});
});
