/** A curve through points that makes no wave of its own between them. */
export interface MonotoneCurve {
	/** Value and slope at x, written to `out`; x within the first and the last point. */
	at(x: number, out: { value: number; slope: number }): void;
}

/**
 * Piecewise cubic Hermite interpolation with slopes by which the curve rises and falls only where the
 * points do. Fritsch and Carlson 1980, SIAM J. Numer. Anal. 17, 238, with the weighted harmonic
 * mean of Fritsch and Butland 1984 for the slopes.
 * @param x rising, at least two @param y as many
 */
export function monotoneCurve(x: ArrayLike<number>, y: ArrayLike<number>): MonotoneCurve {
	const n = x.length;
	const step = Float64Array.from({ length: n - 1 }, (_, i) => x[i + 1] - x[i]);
	const secant = Float64Array.from({ length: n - 1 }, (_, i) => (y[i + 1] - y[i]) / step[i]);
	const slope = new Float64Array(n);
	for (let i = 1; i < n - 1; i++) {
		const [left, right] = [secant[i - 1], secant[i]];
		if (left * right <= 0) continue;
		const [a, b] = [2 * step[i] + step[i - 1], step[i] + 2 * step[i - 1]];
		slope[i] = (a + b) / (a / left + b / right);
	}
	slope[0] = n === 2 ? secant[0] : endSlope(step[0], step[1], secant[0], secant[1]);
	slope[n - 1] =
		n === 2 ? secant[0] : endSlope(step[n - 2], step[n - 3], secant[n - 2], secant[n - 3]);
	let last = 0;
	return {
		at(at, out) {
			if (!(at >= x[last] && at <= x[last + 1])) last = pieceOf(x, at);
			const h = step[last];
			const t = (at - x[last]) / h;
			const [d0, d1] = [slope[last], slope[last + 1]];
			const quadratic = 3 * secant[last] - 2 * d0 - d1;
			const cubic = d0 + d1 - 2 * secant[last];
			out.value = y[last] + h * t * (d0 + t * (quadratic + t * cubic));
			out.slope = d0 + t * (2 * quadratic + 3 * t * cubic);
		}
	};
}

/** Three-point slope at an end, kept from overshooting. Moler 2004, Numerical Computing, Sec. 3.6. */
function endSlope(h: number, next: number, secant: number, nextSecant: number): number {
	const slope = ((2 * h + next) * secant - h * nextSecant) / (h + next);
	if (slope * secant <= 0) return 0;
	if (secant * nextSecant <= 0 && Math.abs(slope) > 3 * Math.abs(secant)) return 3 * secant;
	return slope;
}

/** Index of the piece that holds `at`, by halving. */
function pieceOf(x: ArrayLike<number>, at: number): number {
	let low = 0;
	let high = x.length - 2;
	while (low < high) {
		const middle = (low + high + 1) >> 1;
		if (x[middle] <= at) low = middle;
		else high = middle - 1;
	}
	return low;
}
