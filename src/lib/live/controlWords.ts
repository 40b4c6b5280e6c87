import { componentKinds } from '../dynamics';
import type { LiveControl, Scene } from '../show/document';
import type { EditionContent } from '../show/edition';
import { significant } from '../show/figureWords';

/** Unit of a live control, as it stands behind the number. */
export function controlUnit(content: EditionContent, scene: Scene, control: LiveControl): string {
	const { target } = control;
	if (target.kind === 'rate') return 'million years a second';
	if (target.kind !== 'parameter') return 'times';
	if (scene.subject.kind !== 'galaxy') return '';
	const { components } = content.galaxies[scene.subject.galaxyId].document.model;
	const kind = components.find((component) => component.id === target.componentId)?.kind;
	const info = componentKinds.find((known) => known.kind === kind);
	const parameter = info?.parameterSets
		.flatMap((set) => set.parameters)
		.find((known) => known.name === target.parameter);
	return parameter?.unit ?? '';
}

/** A control's value to three digits; a number as small as the slider's step is zero. */
export function controlNumber(control: LiveControl, value: number): string {
	const range = control.max - control.min;
	return Math.abs(value) < range / 2000 ? '0' : significant(value, 3);
}

/** Step of a control's slider: two hundred steps from end to end. */
export const controlStep = (control: LiveControl): number => (control.max - control.min) / 200;
