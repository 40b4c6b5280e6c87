import { DEGREE } from '../units';
import type { AltAz, SkyDirection } from './types';

/** @param altAz degrees @returns `out`, a unit vector in the room's frame */
export function directionFromAltAz({ altitude, azimuth }: AltAz, out: SkyDirection): SkyDirection {
	const level = Math.cos(altitude * DEGREE);
	out.x = level * Math.sin(azimuth * DEGREE);
	out.y = level * Math.cos(azimuth * DEGREE);
	out.z = Math.sin(altitude * DEGREE);
	return out;
}

/** The inverse of `directionFromAltAz`; at the zenith the azimuth is 0. @returns degrees */
export function altAzFromDirection(direction: SkyDirection, out: AltAz): AltAz {
	const level = Math.hypot(direction.x, direction.y);
	out.altitude = Math.atan2(direction.z, level) / DEGREE;
	out.azimuth = level === 0 ? 0 : Math.atan2(direction.x, direction.y) / DEGREE;
	return out;
}

/**
 * Where words and charts are safe to read in one-way seating: azimuth within 50° of front, altitude
 * 10° to 60°. IMERSA standards committee, "Dome Master Show File Format 1.0", section II item 9
 * (working draft).
 */
export const safeBand = { azimuth: 50, lowest: 10, highest: 60 } as const;

/** Whether a place lies in the safe band, its edges included. */
export const inSafeBand = ({ altitude, azimuth }: AltAz): boolean =>
	Math.abs(azimuth) <= safeBand.azimuth &&
	altitude >= safeBand.lowest &&
	altitude <= safeBand.highest;
