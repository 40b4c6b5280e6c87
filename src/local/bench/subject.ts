import { massModel, type MassModelSpec } from '../../lib/dynamics';
import type { Frame } from '../../lib/picture/frame';
import { initialLook } from '../../lib/show/galaxy';
import {
	advance,
	createRingTable,
	sampleBackground,
	sampleStars,
	setModel
} from '../../lib/starfield';
import { timeFromMyr } from '../../lib/units';

/** What every painter paints: a spiral of so many stars, seen as a scene would show it. */
export function benchFrame(stars: number): { frame: Frame; step: () => void } {
	const spec: MassModelSpec = {
		components: [
			{ id: 'bulge', kind: 'hernquist', parameters: { mass: 7e9, scaleLength: 0.45 }, lit: true },
			{
				id: 'disc',
				kind: 'exponential-disk',
				parameters: { surfaceDensity: 4.4e8, scaleLength: 2.8, scaleHeight: 0, holeRadius: 0 },
				lit: true
			},
			{ id: 'halo', kind: 'nfw', parameters: { density: 1.15e7, scaleRadius: 17 }, lit: false }
		]
	};
	const rings = createRingTable(initialLook.outerRadius);
	setModel(rings, massModel(spec));
	const frame: Frame = {
		geometry: { apertureDegrees: 180, tiltDegrees: 0 },
		view: { distance: 36, inclination: 40, turn: -20, centreAltitude: 50 },
		layers: [
			{
				stars: sampleStars(spec, initialLook, { count: stars, seed: 7, radii: rings.radii }),
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
	return { frame, step: () => advance(rings, timeFromMyr(4 / 60)) };
}

export interface Times {
	/** Milliseconds. */
	median: number;
	p99: number;
}

const summary = (taken: readonly number[]): Times => {
	const sorted = [...taken].sort((a, b) => a - b);
	const at = (share: number) =>
		sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))];
	return { median: at(0.5), p99: at(0.99) };
};

/** Times a piece of work; the first runs are thrown away, since they warm it up. */
export const times = (work: () => void, runs: number, warm = 5): Times =>
	timesInTurn({ work }, runs, 1, warm).work;

/**
 * Times several pieces of work in turn, some runs of each in every round, so that whatever else the
 * machine does falls on all of them alike.
 */
export function timesInTurn<Name extends string>(
	works: Record<Name, () => void>,
	runs: number,
	rounds: number,
	warm = 3
): Record<Name, Times> {
	const names = Object.keys(works) as Name[];
	const taken = new Map<Name, number[]>(names.map((name) => [name, []]));
	for (const name of names) for (let i = 0; i < warm; i++) works[name]();
	for (let round = 0; round < rounds; round++) {
		for (const [name, list] of taken) {
			for (let i = 0; i < runs; i++) {
				const from = performance.now();
				works[name]();
				list.push(performance.now() - from);
			}
		}
	}
	return Object.fromEntries([...taken].map(([name, list]) => [name, summary(list)])) as Record<
		Name,
		Times
	>;
}
