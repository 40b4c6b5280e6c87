/** Largest file or pasted text, bytes, and the number as people say it. */
export const largestText = 5 * 1024 * 1024;
export const largestTextWords = '5 MB';
/** Most rows of one table. */
export const mostRows = 20_000;
/** Longest line and most columns that can be a row of a table. */
export const longestLine = 10_000;
export const mostColumns = 100;

/** What a table may hold: radius in kpc, speed and error in km/s. */
export const largestRadius = 1000;
export const largestSpeed = 2000;
export const largestError = 1000;
