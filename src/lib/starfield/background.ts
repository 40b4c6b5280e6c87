import { seededRandom } from './random';
import { temperatureColour } from './temperatureColour';
import type { BackgroundSky } from './types';

/** Faint stars all round the sky of the dome, evenly spread, few bright. Same seed, same sky. */
export function sampleBackground(seed: number, count: number): BackgroundSky {
	const random = seededRandom(seed ^ 0x5bd1e995);
	const sky: BackgroundSky = {
		count,
		directions: new Float32Array(3 * count),
		light: new Float32Array(count),
		colour: new Uint8Array(3 * count)
	};
	for (let i = 0; i < count; i++) {
		const z = 2 * random.next() - 1;
		const level = Math.sqrt(1 - z * z);
		const azimuth = 2 * Math.PI * random.next();
		sky.directions[3 * i] = level * Math.cos(azimuth);
		sky.directions[3 * i + 1] = level * Math.sin(azimuth);
		sky.directions[3 * i + 2] = z;
		// Counts of stars rise about as light^-1.5 toward the faint end (uniform space).
		sky.light[i] = Math.min(2.2, 0.25 * (1 - random.next()) ** (-1 / 1.5));
		sky.colour.set(temperatureColour(3500 + 6500 * random.next() ** 2), 3 * i);
	}
	return sky;
}
