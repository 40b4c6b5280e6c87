import type { StarLayer, Frame } from './frame';
import type { FilmCamera } from './filmCamera';
import type { DirtyRect } from './dirtyRect';
import { addPoint, addSpot, type Film } from './splat';
import { speedIndex, speedRamp } from './speedRamp';
import {
	dimmestLight,
	lightIndex,
	lightTables,
	nearnessLight,
	spotShare,
	spriteRadius,
	tableSize
} from './starLight';
import { makeViewLight, setViewLight } from './viewLight';

/** Filled anew for every layer; kept so that a frame allocates nothing. */
const seen = makeViewLight();

/** Light tables by look; made once, read in every frame. */
const tablesOf = new WeakMap<object, Float32Array>();

function tables(layer: StarLayer): Float32Array {
	const known = tablesOf.get(layer.look);
	if (known) return known;
	const made = lightTables(layer.look);
	tablesOf.set(layer.look, made);
	return made;
}

/**
 * Adds one layer of stars to the film and widens `touched` by what it painted. Sines and cosines are
 * taken once a ring; a star costs a rotation, a projection and its pixels. Allocates nothing.
 */
export function paintLayer(
	film: Film,
	camera: FilmCamera,
	frame: Frame,
	layer: StarLayer,
	touched: DirtyRect
): void {
	const { size } = film;
	const { stars, rings, look, half } = layer;
	const { x0, y0, z, armCos, armSin, light, colour, size: sprite, population, ringStart } = stars;
	const m = camera.matrix;
	const [shiftX, shiftY, shiftZ] = camera.shift;
	const [m0, m1, m2, m3, m4, m5, m6, m7, m8] = m;
	const { rim } = camera;
	const centre = size / 2;
	const scale = centre / rim;
	const table = tables(layer);
	const { arms } = look.spiral;
	const { gains, leanX, leanY, faceZ, side, reach2, screen } = setViewLight(
		camera,
		frame,
		layer,
		size,
		seen
	);
	const reference = (2 * look.outerRadius) ** 2;
	const bySpeed = frame.colour === 'speed';
	const lowest = half === 'right' ? centre : 1;
	const highest = half === 'left' ? centre : size - 1;
	const last = size - 1;
	let { left, top, right, bottom } = touched;

	for (let k = 0; k < rings.radii.length; k++) {
		const end = ringStart[k + 1];
		let i = ringStart[k];
		if (i === end) continue;
		const angle = rings.phase[k];
		const c = Math.cos(angle);
		const s = Math.sin(angle);
		const armAngle = arms * (angle - layer.patternAngle);
		const ac = Math.cos(armAngle);
		const as = Math.sin(armAngle);
		const speed = bySpeed ? 3 * speedIndex(rings.omega[k] * rings.radii[k], frame.speedRange) : 0;
		for (; i < end; i++) {
			const gx = x0[i] * c - y0[i] * s;
			const gy = x0[i] * s + y0[i] * c;
			const gz = z[i];
			const X = m0 * gx + m1 * gy + m2 * gz + shiftX;
			const Y = m3 * gx + m4 * gy + m5 * gz + shiftY;
			const Z = m6 * gx + m7 * gy + m8 * gz + shiftZ;
			const across2 = X * X + Y * Y;
			const across = Math.sqrt(across2);
			const theta = Math.atan2(across, Z);
			if (theta > rim) continue;
			const k2 = across === 0 ? 0 : (theta * scale) / across;
			const fx = centre + X * k2;
			const fy = centre + Y * k2;
			if (fx < lowest || fx >= highest || fy < 1 || fy >= last) continue;
			const index = lightIndex(armCos[i] * ac - armSin[i] * as, armSin[i] * ac + armCos[i] * as);
			const p = population[i];
			let L =
				gains[p] *
				light[i] *
				nearnessLight(reference, across2 + Z * Z) *
				table[p * tableSize + index];
			const depth = faceZ - gz;
			if (depth * side > 0) {
				const dx = gx + leanX * depth;
				const dy = gy + leanY * depth;
				if (dx * dx + dy * dy < reach2) L *= screen;
			}
			if (L < dimmestLight) continue;
			const from = bySpeed ? speedRamp : colour;
			const at = bySpeed ? speed : 3 * i;
			const radius = spriteRadius(sprite[i], size);
			let reach = 1;
			if (radius < 1.5) {
				addPoint(film, fx, fy, from[at] * L, from[at + 1] * L, from[at + 2] * L);
			} else {
				reach = radius + 1;
				if (fx < reach || fy < reach || fx > size - reach || fy > size - reach) continue;
				const w = L * spotShare;
				addSpot(film, fx, fy, radius, from[at] * w, from[at + 1] * w, from[at + 2] * w);
			}
			if (fx - reach < left) left = fx - reach;
			if (fx + reach > right) right = fx + reach;
			if (fy - reach < top) top = fy - reach;
			if (fy + reach > bottom) bottom = fy + reach;
		}
	}
	touched.left = Math.max(0, Math.floor(left));
	touched.top = Math.max(0, Math.floor(top));
	touched.right = Math.min(last, Math.ceil(right));
	touched.bottom = Math.min(last, Math.ceil(bottom));
}
