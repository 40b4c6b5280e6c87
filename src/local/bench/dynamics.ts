import { fitRotationCurve, massModel, tabulateFrequencies } from '../../lib/dynamics';
import type { FitOptions, MassModelSpec } from '../../lib/dynamics';
import { inventMeasurements } from '../../lib/measurements/invent';
import { readMeasurements } from '../../lib/measurements/readMeasurements';
import { createRingTable, seededRandom, setModel } from '../../lib/starfield';
import { times, type Times } from './subject';

const threeComponents: MassModelSpec = {
	components: [
		{ id: 'bulge', kind: 'hernquist', parameters: { mass: 9e9, scaleLength: 0.6 }, lit: true },
		{
			id: 'disc',
			kind: 'miyamoto-nagai',
			parameters: { mass: 6e10, scaleLength: 3, scaleHeight: 0.3 },
			lit: true
		},
		{ id: 'halo', kind: 'nfw', parameters: { density: 8e6, scaleRadius: 20 }, lit: false }
	]
};

/** The same with another halo each time, as under a moving slider. */
const turned = (turn: number): MassModelSpec => ({
	components: threeComponents.components.map((one) =>
		one.lit
			? one
			: { ...one, parameters: { ...one.parameters, density: 4e6 * (1 + (turn % 90) / 90) } }
	)
});

/** A retune of bulge, disc and halo: Ω, κ and ν at 1,024 radii. */
export function benchSmallRetune(runs = 300): Times {
	const { radii } = createRingTable(25);
	const make = () => new Float64Array(radii.length);
	const out = { omega: make(), kappa: make(), nu: make() };
	let turn = 0;
	return times(() => void tabulateFrequencies(massModel(turned(turn++)), radii, out), runs, 30);
}

/** A million stars get their speeds: the ring table from the model, then each star from its ring. */
export function benchMillionSpeeds(runs = 60): Times {
	const table = createRingTable(25);
	const random = seededRandom(7);
	const ring = Uint16Array.from({ length: 1e6 }, () => Math.floor(1024 * random.next()));
	const speeds = new Float32Array(ring.length);
	let turn = 0;
	return times(() => {
		setModel(table, massModel(turned(turn++)));
		const ringSpeed = table.radii.map((R, k) => R * table.omega[k]);
		for (let i = 0; i < ring.length; i++) speeds[i] = ringSpeed[ring[i]];
	}, runs);
}

/** Fits of three parameters to 30 invented points: light from a table, and a halo. All starts. */
export function benchFit(runs = 60): Times {
	const fits = Array.from({ length: 8 }, (_, i) => inventedFit(i + 1));
	let turn = 0;
	return times(() => void fitRotationCurve(fits[turn++ % fits.length]), runs, 40);
}

function inventedFit(seed: number): FitOptions {
	const truth = massModel(turned(20 * seed));
	const points = inventMeasurements(truth, { from: 0.8, to: 28, points: 30, error: 5, seed });
	const radii = points.map(({ radius }) => radius);
	const light = truth.lit();
	const spec: MassModelSpec = {
		components: [
			{
				id: 'light',
				kind: 'tabulated',
				parameters: {
					radii,
					speeds: radii.map((R) => light.circularVelocity(R)),
					massToLight: 0.5
				},
				lit: true
			},
			{ id: 'halo', kind: 'nfw', parameters: { density: 1e7, scaleRadius: 10 }, lit: false }
		]
	};
	const free = [
		{ componentId: 'light', parameter: 'massToLight', min: 0.05, max: 5 },
		{ componentId: 'halo', parameter: 'density' },
		{ componentId: 'halo', parameter: 'scaleRadius' }
	];
	return { spec, points, free, seed };
}

/** Reading 20,000 rows of measured speeds, filled up with comments to almost 5 MB. */
export function benchRead(runs = 10): Times {
	const rows = Array.from(
		{ length: 20_000 },
		(_, i) => `${(i + 1) / 100},${120 + (i % 90)},${3 + (i % 5)}`
	);
	const comment = `# ${'a remark of no further interest '.repeat(6)}`;
	const comments = new Array<string>(Math.floor(4.4e6 / comment.length)).fill(comment);
	const text = ['radius (kpc),speed (km/s),error (km/s)', ...comments, ...rows].join('\n');
	return times(() => void readMeasurements(text), runs, 2);
}
