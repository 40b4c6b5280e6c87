import { describe, expect, it } from 'vitest';
import { begin, edit, groupMs, redo, stepsKept, undo } from '../../src/lib/show/editingHistory';

const typing = (at: number) => ({ label: 'Typed', group: 'script 1', at });

describe('editingHistory', () => {
	it('undo and redo walk through every step and keep its label', () => {
		let history = begin('a');
		history = edit(history, 'b', { label: 'to b', at: 0 });
		history = edit(history, 'c', { label: 'to c', at: 1 });
		expect(history.past.at(-1)?.label).toBe('to c');
		history = undo(history);
		expect([history.present, history.future[0].label]).toEqual(['b', 'to c']);
		history = undo(history);
		expect(history.present).toBe('a');
		expect(undo(history)).toBe(history);
		history = redo(redo(history));
		expect(history.present).toBe('c');
		expect(redo(history)).toBe(history);
	});

	it('typing without a pause is one step, and a pause begins another', () => {
		let history = begin('');
		history = edit(history, 'g', typing(0));
		history = edit(history, 'ga', typing(400));
		history = edit(history, 'gal', typing(400 + groupMs));
		expect(history.past).toHaveLength(1);
		history = edit(history, 'gala', typing(401 + 2 * groupMs));
		expect(history.past).toHaveLength(2);
		expect(undo(history).present).toBe('gal');
	});

	it('another field and an undo end a group', () => {
		let history = begin('');
		history = edit(history, 'a', typing(0));
		history = edit(history, 'b', { label: 'Typed', group: 'script 2', at: 1 });
		expect(history.past).toHaveLength(2);
		history = undo(history);
		history = edit(history, 'c', typing(2));
		expect(history.past.map((step) => step.value)).toEqual(['', 'a']);
	});

	it('a new step forgets what was undone', () => {
		let history = edit(begin(1), 2, { label: '', at: 0 });
		history = edit(undo(history), 3, { label: '', at: 1 });
		expect(redo(history)).toBe(history);
	});

	it('edit with the present value is no step', () => {
		const history = begin(1);
		expect(edit(history, 1, { label: '', at: 0 })).toBe(history);
	});

	it('only the last steps are kept', () => {
		let history = begin(0);
		for (let i = 1; i <= stepsKept + 20; i++) history = edit(history, i, { label: '', at: i });
		expect(history.past).toHaveLength(stepsKept);
		expect(history.past[0].value).toBe(20);
	});
});
