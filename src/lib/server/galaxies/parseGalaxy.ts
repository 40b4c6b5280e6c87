import { galaxyDocumentSchema, type GalaxyDocument } from '../../show/galaxy';
import { parseOrRefuse } from '../parseOrRefuse';

/** @throws AppError invalid, with `issues` naming each field by its path */
export const parseGalaxy = (input: unknown): GalaxyDocument =>
	parseOrRefuse(galaxyDocumentSchema, input, 'galaxy');
