import type { WebGLRenderer } from 'three';
import type { Frame } from '$lib/picture/frame';
import { PlainPainter } from '$lib/picture/plainPainter';
import { massModel, type MassModelSpec } from '$lib/dynamics';
import { initialLook } from '$lib/show/galaxy';
import { createRingTable, sampleBackground, sampleStars, setModel } from '$lib/starfield';
import { hasWebgl, makeRenderer } from './webgl/makeRenderer';
import { WebglStarPainter } from './webgl/WebglStarPainter';

/** Which painter a film uses, why, and what a frame cost when it was tried. */
export interface PainterChoice {
	painter: 'plain' | 'webgl';
	/** A sentence for the page. */
	reason: string;
	/** Median milliseconds of a trial frame; null where it was not measured. */
	plainMs: number | null;
	webglMs: number | null;
}

const trialFrames = 5;
const trialStars = 40_000;

/** A disc of stars like those of a scene; the same for both painters. */
function trialFrame(): Frame {
	const spec: MassModelSpec = {
		components: [
			{ id: 'disc', kind: 'kuzmin-disk', parameters: { mass: 5e10, scaleLength: 4 }, lit: true }
		]
	};
	const rings = createRingTable(initialLook.outerRadius);
	setModel(rings, massModel(spec));
	return {
		geometry: { apertureDegrees: 180, tiltDegrees: 0 },
		view: { distance: 40, inclination: 40, turn: 0, centreAltitude: 45 },
		layers: [
			{
				stars: sampleStars(spec, initialLook, { count: trialStars, seed: 1, radii: rings.radii }),
				rings,
				look: initialLook,
				patternAngle: 0,
				half: 'whole'
			}
		],
		background: sampleBackground(1, 500),
		colour: 'light',
		speedRange: [0, 300],
		exposure: 1
	};
}

const median = (times: number[]) => [...times].sort((a, b) => a - b)[times.length >> 1];

function time(paint: () => void): number {
	paint();
	return median(
		Array.from({ length: trialFrames }, () => {
			const from = performance.now();
			paint();
			return performance.now() - from;
		})
	);
}

function timePlain(film: number, frame: Frame): number {
	const painter = new PlainPainter(film);
	const context = Object.assign(document.createElement('canvas'), {
		width: film,
		height: film
	}).getContext('2d');
	const image = new ImageData(painter.pixels, film, film);
	return time(() => {
		const { left, top, right, bottom } = painter.paint(frame);
		context?.putImageData(image, 0, 0, left, top, right - left + 1, bottom - top + 1);
	});
}

function timeWebgl(film: number, frame: Frame): number {
	const renderer: WebGLRenderer = makeRenderer(document.createElement('canvas'));
	const painter = new WebglStarPainter(renderer, film);
	const gl = renderer.getContext();
	const pixel = new Uint8Array(4);
	const measured = time(() => {
		painter.paint(frame);
		// Reading a pixel waits until the frame is really drawn.
		gl.readPixels(0, 0, 1, 1, gl.RGBA, gl.UNSIGNED_BYTE, pixel);
	});
	painter.dispose();
	renderer.dispose();
	renderer.forceContextLoss();
	return measured;
}

const milliseconds = (ms: number) => `${ms.toFixed(1)} ms`;

/**
 * Takes the wanted painter, or measures both for some frames and takes the faster. Without WebGL it is
 * the plain one, whatever was wanted, and the reason says so.
 * @param film pixels across
 */
export function choosePainter(wanted: 'auto' | 'plain' | 'webgl', film: number): PainterChoice {
	const choice = (painter: 'plain' | 'webgl', reason: string): PainterChoice => ({
		painter,
		reason,
		plainMs: null,
		webglMs: null
	});
	if (wanted === 'plain') return choice('plain', 'The plain painter is set for this dome.');
	if (!hasWebgl())
		return choice('plain', 'This browser has no WebGL, so the plain painter is used.');
	if (wanted === 'webgl') return choice('webgl', 'The WebGL painter is set for this dome.');
	const remembered = recall(film);
	if (remembered) return remembered;
	const frame = trialFrame();
	const plainMs = timePlain(film, frame);
	let webglMs: number;
	try {
		webglMs = timeWebgl(film, frame);
	} catch (error) {
		const what = error instanceof Error ? error.message : String(error);
		return choice(
			'plain',
			`WebGL failed when it was tried (${what}), so the plain painter is used.`
		);
	}
	const painter = webglMs < plainMs ? 'webgl' : 'plain';
	const [faster, slower] = painter === 'webgl' ? [webglMs, plainMs] : [plainMs, webglMs];
	const name = painter === 'webgl' ? 'WebGL' : 'plain';
	const made: PainterChoice = {
		painter,
		reason: `The ${name} painter was faster here: ${milliseconds(faster)} a frame against ${milliseconds(slower)}.`,
		plainMs,
		webglMs
	};
	remember(film, made);
	return made;
}

const memoryKey = (film: number) => `farwheel painter ${film}`;

/** Kept by the tab, since a page that is reloaded in the middle of a show must not wait. */
function remember(film: number, choice: PainterChoice): void {
	try {
		sessionStorage.setItem(memoryKey(film), JSON.stringify(choice));
	} catch (error) {
		// A browser that forbids storage measures again at the next load, and that is all it costs.
		if (!(error instanceof DOMException)) throw error;
	}
}

/** @returns what this tab measured before; null where there is nothing that can be read */
function recall(film: number): PainterChoice | null {
	try {
		const kept = sessionStorage.getItem(memoryKey(film));
		const choice = kept ? (JSON.parse(kept) as PainterChoice) : null;
		return choice?.painter === 'plain' || choice?.painter === 'webgl' ? choice : null;
	} catch (error) {
		if (error instanceof DOMException || error instanceof SyntaxError) return null;
		throw error;
	}
}
