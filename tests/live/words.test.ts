import { describe, expect, it } from 'vitest';
import { controlNumber, controlUnit } from '../../src/lib/live/controlWords';
import { eventWords } from '../../src/lib/live/eventWords';
import { showTimes } from '../../src/lib/live/showTimes';
import { playbackAt } from '../../src/lib/show/playback';
import type { LiveControl } from '../../src/lib/show/document';
import { events, makeContent, makeScene, uuid } from '../show/support/content';

const halo: LiveControl = {
	id: uuid(5),
	label: 'Halo',
	target: { kind: 'halo-factor' },
	min: 0,
	max: 2,
	rest: 1
};
const scale: LiveControl = {
	...halo,
	id: uuid(6),
	label: 'Halo size',
	target: { kind: 'parameter', componentId: 'halo', parameter: 'scaleRadius' }
};
const content = makeContent([makeScene(1), makeScene(2, { controls: [halo, scale] })]);

describe('showTimes', () => {
	const at = (seconds: number, ...list: Parameters<typeof events>) =>
		showTimes(playbackAt(content, events([0, { kind: 'begin' }], ...list), seconds * 1000));

	it('says on time, behind and ahead in words', () => {
		expect(at(30)).toMatchObject({ elapsed: '0:30', planned: '0:30', words: 'on time' });
		expect(at(140)).toMatchObject({ planned: '1:00', words: '1:20 behind', state: 'behind' });
		expect(at(30, [20_000, { kind: 'advance', from: uuid(1) }])).toMatchObject({
			elapsed: '0:30',
			planned: '1:10',
			words: '0:40 ahead',
			scene: '0:10',
			sceneExpected: '1:00',
			total: '2:00'
		});
	});
});

describe('controlUnit', () => {
	it('names the unit of what a control moves', () => {
		const [, scene] = content.show.scenes;
		expect(controlUnit(content, scene, halo)).toBe('times');
		expect(controlUnit(content, scene, scale)).toBe('kpc');
		expect(controlUnit(content, scene, { ...halo, target: { kind: 'rate' } })).toBe(
			'million years a second'
		);
	});

	it('writes three digits and no remains of zero', () => {
		expect(controlNumber(halo, 1.23456)).toBe('1.23');
		expect(controlNumber(halo, 1e-17)).toBe('0');
	});
});

describe('eventWords', () => {
	it('says what others did with their names and what the reader did without', () => {
		const [advance, control] = events(
			[0, { kind: 'advance', from: uuid(1) }],
			[1, { kind: 'control', scene: uuid(2), control: halo.id, value: 0.5 }]
		);
		expect(eventWords(content, { ...advance, actor: 'Petra' }, 'Petra')).toBe('On to Scene 2.');
		expect(eventWords(content, { ...control, actor: 'Maren' }, 'Petra')).toBe('Halo 0.5 (Maren).');
	});
});
