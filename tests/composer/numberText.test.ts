import { describe, expect, it } from 'vitest';
import { sceneRanges, type NumberRange } from '../../src/lib/show/editingControls';
import {
	fromSlider,
	numberText,
	parseNumber,
	sliderSteps,
	toSlider
} from '../../src/lib/components/settings/numberText';

describe('numberText', () => {
	it('shows and reads the same number', () => {
		for (const value of [0, 1, -3.5, 0.004, 123456, 8.53702e6, 1e10, 2.5e-7]) {
			expect([value, parseNumber(numberText(value))]).toEqual([value, value]);
		}
	});

	it('reads a comma, a true minus and blanks, and nothing that is not a number', () => {
		expect(parseNumber(' 1 200,5 ')).toBe(1200.5);
		expect(parseNumber('−4')).toBe(-4);
		expect(parseNumber('2e9')).toBe(2e9);
		for (const text of ['', 'ten', '1.2.3', '4 kpc', 'Infinity', '0x10', '--1']) {
			expect([text, parseNumber(text)]).toEqual([text, NaN]);
		}
	});

	it('the slider reaches both ends and comes back to where it was, linear and by ratio', () => {
		const ranges: NumberRange[] = Object.values(sceneRanges);
		for (const range of ranges) {
			expect([range.label, fromSlider(range, 0)]).toEqual([range.label, range.sliderMin]);
			expect([range.label, fromSlider(range, sliderSteps(range))]).toEqual([
				range.label,
				range.sliderMax
			]);
			for (const step of [1, Math.floor(sliderSteps(range) / 2)]) {
				expect([range.label, toSlider(range, fromSlider(range, step))]).toEqual([
					range.label,
					step
				]);
			}
		}
	});

	it('values outside the slider stand at its ends', () => {
		expect(toSlider(sceneRanges.rate, 100)).toBe(sliderSteps(sceneRanges.rate));
		expect(toSlider(sceneRanges.inclination, 170)).toBe(sliderSteps(sceneRanges.inclination));
	});
});
