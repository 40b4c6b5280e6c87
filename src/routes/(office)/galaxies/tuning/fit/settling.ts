import { numberOf } from '$lib/dynamics';
import type { MassModelSpec, Parameters } from '$lib/dynamics/types';

/** Milliseconds that a fit takes to settle on the page. */
export const settleMs = 700;

const ease = (share: number) => 1 - (1 - share) ** 3;

/** A number part of the way: by ratio where both are above 0, as masses and lengths are felt. */
const between = (from: number, to: number, share: number) =>
	from > 0 && to > 0 ? from * (to / from) ** share : from + (to - from) * share;

/**
 * The model part of the way from one to another that has the same components.
 * @param share 0 is `from`, 1 is exactly `to`
 */
export function settling(from: MassModelSpec, to: MassModelSpec, share: number): MassModelSpec {
	if (share >= 1) return to;
	const eased = ease(share);
	return {
		...to,
		components: to.components.map((component) => {
			const before = from.components.find(({ id }) => id === component.id);
			if (!before || before.kind !== component.kind) return component;
			const parameters: Parameters = { ...component.parameters };
			for (const name of Object.keys(parameters)) {
				const [a, b] = [numberOf(before.parameters, name), numberOf(parameters, name)];
				if (a !== undefined && b !== undefined) parameters[name] = between(a, b, eased);
			}
			return { ...component, parameters };
		})
	};
}
