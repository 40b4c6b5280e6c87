import { parseNumber } from '$lib/components/settings/numberText';
import { measuredPoints } from '$lib/measurements/measuredPoints';
import { readMeasurements } from '$lib/measurements/readMeasurements';
import type { MeasurementsRead, ReadChoices } from '$lib/measurements/reading';
import { tableSchema } from '$lib/measurements/tableSchema';
import type { Measured, MeasurementsInput } from '$lib/measurements/types';

/** A value and its error as they are typed; an empty value says that there is none. */
export interface TypedMeasured {
	value: string;
	error: string;
}
const nothingTyped: TypedMeasured = { value: '', error: '' };
const typedFrom = (measured: Measured | null): TypedMeasured =>
	measured
		? {
				value: String(measured.value),
				error: measured.error === null ? '' : String(measured.error)
			}
		: nothingTyped;

/** NaN stays NaN, so that the table's check refuses it at its field. */
function measuredFrom({ value, error }: TypedMeasured): Measured | null {
	if (value.trim() === '') return null;
	return { value: parseNumber(value), error: error.trim() === '' ? null : parseNumber(error) };
}

const stemOf = (fileName: string) => fileName.replace(/\.[^.]*$/, '').slice(0, 120);

/** A table on its way in: what was brought, how it is read, and what is still to be said of it. */
export class Importing {
	/** The text or the file; null before anything was brought. */
	input = $state.raw<string | Uint8Array | null>(null);
	fileName = $state('');
	choices = $state.raw<ReadChoices>({});
	name = $state('');
	source = $state('');
	distance = $state.raw<TypedMeasured>(nothingTyped);
	inclination = $state.raw<TypedMeasured>(nothingTyped);
	/** One error for every row, as it is typed. */
	sameError = $state('');
	/** Whether saving was asked for: from then on empty fields are said to be missing. */
	asked = $state(false);

	readonly read: MeasurementsRead | null = $derived.by(() => {
		if (this.input === null) return null;
		const sameError = parseNumber(this.sameError);
		return readMeasurements(this.input, {
			...this.choices,
			distance: measuredFrom(this.distance),
			...(sameError > 0 ? { sameError } : {})
		});
	});
	readonly table: MeasurementsInput | null = $derived.by(() => {
		if (!this.read) return null;
		return {
			name: this.name,
			source: this.source,
			radiusUnit: this.read.radiusUnit.unit,
			speedUnit: this.read.speedUnit.unit,
			distance: measuredFrom(this.distance),
			inclination: measuredFrom(this.inclination),
			rows: this.read.rows
		};
	});
	/** In kpc and km/s; none for angles without a distance. */
	readonly points = $derived.by(() => (this.table ? measuredPoints(this.table) : []));
	/** What keeps the table from being saved, by the path of its field. */
	readonly problems: Readonly<Record<string, string>> = $derived.by(() => {
		const checked = this.table ? tableSchema.safeParse(this.table) : null;
		const issues = checked?.error?.issues ?? [];
		return Object.fromEntries(issues.map(({ path, message }) => [path.join('.'), message]));
	});

	/** Takes a new text or file; what its comments say fills the fields. */
	bring(input: string | Uint8Array, fileName = ''): void {
		this.choices = {};
		this.sameError = '';
		this.asked = false;
		this.fileName = fileName;
		const { name, source, distance, inclination } = readMeasurements(input);
		this.name = name ?? stemOf(fileName);
		this.source = source ?? '';
		this.distance = typedFrom(distance);
		this.inclination = typedFrom(inclination);
		this.input = input;
	}

	choose(choices: ReadChoices): void {
		this.choices = { ...this.choices, ...choices };
	}

	/** A problem of a field, once it is time to say it. */
	problemAt(...paths: string[]): string | undefined {
		const path = paths.find((one) => one in this.problems);
		if (path === undefined) return undefined;
		const empty =
			(path === 'name' && this.name === '') || (path === 'source' && this.source === '');
		return empty && !this.asked ? undefined : this.problems[path];
	}
}
