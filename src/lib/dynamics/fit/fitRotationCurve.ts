import { ParameterError } from '../ParameterError';
import type { MassModelSpec } from '../types';
import {
	leastSquares,
	solvePositive,
	type LeastSquares,
	type Minimum
} from './boundedLeastSquares';
import { Problem, type Coordinate } from './Problem';
import { startingValues } from './starts';
import type { FitOptions, FitPoint, FitResult, FittedParameter } from './types';
import { undecidedWords } from './undecided';

const usualStarts = 12;
/** Steps of every start before the best of them go on. */
const firstSteps = 12;
const finalSteps = 300;
/** Starts that go on to the end. */
const finalists = 3;
/** Two minima are one where their χ² agree to this part. */
const agrees = 1e-6;

/** @throws ParameterError naming the point and what is wrong with it */
function checkPoints(points: readonly FitPoint[], free: number): void {
	points.forEach(({ radius, speed, error }, i) => {
		const wrong = !(radius > 0 && radius < Infinity)
			? 'radius'
			: !Number.isFinite(speed)
				? 'speed'
				: null;
		if (wrong)
			refuse(
				i,
				wrong,
				`Point ${i + 1}: its ${wrong} must be a number${wrong === 'radius' ? ' above 0 kpc' : ''}.`
			);
		if (!(error > 0 && error < Infinity)) {
			refuse(
				i,
				'error',
				`Point ${i + 1}: its error must be a number above 0 km/s; leave the point out.`
			);
		}
	});
	if (points.length < free) {
		throw new ParameterError({
			path: ['points'],
			parameter: 'points',
			message: `${points.length} points cannot fix ${free} free parameters.`
		});
	}
}

function refuse(index: number, parameter: string, message: string): never {
	throw new ParameterError({ path: ['points', index, parameter], parameter, message });
}

const toSolver = (c: Coordinate, value: number) => (c.scale === 'log' ? Math.log(value) : value);
const fromSolver = (c: Coordinate, x: number) =>
	Math.min(c.max, Math.max(c.min, c.scale === 'log' ? Math.exp(x) : x));

/**
 * Weighted least squares of a mass model to measured speeds: Σ((speed − v(R))/error)² over the free
 * parameters within their bounds, log parameters by their logarithm. Several starts spread over the
 * shapes by a seeded sequence guard against a lesser minimum; the given spec is one of them.
 * Standard errors are those of the curvature, (JᵀJ)⁻¹, at the best values for errors as given
 * (Press et al. 2007, Numerical Recipes, Sec. 15.6); a parameter at a bound has none, and the others
 * are as if it stayed there.
 * @throws ParameterError naming the point, component or parameter at fault
 */
export function fitRotationCurve(options: FitOptions): FitResult {
	const { spec, points, free, seed = 1, starts = usualStarts } = options;
	if (free.length === 0) {
		const message = 'At least one parameter must be free.';
		throw new ParameterError({ path: ['free'], parameter: 'free', message });
	}
	checkPoints(points, free.length);
	const problem = new Problem(
		spec,
		free,
		points.map(({ radius }) => radius)
	);
	const { coordinates } = problem;
	const squares = squaresOf(problem, points);
	const own = coordinates.map((c) => valueIn(spec, c));
	const begin = [own, ...startingValues(problem, points, starts - 1, seed)];
	const minima: Minimum[] = [];
	let iterations = 0;
	let best: Minimum | undefined;
	const valuesOf = (minimum: Minimum) => minimum.x.map((x, i) => fromSolver(coordinates[i], x));
	for (const [done, values] of begin.entries()) {
		if (done > 0 && options.shouldStop?.()) break;
		const minimum = leastSquares(
			squares,
			values.map((v, i) => toSolver(coordinates[i], v)),
			firstSteps
		);
		iterations += minimum.iterations;
		minima.push(minimum);
		if (!best || minimum.sumOfSquares < best.sumOfSquares) best = minimum;
		options.onProgress?.({
			done: done + 1,
			of: begin.length,
			chiSquared: best.sumOfSquares,
			spec: withValues(spec, coordinates, valuesOf(best))
		});
	}
	minima.sort((a, b) => a.sumOfSquares - b.sumOfSquares);
	for (let k = 0; k < Math.min(finalists, minima.length); k++) {
		const final = leastSquares(squares, minima[k].x, finalSteps);
		iterations += final.iterations;
		minima[k] = final;
	}
	const [first] = minima.toSorted((a, b) => a.sumOfSquares - b.sumOfSquares);
	const agreeing = minima.filter(
		({ sumOfSquares }) => sumOfSquares <= first.sumOfSquares * (1 + agrees)
	).length;
	return describe(options, problem, first, { iterations, starts: minima.length, agreeing, seed });
}

function squaresOf(problem: Problem, points: readonly FitPoint[]): LeastSquares {
	const { coordinates } = problem;
	const speeds = new Float64Array(points.length);
	return {
		points: points.length,
		low: coordinates.map((c) => toSolver(c, c.min)),
		high: coordinates.map((c) => toSolver(c, c.max)),
		at(x, residuals, slopes) {
			problem.speedsAndSlopes(
				x.map((value, i) => fromSolver(coordinates[i], value)),
				speeds,
				slopes
			);
			for (let k = 0; k < points.length; k++) {
				const { speed, error } = points[k];
				residuals[k] = (speeds[k] - speed) / error;
				for (const column of slopes) column[k] /= error;
			}
		}
	};
}

function describe(
	{ spec, points }: FitOptions,
	problem: Problem,
	minimum: Minimum,
	counts: Pick<FitResult, 'iterations' | 'starts' | 'agreeing' | 'seed'>
): FitResult {
	const { coordinates } = problem;
	const values = minimum.x.map((x, i) => fromSolver(coordinates[i], x));
	const walls = coordinates.map((c, i) =>
		wallOf(minimum.x[i], toSolver(c, c.min), toSolver(c, c.max))
	);
	const solver = covarianceOf(
		minimum.curvature,
		walls.map((wall) => wall === null)
	);
	/** Natural units for one solver's unit. */
	const unit = coordinates.map((c, i) => (c.scale === 'log' ? values[i] : 1));
	const covariance = solver.map((row, i) => row.map((value, j) => value * unit[i] * unit[j]));
	const correlation = solver.map((row, i) =>
		row.map((value, j) => (i === j ? 1 : value / Math.sqrt(solver[i][i] * solver[j][j])))
	);
	const parameters: FittedParameter[] = coordinates.map((c, i) => ({
		componentId: c.componentId,
		parameter: c.parameter,
		unit: c.info.unit,
		scale: c.scale,
		min: c.min,
		max: c.max,
		value: values[i],
		error: Math.sqrt(covariance[i][i]),
		atBound: walls[i]
	}));
	const speeds = new Float64Array(points.length);
	const slopes = coordinates.map(() => new Float64Array(points.length));
	problem.speedsAndSlopes(values, speeds, slopes);
	const nameOf = (id: string) => spec.components.find((one) => one.id === id)?.name || id;
	const degreesOfFreedom = points.length - coordinates.length;
	return {
		spec: withValues(spec, coordinates, values),
		parameters,
		covariance,
		correlation,
		chiSquared: minimum.sumOfSquares,
		degreesOfFreedom,
		reducedChiSquared: degreesOfFreedom > 0 ? minimum.sumOfSquares / degreesOfFreedom : NaN,
		converged: minimum.converged,
		...counts,
		undecided: undecidedWords(coordinates, parameters, correlation, nameOf),
		residuals: Float64Array.from(points, ({ speed }, k) => speed - speeds[k])
	};
}

function wallOf(x: number, low: number, high: number): 'min' | 'max' | null {
	const near = 1e-6 * (high - low);
	return x <= low + near ? 'min' : x >= high - near ? 'max' : null;
}

/** Inverse of the curvature over what is open; NaN for the rest, and where it cannot be inverted. */
function covarianceOf(curvature: readonly number[][], isOpen: readonly boolean[]): number[][] {
	const n = curvature.length;
	const result = Array.from({ length: n }, () => new Array<number>(n).fill(NaN));
	const open = Array.from({ length: n }, (_, i) => i).filter((i) => isOpen[i]);
	const matrix = open.map((i) => open.map((j) => curvature[i][j]));
	open.forEach((i, k) => {
		const column = solvePositive(
			matrix,
			open.map((_, m) => (m === k ? 1 : 0))
		);
		if (column) open.forEach((j, m) => (result[j][i] = column[m]));
	});
	return result;
}

function valueIn(spec: MassModelSpec, { componentId, parameter, min, max }: Coordinate): number {
	const component = spec.components.find(({ id }) => id === componentId);
	const value =
		parameter === 'factor' ? (component?.factor ?? 1) : component?.parameters[parameter];
	return Math.min(max, Math.max(min, typeof value === 'number' ? value : min));
}

/** The spec with the values of the coordinates put in. */
function withValues(
	spec: MassModelSpec,
	coordinates: readonly Coordinate[],
	values: readonly number[]
): MassModelSpec {
	return {
		...spec,
		components: spec.components.map((component) => {
			let changed = component;
			coordinates.forEach(({ componentId, parameter }, i) => {
				if (componentId !== component.id) return;
				changed =
					parameter === 'factor'
						? { ...changed, factor: values[i] }
						: { ...changed, parameters: { ...changed.parameters, [parameter]: values[i] } };
			});
			return changed;
		})
	};
}
