import { createHash, createHmac } from 'node:crypto';
import { environment } from '../env';

/**
 * The secret in a mailed link, made from the row it belongs to and the app's secret. So it need be
 * kept nowhere: the queue holds the row's id, the row holds the token's hash, and a copy of the
 * database opens nothing.
 * @returns 256 bits, safe in a URL
 */
export const secretToken = (purpose: string, id: string): string =>
	createHmac('sha256', environment().AUTH_SECRET).update(`${purpose}:${id}`).digest('base64url');

/** What a row keeps of a token. */
export const tokenHash = (token: string): string =>
	createHash('sha256').update(token).digest('hex');
