export interface Quadrature {
	/** Abscissae on −1 to 1. */
	nodes: Float64Array;
	weights: Float64Array;
}

/**
 * Gauss–Legendre rule of n points, its nodes found by Newton's method on the Legendre polynomial.
 * Abramowitz and Stegun 1964, 25.4.29.
 */
export function gaussLegendre(n: number): Quadrature {
	const nodes = new Float64Array(n);
	const weights = new Float64Array(n);
	for (let i = 0; i < n; i++) {
		let x = Math.cos((Math.PI * (i + 0.75)) / (n + 0.5));
		let slope = 1;
		for (let round = 0; round < 8; round++) {
			let before = 1;
			let value = x;
			for (let k = 2; k <= n; k++) {
				[before, value] = [value, ((2 * k - 1) * x * value - (k - 1) * before) / k];
			}
			slope = (n * (x * value - before)) / (x * x - 1);
			x -= value / slope;
		}
		nodes[i] = x;
		weights[i] = 2 / ((1 - x * x) * slope * slope);
	}
	return { nodes, weights };
}
