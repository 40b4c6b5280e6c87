import { describe, expect, it } from 'vitest';
import { inSafeBand } from '../../src/lib/dome';
import { drawingsLayout, wrapWords } from '../../src/lib/picture/drawings';
import { spreadLabels } from '../../src/lib/picture/drawings/drawChart';
import { letterHeight } from '../../src/lib/picture/drawings/FilmPen';

describe('drawingsLayout', () => {
	it.each([
		[2048, true],
		[2048, false],
		[4096, true]
	])('keeps everything on a film of %d inside the safe band', (filmSize, withChart) => {
		const { chart, caption, name, scale, halves, title } = drawingsLayout(filmSize, withChart);
		const corners = [chart, scale].flatMap(({ left, right, foot, head }) => [
			{ azimuth: left, altitude: foot },
			{ azimuth: right, altitude: head }
		]);
		const places = [
			...corners,
			name,
			title,
			{ altitude: caption.altitude, azimuth: caption.azimuth - caption.widest / 2 },
			{ altitude: caption.altitude, azimuth: caption.azimuth + caption.widest / 2 },
			{ ...halves, azimuth: -halves.azimuth },
			halves
		];
		for (const place of places) expect(inSafeBand(place), JSON.stringify(place)).toBe(true);
	});
	it('writes capitals of 1.5° below 4,096 pixels and 1° from there', () => {
		expect([1024, 2048, 3600, 4096, 8192].map(letterHeight)).toEqual([1.5, 1.5, 1.5, 1, 1]);
	});
});

describe('wrapWords', () => {
	const width = (line: string) => line.length;
	it('breaks at words', () => {
		expect(wrapWords('one two three four', 9, 3, width)).toEqual(['one two', 'three', 'four']);
	});
	it('ends what does not fit in an ellipsis', () => {
		expect(wrapWords('one two three four five', 9, 2, width)).toEqual(['one two', 'three …']);
	});
	it('gives no line for no words', () => {
		expect(wrapWords('  ', 9, 2, width)).toEqual([]);
	});
});

describe('spreadLabels', () => {
	it('pushes names apart and keeps their order', () => {
		expect(spreadLabels([10, 10.5, 30], 2)).toEqual([10, 12, 30]);
		expect(spreadLabels([11, 10], 2)).toEqual([12, 10]);
	});
});
