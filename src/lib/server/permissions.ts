import type { Role } from '../roles';

/**
 * Who may do what in a venue: one line a verb, tested as a table (role × verb). A manager may do
 * everything; every member may read. Verbs call `requireRole(ctx, verb)` first.
 */
export const permissions = {
	'show.read': ['producer', 'adviser', 'presenter', 'technician'],
	'show.edit': ['producer'],
	'edition.freeze': ['producer'],
	'galaxy.read': ['producer', 'adviser', 'presenter', 'technician'],
	'galaxy.edit': ['producer'],
	'dome.read': ['producer', 'adviser', 'presenter', 'technician'],
	'dome.edit': ['technician'],
	'screen.pair': ['technician'],
	'screen.revoke': ['technician'],
	'run.read': ['producer', 'adviser', 'presenter', 'technician'],
	'run.start': ['presenter'],
	'run.command': ['presenter'],
	'run.log': ['presenter'],
	'people.read': [],
	'people.invite': [],
	'people.change': []
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof permissions;

/** @returns whether any of `roles` may do `verb`; a manager always may */
export function may(roles: readonly Role[], verb: Permission): boolean {
	return roles.includes('manager') || permissions[verb].some((role) => roles.includes(role));
}
