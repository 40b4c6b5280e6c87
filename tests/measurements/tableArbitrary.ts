import fc from 'fast-check';
import { kpcIn, kmsIn } from '../../src/lib/measurements/measuredPoints';
import {
	radiusUnits,
	speedUnits,
	type Measured,
	type MeasuredPoint,
	type MeasurementsInput
} from '../../src/lib/measurements/types';

const inRange = (min: number, max: number) =>
	fc.double({ min, max, noNaN: true, noDefaultInfinity: true, minExcluded: min === 0 });

/** Any text a person might type, without signs that no database keeps; trimmed and not empty. */
const words = (maxLength: number, lines = false) =>
	fc
		.oneof(
			fc.string({ unit: 'grapheme', minLength: 1, maxLength }),
			fc.string({ unit: fc.constantFrom(...'"\',;|\t\n#: =%1.5e-A'), minLength: 1, maxLength }),
			fc.constantFrom('"', '1,5', 'NA', '-', '"quoted"', '# no', 'radius', 'km/s', '1;2;3;4;5')
		)
		.map((text) =>
			text
				.replace(lines ? /(?!\n)[\p{Cc}\p{Cs}\p{Zl}\p{Zp}]/gu : /[\p{Cc}\p{Cs}\p{Zl}\p{Zp}]/gu, '')
				.slice(0, maxLength)
				.trim()
		)
		.filter((text) => text !== '' && !/\p{Cs}/u.test(text));

const measured = (max: number): fc.Arbitrary<Measured> =>
	fc.record({
		value: inRange(0, max),
		error: fc.option(inRange(0, max))
	});

const point = (radius: number, speed: number, error: number): fc.Arbitrary<MeasuredPoint> =>
	fc.record(
		{
			radius: inRange(0, radius),
			speed: inRange(-speed, speed),
			error: inRange(0, error),
			gas: inRange(-speed, speed),
			disc: inRange(-speed, speed),
			bulge: inRange(-speed, speed),
			leftOut: words(40)
		},
		{ requiredKeys: ['radius', 'speed', 'error'] }
	);

/** Any table that may be saved. */
export const anyTable: fc.Arbitrary<MeasurementsInput> = fc
	.record({
		name: words(60),
		source: words(120, true),
		radiusUnit: fc.constantFrom(...radiusUnits),
		speedUnit: fc.constantFrom(...speedUnits),
		given: measured(500),
		inclination: fc.option(measured(90)),
		withDistance: fc.boolean()
	})
	.chain(({ given, withDistance, ...table }) => {
		const angle = table.radiusUnit === 'arcsec' || table.radiusUnit === 'arcmin';
		const distance = angle || withDistance ? given : null;
		const kpc = kpcIn(table.radiusUnit, distance?.value ?? null);
		const kms = kmsIn(table.speedUnit);
		return fc
			.array(point(Math.min(1e300, 900 / kpc), 1900 / kms, 900 / kms), {
				minLength: 1,
				maxLength: 12
			})
			.map((rows) => ({ ...table, distance, rows }));
	});
