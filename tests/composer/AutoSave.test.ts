import { describe, expect, it, vi } from 'vitest';
import { makeContent, makeScene } from '../show/support/content';
import { AutoSave, type Conflict } from '../../src/lib/components/saving/AutoSave.svelte';
import type { Draft, KeptDraft } from '../../src/lib/components/saving/drafts';
import type { SaveAnswer } from '../../src/lib/components/saving/saveDocument';
import type { ShowDocument } from '../../src/lib/show/document';

const first = makeContent([makeScene(1)]).show;
const version = (summary: string): ShowDocument => ({ ...first, summary });

/** An AutoSave over a server that answers what the test puts in `answers`, else takes every save. */
function setUp() {
	const sent: { base: number; summary: string }[] = [];
	const answers: SaveAnswer[] = [];
	const kept: { draft: Draft | null } = { draft: null };
	const saving = new AutoSave({
		document: first,
		revision: 4,
		at: '2026-12-01T14:00:00.000Z',
		delay: 0,
		retry: 20,
		send: async (base, document) => {
			sent.push({ base, summary: document.summary });
			const revision = base + 1;
			return answers.shift() ?? { kind: 'saved', revision, at: `revision ${revision}` };
		},
		drafts: {
			write: (draft) => (kept.draft = draft),
			read: (): KeptDraft | null => null,
			remove: () => (kept.draft = null)
		}
	});
	return { saving, sent, answers, kept };
}

describe('AutoSave', () => {
	it('sends what stands after the pause and goes on from the new revision', async () => {
		const { saving, sent, kept } = setUp();
		saving.schedule(version('a'));
		saving.schedule(version('ab'));
		expect(saving.status.kind).toBe('waiting');
		expect(kept.draft?.document.summary).toBe('ab');
		await vi.waitFor(() => expect(saving.status).toEqual({ kind: 'saved', at: 'revision 5' }));
		expect(sent).toEqual([{ base: 4, summary: 'ab' }]);
		expect(kept.draft).toBeNull();
		saving.schedule(version('abc'));
		expect(await saving.flush()).toBe(true);
		expect(sent.at(-1)).toEqual({ base: 5, summary: 'abc' });
	});

	it('a change during a save is sent after it, one save at a time', async () => {
		const { saving, sent } = setUp();
		saving.schedule(version('a'));
		const running = saving.flush();
		saving.schedule(version('b'));
		await Promise.all([running, saving.flush()]);
		expect(sent).toEqual([
			{ base: 4, summary: 'a' },
			{ base: 5, summary: 'b' }
		]);
		expect(saving.unsaved).toBe(false);
	});

	it('a failed save keeps the draft, says why, and can be tried again', async () => {
		const { saving, sent, answers, kept } = setUp();
		answers.push({ kind: 'failed', why: 'The server cannot be reached.' });
		saving.schedule(version('a'));
		expect(await saving.flush()).toBe(false);
		expect(saving.status).toEqual({ kind: 'failed', why: 'The server cannot be reached.' });
		expect(kept.draft).toEqual({ baseRevision: 4, document: version('a') });
		expect(await saving.flush()).toBe(true);
		expect(sent).toHaveLength(2);
		expect(kept.draft).toBeNull();
	});

	it('a failed save is tried again by itself', async () => {
		const { saving, answers, sent } = setUp();
		answers.push({ kind: 'failed', why: 'The server cannot be reached.' });
		saving.schedule(version('a'));
		await vi.waitFor(() => expect(saving.status.kind).toBe('saved'));
		expect(sent).toHaveLength(2);
	});

	it('a conflict stops saving until it is settled, and the draft stays', async () => {
		const { saving, sent, answers, kept } = setUp();
		const conflict: Conflict = { theirs: version('theirs'), revision: 9, by: 'Pia', at: 'now' };
		answers.push({ kind: 'conflict', conflict });
		saving.schedule(version('mine'));
		await saving.flush();
		expect(saving.status).toEqual({ kind: 'conflict', conflict });
		saving.schedule(version('mine and more'));
		expect(await saving.flush()).toBe(false);
		expect(sent).toHaveLength(1);
		expect(kept.draft?.document.summary).toBe('mine and more');
		saving.rebase(9, conflict.theirs, 'now');
		saving.schedule(version('mine and more'));
		expect(await saving.flush()).toBe(true);
		expect(sent.at(-1)).toEqual({ base: 9, summary: 'mine and more' });
	});

	it('a draft that is brought back saves from the revision it began from', async () => {
		const { saving, sent } = setUp();
		saving.resume({ baseRevision: 2, document: version('old work') });
		await saving.flush();
		expect(sent).toEqual([{ base: 2, summary: 'old work' }]);
	});
});
