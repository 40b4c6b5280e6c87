/** An answer of the server's, or the fact that there was none (`status` 0). */
export interface Answer<T> {
	status: number;
	body: T | null;
}

/** Asks the server for JSON; never rejects where it only cannot be reached. */
export async function ask<T>(url: string, init: RequestInit = {}): Promise<Answer<T>> {
	const response = await fetch(url, { cache: 'no-store', ...init }).catch(() => null);
	if (!response) return { status: 0, body: null };
	if (!response.ok || response.status === 204) return { status: response.status, body: null };
	// The line may break in mid-answer.
	const body = (await response.json().catch(() => null)) as T | null;
	return body === null ? { status: 0, body: null } : { status: response.status, body };
}

export const asJson = (method: string, body: unknown): RequestInit => ({
	method,
	headers: { 'content-type': 'application/json' },
	body: JSON.stringify(body)
});
