import { radiusUnitOf, speedUnitOf } from './headingUnits';
import type { Measured, RadiusUnit, SpeedUnit } from './types';

/** What comment lines say of the whole table. */
export interface CommentFacts {
	name: string | null;
	source: string | null;
	radiusUnit: RadiusUnit | null;
	speedUnit: SpeedUnit | null;
	distance: Measured | null;
	inclination: Measured | null;
}

const number = String.raw`([+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)`;
const withError = String.raw`${number}\s*(?:(?:±|\+\/-|\+-)\s*${number})?\s*`;
const distanceIn = new RegExp(
	String.raw`^(?:distance|dist|d)\s*[:=]\s*${withError}(Mpc|kpc)\b`,
	'i'
);
const inclinationIn = new RegExp(
	String.raw`^(?:inclination|incl|inc|i)\s*[:=]\s*${withError}(?:degrees?|deg|°)?\s*$`,
	'i'
);
const wordsIn = /^(name|source|citation|reference|radius unit|speed unit)\s*[:=]\s*(\S.*)$/i;

function measured(value: string, error: string | undefined, unit = 1): Measured | null {
	const number = Number(value) / unit;
	if (!(number > 0 && Number.isFinite(number))) return null;
	const spread = error === undefined ? null : Number(error) / unit;
	return { value: number, error: spread !== null && spread > 0 ? spread : null };
}

/** Words in quotes are JSON: so they may begin with a quote or hold more than one line. */
function plainWords(text: string): string {
	const trimmed = text.trim();
	if (!trimmed.startsWith('"')) return trimmed;
	try {
		const value: unknown = JSON.parse(trimmed);
		return typeof value === 'string' ? value : trimmed;
	} catch (error) {
		if (!(error instanceof SyntaxError)) throw error;
		return trimmed;
	}
}

/** Reads one comment into `facts`; what was said before stays. */
function readComment(facts: CommentFacts, comment: string): void {
	const distance = distanceIn.exec(comment);
	if (distance) {
		const unit = distance[3].toLowerCase() === 'kpc' ? 1000 : 1;
		facts.distance ??= measured(distance[1], distance[2], unit);
		return;
	}
	const inclination = inclinationIn.exec(comment);
	if (inclination) {
		facts.inclination ??= measured(inclination[1], inclination[2]);
		return;
	}
	const words = wordsIn.exec(comment);
	if (!words) return;
	const value = plainWords(words[2]);
	switch (words[1].toLowerCase()) {
		case 'name':
			facts.name ??= value;
			break;
		case 'radius unit':
			facts.radiusUnit ??= radiusUnitOf(value) ?? null;
			break;
		case 'speed unit':
			facts.speedUnit ??= speedUnitOf(value) ?? null;
			break;
		default:
			facts.source ??= value;
	}
}

/** @param comments without their signs */
export function commentFacts(comments: readonly string[]): CommentFacts {
	const facts: CommentFacts = {
		name: null,
		source: null,
		radiusUnit: null,
		speedUnit: null,
		distance: null,
		inclination: null
	};
	for (const comment of comments) readComment(facts, comment.trim());
	return facts;
}
