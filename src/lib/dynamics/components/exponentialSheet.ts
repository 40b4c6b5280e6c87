import { scaledK } from '../bessel';
import type { Acceleration } from '../types';
import { gaussLegendre } from './gaussLegendre';

/*
 * The field of a razor-thin exponential disc off its plane.
 *
 * Such a disc is a sum of Kuzmin discs of scale length a with weights 2πΣ0 a J1(a/Rd) (the inverse
 * Laplace transform of its Hankel transform 2πΣ0Rd²/(1 + k²Rd²)^(3/2); the idea is that of Evans and
 * de Zeeuw 1992, MNRAS 257, 152). Turning the path of that integral to the imaginary axis, a = is,
 * replaces the oscillating J1 by K1, which dies exponentially:
 *
 *   Φ(R,z) = −4GΣ0 ∫ s K1(s/Rd) Re Q ds,   Q = 1/√(R² + (|z| + is)²),   s from 0 to infinity.
 *
 * Differentiating under the integral and integrating by parts once, with (sK1(s/Rd))' = −(s/Rd) K0:
 *
 *   ∂Φ/∂|z| = −(4GΣ0/Rd) ∫ s K0(s/Rd) Im Q ds
 *   ∂Φ/∂R  = (4GΣ0/(R Rd)) ∫ s K0(s/Rd) Im[(|z| + is) Q] ds
 *
 * Q has a sharp turn of width |z| at s = R; with s = R + |z| sinh u it is smooth in u.
 * Tests compare with a 30-digit quadrature of the Hankel integral: better than 1e-9.
 */

const rule = gaussLegendre(16);
/** In scale lengths: beyond it e^-s is below 1e-17. */
const FAR = 42;

type Visit = (s: number, beyond: number, weight: number) => void;

/** Calls `visit` with s, s − R (to full precision) and the weight of each node. z > 0. */
function eachNode(R: number, z: number, Rd: number, visit: Visit): void {
	const end = FAR * Rd;
	const first = Math.min(Rd, 0.5 * Math.hypot(R, z));
	// s = first · t⁴ takes the edge off the logarithm of K at s = 0.
	for (let i = 0; i < rule.nodes.length; i++) {
		const t = 0.5 * (1 + rule.nodes[i]);
		const s = first * t ** 4;
		visit(s, s - R, 2 * first * t ** 3 * rule.weights[i]);
	}
	const far = R > 1.2 * end;
	if (far) {
		// The sharp turn lies where nothing is left of K: even steps will do.
		for (let from = first; from < end; from += 3 * Rd) {
			const half = 0.5 * Math.min(3 * Rd, end - from);
			for (let i = 0; i < rule.nodes.length; i++) {
				const s = from + half * (1 + rule.nodes[i]);
				visit(s, s - R, half * rule.weights[i]);
			}
		}
		return;
	}
	const last = Math.asinh((end - R) / z);
	let from = Math.asinh((first - R) / z);
	while (from < last) {
		const to = Math.min(last, from + 1, Math.asinh(Math.sinh(from) + (3 * Rd) / z));
		const half = 0.5 * (to - from);
		for (let i = 0; i < rule.nodes.length; i++) {
			const u = from + half * (1 + rule.nodes[i]);
			const beyond = z * Math.sinh(u);
			visit(R + beyond, beyond, half * rule.weights[i] * z * Math.cosh(u));
		}
		from = to;
	}
}

/** √(A + iB) with real part ≥ 0, without cancellation. */
function complexRoot(A: number, B: number, out: { re: number; im: number }): void {
	const length = Math.hypot(A, B);
	if (A >= 0) {
		out.re = Math.sqrt(0.5 * (length + A));
		out.im = out.re === 0 ? 0 : (0.5 * B) / out.re;
	} else {
		out.im = Math.sqrt(0.5 * (length - A)) * (B < 0 ? -1 : 1);
		out.re = (0.5 * B) / out.im;
	}
}

/**
 * @param gSigma G Σ0, (km/s)²/kpc
 * @param Rd scale length, kpc
 * @param z not 0
 * @returns (km/s)²
 */
export function exponentialSheetPotential(
	gSigma: number,
	Rd: number,
	R: number,
	z: number
): number {
	const height = Math.abs(z);
	const bessel = { k0: 0, k1: 0 };
	const root = { re: 0, im: 0 };
	let sum = 0;
	eachNode(R, height, Rd, (s, beyond, weight) => {
		scaledK(s / Rd, bessel);
		complexRoot(height * height - beyond * (R + s), 2 * s * height, root);
		const size = root.re * root.re + root.im * root.im;
		sum += weight * s * Math.exp(-s / Rd) * bessel.k1 * (root.re / size);
	});
	return -4 * gSigma * sum;
}

/** Adds scale times the acceleration at (R, z), z not 0, to `out`; (km/s)²/kpc. */
export function addExponentialSheetAcceleration(
	gSigma: number,
	Rd: number,
	R: number,
	z: number,
	scale: number,
	out: Acceleration
): void {
	const height = Math.abs(z);
	const bessel = { k0: 0, k1: 0 };
	const root = { re: 0, im: 0 };
	let along = 0;
	let across = 0;
	eachNode(R, height, Rd, (s, beyond, weight) => {
		scaledK(s / Rd, bessel);
		const kernel = weight * s * Math.exp(-s / Rd) * bessel.k0;
		complexRoot(height * height - beyond * (R + s), 2 * s * height, root);
		const size = root.re * root.re + root.im * root.im;
		const qr = root.re / size;
		const qi = -root.im / size;
		across += kernel * qi;
		along += kernel * (R >= height ? s * qr + height * qi : turnNearAxis(R, height, s, root));
	});
	const strength = (4 * gSigma * scale) / Rd;
	if (R > 0) out.R -= (strength / R) * along;
	out.z += strength * Math.sign(z) * across;
}

/**
 * Im[(z + is) Q] for R < z, where s Re Q and z Im Q nearly cancel: with ε = (R/(z + is))² and
 * σ = √(1 + ε) it is the imaginary part of 1/σ − 1 = −ε / (σ (1 + σ)).
 */
function turnNearAxis(R: number, z: number, s: number, root: { re: number; im: number }): number {
	const d2 = z * z + s * s;
	const er = (R * R * (z * z - s * s)) / (d2 * d2);
	const ei = (-2 * R * R * z * s) / (d2 * d2);
	complexRoot(1 + er, ei, root);
	// σ(1 + σ) = σ + 1 + ε
	const br = root.re + 1 + er;
	const bi = root.im + ei;
	return -(ei * br - er * bi) / (br * br + bi * bi);
}
