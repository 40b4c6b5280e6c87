import { connect as connectTo, createServer, type AddressInfo, type Server } from 'node:net';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { waitForDatabase } from '../../../src/lib/server/db/waitForDatabase';
import { freshDatabase } from '../support/database';

let fresh: Awaited<ReturnType<typeof freshDatabase>>;
beforeAll(async () => {
	fresh = await freshDatabase();
});
afterAll(() => fresh.close());

const listening = (server: Server, port: number) =>
	new Promise<number>((resolve) =>
		server.listen(port, '127.0.0.1', () => resolve((server.address() as AddressInfo).port))
	);
const closed = (server: Server) => new Promise((resolve) => server.close(resolve));

test('waits while nobody answers and returns once the database does', async () => {
	const real = new URL(fresh.url);
	// Stands before the database, so that the test can say when it is there.
	const door = createServer((socket) => {
		const behind = connectTo(Number(real.port), real.hostname);
		socket.pipe(behind).pipe(socket);
		socket.on('error', () => behind.destroy());
		behind.on('error', () => socket.destroy());
	});
	const port = await listening(door, 0);
	await closed(door);
	const url = new URL(fresh.url);
	url.host = `127.0.0.1:${port}`;
	let answered = false;
	const waiting = waitForDatabase(url.href).then(() => {
		answered = true;
	});
	await new Promise((resolve) => setTimeout(resolve, 600));
	expect(answered).toBe(false);
	await listening(door, port);
	await waiting;
	expect(answered).toBe(true);
	await closed(door);
}, 20_000);

test('gives up at once where the database is there and knows no such name', async () => {
	const url = new URL(fresh.url);
	url.pathname = '/no-such-database';
	await expect(waitForDatabase(url.href)).rejects.toThrow(/does not exist/);
});
