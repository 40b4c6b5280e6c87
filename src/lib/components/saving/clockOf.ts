/** @param at ISO 8601 @returns the time of day in the venue's zone, such as "14:02" */
export const clockOf = (at: string, timeZone: string): string =>
	new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', timeZone }).format(
		new Date(at)
	);
