import type { DomeGeometry } from '$lib/dome/types';
import { FilmCamera } from '$lib/picture/filmCamera';
import type { View } from '$lib/picture/frame';
import { TAU } from '$lib/units';

const camera = new FilmCamera();
const corners = 120;

/**
 * A circle in the disc as the film shows it: an SVG path on a square of −1…1.
 * @param R kpc
 */
export function ringPath(R: number, view: View, geometry: DomeGeometry): string {
	camera.set(view, geometry);
	const { matrix: m, shift, rim } = camera;
	const points = Array.from({ length: corners }, (_, k) => {
		const x = R * Math.cos((TAU * k) / corners);
		const y = R * Math.sin((TAU * k) / corners);
		const X = m[0] * x + m[1] * y + shift[0];
		const Y = m[3] * x + m[4] * y + shift[1];
		const Z = m[6] * x + m[7] * y + shift[2];
		const across = Math.hypot(X, Y);
		const scale = across === 0 ? 0 : Math.atan2(across, Z) / (rim * across);
		return `${(X * scale).toFixed(4)},${(Y * scale).toFixed(4)}`;
	});
	return `M${points.join('L')}Z`;
}

/**
 * The radius in the disc that is seen at a point of the film.
 * @param u and @param v on the film's square of −1…1, right and down
 * @returns kpc; null where the line of sight does not meet the disc's plane
 */
export function radiusAt(u: number, v: number, view: View, geometry: DomeGeometry): number | null {
	camera.set(view, geometry);
	const { matrix: m, shift: s, rim } = camera;
	const across = Math.hypot(u, v);
	if (across > 1) return null;
	const theta = across * rim;
	const side = across === 0 ? 0 : Math.sin(theta) / across;
	const d = [u * side, v * side, Math.cos(theta)];
	// Columns of the matrix take the eye's frame back to the galaxy's; the plane is z = 0 there.
	const toward = (column: number, w: ArrayLike<number>) =>
		m[column] * w[0] + m[3 + column] * w[1] + m[6 + column] * w[2];
	const distance = toward(2, s) / toward(2, d);
	if (!(distance > 0 && Number.isFinite(distance))) return null;
	return Math.hypot(distance * toward(0, d) - toward(0, s), distance * toward(1, d) - toward(1, s));
}
