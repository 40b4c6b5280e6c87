import { BufferGeometry, Float32BufferAttribute } from 'three';
import { directionFromAltAz } from '$lib/dome/altAz';
import { directionFromFilm, domeProjection } from '$lib/dome/projection';
import type { AltAz, DomeGeometry, SkyDirection } from '$lib/dome/types';

/** The room's frame (x right, y front, z up) in three's (x right, y up, z toward the viewer). */
export const toThree = ({ x, y, z }: SkyDirection): [number, number, number] => [x, z, -y];

const ringCount = 48;
const spokeCount = 96;

/**
 * The dome of radius 1 as a mesh whose texture is the film: vertices on rings of the film, so that
 * the fisheye is undone by the triangles and not by the eye.
 */
export function domeMesh(geometry: DomeGeometry): BufferGeometry {
	const projection = domeProjection(geometry);
	const direction: SkyDirection = { x: 0, y: 0, z: 0 };
	const position: number[] = [];
	const uv: number[] = [];
	const index: number[] = [];
	for (let ring = 0; ring <= ringCount; ring++) {
		const r = ring / ringCount;
		for (let spoke = 0; spoke <= spokeCount; spoke++) {
			const angle = (2 * Math.PI * spoke) / spokeCount;
			const point = { x: r * Math.cos(angle), y: r * Math.sin(angle) };
			position.push(...toThree(directionFromFilm(projection, point, direction)));
			// Textures count rows from the bottom.
			uv.push((point.x + 1) / 2, (1 - point.y) / 2);
		}
	}
	for (let ring = 0; ring < ringCount; ring++) {
		for (let spoke = 0; spoke < spokeCount; spoke++) {
			const a = ring * (spokeCount + 1) + spoke;
			const b = a + spokeCount + 1;
			index.push(a, b, a + 1, b, b + 1, a + 1);
		}
	}
	const mesh = new BufferGeometry();
	mesh.setAttribute('position', new Float32BufferAttribute(position, 3));
	mesh.setAttribute('uv', new Float32BufferAttribute(uv, 2));
	mesh.setIndex(index);
	return mesh;
}

/** A line on the dome, a little inside it, so that the picture does not hide it. */
export function domeLine(places: readonly AltAz[]): BufferGeometry {
	const direction: SkyDirection = { x: 0, y: 0, z: 0 };
	const points = places.flatMap((at) =>
		toThree(directionFromAltAz(at, direction)).map((c) => c * 0.995)
	);
	const geometry = new BufferGeometry();
	geometry.setAttribute('position', new Float32BufferAttribute(points, 3));
	return geometry;
}
