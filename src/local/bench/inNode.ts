import { PlainPainter } from '../../lib/picture/plainPainter';
import { benchFit, benchMillionSpeeds, benchRead, benchSmallRetune } from './dynamics';
import { benchRetune } from './retune';
import { benchFrame, times } from './subject';

/** Measured in Node, one thread; prints one line of JSON for bench.js. */
const [film, stars] = process.argv.slice(2).map(Number);
const { frame, step } = benchFrame(stars);
const painter = new PlainPainter(film);
const plain = times(() => {
	step();
	painter.paint(frame);
}, 120);
console.log(
	JSON.stringify({
		plain,
		retune: benchRetune(),
		smallRetune: benchSmallRetune(),
		speeds: benchMillionSpeeds(),
		fit: benchFit(),
		read: benchRead()
	})
);
