import type { SkyDirection } from './types';

/** A place inside the dome, in dome radii from the middle of the spring line's plane. */
export interface Seat {
	/** To the right. */
	x: number;
	/** To the front. */
	y: number;
	/** Up. */
	z: number;
}

/** Usual places, in dome radii; the eye a little below the spring line's plane in a tilted house. */
export const seats = {
	sweet: { label: 'Sweet spot', seat: { x: 0, y: -0.25, z: 0 } },
	front: { label: 'Front row', seat: { x: 0, y: 0.55, z: 0 } },
	back: { label: 'Back row', seat: { x: 0, y: -0.75, z: 0 } },
	side: { label: 'At the side', seat: { x: 0.65, y: 0, z: 0 } }
} as const satisfies Record<string, { label: string; seat: Seat }>;
export type SeatName = keyof typeof seats;

/**
 * The point of a dome of radius 1 that somebody sees in a direction: the ray from the seat meets
 * the sphere at s = −b + √(b² − c), with b = d·P and c = |P|² − 1.
 * @param seat must lie inside the dome
 * @param looking unit vector @returns `out`, the unit vector from the dome's middle to that point
 * @throws RangeError where the seat is outside the dome
 */
export function domePointFromSeat(
	seat: Seat,
	looking: SkyDirection,
	out: SkyDirection
): SkyDirection {
	const c = seat.x * seat.x + seat.y * seat.y + seat.z * seat.z - 1;
	if (!(c < 0)) throw new RangeError('The seat must be inside the dome.');
	const b = seat.x * looking.x + seat.y * looking.y + seat.z * looking.z;
	const s = -b + Math.sqrt(b * b - c);
	out.x = seat.x + s * looking.x;
	out.y = seat.y + s * looking.y;
	out.z = seat.z + s * looking.z;
	return out;
}
