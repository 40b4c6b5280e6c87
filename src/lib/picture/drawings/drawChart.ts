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

/**
 * Heights for the names at the ends of curves, pushed apart so that they do not touch and kept between
 * the lowest and the highest that are allowed, in the order of the curves' ends.
 */
export function spreadLabels(
	heights: readonly number[],
	gap: number,
	lowest: number,
	highest: number
): number[] {
	const order = heights.map((h, i) => ({ h, i })).sort((a, b) => a.h - b.h);
	order.forEach((one, k) => (one.h = Math.max(one.h, lowest, k ? order[k - 1].h + gap : lowest)));
	for (let k = order.length - 1, most = highest; k >= 0; k--, most = order[k + 1].h - gap) {
		order[k].h = Math.min(order[k].h, most);
	}
	const out = [...heights];
	for (const { h, i } of order) out[i] = h;
	return out;
}

/** The stretches of a curve that lie on the chart: it leaves at the top and comes back, never across. */
function stretches(
	{ radii, speeds }: ChartCurve,
	{ maxRadius, maxSpeed }: { maxRadius: number; maxSpeed: number },
	at: (r: number, v: number) => AltAz
): AltAz[][] {
	const out: AltAz[][] = [];
	let open = false;
	for (let i = 0; i < radii.length; i++) {
		const inside = radii[i] <= maxRadius && speeds[i] >= 0 && speeds[i] <= maxSpeed;
		if (inside && !open) out.push([]);
		if (inside) out.at(-1)?.push(at(radii[i], speeds[i]));
		open = inside;
	}
	return out;
}

/** The speed chart: distance across in thousand light years, speed upward in km/s. */
export function drawChart(
	pen: FilmPen,
	chart: NonNullable<Drawings['chart']>,
	field: Field,
	ground: Field,
	letter: number
): void {
	const { x, y, at } = placer(field, chart.maxRadius, chart.maxSpeed);
	const { context } = pen;
	const small = letter;
	const corner = (azimuth: number, altitude: number): AltAz => ({ azimuth, altitude });

	// A dark ground keeps lines and letters clear of the stars behind them.
	context.save();
	context.globalAlpha = 0.5;
	context.fillStyle = inks.ground;
	const { left: l, right: r, foot: f, head: h } = ground;
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
		const drawn = stretches(curve, chart, at);
		for (const stretch of drawn) {
			pen.path(stretch);
			pen.stroke(style.colour, lineWidth * 1.8, style.dash);
		}
		return drawn.at(-1)?.at(-1)?.altitude ?? field.foot;
	});
	for (const point of chart.points) drawPoint(pen, at, point, letter);
	const heights = spreadLabels(ends, letter * 1.5, field.foot, field.head);
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
