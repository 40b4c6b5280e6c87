import { describe, expect, test } from 'vitest';
import { requireRole, type Context } from '../../../src/lib/server/context';
import { isAppError } from '../../../src/lib/server/errors';
import { permissions, type Permission } from '../../../src/lib/server/permissions';
import { roles, type Role } from '../../../src/lib/roles';

/** Written down again by hand, so that a slip in the code's own table shows. P A R T M as in `roles`. */
const matrix: Record<Permission, string> = {
	'show.read': 'P A R T M',
	'show.edit': 'P . . . M',
	'edition.freeze': 'P . . . M',
	'galaxy.read': 'P A R T M',
	'galaxy.edit': 'P . . . M',
	'dome.read': 'P A R T M',
	'dome.edit': '. . . T M',
	'screen.pair': '. . . T M',
	'screen.revoke': '. . . T M',
	'run.read': 'P A R T M',
	'run.start': '. . R . M',
	'run.command': '. . R . M',
	'run.log': '. . R . M',
	'people.read': '. . . . M',
	'people.invite': '. . . . M',
	'people.change': '. . . . M'
};

function allowed(held: Role[], verb: Permission): boolean {
	const ctx: Context = {
		userId: 'u',
		userName: 'U',
		venueId: 'v',
		venueName: 'V',
		timeZone: 'Europe/London',
		roles: held,
		requestId: 'test'
	};
	try {
		requireRole(ctx, verb);
		return true;
	} catch (thrown) {
		if (isAppError(thrown) && thrown.code === 'forbidden') return false;
		throw thrown;
	}
}

describe('requireRole', () => {
	test('knows every verb of the matrix and no other', () => {
		expect(Object.keys(permissions).sort()).toEqual(Object.keys(matrix).sort());
	});

	const cells = Object.entries(matrix).flatMap(([verb, row]) =>
		row.split(' ').map((mark, i) => [roles[i], verb as Permission, mark !== '.'] as const)
	);
	test.each(cells)('%s, %s: %s', (role, verb, may) => {
		expect(allowed([role], verb)).toBe(may);
	});

	test('adds the roles of a person who holds several', () => {
		expect(allowed(['adviser', 'technician'], 'dome.edit')).toBe(true);
		expect(allowed(['adviser', 'technician'], 'show.edit')).toBe(false);
	});

	test('allows nothing to a person without a role', () => {
		const verbs = Object.keys(permissions) as Permission[];
		expect(verbs.filter((verb) => allowed([], verb))).toEqual([]);
	});
});
