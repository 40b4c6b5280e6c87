import { componentKinds, massBreakdown, massModel } from '$lib/dynamics';
import type { FitRecord } from '$lib/measurements/fitRecord';
import { componentName } from '$lib/show/editingControls';
import type { Outcome } from './Fitting.svelte';

const orNull = (value: number) => (Number.isFinite(value) ? value : null);

/** The record of a fit as it is kept and printed; the server puts in which version computed it. */
export function recordOf({ result, before, table, used }: Outcome): FitRecord {
	const radii = used.map(({ radius }) => radius);
	const outermost = Math.max(...radii);
	const model = massModel(result.spec);
	const { lit, unlit } = massBreakdown(model, outermost);
	return {
		version: 1,
		computedBy: '',
		measurements: { id: table.id, name: table.name, source: table.source },
		points: {
			used: used.length,
			leftOut: table.points.length - used.length,
			innermost: Math.min(...radii),
			outermost
		},
		start: before.model,
		result: result.spec,
		free: result.parameters.map((one) => {
			const component = result.spec.components.find(({ id }) => id === one.componentId);
			const kind = componentKinds.find((info) => info.kind === component?.kind);
			const info = kind?.parameterSets
				.flatMap((set) => set.parameters)
				.find(({ name }) => name === one.parameter);
			return {
				componentId: one.componentId,
				component: component ? componentName(component) : one.componentId,
				parameter: one.parameter,
				label: info?.label ?? one.parameter,
				unit: one.unit,
				min: one.min,
				max: one.max,
				value: one.value,
				error: orNull(one.error),
				atBound: one.atBound
			};
		}),
		correlation: result.correlation.every((row) => row.every(Number.isFinite))
			? result.correlation
			: null,
		chiSquared: result.chiSquared,
		degreesOfFreedom: result.degreesOfFreedom,
		reducedChiSquared: orNull(result.reducedChiSquared),
		converged: result.converged,
		starts: result.starts,
		seed: result.seed,
		undecided: result.undecided,
		inside: { lit, unlit, dynamical: model.dynamicalMass(outermost) }
	};
}
