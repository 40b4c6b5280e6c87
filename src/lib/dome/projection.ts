import { DEGREE } from '../units';
import type { DomeGeometry, FilmPoint, SkyDirection } from './types';

const clampCosine = (c: number) => Math.min(1, Math.max(-1, c));

/** A dome's projection with its angles turned into numbers once, for hot loops. */
export interface DomeProjection {
	readonly geometry: DomeGeometry;
	/** Half the aperture, radians: the angle from the dome axis that falls on the rim. */
	readonly rim: number;
	readonly cosTilt: number;
	readonly sinTilt: number;
}

export const domeProjection = (geometry: DomeGeometry): DomeProjection => ({
	geometry,
	rim: (geometry.apertureDegrees / 2) * DEGREE,
	cosTilt: Math.cos(geometry.tiltDegrees * DEGREE),
	sinTilt: Math.sin(geometry.tiltDegrees * DEGREE)
});

/**
 * Azimuthal equidistant: the distance from the film's middle is the angle from the dome axis over
 * half the aperture (r = f θ). The axis leans to the front by the tilt; front is at the bottom.
 * Beyond the rim r is above 1. The point opposite the axis has no one place; it goes to the bottom.
 * @param direction unit vector in the room's frame @param out filled and returned
 */
export function filmFromDirection(
	{ rim, cosTilt, sinTilt }: DomeProjection,
	direction: SkyDirection,
	out: FilmPoint
): FilmPoint {
	const ahead = direction.y * cosTilt - direction.z * sinTilt;
	const axial = direction.y * sinTilt + direction.z * cosTilt;
	const across = Math.hypot(direction.x, ahead);
	// atan2 keeps all digits near the axis, where acos would lose half of them.
	const r = Math.atan2(across, axial) / rim;
	if (across === 0) {
		out.x = 0;
		out.y = r;
		return out;
	}
	out.x = (direction.x / across) * r;
	out.y = (ahead / across) * r;
	return out;
}

/** The inverse of `filmFromDirection`. @returns `out`, a unit vector in the room's frame */
export function directionFromFilm(
	{ rim, cosTilt, sinTilt }: DomeProjection,
	point: FilmPoint,
	out: SkyDirection
): SkyDirection {
	const r = Math.hypot(point.x, point.y);
	const theta = r * rim;
	const across = r === 0 ? 0 : Math.sin(theta) / r;
	const ahead = point.y * across;
	const axial = Math.cos(theta);
	out.x = point.x * across;
	out.y = ahead * cosTilt + axial * sinTilt;
	out.z = axial * cosTilt - ahead * sinTilt;
	return out;
}

/** @returns degrees between two unit vectors */
export const angleBetween = (a: SkyDirection, b: SkyDirection): number =>
	Math.acos(clampCosine(a.x * b.x + a.y * b.y + a.z * b.z)) / DEGREE;
