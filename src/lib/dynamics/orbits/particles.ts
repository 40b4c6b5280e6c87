/** Many test particles, one list a coordinate, so that nothing is allocated while they move. */
export interface Particles {
	/** kpc. */
	x: Float64Array;
	y: Float64Array;
	z: Float64Array;
	/** km/s. */
	vx: Float64Array;
	vy: Float64Array;
	vz: Float64Array;
}

/** @param count how many, all at rest at the centre */
export const makeParticles = (count: number): Particles => ({
	x: new Float64Array(count),
	y: new Float64Array(count),
	z: new Float64Array(count),
	vx: new Float64Array(count),
	vy: new Float64Array(count),
	vz: new Float64Array(count)
});
