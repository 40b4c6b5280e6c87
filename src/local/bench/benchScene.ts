import { massModel, type MassModelSpec } from '../../lib/dynamics';
import type { Frame } from '../../lib/picture/frame';
import { initialLook } from '../../lib/show/galaxy';
import { createRingTable, sampleBackground, sampleStars, setModel } from '../../lib/starfield';

/** A large disc galaxy with a bulge, two discs and a halo, as in most scenes. */
export const benchGalaxy: MassModelSpec = {
	components: [
		{ id: 'bulge', kind: 'hernquist', parameters: { mass: 1.2e10, scaleLength: 0.7 }, lit: true },
		{
			id: 'stars',
			kind: 'exponential-disk',
			parameters: { surfaceDensity: 6e8, scaleLength: 3.2, scaleHeight: 0, holeRadius: 0 },
			lit: true
		},
		{
			id: 'gas',
			kind: 'exponential-disk',
			parameters: { surfaceDensity: 2e7, scaleLength: 7, scaleHeight: 0, holeRadius: 0 },
			lit: true
		},
		{ id: 'halo', kind: 'nfw', parameters: { density: 8e6, scaleRadius: 20 }, lit: false }
	]
};

/**
 * The frame every painter is measured with: a galaxy about 55° wide, tilted, with all its light. The
 * caller moves the stars by `advance(frame.layers[0].rings, …)`.
 * @param stars how many
 */
export function benchFrame(stars: number): Frame {
	const rings = createRingTable(initialLook.outerRadius);
	setModel(rings, massModel(benchGalaxy));
	return {
		geometry: { apertureDegrees: 180, tiltDegrees: 0 },
		view: { distance: 45, inclination: 45, turn: 0, centreAltitude: 42 },
		layers: [
			{
				stars: sampleStars(benchGalaxy, initialLook, { count: stars, seed: 7, radii: rings.radii }),
				rings,
				look: initialLook,
				patternAngle: 0,
				half: 'whole'
			}
		],
		background: sampleBackground(7, 1500),
		colour: 'light',
		speedRange: [0, 250],
		exposure: 1
	};
}
