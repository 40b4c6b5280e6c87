import { describe, expect, it } from 'vitest';
import { entranceAt, restShare, viewBetween } from '../../src/lib/picture/entrance';
import { playbackAt, type RunCommand } from '../../src/lib/show/playback';
import { events, makeContent, makeScene, uuid } from '../show/support/content';

const fade = { kind: 'fade', seconds: 4 } as const;
const views = [10, 40, 70, 20].map((inclination) => ({
	distance: 50,
	inclination,
	turn: 0,
	centreAltitude: 40
}));
const content = makeContent([
	makeScene(1, { entrance: fade, view: views[0] }),
	makeScene(2, { entrance: fade, view: views[1] }),
	makeScene(3, { entrance: fade, view: views[2], motion: { rate: 4, begin: 'fresh' } }),
	makeScene(4, { view: views[3] })
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
		expect([now.motion.scene.id, now.exposure]).toEqual([uuid(2), 1]);
		expect(now.view).toEqual(viewBetween(views[0], views[1], 0.5));
	});
	it('darkens what leaves before it lights what comes afresh', () => {
		const jump: [number, RunCommand] = [10_000, { kind: 'jump', to: uuid(3) }];
		const seen = (s: number) => entranceAt(at(s, jump));
		expect(seen(10)).toMatchObject({ motion: { scene: { id: uuid(1) } }, exposure: 1 });
		expect(seen(11.59).motion.scene.id).toBe(uuid(1));
		expect(seen(11.59).exposure).toBeLessThan(0.01);
		expect(seen(11.61).motion.scene.id).toBe(uuid(3));
		expect(seen(11.61).exposure).toBeLessThan(0.01);
		expect(seen(14)).toMatchObject({ motion: { scene: { id: uuid(3) } }, exposure: 1 });
	});
	it('is there at once on a cut', () => {
		const now = entranceAt(at(10, [10_000, { kind: 'jump', to: uuid(4) }]));
		expect(now).toMatchObject({ motion: { scene: { id: uuid(4) } }, exposure: 1, view: views[3] });
	});
	it('never jumps in light or view, whatever is pressed while a scene comes on', () => {
		const pressed: [number, RunCommand][] = [
			[1_000, { kind: 'advance', from: uuid(1) }],
			[1_500, { kind: 'advance', from: uuid(2) }],
			[2_000, { kind: 'back', from: uuid(3) }],
			[2_100, { kind: 'back', from: uuid(2) }],
			[4_600, { kind: 'jump', to: uuid(3) }]
		];
		let before = entranceAt(at(0, ...pressed));
		for (let tick = 1; tick <= 600; tick++) {
			const now = entranceAt(at(tick / 60, ...pressed));
			const dark = Math.min(now.exposure, before.exposure) < 0.03;
			const steps = now.exposure - before.exposure;
			expect(Math.abs(steps), `exposure at tick ${tick}`).toBeLessThan(0.03);
			if (!dark) {
				const far = Math.abs(now.view.inclination - before.view.inclination);
				expect(far, `inclination at tick ${tick}`).toBeLessThan(1);
			}
			before = now;
		}
		expect(before).toMatchObject({ motion: { scene: { id: uuid(3) } }, exposure: 1 });
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
	it('turns back on its way from where it is', () => {
		const list: [number, RunCommand][] = [
			[10_000, { kind: 'rest' }],
			[10_200, { kind: 'resume' }],
			[10_300, { kind: 'end' }]
		];
		let before = restShare(at(9.9, ...list));
		for (let tick = 595; tick <= 680; tick++) {
			// In the middle of a tick, where rounding moves nothing; the steepest step is 1.5 / 48.
			const now = restShare(at((tick + 0.5) / 60, ...list));
			expect(Math.abs(now - before), `tick ${tick}`).toBeLessThan(0.032);
			before = now;
		}
		expect(before).toBe(1);
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
