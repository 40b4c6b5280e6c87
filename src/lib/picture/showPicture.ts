import { massModel } from '../dynamics';
import type { DomeGeometry } from '../dome/types';
import type { Scene } from '../show/document';
import type { EditionContent } from '../show/edition';
import type { MotionStretch, Playback } from '../show/playback';
import { openStretch } from '../show/playback/transition';
import { sampleBackground, sampleStars } from '../starfield';
import type { BackgroundSky, RingTable, StarList } from '../starfield/types';
import { entranceAt, restShare } from './entrance';
import type { Drawings, Frame, StarLayer, View } from './frame';
import { RingMotions, type Angles } from './ringMotion';
import { sceneDrawings } from './sceneDrawings';
import { speedRange } from './speedRange';

/** Light of the rest picture's star field, 0 to 1. */
const restExposure = 0.6;
const backgroundStars = 1500;

export interface ShowPictureOptions {
	/** Stars of each galaxy. */
	starCount: number;
	ringCount?: number;
}

interface GalaxyPainted {
	stars: StarList;
	angles: Angles;
	full: RingTable;
	bare: RingTable;
	speedRange: [number, number];
}

/**
 * The pictures of one edition: turns a moment of playback into the frame that the star painters
 * draw and into what is written over it. Frames share their arrays: paint one before asking for
 * the next.
 */
export class ShowPicture {
	readonly content: EditionContent;
	readonly #options: ShowPictureOptions;
	readonly #motions: RingMotions;
	readonly #galaxies = new Map<string, GalaxyPainted>();
	readonly #background: BackgroundSky;

	constructor(content: EditionContent, options: ShowPictureOptions) {
		this.content = content;
		this.#options = options;
		this.#motions = new RingMotions(content, options.ringCount);
		this.#background = sampleBackground(content.show.seed, backgroundStars);
	}

	/** Everything a star painter needs for one moment. */
	frameAt(playback: Playback, geometry: DomeGeometry): Frame {
		const rest = restShare(playback);
		const entrance = entranceAt(playback);
		const { scene } = entrance.motion;
		const resting = rest >= 0.5;
		const galaxyId = galaxyOf(scene);
		return {
			geometry,
			view: entrance.view,
			layers: resting || !galaxyId ? [] : this.#layers(galaxyId, entrance.motion),
			background: this.#background,
			colour: scene.colour,
			speedRange: galaxyId ? this.#galaxy(galaxyId).speedRange : [0, 1],
			// The scene goes dark in the first half of the way and the rest picture lights in the second.
			exposure: resting ? restExposure * (2 * rest - 1) : entrance.exposure * (1 - 2 * rest)
		};
	}

	/** What is drawn and written over the stars that are seen; empty under the rest picture. */
	drawingsAt(playback: Playback): Drawings {
		if (restShare(playback) >= 0.5) return { rings: [] };
		const { scene, controls } = entranceAt(playback).motion;
		const galaxyId = galaxyOf(scene);
		return sceneDrawings(
			scene,
			controls,
			galaxyId ? this.content.galaxies[galaxyId] : null,
			galaxyId ? this.#galaxy(galaxyId).speedRange : [0, 1]
		);
	}

	/** A text that stays the same while the drawings do: they are made again when it changes. */
	drawingsKey(playback: Playback): string {
		if (restShare(playback) >= 0.5) return 'none';
		const { motion, view } = entranceAt(playback);
		return JSON.stringify([motion.scene.id, motion.controls, view]);
	}

	/** The view of a moment, eased where the stars go on from the scene before. */
	viewAt(playback: Playback): View {
		return entranceAt(playback).view;
	}

	/**
	 * The angle a ring of the scene's galaxy has turned and its speed of turning, for checks.
	 * @param R kpc @returns radians and km/s/kpc at the ring nearest to R; null without a galaxy
	 */
	ringAt(playback: Playback, R: number): { radius: number; phase: number; omega: number } | null {
		const { subject } = playback.scene;
		if (subject.kind !== 'galaxy') return null;
		const motion = this.#motions.of(subject.galaxyId);
		const open = openStretch(playback.content, playback.state);
		const angles = motion.angles(open, motion.makeAngles());
		let k = 0;
		for (let i = 1; i < motion.radii.length; i++) {
			if (Math.abs(motion.radii[i] - R) < Math.abs(motion.radii[k] - R)) k = i;
		}
		return {
			radius: motion.radii[k],
			phase: angles.full[k],
			omega: motion.frequencies(open).full[k]
		};
	}

	#layers(galaxyId: string, stretch: MotionStretch): StarLayer[] {
		const painted = this.#galaxy(galaxyId);
		const motion = this.#motions.of(galaxyId);
		const { look } = this.content.galaxies[galaxyId].document;
		motion.angles(stretch, painted.angles);
		const omega = motion.frequencies(stretch);
		painted.full.omega.set(omega.full);
		painted.bare.omega.set(omega.bare);
		const patternAngle = look.spiral.patternSpeed * painted.angles.time;
		const layer = { stars: painted.stars, look, patternAngle };
		return stretch.scene.comparison === 'halves'
			? [
					{ ...layer, rings: painted.bare, half: 'left' },
					{ ...layer, rings: painted.full, half: 'right' }
				]
			: [{ ...layer, rings: painted.full, half: 'whole' }];
	}

	#galaxy(galaxyId: string): GalaxyPainted {
		const known = this.#galaxies.get(galaxyId);
		if (known) return known;
		const galaxy = this.content.galaxies[galaxyId];
		const motion = this.#motions.of(galaxyId);
		const { model, look } = galaxy.document;
		const angles = motion.makeAngles();
		const whole = massModel(model);
		const table = (phase: Float64Array): RingTable => ({
			radii: motion.radii,
			omega: new Float64Array(motion.radii.length),
			phase
		});
		const made: GalaxyPainted = {
			stars: sampleStars(model, look, {
				count: this.#options.starCount,
				seed: this.content.show.seed,
				radii: motion.radii
			}),
			angles,
			full: table(angles.full),
			bare: table(angles.bare),
			speedRange: speedRange(motion.radii, (k) => whole.circularVelocity(motion.radii[k]))
		};
		this.#galaxies.set(galaxyId, made);
		return made;
	}
}

const galaxyOf = ({ subject }: Scene): string | null =>
	subject.kind === 'galaxy' ? subject.galaxyId : null;
