import { massModel, componentKinds, numberOf } from '../dynamics';
import type { ComponentSpec, MassModelSpec } from '../dynamics/types';

/** Whether a component has stars to show: lit, present, and with an extent. A point has none. */
const showsStars = ({ kind, lit, factor = 1 }: ComponentSpec): boolean =>
	lit && factor > 0 && kind !== 'point-mass';

/** Whether a galaxy has any stars to show. */
export const hasStars = (spec: MassModelSpec): boolean => spec.components.some(showsStars);

/** Where the stars of one lit component are, ring by ring. */
export interface ComponentProfile {
	disc: boolean;
	/** Its own height above the plane, kpc; 0 where the kind has none. */
	scaleHeight: number;
	/** Share of the sampled stars in each ring. */
	weights: Float64Array;
}

/** Share of the outer radius inside which the mean surface density is the measure of crowding. */
const crowdingRadius = 0.32;
/** Rings denser than this share of that mean count as crowded. */
const crowdedAt = 0.4;
/** How strongly crowded rings are thinned: 0 not at all, 1 to one common brightness. */
const thinning = 0.93;
/** Share of the outer radius from which stars thin out, so that the disc has no rim. */
const fadesFrom = 0.6;

/**
 * Shares of stars by component and ring: mass, thinned where it is so dense that the film would
 * only be white. The eye on the dome sees a factor of some tens in brightness, a galaxy has
 * thousands; the thinning is the tone curve, made once where it costs nothing in a frame.
 * @param radii ring radii, kpc, rising @returns one profile a lit component; weights sum to 1
 */
export function starProfiles(spec: MassModelSpec, radii: Float64Array): ComponentProfile[] {
	const count = radii.length;
	const edges = Float64Array.from({ length: count + 1 }, (_, k) =>
		k === 0 ? 0 : k === count ? radii[count - 1] : (radii[k - 1] + radii[k]) / 2
	);
	const lit = spec.components.filter(showsStars);
	const profiles = lit.map((component) => {
		const model = massModel({ components: [component] });
		const weights = new Float64Array(count);
		let inside = model.enclosedMass(0);
		for (let k = 0; k < count; k++) {
			const next = model.enclosedMass(edges[k + 1]);
			weights[k] = Math.max(0, next - inside);
			inside = next;
		}
		return {
			disc: componentKinds.find((info) => info.kind === component.kind)?.shape === 'disc',
			scaleHeight: numberOf(component.parameters, 'scaleHeight') ?? 0,
			weights
		};
	});
	const mass = (k: number) => profiles.reduce((sum, p) => sum + p.weights[k], 0);
	const area = (k: number) => Math.PI * (edges[k + 1] ** 2 - edges[k] ** 2);
	let within = 0;
	const reach = crowdingRadius * radii[count - 1];
	for (let k = 0; k < count && radii[k] < reach; k++) within += mass(k);
	const common = (crowdedAt * within) / (Math.PI * reach * reach);
	let total = 0;
	for (let k = 0; k < count; k++) {
		const crowded = mass(k) / area(k) / common;
		const outward = Math.max(0, (radii[k] / radii[count - 1] - fadesFrom) / (1 - fadesFrom));
		const keep = (1 - outward * outward) / (1 + crowded) ** thinning;
		for (const profile of profiles) {
			profile.weights[k] *= keep;
			total += profile.weights[k];
		}
	}
	if (total > 0) for (const p of profiles) for (let k = 0; k < count; k++) p.weights[k] /= total;
	return profiles;
}
