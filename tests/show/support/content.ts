import type { Scene } from '../../../src/lib/show/document';
import type { EditionContent } from '../../../src/lib/show/edition';
import { initialLook, type GalaxyDocument } from '../../../src/lib/show/galaxy';
import type { RunCommand, RunEvent } from '../../../src/lib/show/playback';

export const uuid = (n: number) => `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`;

export const galaxyId = uuid(900);

export const galaxy: GalaxyDocument = {
	version: 1,
	name: 'Test wheel',
	model: {
		components: [
			{ id: 'bulge', kind: 'hernquist', parameters: { mass: 1e10, scaleLength: 0.6 }, lit: true },
			{
				id: 'disc',
				kind: 'exponential-disk',
				parameters: { surfaceDensity: 8e8, scaleLength: 3, scaleHeight: 0, holeRadius: 0 },
				lit: true
			},
			{ id: 'halo', kind: 'nfw', parameters: { density: 8e6, scaleRadius: 20 }, lit: false }
		]
	},
	look: initialLook,
	sources: 'Made for tests.',
	readingRadius: 8
};

export function makeScene(n: number, overrides: Partial<Scene> = {}): Scene {
	return {
		id: uuid(n),
		title: `Scene ${n}`,
		pace: { kind: 'presenter', expectedSeconds: 60 },
		subject: { kind: 'galaxy', galaxyId },
		mix: { haloFactor: 1, starFactor: 1 },
		comparison: 'none',
		motion: { rate: 4, begin: 'go-on' },
		view: { distance: 50, inclination: 40, turn: 0, centreAltitude: 40 },
		colour: 'light',
		drawings: {
			chart: false,
			chartLit: false,
			chartTotal: false,
			chartMeasured: false,
			rings: [],
			name: false,
			scale: false,
			caption: ''
		},
		script: '',
		note: '',
		controls: [],
		entrance: { kind: 'cut' },
		...overrides
	};
}

export const makeContent = (scenes: Scene[]): EditionContent => ({
	format: 1,
	show: {
		version: 1,
		title: 'Test show',
		audience: 'adults',
		summary: '',
		targetMinutes: 10,
		seed: 7,
		scenes
	},
	galaxies: {
		[galaxyId]: {
			document: galaxy,
			measured: [
				{ radius: 4, speed: 180, error: 5 },
				{ radius: 12, speed: 220, error: 6 }
			],
			measuredSource: 'Made for tests.'
		}
	}
});

/** Numbered events from [milliseconds, command] pairs. */
export const events = (...list: [number, RunCommand][]): RunEvent[] =>
	list.map(([at, command], i) => ({ number: i + 1, at, command, actor: null }));
