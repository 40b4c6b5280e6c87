export { archiveShow, restoreShow } from './archiveShow';
export { copyShow, createShow } from './createShow';
export { listEditions, readEdition, type EditionListed, type EditionRead } from './editions';
export { freezeEdition, type Frozen } from './freezeEdition';
export {
	listShows,
	showFilterSchema,
	showSorts,
	showStates,
	type ShowFilter,
	type ShowListed
} from './listShows';
export type { FieldIssue } from '../parseOrRefuse';
export { readShow, type ShowRead } from './readShow';
export { saveShow, type Saved } from './saveShow';
