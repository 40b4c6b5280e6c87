import { Camera, Scene, type BufferGeometry, type WebGLRenderer } from 'three';
import { FilmCamera } from '$lib/picture/filmCamera';
import type { Frame } from '$lib/picture/frame';
import type { StarList } from '$lib/starfield/types';
import { BackgroundPoints } from './BackgroundPoints';
import { LayerPoints } from './LayerPoints';
import { starGeometry } from './starGeometry';

/**
 * The star painter for machines with a GPU: each star is one vertex that goes straight to the
 * fisheye film in one pass, no cube map and no extension. Reads the same frame as the plain painter
 * and computes the same places and lights. After a lost context three uploads everything again.
 */
export class WebglStarPainter {
	readonly size: number;
	readonly #renderer: WebGLRenderer;
	readonly #scene = new Scene();
	/** The shaders project by themselves; three only wants one. */
	readonly #camera = new Camera();
	readonly #filmCamera = new FilmCamera();
	readonly #geometries = new Map<StarList, BufferGeometry>();
	#layers: { stars: StarList; points: LayerPoints }[] = [];
	#background: BackgroundPoints | null = null;

	/** @param renderer drawing onto a canvas without alpha; its size is set to the film's */
	constructor(renderer: WebGLRenderer, size: number) {
		this.#renderer = renderer;
		this.size = size;
		renderer.setPixelRatio(1);
		renderer.setSize(size, size, false);
		renderer.setClearColor(0x000000, 1);
		renderer.autoClear = true;
	}

	paint(frame: Frame): void {
		this.#filmCamera.set(frame.view, frame.geometry);
		this.#setBackground(frame);
		this.#setLayers(frame);
		this.#renderer.render(this.#scene, this.#camera);
	}

	dispose(): void {
		for (const { points } of this.#layers) points.dispose();
		for (const geometry of this.#geometries.values()) geometry.dispose();
		this.#background?.dispose();
		this.#scene.clear();
	}

	#setBackground(frame: Frame): void {
		if (this.#background?.sky !== frame.background) {
			if (this.#background) {
				this.#scene.remove(this.#background.points);
				this.#background.dispose();
			}
			this.#background = new BackgroundPoints(frame.background);
			this.#scene.add(this.#background.points);
		}
		this.#background.set(this.size, frame);
	}

	#setLayers(frame: Frame): void {
		const fits =
			this.#layers.length === frame.layers.length &&
			this.#layers.every(({ stars }, i) => stars === frame.layers[i].stars);
		if (!fits) this.#makeLayers(frame);
		frame.layers.forEach((layer, i) =>
			this.#layers[i].points.set(this.size, this.#filmCamera, frame, layer)
		);
	}

	#makeLayers(frame: Frame): void {
		for (const { points } of this.#layers) {
			this.#scene.remove(points.points);
			points.dispose();
		}
		this.#layers = frame.layers.map(({ stars, rings }) => {
			let geometry = this.#geometries.get(stars);
			if (!geometry) this.#geometries.set(stars, (geometry = starGeometry(stars)));
			const points = new LayerPoints(geometry, rings.radii.length);
			this.#scene.add(points.points);
			return { stars, points };
		});
	}
}
