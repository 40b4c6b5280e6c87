import type { MassModel } from './types';

/** Far enough to hold all of a body whose mass has an end, kpc. */
const everywhere = 1e9;

/**
 * Radius that holds half of all mass, kpc: of a disc its own mass inside the cylinder. Infinity where
 * the mass has no end, NaN where there is none.
 */
export function halfMassRadius(model: MassModel): number {
	const whole = model.enclosedMass(everywhere);
	if (!(whole > 0)) return NaN;
	// A mass that still grows there by a part in a thousand a decade has no end.
	if (whole > model.enclosedMass(everywhere / 10) * 1.001) return Infinity;
	let low = 1e-9;
	let high = everywhere;
	if (model.enclosedMass(low) >= whole / 2) return 0;
	for (let i = 0; i < 120; i++) {
		const middle = Math.sqrt(low * high);
		if (model.enclosedMass(middle) < whole / 2) low = middle;
		else high = middle;
	}
	return Math.sqrt(low * high);
}

/** Radii from which unlit matter outdoes lit matter for good, kpc; null where it never does. */
export interface Overtaking {
	/** In pull: half of v² is from unlit matter. What a speed chart shows. */
	pull: number | null;
	/** In mass inside the radius. */
	mass: number | null;
}

/** @param to the outermost radius that is looked at, kpc */
export function overtaking(model: MassModel, to = 200): Overtaking {
	const [lit, unlit] = [model.lit(), model.unlit()];
	const excess = {
		pull: (r: number) => unlit.circularVelocity(r) ** 2 - lit.circularVelocity(r) ** 2,
		mass: (r: number) => unlit.enclosedMass(r) - lit.enclosedMass(r)
	};
	return { pull: lastRise(excess.pull, to), mass: lastRise(excess.mass, to) };
}

/** Where f rises above 0 and stays so up to `to`; the inner end where it is above 0 everywhere. */
function lastRise(f: (r: number) => number, to: number): number | null {
	const from = 0.001;
	const count = 600;
	if (!(f(to) > 0)) return null;
	let above = to;
	for (let i = count - 2; i >= 0; i--) {
		const r = from * (to / from) ** (i / (count - 1));
		if (!(f(r) > 0)) {
			let low = r;
			for (let k = 0; k < 60; k++) {
				const middle = Math.sqrt(low * above);
				if (f(middle) > 0) above = middle;
				else low = middle;
			}
			return above;
		}
		above = r;
	}
	return from;
}
