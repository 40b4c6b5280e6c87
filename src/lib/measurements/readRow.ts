import { isMissing, numberIn } from './cells';
import { largestError, largestRadius, largestSpeed } from './limits';
import { kpcIn, kmsIn } from './measuredPoints';
import type { ColumnRole } from './reading';
import type { Measured, MeasuredPoint, RadiusUnit, SpeedUnit } from './types';

export interface RowSettings {
	/** Column of each role. */
	columns: Partial<Record<ColumnRole, number>>;
	/** Cells a row may have, and those it must have. */
	count: number;
	least: number;
	comma: boolean;
	radiusUnit: RadiusUnit;
	speedUnit: SpeedUnit;
	distance: Measured | null;
	sameError?: number;
}

export type RowRead = { row: MeasuredPoint } | { reason: string };

const shown = (cell: string) => `“${cell.length > 40 ? `${cell.slice(0, 39)}…` : cell}”`;
const short = (value: number) => String(Number(value.toPrecision(6)));

/** Why a number cannot stand in a row; null where it can. */
export function faultOf(
	role: 'radius' | 'speed' | 'error' | 'gas' | 'disc' | 'bulge',
	value: number,
	settings: Pick<RowSettings, 'radiusUnit' | 'speedUnit' | 'distance'>
): string | null {
	const { radiusUnit, speedUnit, distance } = settings;
	if (role === 'radius') {
		if (!(value > 0)) return `The radius is ${short(value)} ${radiusUnit}; it must be more than 0.`;
		const kpc = value * kpcIn(radiusUnit, distance?.value ?? null);
		return kpc > largestRadius
			? `The radius is ${short(kpc)} kpc; at most ${largestRadius} kpc are taken. Is the unit right?`
			: null;
	}
	const speed = value * kmsIn(speedUnit);
	if (role === 'error') {
		if (!(value > 0)) return `The error is ${short(value)} ${speedUnit}; it must be more than 0.`;
		return speed > largestError
			? `The error is ${short(speed)} km/s; at most ${largestError} km/s are taken. Is the unit right?`
			: null;
	}
	return Math.abs(speed) > largestSpeed
		? `The ${role === 'speed' ? 'speed' : `speed of the ${role}`} is ${short(speed)} km/s; at most ${largestSpeed} km/s are taken. Is the unit right?`
		: null;
}

/** One line as a row, or why it is none. */
export function readRow(cells: readonly string[], settings: RowSettings): RowRead {
	const { columns, count, least, comma, sameError } = settings;
	const extra = cells.slice(count).some((cell) => cell.trim() !== '');
	if (extra || cells.length < least) {
		const has = cells.length === 1 ? 'one cell' : `${cells.length} cells`;
		return { reason: `It has ${has} where the other lines have ${extra ? count : least}.` };
	}
	const row: MeasuredPoint = { radius: 0, speed: 0, error: sameError ?? 0 };
	for (const role of ['radius', 'speed', 'error', 'gas', 'disc', 'bulge'] as const) {
		const column = columns[role];
		if (column === undefined) continue;
		const cell = cells[column] ?? '';
		if (isMissing(cell)) {
			if (role === 'radius' || role === 'speed' || role === 'error') {
				return { reason: `It has no ${role}.` };
			}
			continue;
		}
		const value = numberIn(cell, comma);
		if (Number.isNaN(value)) return { reason: `The ${role} ${shown(cell)} is not a number.` };
		if (!Number.isFinite(value)) return { reason: `The ${role} ${shown(cell)} is too large.` };
		const fault = faultOf(role, value, settings);
		if (fault) return { reason: fault };
		row[role] = value;
	}
	const reason = columns['left out'] === undefined ? '' : (cells[columns['left out']] ?? '').trim();
	if (reason !== '') row.leftOut = reason.slice(0, 300);
	return { row };
}
