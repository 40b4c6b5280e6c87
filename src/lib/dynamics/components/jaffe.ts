import type { ComponentMaker } from './ComponentMaker';
import { dehnenProfile } from './dehnenProfile';
import { lengthParameter, massParameter } from './parameters';
import { sphericalComponent } from './sphericalComponent';

/**
 * M(r) = M r/(r + a), v² = G M/(r + a), Φ = (G M/a) ln(r/(r + a)); a = scaleLength, which holds half
 * of the mass. The speed is flat in the middle and not 0 at the centre, where the potential and the
 * frequencies have no limit.
 * Jaffe 1983, MNRAS 202, 995.
 */
export const jaffe: ComponentMaker = {
	info: {
		kind: 'jaffe',
		label: 'Jaffe bulge',
		help: 'A round body with a very steep middle, as some elliptical galaxies have.',
		lit: true,
		shape: 'sphere',
		parameterSets: [
			{
				id: 'mass',
				label: 'Mass and size',
				parameters: [
					massParameter({
						initial: 1e10,
						help: 'Mass of the whole body, in units of the mass of the Sun.'
					}),
					lengthParameter({
						initial: 1,
						usualMin: 0.05,
						usualMax: 20,
						help: 'Half of the mass is inside this radius.'
					})
				]
			}
		],
		source: 'Jaffe 1983, MNRAS 202, 995'
	},
	make: ({ mass, scaleLength }) => sphericalComponent(dehnenProfile(mass, scaleLength, 2))
};
