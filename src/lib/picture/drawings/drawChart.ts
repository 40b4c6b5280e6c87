import { scaleLinear } from 'd3-scale';
import type { AltAz } from '../../dome/types';
import { LIGHT_YEARS_PER_KPC } from '../../units';
import type { ChartCurve, Drawings } from '../frame';
import { inks, lineWidth, type FilmPen } from './FilmPen';
import type { Field } from './layout';

const kly = LIGHT_YEARS_PER_KPC / 1000;
const styles: Record<ChartCurve['role'], { colour: string; dash: number[] }> = {
	lit: { colour: inks.lit, dash: [] },
	unlit: { colour: inks.unlit, dash: [0.9, 0.6] },
	total: { colour: inks.ink, dash: [] }
};

/** Sides of the field at each altitude are level: azimuths shrink toward the zenith. */
function placer(field: Field, maxRadius: number, maxSpeed: number) {
	const x = scaleLinear([0, maxRadius * kly], [field.left, field.right]);
	const y = scaleLinear([0, maxSpeed], [field.foot, field.head]);
	return { x, y, at: (r: number, v: number): AltAz => ({ azimuth: x(r * kly), altitude: y(v) }) };
}

function* straight(a: AltAz, b: AltAz, steps = 24): Generator<AltAz> {
	for (let i = 0; i <= steps; i++) {
		const t = i / steps;
		yield {
			altitude: a.altitude + (b.altitude - a.altitude) * t,
			azimuth: a.azimuth + (b.azimuth - a.azimuth) * t
		};
	}
}

/** Heights for the names at the ends of curves, pushed apart so that they do not touch. */
export function spreadLabels(heights: readonly number[], gap: number): number[] {
	const order = heights.map((h, i) => ({ h, i })).sort((a, b) => a.h - b.h);
	for (let k = 1; k < order.length; k++) order[k].h = Math.max(order[k].h, order[k - 1].h + gap);
	const out = [...heights];
	for (const { h, i } of order) out[i] = h;
	return out;
}

/** The speed chart: distance across in thousand light years, speed upward in km/s. */
export function drawChart(
	pen: FilmPen,
	chart: NonNullable<Drawings['chart']>,
	field: Field,
	letter: number
): void {
	const { x, y, at } = placer(field, chart.maxRadius, chart.maxSpeed);
	const { context } = pen;
	const small = letter * 0.9;
	const corner = (azimuth: number, altitude: number): AltAz => ({ azimuth, altitude });

	// A dark ground keeps lines and letters clear of the stars behind them.
	context.save();
	context.globalAlpha = 0.5;
	context.fillStyle = inks.ground;
	const [l, r, f, h] = [field.left - 7.5, field.right + 11, field.foot - 5.4, field.head + 3.4];
	pen.path([
		...straight(corner(l, f), corner(r, f)),
		...straight(corner(r, f), corner(r, h)),
		...straight(corner(r, h), corner(l, h)),
		...straight(corner(l, h), corner(l, f))
	]);
	context.closePath();
	context.fill();
	context.restore();

	pen.path(straight(corner(field.left, field.foot), corner(field.right, field.foot)));
	pen.stroke(inks.soft);
	pen.path(straight(corner(field.left, field.foot), corner(field.left, field.head)));
	pen.stroke(inks.soft);
	for (const tick of x.ticks(4).filter((t) => t > 0)) {
		pen.path([corner(x(tick), field.foot), corner(x(tick), field.foot - 0.6)]);
		pen.stroke(inks.soft);
		pen.text(String(tick), corner(x(tick), field.foot - 0.9 - small), {
			height: small,
			colour: inks.soft,
			mono: true
		});
	}
	for (const tick of y.ticks(4).filter((t) => t > 0)) {
		pen.path([corner(field.left, y(tick)), corner(field.left - 0.6, y(tick))]);
		pen.stroke(inks.soft);
		pen.text(String(tick), corner(field.left - 1, y(tick) - small / 2), {
			height: small,
			colour: inks.soft,
			mono: true,
			align: 'right'
		});
	}
	pen.text(
		'thousand light years',
		corner((field.left + field.right) / 2, field.foot - 1.9 - 2 * small),
		{
			height: small,
			colour: inks.soft
		}
	);
	pen.text('km/s', corner(field.left - 5.5, field.head + 1.4), {
		height: small,
		colour: inks.soft,
		align: 'left'
	});

	const ends = chart.curves.map((curve) => {
		const style = styles[curve.role];
		const places: AltAz[] = [];
		for (let i = 0; i < curve.radii.length; i++) {
			const speed = curve.speeds[i];
			if (curve.radii[i] <= chart.maxRadius && speed >= 0 && speed <= chart.maxSpeed) {
				places.push(at(curve.radii[i], speed));
			}
		}
		pen.path(places);
		pen.stroke(style.colour, lineWidth * 1.8, style.dash);
		return places.at(-1)?.altitude ?? field.foot;
	});
	for (const point of chart.points) drawPoint(pen, at, point, letter);
	const heights = spreadLabels(ends, letter * 1.5);
	chart.curves.forEach((curve, i) => {
		pen.text(curve.name, corner(field.right + 0.8, heights[i] - small / 2), {
			height: small,
			colour: styles[curve.role].colour,
			align: 'left'
		});
	});
}

/** A measured point: an open ring with the bar of its error. */
function drawPoint(
	pen: FilmPen,
	at: (r: number, v: number) => AltAz,
	{ radius, speed, error }: { radius: number; speed: number; error: number },
	letter: number
): void {
	pen.path([at(radius, Math.max(0, speed - error)), at(radius, speed + error)]);
	pen.stroke(inks.ink);
	const { x, y } = pen.place(at(radius, speed));
	pen.context.beginPath();
	pen.context.arc(x, y, letter * 0.27 * pen.perDegree, 0, 2 * Math.PI);
	pen.context.fillStyle = inks.ground;
	pen.context.fill();
	pen.stroke(inks.ink);
}
