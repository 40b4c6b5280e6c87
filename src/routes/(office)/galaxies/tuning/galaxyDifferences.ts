import { canonicalJson } from '$lib/show/hash';
import type { ParameterValue } from '$lib/dynamics';
import type { GalaxyDocument } from '$lib/show/galaxy';

/** One place where two versions of a galaxy differ, each in words. */
export interface GalaxyDifference {
	what: string;
	mine: string;
	theirs: string;
}

const same = (a: unknown, b: unknown) => canonicalJson(a) === canonicalJson(b);
const number = (value: number) => Number(value.toPrecision(4)).toString();
const value = (given: ParameterValue) =>
	typeof given === 'number'
		? number(given)
		: typeof given === 'string'
			? given
			: `${given.length} numbers`;

/** Every difference of two versions, component by component, in the order of the page. */
export function galaxyDifferences(
	mine: GalaxyDocument,
	theirs: GalaxyDocument
): GalaxyDifference[] {
	const found: GalaxyDifference[] = [];
	const text = (what: string, a: string, b: string) => {
		if (a !== b) found.push({ what, mine: a || 'empty', theirs: b || 'empty' });
	};
	text('Name', mine.name, theirs.name);
	const ids = new Set([...mine.model.components, ...theirs.model.components].map((c) => c.id));
	for (const id of ids) {
		const a = mine.model.components.find((c) => c.id === id);
		const b = theirs.model.components.find((c) => c.id === id);
		const name = a?.name || b?.name || id;
		if (!a || !b) {
			found.push({
				what: name,
				mine: a ? 'is there' : 'removed',
				theirs: b ? 'is there' : 'removed'
			});
			continue;
		}
		text(`${name}: name`, a.name ?? '', b.name ?? '');
		text(`${name}: matter`, a.lit ? 'lit' : 'unlit', b.lit ? 'lit' : 'unlit');
		text(`${name}: kind`, a.kind, b.kind);
		for (const key of new Set([...Object.keys(a.parameters), ...Object.keys(b.parameters)])) {
			const [left, right] = [a.parameters[key], b.parameters[key]];
			if (same(left, right)) continue;
			text(
				`${name}: ${key}`,
				left === undefined ? 'not given' : value(left),
				right === undefined ? 'not given' : value(right)
			);
		}
	}
	if (!same(mine.look, theirs.look)) {
		found.push({ what: 'Look', mine: 'yours', theirs: 'theirs, different' });
	}
	text('Sources', mine.sources, theirs.sources);
	text('Reading line', `${number(mine.readingRadius)} kpc`, `${number(theirs.readingRadius)} kpc`);
	return found;
}
