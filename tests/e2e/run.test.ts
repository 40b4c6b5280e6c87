import type { Page } from '@playwright/test';
import { TICKS_PER_SECOND, timeFromMyr } from '../../src/lib/units';
import { newDome, openScreen } from './support/domes';
import { numberOf, readingOf, watchStage, type Reading } from './support/stage';
import { expect, test } from './support/test';

const technician = 'technician@lanternhill.example.org';
const presenter = 'presenter@lanternhill.example.org';

/** The scene's own rate, million years a second, as kpc/(km/s) in one tick. */
const timeOfTick = timeFromMyr(4) / TICKS_PER_SECOND;

/** Between two moments the ring turned by no less than its slower and no more than its faster Ω. */
function expectSteady(a: Reading, b: Reading): void {
	const time = (b.tick - a.tick) * timeOfTick;
	const turned = b.phase - a.phase;
	const [slow, fast] = [Math.min(a.omega, b.omega), Math.max(a.omega, b.omega)];
	// A change that came late is put right from the moment at which it was due; nothing else is.
	const late = (b.late / 1000) * TICKS_PER_SECOND * timeOfTick * (fast - slow);
	const [least, most] = [slow * time - late, fast * time + late];
	expect(turned, `tick ${a.tick} to ${b.tick}: at least ${least}`).toBeGreaterThanOrEqual(
		least - 1e-6
	);
	expect(turned, `tick ${a.tick} to ${b.tick}: at most ${most}`).toBeLessThanOrEqual(most + 1e-6);
}

function expectNoJump(readings: Reading[]): void {
	expect(readings.length).toBeGreaterThan(5);
	for (let i = 1; i < readings.length; i++) expectSteady(readings[i - 1], readings[i]);
}

/** Jumps by the list of scenes, as a presenter would. */
async function jump(desk: Page, title: string): Promise<void> {
	await desk.getByRole('button', { name: 'Jump', exact: true }).click();
	await desk.getByRole('dialog').getByRole('button', { name: title }).click();
	await expect(desk.getByRole('heading', { level: 2, name: title })).toBeVisible();
}

test('a show runs on a paired screen from a console, live, through a reload, to its log', async ({
	browser,
	signIn
}) => {
	// Three browsers and a full film share the machine with the app and its database.
	test.slow();
	const pageOf = async () => (await browser.newContext()).newPage();
	const office = await pageOf();
	await signIn(office, technician);

	// A dome of its own, so that the test finds it free however often it runs.
	const domeName = `Test dome ${Date.now()}`;
	await newDome(office, domeName);

	// A second browser shows a code; a wrong one is refused, the right one pairs it.
	const dome = await pageOf();
	const code = await openScreen(dome);
	await office.getByLabel('Code').fill('AAA AAA');
	await office.getByLabel('Name of the screen').fill('Projector computer');
	await office.getByRole('button', { name: 'Pair', exact: true }).click();
	await expect(office.getByText(/\d tr(y|ies) left/)).toBeVisible();
	await office.getByLabel('Code').fill(code.toLowerCase());
	await office.getByRole('button', { name: 'Pair', exact: true }).click();
	await expect(office.getByText('Projector computer is paired')).toBeVisible();
	await expect(dome.getByRole('heading', { name: domeName })).toBeVisible();

	// The presenter starts the run; the screen loads it by itself.
	const desk = await pageOf();
	await signIn(desk, presenter);
	await desk.goto('/runs/new');
	// Other tests freeze editions of their own; this one wants the demo's.
	const edition = desk.getByRole('option', { name: 'The weight of the Wheel, edition 1' });
	await desk.getByLabel('Edition').selectOption(await edition.first().getAttribute('value'));
	await desk.getByLabel('Dome').selectOption({ label: domeName });
	await expect(desk.getByText('In touch: Projector computer')).toBeVisible();
	await desk.getByRole('button', { name: 'Open the console' }).click();
	await expect(dome.getByText('waits for the console')).toBeVisible();
	await desk.getByRole('button', { name: 'Begin the show' }).click();
	const stage = dome.locator('[data-stage]');
	await expect(stage).toHaveAttribute('data-status', 'running');
	const firstScene = await stage.getAttribute('data-scene');
	await desk.getByRole('button', { name: /^Next: / }).click();
	await expect(stage).not.toHaveAttribute('data-scene', firstScene ?? '');

	// A live control: stars change their speed and not their place.
	await jump(desk, 'What the halo adds');
	const halo = desk.getByRole('slider', { name: 'Halo' });
	await expect(halo).toBeEnabled();
	await expect.poll(() => numberOf(stage, 'ring-omega')).toBeGreaterThan(0);
	const readings = await watchStage(dome);
	const rest = await numberOf(stage, 'ring-omega');
	for (let i = 0; i < 10; i++) await halo.press('ArrowRight');
	await halo.press('End');
	await expect.poll(() => numberOf(stage, 'ring-omega')).toBeGreaterThan(rest * 1.02);
	await dome.waitForTimeout(1000);
	for (let i = 0; i < 10; i++) await halo.press('ArrowLeft');
	await halo.press('Home');
	await expect.poll(() => numberOf(stage, 'ring-omega')).toBeLessThan(rest * 0.99);
	await dome.waitForTimeout(1000);
	await desk
		.getByRole('button', { name: /^Back to rest/ })
		.first()
		.click();
	await expect.poll(() => numberOf(stage, 'ring-omega')).toBe(rest);
	await dome.waitForTimeout(1000);
	expectNoJump(await readings());

	// A reload in mid-scene comes back to the moment it would have reached, as if nothing had been.
	const before = await readingOf(stage);
	await dome.reload();
	await expect(stage).toHaveAttribute('data-status', 'running');
	await expect.poll(() => numberOf(stage, 'tick')).toBeGreaterThan(before.tick);
	const after = await readingOf(stage);
	expectSteady(before, after);

	// The rest picture and back, by a single key.
	await desk.keyboard.press('r');
	await expect(desk.getByText('Rest picture is on')).toBeVisible();
	await desk.keyboard.press('r');
	await expect(desk.getByText('Running', { exact: true })).toBeVisible();

	await desk.getByRole('button', { name: 'End', exact: true }).click();
	await desk.getByRole('dialog').getByRole('button', { name: 'End the show' }).click();
	await expect(stage).toHaveAttribute('data-status', 'ended');

	await desk.getByRole('link', { name: 'Write the log' }).click();
	await expect(desk.getByRole('heading', { level: 1, name: /^Run of / })).toBeVisible();
	await expect(desk.getByRole('cell', { name: /What the halo adds/ })).toBeVisible();
	await expect(desk.getByRole('cell', { name: /^Halo set to / }).first()).toBeVisible();
	await desk.getByLabel('Head-count').fill('57');
	await desk.getByLabel('Remarks').fill('One late coach.');
	await desk.getByRole('button', { name: 'Save the log' }).click();
	await expect(desk.getByText('The log is saved')).toBeVisible();
	await desk.reload();
	await expect(desk.getByLabel('Head-count')).toHaveValue('57');
});
