import { numberOf } from '$lib/dynamics';
import type { FreeParameter } from '$lib/dynamics';
import type { ComponentSpec, ParameterInfo } from '$lib/dynamics/types';
import { componentName, movableParameters } from '$lib/show/editingControls';

/** A parameter that may be ticked as free. */
export interface FreeCandidate {
	key: string;
	component: ComponentSpec;
	/** What people call the component. */
	name: string;
	info: ParameterInfo;
	/** As it stands now. */
	value: number;
}

export const candidateKey = (componentId: string, parameter: string) =>
	`${componentId} ${parameter}`;

/** Every number of every component, in the order of the page. */
export const freeCandidates = (components: readonly ComponentSpec[]): FreeCandidate[] =>
	components.flatMap((component) =>
		movableParameters(component).map((info) => ({
			key: candidateKey(component.id, info.name),
			component,
			name: componentName(component),
			info,
			value: numberOf(component.parameters, info.name) ?? info.initial
		}))
	);

/** Parameters that a table of numbers or a convention gives are not free to begin with. */
const seldomFree = ['hubble', 'scaleHeight', 'holeRadius', 'axisRatio'];

/**
 * What a person usually wants free: how much the stars weigh for their light, and the halo.
 * Discs and bulges keep their sizes, which the light gives.
 */
export function usuallyFree(candidates: readonly FreeCandidate[]): string[] {
	return candidates
		.filter(({ component, info }) => {
			if (seldomFree.includes(info.name)) return false;
			return component.lit ? info.name === 'massToLight' && !isGas(component) : true;
		})
		.map(({ key }) => key);
}

/** Gas is weighed by its own radio light, so its mass is not free. */
const isGas = (component: ComponentSpec) =>
	/gas|hydrogen/i.test(`${component.name} ${component.id}`);

/**
 * Bounds of a free parameter: its own limits; a mass-to-light ratio within what stars can have,
 * 0.05 to 5 in near-infrared light (common practice).
 */
export function boundsOf({ info, component }: FreeCandidate): FreeParameter {
	const stars = info.name === 'massToLight';
	return {
		componentId: component.id,
		parameter: info.name,
		min: stars ? Math.max(info.min, 0.05) : info.min,
		max: stars ? Math.min(info.max, 5) : info.max
	};
}
