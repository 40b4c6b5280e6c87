import { expect } from '@playwright/test';
import { TICKS_PER_SECOND, timeFromMyr } from '../../../src/lib/units';
import type { Reading } from './stage';

/** Most that a phase may be off, radians. */
const tolerance = 1e-6;

/** @param rate million years a second @returns kpc/(km/s) in one tick */
const timeOfTick = (rate: number): number => timeFromMyr(rate) / TICKS_PER_SECOND;

/** The phase a moment would have at another tick if it went on at its own Ω. */
const phaseAt = (from: Reading, tick: number, rate: number): number =>
	from.phase + from.omega * (tick - from.tick) * timeOfTick(rate);

/** All moments lie on one line: each is where the first one's Ω takes the ring. */
export function expectOneLine(readings: Reading[], rate: number): void {
	expect(readings.length).toBeGreaterThanOrEqual(2);
	const [first] = readings;
	for (const { tick, phase } of readings) {
		const off = phase - phaseAt(first, tick, rate);
		expect(Math.abs(off), `tick ${first.tick} to ${tick}: off by ${off} rad`).toBeLessThan(
			tolerance
		);
	}
}

/**
 * Moments before and after one change of Ω lie on two lines that meet at a whole tick between them:
 * the ring changed its speed there and not its place.
 */
export function expectOneBend(before: Reading[], after: Reading[], rate: number): void {
	expectOneLine(before, rate);
	expectOneLine(after, rate);
	const [a, b] = [before[before.length - 1], after[0]];
	const gap = b.phase - phaseAt(a, b.tick, rate);
	const meet = b.tick - Math.round(gap / ((b.omega - a.omega) * timeOfTick(rate)));
	const jump = phaseAt(b, meet, rate) - phaseAt(a, meet, rate);
	expect(Math.abs(jump), `at tick ${meet} the ring jumps by ${jump} rad`).toBeLessThan(tolerance);
	// An event that came late is put right from the tick at which it was due.
	const late = Math.ceil((b.late / 1000) * TICKS_PER_SECOND) + 1;
	expect(meet, `lines meet before tick ${a.tick}`).toBeGreaterThanOrEqual(a.tick - late);
	expect(meet, `lines meet after tick ${b.tick}`).toBeLessThanOrEqual(b.tick);
}
