import { METRES_IN_KPC } from '../units';
import type { FrequencySums, GravityLaw } from './types';

/** How a law is shown to people. Those other than Newton's stand beside the halo, not on it. */
export interface LawInfo {
	law: GravityLaw;
	label: string;
	/** One sentence for people who are not astronomers. */
	help: string;
	/** Author, year, journal. */
	source: string;
}

export const gravityLaws: LawInfo[] = [
	{
		law: 'newton',
		label: 'Newton’s law',
		help: 'Matter pulls as it does in the solar system; what the light cannot explain is unseen matter.',
		source: 'Newton 1687, Principia'
	},
	{
		law: 'radial-acceleration',
		label: 'Radial acceleration relation',
		help: 'A relation measured in many galaxies: the pull that is felt follows from the light alone. Some astronomers read it as a law of its own, most as a trace of the halo.',
		source: 'McGaugh, Lelli and Schombert 2016, PRL 117, 201101'
	},
	{
		law: 'modified-simple',
		label: 'Modified dynamics, simple form',
		help: 'An alternative to unseen matter that some astronomers defend: weak pulls act more strongly than Newton’s law says. μ(x) = x/(1 + x).',
		source: 'Milgrom 1983, ApJ 270, 365; Famaey and Binney 2005, MNRAS 363, 603'
	},
	{
		law: 'modified-standard',
		label: 'Modified dynamics, standard form',
		help: 'An alternative to unseen matter that some astronomers defend: weak pulls act more strongly than Newton’s law says. μ(x) = x/√(1 + x²).',
		source: 'Milgrom 1983, ApJ 270, 365'
	}
];

/**
 * The acceleration that divides strong pulls from weak ones, (km/s)²/kpc: 1.20e-10 m/s² in both
 * papers. McGaugh, Lelli and Schombert 2016; Milgrom 1983 (values from memory).
 */
export const accelerationScale = (1.2e-10 * METRES_IN_KPC) / 1e6;

/** The pull under a law and how it grows with Newton's. */
export interface Pull {
	/** (km/s)²/kpc. */
	pull: number;
	/** d(pull)/d(Newton's pull). */
	slope: number;
}

/**
 * @param newton Newton's pull of the lit matter, (km/s)²/kpc, not negative
 * @param out written to and returned
 */
export function pullUnder(law: GravityLaw, newton: number, out: Pull): Pull {
	const a = accelerationScale;
	if (law === 'newton' || newton === Infinity) {
		out.pull = newton;
		out.slope = 1;
	} else if (newton === 0) {
		out.pull = 0;
		out.slope = Infinity;
	} else if (law === 'radial-acceleration') {
		// g = gN / (1 − e^−s), s = √(gN/a).
		const s = Math.sqrt(newton / a);
		const left = -Math.expm1(-s);
		out.pull = newton / left;
		out.slope = 1 / left - (0.5 * s * Math.exp(-s)) / (left * left);
	} else if (law === 'modified-simple') {
		// g²/(a + g) = gN.
		const root = Math.sqrt(newton * (0.25 * newton + a));
		out.pull = 0.5 * newton + root;
		out.slope = 0.5 + (0.25 * newton + 0.5 * a) / root;
	} else {
		// g²/√(a² + g²) = gN.
		const root = newton * Math.hypot(0.5 * newton, a);
		out.pull = Math.sqrt(0.5 * newton * newton + root);
		out.slope = (0.5 * newton + (0.25 * newton ** 3 + 0.5 * a * a * newton) / root) / out.pull;
	}
	return out;
}

const own: Pull = { pull: 0, slope: 0 };

/**
 * Turns sums under Newton's law into those under another: with g = f(gN) and gN = R ΩN²,
 * Ω² = g/R, κ² = f′(gN) (κN² − 3ΩN²) + 3Ω², and ν² = νN² g/gN, the law acting along the pull.
 * A net outward pull stays as it is.
 */
export function sumsUnder(law: GravityLaw, R: number, sums: FrequencySums): void {
	const { omega, kappa } = sums;
	if (law === 'newton' || !(omega > 0) || omega === Infinity) return;
	// At the very centre the limit, to as many digits as anything there has.
	const radius = R > 0 ? R : 1e-9;
	pullUnder(law, radius * omega, own);
	sums.omega = own.pull / radius;
	sums.kappa = own.slope * (kappa - 3 * omega) + 3 * sums.omega;
	sums.nu *= sums.omega / omega;
}

/** How many times stronger a law makes a pull. @param newton its size, (km/s)²/kpc, above 0 */
export const boostUnder = (law: GravityLaw, newton: number): number =>
	pullUnder(law, newton, own).pull / newton;
