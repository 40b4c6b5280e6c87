import type { Problem } from './Problem';
import { solvePositive } from './boundedLeastSquares';
import type { FitPoint } from './types';

/** Primes of Halton's sequence, one a shape parameter. */
const bases = [2, 3, 5, 7, 11, 13, 17, 19];

/** Halton's sequence, 0 to 1. Halton 1960, Numer. Math. 2, 84. */
function halton(index: number, base: number): number {
	let share = 0;
	let size = 1;
	for (let i = index; i > 0; i = Math.floor(i / base)) {
		size /= base;
		share += size * (i % base);
	}
	return share;
}

/** A stream of 0 ≤ x < 1: Lehmer's generator, MINSTD (Park and Miller 1988, CACM 31(10), 1192). */
function lehmer(seed: number): () => number {
	let state = (Math.abs(Math.trunc(seed)) % 2147483646) + 1;
	return () => {
		state = (state * 48271) % 2147483647;
		return (state - 1) / 2147483646;
	};
}

/**
 * Where to begin, spread evenly over the shapes: lengths from a tenth of the innermost point to ten
 * times the outermost, whatever else over its usual range, all within bounds and shifted by the seed.
 * What v² is linear in is then set by weighted linear least squares in v².
 */
export function startingValues(
	problem: Problem,
	points: readonly FitPoint[],
	count: number,
	seed: number
): number[][] {
	const next = lehmer(seed);
	const shift = problem.coordinates.map(() => next());
	const radii = points.map(({ radius }) => radius);
	const reach = [0.3 * Math.min(...radii), 10 * Math.max(...radii)];
	const shapes = problem.coordinates.filter(({ linear }) => !linear).length;
	return Array.from({ length: shapes === 0 ? 1 : count }, (_, k) => {
		let shape = 0;
		const values = problem.coordinates.map(({ linear, info, min, max, scale }, i) => {
			if (linear) return 1;
			const share = (halton(k + 1, bases[shape++ % bases.length]) + shift[i]) % 1;
			const length = info.unit === 'kpc';
			const low = Math.min(max, Math.max(min, length ? reach[0] : info.usualMin));
			const high = Math.min(max, Math.max(min, length ? reach[1] : info.usualMax));
			if (!(low < high)) return low;
			return scale === 'log' ? low * (high / low) ** share : low + share * (high - low);
		});
		return linearPart(problem, points, values);
	});
}

/** The linear parameters that fit v² best for a shape, kept within their bounds one after the other. */
function linearPart(problem: Problem, points: readonly FitPoint[], values: number[]): number[] {
	const linear = problem.coordinates.flatMap((one, i) => (one.linear ? [i] : []));
	if (linear.length === 0) return values;
	const n = points.length;
	const zero = values.map((value, i) => (linear.includes(i) ? 0 : value));
	const base = problem.speedsSquared(zero, new Float64Array(n));
	const columns = linear.map((i) => {
		const column = problem.speedsSquared(zero.with(i, 1), new Float64Array(n));
		return column.map((value, k) => value - base[k]);
	});
	// An error in v is one of 2v times as much in v².
	const weight = points.map(
		({ speed, error }) => 1 / (2 * Math.max(Math.abs(speed), error) * error) ** 2
	);
	const left = Float64Array.from(points, ({ speed }, k) => speed * Math.abs(speed) - base[k]);
	const result = [...values];
	let open = linear.map((_, i) => i);
	const dot = (a: Float64Array, b: Float64Array) =>
		a.reduce((s, v, k) => s + weight[k] * v * b[k], 0);
	while (open.length > 0) {
		const matrix = open.map((i) =>
			open.map((j) => dot(columns[i], columns[j]) * (i === j ? 1 + 1e-9 : 1))
		);
		const solved = solvePositive(
			matrix,
			open.map((i) => dot(columns[i], left))
		);
		const bounds = open.map((i) => problem.coordinates[linear[i]]);
		const outside = solved
			? solved.findIndex((value, k) => !(value >= bounds[k].min && value <= bounds[k].max))
			: 0;
		if (solved && outside < 0) {
			open.forEach((i, k) => (result[linear[i]] = solved[k]));
			break;
		}
		const at = open[outside];
		const { min, max } = problem.coordinates[linear[at]];
		const value = solved && solved[outside] > max ? max : min;
		result[linear[at]] = value;
		for (let k = 0; k < n; k++) left[k] -= value * columns[at][k];
		open = open.filter((i) => i !== at);
	}
	return result;
}
