import type { ComponentSpec, MassModelSpec } from '../../dynamics/types';
import { initialLook, type GalaxyDocument } from '../../show/galaxy';

/** A galaxy to begin with. */
export interface StartingShape {
	id: string;
	label: string;
	/** One sentence: what one gets. */
	help: string;
	make: (name: string) => GalaxyDocument;
}

const disc = (
	id: string,
	name: string,
	surfaceDensity: number,
	scaleLength: number
): ComponentSpec => ({
	id,
	name,
	kind: 'exponential-disk',
	parameters: { surfaceDensity, scaleLength },
	lit: true
});

const sources = (shapes: string) =>
	`Made up in this library: no measured galaxy. Shapes after ${shapes}.`;

const begin = (
	name: string,
	components: MassModelSpec['components'],
	rest: Omit<GalaxyDocument, 'version' | 'name' | 'model'>
): GalaxyDocument => ({ version: 1, name, model: { components }, ...rest });

/** Round numbers of typical galaxies; common practice, no source. The first is the usual choice. */
export const startingShapes: readonly StartingShape[] = [
	{
		id: 'disc-and-halo',
		label: 'Disc galaxy with halo',
		help: 'Bulge, stars and gas in a disc, and a halo that keeps the curve flat: 200 km/s and more.',
		make: (name) =>
			begin(
				name,
				[
					{
						id: 'bulge',
						name: 'Bulge',
						kind: 'hernquist',
						parameters: { mass: 8e9, scaleLength: 0.5 },
						lit: true
					},
					disc('stars', 'Stellar disc', 6e8, 2.8),
					disc('gas', 'Gas disc', 2e7, 7),
					{
						id: 'halo',
						name: 'Dark halo',
						kind: 'nfw',
						parameters: { density: 9e6, scaleRadius: 18 },
						lit: false
					}
				],
				{
					look: initialLook,
					sources: sources('Hernquist 1990, Freeman 1970, and Navarro, Frenk and White 1997'),
					readingRadius: 9.2
				}
			)
	},
	{
		id: 'small-disc',
		label: 'Small disc galaxy',
		help: 'A faint disc with much gas and a halo with an even core: about 70 km/s, mostly unlit.',
		make: (name) =>
			begin(
				name,
				[
					disc('stars', 'Stellar disc', 4e7, 1.2),
					disc('gas', 'Gas disc', 1.5e7, 2.4),
					{
						id: 'halo',
						name: 'Dark halo',
						kind: 'burkert',
						parameters: { density: 4e7, coreRadius: 2.8 },
						lit: false
					}
				],
				{
					look: {
						...initialLook,
						spiral: { arms: 2, pitchDegrees: 32, patternSpeed: 14, strength: 0.35 },
						dust: 0.2,
						gasClouds: 150,
						outerRadius: 8,
						discTemperature: 7000
					},
					sources: sources('Freeman 1970 and Burkert 1995'),
					readingRadius: 3.1
				}
			)
	},
	{
		id: 'swarm',
		label: 'Elliptical swarm of stars',
		help: 'A round swarm of old stars in a halo, without disc, arms or gas.',
		make: (name) =>
			begin(
				name,
				[
					{
						id: 'stars',
						name: 'Old stars',
						kind: 'hernquist',
						parameters: { mass: 1.2e11, scaleLength: 2.5 },
						lit: true
					},
					{
						id: 'halo',
						name: 'Dark halo',
						kind: 'nfw',
						parameters: { density: 6e6, scaleRadius: 25 },
						lit: false
					}
				],
				{
					look: {
						...initialLook,
						spiral: { ...initialLook.spiral, arms: 0, strength: 0 },
						dust: 0,
						gasClouds: 0,
						outerRadius: 22,
						bulgeTemperature: 4100
					},
					sources: sources('Hernquist 1990 and Navarro, Frenk and White 1997'),
					readingRadius: 9.2
				}
			)
	}
];
