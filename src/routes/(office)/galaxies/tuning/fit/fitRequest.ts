import type { FitPoint, FitProgress, FitResult, FreeParameter } from '$lib/dynamics';
import type { MassModelSpec } from '$lib/dynamics/types';

/** What the page asks of the worker: one fit a model. */
export interface FitRequest {
	models: { key: string; spec: MassModelSpec; free: FreeParameter[] }[];
	points: FitPoint[];
	seed: number;
}

/** What the worker tells: progress of one model, its result, or why there is none. */
export type FitNews =
	| { kind: 'progress'; key: string; progress: FitProgress }
	| { kind: 'result'; key: string; result: FitResult }
	| { kind: 'refused'; key: string; why: string }
	| { kind: 'done' };
