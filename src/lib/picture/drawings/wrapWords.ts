/**
 * Cuts words into lines no wider than `widest`; what does not fit in `lines` ends in an ellipsis.
 * @param width measures a line, in the unit of `widest`
 */
export function wrapWords(
	text: string,
	widest: number,
	lines: number,
	width: (line: string) => number
): string[] {
	const out: string[] = [];
	let line = '';
	for (const word of text.split(/\s+/).filter(Boolean)) {
		const longer = line ? `${line} ${word}` : word;
		if (!line || width(longer) <= widest) line = longer;
		else {
			out.push(line);
			line = word;
		}
	}
	if (line) out.push(line);
	const kept = out.slice(0, lines);
	if (kept.length === 0) return kept;
	const last = kept.length - 1;
	const cut = out.length > lines;
	// A single word may be wider than the line: it loses letters, since words lie when they end outside.
	kept.forEach((one, i) => {
		const end = cut && i === last ? ' …' : '';
		kept[i] = shorten(one, end, widest, width);
	});
	return kept;
}

function shorten(
	line: string,
	end: string,
	widest: number,
	width: (line: string) => number
): string {
	if (width(line + end) <= widest) return line + end;
	let shorter = line;
	while (shorter.includes(' ') && width(`${shorter} …`) > widest)
		shorter = shorter.slice(0, shorter.lastIndexOf(' '));
	if (width(`${shorter} …`) <= widest) return `${shorter} …`;
	while (shorter.length > 1 && width(`${shorter}…`) > widest) shorter = shorter.slice(0, -1);
	return `${shorter}…`;
}
