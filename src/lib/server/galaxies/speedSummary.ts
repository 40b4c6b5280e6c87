import { massModel } from '../../dynamics';
import type { GalaxyDocument } from '../../show/galaxy';

export interface SpeedSummary {
	litCount: number;
	unlitCount: number;
	/** Fastest circular speed between 2 % and all of the outer radius, km/s. */
	peakSpeed: number;
	/** Circular speed at the outer radius, km/s. */
	outerSpeed: number;
	/** kpc. */
	outerRadius: number;
}

const steps = 50;

/** What a list says of a galaxy. The innermost 2 % are left out: a point mass is infinitely fast there. */
export function speedSummary({ model: spec, look }: GalaxyDocument): SpeedSummary {
	const model = massModel(spec);
	let peakSpeed = 0;
	for (let i = 1; i <= steps; i++) {
		peakSpeed = Math.max(peakSpeed, model.circularVelocity((look.outerRadius * i) / steps) || 0);
	}
	const litCount = spec.components.filter((component) => component.lit).length;
	return {
		litCount,
		unlitCount: spec.components.length - litCount,
		peakSpeed,
		outerSpeed: model.circularVelocity(look.outerRadius) || 0,
		outerRadius: look.outerRadius
	};
}
