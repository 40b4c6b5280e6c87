import { error } from '@sveltejs/kit';

/** JSON in a posted form; undefined where the field is empty or missing, 400 where it is no JSON. */
export function jsonField(data: FormData, name: string): unknown {
	const text = data.get(name);
	if (typeof text !== 'string' || text === '') return undefined;
	try {
		return JSON.parse(text);
	} catch (thrown) {
		if (!(thrown instanceof SyntaxError)) throw thrown;
		error(400, { message: 'The form was damaged on its way. Nothing was saved; try again.' });
	}
}
