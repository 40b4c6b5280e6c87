export {
	domeProjection,
	filmFromDirection,
	directionFromFilm,
	angleBetween,
	type DomeProjection
} from './projection';
export { directionFromAltAz, altAzFromDirection, safeBand, inSafeBand } from './altAz';
export { domePointFromSeat, seats, type Seat, type SeatName } from './seat';
export type { AltAz, DomeGeometry, FilmPoint, SkyDirection } from './types';
