import * as fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
	chiSquaredOf,
	fitRotationCurve,
	massModel,
	ParameterError,
	speedBand,
	type FitOptions
} from '../../../src/lib/dynamics';
import { near } from '../near';
import { halo, lightAlone, points, stars, withHalo } from './invented';

/** What scipy 1.17 least_squares finds (trust region, ftol = xtol = gtol = 1e-15, 30 starts). */
const scipy = [
	{
		kind: 'nfw',
		shape: 'scaleRadius',
		chiSquared: 18.43371678284381,
		values: [0.561574415, 3.91891773e6, 18.6147348],
		errors: [0.127137211, 3.30839524e6, 8.99214999],
		correlation: -0.99823809
	},
	{
		kind: 'pseudo-isothermal',
		shape: 'coreRadius',
		chiSquared: 16.970354859728218,
		values: [0.0679490334, 4.44103522e8, 0.861155064],
		errors: [0.103252914, 1.28495967e8, 0.112145272],
		correlation: -0.98491853
	},
	{
		kind: 'burkert',
		shape: 'coreRadius',
		chiSquared: 17.59293685000816,
		values: [0.832369079, 1.23377692e7, 10.0374304],
		errors: [0.0502022943, 2.92829304e6, 1.53625746],
		correlation: -0.97747997
	}
] as const;

const nfwFit = (own: Partial<FitOptions> = {}) =>
	fitRotationCurve({
		spec: withHalo('nfw', { density: 1e7, scaleRadius: 10 }),
		points,
		free: [stars, halo('density'), halo('scaleRadius')],
		...own
	});

describe.each(scipy)('$kind', ({ kind, shape, chiSquared, values, errors, correlation }) => {
	const result = fitRotationCurve({
		spec: withHalo(kind, { density: 1e7, [shape]: 10 }),
		points,
		free: [stars, halo('density'), halo(shape)]
	});
	test('agrees with an independent least-squares code', () => {
		near(result.chiSquared, chiSquared, 1e-9);
		result.parameters.forEach(({ value, error }, i) => {
			near(value, values[i], 1e-5, `value ${i}`);
			near(error, errors[i], 1e-3, `error ${i}`);
		});
		near(result.correlation[1][2], correlation, 1e-4);
	});
	test('says what it did', () => {
		expect(result.converged).toBe(true);
		expect(result.degreesOfFreedom).toBe(9);
		near(result.reducedChiSquared, chiSquared / 9, 1e-9);
		near(chiSquaredOf(result.spec, points), result.chiSquared, 1e-12);
		const left = result.residuals.reduce((sum, one, i) => sum + (one / points[i].error) ** 2, 0);
		near(left, result.chiSquared, 1e-12);
		expect(result.starts).toBe(12);
		expect(result.agreeing).toBeGreaterThanOrEqual(1);
	});
	test('a profile of χ² rises by 1 at one standard error, near enough', () => {
		const { value, error } = result.parameters[0];
		const fixed = (ratio: number) =>
			fitRotationCurve({
				spec: {
					components: result.spec.components.map((one) =>
						one.id === 'disc'
							? { ...one, parameters: { ...one.parameters, massToLight: ratio } }
							: one
					)
				},
				points,
				free: [halo('density'), halo(shape)]
			}).chiSquared - result.chiSquared;
		// A fiftieth of an error away the curve is a parabola: 1/2500 of 1.
		// The fit's curvature leaves second derivatives of the model out, hence the tolerance.
		near((fixed(value + 0.02 * error) + fixed(value - 0.02 * error)) / 2, 0.0004, 0.2);
	});
});

test('one linear parameter has the error that can be had by hand', () => {
	// v² = x u², so v = √x u: with w = √x it is a straight line, σ(w) = 1/√Σ(u/e)², σ(x) = 2w σ(w).
	const [, disc] = lightAlone.components;
	const spec = { components: [disc] };
	const result = fitRotationCurve({ spec, points, free: [stars] });
	const model = massModel(spec);
	let [top, bottom] = [0, 0];
	for (const { radius, speed, error } of points) {
		const unit = model.circularVelocity(radius);
		top += (unit * speed) / error ** 2;
		bottom += (unit / error) ** 2;
	}
	near(result.parameters[0].value, (top / bottom) ** 2, 1e-9);
	near(result.parameters[0].error, (2 * top) / bottom / Math.sqrt(bottom), 1e-6);
	expect(result.undecided).toBeNull();
});

test('the same seed gives the same bits, another seed the same minimum', () => {
	const first = nfwFit({ seed: 4 });
	expect(nfwFit({ seed: 4 })).toEqual(first);
	near(nfwFit({ seed: 99 }).chiSquared, first.chiSquared, 1e-9);
});

test('recovers the model that points without scatter were made with', () => {
	const truth = withHalo('burkert', { density: 2.2e7, coreRadius: 6.5 });
	const model = massModel(truth);
	const exact = points.map((one) => ({ ...one, speed: model.circularVelocity(one.radius) }));
	const spec = withHalo('burkert', { density: 1e5, coreRadius: 100 });
	const free = [stars, halo('density'), halo('coreRadius')];
	const result = fitRotationCurve({ spec, points: exact, free });
	expect(result.chiSquared).toBeLessThan(1e-12);
	[1, 2.2e7, 6.5].forEach((value, i) => near(result.parameters[i].value, value, 1e-6));
});

test('what is not free stays, names, factors and tables too', () => {
	const result = nfwFit();
	const spec = withHalo('nfw', { density: 1e7, scaleRadius: 10 });
	expect(result.spec.components[0]).toEqual(spec.components[0]);
	const { massToLight: _, ...table } = result.spec.components[1].parameters;
	expect(spec.components[1].parameters).toMatchObject(table);
});

test('a parameter that runs to a bound is named, has no error, and the others do', () => {
	const result = nfwFit({
		free: [stars, halo('density'), { ...halo('scaleRadius'), max: 12 }]
	});
	expect(result.parameters[2]).toMatchObject({ value: 12, atBound: 'max', error: NaN });
	expect(result.undecided).toMatch(/scale radius of “halo” ran to its upper limit, 12 kpc/);
	expect(result.parameters[0].error).toBeGreaterThan(0);
	expect(result.parameters[1].error).toBeGreaterThan(0);
});

test('where the data cannot tell two numbers apart it says so', () => {
	const result = nfwFit();
	expect(result.undecided).toMatch(
		/density of “halo” and the scale radius of “halo” are hardly told apart: more of one/
	);
});

test('fits under another law too, with nothing but light', () => {
	const spec = { ...lightAlone, law: 'radial-acceleration' as const };
	const result = fitRotationCurve({ spec, points, free: [stars] });
	expect(result.spec.law).toBe('radial-acceleration');
	const newton = fitRotationCurve({ spec: lightAlone, points, free: [stars] });
	expect(result.chiSquared).toBeLessThan(newton.chiSquared);
	const { value } = result.parameters[0];
	for (const by of [0.99, 1.01]) {
		const moved = fitRotationCurve({
			spec,
			points,
			free: [{ ...stars, min: by * value * 0.999999, max: by * value }]
		});
		expect(moved.chiSquared).toBeGreaterThan(result.chiSquared);
	}
});

test('a factor can be free', () => {
	const result = fitRotationCurve({
		spec: lightAlone,
		points,
		free: [{ componentId: 'disc', parameter: 'factor' }]
	});
	const same = fitRotationCurve({ spec: lightAlone, points, free: [stars] });
	near(result.chiSquared, same.chiSquared, 1e-9);
	near(result.parameters[0].value, same.parameters[0].value, 1e-6);
});

test('tells of every start, and stops where it is asked to', () => {
	const told: number[] = [];
	const result = nfwFit({
		onProgress: ({ done, of, chiSquared, spec }) => {
			told.push(done);
			expect(of).toBe(12);
			near(chiSquaredOf(spec, points), chiSquared, 1e-9);
		},
		shouldStop: () => told.length >= 3
	});
	expect(told).toEqual([1, 2, 3]);
	expect(result.starts).toBe(3);
});

test('the band is the spread of the speed over what the fit allows', () => {
	const result = nfwFit();
	const radii = [2, 8, 20, 40];
	const band = speedBand(result, radii, new Float64Array(4));
	// The same by differences of whole models: √(gᵀ C g).
	const speeds = (values: number[]) => {
		const spec = structuredClone(result.spec);
		result.parameters.forEach(({ componentId, parameter }, i) => {
			const component = spec.components.find(({ id }) => id === componentId);
			if (component) component.parameters = { ...component.parameters, [parameter]: values[i] };
		});
		const model = massModel(spec);
		return radii.map((R) => model.circularVelocity(R));
	};
	const best = result.parameters.map(({ value }) => value);
	const slopes = best.map((value, i) => {
		const [low, high] = [0.9999, 1.0001].map((by) => speeds(best.with(i, by * value)));
		return radii.map((_, k) => (high[k] - low[k]) / (0.0002 * value));
	});
	radii.forEach((_, k) => {
		let sum = 0;
		result.covariance.forEach((row, i) =>
			row.forEach((shared, j) => (sum += slopes[i][k] * shared * slopes[j][k]))
		);
		near(band[k], Math.sqrt(sum), 1e-3, `at ${radii[k]} kpc`);
	});
});

describe('refuses by name', () => {
	test.each<[string, Partial<FitOptions>, RegExp]>([
		[
			'an error of 0',
			{ points: [{ radius: 1, speed: 2, error: 0 }] },
			/Point 1: its error.*above 0/
		],
		['a radius of 0', { points: [{ radius: 0, speed: 2, error: 1 }] }, /Point 1: its radius/],
		['a speed that is none', { points: [{ radius: 1, speed: NaN, error: 1 }] }, /its speed/],
		['too few points', { points: points.slice(0, 2) }, /2 points cannot fix 3/],
		['nothing free', { free: [] }, /At least one/],
		[
			'an unknown component',
			{ free: [{ componentId: 'moon', parameter: 'mass' }] },
			/no component "moon"/
		],
		[
			'an unknown number',
			{ free: [halo('colour')] },
			/no number "colour"; it has density, scaleRadius/
		],
		['a list', { free: [{ componentId: 'disc', parameter: 'radii' }] }, /no number "radii"/],
		[
			'bounds the wrong way round',
			{ free: [{ ...halo('density'), min: 9, max: 2 }] },
			/bounds of density/
		]
	])('%s', (_name, own, why) => {
		expect(() => nfwFit(own)).toThrow(ParameterError);
		expect(() => nfwFit(own)).toThrow(why);
	});
});

test('whatever the points are, it ends within its bounds and no worse than it began', () => {
	const point = fc.record({
		radius: fc.double({ min: 0.01, max: 200, noNaN: true }),
		speed: fc.double({ min: -50, max: 600, noNaN: true }),
		error: fc.double({ min: 0.1, max: 80, noNaN: true })
	});
	fc.assert(
		fc.property(fc.array(point, { minLength: 3, maxLength: 20 }), (any) => {
			const spec = withHalo('nfw', { density: 1e7, scaleRadius: 10 });
			const result = nfwFit({ points: any });
			expect(result.chiSquared).toBeLessThanOrEqual(chiSquaredOf(spec, any) * (1 + 1e-9));
			for (const { value, min, max } of result.parameters) {
				expect(value).toBeGreaterThanOrEqual(min);
				expect(value).toBeLessThanOrEqual(max);
			}
		}),
		{ numRuns: 60 }
	);
});
