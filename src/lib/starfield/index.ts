export { seededRandom, type Random } from './random';
export { temperatureColour } from './temperatureColour';
export { createRingTable, ringOf, setModel, advance, defaultRingCount } from './ringTable';
export { sampleStars, armPhase, type SampleOptions } from './sampleStars';
export { makeStarList, type StarDraft } from './starList';
export { hasStars } from './starProfile';
export { sampleBackground } from './background';
export { populations } from './types';
export type {
	BackgroundSky,
	GalaxyLook,
	Population,
	RingTable,
	SpiralPattern,
	StarList
} from './types';
