import { describe, expect, it, vi } from 'vitest';
import { userEvent } from 'vitest/browser';
import { render } from 'vitest-browser-svelte';
import { massModel } from '../../../src/lib/dynamics';
import type { MassModelSpec } from '../../../src/lib/dynamics/types';
import SpeedChart from '../../../src/lib/components/chart/SpeedChart.svelte';
import { chartRadii, speedCurves } from '../../../src/lib/components/chart/speedCurves';

const spec: MassModelSpec = {
	components: [
		{
			id: 'stars',
			name: 'Stars',
			kind: 'exponential-disk',
			parameters: { surfaceDensity: 5e8, scaleLength: 2.8 },
			lit: true
		},
		{
			id: 'halo',
			name: 'Halo',
			kind: 'nfw',
			parameters: { density: 1e7, scaleRadius: 18 },
			lit: false
		}
	]
};
const radii = chartRadii(20);
const props = (onrest = vi.fn(), onlook = vi.fn()) => ({
	title: 'Speeds',
	curves: speedCurves(spec, massModel(spec), radii),
	radii,
	points: [{ radius: 8, speed: 205, error: 6 }],
	reading: 8,
	onrest,
	onlook
});

describe('SpeedChart', () => {
	it('moves the reading line by keys and says the radius in both units', async () => {
		const onrest = vi.fn();
		const screen = await render(SpeedChart, props(onrest));
		const slider = screen.getByRole('slider', { name: 'Reading radius' });
		await expect.element(slider).toHaveAttribute('aria-valuetext', '8.00 kpc · 26.1 kly');
		(slider.element() as SVGElement).focus();
		await userEvent.keyboard('{ArrowRight}{ArrowLeft}{PageUp}{Home}{End}');
		expect(onrest.mock.calls.flat()).toEqual([8.2, 7.8, 10, 0.1, 20]);
	});

	it('looks where the pointer is and lets go when it leaves', async () => {
		const onlook = vi.fn();
		const screen = await render(SpeedChart, props(vi.fn(), onlook));
		await userEvent.hover(screen.getByRole('group', { name: 'Speeds' }));
		const [looked] = onlook.mock.calls.at(-1) ?? [];
		expect(looked).toBeGreaterThan(7);
		expect(looked).toBeLessThan(13);
		await userEvent.hover(screen.getByRole('button', { name: 'Show as table' }));
		expect(onlook).toHaveBeenLastCalledWith(null);
	});

	it('tells lit from unlit by the line itself and names each curve at its end', async () => {
		const screen = await render(SpeedChart, props());
		const dash = (key: string) =>
			getComputedStyle(screen.container.querySelector(`[data-curve="${key}"]`) ?? document.body)
				.strokeDasharray;
		expect(dash('stars')).toBe('none');
		expect(dash('halo')).not.toBe('none');
		const names = [...screen.container.querySelectorAll('.names text')].map((node) =>
			node.lastChild?.textContent?.trim()
		);
		expect(names).toEqual(['Stars', 'Halo', 'Total']);
	});

	it('shows the same values as a table', async () => {
		const screen = await render(SpeedChart, props());
		await userEvent.click(screen.getByRole('button', { name: 'Show as table' }));
		await expect.element(screen.getByRole('columnheader', { name: 'Total, km/s' })).toBeVisible();
		const last = screen.getByRole('row').nth(16);
		const expected = massModel(spec).circularVelocity(20).toFixed(1);
		await expect.element(last).toHaveTextContent(expected);
		await expect.element(screen.getByRole('table').nth(1)).toHaveTextContent('205.0');
	});
});
