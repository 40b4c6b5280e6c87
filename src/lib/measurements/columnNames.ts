import type { ColumnRole } from './reading';

/** Names of columns without blanks and signs; the first ones are the surest. */
const names: Record<Exclude<ColumnRole, 'error'>, readonly string[]> = {
	radius: [
		'radius',
		'rad',
		'r',
		'radii',
		'galactocentricradius',
		'galactocentricdistance',
		'distancefromthecentre',
		'distancefromcentre',
		'semimajoraxis',
		'rmaj',
		'rgal',
		'rgc'
	],
	speed: [
		'vobs',
		'vobserved',
		'vrot',
		'vrotation',
		'speed',
		'rotationspeed',
		'rotationvelocity',
		'rotationalvelocity',
		'rotationalspeed',
		'observedspeed',
		'observedvelocity',
		'measuredspeed',
		'velocity',
		'vel',
		'v',
		'vc',
		'vcirc',
		'vcircular',
		'circularspeed',
		'circularvelocity',
		'vphi'
	],
	gas: ['vgas', 'gas', 'gasspeed', 'gasvelocity', 'vhi', 'hi', 'vgasonly'],
	disc: ['vdisk', 'vdisc', 'disk', 'disc', 'vstars', 'vstar', 'stars', 'discspeed', 'diskspeed'],
	bulge: ['vbul', 'vbulge', 'bulge', 'bul', 'vbulg', 'bulgespeed'],
	'left out': ['leftout', 'leftoutbecause', 'reasonleftout']
};
const errorNames = [
	'error',
	'err',
	'standarderror',
	'onestandarderror',
	'uncertainty',
	'unc',
	'stderr',
	'std',
	'sd',
	'sigma',
	'1sigma',
	'errors',
	'e',
	'±'
];
const errorMarks = [
	'uncertainty',
	'errorin',
	'errorof',
	'error',
	'sigma',
	'delta',
	'err',
	'unc',
	'sig',
	'std',
	'e',
	'd',
	'u'
];

/** Longer headings are sentences. */
const longestName = 60;

const keyOf = (name: string) =>
	name
		.toLowerCase()
		.replaceAll('σ', 'sigma')
		.replaceAll('δ', 'delta')
		.replace(/\+\/?-/g, '±')
		.replace(/[^\p{L}\p{N}±]/gu, '');

export interface NameMatch {
	role: ColumnRole;
	/** 0 is the surest. */
	rank: number;
}

function errorRank(key: string): number {
	const plain = errorNames.indexOf(key);
	if (plain !== -1) return plain;
	for (const mark of errorMarks) {
		const before = key.startsWith(mark) ? names.speed.indexOf(key.slice(mark.length)) : -1;
		if (before !== -1) return before;
		const after = key.endsWith(mark) ? names.speed.indexOf(key.slice(0, -mark.length)) : -1;
		if (after !== -1) return after;
	}
	return -1;
}

/** What a column's name says it is, if anything. */
export function roleByName(name: string): NameMatch | null {
	if (name.length > longestName) return null;
	const key = keyOf(name);
	if (key === '') return null;
	for (const role of Object.keys(names) as (keyof typeof names)[]) {
		const rank = names[role].indexOf(key);
		if (rank !== -1) return { role, rank };
	}
	const rank = errorRank(key);
	return rank === -1 ? null : { role: 'error', rank };
}
