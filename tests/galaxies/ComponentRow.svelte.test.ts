import { describe, expect, it } from 'vitest';
import { userEvent } from 'vitest/browser';
import { render } from 'vitest-browser-svelte';
import { galaxy } from '../show/support/content';
import { makeTuning } from './support';
import TuningHarness from './TuningHarness.svelte';

const haloOf = (document: typeof galaxy) => document.model.components.find((c) => c.id === 'halo');

async function shown() {
	const made = makeTuning();
	const screen = await render(TuningHarness, { tuning: made.tuning });
	const row = screen.getByRole('listitem').filter({ hasText: 'NFW halo' });
	return { ...made, screen, row };
}

describe('ComponentRow', () => {
	it('refuses a parameter out of range at its field, with the range, and the last good value stays', async () => {
		const { tuning, documents, row } = await shown();
		const field = row.getByRole('textbox', { name: 'Scale radius' });
		await userEvent.fill(field, '25');
		expect(haloOf(tuning.document)?.parameters.scaleRadius).toBe(25);
		await userEvent.fill(field, '5000');
		await expect.element(field).toHaveAttribute('aria-invalid', 'true');
		await expect.element(row.getByText('Type a number from 0.001 to 1000 kpc.')).toBeVisible();
		await userEvent.tab();
		await expect.element(field).toHaveValue('5000');
		expect(documents.at(-1)).toBe(tuning.document);
		expect(haloOf(tuning.document)?.parameters.scaleRadius).toBe(25);
	});

	it('refuses what is no number, and an empty field', async () => {
		const { documents, row } = await shown();
		const field = row.getByRole('textbox', { name: 'Density' });
		for (const text of ['much', '']) {
			await userEvent.fill(field, text);
			await expect.element(field).toHaveAttribute('aria-invalid', 'true');
		}
		expect(documents).toEqual([]);
		await userEvent.fill(field, '9e6');
		await expect.element(field).toHaveAttribute('aria-invalid', 'false');
		expect(documents.map(haloOf).map((halo) => halo?.parameters.density)).toEqual([9e6]);
	});

	it('the slider moves a density by its ratio', async () => {
		const { documents, row } = await shown();
		const slider = row.getByRole('slider', { name: 'Density, slider' });
		(slider.element() as HTMLInputElement).focus();
		await userEvent.keyboard('{ArrowRight}');
		const density = haloOf(documents[0])?.parameters.density ?? NaN;
		expect(density, `${density} after 8e6`).toBeGreaterThan(8e6);
		expect(density, `${density} after 8e6`).toBeLessThan(8.5e6);
	});

	it('a halo is given by mass and concentration instead, with the same speeds', async () => {
		const { tuning, row } = await shown();
		const before = tuning.model.circularVelocity(20);
		await userEvent.selectOptions(row.getByRole('combobox', { name: 'Given by' }), 'mass200');
		await expect.element(row.getByRole('textbox', { name: 'Concentration' })).toBeVisible();
		const after = tuning.model.circularVelocity(20);
		expect(Math.abs(after - before), `${before} and ${after} km/s`).toBeLessThan(0.01);
		expect(Math.abs(after - before), `${before} and ${after} km/s`).toBeGreaterThanOrEqual(0);
	});

	it('marks matter lit, adds and removes a component, and says its share of the pull', async () => {
		const { tuning, screen, row } = await shown();
		await expect.element(row.getByText(/^\d+ %$/)).toBeVisible();
		await userEvent.click(row.getByRole('radio', { name: 'lit', exact: true }));
		expect(haloOf(tuning.document)?.lit).toBe(true);
		await userEvent.click(screen.getByRole('button', { name: 'Add a component' }));
		await userEvent.click(screen.getByRole('button', { name: /^Burkert/ }));
		await expect.element(screen.getByText('Burkert halo', { exact: true })).toBeVisible();
		await userEvent.click(screen.getByRole('button', { name: 'Remove “Burkert halo”' }));
		expect(tuning.document.model.components).toHaveLength(galaxy.model.components.length);
	});
});
