import type { Measured, MeasuredPoint, RadiusUnit, SpeedUnit } from './types';

/** What a column can be; null where it is not used. */
export const columnRoles = [
	'radius',
	'speed',
	'error',
	'gas',
	'disc',
	'bulge',
	'left out'
] as const;
export type ColumnRole = (typeof columnRoles)[number];

export const separators = ['tab', 'semicolon', 'comma', 'bar', 'blanks'] as const;
/** What stands between two cells of a line. */
export type Separator = (typeof separators)[number];

/** What a person decides in place of what was found. */
export interface ReadChoices {
	separator?: Separator;
	/** Whether 1,5 is one and a half. */
	decimalComma?: boolean;
	/** Whether the first line that is no comment names the columns. */
	header?: boolean;
	/** Role of each column in their order; null: not used. */
	roles?: readonly (ColumnRole | null)[];
	radiusUnit?: RadiusUnit;
	speedUnit?: SpeedUnit;
	/** Mpc; null says that there is none, whatever the comments say. */
	distance?: Measured | null;
	/** One standard error for every row, for tables without a column of errors. */
	sameError?: number;
}

export interface ColumnRead {
	/** As it stands over the column; null without a heading. */
	heading: string | null;
	/** Unit in the heading, as it was written. */
	unit: string | null;
	role: ColumnRole | null;
	/** Why it got this role, in words. */
	why: string;
	/** First cells, as they came. */
	sample: string[];
}

export interface RefusedLine {
	/** From 1, in the file as it came. */
	line: number;
	/** The line, cut where it is long. */
	text: string;
	reason: string;
}

export interface UnitRead<T> {
	unit: T;
	why: string;
}

/** A text as a table of observed speeds. */
export interface MeasurementsRead {
	/** Why nothing can be saved as it stands, and what to do; null where it can. */
	problem: string | null;
	separator: Separator;
	decimalComma: boolean;
	/** Headings of the columns; null without. */
	header: string[] | null;
	columns: ColumnRead[];
	radiusUnit: UnitRead<RadiusUnit>;
	speedUnit: UnitRead<SpeedUnit>;
	/** From comments; null where they do not say. */
	name: string | null;
	source: string | null;
	distance: Measured | null;
	inclination: Measured | null;
	/** In the units above. */
	rows: MeasuredPoint[];
	/** Line of each row, from 1. */
	lines: number[];
	refused: RefusedLine[];
	/** Without their signs. */
	comments: string[];
}
