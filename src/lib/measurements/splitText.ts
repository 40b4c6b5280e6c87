import { longestLine, mostRows } from './limits';

export interface TextLine {
	/** From 1. */
	number: number;
	text: string;
}

export interface TextLines {
	/** Lines that may be rows or headings; no more than could be of any use. */
	lines: TextLine[];
	/** How many such lines there are beyond those. */
	further: number;
	/** First comment lines, without their signs. */
	comments: TextLine[];
}

/** Lines that are kept: a table may have headings, and cells in quotes that run over lines. */
const mostLines = 2 * mostRows;
const mostComments = 500;
const commentSign = /^(?:#+|!+|%+|\/\/+)\s?/;
/** A line that only draws a rule. */
const rule = /^[-=_+|:\s]*[-=_]{3,}[-=_+|:\s]*$/;

/** Parts a text into its lines, comments and the rest; empty lines and rules fall away. */
export function splitText(given: string): TextLines {
	const unmarked = given.startsWith('\uFEFF') ? given.slice(1) : given;
	const text = unmarked.includes('\r') ? unmarked.replace(/\r\n?/g, '\n') : unmarked;
	const found: TextLines = { lines: [], further: 0, comments: [] };
	let number = 0;
	for (let at = 0; at < text.length;) {
		const end = text.indexOf('\n', at);
		const stop = end === -1 ? text.length : end;
		number++;
		if (found.lines.length >= mostLines) {
			// Only to say how many there are: a look at each would take longer than the rest.
			if (stop > at && !'#!%/'.includes(text[at])) found.further++;
		} else if (stop > at) {
			takeLine(found, number, text.slice(at, stop));
		}
		at = stop + 1;
	}
	return found;
}

function takeLine(found: TextLines, number: number, text: string): void {
	if (text.length > longestLine) {
		found.lines.push({ number, text });
		return;
	}
	const trimmed = text.trim();
	const sign = commentSign.exec(trimmed);
	if (sign) {
		if (found.comments.length >= mostComments) return;
		found.comments.push({ number, text: trimmed.slice(sign[0].length) });
	} else if (trimmed !== '' && !rule.test(trimmed)) {
		found.lines.push({ number, text });
	}
}
