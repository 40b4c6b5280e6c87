import type { MeasuredPoint } from '../measurements/types';
import type { ShowDocument } from './document';
import type { GalaxyDocument } from './galaxy';

/** A galaxy inside an edition: the document and the measured points drawn on its chart. */
export interface EditionGalaxy {
	document: GalaxyDocument;
	measured: MeasuredPoint[];
	measuredSource: string;
}

/** The whole resolved show. Playback reads this and nothing else. */
export interface EditionContent {
	format: 1;
	show: ShowDocument;
	/** By the galaxy ids used in the scenes. */
	galaxies: Record<string, EditionGalaxy>;
}
