import type { ParameterInfo } from '$lib/dynamics/types';
import type { NumberRange } from '$lib/show/editingControls';

/** What a number field needs to know about a component's parameter. */
export const parameterRange = (info: ParameterInfo): NumberRange => ({
	label: info.label,
	unit: info.unit,
	min: info.min,
	max: info.max,
	sliderMin: info.usualMin,
	sliderMax: info.usualMax,
	step: info.step,
	scale: info.scale
});
