import { z } from 'zod';
import { componentIssues, specIssues, type SpecIssue } from './specIssues';
import type { ComponentSpec, MassModelSpec } from './types';

/**
 * A mass model as forms and JSON endpoints take it. Issues sit at the exact field, such as
 * `components.0.parameters.mass`, and carry min and max in `params`; unknown fields are refused.
 * All rules come from `specIssues`, which `massModel` asks too: what passes here can be computed.
 */
export const massModelSpecSchema = z
	.custom<MassModelSpec>()
	.superRefine((value, context) => report(specIssues(value), context));

/** One component by itself; paths begin at the component. */
export const componentSpecSchema = z
	.custom<ComponentSpec>()
	.superRefine((value, context) => report(componentIssues(value), context));

function report(issues: SpecIssue[], context: z.RefinementCtx): void {
	for (const { path, message, min, max } of issues) {
		context.addIssue({ code: 'custom', path, message, params: { min, max } });
	}
}
