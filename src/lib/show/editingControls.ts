import { numberOf, parameterSetOf } from '../dynamics';
import type { ComponentSpec, ParameterInfo } from '../dynamics/types';
import type { ControlTarget, Scene } from './document';
import type { GalaxyDocument } from './galaxy';

/** What a number field of the composer needs to know about the thing it sets. */
export interface NumberRange {
	label: string;
	/** Empty for a pure number. */
	unit: string;
	/** Hard limits, both allowed. */
	min: number;
	max: number;
	/** Ends of the slider, within the hard limits. */
	sliderMin: number;
	sliderMax: number;
	step: number;
	scale: 'linear' | 'log';
}

const range = (
	label: string,
	unit: string,
	min: number,
	max: number,
	step: number,
	slider: [number, number] = [min, max],
	scale: NumberRange['scale'] = 'linear'
): NumberRange => ({
	label,
	unit,
	min,
	max,
	sliderMin: slider[0],
	sliderMax: slider[1],
	step,
	scale
});

/** Ranges of a scene's own numbers. Hard limits are those of `document.ts` (tested). */
export const sceneRanges = {
	haloFactor: range('Halo', 'times', 0, 2, 0.01),
	starFactor: range('Stars and gas', 'times', 0, 3, 0.01),
	rate: range('Passing time', 'million years a second', 0, 100, 0.1, [0, 20]),
	distance: range('Distance', 'kpc', 5, 400, 1, [5, 400], 'log'),
	inclination: range('Inclination', '°', 0, 180, 1, [0, 90]),
	turn: range('Turn', '°', -180, 180, 1),
	centreAltitude: range('Altitude of the centre', '°', 0, 90, 1),
	seconds: range('Length', 's', 1, 3600, 1, [5, 300]),
	fade: range('Fade', 's', 0.5, 20, 0.5),
	ring: range('Ring', 'kpc', 0.1, 200, 0.1, [0.1, 50], 'log'),
	targetMinutes: range('Target length', 'min', 1, 180, 1, [5, 60])
} as const;

/** What people call a component: its name, else its id. */
export const componentName = (component: ComponentSpec): string => component.name ?? component.id;

/** The parameters of a component that a control may move. */
export const movableParameters = (component: ComponentSpec): ParameterInfo[] =>
	parameterSetOf(component.kind, Object.keys(component.parameters)).parameters.filter(
		(info) => info.min < info.max
	);

/** @returns the range a control's target can have; null where the target does not exist */
export function controlRange(
	target: ControlTarget,
	galaxy: GalaxyDocument | null
): NumberRange | null {
	if (target.kind === 'rate') return sceneRanges.rate;
	if (!galaxy) return null;
	if (target.kind === 'halo-factor') return sceneRanges.haloFactor;
	if (target.kind === 'star-factor') return sceneRanges.starFactor;
	const component = galaxy.model.components.find((c) => c.id === target.componentId);
	const info = component && movableParameters(component).find((p) => p.name === target.parameter);
	if (!component || !info) return null;
	return {
		label: `${componentName(component)}: ${info.label.toLowerCase()}`,
		unit: info.unit,
		min: info.min,
		max: info.max,
		sliderMin: info.usualMin,
		sliderMax: info.usualMax,
		step: info.step,
		scale: info.scale
	};
}

/** The value a control begins with: what the scene or its galaxy has for the same thing. */
export function targetValue(
	target: ControlTarget,
	scene: Scene,
	galaxy: GalaxyDocument | null
): number {
	if (target.kind === 'rate') return scene.motion.rate;
	if (target.kind === 'halo-factor') return scene.mix.haloFactor;
	if (target.kind === 'star-factor') return scene.mix.starFactor;
	const component = galaxy?.model.components.find((c) => c.id === target.componentId);
	const info = component && movableParameters(component).find((p) => p.name === target.parameter);
	const own = component && numberOf(component.parameters, target.parameter);
	return own ?? info?.initial ?? 0;
}

/** Two targets are the same where one control would hide the other. */
export function targetKey(target: ControlTarget): string {
	return target.kind === 'parameter'
		? `parameter ${target.componentId} ${target.parameter}`
		: target.kind;
}

/** Every target a control of a scene with this galaxy can have, in the order of a menu. */
export function controlTargets(galaxy: GalaxyDocument | null): ControlTarget[] {
	if (!galaxy) return [{ kind: 'rate' }];
	return [
		{ kind: 'halo-factor' },
		{ kind: 'star-factor' },
		{ kind: 'rate' },
		...galaxy.model.components.flatMap((component) =>
			movableParameters(component).map((info): ControlTarget => ({
				kind: 'parameter',
				componentId: component.id,
				parameter: info.name
			}))
		)
	];
}
