import { massModel } from '../massModel';
import type { MassModelSpec } from '../types';
import type { FitPoint } from './types';

/** χ²: the squares of measured less model speed, each over the square of its standard error. */
export function chiSquaredOf(spec: MassModelSpec, points: readonly FitPoint[]): number {
	const model = massModel(spec);
	let sum = 0;
	for (const { radius, speed, error } of points) {
		sum += ((speed - model.circularVelocity(radius)) / error) ** 2;
	}
	return sum;
}
