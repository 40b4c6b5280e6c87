import type { Page } from '@playwright/test';
import { addScene, newShow, saved } from './support/composer';
import { expect, test } from './support/test';

const producer = 'producer@lanternhill.example.org';
const stranger = 'producer@saltmarsh.example.org';

const scenes = (page: Page) => page.getByRole('article');
test('two scenes are composed, undone, moved by keyboard, and stand after a reload', async ({
	page,
	signIn
}) => {
	await signIn(page, producer);
	await newShow(page, 'Composed by test');
	await addScene(page, 1, 'First light', 'Out there it is {speed at 30 kly}.');
	await addScene(page, 2, 'Second thoughts', 'And {mass inside 30 kly} pulls.');
	await expect(scenes(page)).toHaveCount(2);
	await expect(scenes(page).first().getByLabel('Figures')).toContainText('km/s');
	await expect(scenes(page).nth(1).getByLabel('Figures')).toContainText('Suns');

	// A number out of range stays at its field and is not saved.
	const distance = scenes(page).nth(1).getByRole('textbox', { name: 'Distance' });
	await distance.fill('4000');
	await expect(scenes(page).nth(1).getByText('Type a number from 5 to 400 kpc.')).toBeVisible();
	await distance.fill('80');

	await page.getByRole('button', { name: 'Delete' }).first().click();
	await expect(scenes(page)).toHaveCount(1);
	await page.keyboard.press('Control+z');
	await expect(scenes(page)).toHaveCount(2);
	await expect(page.getByLabel('Title of scene 1')).toHaveValue('First light');

	await page.getByLabel('Title of scene 2').press('Alt+ArrowUp');
	await expect(page.getByLabel('Title of scene 1')).toHaveValue('Second thoughts');
	await expect(page.getByLabel('Title of scene 1')).toBeFocused();

	await saved(page);
	await page.reload();
	await expect(page.getByLabel('Title of scene 1')).toHaveValue('Second thoughts');
	await expect(page.getByLabel('Script of scene 2')).toHaveValue(
		'Out there it is {speed at 30 kly}.'
	);
});

test('two tabs in one show lose nothing', async ({ page, context, signIn }) => {
	await signIn(page, producer);
	const address = await newShow(page, 'Written by two');
	await addScene(page, 1, 'Opening', 'As it was.');
	await saved(page);
	const other = await context.newPage();
	await other.goto(address);
	await expect(other.getByLabel('Script of scene 1')).toHaveValue('As it was.');

	await page.getByLabel('Script of scene 1').fill('As the first would have it.');
	await page.getByLabel('Script of scene 1').blur();
	await saved(page);
	await other.getByLabel('Script of scene 1').fill('As the second would have it.');
	const dialog = other.getByRole('dialog');
	await expect(dialog).toContainText('Nothing is lost');
	await dialog.getByText('script differs').click();
	await expect(dialog).toContainText('As the first would have it.');
	await expect(dialog).toContainText('As the second would have it.');
	await dialog.getByRole('button', { name: 'Keep mine', exact: true }).click();
	await expect(dialog).toBeHidden();
	await saved(other);

	await page.reload();
	await expect(page.getByLabel('Script of scene 1')).toHaveValue('As the second would have it.');
	await page.goto('/shows?search=Written by two');
	// The newest comes first; an earlier run may have left its own.
	await page
		.getByRole('link', { name: /^Written by two \(/ })
		.first()
		.click();
	await expect(page.getByLabel('Script of scene 1')).toHaveValue('As the first would have it.');
});

test('work written without a connection is kept and offered back', async ({
	page,
	context,
	signIn
}) => {
	await signIn(page, producer);
	const address = await newShow(page, 'Written offline');
	await addScene(page, 1, 'Tunnel', 'Before the tunnel.');
	await saved(page);
	await context.setOffline(true);
	await page.getByLabel('Script of scene 1').fill('Inside the tunnel.');
	await expect(page.getByText('not saved: The server cannot be reached.')).toBeVisible();
	await page.close({ runBeforeUnload: false });
	await context.setOffline(false);

	const later = await context.newPage();
	await later.goto(address);
	await expect(later.getByLabel('Script of scene 1')).toHaveValue('Before the tunnel.');
	await later.getByRole('button', { name: 'Bring it back' }).click();
	await expect(later.getByLabel('Script of scene 1')).toHaveValue('Inside the tunnel.');
	await saved(later);
	await later.reload();
	await expect(later.getByLabel('Script of scene 1')).toHaveValue('Inside the tunnel.');
});

test('a broken scene keeps a show from being frozen; a whole one becomes edition 1', async ({
	page,
	signIn
}) => {
	await signIn(page, producer);
	await newShow(page, 'Frozen by test');
	await addScene(page, 1, 'Broken', 'It is {speed at noon}.');
	await page.getByRole('button', { name: 'Freeze edition 1' }).click();
	const dialog = page.getByRole('dialog');
	await expect(dialog).toContainText('{speed at noon} in the script cannot be computed');
	await dialog.getByRole('button', { name: '1 Broken' }).click();
	await page.getByLabel('Script of scene 1').fill('It is {speed at 30 kly}.');
	await page.getByRole('button', { name: 'Freeze edition 1' }).click();
	await dialog.getByLabel(/Note/).fill('First.');
	await dialog.getByRole('button', { name: 'Freeze edition 1' }).click();
	await dialog.getByRole('link', { name: 'Open edition 1' }).click();
	await expect(page.getByRole('heading', { level: 1 })).toHaveText('Frozen by test, edition 1');
	await expect(page.getByText(/^[0-9a-f]{64}$/)).toBeVisible();
});

test("another venue's show is not found, and a stranger's document is refused as problem details", async ({
	page,
	browser,
	signIn
}) => {
	await signIn(page, producer);
	const address = await newShow(page, 'Only ours');
	const context = await browser.newContext();
	const theirs = await context.newPage();
	await signIn(theirs, stranger);
	const answer = await theirs.goto(address);
	expect(answer?.status()).toBe(404);

	const put = (data: unknown) => page.request.put(`${address}/document`, { data });
	const malformed = await put('{"baseRevision": 1,');
	expect(malformed.status()).toBe(400);
	expect(malformed.headers()['content-type']).toContain('application/problem+json');
	const unknown = await put({ baseRevision: 1, document: { version: 1, odd: true } });
	expect(unknown.status()).toBe(400);
	expect(await unknown.text()).not.toContain('.ts:');
	const large = await put({ baseRevision: 1, document: 'x'.repeat(1_200_000) });
	expect(large.status()).toBe(413);
	await context.close();
});
