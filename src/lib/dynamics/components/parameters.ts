import type { ParameterInfo } from '../types';

type Own = Partial<ParameterInfo> & { initial: number; help: string };

/** A mass in Msun. */
export const massParameter = (own: Own): ParameterInfo => ({
	name: 'mass',
	label: 'Mass',
	unit: 'Msun',
	min: 1,
	max: 1e16,
	usualMin: 1e8,
	usualMax: 1e12,
	step: 1e6,
	scale: 'log',
	optional: false,
	...own
});

/** A length in kpc, by default the scale length. */
export const lengthParameter = (own: Own): ParameterInfo => ({
	name: 'scaleLength',
	label: 'Scale length',
	unit: 'kpc',
	min: 0.001,
	max: 1000,
	usualMin: 0.1,
	usualMax: 20,
	step: 0.01,
	scale: 'log',
	optional: false,
	...own
});

/** A density in Msun/kpc³, at the place `help` says. */
export const densityParameter = (own: Own): ParameterInfo => ({
	name: 'density',
	label: 'Density',
	unit: 'Msun/kpc³',
	min: 1,
	max: 1e14,
	usualMin: 1e5,
	usualMax: 1e9,
	step: 1e4,
	scale: 'log',
	optional: false,
	...own
});

/** A parameter whose only value in this version is 0; it may be left out. */
export const zeroParameter = (
	own: Own & { name: string; label: string; unit: string }
): ParameterInfo => ({
	min: 0,
	max: 0,
	usualMin: 0,
	usualMax: 0,
	step: 0.01,
	scale: 'linear',
	optional: true,
	...own
});
