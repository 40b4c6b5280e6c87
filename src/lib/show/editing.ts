import { documentVersion, type LiveControl, type Scene, type ShowDocument } from './document';

/**
 * Changes to a show document as pure functions: each takes a document and answers a new one that
 * shares what did not change. Positions are counted from 0.
 */

/**
 * A version 4 UUID (RFC 9562). `crypto.randomUUID` exists in secure contexts only, and a venue may
 * serve the office over plain HTTP inside its house.
 */
export function newId(): string {
	const bytes = crypto.getRandomValues(new Uint8Array(16));
	bytes[6] = (bytes[6] & 0x0f) | 0x40;
	bytes[8] = (bytes[8] & 0x3f) | 0x80;
	const hex = Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
	return hex.replace(/^(.{8})(.{4})(.{4})(.{4})(.{12})$/, '$1-$2-$3-$4-$5');
}

/** A show with nothing in it yet. @param seed of its sky, 1 to 2147483647 */
export const newDocument = (title: string, seed: number): ShowDocument => ({
	version: documentVersion,
	title,
	audience: 'mixed family',
	summary: '',
	targetMinutes: 25,
	seed,
	scenes: []
});

/** A scene as people meet it first. It takes picture and motion from the scene before it. */
export function newScene(
	id: string,
	subject: Scene['subject'],
	before: Scene | undefined = undefined
): Scene {
	return {
		id,
		title: 'New scene',
		pace: { kind: 'presenter', expectedSeconds: 60 },
		subject: before?.subject ?? subject,
		mix: before?.mix ?? { haloFactor: 1, starFactor: 1 },
		comparison: 'none',
		motion: before ? { ...before.motion, begin: 'go-on' } : { rate: 3, begin: 'fresh' },
		view: before?.view ?? { distance: 60, inclination: 40, turn: 0, centreAltitude: 40 },
		colour: before?.colour ?? 'light',
		drawings: {
			chart: false,
			chartLit: true,
			chartTotal: true,
			chartMeasured: true,
			rings: [],
			name: false,
			scale: false,
			caption: ''
		},
		script: '',
		note: '',
		controls: [],
		entrance: { kind: 'fade', seconds: 3 }
	};
}

export const indexOfScene = (document: ShowDocument, id: string): number =>
	document.scenes.findIndex((scene) => scene.id === id);

/** @param index where the scene will stand; beyond the end means at the end */
export const insertScene = (document: ShowDocument, scene: Scene, index: number): ShowDocument => ({
	...document,
	scenes: document.scenes.toSpliced(index, 0, scene)
});

/** A copy right after the scene, with ids of its own; the document itself where there is none. */
export function copyScene(
	document: ShowDocument,
	id: string,
	makeId: () => string = newId
): ShowDocument {
	const index = indexOfScene(document, id);
	if (index < 0) return document;
	const scene = document.scenes[index];
	const copy: Scene = {
		...scene,
		id: makeId(),
		title: `${scene.title} (copy)`.slice(0, 120),
		controls: scene.controls.map((control) => ({ ...control, id: makeId() }))
	};
	return insertScene(document, copy, index + 1);
}

export const removeScene = (document: ShowDocument, id: string): ShowDocument => ({
	...document,
	scenes: document.scenes.filter((scene) => scene.id !== id)
});

/** Moves a scene to a position, kept within the list. */
export function moveScene(document: ShowDocument, id: string, to: number): ShowDocument {
	const from = indexOfScene(document, id);
	const target = Math.min(document.scenes.length - 1, Math.max(0, to));
	if (from < 0 || from === target) return document;
	const scenes = document.scenes.toSpliced(from, 1);
	scenes.splice(target, 0, document.scenes[from]);
	return { ...document, scenes };
}

/** The scenes in the order of `ids`, as after a drag; refused where it is not the same set. */
export function orderScenes(document: ShowDocument, ids: readonly string[]): ShowDocument {
	const byId = new Map(document.scenes.map((scene) => [scene.id, scene]));
	const scenes = ids.flatMap((id) => byId.get(id) ?? []);
	const whole = scenes.length === document.scenes.length && new Set(ids).size === ids.length;
	const moved = scenes.some((scene, i) => scene !== document.scenes[i]);
	return whole && moved ? { ...document, scenes } : document;
}

export function changeScene(
	document: ShowDocument,
	id: string,
	change: Partial<Scene>
): ShowDocument {
	return {
		...document,
		scenes: document.scenes.map((scene) => (scene.id === id ? { ...scene, ...change } : scene))
	};
}

export const changeControl = (
	scene: Scene,
	id: string,
	change: Partial<LiveControl>
): LiveControl[] =>
	scene.controls.map((control) => (control.id === id ? { ...control, ...change } : control));
