import { describe, expect, it, vi } from 'vitest';
import { userEvent } from 'vitest/browser';
import { render } from 'vitest-browser-svelte';
import { sceneRanges } from '../../src/lib/show/editingControls';
import NumberSetting from '../../src/lib/components/settings/NumberSetting.svelte';

const range = sceneRanges.distance;

describe('NumberSetting', () => {
	it('refuses a number out of range at the field, with the range, and keeps what was typed', async () => {
		const onchange = vi.fn();
		const screen = await render(NumberSetting, { range, value: 60, onchange });
		const field = screen.getByRole('textbox', { name: 'Distance' });
		await userEvent.fill(field, '4000');
		await expect.element(field).toHaveAttribute('aria-invalid', 'true');
		await expect.element(screen.getByText('Type a number from 5 to 400 kpc.')).toBeVisible();
		await userEvent.tab();
		await expect.element(field).toHaveValue('4000');
		expect(onchange).not.toHaveBeenCalled();
	});

	it('refuses what is no number and takes it once it is one', async () => {
		const onchange = vi.fn();
		const screen = await render(NumberSetting, { range, value: 60, onchange });
		const field = screen.getByRole('textbox', { name: 'Distance' });
		await userEvent.fill(field, 'far');
		await expect.element(field).toHaveAttribute('aria-invalid', 'true');
		await userEvent.fill(field, '72,5');
		await expect.element(field).toHaveAttribute('aria-invalid', 'false');
		expect(onchange.mock.calls).toEqual([[72.5]]);
	});

	it('shows the value that undo brings back, whatever is typed', async () => {
		const screen = await render(NumberSetting, { range, value: 60, onchange: () => {} });
		const field = screen.getByRole('textbox', { name: 'Distance' });
		await userEvent.fill(field, '9999');
		await screen.rerender({ value: 48 });
		await expect.element(field).toHaveValue('48');
		await expect.element(field).toHaveAttribute('aria-invalid', 'false');
	});

	it('the slider moves by keyboard and says its value with the unit', async () => {
		const onchange = vi.fn();
		const screen = await render(NumberSetting, {
			range: sceneRanges.inclination,
			value: 40,
			onchange
		});
		const slider = screen.getByRole('slider', { name: 'Inclination, slider' });
		await expect.element(slider).toHaveAttribute('aria-valuetext', '40 °');
		(slider.element() as HTMLInputElement).focus();
		await userEvent.keyboard('{ArrowRight}');
		expect(onchange.mock.calls).toEqual([[41]]);
	});
});
