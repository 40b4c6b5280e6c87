const awayCodes = new Set([
	'ECONNREFUSED',
	'ECONNRESET',
	'EPIPE',
	'ENOTFOUND',
	'ETIMEDOUT',
	'57P01',
	'57P02',
	'57P03',
	'08006',
	'08001',
	'08003'
]);

/** Whether an error says that PostgreSQL cannot be reached, is starting or is shutting down. */
export function isDatabaseAway(thrown: unknown): boolean {
	for (let e = thrown; e instanceof Error; e = e.cause) {
		const code = (e as Error & { code?: string }).code;
		if (code && awayCodes.has(code)) return true;
		if (
			/Connection terminated|timeout exceeded when trying to connect|timeout expired/i.test(
				e.message
			)
		)
			return true;
		if (e instanceof AggregateError && e.errors.some(isDatabaseAway)) return true;
	}
	return false;
}
