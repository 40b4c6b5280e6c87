import { massBreakdown, massModel, type FitResult } from '$lib/dynamics';
import type { Fitting } from './Fitting.svelte';
import { fitSeed, plain } from './Fitting.svelte';
import { fitInWorker, type RunningFit } from './fitInWorker';
import { haloChoices } from './haloChoices';

/** One halo side by side with the others. */
export interface TrialRow {
	kind: string;
	label: string;
	/** Null while it is under way; a sentence where the fit was refused. */
	result: FitResult | string | null;
	/** Msun inside the outermost point that was used. */
	lit: number;
	unlit: number;
}

/** Several halos fitted to the same points, one after the other, away from the page. */
export class HaloTrial {
	readonly #fitting: Fitting;
	rows = $state.raw<readonly TrialRow[]>([]);
	running = $state(false);
	#work: RunningFit | null = null;
	/** kpc: what the masses are inside of. */
	outermost = $state(0);
	/** Name of the table that was fitted. */
	tableName = $state('');

	constructor(fitting: Fitting) {
		this.#fitting = fitting;
	}

	start(spec: Parameters<typeof haloChoices>[0]): void {
		const { used, ticked, table } = this.#fitting;
		if (this.running || used.length === 0) return;
		const choices = haloChoices(plain(spec), ticked);
		this.outermost = Math.max(...used.map(({ radius }) => radius));
		this.tableName = table?.name ?? '';
		this.rows = choices.map(({ kind, label }) => ({ kind, label, result: null, lit: 0, unlit: 0 }));
		this.running = true;
		const models = choices.map(({ kind: key, spec: model, free }) => ({ key, spec: model, free }));
		this.#work = fitInWorker({ models, points: [...used], seed: fitSeed }, (news) => {
			if (news.kind === 'result') this.#found(news.key, news.result);
			else if (news.kind === 'refused') this.#found(news.key, news.why);
			else if (news.kind === 'done') this.cancel();
		});
	}

	cancel(): void {
		this.#work?.cancel();
		this.#work = null;
		this.running = false;
		this.rows = this.rows.filter(({ result }) => result !== null);
	}

	#found(kind: string, result: FitResult | string): void {
		const masses =
			typeof result === 'string'
				? { lit: 0, unlit: 0 }
				: massBreakdown(massModel(result.spec), this.outermost);
		this.rows = this.rows.map((row) =>
			row.kind === kind ? { ...row, result, lit: masses.lit, unlit: masses.unlit } : row
		);
	}
}
