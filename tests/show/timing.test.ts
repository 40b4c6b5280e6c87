import { describe, expect, it } from 'vitest';
import { clockText, sceneStarts } from '../../src/lib/show/timing';
import { makeContent, makeScene } from './support/content';

describe('clockText', () => {
	it.each([
		[0, '0:00'],
		[250, '4:10'],
		[-5, '-0:05'],
		[-0.2, '0:00'],
		[3723, '1:02:03'],
		[59.6, '1:00']
	])('writes %d seconds as %s', (seconds, text) => {
		expect(clockText(seconds)).toBe(text);
	});
});

describe('sceneStarts', () => {
	it('adds the expected seconds before each scene', () => {
		const { show } = makeContent([
			makeScene(1),
			makeScene(2, { pace: { kind: 'timed', seconds: 7 } }),
			makeScene(3)
		]);
		expect(sceneStarts(show)).toEqual([0, 60, 67]);
	});
});
