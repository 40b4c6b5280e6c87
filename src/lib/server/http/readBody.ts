import { AppError } from '../errors';

/** The largest body that is taken, and what the refusal of a larger one says. */
export interface BodyLimit {
	bytes: number;
	words: string;
}

const commandLimit: BodyLimit = { bytes: 16 * 1024, words: 'A command may have at most 16 kB.' };

/** The server in front of the app has a limit of its own and says so by a status. */
const isTooLarge = (thrown: unknown): boolean =>
	typeof thrown === 'object' && thrown !== null && 'status' in thrown && thrown.status === 413;

async function readBytes(request: Request, limit: BodyLimit): Promise<Buffer> {
	const chunks: Uint8Array[] = [];
	let size = 0;
	const reader = request.body?.getReader();
	for (let part = await reader?.read(); part && !part.done; part = await reader?.read()) {
		size += part.value.byteLength;
		if (size > limit.bytes) {
			await reader?.cancel();
			throw new AppError('too-large', limit.words);
		}
		chunks.push(part.value);
	}
	return Buffer.concat(chunks);
}

/**
 * Reads a JSON body without taking in more than it may be.
 * @throws AppError too-large, or invalid for what is not JSON
 */
export async function readBody(request: Request, limit = commandLimit): Promise<unknown> {
	// Answered before the body is read: a connection that is cut in the middle shows no answer.
	if (Number(request.headers.get('content-length')) > limit.bytes) {
		throw new AppError('too-large', limit.words);
	}
	const bytes = await readBytes(request, limit).catch((thrown: unknown) => {
		throw isTooLarge(thrown) ? new AppError('too-large', limit.words) : thrown;
	});
	try {
		return JSON.parse(bytes.toString('utf8'));
	} catch (error) {
		if (!(error instanceof SyntaxError)) throw error;
		throw new AppError('invalid', 'The body is not valid JSON.');
	}
}
