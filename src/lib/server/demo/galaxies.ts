import { massModel } from '../../dynamics';
import type { ComponentSpec } from '../../dynamics/types';
import { inventMeasurements, type InventOptions } from '../../measurements/invent';
import { initialLook, type GalaxyDocument } from '../../show/galaxy';
import type { Queryable } from '../db/database';
import { galaxies, measurements } from '../db/schema';
import type { DemoGalaxyIds } from './show';

const invented = 'Invented for Lantern Hill Science Centre; no such galaxy is in the sky.';
const inventedPoints =
	'Invented: drawn from the model with seeded scatter. Not a measurement of anything.';

const disc = (
	id: string,
	name: string,
	surfaceDensity: number,
	scaleLength: number
): ComponentSpec => ({
	id,
	name,
	kind: 'exponential-disk',
	parameters: { surfaceDensity, scaleLength, scaleHeight: 0, holeRadius: 0 },
	lit: true
});

interface DemoGalaxy {
	document: GalaxyDocument;
	points: InventOptions;
}

/** The three invented galaxies of the demo, by the names the show uses for them. */
export const demoGalaxies: Record<keyof DemoGalaxyIds, DemoGalaxy> = {
	wheel: {
		document: {
			version: 1,
			name: 'Harrow Wheel',
			model: {
				components: [
					{
						id: 'bulge',
						name: 'Bulge',
						kind: 'hernquist',
						parameters: { mass: 7e9, scaleLength: 0.45 },
						lit: true
					},
					disc('stars', 'Stellar disc', 4.4e8, 2.8),
					disc('gas', 'Gas disc', 2.4e7, 6.5),
					{
						id: 'halo',
						name: 'Dark halo',
						kind: 'nfw',
						parameters: { density: 1.15e7, scaleRadius: 17 },
						lit: false
					}
				]
			},
			look: initialLook,
			sources: `${invented}\nShapes after Hernquist 1990 (bulge), Freeman 1970 (discs), Navarro, Frenk and White 1997 (halo).`,
			readingRadius: 9.2
		},
		points: { from: 0.8, to: 24.5, points: 26, error: 5, seed: 41 }
	},
	dwarf: {
		document: {
			version: 1,
			name: 'Lamplighter Dwarf',
			model: {
				components: [
					disc('stars', 'Stellar disc', 4.5e7, 1.1),
					disc('gas', 'Gas disc', 1.6e7, 2.2),
					{
						id: 'halo',
						name: 'Dark halo',
						kind: 'burkert',
						parameters: { density: 4.6e7, coreRadius: 2.6 },
						lit: false
					}
				]
			},
			look: {
				...initialLook,
				spiral: { arms: 2, pitchDegrees: 34, patternSpeed: 14, strength: 0.35 },
				dust: 0.2,
				gasClouds: 160,
				outerRadius: 7.5,
				discTemperature: 7200,
				armTemperature: 16000
			},
			sources: `${invented}\nShapes after Freeman 1970 (discs) and Burkert 1995 (halo).`,
			readingRadius: 3.1
		},
		points: { from: 0.4, to: 7.2, points: 18, error: 2.2, seed: 97 }
	},
	orchard: {
		document: {
			version: 1,
			name: 'Old Orchard',
			model: {
				components: [
					{
						id: 'bulge',
						name: 'Bulge',
						kind: 'hernquist',
						parameters: { mass: 4.2e10, scaleLength: 1.1 },
						lit: true
					},
					disc('stars', 'Stellar disc', 6.5e8, 2.9),
					{
						id: 'halo',
						name: 'Dark halo',
						kind: 'pseudo-isothermal',
						parameters: { density: 1.6e7, coreRadius: 6 },
						lit: false
					}
				]
			},
			look: {
				...initialLook,
				spiral: { arms: 2, pitchDegrees: 12, patternSpeed: 25, strength: 0.3 },
				dust: 0.35,
				gasClouds: 20,
				outerRadius: 22,
				bulgeTemperature: 3900,
				discTemperature: 4700,
				armTemperature: 7000
			},
			sources: `${invented}\nShapes after Hernquist 1990 (bulge), Freeman 1970 (disc); the halo is the pseudo-isothermal sphere.`,
			readingRadius: 9.2
		},
		points: { from: 0.7, to: 21, points: 22, error: 6, seed: 133 }
	}
};

/** Puts the three galaxies and their invented measurements into a venue. @returns their ids */
export async function seedGalaxies(
	tx: Queryable,
	{ venueId, userId }: { venueId: string; userId: string }
): Promise<DemoGalaxyIds> {
	const put = async ({ document, points }: DemoGalaxy): Promise<string> => {
		const [galaxy] = await tx
			.insert(galaxies)
			.values({ venueId, name: document.name, document, updatedBy: userId })
			.returning({ id: galaxies.id });
		await tx.insert(measurements).values({
			venueId,
			galaxyId: galaxy.id,
			name: `${document.name}, rotation curve (invented)`,
			source: inventedPoints,
			rows: inventMeasurements(massModel(document.model), points),
			createdBy: userId
		});
		return galaxy.id;
	};
	return {
		wheel: await put(demoGalaxies.wheel),
		dwarf: await put(demoGalaxies.dwarf),
		orchard: await put(demoGalaxies.orchard)
	};
}
