import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { largestText, mostRows } from '../../src/lib/measurements/limits';
import { readMeasurements } from '../../src/lib/measurements/readMeasurements';
import type { MeasurementsRead } from '../../src/lib/measurements/reading';

const rolesOf = (read: MeasurementsRead) => read.columns.map(({ role }) => role);
const wanted = [
	{ radius: 1, speed: 50.5, error: 4 },
	{ radius: 2.5, speed: 80, error: 3.5 }
];

describe('ways of writing a table', () => {
	for (const [what, text, separator] of [
		['commas', 'R,V,e\n1,50.5,4\n2.5,80,3.5\n', 'comma'],
		['tabs', 'R\tV\te\n1\t50.5\t4\n2.5\t80\t3.5', 'tab'],
		['blanks', '  R     V   e\n  1  50.5   4\n2.5    80 3.5', 'blanks'],
		['semicolons and decimal commas', 'R;V;e\n1;50,5;4\n2,5;80;3,5', 'semicolon'],
		['blanks and decimal commas', '1,0 50,5 4,0\n2,5 80,0 3,5', 'blanks'],
		['bars', 'R|V|e\n1|50.5|4\n2.5|80|3.5', 'bar'],
		['a mark and carriage returns', '\uFEFFR,V,e\r\n1,50.5,4\r\n2.5,80,3.5\r\n', 'comma'],
		['carriage returns alone', 'R,V,e\r1,50.5,4\r2.5,80,3.5\r', 'comma'],
		['quotes', '"R","V","e"\n"1","50.5","4"\n"2.5","80","3.5"', 'comma'],
		['quoted decimal commas', 'R,V,e\n"1","50,5","4"\n"2,5","80","3,5"', 'comma'],
		['separators at line ends', 'R,V,e,\n1,50.5,4,\n2.5,80,3.5,', 'comma'],
		['no headings', '1,50.5,4\n2.5,80,3.5', 'comma'],
		['headings in a comment', '# R V e\n1 50.5 4\n2.5 80 3.5', 'blanks'],
		['comments of four kinds', '# a\n! b\n% c\n// d\nR,V,e\n1,50.5,4\n2.5,80,3.5', 'comma'],
		['rules and empty lines', 'R V e\n- - -\n--- --- ---\n\n1 50.5 4\n2.5 80 3.5', 'blanks'],
		['a line of units', 'R,V,e\nkpc,km/s,km/s\n1,50.5,4\n2.5,80,3.5', 'comma'],
		['powers of ten', 'R,V,e\n1D0,5.05e1,.4E+01\n+2.5,80.,3.5', 'comma']
	] as const) {
		it(`reads ${what}`, () => {
			const read = readMeasurements(text);
			expect(read.problem).toBeNull();
			expect(read.rows).toEqual(wanted);
			expect(read.separator).toBe(separator);
			expect(read.refused.filter(({ text }) => text !== '- - -')).toEqual([]);
		});
	}

	it('reads UTF-16 with its mark, and Latin letters in the old Windows set', () => {
		const text = 'R,V,e\n1,50.5,4\n2.5,80,3.5\n';
		const wide = Buffer.concat([Buffer.from([0xff, 0xfe]), Buffer.from(text, 'utf16le')]);
		expect(readMeasurements(wide).rows).toEqual(wanted);
		const old = Buffer.from(`# source: Bj\xf6rn\n${text}`, 'latin1');
		expect(readMeasurements(old)).toMatchObject({ rows: wanted, source: 'Björn' });
	});

	it('lets a quoted heading run over two lines, and counts the lines on', () => {
		const read = readMeasurements('"Radius\n(kpc)",Vrot,e_Vrot\n1,50.5,4\n2.5,80,3.5');
		expect(read).toMatchObject({ rows: wanted, lines: [3, 4] });
	});
});

describe('columns', () => {
	it('knows the names archives use, and leaves the rest alone', () => {
		const read = readMeasurements(
			'Rad\tVobs\terrV\tVgas\tVdisk\tVbul\tSBdisk\n0.5\t40\t3\t-2.5\t30\t10\t99'
		);
		expect(rolesOf(read)).toEqual(['radius', 'speed', 'error', 'gas', 'disc', 'bulge', null]);
		expect(read.rows).toEqual([
			{ radius: 0.5, speed: 40, error: 3, gas: -2.5, disc: 30, bulge: 10 }
		]);
		expect(read.columns[0].why).toContain('Rad');
		expect(read.columns[6].why).toContain('SBdisk');
	});

	for (const [headings, roles] of [
		['R_kpc,V_kms,V_err', 'radius,speed,error'],
		['Radius (arcsec),Rotation velocity [km/s],Uncertainty', 'radius,speed,error'],
		['e_Vrot,Vrot,r', 'error,speed,radius'],
		['radius,speed,sigma_v,gas', 'radius,speed,error,gas'],
		['r,V,Vrot,dVrot', 'radius,,speed,error'],
		['Galaxy,Rad,Vel,+/-', ',radius,speed,error']
	]) {
		it(`matches ${headings}`, () => {
			const cells = headings.split(',').map((_, i) => String(i + 1));
			expect(rolesOf(readMeasurements(`${headings}\n${cells.join(',')}`)).join()).toBe(roles);
		});
	}

	it('goes by the numbers where there are no names', () => {
		const lines = [1, 2, 3, 4].map((r) => `${3 + (r % 2)} ${r} ${100 + 10 * r}`);
		const read = readMeasurements(lines.join('\n'));
		expect(rolesOf(read)).toEqual(['error', 'radius', 'speed']);
		expect(read.header).toBeNull();
	});

	it('takes a person’s word for each column, and refuses one role twice', () => {
		const text = 'a,b,c\n1,2,3';
		const roles = ['error', 'speed', 'radius'] as const;
		expect(readMeasurements(text, { roles }).rows).toEqual([{ radius: 3, speed: 2, error: 1 }]);
		const twice = readMeasurements(text, { roles: ['speed', 'speed', 'radius'] });
		expect(twice.problem).toContain('Two columns');
		expect(twice.rows).toEqual([]);
	});

	it('asks for errors where there are none, and takes one for all rows', () => {
		expect(readMeasurements('R,V\n1,2').problem).toContain('error');
		expect(readMeasurements('R,V\n1,2', { sameError: 5 }).rows).toEqual([
			{ radius: 1, speed: 2, error: 5 }
		]);
	});
});

describe('units and facts', () => {
	it('takes units from headings, from a line under them, from comments, or the usual ones', () => {
		const units = (text: string) => {
			const { radiusUnit, speedUnit } = readMeasurements(text);
			return `${radiusUnit.unit} ${speedUnit.unit}`;
		};
		expect(units('R [arcmin],V (m/s),e\n1,2,3')).toBe('arcmin m/s');
		expect(units('R,V,e\npc,km s-1,km s-1\n1,2,3')).toBe('pc km/s');
		expect(units('# radius unit: light years\nR,V,e\n1,2,3')).toBe('light-years km/s');
		expect(units('R,V,e\n1,2,3')).toBe('kpc km/s');
		expect(readMeasurements('R (furlong),V,e\n1,2,3').radiusUnit.why).toContain('furlong');
	});

	it('reads distance, inclination, source and name from comments', () => {
		const read = readMeasurements(
			'# Distance = 9.25 +/- 0.4 Mpc\n# Inc: 61 deg\n# Reference: A paper.\n# name: X\nR,V,e\n1,2,3'
		);
		expect(read).toMatchObject({
			distance: { value: 9.25, error: 0.4 },
			inclination: { value: 61, error: null },
			source: 'A paper.',
			name: 'X'
		});
	});
});

describe('what is refused', () => {
	it('names every line and why, and reads the others', () => {
		const read = readMeasurements(
			'R,V,e\n1,50.5,4\n-1,2,3\n0,2,3\n2,x,3\n3,,3\n4,5,0\n5,6\n6,7,8,9\n7,3000,1\n8,1e999,1\n2.5,80,3.5\n"9,1,1'
		);
		expect(read.rows).toEqual(wanted);
		expect(read.lines).toEqual([2, 12]);
		expect(read.refused.map(({ line }) => line)).toEqual([3, 4, 5, 6, 7, 8, 9, 10, 11, 13]);
		expect(read.refused[2]).toEqual({
			line: 5,
			text: '2,x,3',
			reason: 'The speed “x” is not a number.'
		});
		for (const { reason } of read.refused) expect(reason).toMatch(/^[A-Z].*[.?]$/);
	});

	it('accounts for every line that is not empty and no comment', () => {
		const line = fc.string({ unit: fc.constantFrom(...'0123456789.,x- '), maxLength: 12 });
		fc.assert(
			fc.property(fc.array(line, { maxLength: 30 }), (lines) => {
				const read = readMeasurements(['R,V,e', '1,2,3', ...lines].join('\n'));
				const known = new Set([1, ...read.lines, ...read.refused.map((one) => one.line)]);
				const lost = ['R,V,e', '1,2,3', ...lines].filter(
					(text, i) => text.trim() !== '' && !/^[-\s]+$/.test(text) && !known.has(i + 1)
				);
				expect(lost).toEqual([]);
			})
		);
	});

	it('takes 20,000 rows and refuses one more, saying how many there are', () => {
		const rows = Array.from({ length: mostRows }, (_, i) => `${(i + 1) / 100},100,1`);
		const text = `R,V,e\n${rows.join('\n')}\n`;
		expect(readMeasurements(text)).toMatchObject({ problem: null, refused: [] });
		expect(readMeasurements(text).rows).toHaveLength(mostRows);
		const more = readMeasurements(`${text}300,100,1\n`);
		expect(more.problem).toContain('20,001 rows');
		expect(more.rows).toEqual([]);
	});

	it('refuses more than 5 MB, and what is no text, with what to do', () => {
		const large = readMeasurements(new Uint8Array(largestText + 1).fill(49));
		expect(large.problem).toContain('5 MB');
		expect(readMeasurements('é'.repeat(largestText / 2 + 1)).problem).toContain('5 MB');
		expect(readMeasurements('').problem).toContain('nothing');
		expect(readMeasurements('# only words').problem).toContain('comments');
		expect(readMeasurements('no numbers\nat all').problem).toContain('no rows');
		for (const start of [
			[0x50, 0x4b, 3, 4],
			[0x25, 0x50, 0x44, 0x46],
			[1, 0, 2]
		]) {
			expect(readMeasurements(Uint8Array.from(start)).problem).toMatch(/^This is/);
		}
	});
});

describe('whatever comes', () => {
	const whole = (read: MeasurementsRead) => {
		expect(read.rows).toHaveLength(read.lines.length);
		if (read.problem) expect(read.rows).toEqual([]);
		for (const { radius, speed, error } of read.rows) {
			expect(radius).toBeGreaterThan(0);
			expect(error).toBeGreaterThan(0);
			expect(Number.isFinite(radius + speed + error)).toBe(true);
		}
	};

	it('never throws on random bytes', () => {
		fc.assert(
			fc.property(fc.uint8Array({ maxLength: 2000 }), (bytes) => whole(readMeasurements(bytes))),
			{ numRuns: 1000 }
		);
	});

	it('never throws on text that looks like tables', () => {
		const signs = fc.constantFrom(...'0123456789.,;|\t \n\r"#%!/-+eD=:()[]RVe'.split(''));
		fc.assert(
			fc.property(fc.string({ unit: signs, maxLength: 400 }), (text) =>
				whole(readMeasurements(text))
			),
			{ numRuns: 2000 }
		);
	});
});
