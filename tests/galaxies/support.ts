import { galaxy } from '../show/support/content';
import {
	Tuning,
	type TuningOptions
} from '../../src/routes/(office)/galaxies/tuning/Tuning.svelte';

/** A tuning of the test galaxy that writes down what it tells the page. */
export function makeTuning(options: Partial<TuningOptions> = {}) {
	const told: string[] = [];
	const documents: TuningOptions['document'][] = [];
	const tuning = new Tuning({
		document: galaxy,
		points: [],
		mayEdit: true,
		onchange: (document) => documents.push(document),
		ontold: (message) => told.push(message),
		...options
	});
	return { tuning, told, documents };
}
