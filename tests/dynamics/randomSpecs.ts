import * as fc from 'fast-check';
import {
	componentKinds,
	type ComponentKindInfo,
	type ComponentSpec,
	type ListInfo,
	type MassModelSpec,
	type ParameterInfo
} from '../../src/lib/dynamics/index';

/** Any allowed value, evenly on the parameter's own scale. */
const valueOf = (info: ParameterInfo): fc.Arbitrary<number> =>
	fc
		.double({ min: 0, max: 1, noNaN: true })
		.map((t) =>
			info.scale === 'log'
				? Math.min(info.max, Math.max(info.min, info.min * (info.max / info.min) ** t))
				: info.min + t * (info.max - info.min)
		);

/**
 * Five numbers, so that lists are as long as others; above 0, since a pull outward is not the sum of
 * squares of speeds (signed lists have tests of their own).
 */
const listOf = (info: ListInfo): fc.Arbitrary<number[]> =>
	fc
		.uniqueArray(fc.integer({ min: 1, max: 900 }), { minLength: 5, maxLength: 5 })
		.map((values) => (info.rising ? values.sort((a, b) => a - b) : values))
		.map((values) => values.map((value) => value / 10));

const componentOf = (kind: ComponentKindInfo): fc.Arbitrary<Omit<ComponentSpec, 'id'>> =>
	fc.constantFrom(...kind.parameterSets).chain((set) =>
		fc.record({
			kind: fc.constant(kind.kind),
			parameters: fc.record(
				Object.fromEntries([
					...set.parameters.map((info) => [info.name, valueOf(info)]),
					...(set.choices ?? []).map(({ name, options }) => [
						name,
						fc.constantFrom(...options.map(({ value }) => value))
					]),
					...(set.lists ?? []).map((list) => [list.name, listOf(list)])
				])
			),
			lit: fc.boolean(),
			factor: fc.double({ min: 0, max: 10, noNaN: true })
		})
	);

/** Any component with parameters over their whole allowed ranges. */
export const anyComponent: fc.Arbitrary<ComponentSpec> = fc
	.constantFrom(...componentKinds)
	.chain(componentOf)
	.map((component) => ({ id: 'it', ...component }));

/** A model of one to six such components. */
export const anySpec: fc.Arbitrary<MassModelSpec> = fc
	.array(anyComponent, { minLength: 1, maxLength: 6 })
	.map((components) => ({ components: components.map((one, i) => ({ ...one, id: `c${i}` })) }));
