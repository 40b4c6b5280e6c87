import { G } from '../units';
import { makers, parameterSetOf } from './componentKinds';
import { boostUnder, pullUnder, sumsUnder } from './laws';
import { ParameterError } from './ParameterError';
import { givenNames, numbersOf, wordsAndListsOf } from './parameterValues';
import { calledBy, factorWords, isWithin, specIssues, specLimits } from './specIssues';
import type {
	Acceleration,
	ComponentSpec,
	FrequencySums,
	GravityLaw,
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
	return new ComposedModel(spec.components.map(makePart), spec.law ?? 'newton');
}

function makePart(spec: ComponentSpec): Part {
	const set = parameterSetOf(spec.kind, givenNames(spec.parameters));
	return {
		spec: { ...spec, parameters: { ...spec.parameters } },
		component: makers[spec.kind].make(
			numbersOf(spec.parameters, set),
			wordsAndListsOf(spec.parameters, set)
		),
		factor: spec.factor ?? 1
	};
}

class ComposedModel implements MassModel {
	readonly #parts: readonly Part[];
	/** Those with a factor above 0: what is taken away adds nothing, not even 0 times Infinity. */
	readonly #present: readonly Part[];
	readonly #sums: FrequencySums = { omega: 0, kappa: 0, nu: 0 };
	readonly #pull = { pull: 0, slope: 0 };

	readonly #law: GravityLaw;

	constructor(parts: readonly Part[], law: GravityLaw) {
		this.#parts = parts;
		this.#law = law;
		this.#present = parts.filter((part) => part.factor > 0);
	}

	get spec(): MassModelSpec {
		return {
			components: this.#parts.map(({ spec, factor }) => ({
				...spec,
				parameters: { ...spec.parameters },
				factor
			})),
			...(this.#law === 'newton' ? {} : { law: this.#law })
		};
	}

	circularVelocity(R: number): number {
		return Math.sqrt(Math.max(0, this.#speedSquared(R)));
	}

	circularFrequency(R: number): number {
		return Math.sqrt(Math.max(0, this.#frequencies(R, 0).omega));
	}

	epicycleFrequency(R: number): number {
		return Math.sqrt(this.#frequencies(R, 0).kappa);
	}

	verticalFrequency(R: number, sheetHeight = 0): number {
		return Math.sqrt(this.#frequencies(R, sheetHeight).nu);
	}

	addFrequenciesSquared(R: number, sheetHeight: number, sums: FrequencySums): void {
		if (this.#law === 'newton') {
			this.#addNewton(R, sheetHeight, sums);
			return;
		}
		const own = this.#frequencies(R, sheetHeight);
		sums.omega += own.omega;
		sums.kappa += own.kappa;
		sums.nu += own.nu;
	}

	enclosedMass(r: number): number {
		return this.#sum((component) => component.enclosedMass(r));
	}

	dynamicalMass(R: number): number {
		// In the limit R = 0 only a point mass is left, and it is its own dynamical mass.
		if (R === 0) return this.enclosedMass(0);
		return (this.#speedSquared(R) * R) / G;
	}

	potential(R: number, z: number): number {
		if (this.#law !== 'newton') return NaN;
		return this.#sum((component) => component.potential(R, z));
	}

	acceleration(R: number, z: number, out: Acceleration): Acceleration {
		out.R = 0;
		out.z = 0;
		for (const { component, factor } of this.#present) {
			component.addAcceleration(R, z, factor, out);
		}
		const pull = Math.hypot(out.R, out.z);
		if (this.#law !== 'newton' && pull > 0) {
			const boost = boostUnder(this.#law, pull);
			out.R *= boost;
			out.z *= boost;
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
		if (this.#law !== 'newton') return Infinity;
		if (this.#present.some(({ component }) => !component.escapable)) return Infinity;
		// 0 − x, because −2 times nothing would be −0.
		return Math.sqrt(0 - 2 * this.potential(R, 0));
	}

	lit(): MassModel {
		return new ComposedModel(
			this.#parts.filter(({ spec }) => spec.lit),
			this.#law
		);
	}

	unlit(): MassModel {
		return new ComposedModel(
			this.#parts.filter(({ spec }) => !spec.lit),
			this.#law
		);
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
			}),
			this.#law
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
		this.#addNewton(R, sheetHeight, sums);
		sumsUnder(this.#law, R, sums);
		return sums;
	}

	#addNewton(R: number, sheetHeight: number, sums: FrequencySums): void {
		for (const { component, factor } of this.#present) {
			component.addFrequenciesSquared(R, factor, sheetHeight, sums);
		}
	}

	/** v² under the model's law; negative where the net pull is outward. */
	#speedSquared(R: number): number {
		const newton = this.#sum((component) => component.circularVelocitySquared(R));
		if (this.#law === 'newton' || !(newton > 0) || R === 0) return newton;
		return R * pullUnder(this.#law, newton / R, this.#pull).pull;
	}
}
