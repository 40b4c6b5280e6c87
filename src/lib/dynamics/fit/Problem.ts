import { makers, parameterSetOf } from '../componentKinds';
import { pullUnder } from '../laws';
import { ParameterError } from '../ParameterError';
import { givenNames, numbersOf, wordsAndListsOf } from '../parameterValues';
import { specIssues, specLimits } from '../specIssues';
import type { ComponentSpec, GravityLaw, MassModelSpec, ParameterInfo } from '../types';
import type { FreeParameter } from './types';

/** Parameters in which v² is linear: the shape is computed once and only rescaled. */
const linearNames: readonly string[] = [
	'mass',
	'density',
	'surfaceDensity',
	'massToLight',
	'factor'
];

/** A free parameter as the solver moves it: by its logarithm where its scale is one. */
export interface Coordinate {
	componentId: string;
	parameter: string;
	info: Pick<ParameterInfo, 'label' | 'unit' | 'usualMin' | 'usualMax'>;
	scale: 'linear' | 'log';
	/** In the parameter's own unit. */
	min: number;
	max: number;
	/** v² is proportional to it, given the shape. */
	linear: boolean;
}

interface Part {
	spec: ComponentSpec;
	/** Index of the coordinate by name of the parameter. */
	free: Map<string, number>;
	/** v² at the radii with every linear free parameter at 1. */
	unit: Float64Array;
	/** Whether `unit` depends on a coordinate. */
	shaped: boolean;
	/** Shape coordinates `unit` was computed for. */
	at: number[];
}

/** v² of a model at fixed radii as a function of its free parameters. */
export class Problem {
	readonly radii: Float64Array;
	readonly coordinates: readonly Coordinate[];
	readonly #law: GravityLaw;
	readonly #fixed: Float64Array;
	readonly #parts: Part[];
	readonly #pull = { pull: 0, slope: 0 };

	/**
	 * @param radii kpc
	 * @throws ParameterError where the spec or a free parameter is not to be had, by name
	 */
	constructor(spec: MassModelSpec, free: readonly FreeParameter[], radii: ArrayLike<number>) {
		const [issue] = specIssues(spec);
		if (issue) throw new ParameterError(issue);
		this.radii = Float64Array.from(radii);
		this.#law = spec.law ?? 'newton';
		this.coordinates = free.map((one) => coordinateOf(spec, one));
		this.#fixed = new Float64Array(this.radii.length);
		this.#parts = [];
		for (const component of spec.components) this.#add(component, free);
	}

	get size(): number {
		return this.coordinates.length;
	}

	#add(component: ComponentSpec, free: readonly FreeParameter[]): void {
		const own = new Map<string, number>();
		free.forEach(({ componentId, parameter }, i) => {
			if (componentId === component.id) own.set(parameter, i);
		});
		const shape = [...own.keys()].filter((name) => !linearNames.includes(name));
		const part: Part = {
			spec: component,
			free: own,
			unit: new Float64Array(this.radii.length),
			shaped: shape.length > 0,
			at: shape.map(() => NaN)
		};
		if (own.size === 0) {
			this.#shape(part, part.unit, []);
			for (let i = 0; i < this.radii.length; i++) this.#fixed[i] += part.unit[i];
			return;
		}
		if (!part.shaped) this.#shape(part, part.unit, []);
		this.#parts.push(part);
	}

	/** Fills `out` with v² of a part whose linear free parameters are 1. */
	#shape(part: Part, out: Float64Array, values: readonly number[]): void {
		const { spec, free } = part;
		const set = parameterSetOf(spec.kind, givenNames(spec.parameters));
		const numbers = numbersOf(spec.parameters, set);
		for (const [name, index] of free) {
			if (name === 'factor') continue;
			numbers[name] = linearNames.includes(name) ? 1 : values[index];
		}
		const component = makers[spec.kind].make(numbers, wordsAndListsOf(spec.parameters, set));
		const factor = free.has('factor') ? 1 : (spec.factor ?? 1);
		for (let i = 0; i < out.length; i++) {
			out[i] = factor === 0 ? 0 : factor * component.circularVelocitySquared(this.radii[i]);
		}
	}

	/** v² of a part, all but what is linear in it, for values; computed again only for a new shape. */
	#unitOf(part: Part, values: readonly number[]): Float64Array {
		if (!part.shaped) return part.unit;
		let k = 0;
		let same = true;
		for (const [name, index] of part.free) {
			if (linearNames.includes(name)) continue;
			if (part.at[k] !== values[index]) {
				part.at[k] = values[index];
				same = false;
			}
			k++;
		}
		if (!same) this.#shape(part, part.unit, values);
		return part.unit;
	}

	#scaleOf(part: Part, values: readonly number[]): number {
		let scale = 1;
		for (const [name, index] of part.free) if (linearNames.includes(name)) scale *= values[index];
		return scale;
	}

	/** Newton's v² at the radii. @param values one a coordinate, in the parameters' own units */
	speedsSquared(values: readonly number[], out: Float64Array): Float64Array {
		out.set(this.#fixed);
		for (const part of this.#parts) {
			const unit = this.#unitOf(part, values);
			const scale = this.#scaleOf(part, values);
			for (let i = 0; i < out.length; i++) out[i] += scale * unit[i];
		}
		return out;
	}

	/**
	 * Speeds under the model's law and, column by column, their derivatives by the solver's
	 * coordinates: exact where v² is linear in the parameter, by central differences of 1e-4 where it
	 * shapes a component.
	 */
	speedsAndSlopes(values: readonly number[], speeds: Float64Array, slopes: Float64Array[]): void {
		const n = this.radii.length;
		const newton = this.speedsSquared(values, speeds);
		for (const part of this.#parts) {
			const scale = this.#scaleOf(part, values);
			const unit = this.#unitOf(part, values);
			for (const [name, index] of part.free) {
				if (!linearNames.includes(name)) continue;
				const by = this.coordinates[index].scale === 'log' ? scale : scale / values[index];
				for (let i = 0; i < n; i++) slopes[index][i] = by * unit[i];
			}
		}
		for (const part of this.#parts) if (part.shaped) this.#differences(part, values, slopes);
		for (let i = 0; i < n; i++) {
			const R = this.radii[i];
			let slope = 1;
			let square = newton[i];
			if (this.#law !== 'newton' && square > 0) {
				pullUnder(this.#law, square / R, this.#pull);
				square = this.#pull.pull * R;
				slope = this.#pull.slope;
			}
			const speed = Math.sqrt(Math.max(0, square));
			// A speed of 0 has no slope to follow; a metre a second stands in for it.
			const by = slope / (2 * Math.max(speed, 1e-3));
			speeds[i] = speed;
			for (const column of slopes) column[i] *= by;
		}
	}

	#differences(part: Part, values: readonly number[], slopes: Float64Array[]): void {
		const n = this.radii.length;
		const scale = this.#scaleOf(part, values);
		for (const [name, index] of part.free) {
			if (linearNames.includes(name)) continue;
			const { scale: kind, min, max } = this.coordinates[index];
			const value = values[index];
			const step = kind === 'log' ? 1e-4 : 1e-4 * (max - min);
			const moved = (by: number) =>
				Math.min(max, Math.max(min, kind === 'log' ? value * Math.exp(by) : value + by));
			const [low, high] = [moved(-step), moved(step)];
			const between = kind === 'log' ? Math.log(high / low) : high - low;
			const column = slopes[index];
			const below = new Float64Array(n);
			this.#shape(part, below, values.with(index, low));
			this.#shape(part, column, values.with(index, high));
			for (let i = 0; i < n; i++) column[i] = (scale * (column[i] - below[i])) / between;
		}
	}
}

function coordinateOf(spec: MassModelSpec, free: FreeParameter): Coordinate {
	const { componentId, parameter } = free;
	const component = spec.components.find(({ id }) => id === componentId);
	const refuse = (message: string): never => {
		throw new ParameterError({ path: ['free'], componentId, parameter, message });
	};
	if (!component) return refuse(`This model has no component "${componentId}" to be free.`);
	const set = parameterSetOf(component.kind, givenNames(component.parameters));
	const info: Coordinate['info'] & Pick<ParameterInfo, 'min' | 'max' | 'scale'> =
		parameter === 'factor'
			? {
					label: 'Factor',
					...specLimits.factor,
					usualMin: 0.1,
					usualMax: 3,
					scale: 'linear'
				}
			: (set.parameters.find(({ name }) => name === parameter) ??
				refuse(
					`"${componentId}" has no number "${parameter}"; it has ${set.parameters.map(({ name }) => name).join(', ')}.`
				));
	const min = Math.max(info.min, free.min ?? info.min);
	const max = Math.min(info.max, free.max ?? info.max);
	if (!(min < max)) {
		refuse(`The bounds of ${parameter} must be apart and within ${info.min} to ${info.max}.`);
	}
	// A ratio that may not be 0 is felt by its ratio too.
	const log = min > 0 && (info.scale === 'log' || parameter === 'massToLight');
	return {
		componentId,
		parameter,
		info,
		scale: log ? 'log' : 'linear',
		min,
		max,
		linear: linearNames.includes(parameter)
	};
}
