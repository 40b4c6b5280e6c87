import type { Measured, MeasuredPoint, MeasurementsInput } from './types';

const number = (value: number) => (Object.is(value, -0) ? '-0' : String(value));

/** Words that could be read as something else, or that run over lines, go as JSON. */
const words = (text: string) =>
	text.startsWith('"') || /[\r\n]/.test(text) || text !== text.trim() ? JSON.stringify(text) : text;

const measured = ({ value, error }: Measured) =>
	error === null ? number(value) : `${number(value)} ± ${number(error)}`;

const cell = (text: string) => (/[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text);

const optional = ['gas', 'disc', 'bulge'] as const;

/**
 * A table as CSV (RFC 4180, lines ended by a line feed) with the facts about it in comments above.
 * Reading it with `readMeasurements` gives the same table back, to the last digit.
 */
export function writeMeasurements(table: MeasurementsInput): string {
	const { name, source, radiusUnit, speedUnit, distance, inclination, rows } = table;
	const lines = [`# name: ${words(name)}`, `# source: ${words(source)}`];
	if (distance) lines.push(`# distance: ${measured(distance)} Mpc`);
	if (inclination) lines.push(`# inclination: ${measured(inclination)} degrees`);
	lines.push(`# radius unit: ${radiusUnit}`, `# speed unit: ${speedUnit}`);
	const extra = optional.filter((role) => rows.some((row) => row[role] !== undefined));
	const leftOut = rows.some((row) => row.leftOut !== undefined);
	lines.push(
		[
			`radius (${radiusUnit})`,
			`speed (${speedUnit})`,
			`error (${speedUnit})`,
			...extra.map((role) => `${role} (${speedUnit})`),
			...(leftOut ? ['left out'] : [])
		].join(',')
	);
	const line = (row: MeasuredPoint) =>
		[
			number(row.radius),
			number(row.speed),
			number(row.error),
			...extra.map((role) => (row[role] === undefined ? '' : number(row[role]))),
			...(leftOut ? [cell(row.leftOut ?? '')] : [])
		].join(',');
	for (const row of rows) lines.push(line(row));
	return `${lines.join('\n')}\n`;
}
