import type { CommentFacts } from './commentFacts';
import { radiusUnitOf, speedUnitOf } from './headingUnits';
import type { ColumnRead, ReadChoices, UnitRead } from './reading';
import type { RadiusUnit, SpeedUnit } from './types';

function unitFrom<T extends string>(
	chosen: T | undefined,
	column: ColumnRead | undefined,
	parse: (unit: string) => T | undefined,
	declared: T | null,
	usual: T
): UnitRead<T> {
	if (chosen) return { unit: chosen, why: 'Chosen here' };
	const written = column?.unit ?? null;
	const unit = written === null ? undefined : parse(written);
	if (unit) return { unit, why: `The heading says “${written}”` };
	if (declared) return { unit: declared, why: 'A comment says so' };
	const odd = written === null ? 'The table does not say' : `“${written}” is not known here`;
	return { unit: usual, why: `${odd}; ${usual} is usual` };
}

/** Units of the radius and of the speeds, and what they were taken from. */
export function readUnits(
	columns: readonly ColumnRead[],
	facts: CommentFacts,
	choices: ReadChoices
): { radiusUnit: UnitRead<RadiusUnit>; speedUnit: UnitRead<SpeedUnit> } {
	const of = (role: string) => columns.find((column) => column.role === role);
	return {
		radiusUnit: unitFrom<RadiusUnit>(
			choices.radiusUnit,
			of('radius'),
			radiusUnitOf,
			facts.radiusUnit,
			'kpc'
		),
		speedUnit: unitFrom<SpeedUnit>(
			choices.speedUnit,
			of('speed'),
			speedUnitOf,
			facts.speedUnit,
			'km/s'
		)
	};
}
