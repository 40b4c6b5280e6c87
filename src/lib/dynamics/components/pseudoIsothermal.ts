import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { densityParameter, lengthParameter } from './parameters';
import { sphericalComponent } from './sphericalComponent';

/**
 * 1 − atan(x)/x. Below 0.3 its series Σ (−1)^(k+1) x^2k/(2k + 1) from k = 1 to x^28
 * (relative error below 1e-15), because the difference loses digits there.
 */
function speedFunction(x: number): number {
	if (x >= 0.3) return 1 - Math.atan(x) / x;
	let sum = 0;
	for (let k = 14; k >= 1; k--) sum = 1 / (2 * k + 1) - x * x * sum;
	return x * x * sum;
}

/** ½ ln(1 + x²) + atan(x)/x − 1, in the same way: Σ (−1)^(k+1) x^2k/(2k (2k + 1)). */
function potentialFunction(x: number): number {
	if (x >= 0.3) return 0.5 * Math.log1p(x * x) + Math.atan(x) / x - 1;
	let sum = 0;
	for (let k = 14; k >= 1; k--) sum = 1 / (2 * k * (2 * k + 1)) - x * x * sum;
	return x * x * sum;
}

/**
 * ρ = ρ0 / (1 + x²), v² = 4πGρ0 rc² (1 − atan(x)/x), x = r / rc. The mass grows as r for ever, so
 * nothing escapes; the potential is counted from the centre.
 * Begeman, Broeils and Sanders 1991, MNRAS 249, 523.
 */
export const pseudoIsothermal: ComponentMaker = {
	info: {
		kind: 'pseudo-isothermal',
		label: 'Pseudo-isothermal halo',
		help: 'A halo with an even core whose speeds level off and then stay the same.',
		lit: false,
		shape: 'sphere',
		parameterSets: [
			{
				id: 'density',
				label: 'Density and core',
				parameters: [
					densityParameter({
						label: 'Central density',
						initial: 3e7,
						usualMin: 1e6,
						usualMax: 1e9,
						help: 'How dense the halo is in the middle.'
					}),
					lengthParameter({
						name: 'coreRadius',
						label: 'Core radius',
						initial: 2.5,
						help: 'At this radius the halo is half as dense as in the middle.'
					})
				]
			}
		],
		source: 'Begeman, Broeils and Sanders 1991, MNRAS 249, 523'
	},
	make({ density, coreRadius }) {
		const frequency = 4 * Math.PI * G * density;
		const speed = frequency * coreRadius * coreRadius;
		const mass = 4 * Math.PI * density * coreRadius ** 3;
		return sphericalComponent({
			circularVelocitySquared: (r) => speed * speedFunction(r / coreRadius),
			circularFrequencySquared(r) {
				const x = r / coreRadius;
				return x < 1e-9 ? frequency / 3 : (frequency * speedFunction(x)) / (x * x);
			},
			enclosedMass(r) {
				const x = r / coreRadius;
				return mass * x * speedFunction(x);
			},
			density: (r) => density / (1 + (r / coreRadius) ** 2),
			potential: (r) => speed * potentialFunction(r / coreRadius),
			escapable: false
		});
	}
};
