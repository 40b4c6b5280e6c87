import { error } from '@sveltejs/kit';
import type { Context } from '../context';

/** Who asks. The hooks guard these pages; this is for the compiler and for a guard that was lost. */
export function contextOf(locals: App.Locals): Context {
	if (!locals.ctx) error(404, { message: 'There is no such page.' });
	return locals.ctx;
}
