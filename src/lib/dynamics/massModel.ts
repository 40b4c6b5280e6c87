import { G } from '../units';
import { makers, parameterSetOf } from './componentKinds';
import { ParameterError } from './ParameterError';
import { calledBy, factorWords, isWithin, specIssues, specLimits } from './specIssues';
import type {
	Acceleration,
	ComponentSpec,
	FrequencySums,
	MassComponent,
	MassModel,
	MassModelSpec
} from './types';

/** One component ready to be summed. The component itself is shared between models. */
interface Part {
	spec: ComponentSpec;
	component: MassComponent;
	factor: number;
}

/**
 * @param spec kpc, km/s, Msun and combinations; copied, so that later changes to it do nothing
 * @throws ParameterError naming component, parameter and range, for the first fault found
 */
export function massModel(spec: MassModelSpec): MassModel {
	const [issue] = specIssues(spec);
	if (issue) throw new ParameterError(issue);
	return new ComposedModel(spec.components.map(makePart));
}

function makePart(spec: ComponentSpec): Part {
	const set = parameterSetOf(
		spec.kind,
		Object.keys(spec.parameters).filter((name) => spec.parameters[name] !== undefined)
	);
	const complete = Object.fromEntries(
		set.parameters.map((info) => [info.name, spec.parameters[info.name] ?? info.initial])
	);
	return {
		spec: { ...spec, parameters: { ...spec.parameters } },
		component: makers[spec.kind].make(complete),
		factor: spec.factor ?? 1
	};
}

class ComposedModel implements MassModel {
	readonly #parts: readonly Part[];
	/** Those with a factor above 0: what is taken away adds nothing, not even 0 times Infinity. */
	readonly #present: readonly Part[];
	readonly #sums: FrequencySums = { omega: 0, kappa: 0, nu: 0 };

	constructor(parts: readonly Part[]) {
		this.#parts = parts;
		this.#present = parts.filter((part) => part.factor > 0);
	}

	get spec(): MassModelSpec {
		return {
			components: this.#parts.map(({ spec, factor }) => ({
				...spec,
				parameters: { ...spec.parameters },
				factor
			}))
		};
	}

	circularVelocity(R: number): number {
		return Math.sqrt(this.#sum((component) => component.circularVelocitySquared(R)));
	}

	circularFrequency(R: number): number {
		return Math.sqrt(this.#frequencies(R, 0).omega);
	}

	epicycleFrequency(R: number): number {
		return Math.sqrt(this.#frequencies(R, 0).kappa);
	}

	verticalFrequency(R: number, sheetHeight = 0): number {
		return Math.sqrt(this.#frequencies(R, sheetHeight).nu);
	}

	addFrequenciesSquared(R: number, sheetHeight: number, sums: FrequencySums): void {
		for (const { component, factor } of this.#present) {
			component.addFrequenciesSquared(R, factor, sheetHeight, sums);
		}
	}

	enclosedMass(r: number): number {
		return this.#sum((component) => component.enclosedMass(r));
	}

	dynamicalMass(R: number): number {
		// In the limit R = 0 only a point mass is left, and it is its own dynamical mass.
		if (R === 0) return this.enclosedMass(0);
		return (this.#sum((component) => component.circularVelocitySquared(R)) * R) / G;
	}

	potential(R: number, z: number): number {
		return this.#sum((component) => component.potential(R, z));
	}

	acceleration(R: number, z: number, out: Acceleration): Acceleration {
		out.R = 0;
		out.z = 0;
		for (const { component, factor } of this.#present) {
			component.addAcceleration(R, z, factor, out);
		}
		return out;
	}

	density(R: number, z: number): number {
		return this.#sum((component) => component.density(R, z));
	}

	sheetDensity(R: number): number {
		return this.#sum((component) => component.sheetDensity(R));
	}

	escapeVelocity(R: number): number {
		if (this.#present.some(({ component }) => !component.escapable)) return Infinity;
		// 0 − x, because −2 times nothing would be −0.
		return Math.sqrt(0 - 2 * this.potential(R, 0));
	}

	lit(): MassModel {
		return new ComposedModel(this.#parts.filter(({ spec }) => spec.lit));
	}

	unlit(): MassModel {
		return new ComposedModel(this.#parts.filter(({ spec }) => !spec.lit));
	}

	withFactor(componentId: string, factor: number): MassModel {
		if (!this.#parts.some(({ spec }) => spec.id === componentId)) {
			throw new ParameterError({
				path: ['components'],
				componentId,
				parameter: 'id',
				message: `This model has no component "${componentId}".`
			});
		}
		return this.#rescaled((part) => (part.spec.id === componentId ? factor : part.factor));
	}

	mixed(scales: { lit: number; unlit: number }): MassModel {
		return this.#rescaled((part) => part.factor * (part.spec.lit ? scales.lit : scales.unlit));
	}

	#rescaled(factorOf: (part: Part) => number): MassModel {
		return new ComposedModel(
			this.#parts.map((part, index) => {
				const factor = factorOf(part);
				if (isWithin(factor, specLimits.factor)) return { ...part, factor };
				throw new ParameterError({
					path: ['components', index, 'factor'],
					componentId: part.spec.id,
					parameter: 'factor',
					min: specLimits.factor.min,
					max: specLimits.factor.max,
					message: factorWords(calledBy(part.spec))
				});
			})
		);
	}

	#sum(of: (component: MassComponent) => number): number {
		let sum = 0;
		for (const { component, factor } of this.#present) sum += factor * of(component);
		return sum;
	}

	#frequencies(R: number, sheetHeight: number): FrequencySums {
		const sums = this.#sums;
		sums.omega = 0;
		sums.kappa = 0;
		sums.nu = 0;
		this.addFrequenciesSquared(R, sheetHeight, sums);
		return sums;
	}
}
