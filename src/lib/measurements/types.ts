/** One observed speed: radius in kpc, speed and its one standard error in km/s. */
export interface MeasuredPoint {
	radius: number;
	speed: number;
	error: number;
}
