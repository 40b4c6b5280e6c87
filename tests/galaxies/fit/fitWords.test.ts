import { describe, expect, it } from 'vitest';
import {
	chiSquaredWords,
	fitQuality,
	number,
	valueWithError
} from '../../../src/routes/(office)/galaxies/tuning/fit/fitWords';

describe('words of a fit', () => {
	it.each([
		[15.1282, 1.4871, 'kpc', '15.1 ± 1.5 kpc'],
		[13664200, 2203000, 'Msun/kpc³', '(1.37 ± 0.22) × 10⁷ Msun/kpc³'],
		[0.56157, 0.12714, '', '0.56 ± 0.13'],
		[215.36, 12.7, 'km/s', '215 ± 13 km/s'],
		[0.0001234, 0.0000056, '', '(1.234 ± 0.056) × 10⁻⁴'],
		[12, null, 'kpc', '12 kpc'],
		[12, 0, 'kpc', '12 kpc']
	])('%d ± %d %s is %s', (value, error, unit, words) => {
		expect(valueWithError(value, error, unit)).toBe(words);
	});
	it('shows a number without needless digits and nothing where there is none', () => {
		expect([7e9, 0.45, 24.5312, 0, NaN, -3.2e-7].map((value) => number(value))).toEqual([
			'7 × 10⁹',
			'0.45',
			'24.53',
			'0',
			'–',
			'-3.2 × 10⁻⁷'
		]);
	});
	it('says χ² for each degree of freedom where there is one', () => {
		expect(chiSquaredWords(24.53, 26, 2)).toBe(
			'χ² 24.53 at 26 points, 1.02 for each of 24 degrees of freedom'
		);
		expect(chiSquaredWords(3, 3, 3)).toBe('χ² 3 at 3 points');
	});
	it('calls a bad fit bad and a good one good', () => {
		expect(fitQuality(1.02)).toMatch(/as closely as their errors allow/);
		expect(fitQuality(40)).toMatch(/not a description of this galaxy/);
		expect(fitQuality(0.1)).toMatch(/errors may be too large/);
		expect(fitQuality(NaN)).toMatch(/nothing is tested/);
	});
});
