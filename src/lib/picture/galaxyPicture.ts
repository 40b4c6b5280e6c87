import { massModel } from '../dynamics';
import type { DomeGeometry } from '../dome/types';
import type { GalaxyDocument } from '../show/galaxy';
import {
	advance,
	createRingTable,
	hasStars,
	sampleBackground,
	sampleStars,
	setModel
} from '../starfield';
import type { BackgroundSky, RingTable, StarList } from '../starfield/types';
import { TICKS_PER_SECOND, timeFromMyr } from '../units';
import { speedRange } from './speedRange';
import type { Frame, View } from './frame';

export interface GalaxyPictureOptions {
	/** Whole number; same seed, same stars. */
	seed: number;
	starCount: number;
	ringCount?: number;
	/** Light against that on a dome; above 1 where the film shows a narrow part of the sky. 1 where missing. */
	exposure?: number;
}

const backgroundStars = 600;

/**
 * One galaxy turning while its mass model is changed. New speeds hold from the moment they are set
 * and the angles go on, so that no star jumps; only where the lit matter itself is shaped anew do
 * stars take new places, and then each ring keeps the angle it has turned to.
 */
export class GalaxyPicture {
	readonly #options: GalaxyPictureOptions;
	readonly #background: BackgroundSky;
	#document: GalaxyDocument;
	#rings: RingTable;
	#stars: StarList | null;
	#sampled: string;
	#patternAngle = 0;
	#speedRange: [number, number] = [0, 1];

	constructor(document: GalaxyDocument, options: GalaxyPictureOptions) {
		this.#options = options;
		this.#document = document;
		this.#background = sampleBackground(options.seed, backgroundStars);
		this.#rings = createRingTable(document.look.outerRadius, options.ringCount);
		this.#sampled = samplingKey(document);
		this.#stars = this.#sample();
		this.#takeSpeeds();
	}

	/** The angles of all rings; read only. */
	get rings(): RingTable {
		return this.#rings;
	}

	/** False until `settle` where the document asks for stars at other places. */
	get settled(): boolean {
		return this.#sampled === samplingKey(this.#document);
	}

	/**
	 * Takes new speeds, arms, dust and colours at once. Stars stay where they are until `settle`,
	 * since placing them costs more than one frame.
	 * @throws ParameterError where the model cannot be computed; nothing has changed then
	 */
	setDocument(document: GalaxyDocument): void {
		const before = this.#document;
		this.#document = document;
		try {
			this.#takeSpeeds();
		} catch (thrown) {
			this.#document = before;
			throw thrown;
		}
	}

	/** Places the stars anew where that is due; rings keep the angles of their radius. */
	settle(): void {
		if (this.settled) return;
		const { outerRadius } = this.#document.look;
		const before = this.#rings;
		this.#rings = createRingTable(outerRadius, this.#options.ringCount);
		this.#rings.phase.set(phasesAt(before, this.#rings.radii));
		this.#sampled = samplingKey(this.#document);
		this.#stars = this.#sample();
		this.#takeSpeeds();
	}

	/** Lets so many ticks of 1/60 s pass. @param rateMyrPerSecond million years in a second */
	advance(ticks: number, rateMyrPerSecond: number): void {
		const time = (ticks * timeFromMyr(rateMyrPerSecond)) / TICKS_PER_SECOND;
		advance(this.#rings, time);
		this.#patternAngle += this.#document.look.spiral.patternSpeed * time;
	}

	/** Everything a star painter needs; frames share their arrays. No layer where nothing is lit. */
	frame(geometry: DomeGeometry, view: View, colour: 'light' | 'speed'): Frame {
		const { look } = this.#document;
		const layer = this.#stars && {
			stars: this.#stars,
			rings: this.#rings,
			look,
			patternAngle: this.#patternAngle,
			half: 'whole' as const
		};
		return {
			geometry,
			view,
			layers: layer ? [layer] : [],
			background: this.#background,
			colour,
			speedRange: this.#speedRange,
			exposure: this.#options.exposure ?? 1
		};
	}

	/** km/s at the two ends of the colours by speed. */
	get speedRange(): [number, number] {
		return this.#speedRange;
	}

	#takeSpeeds(): void {
		setModel(this.#rings, massModel(this.#document.model));
		const { radii, omega } = this.#rings;
		this.#speedRange = speedRange(radii, (k) => omega[k] * radii[k]);
	}

	#sample(): StarList | null {
		const { model, look } = this.#document;
		if (!hasStars(model)) return null;
		const { starCount, seed } = this.#options;
		return sampleStars(model, look, { count: starCount, seed, radii: this.#rings.radii });
	}
}

/** What decides where stars are and what colour they have; speeds, dust and arm strength do not. */
function samplingKey({ model, look }: GalaxyDocument): string {
	const { spiral, dust: _dust, ...rest } = look;
	const lit = model.components
		.filter((component) => component.lit)
		.map(({ kind, parameters, factor }) => ({ kind, parameters, factor }));
	return JSON.stringify([lit, spiral.arms, spiral.pitchDegrees, rest]);
}

/** Angles of one table at other radii, between its rings by a straight line, outside by its ends. */
function phasesAt(from: RingTable, radii: Float64Array): Float64Array {
	const last = from.radii.length - 1;
	let k = 0;
	return radii.map((R) => {
		while (k < last - 1 && from.radii[k + 1] < R) k++;
		const share = (R - from.radii[k]) / (from.radii[k + 1] - from.radii[k]);
		const inside = Math.min(1, Math.max(0, share));
		return from.phase[k] + (from.phase[k + 1] - from.phase[k]) * inside;
	});
}
