import { G } from '../../units';
import { betaBelow, betaBetween, betaSeam } from '../incompleteBeta';
import type { ComponentMaker } from './ComponentMaker';
import { densityParameter, lengthParameter } from './parameters';
import { sphericalComponent, type SphericalProfile } from './sphericalComponent';

/**
 * With x = r/rs, t = x^α/(1 + x^α) and B the incomplete beta function:
 *
 *   M(r) = 4πρ0 rs³/α B_t((3−γ)/α, (β−3)/α)
 *   ∫ρ r dr from r outward = ρ0 rs²/α B_(1−t)((β−2)/α, (2−γ)/α)
 *
 * each taken from the end at which its series loses no digits, with a seam between.
 */
function profile(
	density0: number,
	rs: number,
	alpha: number,
	beta: number,
	gamma: number
): SphericalProfile {
	const [inner, outer] = [(3 - gamma) / alpha, (beta - 3) / alpha];
	const [near, far] = [(2 - gamma) / alpha, (beta - 2) / alpha];
	const volume = (4 * Math.PI * density0 * rs ** 3) / alpha;
	const surface = (4 * Math.PI * G * density0 * rs ** 2) / alpha;
	// Seams in 1 − t for the mass and in t for what lies outside.
	const [massSeam, outsideSeam] = [betaSeam(inner), betaSeam(far)];
	const massToSeam = betaBelow(inner, outer, 1 - massSeam);
	const outsideFromSeam = betaBelow(far, near, 1 - outsideSeam);

	function mass(x: number): number {
		const w = x ** alpha;
		const rest = 1 / (1 + w);
		if (rest >= massSeam) return betaBelow(inner, outer, w * rest);
		return massToSeam + betaBetween(outer, inner, rest, massSeam);
	}
	function outside(x: number): number {
		const w = x ** alpha;
		const rest = 1 / (1 + w);
		if (w * rest > outsideSeam) return betaBelow(far, near, rest);
		return outsideFromSeam + betaBetween(near, far, w * rest, outsideSeam);
	}
	const enclosedMass = (r: number) => (r === 0 ? 0 : volume * mass(r / rs));
	const cusp = gamma > 0;
	return {
		circularVelocitySquared(r) {
			if (r > 0) return (G * enclosedMass(r)) / r;
			if (gamma < 2) return 0;
			return gamma > 2 ? Infinity : 4 * Math.PI * G * density0 * rs * rs;
		},
		circularFrequencySquared(r) {
			if (r > 0) return (G * enclosedMass(r)) / (r * r * r);
			return cusp ? Infinity : (4 / 3) * Math.PI * G * density0;
		},
		enclosedMass,
		density(r) {
			if (r === 0) return cusp ? Infinity : density0;
			const x = r / rs;
			return density0 * x ** -gamma * (1 + x ** alpha) ** ((gamma - beta) / alpha);
		},
		potential(r) {
			if (r > 0) return -surface * outside(r / rs) - (G * enclosedMass(r)) / r;
			if (gamma >= 2) return -Infinity;
			return -surface * (outsideFromSeam + betaBelow(near, far, outsideSeam));
		},
		escapable: true
	};
}

/**
 * ρ = ρ0 x^−γ (1 + x^α)^((γ−β)/α), x = r/scaleRadius: slope γ inside, β outside, α how sharp the turn.
 * (1, 3, 1) is the NFW halo, (2, 5, 0) a Plummer sphere. With β up to 3 the mass has no end, yet stars
 * can escape. Zhao 1996, MNRAS 278, 488.
 */
export const doublePowerLaw: ComponentMaker = {
	info: {
		kind: 'double-power-law',
		label: 'Double power law',
		help: 'A round body with one slope inside, another outside, and a turn between them.',
		lit: false,
		shape: 'sphere',
		parameterSets: [
			{
				id: 'density',
				label: 'Density, size and slopes',
				parameters: [
					densityParameter({
						initial: 1e7,
						help: 'Sets how dense the body is around its scale radius.'
					}),
					lengthParameter({
						name: 'scaleRadius',
						label: 'Scale radius',
						initial: 10,
						usualMin: 1,
						usualMax: 100,
						help: 'Where the inner slope turns into the outer.'
					}),
					slope(
						'alpha',
						'Sharpness of the turn',
						0.3,
						10,
						[0.5, 4],
						1,
						'Large is a sudden turn, small a gradual one.'
					),
					slope(
						'beta',
						'Outer slope',
						2.1,
						10,
						[2.5, 6],
						3,
						'How fast the density falls far out; 3 is usual for halos.'
					),
					slope(
						'gamma',
						'Inner slope',
						0,
						2.99,
						[0, 2],
						1,
						'How steeply the density rises towards the centre: 0 is flat.'
					)
				]
			}
		],
		source: 'Zhao 1996, MNRAS 278, 488'
	},
	make: ({ density, scaleRadius, alpha, beta, gamma }) =>
		sphericalComponent(profile(density, scaleRadius, alpha, beta, gamma))
};

function slope(
	name: string,
	label: string,
	min: number,
	max: number,
	[usualMin, usualMax]: [number, number],
	initial: number,
	help: string
) {
	const scale = 'linear' as const;
	return {
		name,
		label,
		unit: '',
		min,
		max,
		usualMin,
		usualMax,
		step: 0.01,
		scale,
		initial,
		optional: false,
		help
	};
}
