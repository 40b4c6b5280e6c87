import type { FitNews, FitRequest } from './fitRequest';
import FitWorker from './fitWorker?worker';

/** A fit that is under way. */
export interface RunningFit {
	/** Ends it at once; nothing more is told. */
	cancel(): void;
}

/** Starts a worker for one request. It ends by itself after the last news. */
export function fitInWorker(request: FitRequest, onnews: (news: FitNews) => void): RunningFit {
	const worker = new FitWorker();
	worker.onmessage = ({ data }: MessageEvent<FitNews>) => {
		if (data.kind === 'done') worker.terminate();
		onnews(data);
	};
	worker.onerror = (event) => {
		worker.terminate();
		const why = event.message || 'The fit could not be started in this browser.';
		onnews({ kind: 'refused', key: '', why });
		onnews({ kind: 'done' });
	};
	worker.postMessage(request);
	return { cancel: () => worker.terminate() };
}
