import { describe, expect, it } from 'vitest';
import {
	fieldInSafeBand,
	layOutDrawings,
	letterHeight,
	overlap,
	wrapWords
} from '../../src/lib/picture/drawings';
import { spreadLabels } from '../../src/lib/picture/drawings/drawChart';
import type { TextStyle } from '../../src/lib/picture/drawings/FilmPen';
import { labelPoints, ringDirections } from '../../src/lib/picture/drawings/rings';
import type { Drawings, View } from '../../src/lib/picture/frame';

/** As wide as the mono face: its letters are 0.6 of the font size, its capitals 0.67. */
const width = (text: string, style: TextStyle) => (text.length * style.height * 0.6) / 0.67;
const words =
	'Measured by the light of its gas this wheel turns at 213 km/s as far out as anybody can see it, and nobody in this room knows why it should, nor does anybody else.';
const chart = { maxRadius: 25, maxSpeed: 300, curves: [], points: [] };
const full: Drawings = {
	rings: [
		{ radius: 8, label: '26,000 light years' },
		{ radius: 9, label: '29,000 light years' },
		{ radius: 20, label: '65,000 light years' }
	],
	name: 'The Great Wheel above Harrow',
	caption: words,
	scale: [0, 250],
	halves: ['without halo', 'with halo']
};
const dark: Drawings = { rings: [], title: `A long dark title ${words}`, caption: words };
const views: View[] = [0, 40, 75, 90].flatMap((inclination) =>
	[22, 45, 90].map((distance) => ({ distance, inclination, turn: 35, centreAltitude: 42 }))
);

function layOut(drawings: Drawings, filmSize: number, view: View) {
	const rings = drawings.rings.map(({ radius }) => labelPoints(ringDirections(view, radius)));
	return layOutDrawings(drawings, filmSize, width, rings);
}

describe('layOutDrawings', () => {
	const cases = [
		['without a chart', full],
		['with a chart', { ...full, chart }],
		['of a dark scene', dark]
	] as const;
	it.each(cases)('keeps all words %s inside the safe band and off each other', (_, drawings) => {
		for (const filmSize of [1024, 2048, 4096]) {
			for (const view of views) {
				const made = layOut(drawings, filmSize, view);
				const fields = made.words.map(({ text, field }) => ({ text, field }));
				if (drawings.chart) fields.push({ text: '(chart)', field: made.chartGround });
				if (drawings.scale) fields.push({ text: '(scale)', field: made.scale });
				fields.forEach(({ text, field }, i) => {
					expect(fieldInSafeBand(field), `${text} ${JSON.stringify(field)}`).toBe(true);
					for (const other of fields.slice(i + 1))
						expect(overlap(field, other.field), `“${text}” on “${other.text}”`).toBe(false);
				});
			}
		}
	});

	it('gives every ring of a usual view its label', () => {
		const view = { distance: 45, inclination: 40, turn: -20, centreAltitude: 45 };
		for (const drawings of [full, { ...full, chart }]) {
			const said = layOut(drawings, 2048, view).words.map(({ text }) => text);
			expect(said).toEqual(expect.arrayContaining(full.rings.map(({ label }) => label)));
		}
	});

	it('leaves everything else where it is when the caption grows', () => {
		const [short, long] = ['One line.', words].map((caption) =>
			layOut({ ...full, rings: [], caption }, 2048, views[0])
		);
		const without = ({ words }: typeof short) =>
			words.filter(({ style, at }) => style.height !== 1.5 || at.altitude > 20);
		expect(without(long)).toEqual(without(short));
		expect(without(short).length).toBe(5);
	});

	it('leaves out a ring that lies outside the safe band', () => {
		const view = { distance: 45, inclination: 0, turn: 0, centreAltitude: 85 };
		const drawings = { rings: [{ radius: 2, label: 'near the zenith' }] };
		expect(layOut(drawings, 2048, view).words).toEqual([]);
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
	it('cuts a single word that is wider than the line', () => {
		expect(wrapWords('supernova of 1054', 6, 1, width)).toEqual(['super…']);
	});
	it('gives no line for no words', () => {
		expect(wrapWords('  ', 9, 2, width)).toEqual([]);
	});
});

describe('spreadLabels', () => {
	it('pushes names apart and keeps their order', () => {
		expect(spreadLabels([10, 10.5, 30], 2, 0, 40)).toEqual([10, 12, 30]);
		expect(spreadLabels([11, 10], 2, 0, 40)).toEqual([12, 10]);
	});
	it('keeps names between the foot and the head of the chart', () => {
		expect(spreadLabels([33, 33, 33], 2, 16, 33)).toEqual([29, 31, 33]);
		expect(spreadLabels([16, 10], 2, 16, 33)).toEqual([18, 16]);
	});
});
