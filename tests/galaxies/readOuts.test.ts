import { describe, expect, it } from 'vitest';
import { massBreakdown, massModel } from '../../src/lib/dynamics';
import { demoGalaxies } from '../../src/lib/server/demo/galaxies';
import { G, myrFromTime } from '../../src/lib/units';
import { galaxy } from '../show/support/content';
import { readOuts, scientific } from '../../src/routes/(office)/galaxies/tuning/readOuts';

const read = (components: typeof galaxy.model.components, R: number) =>
	Object.fromEntries(readOuts(massModel({ components }), R).map((one) => [one.key, one]));

const sun = (mass: number) => ({
	id: 'star',
	kind: 'point-mass' as const,
	parameters: { mass },
	lit: true
});

describe('readOuts', () => {
	it('around a point mass everything is what Kepler says', () => {
		const mass = 1e11;
		const R = 10;
		const speed = Math.sqrt((G * mass) / R);
		const out = read([sun(mass)], R);
		expect(out.speed.exact).toBe(`${speed.toFixed(2)} km/s`);
		expect(out.orbit.exact).toBe(`${myrFromTime((2 * Math.PI * R) / speed).toFixed(1)} Myr`);
		expect(out.escape.exact).toBe(`${(speed * Math.SQRT2).toFixed(2)} km/s`);
		expect(out.lit.words).toBe('100 billion Suns');
		expect(out.unlit.words).toBe('nothing');
		expect(out.dynamical).toMatchObject({ exact: '1.000 × 10¹¹ Msun', label: 'Dynamical mass' });
	});

	it('say what the model says, each mass under its own label', () => {
		const { model } = demoGalaxies.wheel.document;
		const { speed, ratio, dynamical, lit, unlit } = read(model.components, 9.2);
		expect(speed.exact).toBe(`${massModel(model).circularVelocity(9.2).toFixed(2)} km/s`);
		expect(ratio.exact).toBe(massBreakdown(massModel(model), 9.2).ratio.toFixed(3));
		expect(lit.exact).toBe('2.720 × 10¹⁰ Msun');
		expect(unlit.exact).toBe('5.779 × 10¹⁰ Msun');
		expect(dynamical.exact).toBe('9.168 × 10¹⁰ Msun');
		expect(dynamical.note).toContain('Not the sum');
	});

	it('says that nothing escapes where the halo has no end', () => {
		const endless = {
			id: 'halo',
			kind: 'pseudo-isothermal' as const,
			parameters: { density: 1e7, coreRadius: 3 },
			lit: false
		};
		const out = read([endless], 8);
		expect(out.escape.words).toBe('nothing escapes');
		expect(out.ratio.words).toBe('no lit matter');
	});

	it('has words for a galaxy of nothing', () => {
		const out = read([], 8);
		expect(out.speed.words).toBe('no circular orbit');
		expect(out.ratio.words).toBe('nothing inside');
		for (const { exact, words } of Object.values(out)) {
			expect(`${words} ${exact}`).not.toMatch(/NaN|Infinity|undefined/);
		}
	});

	it.each([
		[7e9, '7.000 × 10⁹'],
		[0.00123, '1.230 × 10⁻³']
	])('writes %d as %s', (value, words) => expect(scientific(value)).toBe(words));
});
