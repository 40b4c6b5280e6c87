import { PerspectiveCamera, Vector3 } from 'three';
import { describe, expect, it } from 'vitest';
import { directionFromAltAz } from '../../src/lib/dome/altAz';
import { domeProjection, filmFromDirection } from '../../src/lib/dome/projection';
import { seats } from '../../src/lib/dome/seat';
import { domeMesh, toThree } from '../../src/lib/stage/seat/domeMesh';
import { seatPlace, seatTable } from '../../src/lib/stage/seat/PlainSeat';

const geometry = { apertureDegrees: 180, tiltDegrees: 20 };
const places = [
	{ altitude: 35, azimuth: 0 },
	{ altitude: 20, azimuth: -30 },
	{ altitude: 62, azimuth: 25 }
];
const cameras = Object.values(seats).flatMap(({ seat }) => [
	{ seat, azimuth: 0, altitude: 35, field: 80 },
	{ seat, azimuth: 15, altitude: 50, field: 100 }
]);
const [width, height] = [480, 320];

describe('domeMesh', () => {
	it('has the film at every corner where the projection has it', () => {
		const mesh = domeMesh(geometry);
		const [position, uv] = [mesh.getAttribute('position'), mesh.getAttribute('uv')];
		const projection = domeProjection(geometry);
		const film = { x: 0, y: 0 };
		for (let i = 0; i < position.count; i++) {
			// Back from three's frame to the room's.
			const direction = { x: position.getX(i), y: -position.getZ(i), z: position.getY(i) };
			filmFromDirection(projection, direction, film);
			expect(uv.getX(i)).toBeCloseTo((film.x + 1) / 2, 5);
			expect(uv.getY(i)).toBeCloseTo((1 - film.y) / 2, 5);
		}
		expect(position.count).toBeGreaterThan(1000);
	});
});

describe('the plain seat view', () => {
	it('sees a place where a perspective camera of three sees it', () => {
		for (const camera of cameras) {
			const three = new PerspectiveCamera(camera.field, width / height, 0.01, 4);
			three.position.set(...toThree(camera.seat));
			three.rotation.set(
				(camera.altitude * Math.PI) / 180,
				(-camera.azimuth * Math.PI) / 180,
				0,
				'YXZ'
			);
			three.updateMatrixWorld();
			for (const at of places) {
				const direction = directionFromAltAz(at, { x: 0, y: 0, z: 0 });
				const seen = new Vector3(...toThree(direction)).project(three);
				const place = seatPlace(camera, at, width, height);
				expect(place?.x).toBeCloseTo(((seen.x + 1) * width) / 2, 3);
				expect(place?.y).toBeCloseTo(((1 - seen.y) * height) / 2, 3);
			}
		}
	});

	it('looks up, at a place of the dome, the film pixel of that place', () => {
		const filmSize = 1024;
		const projection = domeProjection(geometry);
		const film = { x: 0, y: 0 };
		let tried = 0;
		for (const camera of cameras) {
			const table = seatTable(camera, geometry, filmSize, width, height);
			for (const at of places) {
				const place = seatPlace(camera, at, width, height);
				if (!place || place.x < 0 || place.y < 0 || place.x >= width || place.y >= height) continue;
				const index = table[Math.floor(place.y) * width + Math.floor(place.x)];
				filmFromDirection(projection, directionFromAltAz(at, { x: 0, y: 0, z: 0 }), film);
				const [column, row] = [film.x, film.y].map((c) => ((c + 1) * filmSize) / 2);
				// A pixel of the seat's picture covers a few of the film.
				const told = `${index % filmSize}, ${Math.floor(index / filmSize)} for ${column}, ${row}`;
				expect(Math.abs((index % filmSize) - column), told).toBeLessThan(4);
				expect(Math.abs(Math.floor(index / filmSize) - row), told).toBeLessThan(4);
				tried++;
			}
		}
		expect(tried).toBeGreaterThan(12);
	});

	it('is black where there is no dome', () => {
		const below = { seat: seats.sweet.seat, azimuth: 180, altitude: -60, field: 40 };
		expect(seatTable(below, geometry, 256, 20, 20).every((index) => index === -1)).toBe(true);
	});

	it('has no place for what is behind the eye', () => {
		const camera = { seat: seats.sweet.seat, azimuth: 0, altitude: 0, field: 60 };
		expect(seatPlace(camera, { altitude: 10, azimuth: 180 }, width, height)).toBeNull();
	});
});
