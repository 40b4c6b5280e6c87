import { createContext } from 'svelte';
import { componentKinds, massModel } from '$lib/dynamics';
import type { ComponentKindInfo, ComponentSpec, GravityLaw } from '$lib/dynamics/types';
import { chartRadii, speedCurves } from '$lib/components/chart/speedCurves';
import type { MeasuredPoint } from '$lib/measurements/types';
import { newId } from '$lib/show/editing';
import { begin, edit, redo, undo, type History } from '$lib/show/editingHistory';
import type { GalaxyDocument } from '$lib/show/galaxy';

export interface TuningOptions {
	document: GalaxyDocument;
	points: readonly MeasuredPoint[];
	/** Name of their table. */
	pointsName?: string;
	/** Without it sliders can be tried, but nothing is told to `onchange`. */
	mayEdit: boolean;
	/** Told of every change of the document. */
	onchange: (document: GalaxyDocument) => void;
	/** Told of what was done, in words; `undoable` where it should be offered to take it back. */
	ontold: (message: string, undoable?: boolean) => void;
}

/** The galaxy under work: its document with undo and redo, and what follows from it. */
export class Tuning {
	#history: History<GalaxyDocument>;
	readonly #options: TuningOptions;
	readonly mayEdit: boolean;
	/** What the chart shows of what was measured, and the name of its table. */
	points = $state.raw<readonly MeasuredPoint[]>([]);
	pointsName = $state<string | undefined>();
	/** One standard error either side of the total at `radii`; null without a fit that still holds. */
	band = $state.raw<{ low: Float64Array; high: Float64Array } | null>(null);
	/** False until the page answers: what is pressed before that would be lost. */
	ready = $state(false);
	/** Radius under the pointer, kpc; null where it is elsewhere. */
	looked = $state<number | null>(null);
	/** The component whose row is pointed at or focused. */
	markedId = $state<string | null>(null);

	readonly document = $derived.by(() => this.#history.present);
	/** kpc; what every read-out is for. */
	readonly reading = $derived.by(() => this.looked ?? this.document.readingRadius);
	readonly model = $derived.by(() => massModel(this.document.model));
	/** The same matter under Newton's law: there pulls of components add. */
	readonly newton = $derived.by(() => massModel({ components: this.document.model.components }));
	/** Whether the law leaves no room for unlit matter, and why. */
	readonly litOnly = $derived.by(() => (this.document.model.law ?? 'newton') !== 'newton');
	readonly litOnlyWhy =
		'Under this law lit matter does all the pulling. Choose Newton’s law to add unlit matter.';
	/** kpc: the chart's right end, with room for the outermost measured point. */
	readonly outer = $derived.by(() =>
		this.points.reduce(
			(most, { radius }) => Math.max(most, radius * 1.03),
			this.document.look.outerRadius
		)
	);
	readonly radii = $derived.by(() => chartRadii(this.outer));
	readonly curves = $derived.by(() => speedCurves(this.document.model, this.model, this.radii));
	readonly undoLabel = $derived.by(() => this.#history.past.at(-1)?.label);
	readonly redoLabel = $derived.by(() => this.#history.future[0]?.label);
	/** Whether something was tried that is not what was read. */
	readonly touched = $derived.by(() => this.document !== this.#options.document);

	constructor(options: TuningOptions) {
		this.#options = options;
		this.mayEdit = options.mayEdit;
		this.points = options.points;
		this.pointsName = options.pointsName;
		this.#history = $state.raw(begin(options.document));
	}

	/** Takes a document as one step that can be undone. Same group in quick succession: one step. */
	change(next: GalaxyDocument, label: string, group?: string): void {
		if (next === this.document) return;
		this.#set(edit(this.#history, next, { label, group, at: performance.now() }));
	}

	changeComponents(components: ComponentSpec[], label: string, group?: string): void {
		const { document } = this;
		this.change({ ...document, model: { ...document.model, components } }, label, group);
	}

	/**
	 * @param words what changes, for the name of the undo step
	 * @param part which field of it: quick changes of one field are one step
	 */
	changeComponent(id: string, change: Partial<ComponentSpec>, words: string, part = words): void {
		const { components } = this.document.model;
		this.changeComponents(
			components.map((component) =>
				component.id === id ? { ...component, ...change } : component
			),
			`Changed ${words}`,
			`${id} ${part}`
		);
	}

	/** Adds a component as its kind is usually met. */
	add(info: ComponentKindInfo): void {
		const [set] = info.parameterSets;
		const component: ComponentSpec = {
			id: newId(),
			kind: info.kind,
			name: info.label,
			parameters: {
				...Object.fromEntries(
					set.parameters.filter((p) => !p.optional).map((p) => [p.name, p.initial])
				),
				...Object.fromEntries((set.lists ?? []).map((list) => [list.name, [...list.initial]]))
			},
			lit: info.lit
		};
		const { components } = this.document.model;
		this.changeComponents([...components, component], `Added “${info.label}”`);
	}

	remove({ id, name }: ComponentSpec): void {
		const label = `Removed “${name || id}”`;
		this.changeComponents(
			this.document.model.components.filter((component) => component.id !== id),
			label
		);
		this.#options.ontold(label, true);
	}

	/** Under a law other than Newton's unlit matter is taken out: it acts on lit matter alone. */
	changeLaw(law: GravityLaw): void {
		const { components } = this.document.model;
		const model =
			law === 'newton'
				? { components }
				: { components: components.filter((component) => component.lit), law };
		this.change({ ...this.document, model }, 'Changed the law');
		if (model.components.length < components.length) {
			this.#options.ontold('Unlit matter was taken out', true);
		}
	}

	/** Where the reading line rests, kpc. */
	rest(radius: number): void {
		const readingRadius = Math.min(200, Math.max(0.1, radius));
		this.change({ ...this.document, readingRadius }, 'Moved the reading line', 'reading');
	}

	undo(): void {
		const { undoLabel } = this;
		if (!undoLabel) return;
		this.#set(undo(this.#history));
		this.#options.ontold(`Undone: ${undoLabel}`);
	}

	redo(): void {
		const { redoLabel } = this;
		if (!redoLabel) return;
		this.#set(redo(this.#history));
		this.#options.ontold(`Done again: ${redoLabel}`);
	}

	#set(history: History<GalaxyDocument>): void {
		this.#history = history;
		if (this.mayEdit) this.#options.onchange(history.present);
	}
}

export const kindInfo = (component: ComponentSpec): ComponentKindInfo | undefined =>
	componentKinds.find((info) => info.kind === component.kind);

export const [getTuning, setTuning] = createContext<Tuning>();
