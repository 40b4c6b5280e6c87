import { DEGREE } from '../units';
import type { View } from './frame';

/**
 * Turns galaxy coordinates (kpc, disc in z = 0) into vectors from the eye in the room's frame (x
 * right, y front, z up): p ↦ M p + t. Both star painters use these twelve numbers.
 */
export interface Camera {
	/** Row by row, nine numbers. */
	readonly matrix: Float64Array;
	/** kpc: the galaxy's centre as seen from the eye. */
	readonly shift: Float64Array;
}

export const makeCamera = (): Camera => ({
	matrix: new Float64Array(9),
	shift: new Float64Array(3)
});

/**
 * In the eye's own frame (right, up, toward the galaxy) a face-on disc lies across the line of
 * sight; the inclination tips its far side up; the turn rolls the picture, counter-clockwise for the
 * audience; then the line of sight is raised to the altitude at which the centre stands in front.
 * @param out filled and returned
 */
export function setCamera(view: View, out: Camera): Camera {
	const ci = Math.cos(view.inclination * DEGREE);
	const si = Math.sin(view.inclination * DEGREE);
	const ct = Math.cos(view.turn * DEGREE);
	const st = Math.sin(view.turn * DEGREE);
	const ca = Math.cos(view.centreAltitude * DEGREE);
	const sa = Math.sin(view.centreAltitude * DEGREE);
	// Tip about the galaxy's x: right = x, up = y cos i + z sin i, away = y sin i − z cos i.
	const up = [0, ci, si];
	const away = [0, si, -ci];
	// Roll about the line of sight, then raise it: y (front) and z (up) of the room.
	for (let k = 0; k < 3; k++) {
		const right = k === 0 ? 1 : 0;
		const x = right * ct - up[k] * st;
		const v = right * st + up[k] * ct;
		out.matrix[k] = x;
		out.matrix[3 + k] = away[k] * ca - v * sa;
		out.matrix[6 + k] = away[k] * sa + v * ca;
	}
	out.shift[0] = 0;
	out.shift[1] = view.distance * ca;
	out.shift[2] = view.distance * sa;
	return out;
}
