import { massModel, ParameterError } from '../dynamics';
import { hasStars } from '../starfield';
import type { Scene } from './document';
import type { EditionContent, EditionGalaxy } from './edition';
import { effectiveModel, sceneSettings } from './settings';

/** Whether a scene's picture can be painted: its galaxy is there, computable, and has stars. */
export function isPlayable(
	scene: Scene,
	galaxies: Readonly<Record<string, EditionGalaxy>>
): boolean {
	if (scene.subject.kind === 'dark') return true;
	const galaxy = galaxies[scene.subject.galaxyId];
	if (!galaxy) return false;
	try {
		massModel(galaxy.document.model);
		massModel(effectiveModel(galaxy.document, sceneSettings(scene, {})));
	} catch (thrown) {
		if (thrown instanceof ParameterError) return false;
		throw thrown;
	}
	return hasStars(galaxy.document.model);
}

/**
 * A show under work as a preview can play it: a scene that cannot be painted becomes a dark sky that
 * says so. What is frozen never needs this, since freezing refuses such scenes.
 */
export const playableContent = (content: EditionContent): EditionContent => ({
	...content,
	show: {
		...content.show,
		scenes: content.show.scenes.map((scene) =>
			isPlayable(scene, content.galaxies)
				? scene
				: { ...scene, subject: { kind: 'dark', name: 'This galaxy cannot be shown' } }
		)
	}
});
