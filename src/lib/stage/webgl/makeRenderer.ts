import { WebGLRenderer } from 'three';

/**
 * A renderer for a film: no alpha, no depth, no smoothing, keeps what it drew so that it can be read.
 * @throws Error where the browser has no WebGL 2
 */
export const makeRenderer = (canvas: HTMLCanvasElement | OffscreenCanvas): WebGLRenderer =>
	new WebGLRenderer({
		canvas,
		alpha: false,
		antialias: false,
		depth: false,
		stencil: false,
		preserveDrawingBuffer: true,
		powerPreference: 'high-performance'
	});

/** Whether this browser can make a WebGL 2 context at all; the trial one is given back at once. */
export function hasWebgl(): boolean {
	const context = document.createElement('canvas').getContext('webgl2');
	context?.getExtension('WEBGL_lose_context')?.loseContext();
	return context !== null;
}
