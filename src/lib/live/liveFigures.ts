import { massModel } from '../dynamics';
import type { Scene } from '../show/document';
import type { EditionContent } from '../show/edition';
import { fillFigures, type FilledPart } from '../show/figures';
import { effectiveModel, sceneSettings, type ControlValues } from '../show/settings';

/** The script of a scene in paragraphs, its figures computed with the live controls as they stand. */
export function liveFigures(
	content: EditionContent,
	scene: Scene,
	controls: ControlValues
): FilledPart[][] {
	const galaxy = scene.subject.kind === 'galaxy' ? content.galaxies[scene.subject.galaxyId] : null;
	const context = galaxy
		? {
				model: massModel(effectiveModel(galaxy.document, sceneSettings(scene, controls))),
				measured: galaxy.measured,
				outerRadius: galaxy.document.look.outerRadius
			}
		: { model: null, measured: [], outerRadius: 1 };
	return scene.script
		.split(/\n\s*\n/)
		.filter((paragraph) => paragraph.trim() !== '')
		.map((paragraph) => fillFigures(paragraph.trim(), context));
}
