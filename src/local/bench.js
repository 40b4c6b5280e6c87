import { execFile } from 'node:child_process';
import { cpus, loadavg } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';

/**
 * Prints measured figures and ratios: the plain painter, the one-pass WebGL painter and the usual
 * cube-camera fisheye on one film with the same stars; full retunes, fits, and reading a large table.
 *
 *   node src/local/bench.js
 */

const film = 2048;
const stars = 100_000;
const root = join(dirname(fileURLToPath(import.meta.url)), '../..');
const chromium = process.env.CHROMIUM_PATH ?? '/usr/bin/chromium';

/** @param {number} value */
const ms = (value) => `${value.toFixed(value < 1 ? 2 : 1).padStart(8)} ms`;

async function inNode() {
	const { stdout } = await promisify(execFile)(
		process.execPath,
		['--import', 'tsx', 'src/local/bench/inNode.ts', String(film), String(stars)],
		{ cwd: root }
	);
	return JSON.parse(stdout);
}

async function inBrowser() {
	const [{ createServer }, { chromium: browserType }] = await Promise.all([
		import('vite'),
		import('playwright')
	]);
	const server = await createServer({
		configFile: false,
		root,
		logLevel: 'error',
		cacheDir: join(root, 'node_modules/.vite-bench'),
		resolve: { alias: { $lib: join(root, 'src/lib') } },
		server: { host: '127.0.0.1', port: 0 },
		optimizeDeps: { include: ['three'] }
	});
	await server.listen();
	const browser = await browserType.launch({
		executablePath: chromium,
		args: [
			'--no-sandbox',
			'--disable-quic',
			'--no-first-run',
			'--disable-background-networking',
			'--disable-component-update',
			'--disable-sync'
		]
	});
	try {
		const address = server.resolvedUrls?.local[0];
		const page = await browser.newPage();
		await page.goto(`${address}src/local/bench/page.html`);
		await page.waitForFunction('typeof measure === "function"');
		return await page.evaluate(`measure(${film}, ${stars})`);
	} finally {
		await browser.close();
		await server.close();
	}
}

console.log(
	`Film of ${film} pixels, ${stars.toLocaleString('en-GB')} stars; ${cpus().length} cores, ${cpus()[0]?.model ?? 'unknown processor'}.`
);
console.log(`Load of the machine when this began: ${loadavg()[0].toFixed(1)}.`);
const node = await inNode();
const page = await inBrowser();
console.log(`WebGL drawn by: ${page.device}\n`);
console.log('                                        median        99th percentile');
/** @type {[string, { median: number, p99: number }][]} */
const rows = [
	['plain painter, Node', node.plain],
	['plain painter, page with canvas', page.plain],
	['WebGL painter, one pass', page.webgl],
	['cube camera to fisheye, three.js', page.cube],
	['retune, 8 components, 1,024 radii', node.retune],
	['retune, bulge, disc and halo', node.smallRetune],
	['speeds of a million stars', node.speeds],
	['fit, 3 free, 30 points, 12 starts', node.fit],
	['reading 20,000 rows, 5 MB', node.read]
];
for (const [name, { median, p99 }] of rows)
	console.log(`${name.padEnd(34)} ${ms(median)}   ${ms(p99)}`);
const ratio = (/** @type {number} */ value) =>
	`${(page.cube.median / value).toFixed(1)} times faster`;
console.log(
	`\nAgainst the cube camera: plain painter in Node ${ratio(node.plain.median)}, in the page ${ratio(page.plain.median)}, WebGL painter ${ratio(page.webgl.median)}.`
);
