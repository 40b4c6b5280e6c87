/**
 * What a start is to do, read from the environment.
 * @typedef {object} Settings
 * @property {boolean} standInDatabase
 * @property {boolean} standInMail
 * @property {boolean} demo
 * @property {string} host
 * @property {number} port wanted
 * @property {boolean} portIsFixed a real installation is expected at its port and nowhere else
 * @property {string | null} origin null: made from host and port
 */

/**
 * @param {NodeJS.ProcessEnv} env
 * @param {{ dev: boolean }} options
 * @returns {Settings | string[]} settings, or the lines that say why this start is refused
 */
export function readSettings(env, { dev }) {
	/** @param {string} name @returns {string | null} an empty variable counts as not set */
	const value = (name) => env[name]?.trim() || null;
	const refusals = [];
	const real = value('DATABASE_URL') !== null;
	const origin = value('ORIGIN');
	const port = Number(value('PORT') ?? 4180);

	if (real && !dev) {
		const why = 'DATABASE_URL is set, so this is a real installation and needs';
		if (!origin) {
			refusals.push(
				`${why} ORIGIN: the address people type, such as https://farwheel.example.org.`
			);
		}
		if (!value('AUTH_SECRET')) {
			refusals.push(
				`${why} AUTH_SECRET: at least 32 random characters, such as \`openssl rand -base64 32\` prints.`
			);
		}
	}
	const secret = value('AUTH_SECRET');
	if (secret && secret.length < 32) {
		refusals.push(`AUTH_SECRET has ${secret.length} characters and needs at least 32.`);
	}
	if (origin && !/^https?:\/\/[^/]+$/.test(origin)) {
		refusals.push(
			`ORIGIN is "${origin}" and must be scheme and host only, such as https://farwheel.example.org.`
		);
	}
	if (!Number.isInteger(port) || port < 1 || port > 65535) {
		refusals.push(`PORT is "${value('PORT')}" and must be a whole number from 1 to 65535.`);
	}
	if (real && value('FARWHEEL_DEMO') === '1') {
		refusals.push('FARWHEEL_DEMO is 1, but demo people exist on the stand-in database only.');
	}
	if (refusals.length > 0) return refusals;
	return {
		standInDatabase: !real,
		standInMail: value('SMTP_URL') === null,
		demo: !real && value('FARWHEEL_DEMO') !== '0',
		host: value('HOST') ?? '127.0.0.1',
		port,
		portIsFixed: real,
		origin
	};
}
