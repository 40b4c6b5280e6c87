import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { nfwHalo, nfwMassFunction } from './nfwHalo';
import { densityParameter, lengthParameter, massParameter } from './parameters';
import { sphericalComponent } from './sphericalComponent';

/**
 * ρ = ρ0 / (x (1 + x)²), M = 4πρ0 rs³ m(x), Φ = −4πGρ0 rs² ln(1 + x)/x, with x = r / rs and
 * m(x) = ln(1 + x) − x/(1 + x). The mass grows without end, but so slowly that stars can escape.
 * A cusp: density and frequencies are Infinity at r = 0, speed and potential are finite.
 * Navarro, Frenk and White 1997, ApJ 490, 493.
 */
export const nfw: ComponentMaker = {
	info: {
		kind: 'nfw',
		label: 'NFW halo',
		help: 'The halo shape that computer models of cold dark matter give.',
		lit: false,
		shape: 'sphere',
		parameterSets: [
			{
				id: 'density',
				label: 'Density and size',
				parameters: [
					densityParameter({
						initial: 8.5e6,
						usualMin: 1e5,
						usualMax: 1e8,
						help: 'How dense the halo is: four times its density at the scale radius.'
					}),
					lengthParameter({
						name: 'scaleRadius',
						label: 'Scale radius',
						initial: 19.6,
						usualMin: 1,
						usualMax: 100,
						help: 'Inside this radius the halo thins out slowly, outside it quickly.'
					})
				]
			},
			{
				id: 'mass200',
				label: 'Mass and concentration',
				parameters: [
					massParameter({
						name: 'mass200',
						label: 'Halo mass',
						initial: 1e12,
						usualMin: 1e9,
						usualMax: 1e14,
						help: 'Mass inside the radius where the mean density is 200 times that of the Universe at balance.'
					}),
					{
						name: 'concentration',
						label: 'Concentration',
						unit: '',
						min: 1,
						max: 100,
						usualMin: 3,
						usualMax: 30,
						step: 0.1,
						scale: 'linear',
						initial: 10,
						optional: false,
						help: 'How strongly the halo is gathered towards its middle.'
					},
					{
						name: 'hubble',
						label: 'Hubble constant',
						unit: 'km/s/Mpc',
						min: 20,
						max: 200,
						usualMin: 60,
						usualMax: 80,
						step: 0.1,
						scale: 'linear',
						initial: 70,
						optional: false,
						help: 'How fast the Universe expands; it sets the density that the halo is compared with.'
					}
				]
			}
		],
		source: 'Navarro, Frenk and White 1997, ApJ 490, 493'
	},
	make(parameters) {
		const { density, scaleRadius } =
			'mass200' in parameters
				? nfwHalo(parameters.mass200, parameters.concentration, parameters.hubble)
				: { density: parameters.density, scaleRadius: parameters.scaleRadius };
		const mass = 4 * Math.PI * density * scaleRadius ** 3;
		const frequency = 4 * Math.PI * G * density;
		const speed = frequency * scaleRadius * scaleRadius;
		return sphericalComponent({
			circularVelocitySquared(r) {
				const x = r / scaleRadius;
				return x === 0 ? 0 : (speed * nfwMassFunction(x)) / x;
			},
			circularFrequencySquared(r) {
				const x = r / scaleRadius;
				return x === 0 ? Infinity : (frequency * nfwMassFunction(x)) / (x * x * x);
			},
			enclosedMass: (r) => mass * nfwMassFunction(r / scaleRadius),
			density(r) {
				const x = r / scaleRadius;
				return density / (x * (1 + x) ** 2);
			},
			potential(r) {
				const x = r / scaleRadius;
				return x === 0 ? -speed : (-speed * Math.log1p(x)) / x;
			},
			escapable: true
		});
	}
};
