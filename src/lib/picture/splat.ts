/** An RGBA film, four bytes a pixel; additions stop at 255 by themselves. */
export interface Film {
	readonly size: number;
	readonly pixels: Uint8ClampedArray;
}

/**
 * Adds a star one pixel wide, shared among the four pixels about its place by area, so that it moves
 * without jumping. Pixel centres lie at half numbers.
 * @param x pixels from the left, 1 to size − 1 @param y pixels from the top, likewise
 */
export function addPoint(
	{ size, pixels }: Film,
	x: number,
	y: number,
	r: number,
	g: number,
	b: number
): void {
	const u = x - 0.5;
	const v = y - 0.5;
	const i = u | 0;
	const j = v | 0;
	const fx = u - i;
	const fy = v - j;
	const w11 = fx * fy;
	const w10 = fx - w11;
	const w01 = fy - w11;
	const w00 = 1 - fx - w01;
	const top = (j * size + i) << 2;
	const low = top + (size << 2);
	pixels[top] += r * w00;
	pixels[top + 1] += g * w00;
	pixels[top + 2] += b * w00;
	pixels[top + 4] += r * w10;
	pixels[top + 5] += g * w10;
	pixels[top + 6] += b * w10;
	pixels[low] += r * w01;
	pixels[low + 1] += g * w01;
	pixels[low + 2] += b * w01;
	pixels[low + 4] += r * w11;
	pixels[low + 5] += g * w11;
	pixels[low + 6] += b * w11;
}

/** As `addPoint`, but leaves pixels outside of a rectangle (inclusive) as they are. */
export function addPointInside(
	{ size, pixels }: Film,
	x: number,
	y: number,
	r: number,
	g: number,
	b: number,
	inside: { left: number; top: number; right: number; bottom: number }
): void {
	const i = (x - 0.5) | 0;
	const j = (y - 0.5) | 0;
	const fx = x - 0.5 - i;
	const fy = y - 0.5 - j;
	for (let dj = 0; dj < 2; dj++) {
		for (let di = 0; di < 2; di++) {
			const px = i + di;
			const py = j + dj;
			if (px < inside.left || px > inside.right || py < inside.top || py > inside.bottom) continue;
			const w = (di ? fx : 1 - fx) * (dj ? fy : 1 - fy);
			const at = (py * size + px) << 2;
			pixels[at] += r * w;
			pixels[at + 1] += g * w;
			pixels[at + 2] += b * w;
		}
	}
}

/**
 * Adds a soft round spot whose light falls as (1 − d²/ρ²)², brightest in the middle.
 * @param radius pixels; the spot must lie on the film
 */
export function addSpot(
	{ size, pixels }: Film,
	x: number,
	y: number,
	radius: number,
	r: number,
	g: number,
	b: number
): void {
	const left = Math.ceil(x - radius - 0.5);
	const right = Math.floor(x + radius - 0.5);
	const top = Math.ceil(y - radius - 0.5);
	const bottom = Math.floor(y + radius - 0.5);
	const scale = 1 / (radius * radius);
	for (let j = top; j <= bottom; j++) {
		const dy = j + 0.5 - y;
		for (let i = left; i <= right; i++) {
			const dx = i + 0.5 - x;
			const fall = 1 - (dx * dx + dy * dy) * scale;
			if (fall <= 0) continue;
			const w = fall * fall;
			const at = (j * size + i) << 2;
			pixels[at] += r * w;
			pixels[at + 1] += g * w;
			pixels[at + 2] += b * w;
		}
	}
}
