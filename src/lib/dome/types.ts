/**
 * Frames. A *sky direction* is a unit vector seen from the middle of the dome by a viewer who
 * faces front: x to the right, y to the front, z to the zenith of the room. The *dome axis* is the
 * zenith turned toward the front by the dome's tilt. The *film* is the square picture: x to the
 * right and y down, both −1…1, the circle of radius 1 being the rim, front at the bottom.
 */
export interface DomeGeometry {
	/** Full angle across the film circle, degrees, 90 to 230; 180 is the usual case. */
	apertureDegrees: number;
	/** Degrees the dome axis leans toward the front, 0 to 45. */
	tiltDegrees: number;
}

export interface FilmPoint {
	/** −1…1, right. */
	x: number;
	/** −1…1, down; the front of the dome is at +1. */
	y: number;
}

export interface SkyDirection {
	x: number;
	y: number;
	z: number;
}

/** Room coordinates as people give them. */
export interface AltAz {
	/** Degrees above the room's horizon. */
	altitude: number;
	/** Degrees from front, positive to the right of a viewer who faces front. */
	azimuth: number;
}
