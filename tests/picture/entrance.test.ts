import { describe, expect, it } from 'vitest';
import { entranceAt, restShare, viewBetween } from '../../src/lib/picture/entrance';
import { playbackAt, type RunCommand } from '../../src/lib/show/playback';
import { events, makeContent, makeScene, uuid } from '../show/support/content';

const fade = { kind: 'fade', seconds: 4 } as const;
const content = makeContent([
	makeScene(1, { entrance: fade }),
	makeScene(2, { entrance: fade }),
	makeScene(3, { entrance: fade, motion: { rate: 4, begin: 'fresh' } }),
	makeScene(4)
]);
const at = (seconds: number, ...list: [number, RunCommand][]) =>
	playbackAt(content, events([0, { kind: 'begin' }], ...list), seconds * 1000);

describe('entranceAt', () => {
	it('lights the first scene from dark', () => {
		const shares = [0, 1, 2, 3, 4].map((s) => entranceAt(at(s)).exposure);
		expect(shares[0]).toBe(0);
		expect(shares[2]).toBeCloseTo(0.5, 10);
		expect(shares[4]).toBe(1);
		expect([...shares].sort((a, b) => a - b)).toEqual(shares);
	});
	it('eases the view where the same galaxy goes on, without going dark', () => {
		const now = entranceAt(at(12, [10_000, { kind: 'advance', from: uuid(1) }]));
		expect(now).toEqual({ shows: 'scene', exposure: 1, viewShare: 0.5 });
	});
	it('darkens what leaves before it lights what comes afresh', () => {
		const jump: [number, RunCommand] = [10_000, { kind: 'jump', to: uuid(3) }];
		expect(entranceAt(at(10, jump))).toMatchObject({ shows: 'left', exposure: 1 });
		expect(entranceAt(at(11.59, jump)).shows).toBe('left');
		expect(entranceAt(at(11.59, jump)).exposure).toBeLessThan(0.01);
		expect(entranceAt(at(11.61, jump))).toMatchObject({ shows: 'scene' });
		expect(entranceAt(at(14, jump))).toEqual({ shows: 'scene', exposure: 1, viewShare: 1 });
	});
	it('is there at once on a cut', () => {
		const now = entranceAt(at(10, [10_000, { kind: 'jump', to: uuid(4) }]));
		expect(now).toEqual({ shows: 'scene', exposure: 1, viewShare: 1 });
	});
});

describe('restShare', () => {
	it('comes and goes in 0.8 s', () => {
		const rest: [number, RunCommand] = [10_000, { kind: 'rest' }];
		const resume: [number, RunCommand] = [20_000, { kind: 'resume' }];
		expect([10, 10.4, 10.8, 15].map((s) => restShare(at(s, rest)))).toEqual([0, 0.5, 1, 1]);
		expect([20, 20.4, 20.8].map((s) => restShare(at(s, rest, resume)))).toEqual([1, 0.5, 0]);
	});
	it('comes up in 0.8 s after the end, and stays where it was up before', () => {
		const end: [number, RunCommand] = [10_000, { kind: 'end' }];
		const rest: [number, RunCommand] = [9_000, { kind: 'rest' }];
		expect([10, 10.4, 10.8, 60].map((s) => restShare(at(s, end)))).toEqual([0, 0.5, 1, 1]);
		expect(restShare(at(10, rest, end))).toBe(1);
	});
	it('is whole before the run', () => {
		expect(restShare(playbackAt(content, [], 0))).toBe(1);
	});
});

describe('viewBetween', () => {
	const a = { distance: 20, inclination: 0, turn: 170, centreAltitude: 30 };
	const b = { distance: 80, inclination: 60, turn: -170, centreAltitude: 50 };
	it('goes by ratio in distance and the short way round in turn', () => {
		const half = viewBetween(a, b, 0.5);
		expect(half.distance).toBeCloseTo(40, 10);
		expect(half.turn).toBeCloseTo(180, 10);
		expect([half.inclination, half.centreAltitude]).toEqual([30, 40]);
	});
	it('ends exactly at the new view', () => {
		expect(viewBetween(a, b, 1)).toBe(b);
	});
});
