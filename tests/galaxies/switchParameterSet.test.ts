import { describe, expect, it } from 'vitest';
import { componentKinds, massModel } from '../../src/lib/dynamics';
import type { ComponentSpec } from '../../src/lib/dynamics/types';
import { switchParameterSet } from '../../src/routes/(office)/galaxies/tuning/switchParameterSet';

const nfw = componentKinds.find((info) => info.kind === 'nfw');
const setOf = (id: string) => {
	const set = nfw?.parameterSets.find((one) => one.id === id);
	if (!set) throw new Error(`nfw has no set ${id}`);
	return set;
};
const halo = (parameters: Record<string, number>): ComponentSpec => ({
	id: 'halo',
	kind: 'nfw',
	parameters,
	lit: false
});
const speed = (component: ComponentSpec, R: number) =>
	massModel({ components: [component] }).circularVelocity(R);

describe('switchParameterSet', () => {
	it.each([
		{ density: 8.53702e6, scaleRadius: 19.5725 },
		{ density: 4e7, scaleRadius: 2 },
		{ density: 1e6, scaleRadius: 60 }
	])('gives the same halo by mass and concentration, and back: %o', (parameters) => {
		const before = halo(parameters);
		const by200 = switchParameterSet(before, setOf('mass200'));
		if (!by200) throw new Error('refused');
		expect(Object.keys(by200).sort()).toEqual(['concentration', 'hubble', 'mass200']);
		const back = switchParameterSet(halo(by200), setOf('density'));
		if (!back) throw new Error('refused on the way back');
		for (const R of [0.5, 8, 30, 150]) {
			const was = speed(before, R);
			for (const now of [speed(halo(by200), R), speed(halo(back), R)]) {
				expect(Math.abs(now / was - 1), `${now} against ${was} km/s at ${R} kpc`).toBeLessThan(
					2e-5
				);
			}
		}
	});
	it('refuses a halo that no concentration from 1 to 100 has', () => {
		expect(switchParameterSet(halo({ density: 1, scaleRadius: 20 }), setOf('mass200'))).toBeNull();
		expect(
			switchParameterSet(halo({ density: 1e13, scaleRadius: 20 }), setOf('mass200'))
		).toBeNull();
	});
});
