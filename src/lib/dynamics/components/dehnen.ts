import type { ComponentMaker } from './ComponentMaker';
import { dehnenProfile } from './dehnenProfile';
import { lengthParameter, massParameter } from './parameters';
import { sphericalComponent } from './sphericalComponent';

/**
 * A round body with an inner slope of choice: γ = 0 has a flat core, 1 is Hernquist's, 2 Jaffe's.
 * At the centre of γ above 2 the speed grows without end.
 * Dehnen 1993, MNRAS 265, 250; Tremaine et al. 1994, AJ 107, 634.
 */
export const dehnen: ComponentMaker = {
	info: {
		kind: 'dehnen',
		label: 'Dehnen bulge',
		help: 'A round bulge whose middle can be flat or steep, as you choose.',
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
						usualMax: 10,
						help: 'Where the body begins to thin out faster.'
					}),
					{
						name: 'gamma',
						label: 'Inner slope',
						unit: '',
						min: 0,
						max: 2.99,
						usualMin: 0,
						usualMax: 2,
						step: 0.01,
						scale: 'linear',
						initial: 1.5,
						optional: false,
						help: 'How steeply the density rises towards the centre: 0 is flat.'
					}
				]
			}
		],
		source: 'Dehnen 1993, MNRAS 265, 250'
	},
	make: ({ mass, scaleLength, gamma }) =>
		sphericalComponent(dehnenProfile(mass, scaleLength, gamma))
};
