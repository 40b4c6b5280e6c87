/** A mail as the transport takes it. */
export interface MailText {
	subject: string;
	text: string;
	html: string;
}

const escaped = (words: string): string =>
	words.replace(
		/[&<>"]/g,
		(sign) => ({ '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' })[sign] ?? sign
	);

/** Paragraphs around one link, as text and as plain HTML that every reader shows. */
export function mailText(
	subject: string,
	{
		before,
		link,
		button,
		after
	}: { before: string[]; link: string; button: string; after: string[] }
): MailText {
	const text = [...before, `${button}:\n${link}`, ...after].join('\n\n') + '\n';
	const paragraph = (words: string) => `<p>${escaped(words)}</p>`;
	const html = [
		'<div style="font:16px/1.5 system-ui,sans-serif;max-width:36em">',
		...before.map(paragraph),
		`<p><a href="${escaped(link)}" style="display:inline-block;padding:10px 18px;border-radius:6px;background:#3c4a8c;color:#ffffff;text-decoration:none">${escaped(button)}</a></p>`,
		`<p>Or copy this address: ${escaped(link)}</p>`,
		...after.map(paragraph),
		'</div>'
	].join('\n');
	return { subject, text, html };
}
