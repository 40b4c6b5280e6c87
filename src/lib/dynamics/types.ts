/** Names of the mass components this version can compute. */
export type ComponentKind =
	| 'point-mass'
	| 'plummer'
	| 'hernquist'
	| 'miyamoto-nagai'
	| 'exponential-disk'
	| 'kuzmin-disk'
	| 'nfw'
	| 'pseudo-isothermal'
	| 'burkert';

export interface ComponentSpec {
	/** Stable within the model; live controls refer to it. */
	id: string;
	kind: ComponentKind;
	/** What people call it, such as "Stellar disc". The core does not read it. */
	name?: string;
	/** By the names in `componentKinds`; kpc, km/s, Msun and combinations. */
	parameters: Record<string, number>;
	/** true for stars and gas, false for a halo. */
	lit: boolean;
	/** Multiplies the component's mass; 0 takes it away. 1 where missing. */
	factor?: number;
}

export interface MassModelSpec {
	components: ComponentSpec[];
	/** Only Newton's law is computed in this version. */
	law?: 'newton';
}

/** Acceleration in the meridional plane, (km/s)²/kpc; negative is inward (R) and downward (z). */
export interface Acceleration {
	R: number;
	z: number;
}

/**
 * What one component must answer. R cylindrical radius, z height, r spherical radius, all in kpc.
 * Everything is linear in the mass, so `factor` is applied outside.
 */
export interface MassComponent {
	/** v² in the plane, (km/s)². May be negative where a component pulls outward. */
	circularVelocitySquared(R: number): number;
	/** κ² in the plane, (km/s/kpc)²: R dΩ²/dR + 4Ω². */
	epicycleFrequencySquared(R: number): number;
	/** ν² in the plane, (km/s/kpc)²: ∂²Φ/∂z² at z = 0. May be Infinity for razor-thin discs. */
	verticalFrequencySquared(R: number): number;
	/** Msun: inside the sphere r, for discs inside the cylinder R. */
	enclosedMass(r: number): number;
	/** (km/s)². */
	potential(R: number, z: number): number;
	/** Adds to `out`, so that components can be summed without allocation. (km/s)²/kpc. */
	addAcceleration(R: number, z: number, scale: number, out: Acceleration): void;
	/** Msun/kpc³. */
	density(R: number, z: number): number;
	/** False where the total mass is infinite in such a way that nothing escapes. */
	readonly escapable: boolean;
}

export interface MassModel {
	readonly spec: MassModelSpec;
	/** km/s at cylindrical radius R (kpc) in the plane; NaN where the net pull is outward. */
	circularVelocity(R: number): number;
	/** Ω, km/s/kpc. */
	circularFrequency(R: number): number;
	/** κ, km/s/kpc; NaN where κ² is negative (circular orbits are unstable there). */
	epicycleFrequency(R: number): number;
	/** ν, km/s/kpc; NaN where ν² is negative. */
	verticalFrequency(R: number): number;
	/** Msun; a disc counts its own mass inside the cylinder. Not the dynamical mass v²R/G. */
	enclosedMass(r: number): number;
	/** v²R/G, Msun: the mass a spherical body would need for the same speed. */
	dynamicalMass(R: number): number;
	/** (km/s)². */
	potential(R: number, z: number): number;
	/** (km/s)²/kpc, written to `out` and returned. */
	acceleration(R: number, z: number, out: Acceleration): Acceleration;
	/** Msun/kpc³. */
	density(R: number, z: number): number;
	/** km/s in the plane; Infinity where nothing escapes. */
	escapeVelocity(R: number): number;
	lit(): MassModel;
	unlit(): MassModel;
	withFactor(componentId: string, factor: number): MassModel;
}

/** One parameter as a form needs it. */
export interface ParameterInfo {
	name: string;
	/** Plain words for a label, such as "Mass" or "Scale length". */
	label: string;
	unit: string;
	min: number;
	max: number;
	/** Least useful step; on a `log` scale a ratio step is derived from it by the form. */
	step: number;
	scale: 'linear' | 'log';
	/** A sensible value to begin with. */
	initial: number;
	/** One sentence for people who are not astronomers. */
	help: string;
}

export interface ParameterSet {
	/** Such as "density" or "mass200": which way of giving the parameters this is. */
	id: string;
	label: string;
	parameters: ParameterInfo[];
}

export interface ComponentKindInfo {
	kind: ComponentKind;
	/** Such as "Exponential disc". */
	label: string;
	/** One sentence: what this shape is for. */
	help: string;
	/** Usual nature of the component, a starting value for the form. */
	lit: boolean;
	shape: 'sphere' | 'disc';
	/** First is the default; nfw has two. */
	parameterSets: ParameterSet[];
	/** Author, year, journal. */
	source: string;
}
