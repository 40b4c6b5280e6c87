import type { DomeGeometry, SkyDirection } from '../../dome/types';
import { makeCamera, setCamera } from '../camera';
import type { Drawings, View } from '../frame';
import { speedRamp } from '../speedRamp';
import { drawChart } from './drawChart';
import { FilmPen, inks, type FilmContext } from './FilmPen';
import { drawingsLayout, wrapWords } from './layout';

/** Draws one ring of the galaxy's plane, with its label where it comes lowest on the film. */
function drawRing(pen: FilmPen, view: View, radius: number, label: string, letter: number): void {
	const { matrix: m, shift: t } = setCamera(view, makeCamera());
	const direction: SkyDirection = { x: 0, y: 0, z: 0 };
	const look = (angle: number): SkyDirection => {
		const gx = radius * Math.cos(angle);
		const gy = radius * Math.sin(angle);
		const x = m[0] * gx + m[1] * gy + t[0];
		const y = m[3] * gx + m[4] * gy + t[1];
		const z = m[6] * gx + m[7] * gy + t[2];
		const d = Math.hypot(x, y, z);
		direction.x = x / d;
		direction.y = y / d;
		direction.z = z / d;
		return direction;
	};
	const { context } = pen;
	context.beginPath();
	let open = false;
	let lowest = { altitude: Infinity, azimuth: 0 };
	const steps = 180;
	for (let i = 0; i <= steps; i++) {
		const { x, y, z } = look((2 * Math.PI * i) / steps);
		const altitude = (Math.asin(Math.min(1, Math.max(-1, z))) * 180) / Math.PI;
		if (altitude < lowest.altitude)
			lowest = { altitude, azimuth: (Math.atan2(x, y) * 180) / Math.PI };
		const place = pen.placeDirection(direction);
		if (place && open) context.lineTo(place.x, place.y);
		else if (place) context.moveTo(place.x, place.y);
		open = place !== null;
	}
	pen.stroke(inks.soft, undefined, [0.8, 0.6]);
	const altitude = Math.max(12, lowest.altitude - letter * 1.7);
	pen.text(
		label,
		{ altitude, azimuth: lowest.azimuth },
		{ height: letter * 0.9, colour: inks.soft }
	);
}

/** The colour scale for stars coloured by speed, with its two ends in figures. */
function drawScale(pen: FilmPen, [low, high]: [number, number], letter: number): void {
	const { scale } = drawingsLayout(pen.filmSize, false);
	const steps = 64;
	const { context } = pen;
	for (let i = 0; i < steps; i++) {
		const at = (share: number) => scale.left + (scale.right - scale.left) * share;
		const k = 3 * Math.round((255 * i) / (steps - 1));
		pen.path([
			{ altitude: scale.foot, azimuth: at(i / steps) },
			{ altitude: scale.foot, azimuth: at((i + 1.1) / steps) },
			{ altitude: scale.head, azimuth: at((i + 1.1) / steps) },
			{ altitude: scale.head, azimuth: at(i / steps) }
		]);
		context.fillStyle = `rgb(${speedRamp[k]} ${speedRamp[k + 1]} ${speedRamp[k + 2]})`;
		context.fill();
	}
	const style = { height: letter * 0.9, colour: inks.ink, mono: true } as const;
	pen.text(
		String(low),
		{ altitude: scale.head + 0.8, azimuth: scale.left },
		{ ...style, align: 'left' }
	);
	pen.text(
		`${high} km/s`,
		{ altitude: scale.head + 0.8, azimuth: scale.right },
		{ ...style, align: 'right' }
	);
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
	const { letter, chart, caption, name, halves, title } = drawingsLayout(
		filmSize,
		drawings.chart !== undefined
	);
	for (const ring of drawings.rings) drawRing(pen, view, ring.radius, ring.label, letter);
	if (drawings.chart) drawChart(pen, drawings.chart, chart, letter);
	if (drawings.scale) drawScale(pen, drawings.scale, letter);
	if (drawings.name) {
		pen.text(drawings.name, name, {
			height: letter * 1.2,
			colour: inks.ink,
			align: 'right',
			bold: true
		});
	}
	if (drawings.title) {
		pen.text(drawings.title, title, { height: letter * 1.6, colour: inks.ink, bold: true });
	}
	if (drawings.halves) {
		drawings.halves.forEach((label, i) => {
			const azimuth = i === 0 ? -halves.azimuth : halves.azimuth;
			pen.text(
				label,
				{ altitude: halves.altitude, azimuth },
				{ height: letter * 1.2, colour: inks.ink }
			);
		});
	}
	if (drawings.caption) {
		const style = { height: letter, colour: inks.ink };
		const lines = wrapWords(drawings.caption, caption.widest, caption.lines, (l) =>
			pen.textWidth(l, style)
		);
		lines.forEach((line, i) => {
			const altitude = caption.altitude + (lines.length - 1 - i) * letter * 1.9;
			pen.text(line, { altitude, azimuth: caption.azimuth }, style);
		});
	}
}
