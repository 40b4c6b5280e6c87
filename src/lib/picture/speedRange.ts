/** Share of the outer radius that sets no scale: a point mass is infinitely fast in the middle. */
const innermost = 0.05;

/**
 * The two ends of a scale of speeds: 0 and the fastest circular speed, in whole steps of 50 km/s.
 * @param radii kpc, rising @param speedAt km/s at an index of `radii`; NaN counts as 0
 */
export function speedRange(
	radii: ArrayLike<number>,
	speedAt: (k: number) => number
): [number, number] {
	const from = radii[radii.length - 1] * innermost;
	let top = 0;
	for (let k = 0; k < radii.length; k++) {
		if (radii[k] >= from) top = Math.max(top, speedAt(k) || 0);
	}
	return [0, Math.max(50, Math.ceil(top / 50) * 50)];
}
