import { chiSquaredOf, speedBand, type FitPoint, type FitResult } from '$lib/dynamics';
import { massModel } from '$lib/dynamics';
import type { MassModelSpec } from '$lib/dynamics/types';
import type { MeasuredPoint } from '$lib/measurements/types';
import type { GalaxyDocument } from '$lib/show/galaxy';
import type { Tuning } from '../Tuning.svelte';
import { fitInWorker, type RunningFit } from './fitInWorker';
import type { FitRequest } from './fitRequest';
import { boundsOf, freeCandidates, usuallyFree } from './freeCandidates';
import { settleMs, settling } from './settling';

/** A table of measured speeds as the page has it: kpc and km/s. */
export interface FitTable {
	id: string;
	name: string;
	source: string;
	points: readonly MeasuredPoint[];
}

/** A result with what it was asked for, as the page shows it. */
export interface Outcome {
	result: FitResult;
	/** The galaxy before it. */
	before: GalaxyDocument;
	table: FitTable;
	used: readonly FitPoint[];
}

/** The seed of every fit on the page: the same data give the same result again. */
export const fitSeed = 1;

/** Fitting on the tuning page: which points, what is free, a fit under way, and what came of it. */
export class Fitting {
	readonly #tuning: Tuning;
	readonly tables: readonly FitTable[];
	tableId = $state<string | undefined>();
	/** Keys of the ticked parameters; null as long as nobody chose. */
	#ticked = $state.raw<readonly string[] | null>(null);
	running = $state.raw<{ done: number; of: number; chiSquared: number } | null>(null);
	outcome = $state.raw<Outcome | null>(null);
	/** Why the last fit gave nothing. */
	refused = $state('');
	#work: RunningFit | null = null;
	#frame = 0;

	readonly table = $derived.by(() => this.tables.find(({ id }) => id === this.tableId));
	readonly used = $derived.by(() => usable(this.table?.points ?? []));
	readonly candidates = $derived.by(() => freeCandidates(this.#tuning.document.model.components));
	readonly ticked = $derived.by(() => {
		const known = this.candidates.map(({ key }) => key);
		return (this.#ticked ?? usuallyFree(this.candidates)).filter((key) => known.includes(key));
	});
	/** χ² of the galaxy as it stands, while sliders move too. */
	readonly chiSquared = $derived.by(() =>
		this.used.length === 0 ? NaN : chiSquaredOf(this.#tuning.document.model, this.used)
	);
	readonly degreesOfFreedom = $derived.by(() => this.used.length - this.ticked.length);
	readonly residuals = $derived.by(() => {
		const { model } = this.#tuning;
		return this.used.map(({ radius, speed, error }) => ({
			radius,
			left: speed - model.circularVelocity(radius),
			error
		}));
	});
	/** Whether the outcome is still what the page shows. */
	readonly holds = $derived.by(
		() => this.outcome !== null && this.outcome.result.spec === this.#tuning.document.model
	);
	readonly why = $derived.by(() => {
		if (!this.table) return 'Choose a table of measured speeds.';
		if (this.used.length === 0) return 'Every point of this table is left out or has no error.';
		if (this.ticked.length === 0) return 'Tick at least one parameter to be free.';
		if (this.degreesOfFreedom < 0) {
			return `${this.used.length} points cannot fix ${this.ticked.length} parameters. Tick fewer.`;
		}
		return '';
	});

	constructor(tuning: Tuning, tables: readonly FitTable[]) {
		this.#tuning = tuning;
		this.tables = tables;
		this.choose(tables[0]?.id);
	}

	/** Takes another table; the chart shows its points. */
	choose(id: string | undefined): void {
		this.cancel();
		this.tableId = id;
		this.outcome = null;
		this.#tuning.band = null;
		this.#tuning.points = this.table?.points ?? [];
		this.#tuning.pointsName = this.table?.name;
	}

	tick(key: string, free: boolean): void {
		const others = this.ticked.filter((one) => one !== key);
		this.#ticked = free ? [...others, key] : others;
	}

	/** What is asked of the worker for the galaxy as it stands. */
	request(): FitRequest {
		const free = this.candidates.filter(({ key }) => this.ticked.includes(key)).map(boundsOf);
		const spec = plain(this.#tuning.document.model);
		return { models: [{ key: 'own', spec, free }], points: [...this.used], seed: fitSeed };
	}

	start(): void {
		const { table, used } = this;
		if (this.why !== '' || !table || this.running) return;
		const before = this.#tuning.document;
		this.refused = '';
		this.outcome = null;
		this.running = { done: 0, of: 1, chiSquared: this.chiSquared };
		this.#work = fitInWorker(this.request(), (news) => {
			if (news.kind === 'progress') this.running = news.progress;
			else if (news.kind === 'refused') this.refused = news.why;
			else if (news.kind === 'result') {
				this.#settle({ result: news.result, before, table, used }, performance.now());
			} else {
				this.running = null;
				this.#work = null;
			}
		});
	}

	cancel(): void {
		this.#work?.cancel();
		this.#work = null;
		this.running = null;
		if (this.#frame !== 0) cancelAnimationFrame(this.#frame);
		this.#frame = 0;
	}

	/** Puts a result on the page as one step that can be undone. */
	take(spec: MassModelSpec, label: string, group?: string): void {
		const { document } = this.#tuning;
		this.#tuning.change({ ...document, model: spec }, label, group);
	}

	/** The galaxy as it was before the fit. */
	putBack(): void {
		const { outcome } = this;
		this.cancel();
		this.outcome = null;
		this.#tuning.band = null;
		if (outcome) this.#tuning.change(outcome.before, 'Put back what was before the fit');
	}

	/** Shows the band of a result at the chart's radii. */
	showBand(result: FitResult | null): void {
		if (!result) {
			this.#tuning.band = null;
			return;
		}
		const { radii } = this.#tuning;
		const model = massModel(result.spec);
		const error = speedBand(result, radii, new Float64Array(radii.length));
		const speed = Float64Array.from(radii, (R) => model.circularVelocity(R));
		this.#tuning.band = {
			low: speed.map((v, i) => Math.max(0, v - error[i])),
			high: speed.map((v, i) => v + error[i])
		};
	}

	#settle(outcome: Outcome, from: number): void {
		const start = outcome.before.model;
		const { spec } = outcome.result;
		const still = matchMedia('(prefers-reduced-motion: reduce)').matches;
		const step = (now: number) => {
			const share = still ? 1 : Math.min(1, (now - from) / settleMs);
			this.take(settling(start, spec, share), 'Fitted to measurements', 'fit');
			if (share < 1) this.#frame = requestAnimationFrame(step);
			else {
				this.outcome = outcome;
				this.showBand(outcome.result);
			}
		};
		step(from);
	}
}

/** Points that count: with an error, and not left out. */
export const usable = (points: readonly MeasuredPoint[]): FitPoint[] =>
	points
		.filter(({ error, leftOut }) => error > 0 && leftOut === undefined)
		.map(({ radius, speed, error }) => ({ radius, speed, error }));

/** A copy that a worker can be sent. */
export const plain = (spec: MassModelSpec): MassModelSpec => structuredClone($state.snapshot(spec));
