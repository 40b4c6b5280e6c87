import { describe, expect, it } from 'vitest';
import { significant, wordsFor } from '../../src/lib/show/figureWords';

describe('wordsFor', () => {
	it.each([
		['mass', 9.512e10, '95 billion Suns', '9.512e+10 Msun'],
		['mass', 9.99e11, '1 trillion Suns', '9.990e+11 Msun'],
		['mass', 4.3e6, '4.3 million Suns', '4.300e+6 Msun'],
		['mass', 0, 'nothing', '0.000 Msun'],
		['speed', 211.6, '212 km/s', '211.6 km/s'],
		['speed', Infinity, 'without limit', 'no limit'],
		['time', 233.4, '230 million years', '233.4 Myr'],
		['time', 1234, '1.2 billion years', '1234 Myr'],
		['time', Infinity, 'for ever', 'no limit'],
		['ratio', 5.44, '5.4 times', '5.440']
	] as const)('says %s %d as %s', (kind, value, words, exact) => {
		expect(wordsFor(kind, value)).toEqual({ words, exact });
	});
});

describe('significant', () => {
	it.each([
		[95.2, '95'],
		[0.123, '0.12'],
		[1234, '1,200'],
		[0, '0'],
		[-5.66, '-5.7']
	])('writes %d to two digits as %s', (value, text) => {
		expect(significant(value, 2)).toBe(text);
	});
});
