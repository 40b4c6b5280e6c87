import { createServer } from 'node:net';

/**
 * @param {number} port 0 for any
 * @param {string} host
 * @returns {Promise<number | null>} the port, or null where it is taken
 */
function tryPort(port, host) {
	return new Promise((resolve, reject) => {
		const server = createServer();
		server.once('error', (/** @type {NodeJS.ErrnoException} */ error) => {
			// EACCES: a port below 1024 that this account may not open.
			if (error.code === 'EADDRINUSE' || error.code === 'EACCES') resolve(null);
			else reject(error);
		});
		server.listen({ port, host, exclusive: true }, () => {
			const address = server.address();
			const found = typeof address === 'object' && address ? address.port : port;
			server.close(() => resolve(found));
		});
	});
}

/** @param {number} port @param {string} [host] */
export const isFree = async (port, host = '127.0.0.1') => (await tryPort(port, host)) !== null;

/**
 * The wanted port, or the next free one after it, or any free one.
 * @param {number | null} wanted null for any
 * @param {string} [host]
 * @returns {Promise<number>}
 */
export async function freePort(wanted, host = '127.0.0.1') {
	if (wanted !== null) {
		for (let port = wanted; port < Math.min(wanted + 100, 65536); port++) {
			if (await isFree(port, host)) return port;
		}
	}
	const any = await tryPort(0, host);
	if (any === null) throw new Error(`no free port on ${host}`);
	return any;
}
