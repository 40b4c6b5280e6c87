import { PlainPainter } from '../../lib/picture/plainPainter';
import { advance } from '../../lib/starfield';
import { timeFromMyr, TICKS_PER_SECOND } from '../../lib/units';
import { benchFrame } from './benchScene';
import { timesOf, type Times } from './times';

export { benchRetune } from './retune';

export interface PainterBenchOptions {
	/** Pixels across. */
	filmSize: number;
	stars: number;
	/** How many frames are measured, after a tenth as many for warming up. */
	frames: number;
}

const myrPerSecond = 4;

/** The plain painter in this process: each frame lets the stars go on by one tick and paints. */
export async function benchPlainPainter(options: PainterBenchOptions): Promise<Times> {
	const frame = benchFrame(options.stars);
	const painter = new PlainPainter(options.filmSize);
	const tick = timeFromMyr(myrPerSecond) / TICKS_PER_SECOND;
	return timesOf(
		() => {
			for (const { rings } of frame.layers) advance(rings, tick);
			painter.paint(frame);
		},
		options.frames,
		Math.ceil(options.frames / 10) + 5
	);
}
