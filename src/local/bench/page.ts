import type { WebGLRenderer } from 'three';
import type { Frame } from '../../lib/picture/frame';
import { PlainPainter } from '../../lib/picture/plainPainter';
import { makeRenderer } from '../../lib/stage/webgl/makeRenderer';
import { WebglStarPainter } from '../../lib/stage/webgl/WebglStarPainter';
import { CubeFisheye } from './CubeFisheye';
import { benchFrame, timesInTurn, type Times } from './subject';

export interface PageTimes {
	plain: Times;
	webgl: Times;
	cube: Times;
	/** What draws WebGL here. */
	device: string;
}

function plainFrame(film: number, frame: Frame): () => void {
	const painter = new PlainPainter(film);
	const canvas = Object.assign(document.createElement('canvas'), { width: film, height: film });
	const context = canvas.getContext('2d', { alpha: false });
	if (!context) throw new Error('no 2D canvas');
	const image = new ImageData(painter.pixels, film, film);
	return () => {
		const { left, top, right, bottom } = painter.paint(frame);
		context.putImageData(image, 0, 0, left, top, right - left + 1, bottom - top + 1);
	};
}

function gpuFrame(make: (renderer: WebGLRenderer) => () => void): () => void {
	const renderer = makeRenderer(document.createElement('canvas'));
	const paint = make(renderer);
	const gl = renderer.getContext();
	const pixel = new Uint8Array(4);
	return () => {
		paint();
		// Waits until the frame is drawn; without it only the sending would be measured.
		gl.readPixels(0, 0, 1, 1, gl.RGBA, gl.UNSIGNED_BYTE, pixel);
	};
}

function measure(film: number, stars: number): PageTimes {
	const { frame, step } = benchFrame(stars);
	const plain = plainFrame(film, frame);
	const webgl = gpuFrame((renderer) => {
		const painter = new WebglStarPainter(renderer, film);
		return () => painter.paint(frame);
	});
	const cube = gpuFrame((renderer) => {
		const fisheye = new CubeFisheye(renderer, film, frame);
		return () => fisheye.paint();
	});
	const stepped = (paint: () => void) => () => {
		step();
		paint();
	};
	const measured = timesInTurn(
		{ plain: stepped(plain), webgl: stepped(webgl), cube: stepped(cube) },
		8,
		5
	);
	const gl = document.createElement('canvas').getContext('webgl2');
	const info = gl?.getExtension('WEBGL_debug_renderer_info');
	const device = gl && info ? String(gl.getParameter(info.UNMASKED_RENDERER_WEBGL)) : 'unknown';
	return { ...measured, device };
}

Object.assign(window, { measure });
