/** One event of a stream. */
export interface StreamEvent {
	/** The last id the stream has named, in this event or before it; '' where none. */
	id: string;
	/** 'message' where the stream names none. */
	event: string;
	data: string;
}

/**
 * Reads a text/event-stream piece by piece (WHATWG HTML, section 9.2): pieces may cut anywhere,
 * lines end in LF, CR or CRLF, comments and unknown fields are passed over.
 * @param onEvent called for every event that has data
 */
export function eventParser(onEvent: (event: StreamEvent) => void) {
	let rest = '';
	let id = '';
	let event = '';
	let data: string[] = [];
	/** Milliseconds the stream asks to wait before coming back. */
	let retry: number | null = null;

	function readLine(line: string): void {
		if (line === '') {
			if (data.length > 0) onEvent({ id, event: event || 'message', data: data.join('\n') });
			event = '';
			data = [];
			return;
		}
		const colon = line.indexOf(':');
		if (colon === 0) return;
		const field = colon < 0 ? line : line.slice(0, colon);
		const value = colon < 0 ? '' : line.slice(colon + 1).replace(/^ /, '');
		if (field === 'data') data.push(value);
		else if (field === 'event') event = value;
		else if (field === 'id' && !value.includes('\0')) id = value;
		else if (field === 'retry' && /^\d+$/.test(value)) retry = Number(value);
	}

	return {
		get retry() {
			return retry;
		},
		push(text: string): void {
			rest += text;
			for (;;) {
				const end = rest.search(/[\r\n]/);
				// A CR at the very end may be the first half of a CRLF.
				if (end < 0 || (rest[end] === '\r' && end === rest.length - 1)) return;
				const line = rest.slice(0, end);
				rest = rest.slice(end + (rest.startsWith('\r\n', end) ? 2 : 1));
				readLine(line);
			}
		}
	};
}
