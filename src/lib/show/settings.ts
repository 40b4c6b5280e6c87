import type { MassModelSpec } from '../dynamics/types';
import type { LiveControl, Scene } from './document';
import type { GalaxyDocument } from './galaxy';

/** Values of live controls by control id; a missing one stands at its resting value. */
export type ControlValues = Readonly<Record<string, number>>;

/** What the scene and its live controls make of the galaxy at one moment. */
export interface SceneSettings {
	haloFactor: number;
	starFactor: number;
	/** Million years in one second of show time. */
	rate: number;
	parameters: { componentId: string; parameter: string; value: number }[];
}

/** @returns the value kept between the control's limits; the resting value where it is not a number */
export function clampControl(control: LiveControl, value: number): number {
	if (Number.isNaN(value)) return control.rest;
	return Math.min(control.max, Math.max(control.min, value));
}

/** The values every control of a scene begins with. */
export const restingValues = (scene: Scene): Record<string, number> =>
	Object.fromEntries(scene.controls.map((control) => [control.id, control.rest]));

/** A live control takes the place of the scene's own value for the same thing. */
export function sceneSettings(scene: Scene, values: ControlValues): SceneSettings {
	const settings: SceneSettings = {
		haloFactor: scene.mix.haloFactor,
		starFactor: scene.mix.starFactor,
		rate: scene.motion.rate,
		parameters: []
	};
	for (const control of scene.controls) {
		const value = clampControl(control, values[control.id] ?? control.rest);
		const { target } = control;
		if (target.kind === 'halo-factor') settings.haloFactor = value;
		else if (target.kind === 'star-factor') settings.starFactor = value;
		else if (target.kind === 'rate') settings.rate = value;
		else
			settings.parameters.push({
				componentId: target.componentId,
				parameter: target.parameter,
				value
			});
	}
	return settings;
}

/** The galaxy's mass model with the scene's factors and parameters put in. */
export function effectiveModel(galaxy: GalaxyDocument, settings: SceneSettings): MassModelSpec {
	return {
		...galaxy.model,
		components: galaxy.model.components.map((component) => {
			const changed = settings.parameters.filter((p) => p.componentId === component.id);
			const factor = component.lit ? settings.starFactor : settings.haloFactor;
			return {
				...component,
				factor: (component.factor ?? 1) * factor,
				parameters: changed.reduce(
					(all, { parameter, value }) => ({ ...all, [parameter]: value }),
					component.parameters
				)
			};
		})
	};
}

/** Values of the controls to try where a scene must hold at all of them: at rest, and each at its limits. */
export const limitValues = (scene: Scene): ControlValues[] => [
	{},
	...scene.controls.flatMap(({ id, min, max }) => [{ [id]: min }, { [id]: max }]),
	Object.fromEntries(scene.controls.map(({ id, max }) => [id, max]))
];
