import { describe, expect, it } from 'vitest';
import { eventParser, type StreamEvent } from '../../src/lib/live/eventParser';
import { followEvents, type LinkState } from '../../src/lib/live/followEvents';

const text =
	': hello\r\nid: a:1\revent: event\ndata: {"n":1}\n\nretry: 20\ndata: x\ndata: y\n\nid: a:2\n\n';
const events: StreamEvent[] = [
	{ id: 'a:1', event: 'event', data: '{"n":1}' },
	{ id: 'a:1', event: 'message', data: 'x\ny' }
];

describe('eventParser', () => {
	it('reads the same events wherever the pieces are cut', () => {
		for (let size = 1; size <= text.length; size++) {
			const seen: StreamEvent[] = [];
			const parser = eventParser((event) => seen.push(event));
			for (let i = 0; i < text.length; i += size) parser.push(text.slice(i, i + size));
			expect([size, seen]).toEqual([size, events]);
			expect(parser.retry).toBe(20);
		}
	});
});

/** Answers one stream after the other and writes down what was asked. */
function server(...answers: (string | number | Error)[]) {
	const asked: (string | null)[] = [];
	const fetch = async (_url: unknown, init?: RequestInit) => {
		asked.push(new Headers(init?.headers).get('last-event-id'));
		const answer = answers[asked.length - 1];
		if (answer instanceof Error) throw answer;
		if (typeof answer === 'number') return new Response(null, { status: answer });
		return new Response(answer);
	};
	return { asked, fetch: fetch as typeof globalThis.fetch };
}
const frame = (n: number) => `id: r:${n}\nevent: event\ndata: ${n}\n\n`;

async function follow(
	{ fetch }: ReturnType<typeof server>,
	onEvent: (event: StreamEvent) => boolean | void
) {
	const states: LinkState[] = [];
	await followEvents({
		url: '/events',
		onEvent,
		onState: (state) => states.push(state),
		signal: new AbortController().signal,
		fetch,
		firstWaitMs: 1
	});
	return states;
}

describe('followEvents', () => {
	it('comes back with the id of the last event after the line ends, breaks or answers 503', async () => {
		const house = server(frame(1) + frame(2), new TypeError('no network'), 503, frame(3), 401);
		const seen: string[] = [];
		const states = await follow(house, (event) => void seen.push(event.data));
		expect(seen).toEqual(['1', '2', '3']);
		expect(house.asked).toEqual([null, 'r:2', 'r:2', 'r:2', 'r:3']);
		expect(states.filter((s) => s !== 'connecting')).toEqual([
			'open',
			'lost',
			'lost',
			'lost',
			'open',
			'lost',
			'refused'
		]);
	});

	it('asks again from the last event taken when one is refused', async () => {
		const house = server(frame(1) + frame(3) + frame(4), frame(2) + frame(3), 404);
		const seen: number[] = [];
		await follow(house, (event) => {
			if (Number(event.data) !== (seen.at(-1) ?? 0) + 1) return false;
			seen.push(Number(event.data));
		});
		expect(seen).toEqual([1, 2, 3]);
		expect(house.asked).toEqual([null, 'r:1', 'r:3']);
	});

	it('gives up a line that says nothing, not even a comment', async () => {
		let asked = 0;
		const silent = (_url: unknown, init?: RequestInit) => {
			asked += 1;
			if (asked > 1) return Promise.resolve(new Response(null, { status: 401 }));
			const body = new ReadableStream({
				start: (c) => init?.signal?.addEventListener('abort', () => c.error(init.signal?.reason))
			});
			return Promise.resolve(new Response(body));
		};
		await followEvents({
			url: '/events',
			onEvent: () => undefined,
			signal: new AbortController().signal,
			fetch: silent as typeof fetch,
			stallMs: 30,
			firstWaitMs: 1
		});
		expect(asked).toBe(2);
	});

	it('ends when told to', async () => {
		const ending = new AbortController();
		const house = server(frame(1), frame(2));
		await followEvents({
			url: '/events',
			onEvent: () => ending.abort(),
			signal: ending.signal,
			fetch: house.fetch
		});
		expect(house.asked).toHaveLength(1);
	});
});
