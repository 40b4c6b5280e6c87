import { describe, expect, it } from 'vitest';
import { massModel } from '../../src/lib/dynamics';
import { ShowPicture } from '../../src/lib/picture/showPicture';
import { playbackAt, type RunCommand } from '../../src/lib/show/playback';
import { effectiveModel, sceneSettings } from '../../src/lib/show/settings';
import { timeFromMyr } from '../../src/lib/units';
import { events, galaxy, makeContent, makeScene, uuid } from '../show/support/content';

const haloControl = {
	id: uuid(50),
	label: 'Halo',
	target: { kind: 'halo-factor' } as const,
	min: 0,
	max: 2,
	rest: 1
};
const content = makeContent([
	makeScene(1, { controls: [haloControl] }),
	makeScene(2, { comparison: 'halves' }),
	makeScene(3, { motion: { rate: 4, begin: 'fresh' } })
]);
const begin: [number, RunCommand] = [0, { kind: 'begin' }];
const control = (at: number, value: number): [number, RunCommand] => [
	at,
	{ kind: 'control', scene: uuid(1), control: uuid(50), value }
];
const picture = new ShowPicture(content, { starCount: 500, ringCount: 256 });
const geometry = { apertureDegrees: 180, tiltDegrees: 0 };
const ring = (list: ReturnType<typeof events>, ms: number) => {
	const found = picture.ringAt(playbackAt(content, list, ms), 8);
	if (!found) throw new Error('the scene shows no galaxy');
	return found;
};

describe('RingMotion', () => {
	it('turns a ring by the computed angular speed', () => {
		const { radius, phase } = ring(events(begin), 30_000);
		const omega = massModel(
			effectiveModel(galaxy, sceneSettings(content.show.scenes[0], {}))
		).circularFrequency(radius);
		// 30 s at 4 million years a second.
		expect(phase).toBeCloseTo(omega * timeFromMyr(120), 8);
	});

	it('goes on without a jump when a live control moves', () => {
		const list = events(begin, control(10_000, 0), control(10_500, 2), control(20_000, 0.5));
		for (const ms of [10_000, 10_500, 20_000]) {
			const before = ring(list, ms - 17);
			const after = ring(list, ms + 17);
			const fastest = Math.max(before.omega, after.omega);
			const step = after.phase - before.phase;
			// Three ticks at the most lie between the two moments.
			expect(step).toBeGreaterThan(0);
			expect(step).toBeLessThanOrEqual(fastest * timeFromMyr(4) * (3 / 60) + 1e-9);
		}
		// At the very tick of the change the angle is that of the old speed, to 1e-6 and far below.
		const old = ring(events(begin), 10_000).phase;
		expect(Math.abs(ring(list, 10_000).phase - old)).toBeLessThan(1e-9);
	});

	it('gives the same angles to the last bit in another process that replays the events', () => {
		const list = events(
			begin,
			...Array.from({ length: 40 }, (_, i) => control(500 + i * 130, i / 20))
		);
		list.forEach((e, i) =>
			picture.frameAt(playbackAt(content, list.slice(0, i + 1), e.at), geometry)
		);
		const lived = ring(list, 9_000);
		const other = { ...content };
		const replayed = new ShowPicture(other, { starCount: 10, ringCount: 256 }).ringAt(
			playbackAt(other, list, 9_000),
			8
		);
		expect(replayed).toEqual(lived);
	});

	it('parts the halves at the start of their scene, from the same angles', () => {
		const list = events(begin, [10_000, { kind: 'advance', from: uuid(1) }]);
		const at = (ms: number) => picture.frameAt(playbackAt(content, list, ms), geometry).layers;
		const [left, right] = at(10_000);
		expect([left.half, right.half]).toEqual(['left', 'right']);
		expect(left.rings.phase).toEqual(right.rings.phase);
		const [bare, full] = at(20_000);
		const k = bare.rings.radii.findIndex((R) => R > 15);
		expect(full.rings.phase[k]).toBeGreaterThan(bare.rings.phase[k]);
	});

	it('starts from zero where a scene begins fresh', () => {
		const list = events(begin, [10_000, { kind: 'jump', to: uuid(3) }]);
		expect(ring(list, 10_000).phase).toBe(0);
	});
});

describe('ShowPicture', () => {
	it('shows the rest picture without stars of the galaxy, and comes back', () => {
		const list = events(begin, [10_000, { kind: 'rest' }], [20_000, { kind: 'resume' }]);
		const frame = (ms: number) => picture.frameAt(playbackAt(content, list, ms), geometry);
		expect(frame(9_000).layers).toHaveLength(1);
		expect(frame(12_000).layers).toHaveLength(0);
		expect(frame(12_000).exposure).toBeCloseTo(0.6, 10);
		expect(frame(21_000).layers).toHaveLength(1);
		expect(frame(21_000).exposure).toBe(1);
	});
});
