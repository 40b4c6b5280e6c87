/**
 * ∫ t^(a−1) (1−t)^(b−1) dt from 0 to x, for a > 0, any b, and x up to 0.9:
 * x^a (1−x)^b / a × Σ (a+b)_k/(a+1)_k x^k, all terms positive where a + b > 0.
 * Abramowitz and Stegun 1964, 26.5.4 in the form of 15.3.3.
 */
export function betaBelow(a: number, b: number, x: number): number {
	if (x <= 0) return 0;
	let term = 1;
	let sum = 1;
	for (let k = 0; k < 2000; k++) {
		term *= ((a + b + k) / (a + 1 + k)) * x;
		sum += term;
		if (Math.abs(term) < 1e-17 * Math.abs(sum)) break;
	}
	return (Math.exp(a * Math.log(x) + b * Math.log1p(-x)) / a) * sum;
}

/**
 * How far up `betaBetween` may go for this b without its terms, of either sign, growing above their
 * sum: 1/2, and less the larger b is.
 */
export const betaSeam = (b: number): number => (b > 4 ? Math.max(0.1, 2 / b) : 0.5);

/**
 * ∫ t^(a−1) (1−t)^(b−1) dt from x to top, for any a and b and 0 < x ≤ top ≤ betaSeam(b): the binomial
 * series of (1−t)^(b−1) term by term. Where a + k is near 0 its term is nearly a logarithm and is
 * taken so.
 */
export function betaBetween(a: number, b: number, x: number, top: number): number {
	const ratio = Math.log(top / x);
	let low = Math.exp(a * Math.log(x));
	let high = Math.exp(a * Math.log(top));
	let factor = 1;
	let sum = 0;
	for (let k = 0; k < 2000; k++) {
		const s = a + k;
		const piece =
			Math.abs(s * ratio) < 0.5
				? low * (s === 0 ? ratio : Math.expm1(s * ratio) / s)
				: (high - low) / s;
		const term = factor * piece;
		sum += term;
		if (k > 2 && Math.abs(factor * high) < 1e-18 * Math.abs(sum) && s > 0) break;
		factor *= (k + 1 - b) / (k + 1);
		if (factor === 0) break;
		low *= x;
		high *= top;
	}
	return sum;
}
