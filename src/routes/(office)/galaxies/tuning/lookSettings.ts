import type { GalaxyDocument } from '$lib/show/galaxy';
import type { NumberRange } from '$lib/show/editingControls';

type Look = GalaxyDocument['look'];

/** One number of the look: its range, and how to read it from a look and put it into one. */
export interface LookSetting {
	range: NumberRange;
	get: (look: Look) => number;
	set: (look: Look, value: number) => Look;
}

const range = (
	label: string,
	unit: string,
	[min, max]: [number, number],
	step: number,
	slider: [number, number] = [min, max],
	scale: NumberRange['scale'] = 'linear'
): NumberRange => ({
	label,
	unit,
	min,
	max,
	sliderMin: slider[0],
	sliderMax: slider[1],
	step,
	scale
});

const spiral = (key: keyof Look['spiral'], its: NumberRange): LookSetting => ({
	range: its,
	get: (look) => look.spiral[key],
	set: (look, value) => ({ ...look, spiral: { ...look.spiral, [key]: whole(its, value) } })
});

const plain = (key: Exclude<keyof Look, 'spiral'>, its: NumberRange): LookSetting => ({
	range: its,
	get: (look) => look[key],
	set: (look, value) => ({ ...look, [key]: whole(its, value) })
});

/** Counts are whole numbers. */
const whole = ({ step }: NumberRange, value: number) => (step === 1 ? Math.round(value) : value);

/** Every number of a galaxy's look, in the order of the form. Hard limits are the document's (tested). */
export const lookSettings: LookSetting[] = [
	spiral('arms', range('Spiral arms', '', [0, 6], 1)),
	spiral('pitchDegrees', range('Opening of the arms', '°', [5, 40], 0.5)),
	spiral('patternSpeed', range('Turning of the arms', 'km/s/kpc', [0, 100], 0.1, [0, 50])),
	spiral('strength', range('Strength of the arms', '', [0, 1], 0.01)),
	plain('dust', range('Dust', '', [0, 1], 0.01)),
	plain('gasClouds', range('Gas clouds', '', [0, 1000], 1)),
	plain('outerRadius', range('Drawn out to', 'kpc', [1, 200], 0.1, [2, 100], 'log')),
	plain('bulgeTemperature', range('Colour of the bulge', 'K', [2500, 12000], 100)),
	plain('discTemperature', range('Colour of the disc', 'K', [2500, 12000], 100)),
	plain('armTemperature', range('Colour of the arms', 'K', [2500, 30000], 100))
];
