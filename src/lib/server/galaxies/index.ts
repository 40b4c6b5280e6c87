export { archiveGalaxy, restoreGalaxy, type Archived } from './archiveGalaxy';
export { copyFromShelf, copyGalaxy, createGalaxy } from './createGalaxy';
export {
	galaxyFilterSchema,
	galaxySorts,
	listGalaxies,
	type GalaxyFilter,
	type GalaxyListed
} from './listGalaxies';
export { readGalaxy, type GalaxyRead } from './readGalaxy';
export { renameGalaxy, saveGalaxy, type Saved } from './saveGalaxy';
export { readShelf, shelf, type ShelfEntry } from './shelf';
export { speedSummary, type SpeedSummary } from './speedSummary';
export { startingShapes, type StartingShape } from './startingShapes';
