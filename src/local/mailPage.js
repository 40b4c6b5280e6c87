/** @param {string} text */
const escaped = (text) => text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`);

/** @param {string} text @returns {string} HTML, addresses in it made into links */
const linked = (text) =>
	text
		.split(/(https?:\/\/[^\s<>"]+)/)
		.map((part, index) =>
			index % 2 === 1 ? `<a href="${escaped(part)}">${escaped(part)}</a>` : escaped(part)
		)
		.join('');

/** @param {import('./mail.js').CaughtMail} mail */
const article = (mail) => `<article>
<h2>${escaped(mail.subject || 'No subject')}</h2>
<p>To ${escaped(mail.to.join(', '))}, from ${escaped(mail.from)}, ${escaped(mail.at.slice(0, 19).replace('T', ' '))} UTC</p>
<pre>${linked(mail.text)}</pre>
</article>`;

/**
 * The page on which caught mails are read.
 * @param {import('./mail.js').CaughtMail[]} mails newest first
 * @returns {string} HTML
 */
export const mailPage = (mails) => `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>Caught mail</title>
<style>
:root { color-scheme: light dark; font: 1rem/1.5 system-ui, sans-serif; }
body { max-width: 44rem; margin: 2rem auto; padding: 0 1rem; }
article { border-top: 1px solid; padding: 0.5rem 0; }
pre { white-space: pre-wrap; overflow-wrap: anywhere; font: inherit; }
</style>
</head>
<body>
<h1>Caught mail</h1>
<p>Mail that this machine would have sent, newest first. Nothing left it. <a href="/">Look again</a></p>
${mails.map(article).join('\n') || '<p>No mail yet.</p>'}
</body>
</html>
`;
