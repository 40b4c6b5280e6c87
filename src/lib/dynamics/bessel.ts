/** e^-x I0(x) and e^-x I1(x). */
export interface ScaledI {
	i0: number;
	i1: number;
}

/** e^x K0(x) and e^x K1(x). */
export interface ScaledK {
	k0: number;
	k1: number;
}

const EULER_GAMMA = 0.5772156649015329;
const MOST_TERMS = 60;

// 1/k², 1/k, and the harmonic numbers 1 + 1/2 + … + 1/k, by index k.
const inverseSquare = new Float64Array(MOST_TERMS + 2);
const inverse = new Float64Array(MOST_TERMS + 2);
const harmonic = new Float64Array(MOST_TERMS + 2);
for (let k = 1; k < MOST_TERMS + 2; k++) {
	inverse[k] = 1 / k;
	inverseSquare[k] = 1 / (k * k);
	harmonic[k] = harmonic[k - 1] + 1 / k;
}

/**
 * Chebyshev coefficients of √x e^x K(x) in u = 4/x − 1 on x ≥ 2, worked out for this file with
 * mpmath at 50 digits; the first is already halved.
 */
const K0_TAIL = Float64Array.of(
	1.2201515410329777273,
	-0.031448101311964500543,
	0.0015698838857300533749,
	-0.00012849549581627802638,
	0.000013949813718876499364,
	-1.8317555227191194848e-6,
	2.7668136394450150761e-7,
	-4.6604898976879476656e-8,
	8.5740340174142260858e-9,
	-1.6975345093890615156e-9,
	3.5773972814003284472e-10,
	-7.9574892444773970377e-11,
	1.855949114954926555e-11,
	-4.5145978833745191751e-12,
	1.1403405882073442347e-12,
	-2.9800969231481783548e-13,
	8.0328907750683743694e-14,
	-2.2275133267462963604e-14,
	6.3400764762766459661e-15,
	-1.8485933779209071694e-15,
	5.5120559994043333649e-16,
	-1.6782311257549006383e-16,
	5.2103917776435541125e-17
);
const K1_TAIL = Float64Array.of(
	1.3603130952422213347,
	0.10392373657681723844,
	-0.0028578168596227793868,
	0.00019521551847135163111,
	-0.0000193619797416608296,
	2.4064849478372171171e-6,
	-3.5019606030878125421e-7,
	5.7410841254500492923e-8,
	-1.0345762465678097027e-8,
	2.0150497551970346161e-9,
	-4.1903547593419255842e-10,
	9.2183151876053141258e-11,
	-2.1299678384277910216e-11,
	5.1396396734823435404e-12,
	-1.2891739609498229352e-12,
	3.3484196660522431201e-13,
	-8.9767051820101460692e-14,
	2.4771544242195986813e-14,
	-7.0198370892147688513e-15,
	2.0387031662398608799e-15,
	-6.0570472706430178228e-16,
	1.8380935752430454256e-16,
	-5.6894628491936483743e-17
);

/**
 * Modified Bessel functions of the first kind, scaled so that they never overflow.
 * Below x = 20 the power series (all terms positive, so no digits are lost), above it the
 * asymptotic series, whose least term there is about e^-40.
 * Abramowitz and Stegun 1964, 9.6.12 and 9.7.1. Relative error below 1e-14.
 * @param x not negative
 */
export function scaledI(x: number, out: ScaledI): void {
	if (x < 20) {
		const q = 0.25 * x * x;
		let term = 1;
		let sum0 = 1;
		let sum1 = 1;
		for (let k = 1; k < MOST_TERMS; k++) {
			term *= q * inverseSquare[k];
			sum0 += term;
			sum1 += term * inverse[k + 1];
			if (term < 1e-17 * sum1) break;
		}
		const scale = Math.exp(-x);
		out.i0 = scale * sum0;
		out.i1 = scale * 0.5 * x * sum1;
		return;
	}
	const step = 1 / (8 * x);
	let term0 = 1;
	let term1 = 1;
	let sum0 = 1;
	let sum1 = 1;
	for (let k = 1; k < MOST_TERMS; k++) {
		const odd = (2 * k - 1) ** 2;
		term0 *= odd * step * inverse[k];
		term1 *= (odd - 4) * step * inverse[k];
		sum0 += term0;
		sum1 += term1;
		if (term0 < 1e-17) break;
	}
	const scale = 1 / Math.sqrt(2 * Math.PI * x);
	out.i0 = scale * sum0;
	out.i1 = scale * sum1;
}

/** Clenshaw's sum of a Chebyshev series at u, −1 to 1. */
function chebyshev(coefficients: Float64Array, u: number): number {
	const twice = 2 * u;
	let b1 = 0;
	let b2 = 0;
	for (let k = coefficients.length - 1; k > 0; k--) {
		const b0 = coefficients[k] + twice * b1 - b2;
		b2 = b1;
		b1 = b0;
	}
	return coefficients[0] + u * b1 - b2;
}

/**
 * Modified Bessel functions of the second kind, scaled so that they never underflow.
 * Below x = 2 the logarithmic series (Abramowitz and Stegun 1964, 9.6.11 and 9.6.13), above it
 * Chebyshev series. Relative error below 1e-14. Both are Infinity at 0.
 * @param x not negative
 */
export function scaledK(x: number, out: ScaledK): void {
	if (x >= 2) {
		const u = 4 / x - 1;
		const scale = 1 / Math.sqrt(x);
		out.k0 = scale * chebyshev(K0_TAIL, u);
		out.k1 = scale * chebyshev(K1_TAIL, u);
		return;
	}
	if (x === 0) {
		out.k0 = Infinity;
		out.k1 = Infinity;
		return;
	}
	const q = 0.25 * x * x;
	const logarithm = Math.log(0.5 * x) + EULER_GAMMA;
	let term = 1;
	let sum0 = -logarithm;
	let sum1 = logarithm - 0.5;
	for (let k = 1; k < MOST_TERMS; k++) {
		term *= q * inverseSquare[k];
		sum0 += term * (harmonic[k] - logarithm);
		sum1 += term * inverse[k + 1] * (logarithm - 0.5 * (harmonic[k] + harmonic[k + 1]));
		if (term < 1e-18) break;
	}
	const scale = Math.exp(x);
	out.k0 = scale * sum0;
	out.k1 = scale * (1 / x + 0.5 * x * sum1);
}
