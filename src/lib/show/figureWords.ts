/** A value as an audience would hear it, and exactly for whoever checks it. */
export interface FigureWords {
	/** Such as "212 km/s" or "about 95 billion Suns". */
	words: string;
	/** Four significant digits and the unit, such as "9.512e10 Msun". */
	exact: string;
}

/** @returns `value` to so many significant digits, with thousands separated, never as 1e5 */
export function significant(value: number, digits: number): string {
	if (value === 0) return '0';
	return Number(value.toPrecision(digits)).toLocaleString('en-GB', { maximumFractionDigits: 20 });
}

const bigNumbers: [number, string][] = [
	[1e12, 'trillion'],
	[1e9, 'billion'],
	[1e6, 'million']
];

function massWords(mass: number): string {
	if (mass === 0) return 'nothing';
	for (const [size, name] of bigNumbers) {
		// 999.6 billion is read as 1 trillion, so the cut is made after rounding to two digits.
		if (Number(mass.toPrecision(2)) >= size) return `${significant(mass / size, 2)} ${name} Suns`;
	}
	return `${significant(mass, 2)} Suns`;
}

function timeWords(myr: number): string {
	if (Number(myr.toPrecision(2)) >= 1000) return `${significant(myr / 1000, 2)} billion years`;
	return `${significant(myr, 2)} million years`;
}

/** @param value km/s, million years, Msun or a plain ratio, by kind */
export function wordsFor(kind: 'speed' | 'time' | 'mass' | 'ratio', value: number): FigureWords {
	const exactUnit = { speed: 'km/s', time: 'Myr', mass: 'Msun', ratio: '' }[kind];
	const exact = Number.isFinite(value) ? `${value.toPrecision(4)} ${exactUnit}`.trim() : 'no limit';
	if (!Number.isFinite(value)) {
		return { words: kind === 'time' ? 'for ever' : 'without limit', exact };
	}
	switch (kind) {
		case 'speed':
			return { words: `${Math.round(value).toLocaleString('en-GB')} km/s`, exact };
		case 'time':
			return { words: timeWords(value), exact };
		case 'mass':
			return { words: massWords(value), exact };
		case 'ratio':
			return { words: `${significant(value, 2)} times`, exact };
	}
}
