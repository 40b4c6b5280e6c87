import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Context } from '../../../src/lib/server/context';
import type { Database } from '../../../src/lib/server/db/database';
import { pairings, screens } from '../../../src/lib/server/db/schema';
import {
	claimPairing,
	listScreens,
	requestPairing,
	revokeScreen,
	screenByToken,
	screenSeen,
	typePairingCode
} from '../../../src/lib/server/domes';
import { roles } from '../../../src/lib/roles';
import { contextFor, makeDome, makeVenue, openDatabase } from '../runs/support';

let db: Database;
let close: () => Promise<void>;
let venue: Awaited<ReturnType<typeof makeVenue>>;
let technician: Context;
let domeId: string;

beforeAll(async () => {
	({ db, close } = await openDatabase());
	venue = await makeVenue(db);
	technician = await contextFor(db, venue, ['technician']);
	domeId = (await makeDome(db, venue.id)).id;
});
afterAll(() => close());

const request = () => requestPairing('192.0.2.1', db);
const expire = (code: string) =>
	db
		.update(pairings)
		.set({ expiresAt: new Date(Date.now() - 1000) })
		.where(eq(pairings.code, code));

async function pair(name = 'Left projector') {
	const { code, claim } = await request();
	const { screenId } = await typePairingCode(technician, { code, domeId, name });
	const answer = await claimPairing(claim, db);
	if (answer.status !== 'paired') throw new Error(answer.status);
	return { screenId, claim, token: answer.token };
}

describe('pairing', () => {
	it('makes six characters without look-alikes that last ten minutes', async () => {
		const { code, expiresAt } = await request();
		expect(code).toMatch(/^[CDFGHJKMNPQRTWXY34679]{6}$/);
		expect(Math.abs(expiresAt.getTime() - Date.now() - 600_000)).toBeLessThan(5000);
	});

	it('gives the token to the browser that asked, and keeps its hash only', async () => {
		const { code, claim } = await request();
		expect(await claimPairing(claim, db)).toEqual({ status: 'waiting' });
		const typed = ` ${code.slice(0, 3).toLowerCase()} ${code.slice(3)}`;
		const { screenId } = await typePairingCode(technician, { code: typed, domeId, name: 'Front' });
		const answer = await claimPairing(claim, db);
		if (answer.status !== 'paired') throw new Error(answer.status);
		const known = await screenByToken(answer.token, db);
		expect([known?.screen.id, known?.dome.id]).toEqual([screenId, domeId]);
		const [row] = await db.select().from(screens).where(eq(screens.id, screenId));
		expect(row.tokenHash).toMatch(/^[0-9a-f]{64}$/);
		expect(JSON.stringify(row)).not.toContain(answer.token);
	});

	it('replaces the token when the browser asks again, so that one is good at a time', async () => {
		const { claim, token } = await pair();
		const again = await claimPairing(claim, db);
		if (again.status !== 'paired') throw new Error(again.status);
		expect(await screenByToken(token, db)).toBeNull();
		expect(await screenByToken(again.token, db)).not.toBeNull();
	});

	it('takes a code once, and not after its ten minutes', async () => {
		const { code } = await request();
		await typePairingCode(technician, { code, domeId, name: 'Once' });
		await expect(
			typePairingCode(technician, { code, domeId, name: 'Twice' })
		).rejects.toMatchObject({ code: 'invalid', details: { triesLeft: 4 } });
		const old = await request();
		await expire(old.code);
		expect(await claimPairing(old.claim, db)).toEqual({ status: 'expired' });
		const other = await contextFor(db, venue, ['technician']);
		await expect(
			typePairingCode(other, { code: old.code, domeId, name: 'Late' })
		).rejects.toMatchObject({ code: 'invalid' });
	});

	it('refuses even a right code after five wrong ones of the same technician', async () => {
		const clumsy = await contextFor(db, venue, ['technician']);
		const { code } = await request();
		const type = (typed: string) =>
			typePairingCode(clumsy, { code: typed, domeId, name: 'Screen' });
		for (let left = 4; left >= 0; left--) {
			await expect(type('AAAAAA')).rejects.toMatchObject({
				code: 'invalid',
				details: { triesLeft: left }
			});
		}
		await expect(type(code)).rejects.toMatchObject({ code: 'too-many' });
		const steady = await contextFor(db, venue, ['technician']);
		expect(await typePairingCode(steady, { code, domeId, name: 'Screen' })).toHaveProperty(
			'screenId'
		);
	});

	it('lets five wrong codes through and no more when they come side by side', async () => {
		const hasty = await contextFor(db, venue, ['technician']);
		const answers = await Promise.allSettled(
			Array.from({ length: 12 }, () =>
				typePairingCode(hasty, { code: 'AAAAAA', domeId, name: 'Screen' })
			)
		);
		const codes = answers.map((a) => (a.status === 'rejected' ? a.reason.code : 'paired'));
		expect(codes.filter((code) => code === 'invalid')).toHaveLength(5);
		expect(codes.filter((code) => code === 'too-many')).toHaveLength(7);
	});

	it('pairs nothing with a dome of another venue', async () => {
		const stranger = await contextFor(db, await makeVenue(db, 'Other'), ['technician']);
		const { code } = await request();
		await expect(typePairingCode(stranger, { code, domeId, name: 'Screen' })).rejects.toMatchObject(
			{ code: 'not-found' }
		);
	});

	it('lets technicians and managers pair, and nobody else', async () => {
		const allowed: string[] = [];
		for (const role of roles) {
			const ctx = await contextFor(db, venue, [role]);
			const { code } = await request();
			const [tried] = await Promise.allSettled([
				typePairingCode(ctx, { code, domeId, name: `Screen of ${role}` })
			]);
			if (tried.status === 'fulfilled') allowed.push(role);
			else expect(tried.reason).toMatchObject({ code: 'forbidden' });
		}
		expect(allowed).toEqual(['technician', 'manager']);
	});
});

describe('revokeScreen', () => {
	it('ends the token at once and takes the screen off the list', async () => {
		const { screenId, token } = await pair('Short-lived');
		expect(await screenSeen(screenId, 'plain', db)).toBe(true);
		await revokeScreen(technician, screenId);
		expect(await screenByToken(token, db)).toBeNull();
		expect(await screenSeen(screenId, 'plain', db)).toBe(false);
		expect((await listScreens(technician)).map((s) => s.id)).not.toContain(screenId);
	});

	it('knows no screen of another venue', async () => {
		const { screenId } = await pair('Ours');
		const stranger = await contextFor(db, await makeVenue(db, 'Third'), ['manager']);
		await expect(revokeScreen(stranger, screenId)).rejects.toMatchObject({ code: 'not-found' });
		expect(await listScreens(stranger)).toEqual([]);
	});
});
