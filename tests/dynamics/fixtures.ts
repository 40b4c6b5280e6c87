import { readFileSync } from 'node:fs';

/** Lines of a fixture as records by column name. */
export function csvFixture(name: string): Record<string, string>[] {
	const text = readFileSync(new URL(`./fixtures/${name}`, import.meta.url), 'utf8');
	const [header, ...lines] = text.trim().split('\n');
	const names = header.split(',');
	return lines.map((line) => {
		const values = line.split(',');
		return Object.fromEntries(names.map((column, i) => [column, values[i]]));
	});
}

export function jsonFixture(name: string): unknown {
	return JSON.parse(readFileSync(new URL(`./fixtures/${name}`, import.meta.url), 'utf8'));
}
