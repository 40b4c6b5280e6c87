import type { FitRecord } from '$lib/measurements/fitRecord';

/** A fit that was kept, as lists and its page show it. */
export interface KeptFit {
	id: string;
	name: string;
	record: FitRecord;
	/** ISO 8601, UTC. */
	at: string;
	by: string | null;
}
