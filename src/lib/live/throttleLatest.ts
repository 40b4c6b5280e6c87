/**
 * Passes on at most one value every `intervalMs`; the last value given is always passed on.
 * @returns `give`, and `flush`, which passes on what waits at once
 */
export function throttleLatest<T>(intervalMs: number, pass: (value: T) => void) {
	let waiting: { value: T } | null = null;
	let timer: ReturnType<typeof setTimeout> | null = null;

	function due(): void {
		timer = null;
		if (!waiting) return;
		const { value } = waiting;
		waiting = null;
		timer = setTimeout(due, intervalMs);
		pass(value);
	}

	return {
		give(value: T): void {
			waiting = { value };
			if (timer === null) due();
		},
		flush(): void {
			if (timer !== null) clearTimeout(timer);
			timer = null;
			due();
		}
	};
}
