import type { DomeGeometry } from '../dome/types';
import type { BackgroundSky, GalaxyLook, RingTable, StarList } from '../starfield/types';

/** Where the galaxy stands in the sky of the dome. Same words as a scene's view. */
export interface View {
	/** kpc from the centre to the eye. */
	distance: number;
	/** Degrees: 0 face-on, 90 edge-on. */
	inclination: number;
	/** Degrees about the line of sight. */
	turn: number;
	/** Degrees above the room's horizon, straight in front. */
	centreAltitude: number;
}

/** One galaxy of stars with the angles its rings have turned to. */
export interface StarLayer {
	stars: StarList;
	rings: RingTable;
	look: GalaxyLook;
	/** Radians the density wave has turned. */
	patternAngle: number;
	/** Part of the dome this layer may paint: by the sign of the film's x. */
	half: 'whole' | 'left' | 'right';
}

/** Everything a star painter needs for one picture. Both painters read this and nothing else. */
export interface Frame {
	geometry: DomeGeometry;
	view: View;
	layers: StarLayer[];
	background: BackgroundSky;
	colour: 'light' | 'speed';
	/** km/s at the two ends of the colour scale; read where colour is 'speed'. */
	speedRange: [number, number];
	/** 0 dark to 1 full: fades and the rest picture. */
	exposure: number;
}

/** One curve of the dome's speed chart. */
export interface ChartCurve {
	name: string;
	/** lit is solid amber, unlit dashed azure, total solid ink. */
	role: 'lit' | 'unlit' | 'total';
	/** kpc. */
	radii: ArrayLike<number>;
	/** km/s. */
	speeds: ArrayLike<number>;
}

export interface ChartPoint {
	/** kpc. */
	radius: number;
	/** km/s. */
	speed: number;
	/** One standard error, km/s. */
	error: number;
}

/** What is drawn and written over the stars. */
export interface Drawings {
	chart?: {
		maxRadius: number;
		maxSpeed: number;
		curves: ChartCurve[];
		points: ChartPoint[];
	};
	rings: { radius: number; label: string }[];
	name?: string;
	/** Large, alone in front: what a dark scene is called. */
	title?: string;
	caption?: string;
	/** Colour scale for stars coloured by speed, km/s. */
	scale?: [number, number];
	/** Labels of the two halves where a comparison is shown. */
	halves?: [string, string];
}
