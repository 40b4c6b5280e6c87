/** What a file begins with that is no table of text, and what to do about it. */
const otherFiles: readonly [bytes: readonly number[], words: string][] = [
	[
		[0x50, 0x4b, 0x03, 0x04],
		'This is a spreadsheet or a ZIP file. Save the table as CSV and bring that.'
	],
	[
		[0xd0, 0xcf, 0x11, 0xe0],
		'This is an old spreadsheet file. Save the table as CSV and bring that.'
	],
	[[0x25, 0x50, 0x44, 0x46], 'This is a PDF. Copy the table out of it and paste it here.'],
	[[0x1f, 0x8b], 'This file is compressed. Unpack it first.'],
	[[0x89, 0x50, 0x4e, 0x47], 'This is a picture. Bring the table as text.']
];

const begins = (bytes: Uint8Array, with_: readonly number[]) =>
	with_.every((byte, i) => bytes[i] === byte);

function encodingOf(bytes: Uint8Array): string {
	if (begins(bytes, [0xff, 0xfe])) return 'utf-16le';
	if (begins(bytes, [0xfe, 0xff])) return 'utf-16be';
	return 'utf-8';
}

/** Bytes of a text file; UTF-8, UTF-16 with its mark, or else the old Windows set. Marks are taken off. */
export function decodeText(bytes: Uint8Array): { text: string } | { problem: string } {
	const other = otherFiles.find(([start]) => begins(bytes, start));
	if (other) return { problem: other[1] };
	const encoding = encodingOf(bytes);
	if (encoding === 'utf-8' && bytes.includes(0)) {
		return { problem: 'This is not a text file. Save the table as CSV and bring that.' };
	}
	try {
		return { text: new TextDecoder(encoding, { fatal: true }).decode(bytes) };
	} catch (error) {
		if (!(error instanceof TypeError)) throw error;
		return { text: new TextDecoder('windows-1252').decode(bytes) };
	}
}
