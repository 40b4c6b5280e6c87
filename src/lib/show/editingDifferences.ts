import type { Scene, ShowDocument } from './document';
import { canonicalJson } from './hash';

/** One scene of two versions of a show, or the show's own details where `sceneId` is null. */
export interface Difference {
	sceneId: string | null;
	kind: 'same' | 'differs' | 'only-mine' | 'only-theirs';
	mineNumber: number | null;
	theirsNumber: number | null;
	title: string;
	/** What differs, in words; empty where nothing does. */
	words: string[];
}

const sceneWords: Record<Exclude<keyof Scene, 'id'>, string> = {
	title: 'title',
	pace: 'pace',
	subject: 'galaxy',
	mix: 'halo and stars',
	comparison: 'comparison',
	motion: 'motion',
	view: 'view',
	colour: 'colours',
	drawings: 'drawings',
	script: 'script',
	note: 'note',
	controls: 'live controls',
	entrance: 'entrance'
};

const showWords = {
	title: 'title',
	audience: 'audience',
	summary: 'summary',
	targetMinutes: 'target length',
	seed: 'sky'
} satisfies Partial<Record<keyof ShowDocument, string>>;

export const sameValue = (a: unknown, b: unknown): boolean =>
	a === b || canonicalJson(a) === canonicalJson(b);

function differing<T extends object>(a: T, b: T, words: Partial<Record<keyof T, string>>) {
	return (Object.keys(words) as (keyof T)[]).flatMap((key) =>
		sameValue(a[key], b[key]) ? [] : [words[key] ?? String(key)]
	);
}

/**
 * Two versions of one show, scene by scene in the order of mine, then what only theirs has.
 * First the show's own details, where they differ.
 */
export function compareDocuments(mine: ShowDocument, theirs: ShowDocument): Difference[] {
	const details = differing(mine, theirs, showWords);
	const theirIndex = new Map(theirs.scenes.map((scene, i) => [scene.id, i]));
	const myIds = new Set(mine.scenes.map((scene) => scene.id));
	// A scene has moved only in relation to those that both versions have.
	const shared = (document: ShowDocument, other: { has(id: string): boolean }) =>
		document.scenes.filter((scene) => other.has(scene.id)).map((scene) => scene.id);
	const order = shared(theirs, myIds);
	const place = new Map(shared(mine, theirIndex).map((id, i) => [id, i]));

	const rows: Difference[] = mine.scenes.map((scene, i) => {
		const at = theirIndex.get(scene.id);
		const other = at === undefined ? undefined : theirs.scenes[at];
		if (at === undefined || !other) {
			return {
				sceneId: scene.id,
				kind: 'only-mine',
				mineNumber: i + 1,
				theirsNumber: null,
				title: scene.title,
				words: []
			};
		}
		const words = differing(scene, other, sceneWords);
		if (order[place.get(scene.id) ?? -1] !== scene.id) words.push('place in the show');
		return {
			sceneId: scene.id,
			kind: words.length > 0 ? 'differs' : 'same',
			mineNumber: i + 1,
			theirsNumber: at + 1,
			title: scene.title,
			words
		};
	});
	theirs.scenes.forEach((scene, i) => {
		if (myIds.has(scene.id)) return;
		rows.push({
			sceneId: scene.id,
			kind: 'only-theirs',
			mineNumber: null,
			theirsNumber: i + 1,
			title: scene.title,
			words: []
		});
	});
	if (details.length === 0) return rows;
	return [
		{
			sceneId: null,
			kind: 'differs',
			mineNumber: null,
			theirsNumber: null,
			title: mine.title,
			words: details
		},
		...rows
	];
}
