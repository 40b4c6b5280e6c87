import type { MassModel } from './types';

/**
 * Circular speeds for a chart.
 * @param radii kpc
 * @param out km/s, at least as long as `radii`; filled and returned
 */
export function rotationCurve(
	model: MassModel,
	radii: ArrayLike<number>,
	out: Float64Array
): Float64Array {
	for (let i = 0; i < radii.length; i++) out[i] = model.circularVelocity(radii[i]);
	return out;
}
