import type { DomeGeometry } from '../dome/types';
import type { ShowPicture } from '../picture/showPicture';
import { playbackAt, sceneEvents } from '../show/playback';

/**
 * Samples the stars of every galaxy of the edition before its scene comes, one galaxy a turn, so
 * that no scene begins with a wait.
 * @returns the function that stops it
 */
export function warmPicture(picture: ShowPicture, geometry: DomeGeometry): () => void {
	const scenes = picture.content.show.scenes.filter(
		({ subject }, i, all) =>
			subject.kind === 'galaxy' &&
			all.findIndex(
				(other) => other.subject.kind === 'galaxy' && other.subject.galaxyId === subject.galaxyId
			) === i
	);
	const next = () => {
		const scene = scenes.shift();
		if (!scene) return;
		// A copy of the content keeps the playback of the real run out of this.
		const content = { ...picture.content };
		// Well past any entrance, so that the scene itself is asked for.
		picture.frameAt(playbackAt(content, sceneEvents(content, scene.id), 60_000), geometry);
		timer = setTimeout(next, 50);
	};
	let timer = setTimeout(next, 50);
	return () => clearTimeout(timer);
}
