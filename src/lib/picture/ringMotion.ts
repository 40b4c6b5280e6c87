import { massModel } from '../dynamics';
import type { EditionContent, EditionGalaxy } from '../show/edition';
import type { MotionStretch } from '../show/playback';
import { effectiveModel, sceneSettings } from '../show/settings';
import { createRingTable, setModel } from '../starfield';
import type { RingTable } from '../starfield/types';
import { TICKS_PER_SECOND, timeFromMyr } from '../units';

/** Angles of one moment: the model as it is, and the same stars without the halo. */
export interface Angles {
	full: Float64Array;
	bare: Float64Array;
	/** Time passed since the fresh start, kpc/(km/s): turns the density wave. */
	time: number;
}

/** Ω of the two models of a stretch, km/s/kpc. */
interface Frequencies {
	full: Float64Array;
	bare: Float64Array;
	/** kpc/(km/s) in one tick. */
	perTick: number;
}

const keptFrequencies = 64;

/**
 * How far the rings of one galaxy have turned. A stretch of constant settings turns a ring by
 * Ω × ticks × (time in a tick), computed in one product, so the sum over a list of stretches is the
 * same however often and wherever it is computed.
 */
export class RingMotion {
	readonly radii: Float64Array;
	readonly #galaxy: EditionGalaxy;
	readonly #work: RingTable;
	readonly #frequencies = new Map<string, Frequencies>();
	/** Angles at the end of closed stretches; a cache, since they follow from the list. */
	readonly #ends = new WeakMap<MotionStretch, Angles>();

	constructor(galaxy: EditionGalaxy, ringCount?: number) {
		this.#galaxy = galaxy;
		this.#work = createRingTable(galaxy.document.look.outerRadius, ringCount);
		this.radii = this.#work.radii;
	}

	/** Angles at the end of a stretch that is still running; `out` is filled and returned. */
	angles(open: MotionStretch, out: Angles): Angles {
		const start = this.#endOf(open.before);
		return this.#turn(start, open, out);
	}

	/** Ω of the stretch's settings, km/s/kpc, for colours by speed. */
	frequencies(stretch: MotionStretch): Frequencies {
		const settings = sceneSettings(stretch.scene, stretch.controls);
		const key = JSON.stringify(settings);
		const kept = this.#frequencies.get(key);
		if (kept) return kept;
		const model = massModel(effectiveModel(this.#galaxy.document, settings));
		setModel(this.#work, model);
		const full = this.#work.omega.slice();
		setModel(this.#work, model.lit());
		const made = {
			full,
			bare: this.#work.omega.slice(),
			perTick: timeFromMyr(settings.rate) / TICKS_PER_SECOND
		};
		if (this.#frequencies.size >= keptFrequencies) {
			const oldest = this.#frequencies.keys().next();
			if (!oldest.done) this.#frequencies.delete(oldest.value);
		}
		this.#frequencies.set(key, made);
		return made;
	}

	makeAngles(): Angles {
		const { length } = this.radii;
		return { full: new Float64Array(length), bare: new Float64Array(length), time: 0 };
	}

	#endOf(stretch: MotionStretch | null): Angles {
		if (!stretch) return this.makeAngles();
		// Walk back to the last stretch whose end is known, then forward; lists may be long.
		const unknown: MotionStretch[] = [];
		let at: MotionStretch | null = stretch;
		while (at && !this.#ends.has(at)) {
			unknown.push(at);
			at = at.before;
		}
		let angles = (at && this.#ends.get(at)) ?? this.makeAngles();
		for (let next = unknown.pop(); next; next = unknown.pop()) {
			angles = this.#turn(angles, next, this.makeAngles());
			this.#ends.set(next, angles);
		}
		return angles;
	}

	#turn(start: Angles, stretch: MotionStretch, out: Angles): Angles {
		const { full, bare, perTick } = this.frequencies(stretch);
		const time = stretch.ticks * perTick;
		// A scene begins with all stars where its predecessor's full model left them.
		const bareStart = stretch.opensScene ? start.full : start.bare;
		for (let k = 0; k < out.full.length; k++) {
			out.full[k] = start.full[k] + full[k] * time;
			out.bare[k] = bareStart[k] + bare[k] * time;
		}
		out.time = start.time + time;
		return out;
	}
}

/** The ring motion of every galaxy of an edition, made when first asked for. */
export class RingMotions {
	readonly #made = new Map<string, RingMotion>();

	constructor(
		readonly content: EditionContent,
		readonly ringCount?: number
	) {}

	of(galaxyId: string): RingMotion {
		const known = this.#made.get(galaxyId);
		if (known) return known;
		const galaxy = this.content.galaxies[galaxyId];
		if (!galaxy) throw new Error(`The edition holds no galaxy ${galaxyId}.`);
		const made = new RingMotion(galaxy, this.ringCount);
		this.#made.set(galaxyId, made);
		return made;
	}
}
