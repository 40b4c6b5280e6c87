import { existsSync, mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { endCommands, runCommand, tail } from './command.js';
import { inWords, oneCheck, sum } from './counts.js';
import { installDebianPackages } from './debian.js';
import { root } from './folders.js';
import { installPackages } from './install.js';
import { postgresFolders } from './postgresPrograms.js';
import { elapsed, withProgress } from './progress.js';
import { Refusal } from './refusal.js';
import { makeScratch, removeScratch, sweepScratch } from './scratch.js';
import { steps } from './testSteps.js';

/**
 * Runs every check on a machine that may have nothing but Node and npm, and closes with one line
 * `N passed, N failed`.
 *
 *   node src/local/test.js [--only unit,server] [part of a test file's name …]
 */

/** @type {(() => Promise<void>)[]} */
const toStop = [];
/** @type {Promise<void> | undefined} */
let cleaning;
/** Ends all that this run started. */
const cleanUp = () =>
	(cleaning ??= (async () => {
		await endCommands();
		for (const stop of toStop.reverse()) await stop();
	})());

for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
	process.on(signal, () => {
		console.log('\nStopping …');
		void cleanUp().then(() => process.exit(130));
	});
}

/** @param {string[]} args */
function readArguments(args) {
	/** @type {string[]} */
	const filters = [];
	let names = steps.map((step) => step.name);
	for (let i = 0; i < args.length; i++) {
		if (args[i] === '--only') names = (args[++i] ?? '').split(',');
		else filters.push(args[i]);
	}
	const unknown = names.filter((name) => !steps.some((step) => step.name === name));
	if (unknown.length > 0) {
		throw new Refusal(
			`There is no step ${unknown.join(', ')}. Steps: ${steps.map((step) => step.name).join(', ')}.`
		);
	}
	return { chosen: steps.filter((step) => names.includes(step.name)), filters };
}

/** What the checks need and a fresh machine lacks. */
async function prepare() {
	await installPackages(root);
	const missing = [];
	if (postgresFolders().length === 0) missing.push('postgresql');
	if (!existsSync(process.env.CHROMIUM_PATH ?? '/usr/bin/chromium')) missing.push('chromium');
	if (missing.length > 0) await installDebianPackages(missing, 'the tests');
	const sync = await runCommand(join(root, 'node_modules', '.bin', 'svelte-kit'), ['sync'], {
		cwd: root
	});
	if (sync.code !== 0) throw new Refusal(`svelte-kit sync failed:\n${tail(sync.output, 20)}`);
	await sweepScratch();
}

/**
 * @param {import('./testSteps.js').Step} step
 * @param {import('./testSteps.js').StepContext} context
 * @returns {Promise<import('./counts.js').Counts>}
 */
async function run(step, context) {
	const began = Date.now();
	const { counts, output } = await withProgress(step.name, () =>
		step.run(context).catch((error) => ({
			counts: oneCheck(false),
			output: error instanceof Refusal ? error.message : String(error?.stack ?? error)
		}))
	);
	writeFileSync(join(context.reports, `${step.name}.log`), output);
	if (counts.failed > 0) console.log(tail(output, 80));
	console.log(`${step.name}: ${inWords(counts)} (${elapsed(began)})`);
	return counts;
}

/** @type {import('./counts.js').Counts[]} */
const results = [];
const began = Date.now();
try {
	const { chosen, filters } = readArguments(process.argv.slice(2));
	await prepare();
	const scratch = makeScratch();
	toStop.push(() => removeScratch(scratch));
	const reports = join(root, 'test-results');
	mkdirSync(reports, { recursive: true });
	/** @param {() => Promise<void>} stop */
	const onStop = (stop) => toStop.push(stop);
	for (const step of chosen) {
		if (cleaning) break;
		const counts = await run(step, { scratch, reports, filters, onStop });
		results.push(counts);
		if (step.name === 'build' && counts.failed > 0 && chosen.some(({ name }) => name === 'e2e')) {
			console.log('e2e: 0 passed, 1 failed (not run, since there is no build)');
			results.push(oneCheck(false));
			break;
		}
	}
} catch (error) {
	console.error(error instanceof Refusal ? error.message : error);
	results.push(oneCheck(false));
}
await cleanUp();
const total = sum(results);
console.log(`All steps took ${elapsed(began)}.`);
console.log(inWords(total));
process.exitCode = total.failed > 0 ? 1 : 0;
