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
	| 'burkert'
	| 'jaffe'
	| 'isochrone'
	| 'dehnen'
	| 'sersic'
	| 'einasto'
	| 'double-power-law'
	| 'logarithmic'
	| 'tabulated';

/** A number, a choice by its name (such as "sech2"), or a list of numbers. */
export type ParameterValue = number | string | readonly number[];
export type Parameters = Record<string, ParameterValue>;

export interface ComponentSpec {
	/** Stable within the model; live controls refer to it. */
	id: string;
	kind: ComponentKind;
	/** What people call it, such as "Stellar disc". The core does not read it. */
	name?: string;
	/** By the names in `componentKinds`; kpc, km/s, Msun and combinations. */
	parameters: Parameters;
	/** true for stars and gas, false for a halo. */
	lit: boolean;
	/** Multiplies the component's mass; 0 takes it away. 1 where missing. */
	factor?: number;
}

export interface MassModelSpec {
	components: ComponentSpec[];
	/** How the pull follows from the matter; Newton's where missing. Others take lit matter only. */
	law?: GravityLaw;
}

export type GravityLaw = 'newton' | 'radial-acceleration' | 'modified-simple' | 'modified-standard';

/** Acceleration in the meridional plane, (km/s)²/kpc; negative is inward (R) and downward (z). */
export interface Acceleration {
	R: number;
	z: number;
}

/** Squares of the three frequencies of nearly circular orbits in the plane, (km/s/kpc)². */
export interface FrequencySums {
	/** Ω². */
	omega: number;
	/** κ² = R dΩ²/dR + 4Ω². */
	kappa: number;
	/** ν² = ∂²Φ/∂z² at z = 0. */
	nu: number;
}

/**
 * What one component must answer. R cylindrical radius (not negative), z height of either sign,
 * r spherical radius, all in kpc. Everything is linear in the mass, so `factor` is applied outside.
 */
export interface MassComponent {
	/** v² in the plane, (km/s)². May be negative where a component pulls outward. */
	circularVelocitySquared(R: number): number;
	/**
	 * Adds scale times its Ω², κ² and ν² to `sums`: one call, so that what they share is computed once.
	 * `sheetHeight` (kpc) is the exponential scale height to lend a razor-thin disc for ν²;
	 * at 0 the disc stays razor-thin and ν² is Infinity wherever there is matter in the plane.
	 */
	addFrequenciesSquared(R: number, scale: number, sheetHeight: number, sums: FrequencySums): void;
	/** Msun: inside the sphere r, for discs inside the cylinder R. */
	enclosedMass(r: number): number;
	/** (km/s)². */
	potential(R: number, z: number): number;
	/** Adds to `out`, so that components can be summed without allocation. (km/s)²/kpc. */
	addAcceleration(R: number, z: number, scale: number, out: Acceleration): void;
	/** Msun/kpc³. A razor-thin disc: 0 off the plane, Infinity in it where there is matter. */
	density(R: number, z: number): number;
	/** Msun/kpc² of matter lying exactly in the plane; 0 for everything that has thickness. */
	sheetDensity(R: number): number;
	/** False where the total mass is infinite in such a way that nothing escapes. */
	readonly escapable: boolean;
}

export interface MassModel {
	readonly spec: MassModelSpec;
	/** km/s at cylindrical radius R (kpc) in the plane; 0 where the net pull is outward. */
	circularVelocity(R: number): number;
	/** Ω, km/s/kpc; 0 where the net pull is outward. */
	circularFrequency(R: number): number;
	/** κ, km/s/kpc; NaN where κ² is negative (circular orbits are unstable there). */
	epicycleFrequency(R: number): number;
	/**
	 * ν, km/s/kpc; NaN where ν² is negative. Infinity in the matter of a razor-thin disc, unless
	 * `sheetHeight` (kpc, 0 where missing) lends such discs an exponential scale height.
	 */
	verticalFrequency(R: number, sheetHeight?: number): number;
	/** Adds Ω², κ² and ν² at R to `sums`: what tables are filled with. */
	addFrequenciesSquared(R: number, sheetHeight: number, sums: FrequencySums): void;
	/** Msun; a disc counts its own mass inside the cylinder. Not the dynamical mass v²R/G. */
	enclosedMass(r: number): number;
	/** v²R/G, Msun: the mass a spherical body would need for the same speed. */
	dynamicalMass(R: number): number;
	/** (km/s)². NaN under a law other than Newton's: it gives pulls, not a potential. */
	potential(R: number, z: number): number;
	/** (km/s)²/kpc, written to `out` and returned. */
	acceleration(R: number, z: number, out: Acceleration): Acceleration;
	/** Msun/kpc³. With a razor-thin disc: Infinity at z = 0 where the disc has matter. */
	density(R: number, z: number): number;
	/** Msun/kpc² lying exactly in the plane: the razor-thin discs. */
	sheetDensity(R: number): number;
	/** km/s in the plane; Infinity where nothing escapes, as under every law but Newton's. */
	escapeVelocity(R: number): number;
	/** The same model with the lit components only. Cheap: nothing is computed anew. */
	lit(): MassModel;
	/** The same model with the unlit components only. */
	unlit(): MassModel;
	/** One component's factor replaced. @throws ParameterError unknown id, or outside 0 to 10 */
	withFactor(componentId: string, factor: number): MassModel;
	/** All lit and all unlit factors multiplied. @throws ParameterError where one leaves 0 to 10 */
	mixed(scales: { lit: number; unlit: number }): MassModel;
}

/** One parameter as a form needs it. */
export interface ParameterInfo {
	name: string;
	/** Plain words for a label, such as "Mass" or "Scale length". */
	label: string;
	/** Empty for a pure number. */
	unit: string;
	/** Hard limits, both allowed: outside them the parameter is refused. */
	min: number;
	max: number;
	/** Ends for a slider: where real galaxies are. Within min and max. */
	usualMin: number;
	usualMax: number;
	/** Least useful step; on a `log` scale a ratio step is derived from it by the form. */
	step: number;
	scale: 'linear' | 'log';
	/** A sensible value to begin with. */
	initial: number;
	/** May be left out; `initial` then stands. Where also min = max, a form has nothing to ask. */
	optional: boolean;
	/** One sentence for people who are not astronomers. */
	help: string;
}

/** A parameter that is one of a few words. It may be left out; `initial` then stands. */
export interface ChoiceInfo {
	name: string;
	label: string;
	options: { value: string; label: string }[];
	initial: string;
	help: string;
}

/** A parameter that is a list of numbers; always asked for. */
export interface ListInfo {
	name: string;
	label: string;
	unit: string;
	/** Limits of each number, both allowed. */
	min: number;
	max: number;
	/** Fewest and most numbers. */
	least: number;
	most: number;
	/** Each number must be above the one before it. */
	rising: boolean;
	/** Name of another list that must be as long. */
	asLongAs?: string;
	/** A sensible list to begin with. */
	initial: readonly number[];
	help: string;
}

export interface ParameterSet {
	/** Such as "density" or "mass200": which way of giving the parameters this is. */
	id: string;
	label: string;
	/** Those that are numbers, in the order a form asks. */
	parameters: ParameterInfo[];
	choices?: ChoiceInfo[];
	lists?: ListInfo[];
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
