import { describe, expect, it, vi } from 'vitest';
import { userEvent } from 'vitest/browser';
import { render } from 'vitest-browser-svelte';
import { seats, type SeatName } from '../../src/lib/dome/seat';
import { seatPlace } from '../../src/lib/stage/seat/PlainSeat';
import SeatPreview from '../../src/lib/stage/SeatPreview.svelte';
import { loneStars, makeFrame } from '../picture/support';
import { pixelsOf, withWebglContexts } from './support/canvases';

const star = { altitude: 40, azimuth: 0 };
const still = makeFrame([loneStars([{ R: 0, light: 4, size: 12 }])], {
	centreAltitude: star.altitude
});
const props = (more: { playing?: boolean; frame?: () => typeof still } = {}) => ({
	frame: () => still,
	playing: false,
	geometry: still.geometry,
	film: 512,
	label: 'The dome',
	...more
});
const [width, height] = [480, 320];

/** Middle of the light of the seat's picture. */
function lightOf(root: ParentNode) {
	const canvas = root.querySelector('canvas');
	if (!canvas) throw new Error('no picture');
	const pixels = pixelsOf(canvas);
	let [light, x, y] = [0, 0, 0];
	for (let i = 0; i < pixels.length; i += 4) {
		const w = pixels[i] + pixels[i + 1] + pixels[i + 2];
		light += w;
		x += w * ((i / 4) % width);
		y += w * Math.floor(i / 4 / width);
	}
	return { x: x / light, y: y / light };
}

async function seesTheStar(root: ParentNode, name: SeatName, azimuth = 0) {
	const camera = { seat: seats[name].seat, azimuth, altitude: 35, field: 70 };
	const place = seatPlace(camera, star, width, height);
	if (!place) throw new Error('the star is behind the eye');
	await vi.waitFor(
		() => {
			const { x, y } = lightOf(root);
			expect(Math.abs(x - place.x), `x ${x} and ${place.x}`).toBeLessThan(4);
			expect(Math.abs(y - place.y), `y ${y} and ${place.y}`).toBeLessThan(4);
		},
		{ timeout: 10_000 }
	);
}

describe('SeatPreview', () => {
	it('without WebGL shows the star where it is seen from the seat, and says how it is drawn', async () => {
		await withWebglContexts(0, async () => {
			const screen = await render(SeatPreview, props());
			await expect.element(screen.getByText('No WebGL here')).toBeInTheDocument();
			await seesTheStar(screen.container, 'sweet');
			await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Seat' }), 'back');
			await seesTheStar(screen.container, 'back');
		});
	});

	it('turns by arrow keys and looks to the front again', async () => {
		await withWebglContexts(0, async () => {
			const screen = await render(SeatPreview, props());
			await seesTheStar(screen.container, 'sweet');
			const view = screen.getByRole('application', { name: /Arrow keys turn/ });
			(view.element() as HTMLElement).focus();
			await userEvent.keyboard('{ArrowRight}{ArrowRight}');
			await seesTheStar(screen.container, 'sweet', 10);
			await screen.getByRole('button', { name: 'Look to the front' }).click();
			await seesTheStar(screen.container, 'sweet');
		});
	});

	it('draws horizon and safe band on demand', async () => {
		await withWebglContexts(0, async () => {
			const screen = await render(SeatPreview, props());
			await seesTheStar(screen.container, 'sweet');
			const greenish = () => {
				const canvas = screen.container.querySelector('canvas');
				const p = canvas ? pixelsOf(canvas) : [];
				let found = 0;
				for (let i = 0; i < p.length; i += 4) if (p[i + 1] > p[i] + 30) found++;
				return found;
			};
			expect(greenish()).toBe(0);
			await screen.getByLabelText('Horizon and safe band').click();
			await vi.waitFor(() => expect(greenish()).toBeGreaterThan(200));
		});
	});

	it('with WebGL hangs the film in a dome, and asks for a still once', async () => {
		const frame = vi.fn(() => still);
		const screen = await render(SeatPreview, props({ frame }));
		await vi.waitFor(() => expect(frame).toHaveBeenCalledTimes(1), { timeout: 10_000 });
		await new Promise((resolve) => setTimeout(resolve, 300));
		expect(frame).toHaveBeenCalledTimes(1);
		expect(screen.container.querySelector('canvas')?.getContext('webgl2')).not.toBeNull();
		expect(screen.container.textContent).not.toContain('No WebGL here');
	});

	it('lets a page be scrolled past it, and zooms once it has the focus', async () => {
		const screen = await render(SeatPreview, props());
		const view = screen.getByRole('application').element() as HTMLElement;
		const wheel = () => new WheelEvent('wheel', { deltaY: 100, cancelable: true, bubbles: true });
		expect(view.dispatchEvent(wheel())).toBe(true);
		view.focus();
		expect(view.dispatchEvent(wheel())).toBe(false);
	});
});
