import { hash, verify } from '@node-rs/argon2';

/**
 * Argon2id with the first set of parameters of the OWASP Password Storage Cheat Sheet (2023 and
 * later): 19 MiB, two passes, one lane. The algorithm of the package is argon2id where none is named.
 */
const parameters = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** @returns a PHC string: parameters and salt are inside */
export const hashPassword = (password: string): Promise<string> =>
	hash(password.normalize('NFKC'), parameters);

/** Hash of nothing anybody types, so that an unknown account costs the same time as a known one. */
let nobody: Promise<string> | undefined;

/** @param stored null for an account that is unknown or has no password: false, after the same work */
export async function verifyPassword(stored: string | null, password: string): Promise<boolean> {
	nobody ??= hashPassword(crypto.randomUUID());
	const matches = await verify(stored ?? (await nobody), password.normalize('NFKC'));
	return stored !== null && matches;
}
