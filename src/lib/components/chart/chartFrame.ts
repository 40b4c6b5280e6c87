import { scaleLinear, type ScaleLinear } from 'd3-scale';

export interface Margin {
	top: number;
	right: number;
	bottom: number;
	left: number;
}

/** Where things are on a chart of a given size, in pixels. */
export interface ChartFrame {
	width: number;
	height: number;
	margin: Margin;
	/** kpc to pixels. */
	x: ScaleLinear<number, number>;
	/** km/s to pixels. */
	y: ScaleLinear<number, number>;
	/** Narrow charts have fewer ticks and shorter names. */
	narrow: boolean;
}

/** Pixels; a page that is not laid out yet says 0. */
const least = 240;

/** @param given width in pixels; the height follows @param maxRadius kpc @param maxSpeed km/s */
export function chartFrame(given: number, maxRadius: number, maxSpeed: number): ChartFrame {
	const width = Math.max(least, given);
	const narrow = width < 560;
	const height = Math.round(narrow ? width * 0.9 : Math.min(560, Math.max(340, width * 0.6)));
	const margin = { top: 48, right: narrow ? 84 : 124, bottom: 46, left: narrow ? 40 : 52 };
	return {
		width,
		height,
		margin,
		narrow,
		x: scaleLinear([0, maxRadius], [margin.left, width - margin.right]),
		y: scaleLinear([0, maxSpeed], [height - margin.bottom, margin.top])
	};
}
