import { describe, expect, it } from 'vitest';
import { massModel } from '../../src/lib/dynamics';
import {
	computeFigure,
	fillFigures,
	filledText,
	parseScript,
	quantities
} from '../../src/lib/show/figures';
import { kpcFromLightYears } from '../../src/lib/units';
import { galaxy } from './support/content';

const model = massModel(galaxy.model);
const context = {
	model,
	measured: [
		{ radius: 4, speed: 180, error: 5 },
		{ radius: 12, speed: 220, error: 6 }
	],
	outerRadius: 25
};
const value = (source: string) => {
	const figure = computeFigure(source, context);
	if (!figure.ok) throw new Error(figure.problem);
	return figure.value;
};
const problem = (source: string, in_ = context as Parameters<typeof computeFigure>[1]) => {
	const figure = computeFigure(source, in_);
	return figure.ok ? null : figure.problem;
};

describe('computeFigure', () => {
	it('computes from the model at the radius, in any of the lengths', () => {
		const R = kpcFromLightYears(30_000);
		expect(value('speed at 30 kly')).toBe(model.circularVelocity(R));
		expect(value('speed at 30000 ly')).toBe(model.circularVelocity(R));
		expect(value('Speed from light at 8 kpc')).toBe(model.lit().circularVelocity(8));
		expect(value('escape speed at 8000 pc')).toBe(model.escapeVelocity(8));
		expect(value('unlit to lit inside 8 kpc')).toBeCloseTo(
			model.unlit().enclosedMass(8) / model.lit().enclosedMass(8),
			12
		);
	});

	it('interpolates measured speeds and refuses outside them', () => {
		expect(value('measured speed at 8 kpc')).toBeCloseTo(200, 10);
		expect(value('measured speed at 12 kpc')).toBe(220);
		expect(problem('measured speed at 13 kpc')).toContain('no measured point');
		expect(problem('measured speed at 2 kpc')).toContain('no measured point');
	});

	it('lands near the round figure for one turn: about 230 million years at 230 km/s and 8.6 kpc', () => {
		// 2 pi R / v in million years; the trade's round figure for the Sun is 200 to 250.
		const turn = value('turn time at 8.6 kpc');
		const speed = model.circularVelocity(8.6);
		expect(turn).toBeCloseTo(((2 * Math.PI * 8.6) / speed) * 977.792, 1);
	});

	it.each([
		['spead at 30 kly', 'not a figure this program knows'],
		['speed', 'needs a radius'],
		['speed inside 3 kly', 'needs a radius after “at”'],
		['peak speed at 3 kpc', 'takes no radius'],
		['speed at 30 miles', 'not a length'],
		['speed at 0 kpc', 'above 0'],
		['speed at 1001 kpc', 'at most 1,000 kpc']
	])('says what is wrong with %s', (source, words) => {
		expect(problem(source)).toContain(words);
	});

	it('says so where there is no galaxy', () => {
		expect(problem('peak speed', { ...context, model: null })).toContain('no galaxy');
	});

	it('computes every quantity it lists', () => {
		for (const quantity of quantities) {
			const source = quantity.join ? `${quantity.name} ${quantity.join} 8 kpc` : quantity.name;
			expect(value(source), source).toBeGreaterThan(0);
		}
	});
});

describe('fillFigures', () => {
	it('keeps the words and the order', () => {
		const parts = fillFigures('At the rim {speed at 20 kpc}. Why {so}?', context);
		expect(parts.map((p) => p.kind)).toEqual(['words', 'figure', 'words', 'figure', 'words']);
	});
	it('leaves a lone brace as words', () => {
		expect(parseScript('a { b } {speed at 1 kpc')).toEqual([
			{ kind: 'words', text: 'a ' },
			{ kind: 'figure', source: 'b' },
			{ kind: 'words', text: ' {speed at 1 kpc' }
		]);
	});
	it('puts a dash where a figure cannot be computed', () => {
		expect(filledText('about {nothing}.', context)).toBe('about –.');
	});
});
