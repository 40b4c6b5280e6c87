import type { ComponentKindInfo, MassComponent } from '../types';

/** What each component file exports: how it is described, and how it is made from checked values. */
export interface ComponentMaker {
	info: ComponentKindInfo;
	/** @param parameters complete and in range, as `specIssues` has found */
	make(parameters: Record<string, number>): MassComponent;
}
