import { expect, type Page } from '@playwright/test';
import { demoPassword } from '../../../src/local/demoPeople.js';

/** Signs a person in by the form and waits until the sign-in page is left. */
export async function signIn(page: Page, email: string, password = demoPassword): Promise<void> {
	await page.goto('/sign-in');
	await page.getByLabel('E-mail').fill(email);
	await page.getByLabel('Password', { exact: true }).fill(password);
	await page.getByRole('button', { name: 'Sign in', exact: true }).click();
	await expect(page).not.toHaveURL(/\/sign-in/);
}
