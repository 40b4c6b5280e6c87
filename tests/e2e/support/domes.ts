import { expect, type Page } from '@playwright/test';

/** Makes a dome, so that a test finds it free however often it runs, and stays on its page. */
export async function newDome(page: Page, name: string): Promise<void> {
	await page.goto('/domes/new');
	await page.getByLabel('Name').fill(name);
	await page.getByLabel('Film size').selectOption('1024');
	await page.getByLabel('Star painter').selectOption('plain');
	await page.getByRole('button', { name: 'Make the dome' }).click();
	await expect(page.getByRole('heading', { level: 1, name })).toBeVisible();
}

/** Opens the dome's own page in a browser that is paired with no dome. @returns the code it shows */
export async function openScreen(dome: Page): Promise<string> {
	// It asks before it is left in the middle of a show.
	dome.on('dialog', (dialog) => void dialog.accept());
	await dome.goto('/dome');
	const code = (await dome.locator('[data-pairing-code]').getAttribute('data-pairing-code')) ?? '';
	expect(code).toMatch(/^[CDFGHJKMNPQRTWXY34679]{6}$/);
	return code;
}
