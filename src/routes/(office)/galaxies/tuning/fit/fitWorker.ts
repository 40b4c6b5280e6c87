import { fitRotationCurve } from '$lib/dynamics';
import type { FitNews, FitRequest } from './fitRequest';

const tell = (news: FitNews) => postMessage(news);

/** Fits away from the page, so that it goes on answering; the page ends the worker to cancel. */
addEventListener('message', ({ data }: MessageEvent<FitRequest>) => {
	for (const { key, spec, free } of data.models) {
		try {
			const result = fitRotationCurve({
				spec,
				free,
				points: data.points,
				seed: data.seed,
				onProgress: (progress) => tell({ kind: 'progress', key, progress })
			});
			tell({ kind: 'result', key, result });
		} catch (error) {
			const why = error instanceof Error ? error.message : String(error);
			tell({ kind: 'refused', key, why });
		}
	}
	tell({ kind: 'done' });
});
