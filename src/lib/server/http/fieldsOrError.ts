import { isAppError, type ErrorCode } from '../errors';
import { orError } from './problem';

export type Tried<T> =
	| { value: T; problems: null }
	/** One message a field; `form` where it belongs to none. */
	| { value: null; problems: Record<string, string> };

/** Refusals that a form answers itself, beside its fields. */
const ofForms: readonly ErrorCode[] = ['invalid', 'conflict', 'too-many', 'precondition'];

/** For form actions: a verb's value, or what to say at the fields. Other errors as `orError`. */
export async function fieldsOrError<T>(work: Promise<T>): Promise<Tried<T>> {
	try {
		return { value: await work, problems: null };
	} catch (thrown) {
		if (!isAppError(thrown) || !ofForms.includes(thrown.code)) {
			return orError(Promise.reject(thrown));
		}
		const { fields, field } = thrown.details;
		const problems = (fields as Record<string, string> | undefined) ?? {
			[typeof field === 'string' ? field : 'form']: thrown.message
		};
		return { value: null, problems };
	}
}
