import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { componentKinds, massModel } from '../../src/lib/dynamics';
import type { ComponentSpec, ParameterSet } from '../../src/lib/dynamics';
import { switchParameterSet } from '../../src/routes/(office)/galaxies/tuning/switchParameterSet';

const sets = componentKinds.find((info) => info.kind === 'nfw')?.parameterSets ?? [];
const setOf = (id: string): ParameterSet => {
	const found = sets.find((set) => set.id === id);
	if (!found) throw new Error(`nfw has no parameter set ${id}`);
	return found;
};
const halo = (parameters: Record<string, number>): ComponentSpec => ({
	id: 'halo',
	kind: 'nfw',
	parameters,
	lit: false
});
const speed = (component: ComponentSpec, R: number) =>
	massModel({ components: [component] }).circularVelocity(R);

/** The halo given the other way, or a failure that says which halo it was. */
function switched(component: ComponentSpec, to: string): ComponentSpec {
	const parameters = switchParameterSet(component, setOf(to));
	if (!parameters) throw new Error(`not switched: ${JSON.stringify(component.parameters)}`);
	return halo(parameters);
}

describe('switchParameterSet', () => {
	it('gives a halo of mass and concentration by density and size with the same speeds, and back', () => {
		fc.assert(
			fc.property(
				fc.double({ min: 9, max: 14, noNaN: true }),
				fc.double({ min: 3, max: 30, noNaN: true }),
				fc.constantFrom(1, 8, 60),
				(logMass, concentration, R) => {
					const first = halo({ mass200: 10 ** logMass, concentration, hubble: 70 });
					const second = switched(first, 'density');
					const third = switched(second, 'mass200');
					for (const other of [second, third]) {
						const ratio = speed(other, R) / speed(first, R);
						expect(ratio, `${speed(other, R)} against ${speed(first, R)}`).toBeGreaterThan(0.9999);
						expect(ratio, `${speed(other, R)} against ${speed(first, R)}`).toBeLessThan(1.0001);
					}
				}
			)
		);
	});

	it('answers null for a halo that no concentration from 1 to 100 has', () => {
		expect(switchParameterSet(halo({ density: 10, scaleRadius: 20 }), setOf('mass200'))).toBeNull();
		expect(
			switchParameterSet(halo({ density: 1e13, scaleRadius: 20 }), setOf('mass200'))
		).toBeNull();
	});

	it('leaves a halo alone that is given that way already', () => {
		const parameters = { density: 8e6, scaleRadius: 20 };
		expect(switchParameterSet(halo(parameters), setOf('density'))).toBe(parameters);
	});
});
