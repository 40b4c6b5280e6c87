import { showDocumentSchema, type ShowDocument } from '../../show/document';
import { parseOrRefuse } from '../parseOrRefuse';

/** @throws AppError invalid, with `issues` naming each field by its path */
export const parseDocument = (input: unknown): ShowDocument =>
	parseOrRefuse(showDocumentSchema, input, 'show document');
