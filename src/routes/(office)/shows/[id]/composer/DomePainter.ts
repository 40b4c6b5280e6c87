import { createContext } from 'svelte';
import type { DomeGeometry } from '$lib/dome/types';
import { PlainPainter } from '$lib/picture/plainPainter';
import { ShowPicture } from '$lib/picture/showPicture';
import type { Scene, ShowDocument } from '$lib/show/document';
import type { EditionContent, EditionGalaxy } from '$lib/show/edition';
import { isPlayable } from '$lib/show/editingPlayable';
import { scenePlayback, type SceneMotion } from '$lib/show/editingPlayback';

/** Pixels across the small film of a row. */
export const filmSize = 200;
const starCount = 2500;
const ringCount = 96;
/** Milliseconds of painting before the page gets its turn again. */
const turn = 8;
const geometry: DomeGeometry = { apertureDegrees: 180, tiltDegrees: 0 };

/**
 * Paints the small films of one page: one set of stars and one painter for all of them. Stills wait
 * in a queue and are painted between other work, so that a long show can be read before its pictures
 * are all there.
 */
export class DomePainter {
	readonly #content: EditionContent;
	readonly #waiting = new Map<HTMLCanvasElement, SceneMotion>();
	#picture: ShowPicture | undefined;
	#painter: PlainPainter | undefined;
	#scheduled = false;

	constructor(show: ShowDocument, galaxies: Record<string, EditionGalaxy>) {
		this.#content = { format: 1, show: { ...show, scenes: [] }, galaxies };
	}

	canPaint(scene: Scene): boolean {
		return isPlayable(scene, this.#content.galaxies);
	}

	/** Paints a still when its turn comes. @returns how to take the wish back */
	request(canvas: HTMLCanvasElement, motion: SceneMotion): () => void {
		this.#waiting.set(canvas, motion);
		this.#schedule();
		return () => {
			if (this.#waiting.get(canvas) === motion) this.#waiting.delete(canvas);
		};
	}

	/** Paints at once. */
	paint(canvas: HTMLCanvasElement, motion: SceneMotion): void {
		// Made when first needed: neither is there while the page is rendered on the server.
		this.#picture ??= new ShowPicture(this.#content, { starCount, ringCount });
		this.#painter ??= new PlainPainter(filmSize);
		const playback = scenePlayback(this.#content, motion);
		this.#painter.paint(this.#picture.frameAt(playback, geometry));
		const image = new ImageData(this.#painter.pixels, filmSize, filmSize);
		canvas.getContext('2d')?.putImageData(image, 0, 0);
	}

	#schedule(): void {
		if (this.#scheduled) return;
		this.#scheduled = true;
		setTimeout(() => {
			this.#scheduled = false;
			const until = performance.now() + turn;
			for (const [canvas, motion] of this.#waiting) {
				this.#waiting.delete(canvas);
				this.paint(canvas, motion);
				if (performance.now() > until) break;
			}
			if (this.#waiting.size > 0) this.#schedule();
		});
	}
}

export const [getDomePainter, setDomePainter] = createContext<DomePainter>();
