import type { DomeGeometry } from '../../dome/types';
import type { Drawings, View } from '../frame';
import { speedRamp } from '../speedRamp';
import { drawChart } from './drawChart';
import { FilmPen, type FilmContext } from './FilmPen';
import { layOutDrawings, type Field } from './layout';
import { drawRing, labelPoints, ringDirections } from './rings';

/** The bar for stars coloured by speed; the figures at its two ends are words of the layout. */
function drawScale(pen: FilmPen, scale: Field): void {
	const steps = 64;
	const at = (share: number) => scale.left + (scale.right - scale.left) * share;
	for (let i = 0; i < steps; i++) {
		const k = 3 * Math.round((255 * i) / (steps - 1));
		const [left, right] = [at(i / steps), at(Math.min(1, (i + 1.1) / steps))];
		pen.path([
			{ altitude: scale.foot, azimuth: left },
			{ altitude: scale.foot, azimuth: right },
			{ altitude: scale.head, azimuth: right },
			{ altitude: scale.head, azimuth: left }
		]);
		pen.context.fillStyle = `rgb(${speedRamp[k]} ${speedRamp[k + 1]} ${speedRamp[k + 2]})`;
		pen.context.fill();
	}
}

/**
 * Draws and writes over the stars: onto a transparent canvas of the film's size, cleared first.
 * Everything is placed by altitude and azimuth, inside the safe band, sized in degrees.
 */
export function drawOnFilm(
	context: FilmContext,
	filmSize: number,
	geometry: DomeGeometry,
	view: View,
	drawings: Drawings
): void {
	context.setTransform(1, 0, 0, 1, 0, 0);
	context.clearRect(0, 0, filmSize, filmSize);
	const pen = new FilmPen(context, filmSize, geometry);
	const rings = drawings.rings.map(({ radius }) => ringDirections(view, radius));
	const { letter, chart, chartGround, scale, words } = layOutDrawings(
		drawings,
		filmSize,
		(text, style) => pen.textWidth(text, style),
		rings.map(labelPoints)
	);
	for (const ring of rings) drawRing(pen, ring);
	if (drawings.chart) drawChart(pen, drawings.chart, chart, chartGround, letter);
	if (drawings.scale) drawScale(pen, scale);
	for (const { text, at, style } of words) pen.text(text, at, style);
}
