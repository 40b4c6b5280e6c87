import type { FilmCamera } from './filmCamera';
import type { Frame, StarLayer } from './frame';
import { dustScreen, slantLight, speedShare, starGain } from './starLight';

/** What the place of the eye does to the light of one layer, in numbers that both painters use. */
export interface ViewLight {
	/** Light of a star of light 1 by population, 1 being white. */
	readonly gains: Float32Array;
	/** Toward the eye in the galaxy's frame: x and y per kpc of height above the plane. */
	leanX: number;
	leanY: number;
	/** The dust sheet's face toward the eye, kpc; the sign of the side on which the eye is. */
	faceZ: number;
	side: number;
	/** Square of the sheet's radius, kpc². */
	reach2: number;
	/** What the sheet lets through. */
	screen: number;
}

export const makeViewLight = (): ViewLight => ({
	gains: new Float32Array(slantLight.length),
	leanX: 0,
	leanY: 0,
	faceZ: 0,
	side: 1,
	reach2: 0,
	screen: 1
});

/**
 * Finds how steeply the layer is seen (sight lines taken as parallel, since the eye stands far off).
 * A star is behind the dust where its line of sight meets the sheet's face inside its radius:
 * (faceZ − z) × side > 0 and |(x, y) + lean (faceZ − z)|² < reach².
 * @param out filled and returned
 */
export function setViewLight(
	{ matrix: m, shift: t }: FilmCamera,
	frame: Frame,
	{ look, stars }: StarLayer,
	filmSize: number,
	out: ViewLight
): ViewLight {
	const away = -1 / Math.max(1e-9, Math.hypot(t[0], t[1], t[2]));
	const toEye = (k: number) => (m[k] * t[0] + m[3 + k] * t[1] + m[6 + k] * t[2]) * away;
	const steep = toEye(2);
	const side = steep < 0 ? -1 : 1;
	const height = side * Math.max(dustScreen.leastSlope, Math.abs(steep));
	out.leanX = toEye(0) / height;
	out.leanY = toEye(1) / height;
	out.side = side;
	out.faceZ = side * dustScreen.halfHeight;
	out.reach2 = (dustScreen.reach * look.outerRadius) ** 2;
	out.screen = Math.max(
		dustScreen.leastLight,
		Math.exp((-dustScreen.depth * look.dust) / Math.abs(height))
	);
	const gain = starGain(filmSize, stars.count) * frame.exposure;
	const share = frame.colour === 'speed' ? speedShare : 1;
	slantLight.forEach((power, p) => {
		out.gains[p] = (gain * share * ((Math.abs(steep) + 0.15) / 1.15) ** power) / 255;
	});
	return out;
}
