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
