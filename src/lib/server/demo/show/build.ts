import type { LiveControl, Scene } from '../../../show/document';

/** What a scene of the demo says for itself; everything else stands at the values below. */
export interface SceneDraft {
	title: string;
	seconds: number;
	script: string;
	note?: string;
	subject: Scene['subject'];
	pace?: 'timed' | 'presenter';
	mix?: Partial<Scene['mix']>;
	comparison?: Scene['comparison'];
	motion?: Partial<Scene['motion']>;
	view?: Partial<Scene['view']>;
	colour?: Scene['colour'];
	drawings?: Partial<Scene['drawings']>;
	controls?: Omit<LiveControl, 'id'>[];
	entrance?: Scene['entrance'];
}

/**
 * Stable ids, so that the demo is the same wherever it is made: a version 8 UUID (RFC 9562) whose
 * last digits are the scene and the control.
 */
export function demoId(scene: number, control = 0): string {
	const two = (n: number) => String(n).padStart(2, '0');
	return `fa2e0000-0000-8000-8000-0000000${two(scene)}0${two(control)}`;
}

/** Blank lines part paragraphs; other line ends are only there for the source's sake. */
const paragraphs = (text: string): string =>
	text
		.trim()
		.split(/\n\s*\n/)
		.map((paragraph) => paragraph.replace(/\s+/g, ' '))
		.join('\n\n');

/** A whole scene from its draft. @param number 1, 2, 3 … */
export function buildScene(draft: SceneDraft, number: number): Scene {
	return {
		id: demoId(number),
		title: draft.title,
		pace:
			draft.pace === 'timed'
				? { kind: 'timed', seconds: draft.seconds }
				: { kind: 'presenter', expectedSeconds: draft.seconds },
		subject: draft.subject,
		mix: { haloFactor: 1, starFactor: 1, ...draft.mix },
		comparison: draft.comparison ?? 'none',
		motion: { rate: 3, begin: 'go-on', ...draft.motion },
		view: { distance: 48, inclination: 40, turn: 0, centreAltitude: 38, ...draft.view },
		colour: draft.colour ?? 'light',
		drawings: {
			chart: false,
			chartLit: false,
			chartTotal: false,
			chartMeasured: false,
			rings: [],
			name: false,
			scale: false,
			caption: '',
			...draft.drawings
		},
		script: paragraphs(draft.script),
		note: draft.note ?? '',
		controls: (draft.controls ?? []).map((control, i) => ({
			...control,
			id: demoId(number, i + 1)
		})),
		entrance: draft.entrance ?? { kind: 'fade', seconds: 4 }
	};
}
