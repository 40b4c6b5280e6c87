import type { MassModelSpec } from '../dynamics/types';
import { DEGREE, TAU } from '../units';
import { seededRandom, type Random } from './random';
import { createRingTable, ringOf } from './ringTable';
import { starProfiles, type ComponentProfile } from './starProfile';
import { makeStarList, type StarDraft } from './starList';
import { temperatureColour } from './temperatureColour';
import { populations, type GalaxyLook, type Population, type StarList } from './types';

export interface SampleOptions {
	count: number;
	seed: number;
	/** Ring radii, kpc; those of `createRingTable` where missing. */
	radii?: Float64Array;
}

/** Height of discs that have none of their own, kpc: old stars, and the thin layer of young ones. */
const oldHeight = 0.28;
const youngHeight = 0.09;
/** Share of a disc's stars that are young, hot and few in mass, but bright. */
const youngShare = 0.34;
/** Bulges look a little flattened. */
const bulgeFlattening = 0.72;
/** Inside this share of the outer radius a galaxy with a bulge has no arms. */
const armsBegin = 0.075;

/** One star in so many is a soft patch: the light of the many that no film can show singly. */
const hazeEvery = 40;
const hazeLight = 0.75;
/** Share of the outer radius where haze ends, in discs and elsewhere: beyond, patches would stand alone. */
const hazeEnds = { disc: 0.55, spheroid: 0.12 };

/** H alpha and its neighbours as the eye would see them: common practice, no source. */
const cloudColour: [number, number, number] = [255, 96, 150];

/**
 * Phase of a place in the spiral: 0 on the ridge of an arm, negative on its inner edge. A
 * logarithmic spiral that trails where the disc turns counter-clockwise.
 */
export function armPhase(look: GalaxyLook, R: number, azimuth: number): number {
	const { arms, pitchDegrees } = look.spiral;
	return arms * (azimuth + Math.log(Math.max(R, 1e-3)) / Math.tan(pitchDegrees * DEGREE));
}

/**
 * Colours drawn away from grey, since a dim film washes them out: what long exposures show rather
 * than what the eye would see. Common practice, no source.
 */
function deepened([r, g, b]: [number, number, number], depth: number): [number, number, number] {
	const grey = (r + g + b) / 3;
	const away = (c: number) => Math.round(Math.min(255, Math.max(0, grey + (c - grey) * depth)));
	return [away(r), away(g), away(b)];
}

/** Eighty colours about a temperature, so that no star needs its own spectrum. */
function palette(temperature: number, spread: number, depth = 1.7): [number, number, number][] {
	return Array.from({ length: 80 }, (_, i) =>
		deepened(temperatureColour(temperature * (1 + spread * (i / 40 - 1))), depth)
	);
}

/** Draws places from the profiles: which component, which ring. */
function placer(profiles: ComponentProfile[], ringCount: number) {
	const cumulative = new Float64Array(profiles.length * ringCount);
	let sum = 0;
	profiles.forEach((profile, c) => {
		for (let k = 0; k < ringCount; k++) cumulative[c * ringCount + k] = sum += profile.weights[k];
	});
	return (u: number) => {
		let low = 0;
		let high = cumulative.length - 1;
		while (low < high) {
			const middle = (low + high) >> 1;
			if (cumulative[middle] <= u * sum) low = middle + 1;
			else high = middle;
		}
		return { component: Math.floor(low / ringCount), ring: low % ringCount };
	};
}

const twoSided = (random: Random, scale: number) =>
	-Math.log(1 - random.next()) * scale * (random.next() < 0.5 ? -1 : 1);

/**
 * Stars of the lit components, placed once: same model, look, seed and count, same stars. The same
 * everywhere to the 24 bits kept; sines may differ in the last of 53 bits between engines.
 * @throws Error where the model has no lit matter
 */
export function sampleStars(
	spec: MassModelSpec,
	look: GalaxyLook,
	options: SampleOptions
): StarList {
	const radii = options.radii ?? createRingTable(look.outerRadius).radii;
	const profiles = starProfiles(spec, radii);
	if (profiles.length === 0)
		throw new Error('A galaxy needs at least one lit component to show stars.');
	const random = seededRandom(options.seed);
	const place = placer(profiles, radii.length);
	const colours: Record<Exclude<Population, 'gas-cloud'>, [number, number, number][]> = {
		bulge: palette(look.bulgeTemperature, 0.22),
		disc: palette(look.discTemperature, 0.25),
		arm: palette(look.armTemperature, 0.35, 2.3)
	};
	const discs = profiles.map((p, i) => ({ p, i })).filter(({ p }) => p.disc);
	const hasBulge = discs.length < profiles.length;
	const placeInDisc = discs.length
		? placer(
				discs.map(({ p }) => p),
				radii.length
			)
		: null;
	const clouds = placeInDisc ? Math.min(look.gasClouds, Math.floor(options.count / 4)) : 0;
	const drafts: StarDraft[] = [];

	for (let i = 0; i < options.count; i++) {
		const cloud = i < clouds && placeInDisc !== null;
		const at = cloud ? placeInDisc(0.2 + 0.8 * random.next()) : place(random.next());
		const profile = cloud ? discs[at.component].p : profiles[at.component];
		const inner = at.ring === 0 ? 0 : (radii[at.ring - 1] + radii[at.ring]) / 2;
		const outer =
			at.ring === radii.length - 1 ? radii[at.ring] : (radii[at.ring] + radii[at.ring + 1]) / 2;
		const r = Math.sqrt(inner * inner + random.next() * (outer * outer - inner * inner));
		const azimuth = TAU * random.next();
		const young = random.next() < youngShare;
		let population: Population = cloud ? 'gas-cloud' : profile.disc && young ? 'arm' : 'disc';
		let R = r;
		let z: number;
		if (profile.disc) {
			z = twoSided(
				random,
				cloud || population === 'arm' ? youngHeight : profile.scaleHeight || oldHeight
			);
			if (!cloud && hasBulge && R < armsBegin * look.outerRadius) population = 'bulge';
		} else {
			population = 'bulge';
			const cosine = 2 * random.next() - 1;
			R = r * Math.sqrt(1 - cosine * cosine);
			z = r * cosine * bulgeFlattening;
		}
		const phase = armPhase(look, R, azimuth);
		// Few stars are bright: light falls off as a power of rank, cut at both ends.
		const rank = random.next();
		const hazeEnd = (profile.disc ? hazeEnds.disc : hazeEnds.spheroid) * look.outerRadius;
		const haze = !cloud && i % hazeEvery === 0 && r < hazeEnd;
		const light = cloud
			? 1.6 + 2.4 * rank
			: haze
				? hazeLight
				: Math.min(3.2, 0.42 * (1 - rank) ** -0.42);
		drafts.push({
			ring: ringOf(radii, R),
			x: R * Math.cos(azimuth),
			y: R * Math.sin(azimuth),
			z,
			armPhase: phase,
			light: population === 'arm' ? light * 1.5 : light,
			colour:
				population === 'gas-cloud'
					? cloudColour
					: colours[population][Math.floor(80 * random.next())],
			size: cloud ? 3 + 4 * random.next() : haze ? 4 + 4 * rank : light > 2.2 ? 1.8 : 1,
			population: populations.indexOf(population)
		});
	}
	return makeStarList(drafts, radii.length, options.seed);
}
