import type { WordsAndLists } from './components/ComponentMaker';
import { isRecord } from './specIssues';
import type { Parameters, ParameterSet } from './types';

/** A parameter that is a number; undefined where it is missing or of another nature. */
export function numberOf(parameters: Parameters, name: string): number | undefined {
	const value = parameters[name];
	return typeof value === 'number' ? value : undefined;
}

/** The numbers of a set, those left out at their initial values. */
export const numbersOf = (parameters: Parameters, set: ParameterSet): Record<string, number> =>
	Object.fromEntries(
		set.parameters.map((info) => [info.name, numberOf(parameters, info.name) ?? info.initial])
	);

/** The words and lists of a set, words left out at their initial values. */
export function wordsAndListsOf(parameters: Parameters, set: ParameterSet): WordsAndLists {
	const choices = (set.choices ?? []).map(({ name, initial }) => {
		const value = parameters[name];
		return [name, typeof value === 'string' ? value : initial];
	});
	const lists = (set.lists ?? []).map(({ name }) => {
		const value = parameters[name];
		return [name, Array.isArray(value) ? [...value] : []];
	});
	return { choices: Object.fromEntries(choices), lists: Object.fromEntries(lists) };
}

/** Names of the parameters that have a value. */
export const givenNames = (parameters: unknown): string[] =>
	isRecord(parameters)
		? Object.keys(parameters).filter((name) => parameters[name] !== undefined)
		: [];
