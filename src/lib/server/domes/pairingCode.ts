import { createHash, randomBytes, randomInt } from 'node:crypto';

/** No vowels and no look-alikes (0 O, 1 I L, 2 Z, 5 S, 8 B, U V), so a code reads across a dome. */
const alphabet = 'CDFGHJKMNPQRTWXY34679';
export const codeLength = 6;

/** Six characters, about 86 million different ones. */
export const makeCode = (): string =>
	Array.from({ length: codeLength }, () => alphabet[randomInt(alphabet.length)]).join('');

/** What a technician typed as it is kept: upper case, without blanks and dashes. */
export const normalCode = (typed: string): string => typed.toUpperCase().replace(/[\s-]/g, '');

/** 256 random bits for cookies and claims. */
export const makeSecret = (): string => randomBytes(32).toString('base64url');

/** SHA-256, hex: what the database keeps of a secret. */
export const hashSecret = (secret: string): string =>
	createHash('sha256').update(secret).digest('hex');
