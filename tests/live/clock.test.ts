import { describe, expect, it } from 'vitest';
import { offsetFrom, ServerClock } from '../../src/lib/live/clock';

describe('offsetFrom', () => {
	it('takes the sample with the least round trip', () => {
		// The server is 1000 ms ahead; the slow answers spent their time on one way only.
		const samples = [
			{ sent: 0, received: 200, server: 1190 },
			{ sent: 300, received: 304, server: 1302 },
			{ sent: 400, received: 700, server: 1405 }
		];
		expect(offsetFrom(samples)).toEqual({ offset: 1000, error: 2 });
	});

	it('refuses to guess from nothing', () => {
		expect(() => offsetFrom([])).toThrow(/at least one sample/);
	});
});

describe('ServerClock', () => {
	/** A local clock and a server `ahead` of it, with a time for each way, one pair a question. */
	function simulated(ahead: () => number, ways: [number, number][]) {
		let local = 5000;
		let asked = 0;
		const ask = async () => {
			const [there, back] = ways[asked++ % ways.length];
			local += there;
			const server = local + ahead();
			local += back;
			return server;
		};
		return { clock: new ServerClock(ask, () => local), pass: (ms: number) => (local += ms) };
	}

	it('knows the server to within half of the least round trip, however uneven the ways', async () => {
		const { clock, pass } = simulated(
			() => -340,
			[
				[80, 5],
				[3, 1],
				[1, 60]
			]
		);
		const { error } = await clock.measure(3);
		expect(error).toBe(2);
		pass(1000);
		const truth = 5000 + 85 + 4 + 61 + 1000 - 340;
		expect([Math.abs(clock.now() - truth) <= 2, clock.now(), truth]).toContain(true);
	});

	it('keeps a better offset that a worse one agrees with, and follows a real change', async () => {
		let ahead = 100;
		const { clock } = simulated(
			() => ahead,
			[
				[1, 1],
				[40, 2],
				[2, 2]
			]
		);
		await clock.measure(1);
		expect(clock.known).toEqual({ offset: 100, error: 1 });
		await clock.measure(1);
		expect(clock.known).toEqual({ offset: 100, error: 1 });
		ahead = 900;
		await clock.measure(1);
		expect(clock.known).toEqual({ offset: 900, error: 2 });
	});

	it('says so where no question was answered and keeps what it knew', async () => {
		const clock = new ServerClock(
			() => Promise.reject(new Error('away')),
			() => 10
		);
		clock.remember({ offset: 7, error: 1 });
		await expect(clock.measure(2)).rejects.toThrow('away');
		expect(clock.now()).toBe(17);
	});
});
