import { rangeWords } from './rangeWords';
import type { SpecIssue } from './specIssues';
import type { ListInfo, ParameterSet } from './types';

/** What is wrong with the words and the lists of a component; paths begin at the component. */
export function wordAndListIssues(
	set: ParameterSet,
	parameters: Record<string, unknown>,
	called: string
): SpecIssue[] {
	const issues: SpecIssue[] = [];
	for (const { name, label, options } of set.choices ?? []) {
		const value = parameters[name];
		if (value === undefined || options.some((option) => option.value === value)) continue;
		issues.push({
			path: ['parameters', name],
			parameter: name,
			message: `${called}: ${label.toLowerCase()} (${name}) must be ${options.map((option) => `"${option.value}"`).join(' or ')}.`
		});
	}
	for (const info of set.lists ?? []) {
		const issue = listIssue(info, parameters, called);
		if (issue) issues.push(issue);
	}
	return issues;
}

function listIssue(
	info: ListInfo,
	parameters: Record<string, unknown>,
	called: string
): SpecIssue | null {
	const { name, least, most } = info;
	const value: unknown = parameters[name];
	const named = `${called}: ${info.label.toLowerCase()} (${name})`;
	const fault = (message: string, at?: number): SpecIssue => ({
		path: at === undefined ? ['parameters', name] : ['parameters', name, at],
		parameter: name,
		min: info.min,
		max: info.max,
		message
	});
	if (!Array.isArray(value) || value.length < least || value.length > most) {
		return fault(`${named} must be a list of ${least} to ${most} numbers.`);
	}
	const entries: readonly unknown[] = value;
	const other: unknown = info.asLongAs ? parameters[info.asLongAs] : undefined;
	if (Array.isArray(other) && other.length !== entries.length) {
		return fault(
			`${named} has ${entries.length} numbers and ${info.asLongAs} has ${other.length}; they must be as many.`
		);
	}
	let before = -Infinity;
	for (const [at, entry] of entries.entries()) {
		if (typeof entry !== 'number' || !(entry >= info.min && entry <= info.max)) {
			return fault(`${named}, number ${at + 1}: allowed are numbers ${rangeWords(info)}.`, at);
		}
		if (info.rising && entry <= before) {
			return fault(`${named}, number ${at + 1}: each must be above the one before it.`, at);
		}
		before = entry;
	}
	return null;
}
