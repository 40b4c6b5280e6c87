import { z } from 'zod';
import { roles, type Role } from '../../roles';
import { AppError } from '../errors';

export const emailSchema = z
	.email('Write a whole e-mail address, such as name@example.org.')
	.max(254, 'An e-mail address has at most 254 characters.')
	.transform((email) => email.trim().toLowerCase());

export const rolesSchema = z
	.array(z.enum(roles))
	.min(1, 'Choose at least one role.')
	.transform((chosen) => roles.filter((role) => chosen.includes(role)));

/** @throws AppError invalid where there is none or an unknown one */
export function parseRoles(input: unknown): Role[] {
	const parsed = rolesSchema.safeParse(input);
	if (parsed.success) return parsed.data;
	throw new AppError('invalid', 'Choose at least one of the five roles.');
}
