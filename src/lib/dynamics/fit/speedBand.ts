import { Problem } from './Problem';
import type { FitResult } from './types';

/**
 * One standard error of the model's speed at each radius, by the covariance of the fit: √(gᵀ C g) with
 * g the slope of the speed by each free parameter. 0 where nothing has an error.
 * @param radii kpc @param out km/s, at least as long; filled and returned
 */
export function speedBand(
	result: Pick<FitResult, 'spec' | 'parameters' | 'covariance'>,
	radii: ArrayLike<number>,
	out: Float64Array
): Float64Array {
	const { spec, parameters, covariance } = result;
	const problem = new Problem(spec, parameters, radii);
	const speeds = new Float64Array(radii.length);
	const slopes = parameters.map(() => new Float64Array(radii.length));
	problem.speedsAndSlopes(
		parameters.map(({ value }) => value),
		speeds,
		slopes
	);
	// The slopes are by the solver's coordinates, the covariance is in the parameters' own units.
	const unit = parameters.map(({ scale, value }) => (scale === 'log' ? 1 / value : 1));
	for (let k = 0; k < radii.length; k++) {
		let sum = 0;
		for (let i = 0; i < parameters.length; i++) {
			for (let j = 0; j < parameters.length; j++) {
				const shared = covariance[i][j];
				if (Number.isNaN(shared)) continue;
				sum += slopes[i][k] * unit[i] * shared * slopes[j][k] * unit[j];
			}
		}
		out[k] = Math.sqrt(Math.max(0, sum));
	}
	return out;
}
