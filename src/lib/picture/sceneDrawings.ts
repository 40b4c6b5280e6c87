import { massModel } from '../dynamics';
import type { Scene } from '../show/document';
import type { EditionGalaxy } from '../show/edition';
import { filledText } from '../show/figures';
import { significant } from '../show/figureWords';
import { effectiveModel, limitValues, sceneSettings, type ControlValues } from '../show/settings';
import { lightYearsFromKpc } from '../units';
import type { ChartCurve, Drawings } from './frame';
import { speedRange } from './speedRange';

/** Points of a curve on the dome's chart. */
const chartPoints = 120;

/** Such as "30,000 light years". @param R kpc */
export const ringLabel = (R: number): string =>
	`${significant(lightYearsFromKpc(R), 2)} light years`;

/** Fastest speed on the chart wherever the presenter may put the controls: the axis stands still. */
const topAtLimits = (scene: Scene, galaxy: EditionGalaxy, radii: readonly number[]): number =>
	Math.max(
		...limitValues(scene).map((values) => {
			const model = massModel(effectiveModel(galaxy.document, sceneSettings(scene, values)));
			return speedRange(radii, (k) => model.circularVelocity(radii[k]))[1];
		})
	);

/** What a scene draws and writes over its stars, with its live controls where they stand. */
export function sceneDrawings(
	scene: Scene,
	controls: ControlValues,
	galaxy: EditionGalaxy | null,
	scale: [number, number]
): Drawings {
	const { drawings } = scene;
	if (!galaxy) {
		const title = scene.subject.kind === 'dark' ? scene.subject.name : '';
		return {
			rings: [],
			...(title ? { title } : {}),
			...(drawings.caption
				? { caption: filledText(drawings.caption, { model: null, measured: [], outerRadius: 1 }) }
				: {})
		};
	}
	const model = massModel(effectiveModel(galaxy.document, sceneSettings(scene, controls)));
	const maxRadius = galaxy.document.look.outerRadius;
	const radii = Array.from({ length: chartPoints }, (_, i) => (maxRadius * (i + 1)) / chartPoints);
	const curve = (name: string, role: ChartCurve['role'], of: typeof model): ChartCurve => ({
		name,
		role,
		radii,
		speeds: radii.map((R) => of.circularVelocity(R))
	});
	const curves = [
		...(drawings.chartLit ? [curve('light alone', 'lit', model.lit())] : []),
		...(drawings.chartTotal ? [curve('with the halo', 'total', model)] : [])
	];
	return {
		rings: drawings.rings.map((radius) => ({ radius, label: ringLabel(radius) })),
		...(drawings.name ? { name: galaxy.document.name } : {}),
		...(drawings.caption
			? {
					caption: filledText(drawings.caption, {
						model,
						measured: galaxy.measured,
						outerRadius: maxRadius
					})
				}
			: {}),
		...(drawings.scale && scene.colour === 'speed' ? { scale } : {}),
		...(scene.comparison === 'halves' ? { halves: ['without halo', 'with halo'] } : {}),
		...(drawings.chart
			? {
					chart: {
						maxRadius,
						maxSpeed: 1.2 * Math.max(scale[1], topAtLimits(scene, galaxy, radii)),
						curves,
						points: drawings.chartMeasured
							? galaxy.measured.filter((p) => p.radius <= maxRadius)
							: []
					}
				}
			: {})
	};
}
