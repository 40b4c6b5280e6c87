import { describe, expect, it, vi } from 'vitest';
import { render } from 'vitest-browser-svelte';
import type { Drawings, Frame } from '../../src/lib/picture/frame';
import type { PainterChoice } from '../../src/lib/stage/choosePainter';
import FilmStage from '../../src/lib/stage/FilmStage.svelte';
import { centroid, loneStars, makeFrame } from '../picture/support';
import { pixelsOf, withWebglContexts } from './support/canvases';

const film = 256;
const still = makeFrame([loneStars([{ R: 0, light: 3 }])]);
const label = 'A galaxy, seen in front';

function stage(more: {
	painter?: 'auto' | 'plain' | 'webgl';
	playing?: boolean;
	frame?: () => Frame | null;
	drawings?: Drawings;
}) {
	const onpainter = vi.fn<(choice: PainterChoice) => void>();
	const { drawings, ...props } = more;
	const { view, geometry } = still;
	const rendered = render(FilmStage, {
		film,
		label,
		onpainter,
		frame: () => still,
		playing: false,
		...(drawings ? { drawings: { drawings, view, geometry } } : {}),
		...props
	});
	return { rendered, onpainter };
}

const canvases = (root: ParentNode) => [...root.querySelectorAll('canvas')];

/** The star stands at 45° in front: on the film half way from the middle down. */
async function seesTheStar(root: ParentNode) {
	await vi.waitFor(
		() => {
			const middle = centroid(pixelsOf(canvases(root)[0]), film);
			expect(middle?.x, JSON.stringify(middle)).toBeCloseTo(film / 2, -0.4);
			expect(middle?.y, JSON.stringify(middle)).toBeCloseTo(film * 0.75, -0.4);
		},
		{ timeout: 10_000 }
	);
}

describe('FilmStage', () => {
	it.each(['plain', 'webgl'] as const)('shows a still by the %s painter', async (painter) => {
		const { rendered, onpainter } = stage({ painter });
		const screen = await rendered;
		await expect.element(screen.getByRole('img', { name: label })).toBeInTheDocument();
		await seesTheStar(screen.container);
		expect(onpainter.mock.lastCall?.[0]).toMatchObject({ painter });
	});

	it('uses the plain painter where there is no WebGL, and says so', async () => {
		await withWebglContexts(0, async () => {
			const { rendered, onpainter } = stage({ painter: 'auto' });
			const screen = await rendered;
			await seesTheStar(screen.container);
			expect(onpainter.mock.lastCall?.[0]).toMatchObject({ painter: 'plain' });
			expect(onpainter.mock.lastCall?.[0].reason).toContain('no WebGL');
		});
	});

	it('goes over to the plain painter where WebGL does not start after all', async () => {
		// The first context answers whether there is WebGL; there is none for the film.
		await withWebglContexts(1, async () => {
			const { rendered, onpainter } = stage({ painter: 'webgl' });
			const screen = await rendered;
			await seesTheStar(screen.container);
			expect(onpainter.mock.calls.map(([{ painter }]) => painter)).toEqual(['webgl', 'plain']);
			expect(onpainter.mock.lastCall?.[0].reason).toContain('did not start');
		});
	});

	it('goes over to the plain painter when a lost context does not come back', async () => {
		const { rendered, onpainter } = stage({ painter: 'webgl' });
		const screen = await rendered;
		await seesTheStar(screen.container);
		const gl = canvases(screen.container)[0].getContext('webgl2');
		gl?.getExtension('WEBGL_lose_context')?.loseContext();
		await vi.waitFor(() => expect(onpainter).toHaveBeenCalledTimes(2), { timeout: 10_000 });
		expect(onpainter.mock.lastCall?.[0]).toMatchObject({ painter: 'plain' });
		expect(onpainter.mock.lastCall?.[0].reason).toContain('lost its WebGL context');
		await seesTheStar(screen.container);
	});

	it('stays with WebGL when a lost context comes back, and paints the still again', async () => {
		const { rendered, onpainter } = stage({ painter: 'webgl' });
		const screen = await rendered;
		await seesTheStar(screen.container);
		const gl = canvases(screen.container)[0].getContext('webgl2');
		const loss = gl?.getExtension('WEBGL_lose_context');
		loss?.loseContext();
		await new Promise((resolve) => setTimeout(resolve, 200));
		loss?.restoreContext();
		await seesTheStar(screen.container);
		await new Promise((resolve) => setTimeout(resolve, 2500));
		expect(onpainter).toHaveBeenCalledTimes(1);
	});

	it('asks for a still once, and again only for another one', async () => {
		const [first, second] = [vi.fn(() => still), vi.fn(() => still)];
		const screen = await stage({ painter: 'plain', frame: first }).rendered;
		await vi.waitFor(() => expect(first).toHaveBeenCalledTimes(1));
		await screen.rerender({ frame: second });
		await vi.waitFor(() => expect(second).toHaveBeenCalledTimes(1));
		await new Promise((resolve) => setTimeout(resolve, 200));
		expect([first.mock.calls.length, second.mock.calls.length]).toEqual([1, 1]);
	});

	it('asks at every animation frame while it plays', async () => {
		const frame = vi.fn(() => still);
		await stage({ painter: 'plain', frame, playing: true }).rendered;
		await vi.waitFor(() => expect(frame.mock.calls.length).toBeGreaterThan(5), { timeout: 5000 });
	});

	it('writes over the stars on a canvas of its own', async () => {
		const screen = await stage({
			painter: 'plain',
			drawings: { rings: [], caption: 'It turns too fast.' }
		}).rendered;
		await vi.waitFor(() => {
			const overlay = pixelsOf(canvases(screen.container)[1]);
			const inked = overlay.filter((_, i) => i % 4 === 3 && overlay[i] > 200).length;
			expect(inked).toBeGreaterThan(20);
			expect(inked).toBeLessThan((film * film) / 20);
		});
	});

	it('fades words with the stars', async () => {
		const frame = () => ({ ...still, exposure: 0.25 });
		const drawings = { rings: [], caption: 'It turns too fast.' };
		const screen = await stage({ painter: 'plain', frame, drawings }).rendered;
		await vi.waitFor(() => {
			const layer = canvases(screen.container)[1].parentElement;
			expect(layer && getComputedStyle(layer).opacity).toBe('0.25');
		});
	});
});
