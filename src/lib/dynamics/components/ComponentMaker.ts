import type { ComponentKindInfo, MassComponent } from '../types';

/** Parameters that are not numbers, complete. */
export interface WordsAndLists {
	choices: Record<string, string>;
	lists: Record<string, readonly number[]>;
}

/** What each component file exports: how it is described, and how it is made from checked values. */
export interface ComponentMaker {
	info: ComponentKindInfo;
	/** @param parameters complete and in range, as `specIssues` has found; so is `others` */
	make(parameters: Record<string, number>, others: WordsAndLists): MassComponent;
}
