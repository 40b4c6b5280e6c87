/** Seconds of silence after which a step on a plain log says that it is still at work. */
const quietSeconds = 15;

/** @param {number} since milliseconds */
export const elapsed = (since) => `${((Date.now() - since) / 1000).toFixed(1)} s`;

let busy = false;

/**
 * Runs a step that may be slow and shows how long it has been at it: a counting line on a terminal,
 * a line now and then elsewhere. A step within a step shows nothing of its own.
 * @template T
 * @param {string} label such as "Installing packages"
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function withProgress(label, work) {
	if (busy) return work();
	busy = true;
	const began = Date.now();
	const terminal = process.stdout.isTTY === true;
	process.stdout.write(terminal ? `${label} …` : `${label} …\n`);
	const timer = setInterval(
		() => {
			const time = `${Math.round((Date.now() - began) / 1000)} s`;
			process.stdout.write(terminal ? `\r${label} … ${time}` : `  still at it after ${time}\n`);
		},
		terminal ? 1000 : quietSeconds * 1000
	);
	let end = 'failed';
	try {
		const result = await work();
		end = 'done';
		return result;
	} finally {
		clearInterval(timer);
		busy = false;
		const line = `${end} in ${elapsed(began)}`;
		process.stdout.write(terminal ? `\r${label} … ${line}\n` : `  ${line}\n`);
	}
}
