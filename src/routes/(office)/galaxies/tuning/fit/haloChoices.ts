import { componentKinds } from '$lib/dynamics';
import type { FreeParameter } from '$lib/dynamics';
import type { ComponentKind, ComponentSpec, MassModelSpec } from '$lib/dynamics/types';
import { boundsOf, freeCandidates } from './freeCandidates';

/** A halo to try in place of the galaxy's own. */
export interface HaloChoice {
	kind: ComponentKind;
	label: string;
	spec: MassModelSpec;
	free: FreeParameter[];
}

const tried: readonly string[] = ['nfw', 'pseudo-isothermal', 'burkert', 'einasto'];
/** Of these only how much of it there is and how large: the shape stays at its usual value. */
const kept: readonly string[] = ['hubble', 'index'];

/**
 * The galaxy with each usual halo in place of its unlit matter. Free are the halo's numbers and
 * whatever of the lit matter is ticked.
 */
export function haloChoices(spec: MassModelSpec, ticked: readonly string[]): HaloChoice[] {
	const lit = spec.components.filter((component) => component.lit);
	return componentKinds
		.filter(({ kind }) => tried.includes(kind))
		.map((info) => {
			const [set] = info.parameterSets;
			const own = spec.components.find(({ kind, lit: light }) => !light && kind === info.kind);
			const halo: ComponentSpec = own ?? {
				id: freshId(lit, 'halo'),
				kind: info.kind,
				name: info.label,
				parameters: Object.fromEntries(
					set.parameters.filter((p) => !p.optional).map((p) => [p.name, p.initial])
				),
				lit: false
			};
			const components = [...lit, halo];
			const free = freeCandidates(components)
				.filter(({ key, component, info: { name } }) =>
					component.lit ? ticked.includes(key) : !kept.includes(name)
				)
				.map(boundsOf);
			return { kind: info.kind, label: info.label, spec: { ...spec, components }, free };
		});
}

/** An id that no component has. */
function freshId(components: readonly ComponentSpec[], wanted: string): string {
	let id = wanted;
	for (let n = 2; components.some((component) => component.id === id); n++) id = `${wanted}-${n}`;
	return id;
}
