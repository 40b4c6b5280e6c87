import { describe, expect, it } from 'vitest';
import { changeScene, insertScene, moveScene, removeScene } from '../../src/lib/show/editing';
import { compareDocuments } from '../../src/lib/show/editingDifferences';
import { makeContent, makeScene, uuid } from './support/content';

const base = makeContent([1, 2, 3].map((n) => makeScene(n))).show;
const told = (mine: typeof base, theirs: typeof base) =>
	compareDocuments(mine, theirs)
		.filter((row) => row.kind !== 'same')
		.map((row) => [row.sceneId, row.kind, row.words.join(', ')]);

describe('compareDocuments', () => {
	it('finds nothing between equal documents that share no object', () => {
		expect(told(base, structuredClone(base))).toEqual([]);
		expect(compareDocuments(base, structuredClone(base))).toHaveLength(3);
	});

	it('names the fields that differ in a scene', () => {
		const mine = changeScene(base, uuid(2), { script: 'Look.', colour: 'speed' });
		expect(told(mine, base)).toEqual([[uuid(2), 'differs', 'colours, script']]);
	});

	it('names scenes that one side alone has, without calling the others moved', () => {
		const mine = removeScene(base, uuid(1));
		const theirs = insertScene(base, makeScene(9), 1);
		expect(told(mine, theirs)).toEqual([
			[uuid(1), 'only-theirs', ''],
			[uuid(9), 'only-theirs', '']
		]);
		expect(told(theirs, mine)).toEqual([
			[uuid(1), 'only-mine', ''],
			[uuid(9), 'only-mine', '']
		]);
	});

	it('says which scenes stand elsewhere', () => {
		expect(told(moveScene(base, uuid(3), 1), base)).toEqual([
			[uuid(3), 'differs', 'place in the show'],
			[uuid(2), 'differs', 'place in the show']
		]);
	});

	it("puts the show's own details first", () => {
		const rows = compareDocuments({ ...base, title: 'Mine', targetMinutes: 12 }, base);
		expect(rows[0]).toMatchObject({ sceneId: null, words: ['title', 'target length'] });
	});
});
