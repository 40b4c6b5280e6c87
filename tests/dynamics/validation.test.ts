import * as fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
	componentKinds,
	componentSpecSchema,
	massModel,
	massModelSpecSchema,
	ParameterError,
	type MassModelSpec
} from '../../src/lib/dynamics/index';
import { anySpec } from './randomSpecs';

/** A sound model whose second component is overwritten with `change`. */
function specWith(change: Record<string, unknown>, model: Record<string, unknown> = {}): unknown {
	return {
		components: [
			{
				id: 'disc',
				kind: 'miyamoto-nagai',
				parameters: { mass: 5e10, scaleLength: 3, scaleHeight: 0.3 },
				lit: true
			},
			{
				id: 'halo',
				name: 'Dark halo',
				kind: 'nfw',
				parameters: { density: 8e6, scaleRadius: 20 },
				lit: false,
				...change
			}
		],
		...model
	};
}

function errorOf(spec: unknown): ParameterError {
	try {
		massModel(spec as MassModelSpec);
	} catch (error) {
		if (error instanceof ParameterError) return error;
		throw error;
	}
	throw new Error('the model was taken');
}

const parametersOf = (parameters: Record<string, unknown>) => specWith({ parameters });
const disc = (extra: Record<string, unknown>) =>
	specWith({
		kind: 'exponential-disk',
		parameters: { surfaceDensity: 1e8, scaleLength: 2, ...extra }
	});

/** What is wrong, where the issue must sit, and what the message must say. */
const refused: [string, unknown, (string | number)[], RegExp][] = [
	[
		'a missing parameter',
		parametersOf({ density: 8e6 }),
		['components', 1, 'parameters', 'scaleRadius'],
		/"Dark halo": scale radius \(scaleRadius\) is missing\. Allowed: from 0\.001 to 1000 kpc\./
	],
	[
		'NaN',
		parametersOf({ density: NaN, scaleRadius: 20 }),
		['components', 1, 'parameters', 'density'],
		/density.*is not a number.*from 1 to 10¹⁴ Msun\/kpc³/
	],
	[
		'a word',
		parametersOf({ density: '8e6', scaleRadius: 20 }),
		['components', 1, 'parameters', 'density'],
		/is not a number/
	],
	[
		'null',
		parametersOf({ density: null, scaleRadius: 20 }),
		['components', 1, 'parameters', 'density'],
		/is not a number/
	],
	[
		'infinity',
		parametersOf({ density: Infinity, scaleRadius: 20 }),
		['components', 1, 'parameters', 'density'],
		/is out of range/
	],
	[
		'a negative value',
		parametersOf({ density: 8e6, scaleRadius: -1 }),
		['components', 1, 'parameters', 'scaleRadius'],
		/is out of range.*from 0\.001 to 1000 kpc/
	],
	[
		'an unknown parameter',
		parametersOf({ density: 8e6, scaleRadius: 20, colour: 1 }),
		['components', 1, 'parameters', 'colour'],
		/no parameter "colour"; it takes density, scaleRadius/
	],
	[
		'two parameter sets at once',
		parametersOf({ density: 8e6, scaleRadius: 20, mass200: 1e12 }),
		['components', 1, 'parameters', 'mass200'],
		/no parameter "mass200"/
	],
	[
		'half of the other set',
		parametersOf({ mass200: 1e12, concentration: 10 }),
		['components', 1, 'parameters', 'hubble'],
		/hubble constant \(hubble\) is missing.*from 20 to 200 km\/s\/Mpc/
	],
	[
		'no parameters',
		specWith({ parameters: undefined }),
		['components', 1, 'parameters'],
		/needs its parameters/
	],
	[
		'parameters as a list',
		specWith({ parameters: [1, 2] }),
		['components', 1, 'parameters'],
		/needs its parameters/
	],
	[
		'a thick disc',
		disc({ scaleHeight: 0.3 }),
		['components', 1, 'parameters', 'scaleHeight'],
		/scale height \(scaleHeight\) is out of range.*only 0 kpc in this version \(from 0 to 0 kpc\)/
	],
	[
		'a disc with a hole',
		disc({ holeRadius: 4 }),
		['components', 1, 'parameters', 'holeRadius'],
		/hole radius.*from 0 to 0 kpc/
	],
	[
		'a vertical profile',
		disc({ vertical: 1 }),
		['components', 1, 'parameters', 'vertical'],
		/vertical profile.*from 0 to 0/
	],
	[
		'an unknown kind',
		specWith({ kind: 'pancake' }),
		['components', 1, 'kind'],
		/unknown kind; known are .*burkert/
	],
	[
		'a kind that every object has',
		specWith({ kind: 'toString' }),
		['components', 1, 'kind'],
		/unknown kind/
	],
	[
		'an id used twice',
		specWith({ id: 'disc' }),
		['components', 1, 'id'],
		/Two components have the id "disc"/
	],
	['no id', specWith({ id: undefined }), ['components', 1, 'id'], /needs an id/],
	['an empty id', specWith({ id: '' }), ['components', 1, 'id'], /needs an id/],
	['no lit mark', specWith({ lit: undefined }), ['components', 1, 'lit'], /lit or unlit/],
	[
		'a factor too large',
		specWith({ factor: 10.5 }),
		['components', 1, 'factor'],
		/"Dark halo": factor must be a number from 0 to 10/
	],
	['a negative factor', specWith({ factor: -0.1 }), ['components', 1, 'factor'], /from 0 to 10/],
	['a factor of NaN', specWith({ factor: NaN }), ['components', 1, 'factor'], /from 0 to 10/],
	[
		'an unknown field of a component',
		specWith({ weight: 1 }),
		['components', 1, 'weight'],
		/no field "weight"/
	],
	[
		'an unknown field of the model',
		specWith({}, { colour: 'red' }),
		['colour'],
		/no field "colour"/
	],
	['an unknown law', specWith({}, { law: 'epicurean' }), ['law'], /one of newton, radial-/],
	[
		'another law beside a halo',
		specWith({ lit: false }, { law: 'modified-simple' }),
		['law'],
		/explained twice/
	],
	['no components', {}, ['components'], /must be a list/],
	[
		'too many components',
		{
			components: Array.from({ length: 33 }, (_, i) => ({
				id: `p${i}`,
				kind: 'point-mass',
				parameters: { mass: 1e9 },
				lit: true
			}))
		},
		['components'],
		/at most 32/
	],
	['a component that is none', { components: [7] }, ['components', 0], /A component is an object/],
	['nothing', null, [], /A mass model is an object/]
];

describe.each(refused)('%s is refused', (_title, spec, path, message) => {
	test('by massModel', () => {
		const error = errorOf(spec);
		expect(error.path).toEqual(path);
		expect(error.message).toMatch(message);
	});

	test('by the schema, at the field', () => {
		const result = massModelSpecSchema.safeParse(spec);
		expect(result.success).toBe(false);
		const issue = result.error?.issues[0];
		expect(issue?.path).toEqual(path);
		expect(issue?.message).toMatch(message);
	});
});

test('the error carries component, parameter and range', () => {
	const { componentId, parameter, min, max, name } = errorOf(
		parametersOf({ density: 8e6, scaleRadius: 5000 })
	);
	expect({ componentId, parameter, min, max, name }).toEqual({
		componentId: 'halo',
		parameter: 'scaleRadius',
		min: 0.001,
		max: 1000,
		name: 'ParameterError'
	});
});

test('the schema reports every fault, each with its range', () => {
	const result = massModelSpecSchema.safeParse(parametersOf({ density: -1, scaleRadius: 0 }));
	const issues = result.error?.issues ?? [];
	expect(issues.map((issue) => issue.path.join('.'))).toEqual([
		'components.1.parameters.density',
		'components.1.parameters.scaleRadius'
	]);
	expect(issues.map((issue) => issue.code === 'custom' && issue.params)).toEqual([
		{ min: 1, max: 1e14 },
		{ min: 0.001, max: 1000 }
	]);
});

test('one component can be checked by itself', () => {
	const result = componentSpecSchema.safeParse({
		id: 'a',
		kind: 'plummer',
		parameters: { mass: 0, scaleLength: 1 },
		lit: true
	});
	expect(result.error?.issues.map((issue) => issue.path)).toEqual([['parameters', 'mass']]);
});

test('ends of a range, a missing factor and optional zeros are taken', () => {
	for (const spec of [
		disc({}),
		disc({ scaleHeight: 0, vertical: 0, holeRadius: 0 }),
		parametersOf({ density: 1, scaleRadius: 0.001 }),
		parametersOf({ density: 1e14, scaleRadius: 1000 }),
		specWith({ factor: 0 }, { law: 'newton' }),
		specWith({ factor: 10 })
	]) {
		expect(massModelSpecSchema.safeParse(spec).success).toBe(true);
		expect(massModel(spec as MassModelSpec).circularVelocity(8)).toBeGreaterThan(0);
	}
});

test('withFactor refuses unknown components and factors out of range', () => {
	const model = massModel(specWith({}) as MassModelSpec);
	expect(() => model.withFactor('moon', 1)).toThrow(/no component "moon"/);
	for (const factor of [-1, 10.01, NaN]) {
		expect(() => model.withFactor('halo', factor)).toThrow(ParameterError);
	}
});

test('whatever is broken, schema and massModel agree', () => {
	const junk = fc.oneof(
		fc.double(),
		fc.string(),
		fc.constant(null),
		fc.constant(undefined),
		fc.boolean(),
		fc.constant([]),
		fc.constant({})
	);
	const places = fc.constantFrom(
		'id',
		'kind',
		'lit',
		'factor',
		'parameters',
		'name',
		'mass',
		'extra'
	);
	let broken = 0;
	fc.assert(
		fc.property(anySpec, places, junk, (spec, place, value) => {
			const first: Record<string, unknown> = { ...spec.components[0] };
			if (place === 'mass') first.parameters = { ...spec.components[0].parameters, mass: value };
			else first[place] = value;
			const changed = { components: [first, ...spec.components.slice(1)] };
			let taken = true;
			try {
				massModel(changed as MassModelSpec);
			} catch (error) {
				expect(error).toBeInstanceOf(ParameterError);
				taken = false;
				broken++;
			}
			expect(massModelSpecSchema.safeParse(changed).success).toBe(taken);
		}),
		{ numRuns: 500 }
	);
	expect(broken).toBeGreaterThan(100);
});

test('every kind describes its parameters fully, and its initial values make a model', () => {
	expect(componentKinds.map((info) => info.kind).sort()).toEqual([
		'burkert',
		'dehnen',
		'double-power-law',
		'einasto',
		'exponential-disk',
		'hernquist',
		'isochrone',
		'jaffe',
		'kuzmin-disk',
		'logarithmic',
		'miyamoto-nagai',
		'nfw',
		'plummer',
		'point-mass',
		'pseudo-isothermal',
		'sersic',
		'tabulated'
	]);
	for (const { kind, label, help, source, lit, parameterSets } of componentKinds) {
		for (const text of [label, help, source]) expect(text).not.toBe('');
		for (const set of parameterSets) {
			for (const info of set.parameters) {
				expect(info.label).not.toBe('');
				expect(info.help).toMatch(/\.$/);
				expect(info.step).toBeGreaterThan(0);
				const ordered = [info.min, info.usualMin, info.initial, info.usualMax, info.max];
				expect(ordered, `${kind} ${info.name}`).toEqual([...ordered].sort((a, b) => a - b));
				if (info.scale === 'log') expect(info.usualMin).toBeGreaterThan(0);
			}
			const parameters = Object.fromEntries([
				...set.parameters.map((p) => [p.name, p.initial] as const),
				...(set.choices ?? []).map((choice) => [choice.name, choice.initial] as const),
				...(set.lists ?? []).map((list) => [list.name, list.initial] as const)
			]);
			const model = massModel({ components: [{ id: 'it', kind, parameters, lit }] });
			expect(model.circularVelocity(8)).toBeGreaterThan(0);
		}
	}
});
