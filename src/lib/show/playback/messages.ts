import { z } from 'zod';

/**
 * What a console may say in a run, in one typed union checked on both ends. A command becomes a
 * `RunEvent` when the server has numbered and timed it; a run is the list of its events.
 */
export const runCommandSchema = z.discriminatedUnion('kind', [
	/** The first scene begins. */
	z.strictObject({ kind: z.literal('begin') }),
	/** On to the next scene; carries the scene it leaves, so that two presses at once move once. */
	z.strictObject({ kind: z.literal('advance'), from: z.uuid() }),
	z.strictObject({ kind: z.literal('back'), from: z.uuid() }),
	z.strictObject({ kind: z.literal('jump'), to: z.uuid() }),
	/** Time stands still, and goes on. */
	z.strictObject({ kind: z.literal('hold') }),
	z.strictObject({ kind: z.literal('go-on') }),
	/** The dim star field instead of the scene, and back. */
	z.strictObject({ kind: z.literal('rest') }),
	z.strictObject({ kind: z.literal('resume') }),
	/** A live control of the scene moves; the value is kept inside the control's limits. */
	z.strictObject({
		kind: z.literal('control'),
		scene: z.uuid(),
		control: z.uuid(),
		value: z.number()
	}),
	z.strictObject({ kind: z.literal('end') })
]);
export type RunCommand = z.infer<typeof runCommandSchema>;

export interface RunEvent {
	/** 1, 2, 3 … without a gap within a run. */
	number: number;
	/** Milliseconds since 1970 by the server's clock. */
	at: number;
	command: RunCommand;
	/** Name of who did it, for the log and for a second console. */
	actor: string | null;
}
