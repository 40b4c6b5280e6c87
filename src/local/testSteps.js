import { join } from 'node:path';
import { rmSync } from 'node:fs';
import { buildApp } from './build.js';
import { runCommand } from './command.js';
import { oneCheck, playwrightCounts, vitestCounts } from './counts.js';
import { root } from './folders.js';
import { startCluster } from './postgres.js';
import { Refusal } from './refusal.js';
import { startTestedApp } from './testedApp.js';

/**
 * @typedef {{ counts: import('./counts.js').Counts, output: string }} StepResult
 * @typedef {{ scratch: string, reports: string, filters: string[], onStop: (stop: () => Promise<void>) => void }} StepContext
 *   filters: parts of test file names, to run only those
 * @typedef {{ name: string, run: (context: StepContext) => Promise<StepResult> }} Step
 */

/** Longer than any step takes; a step that hangs is ended. Milliseconds. */
const patience = 25 * 60_000;

/** @param {string} name @param {string[]} args @param {NodeJS.ProcessEnv} [env] */
const tool = (name, args, env = {}) =>
	runCommand(join(root, 'node_modules', '.bin', name), args, {
		cwd: root,
		env: { ...process.env, NO_COLOR: '1', FORCE_COLOR: '0', ...env },
		patience
	});

/** @param {[string, string[]][]} commands @returns {Promise<StepResult>} one check of them all */
async function check(commands) {
	let output = '';
	let good = true;
	for (const [name, args] of commands) {
		const result = await tool(name, args);
		good &&= result.code === 0;
		if (result.code !== 0) output += result.output;
	}
	return { counts: oneCheck(good), output };
}

/** @param {string} project @param {StepContext} context @param {NodeJS.ProcessEnv} [env] @returns {Promise<StepResult>} */
async function vitest(project, { reports, filters }, env) {
	const file = join(reports, `${project}.json`);
	rmSync(file, { force: true });
	const { code, output } = await tool(
		'vitest',
		['run', '--project', project, '--reporter=default', '--reporter=json'].concat([
			`--outputFile.json=${file}`,
			...filters
		]),
		env
	);
	return { counts: vitestCounts(file, code), output };
}

/** Settings that give up safety for speed: the cluster is thrown away. */
const throwAway = ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off'];

/** @type {Step[]} */
export const steps = [
	{
		name: 'lint',
		run: () =>
			check([
				['prettier', ['--check', '--log-level=warn', '.']],
				['eslint', ['-c', '.config/eslint.config.js', '--max-warnings=0', '.']]
			])
	},
	{
		name: 'types',
		run: () => check([['svelte-check', ['--tsconfig', './tsconfig.json', '--fail-on-warnings']]])
	},
	{ name: 'unit', run: (context) => vitest('unit', context) },
	{
		name: 'server',
		async run(context) {
			const cluster = await startCluster({
				dataFolder: join(context.scratch, 'server'),
				settings: [...throwAway, 'max_connections=300']
			});
			return vitest('server', context, { TEST_DATABASE_URL: cluster.url('postgres') });
		}
	},
	{ name: 'component', run: (context) => vitest('component', context) },
	{
		name: 'build',
		async run() {
			try {
				await buildApp(root);
				return { counts: oneCheck(true), output: '' };
			} catch (error) {
				if (!(error instanceof Refusal)) throw error;
				return { counts: oneCheck(false), output: error.message };
			}
		}
	},
	{
		name: 'e2e',
		async run({ scratch, reports, filters, onStop }) {
			const app = await startTestedApp(join(scratch, 'e2e'));
			onStop(app.stop);
			if (!app.env) return { counts: oneCheck(false), output: app.output() };
			const file = join(reports, 'e2e.json');
			rmSync(file, { force: true });
			const { code, output } = await tool(
				'playwright',
				['test', '--config', 'tests/e2e/playwright.config.ts', ...filters],
				{ ...app.env, FARWHEEL_TEST_REPORT: file }
			);
			await app.stop();
			return {
				counts: playwrightCounts(file, code),
				output: `${output}\nThe app said:\n${app.output().split('\n').slice(-25).join('\n')}`
			};
		}
	}
];
