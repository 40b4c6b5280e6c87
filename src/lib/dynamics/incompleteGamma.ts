const lanczos = [
	0.99999999999980993, 676.5203681218851, -1259.1392167224028, 771.32342877765313,
	-176.61502916214059, 12.507343278686905, -0.13857109526572012, 9.9843695780195716e-6,
	1.5056327351493116e-7
];

/** ln Γ(a), a > 0, to some 14 digits. Lanczos 1964, SIAM J. Numer. Anal. B 1, 86, with g = 7. */
export function lnGamma(a: number): number {
	const x = a - 1;
	let sum = lanczos[0];
	for (let k = 1; k < lanczos.length; k++) sum += lanczos[k] / (x + k);
	const t = x + 7.5;
	return 0.5 * Math.log(2 * Math.PI) + (x + 0.5) * Math.log(t) - t + Math.log(sum);
}

/**
 * γ(a, s) e^s s^−a, the lower incomplete gamma function without what is large or small in it:
 * Σ s^k / (a (a+1) … (a+k)). All terms are positive. Good for s up to some a + 1.
 * Abramowitz and Stegun 1964, 6.5.29.
 */
export function gammaSeries(a: number, s: number): number {
	let term = 1 / a;
	let sum = term;
	for (let k = 1; k < 1000; k++) {
		term *= s / (a + k);
		sum += term;
		if (term < 1e-17 * sum) break;
	}
	return sum;
}

/**
 * Γ(a, s) e^s s^−a, the upper incomplete gamma function without what is large or small in it, by its
 * continued fraction (Legendre's; Abramowitz and Stegun 1964, 6.5.31), for s above some a + 1.
 * Evaluated from the front by Lentz's method.
 */
export function gammaFraction(a: number, s: number): number {
	let b = s + 1 - a;
	let c = 1e300;
	let d = 1 / b;
	let value = d;
	for (let k = 1; k < 1000; k++) {
		const numerator = -k * (k - a);
		b += 2;
		d = 1 / (numerator * d + b);
		c = b + numerator / c;
		const step = c * d;
		value *= step;
		if (Math.abs(step - 1) < 1e-16) break;
	}
	return value;
}

/** P(a, s) = γ(a, s)/Γ(a), between 0 and 1. */
export function gammaShare(a: number, s: number): number {
	if (s <= 0) return 0;
	const size = Math.exp(a * Math.log(s) - s - lnGamma(a));
	return s < a + 1 ? size * gammaSeries(a, s) : 1 - size * gammaFraction(a, s);
}
