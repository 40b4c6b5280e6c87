import { untrack } from 'svelte';
import { links } from '../links';
import type { EditionContent } from '../show/edition';
import type { RunEvent } from '../show/playback';
import { appendEvent } from './appendEvent';
import { ask, asJson } from './ask';
import { askServerTime, ServerClock } from './clock';
import type { StreamEvent } from './eventParser';
import { followEvents, type LinkState } from './followEvents';
import { Pairing } from './Pairing.svelte';
import { pause } from './pause';
import { screenMemory } from './screenMemory';
import type { FollowedRun, ScreenIdentity } from './screenTypes';
import { throttleLatest } from './throttleLatest';

const retryMs = 1000;
/** How often the screen looks whether its dome's settings changed, and measures the clock anew. */
const lookMs = 30_000;
const keepMs = 1000;

/**
 * A dome page's end of the wire: pairs, says who it is, follows whatever runs in its dome, and keeps
 * edition and events, so that the picture goes on whether the server answers or not.
 */
export class DomeScreen {
	phase = $state<'starting' | 'unreached' | 'pairing' | 'paired'>('starting');
	identity = $state.raw<ScreenIdentity | null>(null);
	/** Null while nothing is open in the dome; content and events of the last run stay. */
	run = $state.raw<FollowedRun | null>(null);
	content = $state.raw<EditionContent | null>(null);
	events = $state.raw<readonly RunEvent[]>([]);
	link = $state<LinkState>('connecting');
	readonly pairing = new Pairing();
	readonly clock = new ServerClock(askServerTime);
	readonly #memory = screenMemory(localStorage);
	readonly #keep = throttleLatest<null>(keepMs, () => this.#remember());
	/** Run whose events and content are held. */
	#heldRunId: string | null = null;

	/** Begins and goes on until the function it returns is called. */
	start(): () => void {
		return untrack(() => this.#start());
	}

	/** Not tracked: an effect that begins it must not begin it again with every event. */
	#start(): () => void {
		const ending = new AbortController();
		this.#restore();
		void this.#live(ending.signal);
		const look = setInterval(() => void this.#look(), lookMs);
		return () => {
			clearInterval(look);
			ending.abort();
		};
	}

	/** Tells the server which painter this screen uses. */
	async sayPainter(painter: 'plain' | 'webgl'): Promise<void> {
		await ask(links.apiScreen(), asJson('PUT', { painter }));
	}

	async #live(signal: AbortSignal): Promise<void> {
		while (!signal.aborted) {
			const status = await this.#whoAmI();
			if (status === 401) {
				this.#forget();
				this.phase = 'pairing';
				await this.pairing.run(signal);
			} else if (!this.identity) {
				this.phase = 'unreached';
				await pause(retryMs, signal);
			} else {
				this.phase = 'paired';
				await this.#follow(signal);
				await pause(status === 200 ? 0 : retryMs, signal);
			}
		}
	}

	/** @returns the status of the answer, 0 where there was none */
	async #whoAmI(): Promise<number> {
		const { status, body } = await ask<ScreenIdentity>(links.apiScreen());
		if (!body) return status;
		this.#setIdentity(body);
		await this.#measure();
		this.#setRun(body.run);
		return status;
	}

	/** The same answer again changes nothing: a picture is not made anew for it. */
	#setIdentity(identity: ScreenIdentity): void {
		const same = (a: ScreenIdentity | null) => a && JSON.stringify([a.screen, a.dome]);
		if (same(this.identity) !== same(identity)) this.identity = identity;
	}

	async #measure(): Promise<void> {
		// Without an answer the known offset stays; the next look measures again.
		await this.clock.measure().catch(() => null);
	}

	async #look(): Promise<void> {
		if (this.phase !== 'paired') return;
		const { body } = await ask<ScreenIdentity>(links.apiScreen());
		if (!body) return;
		this.#setIdentity(body);
		await this.#measure();
		this.#keep.give(null);
	}

	/** Follows the stream until the server refuses or revokes. */
	async #follow(signal: AbortSignal): Promise<void> {
		const ending = new AbortController();
		const end = () => ending.abort();
		signal.addEventListener('abort', end, { once: true });
		await followEvents({
			url: links.apiScreenEvents(),
			lastEventId: this.#heldRunId ? `${this.#heldRunId}:${this.events.length}` : '',
			onEvent: (event) => {
				if (event.event === 'revoked') return end();
				return this.#take(event);
			},
			onState: (state) => {
				this.link = state;
				// A line that came back may have been away for long: settings and clock are looked at anew.
				if (state === 'open') void this.#look();
			},
			signal: ending.signal
		});
		signal.removeEventListener('abort', end);
	}

	#take(event: StreamEvent): boolean {
		if (event.event === 'run') {
			this.#setRun(JSON.parse(event.data) as FollowedRun | null);
			return true;
		}
		if (event.event !== 'event' || !event.id.startsWith(`${this.#heldRunId}:`)) return true;
		const next = appendEvent(this.events, JSON.parse(event.data) as RunEvent);
		if (!next) return false;
		this.events = next;
		this.#keep.give(null);
		return true;
	}

	#setRun(run: FollowedRun | null): void {
		this.run = run;
		if (run && run.runId !== this.#heldRunId) {
			this.#heldRunId = run.runId;
			this.events = [];
			this.content = null;
			void this.#load(run);
		}
		// A run that closed unseen leaves nothing to show; one seen to its end keeps its last picture.
		if (!run && this.events.at(-1)?.command.kind !== 'end') this.#drop();
		this.#keep.give(null);
	}

	#drop(): void {
		this.content = null;
		this.events = [];
		this.#heldRunId = null;
	}

	/** Fetches the edition of a run, or takes it from memory; goes on trying while the run is on. */
	async #load(run: FollowedRun): Promise<void> {
		let content = this.#memory.readContent(run.hash);
		while (!content && this.#heldRunId === run.runId) {
			// Editions never change: the browser may answer from its own cache.
			const url = links.apiScreenEdition(run.editionId);
			const answer = await ask<EditionContent>(url, { cache: 'default' });
			content = answer.body;
			if (content) this.#memory.writeContent(run.hash, content);
			else await pause(retryMs, new AbortController().signal);
		}
		if (this.#heldRunId === run.runId) this.content = content;
	}

	#remember(): void {
		if (!this.identity) return;
		this.#memory.write({
			identity: this.identity,
			run: this.run,
			events: this.events,
			offset: this.clock.known
		});
	}

	/** What was kept before a reload: the picture is there before the server has answered. */
	#restore(): void {
		const kept = this.#memory.read();
		if (!kept) return;
		this.identity = kept.identity;
		if (kept.offset) this.clock.remember(kept.offset);
		if (!kept.run) return;
		const content = this.#memory.readContent(kept.run.hash);
		if (!content) return;
		this.run = kept.run;
		this.#heldRunId = kept.run.runId;
		this.events = kept.events;
		this.content = content;
		this.phase = 'paired';
	}

	#forget(): void {
		this.#memory.forget();
		this.identity = null;
		this.run = null;
		this.#drop();
	}
}
