import { untrack } from 'svelte';
import { links } from '../links';
import type { EditionContent } from '../show/edition';
import { playbackAt, type Playback, type RunCommand, type RunEvent } from '../show/playback';
import { appendEvent } from './appendEvent';
import { askServerTime, ServerClock } from './clock';
import { CommandQueue, type QueuedCommand } from './commandQueue';
import { commandWords } from './commandWords';
import { eventWords } from './eventWords';
import { followEvents, type LinkState } from './followEvents';
import { postCommand } from './postCommand';

/** How often the times move on the console. */
const momentMs = 100;
const measureMs = 60_000;

export interface ConsoleRunOptions {
	runId: string;
	content: EditionContent;
	/** Events read with the page; the stream goes on behind them. */
	events: readonly RunEvent[];
	/** Name of the reader: what others do is said with their names. */
	reader: string;
}

/** A console's end of a run: what happened, what the moment is, and what is still on its way. */
export class ConsoleRun {
	readonly content: EditionContent;
	events = $state.raw<readonly RunEvent[]>([]);
	link = $state<LinkState>('connecting');
	/** Presses the server has not confirmed, oldest first. */
	queued = $state.raw<readonly QueuedCommand[]>([]);
	/** What happened last, or why a press was refused: said politely. */
	said = $state('');
	/** True where `said` is a refusal. */
	refused = $state(false);
	readonly playback: Playback;
	readonly #options: ConsoleRunOptions;
	readonly #clock = new ServerClock(askServerTime);
	readonly #queue: CommandQueue;
	#now = $state(0);

	constructor(options: ConsoleRunOptions) {
		this.#options = options;
		this.content = options.content;
		this.events = options.events;
		this.#now = this.now();
		this.playback = $derived(playbackAt(this.content, this.events, this.#now));
		this.#queue = new CommandQueue({
			send: (queued) => postCommand(options.runId, queued),
			onChange: (queued) => (this.queued = queued),
			onRefused: (queued, detail) => {
				this.refused = true;
				this.said = `${commandWords[queued.command.kind]} was refused. ${detail}`;
			}
		});
	}

	/** The server's clock, never before the last event: what was pressed is seen at once. */
	now(): number {
		return Math.max(this.#clock.now(), this.events.at(-1)?.at ?? 0);
	}

	/** Playback of this very moment, for pictures that are drawn more often than the page. */
	moment(): Playback {
		return playbackAt(this.content, this.events, this.now());
	}

	/** Whether a press of this kind is on its way. */
	waits(...kinds: RunCommand['kind'][]): boolean {
		return this.queued.some((queued) => kinds.includes(queued.command.kind));
	}

	/** What was pressed and has not reached the server after at least one try; null where all has. */
	get unreached(): string | null {
		const first = this.queued.find((queued) => queued.failures > 0);
		return first ? commandWords[first.command.kind] : null;
	}

	send(command: RunCommand): void {
		this.refused = false;
		this.#queue.push(command);
	}

	/** Begins and goes on until the function it returns is called; to be called once. */
	start(): () => void {
		return untrack(() => this.#start());
	}

	/** Not tracked: an effect that begins it must not begin it again with every event. */
	#start(): () => void {
		const ending = new AbortController();
		const measure = () => void this.#clock.measure().catch(() => null);
		measure();
		const timers = [
			setInterval(() => (this.#now = this.now()), momentMs),
			setInterval(measure, measureMs)
		];
		void followEvents({
			url: links.apiRunEvents(this.#options.runId),
			lastEventId: `${this.#options.runId}:${this.events.length}`,
			onEvent: ({ event, data }) => {
				if (event === 'event') return this.#take(JSON.parse(data) as RunEvent);
			},
			onState: (state) => (this.link = state),
			signal: ending.signal
		});
		return () => {
			ending.abort();
			this.#queue.close();
			for (const timer of timers) clearInterval(timer);
		};
	}

	#take(event: RunEvent): boolean {
		const next = appendEvent(this.events, event);
		if (!next) return false;
		if (next === this.events) return true;
		this.events = next;
		this.#now = this.now();
		this.refused = false;
		this.said = eventWords(this.content, event, this.#options.reader);
		return true;
	}
}
