/**
 * Runs a test in a browser whose canvases give at most so many WebGL contexts; 2D ones work as ever.
 * @returns what `run` returns
 */
export async function withWebglContexts<T>(allowed: number, run: () => Promise<T>): Promise<T> {
	const { prototype } = HTMLCanvasElement;
	const original = Object.getOwnPropertyDescriptor(prototype, 'getContext');
	if (!original) throw new Error('this browser has no canvas');
	let left = allowed;
	Object.defineProperty(prototype, 'getContext', {
		...original,
		value(this: HTMLCanvasElement, kind: string, ...rest: unknown[]): unknown {
			if (kind.startsWith('webgl') && left-- <= 0) return null;
			return Reflect.apply(original.value as CallableFunction as () => unknown, this, [
				kind,
				...rest
			]);
		}
	});
	try {
		return await run();
	} finally {
		Object.defineProperty(prototype, 'getContext', original);
	}
}

/** Pixels of any canvas as it stands. */
export function pixelsOf(canvas: HTMLCanvasElement): Uint8ClampedArray {
	const copy = Object.assign(document.createElement('canvas'), {
		width: canvas.width,
		height: canvas.height
	});
	const context = copy.getContext('2d');
	if (!context) throw new Error('this browser gives no 2D canvas');
	context.drawImage(canvas, 0, 0);
	return context.getImageData(0, 0, canvas.width, canvas.height).data;
}
