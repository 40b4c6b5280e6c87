import type { MassModel } from '../dynamics/types';
import type { MeasuredPoint } from '../measurements/types';
import { kpcFromLightYears, myrFromTime, TAU } from '../units';
import { wordsFor, type FigureWords } from './figureWords';

/**
 * Figures in a script stand in braces: `{speed at 30 kly}`, `{unlit mass inside 50 kly}`,
 * `{peak speed}`. They are computed from the scene's galaxy as it is at that moment, never typed.
 */
export interface FigureContext {
	/** The scene's galaxy with its mix and live controls; null where the scene shows none. */
	model: MassModel | null;
	measured: readonly MeasuredPoint[];
	/** kpc; peaks are looked for up to here. */
	outerRadius: number;
}

interface Quantity {
	/** Words that come before the radius, and the joining word. */
	name: string;
	join: 'at' | 'inside' | null;
	help: string;
	/** R in kpc, NaN where the quantity takes none. @returns a value in `kind`'s unit */
	compute: (context: FigureContext & { model: MassModel }, R: number) => number;
	kind: 'speed' | 'time' | 'mass' | 'ratio';
}

/** Speed interpolated between measured points, km/s; NaN outside them. */
function measuredSpeed(points: readonly MeasuredPoint[], R: number): number {
	const sorted = [...points].sort((a, b) => a.radius - b.radius);
	const above = sorted.findIndex((p) => p.radius >= R);
	if (above < 0) return NaN;
	const b = sorted[above];
	if (b.radius === R) return b.speed;
	if (above === 0) return NaN;
	const a = sorted[above - 1];
	return a.speed + ((b.speed - a.speed) * (R - a.radius)) / (b.radius - a.radius);
}

function peakSpeed(model: MassModel, outerRadius: number): number {
	let peak = 0;
	for (let i = 1; i <= 500; i++)
		peak = Math.max(peak, model.circularVelocity((outerRadius * i) / 500) || 0);
	return peak;
}

/** Every figure a script may use, with what it means; the composer lists them from here. */
export const quantities: readonly Quantity[] = [
	{
		name: 'speed',
		join: 'at',
		kind: 'speed',
		help: 'how fast stars move there',
		compute: ({ model }, R) => model.circularVelocity(R)
	},
	{
		name: 'speed from light',
		join: 'at',
		kind: 'speed',
		help: 'how fast they would move if the stars and gas were all there is',
		compute: ({ model }, R) => model.lit().circularVelocity(R)
	},
	{
		name: 'measured speed',
		join: 'at',
		kind: 'speed',
		help: 'between the measured points on either side',
		compute: ({ measured }, R) => measuredSpeed(measured, R)
	},
	{
		name: 'escape speed',
		join: 'at',
		kind: 'speed',
		help: 'faster than this a star leaves for good',
		compute: ({ model }, R) => model.escapeVelocity(R)
	},
	{
		name: 'peak speed',
		join: null,
		kind: 'speed',
		help: 'the greatest speed anywhere in the disc',
		compute: ({ model, outerRadius }) => peakSpeed(model, outerRadius)
	},
	{
		name: 'turn time',
		join: 'at',
		kind: 'time',
		help: 'how long a star there takes for one turn',
		compute: ({ model }, R) => myrFromTime(TAU / model.circularFrequency(R))
	},
	{
		name: 'mass',
		join: 'inside',
		kind: 'mass',
		help: 'all matter inside that radius',
		compute: ({ model }, R) => model.enclosedMass(R)
	},
	{
		name: 'lit mass',
		join: 'inside',
		kind: 'mass',
		help: 'stars and gas inside that radius',
		compute: ({ model }, R) => model.lit().enclosedMass(R)
	},
	{
		name: 'unlit mass',
		join: 'inside',
		kind: 'mass',
		help: 'halo matter inside that radius',
		compute: ({ model }, R) => model.unlit().enclosedMass(R)
	},
	{
		name: 'dynamical mass',
		join: 'inside',
		kind: 'mass',
		help: 'what the speed there implies, v²R/G, as if all matter were a ball',
		compute: ({ model }, R) => model.dynamicalMass(R)
	},
	{
		name: 'unlit to lit',
		join: 'inside',
		kind: 'ratio',
		help: 'how many times more unlit than lit matter inside that radius',
		compute: ({ model }, R) => model.unlit().enclosedMass(R) / model.lit().enclosedMass(R)
	}
];

const toKpc: Record<string, (n: number) => number> = {
	kpc: (n) => n,
	pc: (n) => n / 1000,
	ly: kpcFromLightYears,
	kly: (n) => kpcFromLightYears(n * 1000)
};

const usage = 'Write it like {speed at 30 kly} or {mass inside 10 kpc}.';

export type ScriptPart =
	| { kind: 'words'; text: string }
	/** `source` is what stands between the braces. */
	| { kind: 'figure'; source: string };

/** @returns the script cut at its braces; a lone brace stays words */
export function parseScript(script: string): ScriptPart[] {
	const parts: ScriptPart[] = [];
	let from = 0;
	for (const match of script.matchAll(/\{([^{}\n]{1,80})\}/g)) {
		if (match.index > from) parts.push({ kind: 'words', text: script.slice(from, match.index) });
		parts.push({ kind: 'figure', source: match[1].trim() });
		from = match.index + match[0].length;
	}
	if (from < script.length) parts.push({ kind: 'words', text: script.slice(from) });
	return parts;
}

export type Figure =
	| ({ ok: true; source: string; value: number; quantity: string } & FigureWords)
	| { ok: false; source: string; problem: string };

/** Computes one figure. A figure that cannot be computed says why; it is never guessed. */
export function computeFigure(source: string, context: FigureContext): Figure {
	const fail = (problem: string): Figure => ({ ok: false, source, problem });
	const match = /^([a-z ]+?)(?:\s+(at|inside)\s+([0-9]*\.?[0-9]+)\s*([a-z]+))?$/i.exec(source);
	const name = match?.[1].toLowerCase().replace(/\s+/g, ' ');
	const quantity = quantities.find((q) => q.name === name);
	if (!match || !quantity) {
		const known = quantities.map((q) => q.name).join(', ');
		return fail(`“${source}” is not a figure this program knows. It knows: ${known}.`);
	}
	const join = match[2]?.toLowerCase() ?? null;
	if (join !== quantity.join) {
		return fail(
			quantity.join
				? `“${quantity.name}” needs a radius after “${quantity.join}”. ${usage}`
				: `“${quantity.name}” takes no radius.`
		);
	}
	let R = NaN;
	if (quantity.join) {
		const convert = toKpc[match[4].toLowerCase()];
		if (!convert) return fail(`“${match[4]}” is not a length here. Use kly, ly, kpc or pc.`);
		R = convert(Number(match[3]));
		if (!(R > 0 && R <= 1000)) return fail('The radius must be above 0 and at most 1,000 kpc.');
	}
	if (!context.model) return fail('This scene shows no galaxy to compute it from.');
	const value = quantity.compute({ ...context, model: context.model }, R);
	if (Number.isNaN(value)) {
		return fail(
			quantity.name === 'measured speed'
				? 'There is no measured point on both sides of this radius.'
				: 'This galaxy has no such value at this radius.'
		);
	}
	return { ok: true, source, value, quantity: quantity.name, ...wordsFor(quantity.kind, value) };
}

export type FilledPart = { kind: 'words'; text: string } | { kind: 'figure'; figure: Figure };

/** The script with its figures computed, in order. */
export const fillFigures = (script: string, context: FigureContext): FilledPart[] =>
	parseScript(script).map((part) =>
		part.kind === 'words' ? part : { kind: 'figure', figure: computeFigure(part.source, context) }
	);

/** The script as plain words; a figure that cannot be computed stands as "–". */
export const filledText = (script: string, context: FigureContext): string =>
	fillFigures(script, context)
		.map((part) => (part.kind === 'words' ? part.text : part.figure.ok ? part.figure.words : '–'))
		.join('');
