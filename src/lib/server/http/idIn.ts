import { error } from '@sveltejs/kit';
import { z } from 'zod';

/** An id in a posted form. What is no id names nothing: 404. */
export function idIn(data: FormData, name: string): string {
	const id = z.uuid().safeParse(data.get(name));
	if (!id.success) error(404, { message: 'There is no such thing in this venue.' });
	return id.data;
}
