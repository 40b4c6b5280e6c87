import { createContext } from 'svelte';
import type { Scene, ShowDocument } from '$lib/show/document';
import type { EditionContent, EditionGalaxy } from '$lib/show/edition';
import {
	changeScene,
	copyScene,
	indexOfScene,
	insertScene,
	moveScene,
	newId,
	newScene,
	orderScenes,
	removeScene
} from '$lib/show/editing';
import { begin, edit, redo, undo, type History } from '$lib/show/editingHistory';
import { findFaults, type Fault } from '$lib/show/freeze';
import { sceneStarts, totalSeconds } from '$lib/show/timing';

export const settingsTabs = [
	'Picture',
	'Motion',
	'Comparison',
	'Drawings',
	'Live controls',
	'Entrance',
	'Pace'
] as const;
export type SettingsTab = (typeof settingsTabs)[number];

export interface ComposerOptions {
	document: ShowDocument;
	galaxies: Record<string, EditionGalaxy>;
	archived: Record<string, string>;
	mayEdit: boolean;
	/** Told of every change of the document. */
	onchange: (document: ShowDocument) => void;
	/** Told of what can be taken back, in words. */
	ontold: (message: string) => void;
}

/** The show under work: its document with undo and redo, and which row is open. */
export class Composer {
	#history: History<ShowDocument>;
	readonly galaxies: Record<string, EditionGalaxy>;
	readonly archived: Record<string, string>;
	readonly mayEdit: boolean;
	readonly #options: ComposerOptions;
	/** False until the page answers: what is pressed before that would be lost. */
	ready = $state(false);
	/** The row that is unfolded. */
	openId = $state<string | null>(null);
	tab = $state<SettingsTab>('Picture');
	/** Row whose title takes the focus when it appears. */
	focusId = $state<string | null>(null);

	readonly document = $derived.by(() => this.#history.present);
	readonly starts = $derived.by(() => sceneStarts(this.#history.present));
	readonly total = $derived.by(() => totalSeconds(this.#history.present));
	readonly undoLabel = $derived.by(() => this.#history.past.at(-1)?.label);
	readonly redoLabel = $derived.by(() => this.#history.future[0]?.label);

	constructor(options: ComposerOptions) {
		this.#options = options;
		this.galaxies = options.galaxies;
		this.archived = options.archived;
		this.mayEdit = options.mayEdit;
		this.#history = $state.raw(begin(options.document));
	}

	galaxyOf(scene: Scene): EditionGalaxy | null {
		return scene.subject.kind === 'galaxy' ? (this.galaxies[scene.subject.galaxyId] ?? null) : null;
	}

	/** One scene as a content of its own: what a row computes from, so that others do not matter. */
	contentOf(scene: Scene): EditionContent {
		return {
			format: 1,
			show: { ...this.document, scenes: [scene] },
			galaxies: this.galaxies
		};
	}

	/** Faults of one scene, numbered as it stands. */
	faultsOf(scene: Scene): Fault[] {
		const { galaxies } = this;
		const show = { ...this.#options.document, scenes: [scene] };
		return findFaults({ format: 1, show, galaxies }, this.archived);
	}

	/** Takes a document as one step that can be undone. Same group in quick succession: one step. */
	change(next: ShowDocument, label: string, group?: string): void {
		if (!this.mayEdit || next === this.document) return;
		this.#set(edit(this.#history, next, { label, group, at: performance.now() }));
	}

	/**
	 * @param words what changes, for the name of the undo step
	 * @param part which field of it: quick changes of one field are one step
	 */
	changeScene(scene: Scene, change: Partial<Scene>, words: string, part = ''): void {
		const next = changeScene(this.document, scene.id, change);
		this.change(next, `Changed ${words} of “${scene.title}”`, `${scene.id} ${words} ${part}`);
	}

	undo(): void {
		const { undoLabel } = this;
		if (!this.mayEdit || !undoLabel) return;
		this.#set(undo(this.#history));
		this.#options.ontold(`Undone: ${undoLabel}`);
	}

	redo(): void {
		const { redoLabel } = this;
		if (!this.mayEdit || !redoLabel) return;
		this.#set(redo(this.#history));
		this.#options.ontold(`Done again: ${redoLabel}`);
	}

	/** A new scene after the given one, or at the end; it takes its picture from the one before. */
	add(after?: string): void {
		const { scenes } = this.document;
		const index = after ? indexOfScene(this.document, after) + 1 : scenes.length;
		const [galaxyId] = Object.keys(this.galaxies);
		const scene = newScene(
			newId(),
			galaxyId ? { kind: 'galaxy', galaxyId } : { kind: 'dark', name: '' },
			scenes[index - 1]
		);
		this.focusId = scene.id;
		this.openId = scene.id;
		this.change(insertScene(this.document, scene, index), `Added scene ${index + 1}`);
	}

	copy(scene: Scene): void {
		this.change(copyScene(this.document, scene.id), `Copied “${scene.title}”`);
	}

	remove(scene: Scene): void {
		this.change(removeScene(this.document, scene.id), `Deleted “${scene.title}”`);
		if (this.openId === scene.id) this.openId = null;
		this.#options.ontold(`Deleted “${scene.title}”`);
	}

	/** @param by −1 up, 1 down @returns the new position, counted from 1, or null where it is the end */
	move(scene: Scene, by: -1 | 1): number | null {
		const from = indexOfScene(this.document, scene.id);
		const next = moveScene(this.document, scene.id, from + by);
		if (next === this.document) return null;
		this.change(next, `Moved “${scene.title}”`, `move ${scene.id}`);
		return from + by + 1;
	}

	order(ids: readonly string[]): void {
		this.change(orderScenes(this.document, ids), 'Moved a scene');
	}

	toggle(id: string): void {
		this.openId = this.openId === id ? null : id;
	}

	#set(history: History<ShowDocument>): void {
		this.#history = history;
		this.#options.onchange(history.present);
	}
}

export const [getComposer, setComposer] = createContext<Composer>();
