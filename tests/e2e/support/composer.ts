import { expect, type Page } from '@playwright/test';

/** Makes a show and waits until its composer answers. @returns its address */
export async function newShow(page: Page, title: string): Promise<string> {
	await page.goto('/shows?new');
	await page.getByLabel('Title of the new show').fill(title);
	await page.getByRole('button', { name: 'Make the show' }).click();
	await expect(page.getByRole('heading', { level: 1, name: title })).toBeVisible();
	return page.url();
}

/** Adds a scene at the end and writes it. @param number the one it gets, counted from 1 */
export async function addScene(page: Page, number: number, title: string, script: string) {
	await page.getByRole('button', { name: 'Add a scene' }).click();
	await page.getByLabel(`Title of scene ${number}`).fill(title);
	await page.getByLabel(`Script of scene ${number}`).fill(script);
}

/** Waits until the page says that everything is saved. */
export const saved = (page: Page) => expect(page.locator('[data-save=saved]')).toBeVisible();
