import { massModel, ParameterError } from '../dynamics';
import { rangeWords } from '../dynamics/rangeWords';
import type { MassModel } from '../dynamics/types';
import { hasStars } from '../starfield';
import type { LiveControl, Scene } from './document';
import type { EditionContent, EditionGalaxy } from './edition';
import { controlRange, targetKey } from './editingControls';
import { fillFigures } from './figures';
import { effectiveModel, limitValues, sceneSettings, type ControlValues } from './settings';

/** Why a show cannot be frozen, and what to do about it. */
export interface Fault {
	/** Null where the fault is the show's and not one scene's. */
	sceneId: string | null;
	/** 1, 2, 3 …; null as above. */
	sceneNumber: number | null;
	sceneTitle: string;
	/** What is wrong, in one sentence. */
	what: string;
	/** What to do next, in one sentence. */
	remedy: string;
}

type Finding = Pick<Fault, 'what' | 'remedy'>;

/**
 * Everything that keeps a show from being frozen; empty where it can be. The composer shows these
 * on its rows and freezing refuses with the same list.
 * @param content with the galaxies that can be used; one that is missing here is broken
 * @param archived names of galaxies that are in the venue but archived, by id
 */
export function findFaults(
	content: EditionContent,
	archived: Readonly<Record<string, string>> = {}
): Fault[] {
	const { scenes } = content.show;
	if (scenes.length === 0) {
		return [
			{
				sceneId: null,
				sceneNumber: null,
				sceneTitle: '',
				what: 'The show has no scene.',
				remedy: 'Add at least one.'
			}
		];
	}
	return scenes.flatMap((scene, i) =>
		sceneFindings(scene, content, archived).map((finding) => ({
			sceneId: scene.id,
			sceneNumber: i + 1,
			sceneTitle: scene.title,
			...finding
		}))
	);
}

function sceneFindings(
	scene: Scene,
	{ galaxies }: EditionContent,
	archived: Readonly<Record<string, string>>
): Finding[] {
	if (scene.subject.kind === 'dark') {
		return [...controlFindings(scene, null), ...figureFindings(scene, null, null)];
	}
	const { galaxyId } = scene.subject;
	const galaxy = galaxies[galaxyId];
	if (!galaxy) {
		return [
			galaxyId in archived
				? {
						what: `Its galaxy “${archived[galaxyId]}” is archived.`,
						remedy: 'Restore the galaxy, or choose another under Picture.'
					}
				: {
						what: 'Its galaxy is not in the library of this venue.',
						remedy: 'Choose another under Picture.'
					}
		];
	}
	const models = limitValues(scene).map((values) => modelOf(scene, galaxy, values));
	const model = models.find((one) => !('circularVelocity' in one)) ?? models[0];
	if (!('circularVelocity' in model)) return [...controlFindings(scene, galaxy), model];
	return [
		...matterFindings(scene, galaxy),
		...controlFindings(scene, galaxy),
		...figureFindings(scene, model, galaxy)
	];
}

/** The model with live controls where they stand, or why there is none. */
function modelOf(scene: Scene, galaxy: EditionGalaxy, values: ControlValues): MassModel | Finding {
	try {
		return massModel(effectiveModel(galaxy.document, sceneSettings(scene, values)));
	} catch (thrown) {
		if (!(thrown instanceof ParameterError)) throw thrown;
		return {
			what: `The galaxy cannot be computed: ${thrown.message}`,
			remedy: 'Change the value in the galaxy, in Picture, or the values of the control.'
		};
	}
}

function matterFindings(scene: Scene, { document }: EditionGalaxy): Finding[] {
	const present = document.model.components.filter((c) => (c.factor ?? 1) > 0);
	const found: Finding[] = [];
	if (!hasStars(document.model)) {
		found.push({
			what: `The galaxy “${document.name}” has no lit component with an extent, so there are no stars to show.`,
			remedy: 'Mark one of its components as lit, or choose another galaxy.'
		});
	}
	if (scene.comparison === 'halves' && !present.some((c) => !c.lit)) {
		found.push({
			what: `It compares with and without halo, but “${document.name}” has no unlit component: both halves would be the same.`,
			remedy: 'Switch the comparison off, or choose a galaxy with a halo.'
		});
	} else if (scene.comparison === 'halves' && sceneSettings(scene, {}).haloFactor === 0) {
		found.push({
			what: 'It compares with and without halo, but its halo stands at 0: both halves would be the same.',
			remedy: 'Raise the halo under Picture, or switch the comparison off.'
		});
	}
	return found;
}

function controlFindings(scene: Scene, galaxy: EditionGalaxy | null): Finding[] {
	const seen = new Set<string>();
	return scene.controls.flatMap((control) => {
		const key = targetKey(control.target);
		const twice = seen.has(key);
		seen.add(key);
		if (!twice) return controlFinding(control, galaxy);
		return [
			{
				what: `Two live controls move the same thing; “${control.label}” is the second.`,
				remedy: 'Take one of them out under Live controls.'
			}
		];
	});
}

function controlFinding(control: LiveControl, galaxy: EditionGalaxy | null): Finding[] {
	const limits = controlRange(control.target, galaxy?.document ?? null);
	if (!limits) {
		return [
			{
				what: galaxy
					? `The live control “${control.label}” moves something that “${galaxy.document.name}” does not have.`
					: `The live control “${control.label}” moves a galaxy, but this scene shows none.`,
				remedy: 'Choose another target under Live controls, or take the control out.'
			}
		];
	}
	if (control.min >= limits.min && control.max <= limits.max) return [];
	return [
		{
			what: `The limits of the live control “${control.label}” leave the physical range, ${rangeWords(limits)}.`,
			remedy: 'Narrow the limits under Live controls.'
		}
	];
}

function figureFindings(
	scene: Scene,
	model: MassModel | null,
	galaxy: EditionGalaxy | null
): Finding[] {
	const context = {
		model,
		measured: galaxy?.measured ?? [],
		outerRadius: galaxy?.document.look.outerRadius ?? 1
	};
	const places = [
		{ name: 'script', text: scene.script },
		{ name: 'caption', text: scene.drawings.caption }
	];
	return places.flatMap(({ name, text }) =>
		fillFigures(text, context).flatMap((part) =>
			part.kind === 'figure' && !part.figure.ok
				? [
						{
							what: `The figure {${part.figure.source}} in the ${name} cannot be computed. ${part.figure.problem}`,
							remedy: `Change it in the ${name}.`
						}
					]
				: []
		)
	);
}
