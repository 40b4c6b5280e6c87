import type { ShowPicture } from '$lib/picture/showPicture';
import type { Playback } from '$lib/show/playback';

/** kpc: the radius whose ring is read off. */
const readRadius = 8;

/** What the stage says about its picture, for checks from outside. */
export interface Readings {
	scene: string;
	status: Playback['status'];
	/** 1/60 s since the run began. */
	tick: number;
	/** Radians the ring at 8 kpc has turned, nine decimals; null where no galaxy is on. */
	ringPhase: string | null;
	/** km/s/kpc. */
	ringOmega: string | null;
}

/** Reads tick and ring off one and the same moment, so that they may be compared. */
export function readings(picture: ShowPicture, playback: Playback): Readings {
	const ring = picture.ringAt(playback, readRadius);
	return {
		scene: playback.scene.id,
		status: playback.status,
		tick: playback.tick,
		ringPhase: ring && ring.phase.toFixed(9),
		ringOmega: ring && ring.omega.toFixed(9)
	};
}
