/** Day and time in the venue's zone, such as "1 Dec 2026, 14:02". */
export const dayOf = (at: Date | string, timeZone: string): string =>
	new Intl.DateTimeFormat('en-GB', {
		day: 'numeric',
		month: 'short',
		year: 'numeric',
		hour: '2-digit',
		minute: '2-digit',
		timeZone
	}).format(new Date(at));
