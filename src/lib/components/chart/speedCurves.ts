import { gravityLaws, massModel, rotationCurve } from '$lib/dynamics';
import type { MassModel, MassModelSpec } from '$lib/dynamics/types';

/** One line of the speed chart. */
export interface SpeedCurve {
	/** A component's id, or "lit", "unlit", "total" with a sign before it. */
	key: string;
	name: string;
	role: 'lit' | 'unlit' | 'total';
	/** Of several components, so drawn stronger than each of them. */
	sum: boolean;
	/** km/s at the chart's radii. */
	speeds: Float64Array;
}

/** Radii (kpc) of a chart that ends at `outer`: closer together inside, where curves bend. */
export const chartRadii = (outer: number, count = 240): Float64Array =>
	Float64Array.from({ length: count }, (_, i) => outer * ((i + 0.4) / (count - 0.6)) ** 1.5);

/**
 * Every component by itself, lit and unlit matter together where there are several of them, and
 * the total; in the order they are drawn. Under another law than Newton's only the total follows
 * it: the others show what the matter does by Newton's.
 */
export function speedCurves(
	spec: MassModelSpec,
	model: MassModel,
	radii: Float64Array
): SpeedCurve[] {
	const speeds = (of: MassModel) => rotationCurve(of, radii, new Float64Array(radii.length));
	const curves: SpeedCurve[] = spec.components.map((component) => ({
		key: component.id,
		name: component.name || component.id,
		role: component.lit ? 'lit' : 'unlit',
		sum: false,
		speeds: speeds(massModel({ components: [component] }))
	}));
	const law = gravityLaws.find((info) => info.law === spec.law);
	const other = law !== undefined && law.law !== 'newton';
	const several = (lit: boolean) => spec.components.filter((c) => c.lit === lit).length > 1;
	if (several(false)) {
		curves.push({
			key: '+unlit',
			name: 'Unlit matter',
			role: 'unlit',
			sum: true,
			speeds: speeds(model.unlit())
		});
	}
	if (several(true) || (other && curves.length > 0)) {
		curves.push({
			key: '+lit',
			name: other ? 'Lit, Newton’s law' : 'Lit matter',
			role: 'lit',
			sum: true,
			speeds: speeds(other ? massModel({ components: spec.components }) : model.lit())
		});
	}
	if (spec.components.length > 0) {
		curves.push({
			key: '+total',
			name: other ? 'By this law' : 'Total',
			role: 'total',
			sum: true,
			speeds: speeds(model)
		});
	}
	return curves;
}

/**
 * Upper end of the speed axis, km/s: room for all measured points and for the total beyond the
 * innermost 3 %, where a point mass is infinitely fast. Steps are coarse, so that the axis keeps
 * still while a slider is dragged.
 */
export function topSpeed(
	curves: readonly SpeedCurve[],
	radii: Float64Array,
	points: readonly { speed: number; error: number }[]
): number {
	let top = points.reduce((most, { speed, error }) => Math.max(most, speed + error), 20);
	const total = curves.find((curve) => curve.role === 'total');
	const outer = radii[radii.length - 1] ?? 0;
	radii.forEach((R, i) => {
		const speed = total?.speeds[i] ?? 0;
		if (R > 0.03 * outer && Number.isFinite(speed)) top = Math.max(top, speed);
	});
	const wanted = top * 1.1;
	const step = wanted > 400 ? 100 : wanted > 120 ? 50 : 20;
	return Math.ceil(wanted / step) * step;
}
