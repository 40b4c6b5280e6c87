import { expect, test } from 'vitest';
import { demoPassword, demoPeople, demoVenues } from '../../src/local/demoPeople.js';
import { roles } from '../../src/lib/roles';

test('the first venue has exactly one person per role', () => {
	const people = demoPeople.filter((person) => person.venue === demoVenues[0].name);
	expect(people.flatMap((person) => person.roles).sort()).toEqual([...roles].sort());
});

test('every demo person belongs to a demo venue and has an address that cannot exist', () => {
	for (const person of demoPeople) {
		expect(demoVenues.map((venue) => venue.name)).toContain(person.venue);
		expect(person.email).toMatch(/^[a-z]+@[a-z]+\.example\.org$/);
	}
	expect(new Set(demoPeople.map((person) => person.email)).size).toBe(demoPeople.length);
});

test('a second venue has a producer, so that separation can be seen', () => {
	const people = demoPeople.filter((person) => person.venue === demoVenues[1].name);
	expect(people.map((person) => person.roles)).toEqual([['producer']]);
});

test('the demo password is long enough for the sign-in rules', () => {
	expect(demoPassword.length).toBeGreaterThanOrEqual(15);
});
