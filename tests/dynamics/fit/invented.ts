import type {
	ComponentKind,
	ComponentSpec,
	FitPoint,
	MassModelSpec
} from '../../../src/lib/dynamics';

const radii = [0.5, 1, 1.5, 2.5, 4, 6, 8, 10, 13, 16, 20, 25];
const gas = [-3, -2, 4, 9, 14, 19, 22, 24, 25, 24, 22, 20];
const disc = [48, 75, 92, 108, 116, 112, 104, 95, 84, 75, 66, 58];
const speeds = [41, 75, 83, 110, 114, 129, 122, 132, 126, 135, 138, 124];
const errors = [6, 5, 4, 4, 3, 3, 3, 3, 4, 4, 5, 6];

/** Twelve invented points of an invented galaxy; kpc, km/s. */
export const points: FitPoint[] = radii.map((radius, i) => ({
	radius,
	speed: speeds[i],
	error: errors[i]
}));

const light = (id: string, own: number[]): ComponentSpec => ({
	id,
	kind: 'tabulated',
	name: id,
	parameters: { radii, speeds: own, massToLight: 1 },
	lit: true
});

export const lightAlone: MassModelSpec = { components: [light('gas', gas), light('disc', disc)] };

export const withHalo = (
	kind: ComponentKind,
	parameters: Record<string, number>
): MassModelSpec => ({
	components: [...lightAlone.components, { id: 'halo', kind, parameters, lit: false }]
});

/** The stars' mass-to-light ratio within what stars can have. */
export const stars = { componentId: 'disc', parameter: 'massToLight', min: 0.05, max: 5 };
export const halo = (parameter: string) => ({ componentId: 'halo', parameter });
