import { isComponentKind, makers, parameterNames, parameterSetOf } from './componentKinds';
import { gravityLaws } from './laws';
import { givenNames } from './parameterValues';
import { rangeWords } from './rangeWords';
import type { ComponentKind, ParameterInfo } from './types';
import { wordAndListIssues } from './wordAndListIssues';

/** One fault of a mass model, in plain words, with the place it is at. */
export interface SpecIssue {
	path: (string | number)[];
	message: string;
	componentId?: string;
	/** Name of the parameter or field. */
	parameter?: string;
	min?: number;
	max?: number;
}

/** Limits of a mass model that are not limits of one kind. */
export const specLimits = {
	components: 32,
	idLength: 64,
	nameLength: 120,
	factor: { min: 0, max: 10, unit: '' }
} as const;

const modelFields = ['components', 'law'];
const componentFields = ['id', 'kind', 'name', 'parameters', 'lit', 'factor'];

export function isRecord(value: unknown): value is Record<string, unknown> {
	return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/**
 * Every fault of what should be a `MassModelSpec`; empty where it can be computed.
 * `massModel` and `massModelSpecSchema` both ask here, so they cannot disagree.
 */
export function specIssues(value: unknown): SpecIssue[] {
	if (!isRecord(value)) {
		return [{ path: [], message: 'A mass model is an object with a list of components.' }];
	}
	const issues: SpecIssue[] = Object.keys(value)
		.filter((field) => !modelFields.includes(field))
		.map((field) => ({
			path: [field],
			parameter: field,
			message: `A mass model has no field "${field}"; take it out.`
		}));
	const { components, law } = value;
	const known = gravityLaws.find((info) => info.law === law);
	if (law !== undefined && !known) {
		issues.push({
			path: ['law'],
			parameter: 'law',
			message: `The law must be one of ${gravityLaws.map((info) => info.law).join(', ')}.`
		});
	}
	if (!Array.isArray(components) || components.length > specLimits.components) {
		issues.push({
			path: ['components'],
			parameter: 'components',
			message: `Components must be a list of at most ${specLimits.components}.`
		});
		return issues;
	}
	if (known && known.law !== 'newton' && components.some((c) => isRecord(c) && c.lit === false)) {
		issues.push({
			path: ['law'],
			parameter: 'law',
			message: `${known.label} takes the place of unlit matter, so it acts on lit matter alone: with a halo the same speeds would be explained twice. Take the unlit components out, or choose Newton’s law.`
		});
	}
	const ids = new Set<unknown>();
	components.forEach((component: unknown, index) => {
		const path = ['components', index];
		issues.push(...componentIssues(component).map((i) => ({ ...i, path: [...path, ...i.path] })));
		const id = isRecord(component) ? component.id : undefined;
		if (typeof id === 'string' && ids.has(id)) {
			issues.push({
				path: [...path, 'id'],
				componentId: id,
				parameter: 'id',
				message: `Two components have the id "${id}"; give each its own.`
			});
		}
		ids.add(id);
	});
	return issues;
}

/** Every fault of one component by itself; paths begin at the component. */
export function componentIssues(component: unknown): SpecIssue[] {
	if (!isRecord(component)) {
		return [{ path: [], message: 'A component is an object with id, kind and parameters.' }];
	}
	const { id, kind, name, parameters, lit, factor } = component;
	const componentId = typeof id === 'string' ? id : undefined;
	const called = calledBy(component);
	const issues: SpecIssue[] = [];
	const refuse = (parameter: string, message: string, range?: { min: number; max: number }) =>
		issues.push({
			path: [parameter],
			componentId,
			parameter,
			message,
			...(range && { min: range.min, max: range.max })
		});

	for (const field of Object.keys(component)) {
		if (!componentFields.includes(field)) refuse(field, `${called} has no field "${field}".`);
	}
	if (typeof id !== 'string' || id.length < 1 || id.length > specLimits.idLength) {
		refuse('id', `${called} needs an id of 1 to ${specLimits.idLength} letters.`);
	}
	if (name !== undefined && (typeof name !== 'string' || name.length > specLimits.nameLength)) {
		refuse('name', `${called} needs a name of at most ${specLimits.nameLength} letters.`);
	}
	if (typeof lit !== 'boolean') refuse('lit', `${called} must be marked lit or unlit.`);
	if (factor !== undefined && !isWithin(factor, specLimits.factor)) {
		refuse('factor', factorWords(called), specLimits.factor);
	}
	if (!isComponentKind(kind)) {
		refuse('kind', `${called} is of an unknown kind; known are ${Object.keys(makers).join(', ')}.`);
	} else if (!isRecord(parameters)) {
		refuse('parameters', `${called} needs its parameters, a number for each.`);
	} else {
		for (const issue of parameterIssues(kind, parameters, called)) {
			issues.push({ ...issue, componentId });
		}
	}
	return issues;
}

function parameterIssues(
	kind: ComponentKind,
	parameters: Record<string, unknown>,
	called: string
): SpecIssue[] {
	// A key that is there without a value is missing.
	const given = givenNames(parameters);
	const set = parameterSetOf(kind, given);
	const known = parameterNames(set);
	const issues: SpecIssue[] = given
		.filter((name) => !known.includes(name))
		.map((name) => ({
			path: ['parameters', name],
			parameter: name,
			message: `${called} has no parameter "${name}"; it takes ${known.join(', ')}.`
		}));
	issues.push(...wordAndListIssues(set, parameters, called));
	for (const info of set.parameters) {
		const value = parameters[info.name];
		if (value === undefined ? info.optional : isWithin(value, info)) continue;
		issues.push({
			path: ['parameters', info.name],
			parameter: info.name,
			min: info.min,
			max: info.max,
			message: parameterWords(called, info, value)
		});
	}
	return issues;
}

function parameterWords(called: string, info: ParameterInfo, value: unknown): string {
	const label = info.label.toLowerCase();
	const fault =
		value === undefined
			? 'is missing'
			: typeof value !== 'number' || Number.isNaN(value)
				? 'is not a number'
				: 'is out of range';
	const named = label === info.name ? label : `${label} (${info.name})`;
	return `${called}: ${named} ${fault}. Allowed: ${rangeWords(info)}.`;
}

/** How a message names a component: by its name, else by its id. */
export function calledBy(component: { name?: unknown; id?: unknown }): string {
	const { name, id } = component;
	if (typeof name === 'string' && name !== '') return `"${name}"`;
	return typeof id === 'string' && id !== '' ? `"${id}"` : 'A component without an id';
}

export function isWithin(value: unknown, range: { min: number; max: number }): value is number {
	return typeof value === 'number' && value >= range.min && value <= range.max;
}

export const factorWords = (called: string): string =>
	`${called}: factor must be a number ${rangeWords(specLimits.factor)}.`;
