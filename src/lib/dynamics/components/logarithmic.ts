import { G } from '../../units';
import type { ComponentMaker } from './ComponentMaker';
import { gaussLegendre } from './gaussLegendre';
import { lengthParameter } from './parameters';

const rule = gaussLegendre(24);

/**
 * Φ = (v0²/2) ln(Rc² + R² + z²/q²), lengths in kpc: v0 = speed, Rc = coreRadius, q = axisRatio of the
 * potential. The speed rises to v0 and stays; the mass has no end and nothing escapes. Below
 * q = 0.7071 the density would be negative on the axis, so that is refused.
 * The mass inside the sphere r is the flux of the pull through it (Gauss), one smooth integral.
 * Binney and Tremaine 2008, Sec. 2.3.2.
 */
export const logarithmic: ComponentMaker = {
	info: {
		kind: 'logarithmic',
		label: 'Flat-curve halo',
		help: 'A halo made so that the speed is the same everywhere outside its core; it may be flattened.',
		lit: false,
		shape: 'sphere',
		parameterSets: [
			{
				id: 'speed',
				label: 'Speed and core',
				parameters: [
					{
						name: 'speed',
						label: 'Speed far out',
						unit: 'km/s',
						min: 0.1,
						max: 2000,
						usualMin: 20,
						usualMax: 400,
						step: 1,
						scale: 'linear',
						initial: 200,
						optional: false,
						help: 'The speed that stars reach outside the core.'
					},
					lengthParameter({
						name: 'coreRadius',
						label: 'Core radius',
						initial: 5,
						usualMax: 50,
						help: 'Inside this radius the halo is of one density.'
					}),
					{
						name: 'axisRatio',
						label: 'Axis ratio',
						unit: '',
						min: 0.7072,
						max: 2,
						usualMin: 0.75,
						usualMax: 1.25,
						step: 0.01,
						scale: 'linear',
						initial: 1,
						optional: false,
						help: 'Height over width of the pull’s shape: 1 is round, below it flattened.'
					}
				]
			}
		],
		source: 'Binney and Tremaine 2008, Sec. 2.3.2'
	},
	make({ speed, coreRadius, axisRatio }) {
		const v2 = speed * speed;
		const core = coreRadius * coreRadius;
		const stretch = 1 / (axisRatio * axisRatio);
		return {
			circularVelocitySquared: (R) => (v2 * R * R) / (core + R * R),
			addFrequenciesSquared(R, scale, _sheetHeight, sums) {
				const square = core + R * R;
				const omega = (scale * v2) / square;
				sums.omega += omega;
				sums.kappa += (omega * (4 * core + 2 * R * R)) / square;
				sums.nu += omega * stretch;
			},
			enclosedMass(r) {
				let sum = 0;
				for (let i = 0; i < rule.nodes.length; i++) {
					const mu = 0.5 * (1 + rule.nodes[i]);
					const square = r * r * (1 + (stretch - 1) * mu * mu);
					sum += (rule.weights[i] * square) / (core + square);
				}
				return (0.5 * sum * r * v2) / G;
			},
			potential: (R, z) => 0.5 * v2 * Math.log(core + R * R + z * z * stretch),
			addAcceleration(R, z, scale, out) {
				const pull = (scale * v2) / (core + R * R + z * z * stretch);
				out.R -= pull * R;
				out.z -= pull * z * stretch;
			},
			density(R, z) {
				const square = core + R * R + z * z * stretch;
				const shape = (2 + stretch) * core + stretch * R * R + stretch * (2 - stretch) * z * z;
				return (v2 * shape) / (4 * Math.PI * G * square * square);
			},
			sheetDensity: () => 0,
			escapable: false
		};
	}
};
