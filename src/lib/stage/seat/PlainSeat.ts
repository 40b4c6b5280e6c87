import { directionFromAltAz } from '$lib/dome/altAz';
import { domeProjection, filmFromDirection } from '$lib/dome/projection';
import { domePointFromSeat, type Seat } from '$lib/dome/seat';
import type { AltAz, DomeGeometry, FilmPoint, SkyDirection } from '$lib/dome/types';
import { DEGREE } from '$lib/units';

export interface SeatCamera {
	seat: Seat;
	/** Degrees. */
	azimuth: number;
	altitude: number;
	field: number;
}

/** The camera's axes in the room and how far the picture reaches at its top and right edge. */
function axes({ azimuth, altitude, field }: SeatCamera, width: number, height: number) {
	const reach = Math.tan((field * DEGREE) / 2);
	return {
		ahead: directionFromAltAz({ altitude, azimuth }, { x: 0, y: 0, z: 0 }),
		right: directionFromAltAz({ altitude: 0, azimuth: azimuth + 90 }, { x: 0, y: 0, z: 0 }),
		up: directionFromAltAz({ altitude: altitude + 90, azimuth }, { x: 0, y: 0, z: 0 }),
		reachUp: reach,
		reachRight: (reach * width) / height
	};
}

/** @returns pixels of the seat's picture where a place of the dome is seen, or null behind the eye */
export function seatPlace(
	camera: SeatCamera,
	at: AltAz,
	width: number,
	height: number
): { x: number; y: number } | null {
	const { ahead, right, up, reachUp, reachRight } = axes(camera, width, height);
	const { x, y, z } = directionFromAltAz(at, { x: 0, y: 0, z: 0 });
	const d = { x: x - camera.seat.x, y: y - camera.seat.y, z: z - camera.seat.z };
	const along = (axis: SkyDirection) => axis.x * d.x + axis.y * d.y + axis.z * d.z;
	const depth = along(ahead);
	if (depth < 0.01) return null;
	return {
		x: ((along(right) / depth / reachRight + 1) * width) / 2,
		y: ((1 - along(up) / depth / reachUp) * height) / 2
	};
}

/**
 * For machines without WebGL: which film pixel each pixel of the seat's picture shows. Made anew when
 * somebody turns, used for every frame.
 * @returns indices into a film of `filmSize`² pixels, row by row; −1 where there is no dome
 */
export function seatTable(
	camera: SeatCamera,
	geometry: DomeGeometry,
	filmSize: number,
	width: number,
	height: number
): Int32Array {
	const table = new Int32Array(width * height);
	const projection = domeProjection(geometry);
	const { ahead, right, up, reachUp, reachRight } = axes(camera, width, height);
	const ray: SkyDirection = { x: 0, y: 0, z: 0 };
	const hit: SkyDirection = { x: 0, y: 0, z: 0 };
	const film: FilmPoint = { x: 0, y: 0 };
	for (let j = 0; j < height; j++) {
		const v = (1 - (2 * (j + 0.5)) / height) * reachUp;
		for (let i = 0; i < width; i++) {
			const u = ((2 * (i + 0.5)) / width - 1) * reachRight;
			const x = ahead.x + right.x * u + up.x * v;
			const y = ahead.y + right.y * u + up.y * v;
			const z = ahead.z + right.z * u + up.z * v;
			const length = Math.hypot(x, y, z);
			ray.x = x / length;
			ray.y = y / length;
			ray.z = z / length;
			filmFromDirection(projection, domePointFromSeat(camera.seat, ray, hit), film);
			const inside = film.x * film.x + film.y * film.y < 1;
			const column = Math.floor(((film.x + 1) * filmSize) / 2);
			const row = Math.floor(((film.y + 1) * filmSize) / 2);
			table[j * width + i] = inside ? row * filmSize + column : -1;
		}
	}
	return table;
}
