import { describe, expect, it } from 'vitest';
import { Player } from '../../src/routes/(office)/shows/[id]/preview/Player.svelte';
import { makeContent, makeScene } from '../show/support/content';

/** Three scenes of 60 s, 10 s by itself, and 60 s, with a clock that the test turns. */
function setUp() {
	const clock = { now: 5000 };
	const content = makeContent([
		makeScene(1),
		makeScene(2, { pace: { kind: 'timed', seconds: 10 } }),
		makeScene(3)
	]);
	return { clock, player: new Player(content, () => clock.now) };
}

describe('Player', () => {
	it('plays from where it stands, holds, and goes on', () => {
		const { clock, player } = setUp();
		player.toggle();
		clock.now += 12_000;
		player.look();
		expect(player.position).toBeCloseTo(12, 9);
		player.toggle();
		clock.now += 60_000;
		player.look();
		expect(player.position).toBeCloseTo(12, 9);
		player.toggle();
		clock.now += 50_000;
		expect(player.moment().sceneIndex).toBe(1);
		expect(player.moment().sceneSeconds).toBeCloseTo(2, 6);
	});

	it('seeks to any moment and to scenes, and keeps within the show', () => {
		const { player } = setUp();
		player.seek(65);
		expect([player.playback.sceneIndex, player.playback.sceneSeconds]).toEqual([1, 5]);
		player.toScene(2);
		expect([player.playback.sceneIndex, player.position]).toEqual([2, 70]);
		player.seek(10);
		expect(player.playback.sceneIndex).toBe(0);
		player.seek(1e6);
		expect(player.position).toBe(130);
		player.toScene(-3);
		expect(player.position).toBe(0);
	});

	it('stops at the end and begins again from there', () => {
		const { clock, player } = setUp();
		player.seek(129);
		player.toggle();
		clock.now += 4000;
		player.look();
		expect([player.playing, player.position]).toEqual([false, 130]);
		player.toggle();
		expect([player.playing, player.position]).toEqual([true, 0]);
	});
});
