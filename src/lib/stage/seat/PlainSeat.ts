import { directionFromAltAz } from '$lib/dome/altAz';
import { domeProjection, filmFromDirection } from '$lib/dome/projection';
import { domePointFromSeat, type Seat } from '$lib/dome/seat';
import type { DomeGeometry, FilmPoint, SkyDirection } from '$lib/dome/types';

export interface SeatCamera {
	seat: Seat;
	/** Degrees. */
	azimuth: number;
	altitude: number;
	field: number;
}

/**
 * For machines without WebGL: which film pixel each pixel of the seat's picture shows. Made anew when
 * somebody turns, used for every frame.
 * @returns indices into a film of `filmSize`² pixels, row by row; −1 where there is no dome
 */
export function seatTable(
	{ seat, azimuth, altitude, field }: SeatCamera,
	geometry: DomeGeometry,
	filmSize: number,
	width: number,
	height: number
): Int32Array {
	const table = new Int32Array(width * height);
	const projection = domeProjection(geometry);
	const ahead = directionFromAltAz({ altitude, azimuth }, { x: 0, y: 0, z: 0 });
	const right = directionFromAltAz({ altitude: 0, azimuth: azimuth + 90 }, { x: 0, y: 0, z: 0 });
	const up = directionFromAltAz({ altitude: altitude + 90, azimuth }, { x: 0, y: 0, z: 0 });
	const reach = Math.tan((field * Math.PI) / 360);
	const ray: SkyDirection = { x: 0, y: 0, z: 0 };
	const hit: SkyDirection = { x: 0, y: 0, z: 0 };
	const film: FilmPoint = { x: 0, y: 0 };
	for (let j = 0; j < height; j++) {
		const v = (1 - (2 * (j + 0.5)) / height) * reach;
		for (let i = 0; i < width; i++) {
			const u = ((2 * (i + 0.5)) / width - 1) * reach * (width / height);
			const x = ahead.x + right.x * u + up.x * v;
			const y = ahead.y + right.y * u + up.y * v;
			const z = ahead.z + right.z * u + up.z * v;
			const length = Math.hypot(x, y, z);
			ray.x = x / length;
			ray.y = y / length;
			ray.z = z / length;
			filmFromDirection(projection, domePointFromSeat(seat, ray, hit), film);
			const inside = film.x * film.x + film.y * film.y < 1;
			const column = Math.floor(((film.x + 1) * filmSize) / 2);
			const row = Math.floor(((film.y + 1) * filmSize) / 2);
			table[j * width + i] = inside ? row * filmSize + column : -1;
		}
	}
	return table;
}
