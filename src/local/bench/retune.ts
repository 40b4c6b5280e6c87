import { massModel, tabulateFrequencies, type MassModelSpec } from '../../lib/dynamics';
import { createRingTable } from '../../lib/starfield';
import { times, type Times } from './subject';

const disc = (id: string, surfaceDensity: number, scaleLength: number) => ({
	id,
	kind: 'exponential-disk' as const,
	parameters: { surfaceDensity, scaleLength, scaleHeight: 0, holeRadius: 0 },
	lit: true
});

/** Eight parts of a large galaxy, of six kinds. */
const eightComponents: MassModelSpec = {
	components: [
		{ id: 'nucleus', kind: 'point-mass', parameters: { mass: 4.2e6 }, lit: true },
		{ id: 'bulge', kind: 'hernquist', parameters: { mass: 9e9, scaleLength: 0.6 }, lit: true },
		{ id: 'core', kind: 'plummer', parameters: { mass: 6e8, scaleLength: 0.2 }, lit: true },
		disc('thin', 6e8, 2.6),
		disc('thick', 1.2e8, 3.2),
		disc('gas', 2e7, 7),
		{
			id: 'outer',
			kind: 'miyamoto-nagai',
			parameters: { mass: 6e9, scaleLength: 6, scaleHeight: 0.4 },
			lit: true
		},
		{ id: 'halo', kind: 'nfw', parameters: { density: 8e6, scaleRadius: 20 }, lit: false }
	]
};

/** A full retune: the model made anew from changed numbers, and Ω, κ and ν at every ring of stars. */
export function benchRetune(runs = 300): Times {
	const { radii } = createRingTable(25);
	const out = {
		omega: new Float64Array(radii.length),
		kappa: new Float64Array(radii.length),
		nu: new Float64Array(radii.length)
	};
	let turn = 0;
	return times(
		() => {
			// Another factor each time, as under a moving slider.
			const factor = 0.5 + (turn++ % 100) / 100;
			const components = eightComponents.components.map((component) =>
				component.lit ? component : { ...component, factor }
			);
			tabulateFrequencies(massModel({ components }), radii, out);
		},
		runs,
		30
	);
}
