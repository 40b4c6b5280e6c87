import { join, resolve } from 'node:path';
import { existsSync } from 'node:fs';
import { launchApp, untilHealthy } from './app.js';
import { buildApp } from './build.js';
import { endCommands } from './command.js';
import { banner } from './banner.js';
import { defaultDataFolder, makeDataFolder, root } from './folders.js';
import { installPackages } from './install.js';
import { freePort, isFree } from './ports.js';
import { startCluster, stopCluster } from './postgres.js';
import { endProcess, stillRuns } from './processes.js';
import { Refusal } from './refusal.js';
import { claim, record, release } from './running.js';
import { secrets } from './secrets.js';
import { readSettings } from './settings.js';

/**
 * Brings Farwheel up on one machine: packages, database, mail, build, app. Needs no package itself.
 *
 *   node src/local/start.js [--dev] [--data <folder>] [--no-env-file]
 */

/** What to stop, last started first stopped. @type {(() => Promise<void> | void)[]} */
const started = [];
let stopping = false;

/** @param {number} code */
async function stopAll(code) {
	if (stopping) return;
	stopping = true;
	await endCommands();
	for (const stop of started.reverse()) {
		try {
			await stop();
		} catch (error) {
			// The others are to stop all the same.
			console.error(error);
			code = 1;
		}
	}
	process.exit(code);
}

function stopOnSignals() {
	for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
		process.on(signal, () => {
			// npm passes on the Ctrl-C that the terminal has sent us too: both are one wish.
			if (!stopping) console.log('\nStopping …');
			void stopAll(0);
		});
	}
	// The test command holds a channel to us: when it is gone, nobody else would stop us.
	process.on('disconnect', () => void stopAll(0));
}

/** @param {string[]} args */
function readArguments(args) {
	const options = { dev: false, dataFolder: defaultDataFolder, envFile: join(root, '.env') };
	for (let i = 0; i < args.length; i++) {
		if (args[i] === '--dev') options.dev = true;
		else if (args[i] === '--data' && args[i + 1]) options.dataFolder = resolve(args[++i]);
		else if (args[i] === '--no-env-file') options.envFile = '';
		else {
			throw new Refusal(`Unknown option ${args[i]}. Known: --dev, --data <folder>, --no-env-file.`);
		}
	}
	return options;
}

/** @param {import('./settings.js').Settings} settings */
async function choosePort({ port, portIsFixed, host }) {
	if (!portIsFixed) return freePort(port, host);
	if (await isFree(port, host)) return port;
	throw new Refusal(`Port ${port} of ${host} is taken. Stop what uses it, or set PORT to another.`);
}

/** @param {ReturnType<typeof readArguments>} options */
async function start({ dev, dataFolder, envFile }) {
	if (existsSync(envFile)) process.loadEnvFile(envFile);
	const settings = readSettings(process.env, { dev });
	if (Array.isArray(settings)) throw new Refusal(settings.join('\n'));

	makeDataFolder(dataFolder);
	const claimed = await claim(dataFolder);
	if (!claimed.taken) {
		const { address, mailPage, starter } = claimed.record;
		console.log(
			address
				? `Farwheel is already running at ${address}${mailPage ? `, mail at ${mailPage}` : ''} (process ${starter.pid}).`
				: `Farwheel is already starting (process ${starter.pid}).`
		);
		return;
	}
	started.push(() => release(dataFolder));
	// A start that was killed cannot have stopped its app.
	const orphan = claimed.leftover?.app;
	if (orphan && stillRuns(orphan)) await endProcess(orphan);

	await installPackages(root);
	/** @type {NodeJS.ProcessEnv} */
	const env = { ...process.env, SHUTDOWN_TIMEOUT: process.env.SHUTDOWN_TIMEOUT ?? '3' };
	delete env.FARWHEEL_DEMO;
	env.AUTH_SECRET ||= secrets(dataFolder).authSecret;
	/** @type {Omit<import('./running.js').RunningRecord, 'starter'>} */
	const facts = { dev };
	let databaseFolder;
	if (settings.standInDatabase) {
		started.push(() => stopCluster(dataFolder));
		const cluster = await startCluster({ dataFolder });
		await cluster.ensureDatabase('farwheel');
		databaseFolder = cluster.folder;
		facts.databaseUrl = env.DATABASE_URL = cluster.url('farwheel');
		if (settings.demo) env.FARWHEEL_DEMO = '1';
	}
	if (!dev) await buildApp(root);

	const port = await choosePort(settings);
	if (settings.standInMail) {
		// Loaded late: it needs packages, which the lines above may just have installed.
		const { startMailCatcher } = await import('./mail.js');
		const mail = await startMailCatcher({ dataFolder, pagePort: port + 1 });
		started.push(mail.stop);
		facts.smtpUrl = env.SMTP_URL = mail.smtpUrl;
		facts.mailPage = env.FARWHEEL_MAIL_PAGE = mail.page;
	}
	// An address of all interfaces is none to call; this machine answers on loopback too.
	const reachable = ['0.0.0.0', '::'].includes(settings.host) ? '127.0.0.1' : settings.host;
	const local = `http://${reachable.includes(':') ? `[${reachable}]` : reachable}:${port}`;
	env.HOST = settings.host;
	env.PORT = String(port);
	env.ORIGIN = settings.origin ?? local;
	if (!dev) env.NODE_ENV = 'production';
	if (stopping) return;
	const app = launchApp({
		root,
		dev,
		env,
		port,
		host: settings.host,
		plainLog: !settings.standInDatabase
	});
	started.push(app.stop);
	facts.app = app.identity;
	record(dataFolder, facts);
	await untilHealthy(app, local);
	facts.address = env.ORIGIN;
	record(dataFolder, facts);
	console.log(
		banner({
			address: env.ORIGIN,
			settings,
			mailPage: facts.mailPage,
			databaseFolder,
			dataFolder,
			port
		})
	);
	const how = await app.ended;
	if (!stopping) throw new Refusal(`The app stopped by itself: it ${how}.`);
}

try {
	stopOnSignals();
	await start(readArguments(process.argv.slice(2)));
} catch (error) {
	// A stop on request breaks off whatever is at work; that is no failure.
	if (!stopping) {
		const closed = error instanceof Error && 'code' in error && error.code === 'EACCES';
		if (error instanceof Refusal) console.error(error.message);
		else if (closed) {
			console.error(
				`${error.message}\nIt belongs to another account: start as that one, or give it to this one.`
			);
		} else console.error(error);
		await stopAll(1);
	}
}
