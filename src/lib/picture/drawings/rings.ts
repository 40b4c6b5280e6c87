import { altAzFromDirection } from '../../dome/altAz';
import type { AltAz, SkyDirection } from '../../dome/types';
import { makeCamera, setCamera } from '../camera';
import type { View } from '../frame';
import { inks, lineWidth, type FilmPen } from './FilmPen';

const steps = 180;
/** Degrees of line and gap. */
const dash = [1, 0.8];

/** Directions of a closed ring in the galaxy's plane. @param radius kpc */
export function ringDirections(view: View, radius: number): SkyDirection[] {
	const { matrix: m, shift: t } = setCamera(view, makeCamera());
	return Array.from({ length: steps + 1 }, (_, i) => {
		const angle = (2 * Math.PI * i) / steps;
		const gx = radius * Math.cos(angle);
		const gy = radius * Math.sin(angle);
		const x = m[0] * gx + m[1] * gy + t[0];
		const y = m[3] * gx + m[4] * gy + t[1];
		const z = m[6] * gx + m[7] * gy + t[2];
		const d = Math.hypot(x, y, z);
		return { x: x / d, y: y / d, z: z / d };
	});
}

/** Every fourth point, in degrees: places for a ring's label. */
export const labelPoints = (directions: readonly SkyDirection[]): AltAz[] =>
	directions
		.filter((_, i) => i % 4 === 0)
		.map((direction) => altAzFromDirection(direction, { altitude: 0, azimuth: 0 }));

/** Draws one ring, dashed; what lies beyond the rim is left out. */
export function drawRing(pen: FilmPen, directions: readonly SkyDirection[]): void {
	const { context } = pen;
	context.beginPath();
	let open = false;
	for (const direction of directions) {
		const place = pen.placeDirection(direction);
		if (place && open) context.lineTo(place.x, place.y);
		else if (place) context.moveTo(place.x, place.y);
		open = place !== null;
	}
	// A dark rim under every dash, as under words, so that stars do not eat the line.
	pen.stroke(inks.ground, 3 * lineWidth, dash);
	pen.stroke(inks.soft, 1.2 * lineWidth, dash);
}
