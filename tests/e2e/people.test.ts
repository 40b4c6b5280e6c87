import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { demoPassword } from '../../src/local/demoPeople.js';
import { expect, test } from './support/test';

const manager = 'manager@lanternhill.example.org';
const password = 'seven quiet herons fishing';

/** An address nobody has used, also where the tests run twice on one database. */
const newAddress = (name: string) => `${name}-${Date.now()}@example.org`;

async function invite(page: Page, email: string, role: string): Promise<void> {
	await page.goto('/people');
	await page.getByRole('link', { name: 'Invite somebody' }).click();
	await page.getByLabel('E-mail of the person to invite').fill(email);
	await page.getByRole('checkbox', { name: role }).check();
	await page.getByRole('button', { name: 'Send invitation' }).click();
	await expect(page.getByText(`An invitation is on its way to ${email}`)).toBeVisible();
}

test('a page behind sign-in asks for it and then goes on there', async ({ page }) => {
	await page.goto('/account');
	await expect(page).toHaveURL(/\/sign-in\?next=%2Faccount/);
	await page.getByLabel('E-mail').fill(manager);
	await page.getByLabel('Password', { exact: true }).fill(demoPassword);
	await page.getByRole('button', { name: 'Sign in', exact: true }).click();
	await expect(page).toHaveURL(/\/account$/);
	await expect(page.getByText('Lantern Hill Science Centre')).toBeVisible();
});

test('a wrong password is refused in the same words as an unknown e-mail', async ({ page }) => {
	const said: string[] = [];
	for (const email of [manager, newAddress('nobody')]) {
		await page.goto('/sign-in');
		await page.getByLabel('E-mail').fill(email);
		await page.getByLabel('Password', { exact: true }).fill('not the password at all');
		await page.getByRole('button', { name: 'Sign in', exact: true }).click();
		const problem = page.getByText('do not go together');
		await expect(problem).toBeVisible();
		await expect(page.getByLabel('Password', { exact: true })).toHaveValue('');
		said.push(await problem.innerText());
	}
	expect(said[0]).toBe(said[1]);
});

test('an API without a session answers problem details and no page', async ({ request }) => {
	const answer = await request.get('/api/runs/00000000-0000-4000-8000-000000000000/events');
	expect(answer.status()).toBe(401);
	expect(answer.headers()['content-type']).toContain('application/problem+json');
	expect(await answer.json()).toMatchObject({ status: 401, title: 'Sign in first' });
});

test('an invited person joins by the link in the mail, once', async ({
	page,
	browser,
	mail,
	signIn
}) => {
	const email = newAddress('nova');
	const since = new Date(Date.now() - 1000);
	await signIn(page, manager);
	await invite(page, email, 'Presenter');
	await expect(page.getByRole('cell', { name: email })).toBeVisible();

	const link = mail.linkIn(await mail.next(email, { since, subject: /Join Lantern Hill/ }));
	const theirs = await (await browser.newContext()).newPage();
	await theirs.goto(link);
	await theirs.getByLabel('Your name').fill('Nova Carrick');
	await theirs.getByLabel('Password', { exact: true }).fill('passwordpassword1');
	await theirs.getByRole('button', { name: 'Join the venue' }).click();
	await expect(theirs.getByText('made of common passwords')).toBeVisible();
	await theirs.getByLabel('Password', { exact: true }).fill(password);
	await theirs.getByRole('button', { name: 'Join the venue' }).click();
	// Who only presents starts at the runs.
	await expect(theirs).toHaveURL(/\/runs$/);
	await expect(theirs.getByRole('link', { name: 'People', exact: true })).toHaveCount(0);
	expect((await theirs.goto('/people'))?.status()).toBe(403);
	await theirs.goto(link);
	await expect(theirs.getByRole('heading', { name: 'This invitation is over' })).toBeVisible();

	// Disabled, the person is out with the next request.
	await page.goto('/people');
	const row = page.getByRole('row', { name: /Nova Carrick/ }).filter({ hasText: email });
	await row.getByRole('button', { name: 'Disable' }).click();
	await page.getByRole('dialog').getByRole('button', { name: 'Disable' }).click();
	await expect(page.getByText('The person is out and cannot sign in.')).toBeVisible();
	await theirs.goto('/shows');
	await expect(theirs).toHaveURL(/\/sign-in/);
	await theirs.context().close();
});

test('a forgotten password is replaced by a link that ends every session', async ({
	page,
	browser,
	mail,
	signIn
}) => {
	const email = newAddress('orla');
	const since = new Date(Date.now() - 1000);
	await signIn(page, manager);
	await invite(page, email, 'Adviser');
	const theirs = await (await browser.newContext()).newPage();
	await theirs.goto(mail.linkIn(await mail.next(email, { since })));
	await theirs.getByLabel('Your name').fill('Orla Finch');
	await theirs.getByLabel('Password', { exact: true }).fill(password);
	await theirs.getByRole('button', { name: 'Join the venue' }).click();
	await expect(theirs).toHaveURL(/\/shows$/);

	const other = await (await browser.newContext()).newPage();
	await other.goto('/forgot');
	await other.getByLabel('E-mail').fill(email);
	await other.getByRole('button', { name: 'Mail me a link' }).click();
	await expect(other.getByText('a link is on its way')).toBeVisible();
	const link = mail.linkIn(await mail.next(email, { subject: /new password/ }));
	await other.goto(link);
	await other.getByLabel('New password', { exact: true }).fill('nine slow barges at dusk');
	await other.getByRole('button', { name: 'Save the new password' }).click();
	await expect(other.getByText('Your password is changed')).toBeVisible();
	await theirs.goto('/shows');
	await expect(theirs).toHaveURL(/\/sign-in/);
	await signIn(other, email, 'nine slow barges at dusk');
	await other.goto(link);
	await expect(other.getByRole('heading', { name: 'This link is over' })).toBeVisible();
	await theirs.context().close();
	await other.context().close();
});

test('a sign-in link by mail works once, after a press', async ({ page, browser, mail }) => {
	const email = 'technician@lanternhill.example.org';
	const since = new Date(Date.now() - 1000);
	await page.goto('/sign-in');
	await page.getByLabel('E-mail').fill(email);
	await page.getByRole('button', { name: 'Mail me a link instead' }).click();
	await expect(page.getByText('a link is on its way')).toBeVisible();
	const link = mail.linkIn(await mail.next(email, { since, subject: /Sign in/ }));
	await page.goto(link);
	await page.getByRole('button', { name: 'Sign in', exact: true }).click();
	await expect(page).toHaveURL(/\/shows$/);
	await expect(page.getByRole('link', { name: 'Tomas Ashby' })).toBeVisible();

	const late = await (await browser.newContext()).newPage();
	await late.goto(link);
	await late.getByRole('button', { name: 'Sign in', exact: true }).click();
	await expect(late.getByText('This link was used')).toBeVisible();
	await late.context().close();
});

test('the account page lists sessions and ends another one', async ({ page, browser, signIn }) => {
	const email = 'adviser@lanternhill.example.org';
	await signIn(page, email);
	const second = await (await browser.newContext()).newPage();
	await signIn(second, email);
	await page.goto('/account');
	await page.getByRole('button', { name: 'End all other sessions' }).click();
	await expect(page.getByText(/sessions? (is|are) ended/)).toBeVisible();
	await second.goto('/shows');
	await expect(second).toHaveURL(/\/sign-in/);
	await page.goto('/shows');
	await expect(page).toHaveURL(/\/shows$/);
	await page.getByRole('button', { name: 'Sign out' }).click();
	await expect(page).toHaveURL(/\/sign-in/);
	await second.context().close();
});

test('an unknown address helps on', async ({ page, signIn }) => {
	await signIn(page, manager);
	const answer = await page.goto('/no/such/place');
	expect(answer?.status()).toBe(404);
	await expect(page.getByRole('heading', { name: 'There is nothing here' })).toBeVisible();
	await page.getByRole('link', { name: 'Go to shows' }).click();
	await expect(page).toHaveURL(/\/shows$/);
});

for (const colorScheme of ['light', 'dark'] as const) {
	test(`doors, people and account have no fault that a machine can find, ${colorScheme}`, async ({
		page,
		signIn
	}) => {
		await page.emulateMedia({ colorScheme });
		const check = async (address: string) => {
			await page.goto(address);
			const { violations } = await new AxeBuilder({ page }).analyze();
			expect(violations, address).toEqual([]);
			await page.setViewportSize({ width: 320, height: 640 });
			const tooWide = await page.evaluate(
				() => document.documentElement.scrollWidth - window.innerWidth
			);
			expect(tooWide, `${address} at 320 pixels`).toBeLessThanOrEqual(0);
			await page.setViewportSize({ width: 1280, height: 720 });
		};
		for (const address of ['/sign-in', '/forgot', '/join/none', '/reset/none']) {
			await check(address);
		}
		await signIn(page, manager);
		for (const address of ['/people?invite', '/account', '/no/such/place']) await check(address);
		await page.goto('/people');
		await page.getByRole('button', { name: 'Change roles' }).first().click();
		expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
	});
}
