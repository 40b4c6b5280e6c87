import { createServer, type Server } from 'node:net';
import { expect, onTestFinished, test } from 'vitest';
import { freePort, isFree } from '../../src/local/ports.js';

async function take(port: number): Promise<Server> {
	const server = createServer();
	await new Promise<void>((resolve, reject) => {
		server.once('error', reject);
		server.listen(port, '127.0.0.1', () => resolve());
	});
	onTestFinished(() => {
		server.close();
	});
	return server;
}

test('freePort gives the wanted port where it is free', async () => {
	const port = await freePort(null);
	expect(await freePort(port)).toBe(port);
});

test('freePort goes on to a later port where the wanted one is taken', async () => {
	const port = await freePort(null);
	await take(port);
	expect(await isFree(port)).toBe(false);
	const other = await freePort(port);
	expect(other).not.toBe(port);
	expect(await isFree(other)).toBe(true);
});
