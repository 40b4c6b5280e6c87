import { commonWords } from './commonWords';

export const shortestPassword = 15;
export const longestPassword = 256;

/** Letters that people write for other letters. */
const written: Record<string, string> = {
	'0': 'o',
	'1': 'i',
	'3': 'e',
	'4': 'a',
	'5': 's',
	'7': 't',
	'8': 'b',
	'@': 'a',
	$: 's',
	'!': 'i'
};
const unmasked = (word: string) => word.replace(/[0134578@$!]/g, (sign) => written[sign] ?? '');

const onlyLetters = (word: string) => word.replace(/[^\p{L}]/gu, '');

/** Whether `text` is nothing but words of `words`, one after another. */
function madeOf(text: string, words: ReadonlySet<string>): boolean {
	const reach = [true];
	const longest = Math.max(...[...words].map((word) => word.length));
	for (let end = 1; end <= text.length; end++) {
		reach[end] = false;
		for (let start = Math.max(0, end - longest); start < end && !reach[end]; start++) {
			reach[end] = reach[start] && words.has(text.slice(start, end));
		}
	}
	return text.length > 0 && reach[text.length];
}

/** The shortest piece that gives the text when repeated. */
function period(text: string): number {
	for (let size = 1; size <= text.length / 2; size++) {
		if (
			text ===
			text
				.slice(0, size)
				.repeat(Math.ceil(text.length / size))
				.slice(0, text.length)
		) {
			return size;
		}
	}
	return text.length;
}

const rows = ['abcdefghijklmnopqrstuvwxyz', '01234567890123456789', 'qwertyuiopasdfghjklzxcvbnm'];
const lines = rows.flatMap((row) => [row + row, [...row, ...row].reverse().join('')]);

/**
 * What speaks against a password, in words for its field; null where nothing does. Length is what
 * counts (NIST SP 800-63B): there are no rules about signs, but passwords that are tried first are
 * refused: common ones and their repetitions, walks over the keyboard, and the person's own words.
 * @param own words such as the e-mail address and the names of person and venue
 */
export function passwordProblem(password: string, own: readonly string[] = []): string | null {
	const length = [...password].length;
	if (length < shortestPassword) {
		return `Use at least ${shortestPassword} characters, this has ${length}. Four or five words that do not belong together do well.`;
	}
	if (length > longestPassword) return `Use at most ${longestPassword} characters.`;
	const low = password.normalize('NFKC').toLowerCase();
	const plain = low.replace(/[\s_.-]/g, '');
	if (period(plain) <= 4 || lines.some((line) => line.includes(plain))) {
		return 'This is a pattern that is guessed at once. Take words that do not belong together.';
	}
	const ownWords = own
		.flatMap((words) => [
			onlyLetters(words.toLowerCase()),
			...words.toLowerCase().split(/[^\p{L}]+/u)
		])
		.filter((word) => word.length >= 3);
	const words = new Set([...commonWords, ...ownWords]);
	if (madeOf(onlyLetters(low), words) || madeOf(onlyLetters(unmasked(low)), words)) {
		return 'This is made of common passwords, or of your own name, e-mail or venue. Take other words.';
	}
	return null;
}
