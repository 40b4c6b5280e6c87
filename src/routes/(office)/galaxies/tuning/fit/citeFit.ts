import type { FitRecord } from '$lib/measurements/fitRecord';
import { number, valueWithError } from './fitWords';

const longest = 4000;

/** The line of the sources that a kept fit writes: data, result with errors, how well it does. */
export function fitLine(record: FitRecord): string {
	const found = record.free.map(
		({ component, label, value, error, unit }) =>
			`${component} ${label.toLowerCase()} ${valueWithError(value, error, unit)}`
	);
	const reduced =
		record.reducedChiSquared === null ? '' : `, reduced χ² ${number(record.reducedChiSquared, 3)}`;
	return `Fitted to ${record.points.used} points of “${record.measurements.name}”: ${found.join('; ')}${reduced}`;
}

/** Sources with the data's own citation and the fit's line; an older line for the same table goes. */
export function citedIn(sources: string, record: FitRecord): string {
	const mark = ` points of “${record.measurements.name}”: `;
	const lines = sources
		.split('\n')
		.filter(
			(line) => line.trim() !== '' && !(line.startsWith('Fitted to ') && line.includes(mark))
		);
	if (!lines.includes(record.measurements.source)) lines.push(record.measurements.source);
	const all = [...lines, fitLine(record)].join('\n');
	// Too long: what people wrote is never cut; the fit stays in its record.
	return all.length <= longest ? all : sources;
}
