import { commentFacts } from './commentFacts';
import { mostColumns, mostRows } from './limits';
import { matchColumns } from './matchColumns';
import { readRow, type RowSettings } from './readRow';
import { readUnits } from './readUnits';
import type { ColumnRead, ColumnRole, MeasurementsRead, ReadChoices, RefusedLine } from './reading';
import type { TableRecord } from './records';
import { splitText, type TextLines } from './splitText';
import { tableShape, type TableShape } from './tableShape';
import { textOf } from './textOf';

const nothingRead: MeasurementsRead = {
	problem: null,
	separator: 'comma',
	decimalComma: false,
	header: null,
	columns: [],
	radiusUnit: { unit: 'kpc', why: '' },
	speedUnit: { unit: 'km/s', why: '' },
	name: null,
	source: null,
	distance: null,
	inclination: null,
	rows: [],
	lines: [],
	refused: [],
	comments: []
};

const refusal = ({ line, text }: TableRecord, reason: string): RefusedLine => ({
	line,
	text: text.length > 200 ? `${text.slice(0, 199)}…` : text,
	reason
});

function columnsOf(
	{ header, first, count, decimalComma }: TableShape,
	roles: ReadChoices['roles']
): ColumnRead[] {
	const cells = first.map((row) => row.cells);
	return matchColumns(header.headings, cells, count, decimalComma).map(({ role, why }, i) => {
		const chosen = roles !== undefined && i < roles.length;
		return {
			heading: header.headings?.[i]?.text ?? null,
			unit: header.headings?.[i]?.unit ?? null,
			role: chosen ? roles[i] : role,
			why: chosen && roles[i] !== role ? 'Chosen here' : why,
			sample: cells.slice(0, 3).map((row) => row[i] ?? '')
		};
	});
}

/** What keeps a table from being read at all: too much of it, or columns missing or given twice. */
function problemOf(
	{ table, count, header }: TableShape,
	{ lines, further }: TextLines,
	columns: readonly ColumnRead[],
	sameError: number | undefined
): string | null {
	if (table.length > mostRows || further > 0) {
		const all = (lines.length + further - header.before).toLocaleString('en-GB');
		return `The table has ${all} rows; at most ${mostRows.toLocaleString('en-GB')} can be kept. Nothing of it was read: bring a part of it, or average neighbouring points.`;
	}
	if (count > mostColumns) {
		return `The table has more than ${mostColumns} columns. Bring only those of the rotation curve.`;
	}
	if (table.length === 0) return 'There are no rows of numbers in this.';
	const used = columns.flatMap(({ role }) => (role ? [role] : []));
	const twice = used.find((role, i) => used.indexOf(role) !== i);
	if (twice) return `Two columns are said to be the ${twice}. Choose one of them.`;
	const wanted: ColumnRole[] =
		sameError === undefined ? ['radius', 'speed', 'error'] : ['radius', 'speed'];
	const missing = wanted.find((role) => !used.includes(role));
	if (missing === undefined) return null;
	const all = missing === 'error' ? ', or give one error for all rows' : '';
	return `No column is known to be the ${missing}. Say below which one it is${all}.`;
}

function readRows(records: readonly TableRecord[], settings: RowSettings) {
	const rows: MeasurementsRead['rows'] = [];
	const lines: number[] = [];
	const refused: RefusedLine[] = [];
	for (const record of records) {
		const read = record.fault ? { reason: record.fault } : readRow(record.cells, settings);
		if ('reason' in read) {
			refused.push(refusal(record, read.reason));
			continue;
		}
		rows.push(read.row);
		lines.push(record.line);
	}
	return { rows, lines, refused };
}

function readTable(text: TextLines, choices: ReadChoices): MeasurementsRead {
	const { sameError } = choices;
	const shape = tableShape(text, choices);
	const comments = text.comments.map((comment) => comment.text);
	const facts = commentFacts(comments);
	const columns = columnsOf(shape, choices.roles);
	const { radiusUnit, speedUnit } = readUnits(columns, facts, choices);
	const distance = choices.distance === undefined ? facts.distance : choices.distance;
	const { header, separator, decimalComma, count, least } = shape;
	const read: MeasurementsRead = {
		...nothingRead,
		problem: problemOf(shape, text, columns, sameError),
		separator,
		decimalComma,
		header: header.headings?.map((heading) => heading.text) ?? null,
		columns,
		radiusUnit,
		speedUnit,
		name: facts.name,
		source: facts.source,
		distance,
		inclination: facts.inclination,
		refused: header.broken.map((record) =>
			refusal(record, record.fault ?? 'It stands above the first row and is no heading.')
		),
		comments
	};
	if (read.problem) return read;
	const { rows, lines, refused } = readRows(shape.table, {
		columns: Object.fromEntries(columns.flatMap(({ role }, i) => (role ? [[role, i]] : []))),
		count,
		least,
		comma: decimalComma,
		radiusUnit: radiusUnit.unit,
		speedUnit: speedUnit.unit,
		distance,
		sameError
	});
	const problem =
		rows.length === 0 ? 'No line could be read as a row; the reasons stand below.' : null;
	return { ...read, problem, rows, lines, refused: [...read.refused, ...refused] };
}

/**
 * Reads a table of observed speeds: comma, tab, semicolon, bar or blanks between cells, with or
 * without headings and comments. Never throws; what cannot be read is said in `problem` and `refused`.
 * @param input text, or the bytes of a file
 */
export function readMeasurements(
	input: string | Uint8Array,
	choices: ReadChoices = {}
): MeasurementsRead {
	const read = textOf(input);
	if ('problem' in read) return { ...nothingRead, problem: read.problem };
	const text = splitText(read.text);
	if (text.lines.length > 0) return readTable(text, choices);
	return {
		...nothingRead,
		comments: text.comments.map((comment) => comment.text),
		problem:
			text.comments.length > 0
				? 'There is nothing but comments in this.'
				: 'There is nothing in this. Paste a table, or choose a file that holds one.'
	};
}
