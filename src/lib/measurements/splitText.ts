import { longestLine } from './limits';

export interface TextLine {
	/** From 1. */
	number: number;
	text: string;
}

export interface TextLines {
	/** Lines that may be rows or headings. */
	lines: TextLine[];
	/** Comment lines without their signs. */
	comments: TextLine[];
}

const commentSign = /^(?:#+|!+|%+|\/\/+)\s?/;
/** A line that only draws a rule. */
const rule = /^[-=_+|:\s]*[-=_]{3,}[-=_+|:\s]*$/;

/** Parts a text into its lines, comments and the rest; empty lines and rules fall away. */
export function splitText(text: string): TextLines {
	const lines: TextLine[] = [];
	const comments: TextLine[] = [];
	const parts = text.replace(/^\uFEFF/, '').split(/\r\n|\n|\r/);
	for (const [i, part] of parts.entries()) {
		const trimmed = part.length > longestLine ? part : part.trim();
		if (trimmed === '') continue;
		const number = i + 1;
		if (trimmed.length <= longestLine && rule.test(trimmed)) continue;
		const sign = commentSign.exec(trimmed);
		if (sign) comments.push({ number, text: trimmed.slice(sign[0].length, longestLine) });
		else lines.push({ number, text: part });
	}
	return { lines, comments };
}
