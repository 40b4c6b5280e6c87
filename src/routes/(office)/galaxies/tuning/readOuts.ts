import { massBreakdown, orbitTimeMyr } from '$lib/dynamics';
import type { MassModel } from '$lib/dynamics/types';
import { wordsFor } from '$lib/show/figureWords';

export interface ReadOut {
	key: string;
	label: string;
	/** As an audience would hear it. */
	words: string;
	/** Exactly, with its unit. */
	exact: string;
	/** What it is, where the label may be mistaken. */
	note?: string;
}

const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** Four digits with a power of ten as people write it. */
export function scientific(value: number): string {
	const [digits, exponent] = value.toExponential(3).split('e');
	const power = exponent
		.replace('+', '')
		.replace('-', '⁻')
		.replace(/\d/g, (digit) => superscripts[Number(digit)]);
	return `${digits} × 10${power}`;
}

const mass = (value: number) => ({
	words: wordsFor('mass', value).words,
	exact: value > 0 ? `${scientific(value)} Msun` : '0 Msun'
});

/** What can be said of one radius, kpc. */
export function readOuts(model: MassModel, R: number): ReadOut[] {
	const speed = model.circularVelocity(R);
	const { lit, unlit, ratio } = massBreakdown(model, R);
	const escape = model.escapeVelocity(R);
	const empty = lit + unlit === 0;
	const turning = speed > 0;
	return [
		{
			key: 'speed',
			label: 'Speed',
			words: turning ? wordsFor('speed', speed).words : 'no circular orbit',
			exact: turning ? `${speed.toFixed(2)} km/s` : ''
		},
		{
			key: 'orbit',
			label: 'One turn takes',
			words: turning ? wordsFor('time', orbitTimeMyr(model, R)).words : 'for ever',
			exact: turning ? `${orbitTimeMyr(model, R).toFixed(1)} Myr` : ''
		},
		{ key: 'lit', label: 'Mass inside, lit', ...mass(lit) },
		{ key: 'unlit', label: 'Mass inside, unlit', ...mass(unlit) },
		{
			key: 'ratio',
			label: 'Unlit for each lit',
			words: empty
				? 'nothing inside'
				: Number.isFinite(ratio)
					? wordsFor('ratio', ratio).words
					: 'no lit matter',
			exact: Number.isFinite(ratio) ? ratio.toFixed(3) : ''
		},
		{
			key: 'dynamical',
			label: 'Dynamical mass',
			...mass(model.dynamicalMass(R) || 0),
			note: 'v²R/G: what a round body would need for this speed. Not the sum of the masses inside.'
		},
		{
			key: 'escape',
			label: 'Escape speed',
			words: escape === Infinity ? 'nothing escapes' : wordsFor('speed', escape).words,
			exact: escape === Infinity ? 'this halo has no end' : `${escape.toFixed(2)} km/s`
		}
	];
}
