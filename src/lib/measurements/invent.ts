import type { MassModel } from '../dynamics/types';
import type { MeasuredPoint } from './types';

export interface InventOptions {
	/** kpc of the first and the last point. */
	from: number;
	to: number;
	points: number;
	/** One standard error, km/s; the scatter is drawn with the same size. */
	error: number;
	/** Whole number; the same seed gives the same points. */
	seed: number;
}

/** A stream of 0 ≤ x < 1: Lehmer's generator, MINSTD (Park and Miller 1988, CACM 31(10), 1192). */
function lehmer(seed: number): () => number {
	let state = (Math.abs(Math.trunc(seed)) % 2147483646) + 1;
	return () => {
		state = (state * 48271) % 2147483647;
		return (state - 1) / 2147483646;
	};
}

/**
 * Invented observed speeds for invented galaxies: the model's own speed with normal scatter, errors a
 * little larger where the disc is faint. Whoever shows them must say that they are invented.
 */
export function inventMeasurements(
	model: Pick<MassModel, 'circularVelocity'>,
	{ from, to, points, error, seed }: InventOptions
): MeasuredPoint[] {
	const next = lehmer(seed);
	const normal = () => Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next());
	const rounded = (value: number) => Math.round(value * 10) / 10;
	return Array.from({ length: points }, (_, i) => {
		const share = points === 1 ? 0 : i / (points - 1);
		const radius = Math.round((from + (to - from) * share) * 100) / 100;
		const sigma = error * (0.8 + 0.6 * share + 0.3 * next());
		return {
			radius,
			speed: rounded(model.circularVelocity(radius) + sigma * normal()),
			error: rounded(sigma)
		};
	});
}
