/**
 * Undo and redo over immutable values. Steps that share a `group` and follow closely (typing in one
 * field, dragging one slider) become one step.
 */
export interface History<T> {
	readonly past: readonly Step<T>[];
	readonly present: T;
	readonly future: readonly Step<T>[];
	/** Group and moment of the last step, while it can still grow. */
	readonly open: { group: string; at: number } | null;
}

export interface Step<T> {
	readonly value: T;
	/** What going from `value` onward does, such as "Deleted scene 3". */
	readonly label: string;
}

export interface EditOptions {
	label: string;
	/** Same group within `groupMs`: one step. Without it every change is a step of its own. */
	group?: string;
	/** Milliseconds, any steady clock. */
	at: number;
}

/** A pause longer than this between keystrokes begins a new step. */
export const groupMs = 1500;
/** Steps kept; the oldest fall away. */
export const stepsKept = 300;

export const begin = <T>(value: T): History<T> => ({
	past: [],
	present: value,
	future: [],
	open: null
});

/** Takes `next` as the present. Nothing happens where it is the present already. */
export function edit<T>(history: History<T>, next: T, options: EditOptions): History<T> {
	if (next === history.present) return history;
	const { label, group, at } = options;
	const grows =
		group !== undefined &&
		history.open?.group === group &&
		at - history.open.at <= groupMs &&
		history.future.length === 0;
	return {
		past: grows
			? history.past
			: [...history.past, { value: history.present, label }].slice(-stepsKept),
		present: next,
		future: [],
		open: group === undefined ? null : { group, at }
	};
}

/** One step back; the history itself where there is none. */
export function undo<T>(history: History<T>): History<T> {
	const step = history.past.at(-1);
	if (!step) return history;
	return {
		past: history.past.slice(0, -1),
		present: step.value,
		future: [{ value: history.present, label: step.label }, ...history.future],
		open: null
	};
}

/** One step forward again; the history itself where there is none. */
export function redo<T>(history: History<T>): History<T> {
	const [step, ...rest] = history.future;
	if (!step) return history;
	return {
		past: [...history.past, { value: history.present, label: step.label }],
		present: step.value,
		future: rest,
		open: null
	};
}
