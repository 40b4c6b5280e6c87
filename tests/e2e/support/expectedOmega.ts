import { massModel } from '../../../src/lib/dynamics';
import { demoGalaxies } from '../../../src/lib/server/demo/galaxies';
import { createRingTable, ringOf } from '../../../src/lib/starfield';

/** kpc: where the stage reads its ring off. */
const readRadius = 8;

/**
 * The speed of turning that the mass model of the Harrow Wheel asks for at the ring the stage reads.
 * @param halo factor: times its mass; density: Msun/kpc³ in place of its own
 * @returns km/s/kpc
 */
export function expectedOmega(halo: { factor?: number; density?: number }): number {
	const { model, look } = demoGalaxies.wheel.document;
	const { radii } = createRingTable(look.outerRadius);
	const components = model.components.map((component) =>
		component.lit
			? component
			: {
					...component,
					factor: halo.factor ?? 1,
					parameters: {
						...component.parameters,
						density: halo.density ?? component.parameters.density
					}
				}
	);
	return massModel({ ...model, components }).circularFrequency(radii[ringOf(radii, readRadius)]);
}
