import type { DomeGeometry } from '$lib/dome/types';
import { drawOnFilm } from '$lib/picture/drawings';
import type { Drawings, Frame, View } from '$lib/picture/frame';
import { PlainPainter } from '$lib/picture/plainPainter';

export interface Drawn {
	drawings: Drawings;
	view: View;
	geometry: DomeGeometry;
}

/** A film with its drawings on one canvas, painted by the plain painter: what hangs in the dome. */
export class SeatFilm {
	readonly canvas: HTMLCanvasElement;
	readonly #context: CanvasRenderingContext2D;
	readonly #painter: PlainPainter;
	readonly #image: ImageData;
	readonly #overlay: HTMLCanvasElement;
	#drawn: Drawn | null = null;

	/** @throws Error where the browser gives no 2D canvas */
	constructor(readonly size: number) {
		const canvas = () =>
			Object.assign(document.createElement('canvas'), { width: size, height: size });
		this.canvas = canvas();
		this.#overlay = canvas();
		const context = this.canvas.getContext('2d', { alpha: false, willReadFrequently: true });
		if (!context) throw new Error('This browser gives no 2D canvas.');
		this.#context = context;
		this.#painter = new PlainPainter(size);
		this.#image = new ImageData(this.#painter.pixels, size, size);
	}

	paint(frame: Frame, drawn: Drawn | null): void {
		this.#painter.paint(frame);
		// The drawings lie on the same canvas, so the whole film goes on again.
		this.#context.putImageData(this.#image, 0, 0);
		if (drawn !== this.#drawn) {
			this.#drawn = drawn;
			const context = this.#overlay.getContext('2d');
			if (context && drawn)
				drawOnFilm(context, this.size, drawn.geometry, drawn.view, drawn.drawings);
		}
		if (!drawn) return;
		// Words come and go with the stars.
		this.#context.globalAlpha = frame.exposure;
		this.#context.drawImage(this.#overlay, 0, 0);
		this.#context.globalAlpha = 1;
	}

	pixels(): Uint8ClampedArray {
		return this.#context.getImageData(0, 0, this.size, this.size).data;
	}
}
