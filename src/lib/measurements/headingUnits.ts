import type { RadiusUnit, SpeedUnit } from './types';

const radiusWords: Record<RadiusUnit, readonly string[]> = {
	kpc: ['kpc', 'kiloparsec', 'kiloparsecs'],
	pc: ['pc', 'parsec', 'parsecs'],
	arcsec: ['arcsec', 'arcsecs', 'arcsecond', 'arcseconds', 'asec', '"', '″', "''"],
	arcmin: ['arcmin', 'arcmins', 'arcminute', 'arcminutes', 'amin', "'", '′'],
	'light-years': ['ly', 'lyr', 'lightyear', 'lightyears']
};
const speedWords: Record<SpeedUnit, readonly string[]> = {
	'km/s': ['km/s', 'kms', 'kms1', 'km/sec', 'kmpersecond', 'kilometrespersecond'],
	'm/s': ['m/s', 'ms', 'ms1', 'm/sec', 'metrespersecond']
};

const find = <T extends string>(words: Record<T, readonly string[]>, unit: string) => {
	const key = unit.toLowerCase().replace(/[\s\-−–^{}.*·]/g, '');
	return (Object.keys(words) as T[]).find((name) => words[name].includes(key));
};

export const radiusUnitOf = (unit: string): RadiusUnit | undefined => find(radiusWords, unit);
export const speedUnitOf = (unit: string): SpeedUnit | undefined => find(speedWords, unit);

const bracketed = /^(.*?)\s*[([{]\s*([^()[\]{}]*)\s*[)\]}]\s*$/;
const trailing =
	/^(.*?)(?:[\s_,/]+|\s+in\s+)(kpc|pc|arcsec|arcmin|light[ -]years?|ly|km\/s|km[ _]?s\^?-?1|kms-1|kms|m\/s)$/i;

/** A heading such as "Radius (kpc)", "R_kpc" or "V, km/s" as name and unit. */
export function splitHeading(heading: string): { name: string; unit: string | null } {
	const text = heading.trim();
	const match = bracketed.exec(text) ?? trailing.exec(text);
	return match && match[1] !== ''
		? { name: match[1].trim(), unit: match[2].trim() }
		: { name: text, unit: null };
}

/** Whether a cell of a line under the headings is a unit. */
export const isUnitCell = (cell: string): boolean => {
	const text = cell.trim().replace(/^[([{]|[)\]}]$/g, '');
	return (
		radiusUnitOf(text) !== undefined ||
		speedUnitOf(text) !== undefined ||
		/^l(?:sun)?\/pc\^?2$/i.test(text)
	);
};
