import { G } from '../../units';
import { gammaFraction, gammaSeries, lnGamma } from '../incompleteGamma';
import type { SphericalProfile } from './sphericalComponent';

/**
 * ρ = ρ0 x^−p e^(−b x^(1/n)), x = r/a: the common form of the Einasto halo (p = 0) and of the
 * deprojected Sérsic body. With s = b x^(1/n):
 *
 *   M(r) = 4πρ0 a³ n b^(−n(3−p)) γ(n(3−p), s)
 *   Φ(r) = −G M(r)/r − 4πGρ0 a² n b^(−n(2−p)) Γ(n(2−p), s)
 *
 * Both are evaluated by what is left of γ and Γ without s^a e^−s, so that no digit is lost at
 * either end. p < 2.
 * @param logDensity ln ρ0, Msun/kpc³ @param length a, kpc
 */
export function gammaProfile(
	logDensity: number,
	length: number,
	p: number,
	b: number,
	n: number
): SphericalProfile {
	const volume = 4 * Math.PI * length ** 3 * n;
	const inner = n * (3 - p);
	const outer = n * (2 - p);
	const logB = Math.log(b);
	const total = Math.exp(logDensity + lnGamma(inner) - inner * logB);
	const centre = Math.exp(logDensity + lnGamma(outer) - outer * logB);
	const power = 1 / n;

	/** M/(4πa³n) and, beside it, x and s. */
	function mass(x: number): number {
		const s = b * x ** power;
		const size = Math.exp(logDensity - s) * x ** (3 - p);
		return s < inner + 1 ? size * gammaSeries(inner, s) : total - size * gammaFraction(inner, s);
	}
	function outside(x: number): number {
		const s = b * x ** power;
		const size = Math.exp(logDensity - s) * x ** (2 - p);
		return s < outer + 1 ? centre - size * gammaSeries(outer, s) : size * gammaFraction(outer, s);
	}
	const enclosedMass = (r: number) => (r === 0 ? 0 : volume * mass(r / length));
	const density = (r: number) =>
		r === 0
			? p > 0
				? Infinity
				: Math.exp(logDensity)
			: Math.exp(logDensity - b * (r / length) ** power) * (r / length) ** -p;
	return {
		circularVelocitySquared: (r) => (r === 0 ? 0 : (G * enclosedMass(r)) / r),
		circularFrequencySquared: (r) =>
			r === 0 ? (4 / 3) * Math.PI * G * density(0) : (G * enclosedMass(r)) / (r * r * r),
		enclosedMass,
		density,
		potential(r) {
			const x = r / length;
			const far = 4 * Math.PI * G * length * length * n;
			return -far * outside(x) - (r === 0 ? 0 : (G * enclosedMass(r)) / r);
		},
		escapable: true
	};
}
