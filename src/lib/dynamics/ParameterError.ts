import type { SpecIssue } from './specIssues';

/**
 * A mass model that cannot be computed as it is given. `message` names the component, the
 * parameter and the allowed range in plain words and can be shown to people.
 */
export class ParameterError extends Error {
	/** Undefined where the fault is not in one component. */
	readonly componentId: string | undefined;
	/** Name of the parameter or field at fault. */
	readonly parameter: string | undefined;
	readonly min: number | undefined;
	readonly max: number | undefined;
	/** Where in the spec, such as ['components', 0, 'parameters', 'mass']. */
	readonly path: (string | number)[];

	constructor(issue: SpecIssue) {
		super(issue.message);
		this.name = 'ParameterError';
		this.componentId = issue.componentId;
		this.parameter = issue.parameter;
		this.min = issue.min;
		this.max = issue.max;
		this.path = issue.path;
	}
}
