/** Time of day with seconds in the venue's zone. @param at milliseconds since 1970 */
export const clockOf = (at: number, timeZone: string): string =>
	new Intl.DateTimeFormat('en-GB', { timeStyle: 'medium', timeZone }).format(new Date(at));
