import { AppError } from '../errors';

/** Largest body of a command, bytes. */
export const largestBody = 16 * 1024;

/**
 * Reads a small JSON body without taking in more than it may be.
 * @throws AppError too-large, or invalid for what is not JSON
 */
export async function readBody(request: Request, most = largestBody): Promise<unknown> {
	const chunks: Uint8Array[] = [];
	let size = 0;
	const reader = request.body?.getReader();
	for (let part = await reader?.read(); part && !part.done; part = await reader?.read()) {
		size += part.value.byteLength;
		if (size > most) {
			await reader?.cancel();
			throw new AppError('too-large', `A command may have at most ${most / 1024} kB.`);
		}
		chunks.push(part.value);
	}
	try {
		return JSON.parse(Buffer.concat(chunks).toString('utf8'));
	} catch (error) {
		if (!(error instanceof SyntaxError)) throw error;
		throw new AppError('invalid', 'The body is not valid JSON.');
	}
}
