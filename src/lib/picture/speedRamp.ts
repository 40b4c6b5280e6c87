/**
 * Colours for speed, slow to fast: dark blue through grey to yellow, with lightness rising evenly, so
 * that the order is read without colour and is near the same for eyes that confuse red and green
 * (the property asked for by Nuñez, Anderton and Renslow 2018, PLOS ONE 13(7), e0199239). The stops
 * are our own: lightness 38 to 92 in equal steps, chroma through zero in the middle.
 */
const stops: [number, number, number][] = [
	[26, 88, 178],
	[68, 110, 164],
	[103, 131, 155],
	[139, 152, 148],
	[178, 174, 131],
	[215, 198, 104],
	[252, 226, 66]
];

/** 256 colours of three bytes. */
export const speedRamp: Uint8Array = (() => {
	const bytes = new Uint8Array(256 * 3);
	for (let i = 0; i < 256; i++) {
		const at = (i / 255) * (stops.length - 1);
		const k = Math.min(stops.length - 2, Math.floor(at));
		for (let c = 0; c < 3; c++) {
			bytes[3 * i + c] = Math.round(stops[k][c] + (stops[k + 1][c] - stops[k][c]) * (at - k));
		}
	}
	return bytes;
})();

/** @returns index into the ramp of a speed (km/s), kept at its ends */
export function speedIndex(speed: number, [low, high]: readonly [number, number]): number {
	const share = (speed - low) / (high - low);
	return Math.round(255 * Math.min(1, Math.max(0, share || 0)));
}
