export { massModel } from './massModel';
export { rotationCurve } from './rotationCurve';
export {
	tabulateFrequencies,
	defaultSheetHeight,
	type FrequencyTable
} from './tabulateFrequencies';
export { componentKinds, isComponentKind, parameterSetOf } from './componentKinds';
export { accelerationScale, gravityLaws, type LawInfo } from './laws';
export { numberOf } from './parameterValues';
export { criticalDensity, nfwHalo, type NfwHalo } from './components/nfwHalo';
export { orbitTimeMyr, massBreakdown, type MassBreakdown } from './derived';
export { ParameterError } from './ParameterError';
export { specIssues, specLimits, type SpecIssue } from './specIssues';
export { componentSpecSchema, massModelSpecSchema } from './schema';
export { milkyWayMcMillan2017, type ShelfGalaxy } from './shelf';
export type {
	Acceleration,
	ChoiceInfo,
	ComponentKind,
	ComponentKindInfo,
	ComponentSpec,
	FrequencySums,
	GravityLaw,
	ListInfo,
	MassModel,
	MassModelSpec,
	ParameterInfo,
	Parameters,
	ParameterSet,
	ParameterValue
} from './types';
export { chiSquaredOf } from './fit/chiSquared';
export { fitRotationCurve } from './fit/fitRotationCurve';
export { speedBand } from './fit/speedBand';
export type {
	FitOptions,
	FitPoint,
	FitProgress,
	FitResult,
	FittedParameter,
	FreeParameter
} from './fit/types';
export { countBound, energies } from './orbits/energies';
export { integrateOrbits, usualStep, type OrbitOptions } from './orbits/integrateOrbits';
export { makeParticles, type Particles } from './orbits/particles';
export {
	circularSpeedSlope,
	oortConstants,
	peakSpeed,
	resonances,
	type OortConstants,
	type Resonances
} from './curveDerived';
export { discSurfaceDensity, toomreQ } from './discStability';
export { halfMassRadius, overtaking, type Overtaking } from './massDerived';
export { hydrogenLine, lineFrequency, lineShift } from './radioLine';
export { halfLightRadius3d, virialMass, wolfAssumptions, wolfMass } from './swarm';
