import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readMeasurements } from '../../src/lib/measurements/readMeasurements';
import type { MeasurementsRead } from '../../src/lib/measurements/reading';
import { tableSchema } from '../../src/lib/measurements/tableSchema';
import type { MeasurementsInput } from '../../src/lib/measurements/types';
import { writeMeasurements } from '../../src/lib/measurements/writeMeasurements';
import { anyTable } from './tableArbitrary';

const tableOf = (read: MeasurementsRead): MeasurementsInput => ({
	name: read.name ?? '',
	source: read.source ?? '',
	radiusUnit: read.radiusUnit.unit,
	speedUnit: read.speedUnit.unit,
	distance: read.distance,
	inclination: read.inclination,
	rows: read.rows
});

describe('writing and reading', () => {
	it('gives every table back exactly, with nothing refused', () => {
		fc.assert(
			fc.property(anyTable, (table) => {
				const read = readMeasurements(writeMeasurements(table));
				expect(read.problem).toBeNull();
				expect(read.refused).toEqual([]);
				expect(tableOf(read)).toEqual(table);
			}),
			{ numRuns: 500 }
		);
	});

	it('gives it back from bytes with a mark and with the line ends of another system', () => {
		fc.assert(
			fc.property(anyTable, (table) => {
				const text = `\uFEFF${writeMeasurements(table).replaceAll('\n', '\r\n')}`;
				expect(tableOf(readMeasurements(new TextEncoder().encode(text)))).toEqual(table);
			}),
			{ numRuns: 100 }
		);
	});

	it('every table that is written may be saved', () => {
		fc.assert(
			fc.property(anyTable, (table) => {
				expect(tableSchema.parse(table)).toEqual(table);
			}),
			{ numRuns: 200 }
		);
	});

	it('says the units, the facts and the reasons in words that other programs can read', () => {
		const csv = writeMeasurements({
			name: 'Speeds',
			source: 'Invented.',
			radiusUnit: 'arcsec',
			speedUnit: 'km/s',
			distance: { value: 9.5, error: 0.5 },
			inclination: { value: 60, error: null },
			rows: [
				{ radius: 10, speed: 100, error: 5, gas: -3 },
				{ radius: 20, speed: 120, error: 5, leftOut: 'Beam, smeared' }
			]
		});
		expect(csv).toBe(
			[
				'# name: Speeds',
				'# source: Invented.',
				'# distance: 9.5 ± 0.5 Mpc',
				'# inclination: 60 degrees',
				'# radius unit: arcsec',
				'# speed unit: km/s',
				'radius (arcsec),speed (km/s),error (km/s),gas (km/s),left out',
				'10,100,5,-3,',
				'20,120,5,,"Beam, smeared"',
				''
			].join('\n')
		);
	});
});
