import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { expect, test } from './support/test';

const producer = 'producer@lanternhill.example.org';
const adviser = 'adviser@lanternhill.example.org';
const stranger = 'producer@saltmarsh.example.org';

/** Makes a galaxy of a shape and waits until its page answers. @returns its address */
async function newGalaxy(page: Page, name: string, shape = 'Disc galaxy with halo') {
	await page.goto('/galaxies?new');
	await page.getByLabel('Name of the new galaxy').fill(name);
	await page.getByLabel(shape).check();
	await page.getByRole('button', { name: 'Make the galaxy' }).click();
	await expect(page.getByRole('heading', { level: 1, name })).toBeVisible();
	await expect(page.getByRole('button', { name: 'Add a component' })).toBeEnabled();
	return page.url();
}
const row = (page: Page, name: string) =>
	page.getByRole('listitem').filter({ has: page.getByLabel(`Name of the component ${name}`) });
const speed = async (page: Page) =>
	Number.parseFloat(await page.locator('[data-read-out=speed] .exact').innerText());
const saved = (page: Page) => expect(page.locator('[data-save=saved]')).toBeVisible();

test('a halo is tuned: curve and read-outs answer, a reload keeps it, undo takes it back', async ({
	page,
	signIn
}) => {
	await signIn(page, producer);
	await newGalaxy(page, 'Tuned by test');
	await expect(page.locator('[data-painter]')).toBeVisible();
	const total = page.locator('[data-curve="+total"]');
	const before = { speed: await speed(page), path: await total.getAttribute('d') };

	const slider = row(page, 'Dark halo').getByLabel('Density, slider');
	await slider.focus();
	for (let i = 0; i < 30; i++) await slider.press('ArrowRight');
	expect(await speed(page)).toBeGreaterThan(before.speed + 5);
	expect(await total.getAttribute('d')).not.toBe(before.path);
	const tuned = await speed(page);

	// A number out of range stays at its field; model and curve keep the last good one.
	const field = row(page, 'Dark halo').getByRole('textbox', { name: 'Scale radius' });
	await field.fill('-4');
	await expect(
		row(page, 'Dark halo').getByText('Type a number from 0.001 to 1000 kpc.')
	).toBeVisible();
	expect(await speed(page)).toBe(tuned);
	await saved(page);
	await page.reload();
	await expect(page.locator('[data-read-out=speed] .exact')).toHaveText(`${tuned.toFixed(2)} km/s`);

	await row(page, 'Dark halo').getByRole('button', { name: 'Remove' }).click();
	await expect(page.locator('[data-read-out=unlit] .words')).toHaveText('nothing');
	await page.keyboard.press('Control+z');
	expect(await speed(page)).toBe(tuned);
	await saved(page);
});

test('a component is added, marked unlit, and the halo is given by mass instead', async ({
	page,
	signIn
}) => {
	await signIn(page, producer);
	await newGalaxy(page, 'Built by test');
	await page.getByRole('button', { name: 'Add a component' }).click();
	await page
		.getByRole('dialog')
		.getByRole('button', { name: /^Plummer/ })
		.click();
	const added = row(page, 'Plummer');
	await expect(added).toHaveCount(1);
	const lit = page.locator('[data-read-out=lit] .exact');
	const before = await lit.innerText();
	await added.getByLabel('unlit', { exact: true }).check();
	await expect(lit).not.toHaveText(before);

	const was = await speed(page);
	await row(page, 'Dark halo').getByLabel('Given by').selectOption('Mass and concentration');
	await expect(
		row(page, 'Dark halo').getByRole('textbox', { name: 'Concentration' })
	).toBeVisible();
	expect(Math.abs((await speed(page)) - was)).toBeLessThan(0.02);
	await saved(page);
});

test('the reading line is moved by keys and what it says follows', async ({ page, signIn }) => {
	await signIn(page, producer);
	await newGalaxy(page, 'Read by test');
	const line = page.getByRole('slider', { name: 'Reading radius' });
	const turn = page.locator('[data-read-out=orbit] .exact');
	const before = await turn.innerText();
	await line.press('PageUp');
	await expect(line).toHaveAttribute('aria-valuetext', /^11\.7 kpc · 38\.2 kly$/);
	await expect(turn).not.toHaveText(before);
	await page.getByRole('button', { name: 'Show as table' }).click();
	await expect(page.getByRole('columnheader', { name: 'Total, km/s' })).toBeVisible();
});

test('two tabs on one galaxy lose nothing', async ({ page, context, signIn }) => {
	await signIn(page, producer);
	const address = await newGalaxy(page, 'Shared by two');
	const other = await context.newPage();
	await other.goto(address);
	await expect(other.getByRole('button', { name: 'Add a component' })).toBeEnabled();
	const sources = (tab: Page) => tab.getByLabel(/^Sources/);
	await sources(page).fill('As the first would have it.');
	await sources(page).blur();
	await saved(page);
	await sources(other).fill('As the second would have it.');
	const dialog = other.getByRole('dialog');
	await expect(dialog).toContainText('As the first would have it.');
	await expect(dialog).toContainText('As the second would have it.');
	await dialog.getByRole('button', { name: 'Keep mine as a copy' }).click();
	await expect(dialog).toBeHidden();
	await expect(sources(other)).toHaveValue('As the first would have it.');
	await page.goto('/galaxies?search=Shared by two (my');
	await page.getByRole('link', { name: /my version/ }).click();
	await expect(sources(page)).toHaveValue('As the second would have it.');
});

test('the shelf can be tried and copied; who may not edit can try too', async ({
	page,
	browser,
	signIn
}) => {
	await signIn(page, producer);
	await page.goto('/galaxies');
	await page.getByRole('link', { name: /^Milky Way/ }).click();
	await expect(page.getByText('All discs are razor-thin here.')).toBeVisible();
	await expect(page.getByRole('button', { name: 'Add a component' })).toBeEnabled();
	await row(page, 'Dark halo').getByRole('textbox', { name: 'Scale radius' }).fill('30');
	await expect(page.getByText('What you try here is not saved.')).toBeVisible();
	await page.getByRole('button', { name: 'Copy to our galaxies' }).click();
	await expect(page).toHaveURL(/\/galaxies\/[0-9a-f-]{36}$/);
	await expect(row(page, 'Dark halo').getByRole('textbox', { name: 'Scale radius' })).toHaveValue(
		'30'
	);

	const context = await browser.newContext();
	const theirs = await context.newPage();
	await signIn(theirs, adviser);
	await theirs.goto(page.url());
	await expect(theirs.getByText('Read only: producers tune galaxies.')).toBeVisible();
	await row(theirs, 'Dark halo').getByRole('textbox', { name: 'Scale radius' }).fill('40');
	await expect(theirs.getByText('What you try here is not saved.')).toBeVisible();
	await theirs.reload();
	await expect(row(theirs, 'Dark halo').getByRole('textbox', { name: 'Scale radius' })).toHaveValue(
		'30'
	);
	await context.close();
});

test('archiving a galaxy in use asks and names the shows; one not in use can be undone', async ({
	page,
	signIn
}) => {
	await signIn(page, producer);
	await page.goto('/galaxies');
	await page
		.getByRole('row', { name: /Harrow Wheel/ })
		.getByRole('button', { name: 'Archive' })
		.click();
	const dialog = page.getByRole('dialog');
	await expect(dialog).toContainText('The weight of the Wheel');
	await dialog.getByRole('button', { name: 'Keep as it is' }).click();
	await newGalaxy(page, 'Put away by test', 'Elliptical swarm of stars');
	await page.goto('/galaxies');
	await page.getByRole('button', { name: 'Archive “Put away by test”' }).click();
	await expect(page.getByRole('link', { name: 'Put away by test' })).toBeHidden();
	await page.getByRole('button', { name: 'Undo' }).click();
	await expect(page.getByRole('link', { name: 'Put away by test' })).toBeVisible();
});

test("another venue's galaxy is not found, and bad documents are refused as problem details", async ({
	page,
	browser,
	signIn
}) => {
	await signIn(page, producer);
	const address = await newGalaxy(page, 'Only ours too');
	const context = await browser.newContext();
	const theirs = await context.newPage();
	await signIn(theirs, stranger);
	expect((await theirs.goto(address))?.status()).toBe(404);
	await context.close();

	const put = (data: unknown) => page.request.put(`${address}/document`, { data });
	const malformed = await put('{"baseRevision": 1,');
	expect(malformed.status()).toBe(400);
	expect(malformed.headers()['content-type']).toContain('application/problem+json');
	const unknown = await put({ baseRevision: 1, document: { version: 1, odd: true } });
	expect(unknown.status()).toBe(400);
	expect(await unknown.text()).not.toContain('.ts:');
	expect((await put({ baseRevision: 1, document: 'x'.repeat(300_000) })).status()).toBe(413);
});

test('library and tuning page have no fault that a machine can find', async ({ page, signIn }) => {
	await signIn(page, producer);
	for (const address of ['/galaxies?new', '/galaxies']) {
		await page.goto(address);
		expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
	}
	await page.getByRole('link', { name: 'Harrow Wheel' }).click();
	await expect(page.locator('[data-painter]')).toBeVisible();
	await page.getByText('arms, dust, gas clouds, colours').click();
	expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
});
