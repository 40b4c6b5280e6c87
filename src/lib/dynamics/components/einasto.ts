import type { ComponentMaker } from './ComponentMaker';
import { gammaProfile } from './gammaProfile';
import { densityParameter, lengthParameter } from './parameters';
import { sphericalComponent } from './sphericalComponent';

/**
 * ρ = ρ₋₂ exp(−2n [(r/r₋₂)^(1/n) − 1]): `density` ρ₋₂ at `scaleRadius` r₋₂, where the logarithmic
 * slope is −2, and `index` n. Papers that give the exponent α = 1/n are served too: an index below 1
 * is read as α, which n never is in a halo.
 * Einasto 1965, Trudy Astrofiz. Inst. Alma-Ata 5, 87; Navarro et al. 2004, MNRAS 349, 1039;
 * Retana-Montenegro et al. 2012, A&A 540, A70 for its mass and potential (from memory).
 */
export const einasto: ComponentMaker = {
	info: {
		kind: 'einasto',
		label: 'Einasto halo',
		help: 'A halo whose slope changes gradually all the way, as the finest computer models show.',
		lit: false,
		shape: 'sphere',
		parameterSets: [
			{
				id: 'density',
				label: 'Density and size',
				parameters: [
					densityParameter({
						initial: 2.1e6,
						usualMin: 1e4,
						usualMax: 1e8,
						help: 'How dense the halo is at its scale radius.'
					}),
					lengthParameter({
						name: 'scaleRadius',
						label: 'Scale radius',
						initial: 20,
						usualMin: 1,
						usualMax: 100,
						help: 'Where the density falls with the square of the distance.'
					}),
					{
						name: 'index',
						label: 'Index',
						unit: '',
						min: 0.05,
						max: 20,
						usualMin: 1,
						usualMax: 10,
						step: 0.01,
						scale: 'linear',
						initial: 6,
						optional: false,
						help: 'How slowly the slope changes: large is a steep middle, small a flat one. Below 1 it is read as α, which is 1 over the index.'
					}
				]
			}
		],
		source: 'Navarro et al. 2004, MNRAS 349, 1039'
	},
	make({ density, scaleRadius, index }) {
		const n = index < 1 ? 1 / index : index;
		return sphericalComponent(gammaProfile(Math.log(density) + 2 * n, scaleRadius, 0, 2 * n, n));
	}
};
