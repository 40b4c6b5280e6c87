import { addScene, newShow, saved } from './support/composer';
import { expectOneBend, expectOneLine } from './support/continuity';
import { newDome, openScreen } from './support/domes';
import { expectedOmega } from './support/expectedOmega';
import { drawnOver, numberOf, readingOf, starlight, watchStage } from './support/stage';
import { expect, test } from './support/test';

const address = (role: string) => `${role}@lanternhill.example.org`;
/** Million years a second. */
const rate = 4;

// What a person would wait for no longer fails where it stands, not at the end of the whole job.
test.use({ actionTimeout: 20_000 });

test('the whole job: a galaxy is tuned, a show made of it, frozen, and run live to its log', async ({
	browser,
	signIn
}) => {
	test.slow();
	const pageOf = async () => (await browser.newContext()).newPage();
	const stamp = Date.now();
	const [title, domeName, galaxyName] = ['Whole job', 'Job dome', 'Heavier wheel'].map(
		(name) => `${name} ${stamp}`
	);
	const office = await pageOf();
	let density = 0;

	await test.step('the producer signs in, copies a galaxy and tunes its halo', async () => {
		await signIn(office, address('producer'));
		await office.goto('/galaxies');
		await office.getByRole('link', { name: 'Harrow Wheel', exact: true }).click();
		await office.getByRole('button', { name: 'Make a copy' }).click();
		await office.getByLabel('Name', { exact: true }).fill(galaxyName);
		await expect(office.getByRole('heading', { level: 1, name: galaxyName })).toBeVisible();
		const speed = office.locator('[data-read-out=speed] .exact');
		const curve = office.locator('[data-curve="+total"]');
		const before = { speed: await speed.innerText(), curve: await curve.getAttribute('d') };
		const halo = office.locator('[data-component=halo]');
		const slider = halo.getByLabel('Density, slider');
		await slider.focus();
		for (let i = 0; i < 20; i++) await slider.press('ArrowRight');
		expect(Number.parseFloat(await speed.innerText())).toBeGreaterThan(
			Number.parseFloat(before.speed) + 5
		);
		expect(await curve.getAttribute('d')).not.toBe(before.curve);
		await saved(office);
		// What the field shows is rounded; a number typed is exact.
		await halo.getByRole('textbox', { name: 'Density' }).fill('2e7');
		density = 2e7;
		await saved(office);
	});

	await test.step('two scenes are composed', async () => {
		await newShow(office, title);
		const scene = (n: number) => office.getByRole('article').nth(n - 1);
		const tab = (name: string) => office.getByRole('tab', { name }).click();

		await addScene(office, 1, 'First light', 'Out there stars do {speed at 30 kly}.');
		await scene(1).getByLabel('Galaxy', { exact: true }).selectOption('Harrow Wheel');
		await expect(scene(1).getByLabel('Figures')).toContainText('km/s');
		await tab('Motion');
		await scene(1).getByRole('textbox', { name: 'Passing time' }).fill(String(rate));
		await tab('Drawings');
		await scene(1).getByLabel('Speed chart').check();
		await tab('Live controls');
		await scene(1).getByRole('button', { name: 'Add a live control' }).click();
		await scene(1).getByLabel('Moves').selectOption('Halo');
		await scene(1).getByLabel('Name on the console').fill('Weight of the halo');
		await scene(1).getByRole('textbox', { name: 'From' }).fill('0');
		await scene(1).getByRole('textbox', { name: 'To' }).fill('2');
		await scene(1).getByRole('textbox', { name: 'Rests at' }).fill('1');

		await addScene(office, 2, 'A heavier wheel', 'With more halo: {speed at 30 kly}.');
		await tab('Picture');
		await scene(2).getByLabel('Galaxy', { exact: true }).selectOption(galaxyName);
		await tab('Drawings');
		await scene(2).getByLabel('Speed chart').check();
		await saved(office);
		const figure = async (n: number) =>
			Number(/([\d.]+) km\/s/.exec(await scene(n).getByLabel('Figures').innerText())?.[1]);
		expect(await figure(2)).toBeGreaterThan((await figure(1)) + 5);
	});

	await test.step('it is previewed, and the page says which painter paints', async () => {
		await office.getByRole('link', { name: 'Preview' }).click();
		const film = office.getByRole('img', { name: 'The dome in “First light”' });
		await expect(film).toHaveAttribute('data-painter', /^(plain|webgl)$/);
		await expect(office.getByText(/^(The|This browser) .*painter/)).toBeVisible();
		const moment = office.getByRole('slider', { name: 'Moment of the show' });
		await office.getByRole('button', { name: 'Play', exact: true }).click();
		await expect.poll(async () => Number(await moment.inputValue())).toBeGreaterThan(0.5);
		await office.getByRole('button', { name: 'Hold', exact: true }).click();
		await office.getByRole('button', { name: 'Next scene' }).click();
		await expect(office.getByRole('heading', { name: /A heavier wheel/ })).toBeVisible();
		await office.getByRole('link', { name: 'Back to the show' }).click();
	});

	await test.step('edition 1 is frozen', async () => {
		await office.getByRole('button', { name: 'Freeze edition 1' }).click();
		const dialog = office.getByRole('dialog');
		await dialog.getByRole('button', { name: 'Freeze edition 1' }).click();
		await dialog.getByRole('link', { name: 'Open edition 1' }).click();
		await expect(office.getByRole('heading', { level: 1 })).toHaveText(`${title}, edition 1`);
	});

	const [dome, technician] = [await pageOf(), await pageOf()];
	await test.step('a technician pairs a screen with a dome', async () => {
		await signIn(technician, address('technician'));
		await newDome(technician, domeName);
		await technician.getByLabel('Code').fill(await openScreen(dome));
		await technician.getByLabel('Name of the screen').fill('Job screen');
		await technician.getByRole('button', { name: 'Pair', exact: true }).click();
		await expect(dome.getByRole('heading', { name: domeName })).toBeVisible();
	});

	const [desk, second] = [await pageOf(), await pageOf()];
	const stage = dome.locator('[data-stage]');
	const halo = desk.getByRole('slider', { name: 'Weight of the halo' });
	await test.step('the presenter starts the run; a manager opens a second console', async () => {
		await signIn(desk, address('presenter'));
		await desk.goto('/runs/new');
		const edition = desk.getByRole('option', { name: `${title}, edition 1` });
		await desk.getByLabel('Edition').selectOption(await edition.getAttribute('value'));
		await desk.getByLabel('Dome').selectOption({ label: domeName });
		await expect(desk.getByText('In touch: Job screen')).toBeVisible();
		await desk.getByRole('button', { name: 'Open the console' }).click();
		await expect(dome.getByText('waits for the console')).toBeVisible();
		await signIn(second, address('manager'));
		await second.goto(desk.url());
		await desk.getByRole('button', { name: 'Begin the show' }).click();
		await expect(stage).toHaveAttribute('data-status', 'running');
		await expect(desk.getByRole('heading', { level: 2, name: 'First light' })).toBeVisible();
		await expect.poll(() => starlight(stage)).toBeGreaterThan(100);
	});

	const firstScene = (await stage.getAttribute('data-scene')) ?? '';
	await test.step('tuned live, stars change their speed and not their place', async () => {
		const readings = await watchStage(dome);
		const rest = await numberOf(stage, 'ring-omega');
		expect(rest / expectedOmega({}) - 1).toBeCloseTo(0, 8);
		// Let the scene come on wholly: until then its drawings change by themselves.
		await expect.poll(async () => (await readings()).length).toBeGreaterThan(16);
		const words = desk.locator('.figure');
		const [chart, figure] = [await drawnOver(stage), await words.innerText()];
		expect(await drawnOver(stage)).toBe(chart);
		await halo.press('End');
		const tuned = expectedOmega({ factor: 2 });
		expect(tuned).toBeGreaterThan(rest * 1.1);
		await expect
			.poll(async () => (await readings()).filter((r) => r.omega !== rest).length)
			.toBeGreaterThan(6);
		const seen = await readings();
		const [before, after] = [true, false].map((at) =>
			seen.filter((r) => (r.omega === rest) === at)
		);
		expect(after[0].omega / tuned - 1).toBeCloseTo(0, 8);
		expectOneBend(before, after, rate);
		expect(await drawnOver(stage)).not.toBe(chart);
		await expect(words).not.toHaveText(figure);
	});

	await test.step('the second console sees the change and who made it', async () => {
		await expect(second.getByRole('slider', { name: 'Weight of the halo' })).toHaveValue('2');
		await expect(second.getByText('Weight of the halo 2 (Petra Lindqvist).')).toBeVisible();
	});

	await test.step('on to the second scene, and the dome is reloaded in the middle of it', async () => {
		await desk.getByRole('button', { name: 'Next: A heavier wheel' }).click();
		await expect(stage).not.toHaveAttribute('data-scene', firstScene);
		await expect(second.getByRole('heading', { level: 2, name: 'A heavier wheel' })).toBeVisible();
		await expect
			.poll(() => numberOf(stage, 'ring-omega'))
			.toBeCloseTo(expectedOmega({ density }), 6);
		const scene = (await stage.getAttribute('data-scene')) ?? '';
		const before = await readingOf(stage);
		await dome.reload();
		await expect(stage).toHaveAttribute('data-scene', scene);
		await expect(stage).toHaveAttribute('data-status', 'running');
		await expect.poll(() => numberOf(stage, 'tick')).toBeGreaterThan(before.tick);
		expectOneLine([before, await readingOf(stage)], rate);
		await expect.poll(() => starlight(stage)).toBeGreaterThan(100);
	});

	await test.step('the show ends, and the log says what happened', async () => {
		await desk.getByRole('button', { name: 'End the show' }).click();
		await desk.getByRole('dialog').getByRole('button', { name: 'End the show' }).click();
		await expect(stage).toHaveAttribute('data-status', 'ended');
		await desk.getByRole('link', { name: 'Write the log' }).click();
		await expect(desk.getByRole('heading', { level: 1, name: `Run of ${title}` })).toBeVisible();
		await expect(desk.getByRole('cell', { name: '1. First light' })).toBeVisible();
		await expect(desk.getByRole('cell', { name: 'Weight of the halo set to 2' })).toBeVisible();
		await expect(desk.getByRole('cell', { name: '2. A heavier wheel' })).toBeVisible();
	});
	await Promise.all([office, dome, technician, desk, second].map((page) => page.context().close()));
});
