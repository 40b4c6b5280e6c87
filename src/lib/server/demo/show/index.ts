import { documentVersion, type ShowDocument } from '../../../show/document';
import { buildScene } from './build';
import { arriving } from './arriving';
import { weighing } from './weighing';
import { wondering } from './wondering';

export interface DemoGalaxyIds {
	wheel: string;
	dwarf: string;
	orchard: string;
}

/** The demo's complete show: twelve scenes, about 25 minutes, how a galaxy is weighed. */
export function demoShow(galaxies: DemoGalaxyIds): ShowDocument {
	const drafts = [...arriving(galaxies), ...weighing(galaxies), ...wondering(galaxies)];
	return {
		version: documentVersion,
		title: 'The weight of the Wheel',
		audience: 'mixed family',
		summary:
			'How fast the stars of a galaxy move, what their light can explain, and how much more there must be. Spoken live, with one question the audience may ask: what if there were twice as much of it?',
		targetMinutes: 25,
		seed: 20417,
		scenes: drafts.map((draft, i) => buildScene(draft, i + 1))
	};
}
