import { newId } from '../show/editing';
import type { RunCommand } from '../show/playback';

export interface QueuedCommand {
	command: RunCommand;
	/** Made once for a press; every further try carries it, so the press counts once. */
	idempotencyKey: string;
	/** Tries that came to nothing. */
	failures: number;
}

export type SendResult =
	| { kind: 'done'; applied: boolean }
	/** The server understood and refuses: trying again would not help. */
	| { kind: 'refused'; detail: string }
	/** Nobody answered, or the server is in trouble: try again. */
	| { kind: 'unreached' };

export interface CommandQueueOptions {
	send: (queued: QueuedCommand) => Promise<SendResult>;
	/** Called after every change; `queued` is what the server has not confirmed, oldest first. */
	onChange: (queued: readonly QueuedCommand[]) => void;
	onRefused: (queued: QueuedCommand, detail: string) => void;
	makeKey?: () => string;
	firstWaitMs?: number;
	longestWaitMs?: number;
}

/**
 * Commands of one console on their way to the server: one after the other in the order of the
 * presses, each tried until the server has answered.
 */
export class CommandQueue {
	readonly #options: CommandQueueOptions;
	#queue: QueuedCommand[] = [];
	#sending = false;
	#closed = false;

	constructor(options: CommandQueueOptions) {
		this.#options = options;
	}

	/** A value of a control that still waits gives way to a newer one of the same control. */
	push(command: RunCommand): void {
		const last = this.#queue.length - 1;
		const waits = this.#sending ? last > 0 : last >= 0;
		const same =
			waits &&
			command.kind === 'control' &&
			isSameControl(this.#queue[last].command, command) &&
			this.#queue[last].failures === 0;
		const makeKey = this.#options.makeKey ?? newId;
		const queued = { command, idempotencyKey: makeKey(), failures: 0 };
		this.#queue = same ? [...this.#queue.slice(0, last), queued] : [...this.#queue, queued];
		this.#options.onChange(this.#queue);
		void this.#work();
	}

	/** Gives up what was not sent. */
	close(): void {
		this.#closed = true;
		this.#queue = [];
	}

	async #work(): Promise<void> {
		if (this.#sending) return;
		this.#sending = true;
		const { firstWaitMs = 300, longestWaitMs = 4000 } = this.#options;
		while (this.#queue.length > 0 && !this.#closed) {
			const [first] = this.#queue;
			const result = await this.#options.send(first);
			if (this.#closed) break;
			if (result.kind === 'unreached') {
				const tried = { ...first, failures: first.failures + 1 };
				this.#queue = [tried, ...this.#queue.slice(1)];
				this.#options.onChange(this.#queue);
				const wait = Math.min(longestWaitMs, firstWaitMs * 2 ** (tried.failures - 1));
				await new Promise((resolve) => setTimeout(resolve, wait));
				continue;
			}
			this.#queue = this.#queue.slice(1);
			if (result.kind === 'refused') this.#options.onRefused(first, result.detail);
			this.#options.onChange(this.#queue);
		}
		this.#sending = false;
	}
}

const isSameControl = (a: RunCommand, b: RunCommand): boolean =>
	a.kind === 'control' && b.kind === 'control' && a.control === b.control && a.scene === b.scene;
