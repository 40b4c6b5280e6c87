import { milkyWayMcMillan2017 } from '../../dynamics/shelf';
import type { ShelfGalaxy } from '../../dynamics/shelf';
import { initialLook, type GalaxyDocument } from '../../show/galaxy';
import { notFound } from '../errors';

/** A galaxy of the reference shelf: read-only, the same for every venue. */
export interface ShelfEntry {
	/** Stands in the address. */
	id: string;
	document: GalaxyDocument;
	sources: string[];
	/** Each says what is simplified against the source and by how much. */
	approximations: string[];
}

const entry = (
	id: string,
	{ name, spec, sources, approximations }: ShelfGalaxy,
	rest: Pick<GalaxyDocument, 'look' | 'readingRadius'>
): ShelfEntry => ({
	id,
	document: {
		version: 1,
		name,
		model: spec,
		sources: [...sources, ...approximations].join('\n'),
		...rest
	},
	sources,
	approximations
});

/** Everything on the shelf, in order. How a galaxy looks is ours; how it moves is the source's. */
export const shelf = (): ShelfEntry[] => [
	entry('milky-way-mcmillan-2017', milkyWayMcMillan2017(), {
		look: { ...initialLook, outerRadius: 30 },
		readingRadius: 8.21
	})
];

/** @throws AppError not-found */
export function readShelf(id: string): ShelfEntry {
	const found = shelf().find((one) => one.id === id);
	if (!found) throw notFound('reference galaxy');
	return found;
}
