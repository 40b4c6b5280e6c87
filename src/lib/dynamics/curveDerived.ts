import type { MassModel } from './types';

/** Oort's constants, km/s/kpc. */
export interface OortConstants {
	/** A = −½ R dΩ/dR: how fast neighbouring rings slide past each other. */
	A: number;
	/** B = A − Ω: half the local spin. */
	B: number;
}

/**
 * By κ² = −4BΩ: B = −κ²/(4Ω), A = Ω + B. Exact wherever κ is. Oort 1927, BAN 3, 275;
 * Binney and Tremaine 2008, Sec. 3.2.3. NaN where nothing turns or circles are unstable.
 * @param R kpc
 */
export function oortConstants(model: MassModel, R: number): OortConstants {
	const omega = model.circularFrequency(R);
	const B = -(model.epicycleFrequency(R) ** 2) / (4 * omega);
	return { A: omega + B, B };
}

/** dv/dR of the circular speed, km/s/kpc: −(A + B). 0 on a flat curve. @param R kpc */
export function circularSpeedSlope(model: MassModel, R: number): number {
	const { A, B } = oortConstants(model, R);
	return -(A + B);
}

/** Radii of a scan, kpc, evenly by their ratio. */
const scan = (from: number, to: number, count: number) =>
	Array.from({ length: count }, (_, i) => from * (to / from) ** (i / (count - 1)));

/** Where f changes its sign between two radii, by halving. */
function rootBetween(f: (R: number) => number, low: number, high: number): number {
	const rising = f(low) < 0;
	for (let i = 0; i < 60; i++) {
		const middle = Math.sqrt(low * high);
		if (f(middle) < 0 === rising) low = middle;
		else high = middle;
	}
	return Math.sqrt(low * high);
}

function rootsOf(f: (R: number) => number, from: number, to: number): number[] {
	const radii = scan(from, to, 600);
	const values = radii.map(f);
	return radii.flatMap((R, i) =>
		i > 0 && values[i - 1] * values[i] < 0 ? [rootBetween(f, radii[i - 1], R)] : []
	);
}

/** Radii (kpc, rising) at which stars and a turning pattern keep step; often one of each, or none. */
export interface Resonances {
	/** Ω = Ωp: stars and pattern turn together. */
	corotation: number[];
	/** Ω − κ/m = Ωp. */
	innerLindblad: number[];
	/** Ω + κ/m = Ωp. */
	outerLindblad: number[];
}

/**
 * Every crossing between two radii. Binney and Tremaine 2008, Sec. 3.3.3.
 * @param patternSpeed Ωp, km/s/kpc @param arms m, 2 for two arms or a bar
 * @param from above 0, kpc @param to kpc
 */
export function resonances(
	model: MassModel,
	patternSpeed: number,
	{ arms = 2, from = 0.05, to = 200 }: { arms?: number; from?: number; to?: number } = {}
): Resonances {
	const crossings = (share: number) =>
		rootsOf(
			(R) => model.circularFrequency(R) + share * model.epicycleFrequency(R) - patternSpeed,
			from,
			to
		);
	return {
		corotation: rootsOf((R) => model.circularFrequency(R) - patternSpeed, from, to),
		innerLindblad: crossings(-1 / arms),
		outerLindblad: crossings(1 / arms)
	};
}

/**
 * The fastest circular orbit between two radii, and where. At the outer end where the curve still
 * rises there.
 * @param from above 0, kpc @param to kpc @returns kpc, km/s
 */
export function peakSpeed(
	model: MassModel,
	from = 0.01,
	to = 200
): { radius: number; speed: number } {
	const radii = scan(from, to, 400);
	const speeds = radii.map((R) => model.circularVelocity(R));
	const best = speeds.reduce((top, v, i) => (v > speeds[top] ? i : top), 0);
	let low = Math.log(radii[Math.max(0, best - 1)]);
	let high = Math.log(radii[Math.min(radii.length - 1, best + 1)]);
	// Golden section: Kiefer 1953, Proc. AMS 4, 502.
	const golden = (Math.sqrt(5) - 1) / 2;
	for (let i = 0; i < 60; i++) {
		const [a, b] = [high - golden * (high - low), low + golden * (high - low)];
		if (model.circularVelocity(Math.exp(a)) < model.circularVelocity(Math.exp(b))) low = a;
		else high = b;
	}
	const radius = Math.exp((low + high) / 2);
	return { radius, speed: model.circularVelocity(radius) };
}
