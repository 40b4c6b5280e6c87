import { safeBand } from '$lib/dome/altAz';
import type { AltAz } from '$lib/dome/types';

const steps = (from: number, to: number, count = 60) =>
	Array.from({ length: count + 1 }, (_, i) => from + ((to - from) * i) / count);

/** The room's horizon all round; closed. */
export const horizon: readonly AltAz[] = steps(-180, 180, 180).map((azimuth) => ({
	altitude: 0,
	azimuth
}));

const { azimuth: side, lowest, highest } = safeBand;

/** The edge of the safe band; closed. */
export const safeBandEdge: readonly AltAz[] = [
	...steps(-side, side).map((azimuth) => ({ altitude: lowest, azimuth })),
	...steps(lowest, highest).map((altitude) => ({ altitude, azimuth: side })),
	...steps(side, -side).map((azimuth) => ({ altitude: highest, azimuth })),
	...steps(highest, lowest).map((altitude) => ({ altitude, azimuth: -side }))
];

/** Colours of the guide lines in either view. */
export const guideColours = { horizon: '#a4abba', safeBand: '#7ccb8f' } as const;
