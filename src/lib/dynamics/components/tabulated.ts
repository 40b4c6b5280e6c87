import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { gaussLegendre } from './gaussLegendre';
import { monotoneCurve } from './monotoneCurve';
import { sphericalComponent } from './sphericalComponent';

const rule = gaussLegendre(12);

/**
 * A component known only by the speed it would give alone, as tables of gas and stars come:
 * v² = massToLight × V|V|, so that a negative V pulls outward and speeds grow with the square root of
 * the mass-to-light ratio. Between the points V follows a monotone curve from V = 0 at the centre;
 * beyond the last point all of the mass is inside, v² ∝ 1/R. What the speeds alone do not tell is
 * taken as if the matter were round: mass v²r/G, density, potential, and ν = Ω. The density is then
 * negative where v²r falls, as it does around a hole in the gas.
 * Units of the lists kpc and km/s. Rule of V|V|: Lelli, McGaugh and Schombert 2016, AJ 152, 157.
 */
export const tabulated: ComponentMaker = {
	info: {
		kind: 'tabulated',
		label: 'Tabulated light',
		help: 'Speeds that the measured light or gas would give by itself, point by point, from a table.',
		lit: true,
		shape: 'disc',
		parameterSets: [
			{
				id: 'table',
				label: 'Points and mass-to-light ratio',
				parameters: [
					{
						name: 'massToLight',
						label: 'Mass-to-light ratio',
						unit: 'Msun/Lsun',
						min: 0.001,
						max: 100,
						usualMin: 0.1,
						usualMax: 5,
						step: 0.01,
						scale: 'linear',
						initial: 1,
						optional: false,
						help: 'How much mass belongs to each unit of light. For gas it is 1.'
					}
				],
				lists: [
					{
						name: 'radii',
						label: 'Radii',
						unit: 'kpc',
						min: 1e-4,
						max: 1000,
						least: 2,
						most: 5000,
						rising: true,
						initial: [1, 2, 4, 8, 16],
						help: 'Distance from the centre of each point.'
					},
					{
						name: 'speeds',
						label: 'Speeds',
						unit: 'km/s',
						min: -2000,
						max: 2000,
						least: 2,
						most: 5000,
						rising: false,
						asLongAs: 'radii',
						initial: [40, 65, 85, 80, 60],
						help: 'Speed this matter alone would give at mass-to-light 1; below 0 it pulls outward.'
					}
				]
			}
		],
		source: 'Lelli, McGaugh and Schombert 2016, AJ 152, 157'
	},
	make({ massToLight }, { lists: { radii, speeds } }) {
		const x = Float64Array.of(0, ...radii);
		const curve = monotoneCurve(x, Float64Array.of(0, ...speeds));
		const end = x[x.length - 1];
		const endSpeed = speeds[speeds.length - 1];
		/** v²r at and beyond the last point. */
		const all = massToLight * endSpeed * Math.abs(endSpeed) * end;
		const own = { value: 0, slope: 0 };

		function speedSquared(r: number): number {
			if (r >= end) return all / r;
			curve.at(r, own);
			return massToLight * own.value * Math.abs(own.value);
		}
		/** d(v²r)/dr. */
		function growth(r: number): number {
			if (r >= end) return 0;
			curve.at(r, own);
			const { value, slope } = own;
			return massToLight * (value * Math.abs(value) + 2 * r * Math.abs(value) * slope);
		}
		/** Near the centre V is a straight line, so Ω is one value. */
		function centre(): number {
			curve.at(0, own);
			return massToLight * own.slope * Math.abs(own.slope);
		}
		/** ∫ v²/r dr from a to b within one piece. */
		function fall(a: number, b: number): number {
			let sum = 0;
			const half = 0.5 * (b - a);
			for (let i = 0; i < rule.nodes.length; i++) {
				const r = a + half * (1 + rule.nodes[i]);
				sum += rule.weights[i] * (speedSquared(r) / r);
			}
			return half * sum;
		}
		const potentials = new Float64Array(x.length);
		potentials[x.length - 1] = -all / end;
		for (let i = x.length - 2; i >= 0; i--)
			potentials[i] = potentials[i + 1] - fall(x[i], x[i + 1]);
		return sphericalComponent({
			circularVelocitySquared: (r) => (r === 0 ? 0 : speedSquared(r)),
			circularFrequencySquared: (r) => (r === 0 ? centre() : speedSquared(r) / (r * r)),
			enclosedMass: (r) => (r === 0 ? 0 : (speedSquared(r) * r) / G),
			density: (r) => (r === 0 ? 3 * centre() : growth(r) / (r * r)) / (4 * Math.PI * G),
			potential(r) {
				if (r >= end) return -all / r;
				const above = x.findIndex((one) => one > r);
				return potentials[above] - fall(r, x[above]);
			},
			escapable: true
		});
	}
};
