/** A function of a few variables whose squares are to be least, within a box. */
export interface LeastSquares {
	/** Fills residuals and, column by column, their derivatives. */
	at(x: readonly number[], residuals: Float64Array, slopes: Float64Array[]): void;
	points: number;
	low: readonly number[];
	high: readonly number[];
}

export interface Minimum {
	x: number[];
	sumOfSquares: number;
	/** No step lowers the sum by more than rounding any more. */
	converged: boolean;
	iterations: number;
	/** JᵀJ at x. */
	curvature: number[][];
	/** Jᵀr at x. */
	gradient: number[];
}

/** Solves a symmetric positive system by Cholesky; null where it is not positive. */
export function solvePositive(
	matrix: readonly number[][],
	right: readonly number[]
): number[] | null {
	const n = right.length;
	const L: number[][] = [];
	for (let i = 0; i < n; i++) {
		L.push([]);
		for (let j = 0; j <= i; j++) {
			let sum = matrix[i][j];
			for (let k = 0; k < j; k++) sum -= L[i][k] * L[j][k];
			if (i === j) {
				if (!(sum > 0)) return null;
				L[i].push(Math.sqrt(sum));
			} else L[i].push(sum / L[j][j]);
		}
	}
	const x = [...right];
	for (let i = 0; i < n; i++) {
		for (let k = 0; k < i; k++) x[i] -= L[i][k] * x[k];
		x[i] /= L[i][i];
	}
	for (let i = n - 1; i >= 0; i--) {
		for (let k = i + 1; k < n; k++) x[i] -= L[k][i] * x[k];
		x[i] /= L[i][i];
	}
	return x;
}

/**
 * The step that makes the damped quadratic model least within the box: whatever would leave the box is
 * put on its wall and the rest solved again.
 */
function boxStep(
	curvature: readonly number[][],
	gradient: readonly number[],
	damping: number,
	x: readonly number[],
	low: readonly number[],
	high: readonly number[]
): number[] | null {
	const n = x.length;
	const step = new Array<number>(n).fill(0);
	let open = Array.from({ length: n }, (_, i) => i).filter(
		(i) => !(x[i] <= low[i] && gradient[i] > 0) && !(x[i] >= high[i] && gradient[i] < 0)
	);
	while (open.length > 0) {
		const closed = Array.from({ length: n }, (_, i) => i).filter((i) => !open.includes(i));
		const matrix = open.map((i) =>
			open.map((j) => curvature[i][j] + (i === j ? damping * (curvature[i][i] + 1e-12) : 0))
		);
		const right = open.map(
			(i) => -gradient[i] - closed.reduce((sum, j) => sum + curvature[i][j] * step[j], 0)
		);
		const solved = solvePositive(matrix, right);
		if (!solved) return null;
		let worst = -1;
		let most = 1e-15;
		open.forEach((i, k) => {
			const over = Math.max(low[i] - x[i] - solved[k], x[i] + solved[k] - high[i]);
			if (over > most) {
				most = over;
				worst = k;
			}
		});
		if (worst < 0) {
			open.forEach((i, k) => (step[i] = solved[k]));
			return step;
		}
		const wall = open[worst];
		step[wall] = (solved[worst] > 0 ? high[wall] : low[wall]) - x[wall];
		open = open.filter((i) => i !== wall);
	}
	return step;
}

/**
 * Levenberg–Marquardt within a box: damping by the diagonal (Marquardt 1963, J. SIAM 11, 431), walls
 * by an active set.
 * @param start within the box
 * @param most steps
 */
export function leastSquares(
	problem: LeastSquares,
	start: readonly number[],
	most: number
): Minimum {
	const n = start.length;
	const { points, low, high } = problem;
	let residuals = new Float64Array(points);
	let slopes = start.map(() => new Float64Array(points));
	let nextResiduals = new Float64Array(points);
	let nextSlopes = start.map(() => new Float64Array(points));
	let x = start.map((value, i) => Math.min(high[i], Math.max(low[i], value)));
	problem.at(x, residuals, slopes);
	let sum = squares(residuals);
	let damping = 1e-3;
	let converged = false;
	let iterations = 0;
	let still = 0;
	const curvature = start.map(() => new Array<number>(n).fill(0));
	const gradient = new Array<number>(n).fill(0);
	normal(residuals, slopes, curvature, gradient);
	while (iterations < most && !converged) {
		iterations++;
		const step = boxStep(curvature, gradient, damping, x, low, high);
		if (step === null) {
			damping = Math.max(1e-9, damping * 10);
			if (damping > 1e12) converged = true;
			continue;
		}
		// What the quadratic model still promises: less than rounding is nothing.
		if (damping <= 1e3 && promise(curvature, gradient, step) <= 1e-13 * sum) {
			converged = true;
			break;
		}
		const next = x.map((value, i) => Math.min(high[i], Math.max(low[i], value + step[i])));
		problem.at(next, nextResiduals, nextSlopes);
		const nextSum = squares(nextResiduals);
		if (nextSum < sum) {
			still = sum - nextSum <= 1e-12 * sum ? still + 1 : 0;
			x = next;
			sum = nextSum;
			[residuals, nextResiduals] = [nextResiduals, residuals];
			[slopes, nextSlopes] = [nextSlopes, slopes];
			normal(residuals, slopes, curvature, gradient);
			damping = Math.max(1e-12, damping / 10);
			if (still >= 2) converged = true;
		} else {
			damping = Math.max(1e-9, damping * 10);
			// Neither the quadratic model nor the steepest way down goes lower: this is the bottom.
			if (damping > 1e10) converged = true;
		}
	}
	return { x, sumOfSquares: sum, converged, iterations, curvature, gradient };
}

/** By how much a step lowers the sum of squares, as the quadratic model has it. */
function promise(
	curvature: readonly number[][],
	gradient: readonly number[],
	step: readonly number[]
): number {
	let sum = 0;
	for (let i = 0; i < step.length; i++) {
		let along = 2 * gradient[i];
		for (let j = 0; j < step.length; j++) along += curvature[i][j] * step[j];
		sum -= along * step[i];
	}
	return sum;
}

function squares(values: Float64Array): number {
	let sum = 0;
	for (const value of values) sum += value * value;
	return Number.isNaN(sum) ? Infinity : sum;
}

function normal(
	residuals: Float64Array,
	slopes: readonly Float64Array[],
	curvature: number[][],
	gradient: number[]
): void {
	for (let i = 0; i < slopes.length; i++) {
		let g = 0;
		for (let k = 0; k < residuals.length; k++) g += slopes[i][k] * residuals[k];
		gradient[i] = g;
		for (let j = 0; j <= i; j++) {
			let sum = 0;
			for (let k = 0; k < residuals.length; k++) sum += slopes[i][k] * slopes[j][k];
			curvature[i][j] = sum;
			curvature[j][i] = sum;
		}
	}
}
