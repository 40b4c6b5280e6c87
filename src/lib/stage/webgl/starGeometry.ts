import { BufferAttribute, BufferGeometry } from 'three';
import type { BackgroundSky, StarList } from '$lib/starfield/types';

/** Attributes of stars.vert.glsl, uploaded once for a star list. */
export function starGeometry(stars: StarList): BufferGeometry {
	const position = new Float32Array(3 * stars.count);
	const arm = new Float32Array(2 * stars.count);
	for (let i = 0; i < stars.count; i++) {
		position[3 * i] = stars.x0[i];
		position[3 * i + 1] = stars.y0[i];
		position[3 * i + 2] = stars.z[i];
		arm[2 * i] = stars.armCos[i];
		arm[2 * i + 1] = stars.armSin[i];
	}
	const geometry = new BufferGeometry();
	geometry.setAttribute('position', new BufferAttribute(position, 3));
	geometry.setAttribute('ring', new BufferAttribute(Float32Array.from(stars.ring), 1));
	geometry.setAttribute('arm', new BufferAttribute(arm, 2));
	geometry.setAttribute('light', new BufferAttribute(stars.light, 1));
	geometry.setAttribute('colour', new BufferAttribute(stars.colour, 3, true));
	geometry.setAttribute('size', new BufferAttribute(stars.size, 1));
	geometry.setAttribute('population', new BufferAttribute(Float32Array.from(stars.population), 1));
	return geometry;
}

/** Attributes of background.vert.glsl. */
export function backgroundGeometry(sky: BackgroundSky): BufferGeometry {
	const geometry = new BufferGeometry();
	geometry.setAttribute('position', new BufferAttribute(sky.directions, 3));
	geometry.setAttribute('light', new BufferAttribute(sky.light, 1));
	geometry.setAttribute('colour', new BufferAttribute(sky.colour, 3, true));
	return geometry;
}
