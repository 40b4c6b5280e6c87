import type { MassModelSpec } from '../types';

/** A speed to be met; radius kpc, speed and one standard error km/s. */
export interface FitPoint {
	radius: number;
	speed: number;
	error: number;
}

/** A parameter that the fit may move. */
export interface FreeParameter {
	componentId: string;
	/** A numeric parameter of the component, or "factor". */
	parameter: string;
	/** Bounds; those of the parameter itself where missing. */
	min?: number;
	max?: number;
}

export interface FitOptions {
	/** Where to begin; whatever is not free stays as it is. */
	spec: MassModelSpec;
	points: readonly FitPoint[];
	free: readonly FreeParameter[];
	/** Whole number; the same seed gives the same starts. */
	seed?: number;
	/** How many starts, the given spec among them. */
	starts?: number;
	/** Told after every start of the best so far. */
	onProgress?: (progress: FitProgress) => void;
	/** Asked between starts; true ends the fit with the best so far. */
	shouldStop?: () => boolean;
}

export interface FitProgress {
	/** Starts done and in all. */
	done: number;
	of: number;
	chiSquared: number;
	spec: MassModelSpec;
}

export interface FittedParameter {
	componentId: string;
	parameter: string;
	/** Empty for a pure number. */
	unit: string;
	/** Fitted as its logarithm where "log". */
	scale: 'linear' | 'log';
	min: number;
	max: number;
	value: number;
	/** One standard error in the parameter's own unit; NaN where the data say nothing of it. */
	error: number;
	/** At which of its bounds it ended. */
	atBound: 'min' | 'max' | null;
}

export interface FitResult {
	/** The spec with the best values put in. */
	spec: MassModelSpec;
	parameters: FittedParameter[];
	/** In the units of the parameters, row by row; NaN for those without an error. */
	covariance: number[][];
	correlation: number[][];
	chiSquared: number;
	/** Points less free parameters. */
	degreesOfFreedom: number;
	/** χ² over the degrees of freedom; NaN where there are none. */
	reducedChiSquared: number;
	converged: boolean;
	/** Steps of all starts together. */
	iterations: number;
	starts: number;
	/** Starts that ended at the same χ² within 1e-6. */
	agreeing: number;
	seed: number;
	/** A plain sentence where the data cannot decide between values; null where they can. */
	undecided: string | null;
	/** Measured less model at each point, km/s. */
	residuals: Float64Array;
}
