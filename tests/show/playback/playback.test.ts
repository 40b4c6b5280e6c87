import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	playbackAt,
	rehearsalEvents,
	sceneEvents,
	type RunCommand
} from '../../../src/lib/show/playback';
import { totalSeconds } from '../../../src/lib/show/timing';
import { events, makeContent, makeScene, uuid } from '../support/content';

const began = 1_000_000;
const control = (id: number) => ({
	id: uuid(id),
	label: 'Halo',
	target: { kind: 'halo-factor' } as const,
	min: 0,
	max: 2,
	rest: 1
});
const content = makeContent([
	makeScene(1, { pace: { kind: 'timed', seconds: 10 } }),
	makeScene(2, { controls: [control(50)] }),
	makeScene(3, { pace: { kind: 'timed', seconds: 5 } }),
	makeScene(4)
]);
const begin: [number, RunCommand] = [began, { kind: 'begin' }];

describe('playbackAt', () => {
	it('waits at the first scene before the run begins', () => {
		const now = playbackAt(content, [], began);
		expect([now.status, now.sceneIndex, now.elapsedSeconds]).toEqual(['waiting', 0, 0]);
	});

	it('goes on from a timed scene by itself, to the tick', () => {
		const list = events(begin);
		expect(playbackAt(content, list, began + 9_999).sceneIndex).toBe(0);
		expect(playbackAt(content, list, began + 10_000).sceneIndex).toBe(1);
		expect(playbackAt(content, list, began + 12_500).sceneSeconds).toBeCloseTo(2.5, 10);
	});

	it('waits for the presenter where the scene says so', () => {
		const now = playbackAt(content, events(begin), began + 600_000);
		expect([now.sceneIndex, now.sceneSeconds]).toEqual([1, 590]);
	});

	it('moves once when two consoles advance from the same scene', () => {
		const list = events(
			begin,
			[began + 20_000, { kind: 'advance', from: uuid(2) }],
			[began + 20_050, { kind: 'advance', from: uuid(2) }]
		);
		expect(playbackAt(content, list, began + 21_000).sceneIndex).toBe(2);
	});

	it('stays on the last scene until somebody ends the run', () => {
		const list = events(begin, [began + 20_000, { kind: 'jump', to: uuid(4) }]);
		expect(playbackAt(content, list, began + 3_600_000)).toMatchObject({
			status: 'running',
			sceneIndex: 3
		});
		const ended = [...list, ...events([began + 30_000, { kind: 'end' }])];
		expect(playbackAt(content, ended, began + 3_600_000)).toMatchObject({
			status: 'ended',
			elapsedSeconds: 30
		});
	});

	it('lets no scene time pass under hold or rest, and all of the run time', () => {
		const list = events(
			begin,
			[began + 4_000, { kind: 'hold' }],
			[began + 8_000, { kind: 'go-on' }],
			[began + 9_000, { kind: 'rest' }],
			[began + 19_000, { kind: 'resume' }]
		);
		const now = playbackAt(content, list, began + 20_000);
		expect(now).toMatchObject({ sceneIndex: 0, sceneSeconds: 6, elapsedSeconds: 20 });
	});

	it('keeps a live control inside its limits and only on its own scene', () => {
		const move = (scene: number, value: number): RunCommand => ({
			kind: 'control',
			scene: uuid(scene),
			control: uuid(50),
			value
		});
		const list = events(begin, [began + 1_000, move(2, 2)], [began + 11_000, move(2, 9)]);
		expect(playbackAt(content, list, began + 10_500).controls).toEqual({ [uuid(50)]: 1 });
		expect(playbackAt(content, list, began + 11_500).controls).toEqual({ [uuid(50)]: 2 });
	});

	it('puts controls back to rest when the scene comes on again', () => {
		const list = events(
			begin,
			[began + 11_000, { kind: 'control', scene: uuid(2), control: uuid(50), value: 0.3 }],
			[began + 12_000, { kind: 'advance', from: uuid(2) }],
			[began + 13_000, { kind: 'back', from: uuid(3) }]
		);
		expect(playbackAt(content, list, began + 14_000)).toMatchObject({
			sceneIndex: 1,
			controls: { [uuid(50)]: 1 }
		});
	});

	it('gives the same moment whether folded step by step or at once', () => {
		const command = fc.oneof(
			fc.constantFrom<RunCommand>(
				{ kind: 'hold' },
				{ kind: 'go-on' },
				{ kind: 'rest' },
				{ kind: 'resume' },
				...[1, 2, 3, 4].flatMap<RunCommand>((n) => [
					{ kind: 'advance', from: uuid(n) },
					{ kind: 'back', from: uuid(n) },
					{ kind: 'jump', to: uuid(n) }
				])
			),
			fc
				.double({ min: -1, max: 3, noNaN: true })
				.map<RunCommand>((value) => ({ kind: 'control', scene: uuid(2), control: uuid(50), value }))
		);
		fc.assert(
			fc.property(
				fc.array(fc.tuple(fc.integer({ min: 0, max: 7000 }), command), { maxLength: 30 }),
				(steps) => {
					let at = began;
					const list = events(
						begin,
						...steps.map<[number, RunCommand]>(([gap, c]) => [(at += gap), c])
					);
					const fresh = () => ({ ...content });
					const atOnce = playbackAt(fresh(), list, at + 500);
					const stepwise = fresh();
					list.forEach((e, i) => playbackAt(stepwise, list.slice(0, i + 1), e.at));
					const last = playbackAt(stepwise, list, at + 500);
					expect({ ...last.state }).toEqual({ ...atOnce.state });
				}
			)
		);
	});

	it('refuses an edition without scenes', () => {
		expect(() => playbackAt(makeContent([]), [], 0)).toThrow('without scenes');
	});
});

describe('rehearsalEvents', () => {
	it('plays every scene for its expected time', () => {
		const list = rehearsalEvents(content);
		expect(totalSeconds(content.show)).toBe(135);
		const scenes = [0, 9.9, 10, 69.9, 70, 74.9, 75, 134].map(
			(s) => playbackAt(content, list, s * 1000).sceneIndex
		);
		expect(scenes).toEqual([0, 0, 1, 1, 2, 2, 3, 3]);
	});
});

describe('sceneEvents', () => {
	it('puts the wanted scene on at time 0', () => {
		const now = playbackAt(content, sceneEvents(content, uuid(3)), 1000);
		expect([now.sceneIndex, now.sceneSeconds]).toEqual([2, 1]);
	});
	it('names a scene that is not there', () => {
		expect(() => sceneEvents(content, uuid(77))).toThrow(uuid(77));
	});
});
