import { describe, expect, it } from 'vitest';
import type { ListInfo } from '../../src/lib/dynamics/types';
import { linesOf, readLines } from '../../src/routes/(office)/galaxies/tuning/listLines';

const list = (own: Partial<ListInfo> & { name: string }): ListInfo => ({
	label: own.name,
	unit: 'kpc',
	min: 0.001,
	max: 1000,
	least: 2,
	most: 5,
	rising: false,
	initial: [1, 2],
	help: '',
	...own
});
const lists = [
	list({ name: 'radii', rising: true }),
	list({ name: 'speeds', unit: 'km/s', min: -2000, max: 2000, asLongAs: 'radii' })
];

describe('lines of points', () => {
	it('come back as they were written', () => {
		const parameters = { radii: [0.5, 1, 2.25], speeds: [-4, 10.5, 80] };
		expect(linesOf(lists, parameters)).toBe('0.5\t-4\n1\t10.5\n2.25\t80');
		expect(readLines(lists, linesOf(lists, parameters))).toEqual({ lists: parameters });
	});
	it('may be apart by blanks or semicolons, with empty lines and decimal commas', () => {
		expect(readLines(lists, '1,5 ; 20\r\n\r\n 2,5   -30\n')).toEqual({
			lists: { radii: [1.5, 2.5], speeds: [20, -30] }
		});
	});
	it.each([
		['1 2\n3', /^Line 2 has 1 numbers; 2 are needed/],
		['1 2\n3 fast', /^Line 2: “fast” is not a number/],
		['2 10\n1 20', /radii.*number 2: each must be above the one before it/],
		['1 2', /list of 2 to 5 numbers/],
		['0 5\n1 10', /radii.*number 1: allowed are numbers from 0.001 to 1000 kpc/]
	])('%j is refused with the line and the reason', (text, why) => {
		const read = readLines(lists, text);
		expect('problem' in read ? read.problem : 'taken').toMatch(why);
	});
});
