/**
 * JSON with the keys of every object in code-unit order and no blanks: one text for one value,
 * whoever writes it (the idea of RFC 8785; numbers are written as JSON.stringify writes them).
 * @throws TypeError for values JSON cannot hold, such as NaN or undefined in an array
 */
export function canonicalJson(value: unknown): string {
	if (typeof value === 'number' && !Number.isFinite(value)) {
		throw new TypeError(`${value} cannot be written as JSON`);
	}
	if (value === undefined || typeof value === 'function' || typeof value === 'symbol') {
		throw new TypeError(`${typeof value} cannot be written as JSON`);
	}
	if (Array.isArray(value)) return `[${value.map(canonicalJson).join(',')}]`;
	if (value !== null && typeof value === 'object') {
		const members = Object.entries(value)
			.filter(([, member]) => member !== undefined)
			.sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0))
			.map(([key, member]) => `${JSON.stringify(key)}:${canonicalJson(member)}`);
		return `{${members.join(',')}}`;
	}
	return JSON.stringify(value);
}

/** @returns SHA-256 of the text's UTF-8 bytes, 64 hexadecimal digits. FIPS 180-4, by Web Crypto. */
export async function sha256Hex(text: string): Promise<string> {
	const digest = await crypto.subtle.digest('SHA-256', new TextEncoder().encode(text));
	return Array.from(new Uint8Array(digest), (byte) => byte.toString(16).padStart(2, '0')).join('');
}
