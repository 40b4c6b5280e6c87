import { G } from '../../units';
import type { SphericalProfile } from './sphericalComponent';

/** (e^(q u) − 1)/q, which is u where q = 0. */
const grown = (q: number, u: number) => (q === 0 ? u : Math.expm1(q * u) / q);

/**
 * M(r) = M (r/(r+a))^(3−γ), ρ = (3−γ) M a / (4π r^γ (r+a)^(4−γ)),
 * Φ = −G M / ((2−γ) a) × (1 − (r/(r+a))^(2−γ)), for γ = 2 (G M/a) ln(r/(r+a)).
 * Dehnen 1993, MNRAS 265, 250; γ = 2 is Jaffe 1983, MNRAS 202, 995.
 */
export function dehnenProfile(mass: number, a: number, gamma: number): SphericalProfile {
	const gm = G * mass;
	/** ln(r/(r+a)). */
	const inside = (r: number) => -Math.log1p(a / r);
	const share = (r: number, power: number) => Math.exp(power * inside(r));
	const density = (r: number) =>
		r === 0
			? gamma > 0
				? Infinity
				: (3 * mass) / (4 * Math.PI * a ** 3)
			: ((3 - gamma) * mass * a * share(r, 4 - gamma)) / (4 * Math.PI * r ** 4);
	return {
		circularVelocitySquared(r) {
			if (r === 0) return gamma < 2 ? 0 : gamma > 2 ? Infinity : gm / a;
			return (gm / r) * share(r, 3 - gamma);
		},
		circularFrequencySquared(r) {
			if (r === 0) return gamma > 0 ? Infinity : gm / a ** 3;
			return (gm / (r * r * r)) * share(r, 3 - gamma);
		},
		enclosedMass: (r) => (r === 0 ? 0 : mass * share(r, 3 - gamma)),
		density,
		potential(r) {
			if (r === 0) return gamma < 2 ? -gm / ((2 - gamma) * a) : -Infinity;
			return (gm / a) * grown(2 - gamma, inside(r));
		},
		escapable: true
	};
}
