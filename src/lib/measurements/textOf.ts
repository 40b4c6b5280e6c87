import { largestText, largestTextWords } from './limits';
import { decodeText } from './decodeText';

/** Bytes a text takes as UTF-8; counted only where it could be too many. */
const bytesOf = (text: string) =>
	text.length * 3 <= largestText ? 0 : new TextEncoder().encode(text).length;

/** The text of a file or of what was pasted, or why it cannot be read. */
export function textOf(input: string | Uint8Array): { text: string } | { problem: string } {
	const size = typeof input === 'string' ? bytesOf(input) : input.byteLength;
	if (size > largestText) {
		const had = (size / 1024 / 1024).toFixed(1);
		return {
			problem: `This is ${had} MB; at most ${largestTextWords} can be read. Bring the part that holds the rotation curve.`
		};
	}
	return typeof input === 'string' ? { text: input } : decodeText(input);
}
