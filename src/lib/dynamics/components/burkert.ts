import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { densityParameter, lengthParameter } from './parameters';
import { sphericalComponent } from './sphericalComponent';

/**
 * f(x) / x³ with f = ln(1 + x²) + 2 ln(1 + x) − 2 atan(x) = 4 ∫ x² / ((1 + x)(1 + x²)) dx.
 * Below 0.3 the terms of f cancel to third order, so there its series
 * 4 Σ [x^(4k+3)/(4k + 3) − x^(4k+4)/(4k + 4)] is summed to x^32 (relative error below 1e-15).
 */
function meanDensityFunction(x: number): number {
	if (x >= 0.3) {
		return (Math.log1p(x * x) + 2 * Math.log1p(x) - 2 * Math.atan(x)) / (x * x * x);
	}
	const x4 = x ** 4;
	let sum = 0;
	for (let k = 7; k >= 0; k--) sum = 1 / (4 * k + 3) - x / (4 * k + 4) + x4 * sum;
	return 4 * sum;
}

/** ∫ from x to infinity of t / ((1 + t)(1 + t²)) dt; every term is positive. */
function outerFunction(x: number): number {
	return 0.5 * Math.atan2(1, x) + 0.25 * Math.log1p((2 * x) / (1 + x * x));
}

/**
 * ρ = ρ0 / ((1 + x)(1 + x²)), M = πρ0 rc³ f(x), x = r / rc. The mass grows without end, but so
 * slowly that stars can escape. Burkert 1995, ApJ 447, L25.
 */
export const burkert: ComponentMaker = {
	info: {
		kind: 'burkert',
		label: 'Burkert halo',
		help: 'A halo with an even core, found to suit many small galaxies.',
		lit: false,
		shape: 'sphere',
		parameterSets: [
			{
				id: 'density',
				label: 'Density and core',
				parameters: [
					densityParameter({
						label: 'Central density',
						initial: 2e7,
						usualMin: 1e6,
						usualMax: 1e9,
						help: 'How dense the halo is in the middle.'
					}),
					lengthParameter({
						name: 'coreRadius',
						label: 'Core radius',
						initial: 8,
						usualMin: 0.5,
						usualMax: 50,
						help: 'At this radius the halo is a quarter as dense as in the middle.'
					})
				]
			}
		],
		source: 'Burkert 1995, ApJ 447, L25'
	},
	make({ density, coreRadius }) {
		const frequency = Math.PI * G * density;
		const speed = frequency * coreRadius * coreRadius;
		const mass = Math.PI * density * coreRadius ** 3;
		return sphericalComponent({
			circularVelocitySquared(r) {
				const x = r / coreRadius;
				return speed * x * x * meanDensityFunction(x);
			},
			circularFrequencySquared: (r) => frequency * meanDensityFunction(r / coreRadius),
			enclosedMass(r) {
				const x = r / coreRadius;
				return mass * x * x * x * meanDensityFunction(x);
			},
			density(r) {
				const x = r / coreRadius;
				return density / ((1 + x) * (1 + x * x));
			},
			potential(r) {
				const x = r / coreRadius;
				return -speed * (x * x * meanDensityFunction(x) + 4 * outerFunction(x));
			},
			escapable: true
		});
	}
};
