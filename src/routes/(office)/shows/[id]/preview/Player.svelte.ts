import type { EditionContent } from '$lib/show/edition';
import { playbackAt, rehearsalEvents, type Playback, type RunEvent } from '$lib/show/playback';
import { sceneStarts, totalSeconds } from '$lib/show/timing';

/**
 * Plays a show as if every scene lasted as long as expected. The clock is handed in, so that tests
 * step it. `position` stands still between looks; a film asks `moment` for its own frames.
 */
export class Player {
	readonly content: EditionContent;
	readonly starts: number[];
	/** Seconds of the whole show. */
	readonly duration: number;
	readonly #events: RunEvent[];
	readonly #now: () => number;
	#playing = $state(false);
	/** Seconds from the beginning, as the page last saw it. */
	#position = $state(0);
	/** Clock at which second 0 would have been, while playing; milliseconds. */
	#zero = 0;

	/** @param content with at least one scene @param now a steady clock, milliseconds */
	constructor(content: EditionContent, now: () => number) {
		this.content = content;
		this.starts = sceneStarts(content.show);
		this.duration = totalSeconds(content.show);
		this.#events = rehearsalEvents(content);
		this.#now = now;
	}

	get playing(): boolean {
		return this.#playing;
	}

	get position(): number {
		return this.#position;
	}

	/** The moment the page last saw. */
	get playback(): Playback {
		return this.#at(this.#position);
	}

	/** The moment right now, for a frame. */
	moment(): Playback {
		return this.#at(this.#current());
	}

	/** Lets the page see how far it has come; stops at the end. */
	look(): void {
		this.#position = this.#current();
		if (this.#playing && this.#position >= this.duration) this.#playing = false;
	}

	toggle(): void {
		if (this.#playing) {
			this.look();
			this.#playing = false;
			return;
		}
		if (this.#position >= this.duration) this.#position = 0;
		this.#zero = this.#now() - this.#position * 1000;
		this.#playing = true;
	}

	/** @param seconds kept within the show */
	seek(seconds: number): void {
		this.#position = Math.min(this.duration, Math.max(0, seconds));
		this.#zero = this.#now() - this.#position * 1000;
	}

	/** To the beginning of a scene, counted from 0; kept within the show. */
	toScene(index: number): void {
		const kept = Math.min(this.starts.length - 1, Math.max(0, index));
		this.seek(this.starts[kept]);
	}

	#current(): number {
		if (!this.#playing) return this.#position;
		return Math.min(this.duration, (this.#now() - this.#zero) / 1000);
	}

	#at(seconds: number): Playback {
		return playbackAt(this.content, this.#events, seconds * 1000);
	}
}
