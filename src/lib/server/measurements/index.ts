export { addMeasurements } from './addMeasurements';
export { citeMeasurements, leavePointOut, putPointBack } from './changeMeasurements';
export { useLightCurves } from './useLightCurves';
export type { MeasurementTable } from './measurementsOf';
export {
	exportMeasurements,
	listMeasurements,
	listVenueMeasurements,
	measurementFilterSchema,
	measurementSorts,
	readMeasurementTable,
	type MeasurementFilter,
	type MeasurementListed,
	type MeasurementsRecord
} from './readMeasurementTables';
