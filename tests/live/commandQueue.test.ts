import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { appendEvent } from '../../src/lib/live/appendEvent';
import { CommandQueue, type QueuedCommand, type SendResult } from '../../src/lib/live/commandQueue';
import { throttleLatest } from '../../src/lib/live/throttleLatest';
import type { RunCommand } from '../../src/lib/show/playback';
import { events, uuid } from '../show/support/content';

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

const control = (value: number): RunCommand => ({
	kind: 'control',
	scene: uuid(1),
	control: uuid(2),
	value
});

function queueOn(answers: SendResult[]) {
	const sent: QueuedCommand[] = [];
	const refused: string[] = [];
	let left: readonly QueuedCommand[] = [];
	let keys = 0;
	const queue = new CommandQueue({
		send: async (queued) => {
			sent.push(queued);
			return answers[sent.length - 1] ?? { kind: 'done', applied: true };
		},
		onChange: (now) => (left = now),
		onRefused: (_queued, detail) => refused.push(detail),
		makeKey: () => `key ${++keys}`
	});
	return { queue, sent, refused, left: () => left };
}

describe('CommandQueue', () => {
	it('tries the same command with the same key until the server answers', async () => {
		const { queue, sent, left } = queueOn([{ kind: 'unreached' }, { kind: 'unreached' }]);
		queue.push({ kind: 'hold' });
		queue.push({ kind: 'rest' });
		await vi.advanceTimersByTimeAsync(1);
		expect(left().map((q) => q.failures)).toEqual([1, 0]);
		await vi.advanceTimersByTimeAsync(10_000);
		expect(sent.map((q) => q.idempotencyKey)).toEqual(['key 1', 'key 1', 'key 1', 'key 2']);
		expect(left()).toEqual([]);
	});

	it('goes on behind a command that is refused, and tells why', async () => {
		const { queue, sent, refused } = queueOn([{ kind: 'refused', detail: 'No such scene.' }]);
		queue.push({ kind: 'jump', to: uuid(9) });
		queue.push({ kind: 'hold' });
		await vi.advanceTimersByTimeAsync(1);
		expect(refused).toEqual(['No such scene.']);
		expect(sent).toHaveLength(2);
	});

	it('lets a newer value of a control take the place of one that still waits', async () => {
		const { queue, sent } = queueOn([{ kind: 'unreached' }]);
		for (const value of [0.1, 0.2, 0.3, 0.4]) queue.push(control(value));
		await vi.advanceTimersByTimeAsync(5000);
		expect(sent.map((q) => q.command.kind === 'control' && q.command.value)).toEqual([
			0.1, 0.1, 0.4
		]);
	});
});

describe('throttleLatest', () => {
	it('passes at most one value in each interval and always the last', () => {
		const passed: [number, number][] = [];
		const begin = Date.now();
		const throttle = throttleLatest<number>(100, (value) =>
			passed.push([Date.now() - begin, value])
		);
		for (let i = 0; i < 50; i++) {
			throttle.give(i);
			vi.advanceTimersByTime(10);
		}
		vi.advanceTimersByTime(1000);
		expect(passed).toEqual([
			[0, 0],
			[100, 9],
			[200, 19],
			[300, 29],
			[400, 39],
			[500, 49]
		]);
	});

	it('passes what waits at once when flushed', () => {
		const passed: number[] = [];
		const throttle = throttleLatest<number>(100, (value) => passed.push(value));
		throttle.give(1);
		throttle.give(2);
		throttle.flush();
		expect(passed).toEqual([1, 2]);
	});
});

describe('appendEvent', () => {
	const [one, two, three] = events(
		[0, { kind: 'begin' }],
		[1, { kind: 'hold' }],
		[2, { kind: 'go-on' }]
	);

	it('adds the next, passes over a known one and refuses a gap', () => {
		expect(appendEvent([one], two)).toEqual([one, two]);
		const known = [one, two];
		expect(appendEvent(known, one)).toBe(known);
		expect(appendEvent([one], three)).toBeNull();
	});
});
