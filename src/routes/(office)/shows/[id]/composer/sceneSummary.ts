import type { Scene } from '$lib/show/document';
import { numberText } from '$lib/components/settings/numberText';

const times = (what: string, factor: number): string[] => {
	if (factor === 1) return [];
	return [factor === 0 ? `without ${what}` : `${what} × ${numberText(factor)}`];
};

/** What a scene shows, in a few words under its picture. @param galaxy its name, or null */
export function sceneSummary(scene: Scene, galaxy: string | null): string[] {
	if (scene.subject.kind === 'dark') {
		return [scene.subject.name ? `Dark sky: “${scene.subject.name}”` : 'Dark sky'];
	}
	return [
		galaxy ?? 'Missing galaxy',
		...(scene.comparison === 'halves' ? ['left without halo, right with it'] : []),
		...times('halo', scene.mix.haloFactor),
		...times('stars', scene.mix.starFactor),
		...(scene.motion.rate === 0 ? ['standing still'] : [])
	];
}
