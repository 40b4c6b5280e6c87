/** One lobe with its own width on each side, as in the fits below. */
const lobe = (wavelength: number, peak: number, below: number, above: number) => {
	const t = (wavelength - peak) / (wavelength < peak ? below : above);
	return Math.exp(-0.5 * t * t);
};

/**
 * CIE 1931 colour matching functions, analytic multi-lobe fit of Wyman, Sloan and Shirley 2013,
 * Journal of Computer Graphics Techniques 2(2), 1. Wavelength in nm.
 */
const matching = (w: number): [number, number, number] => [
	1.056 * lobe(w, 599.8, 37.9, 31.0) +
		0.362 * lobe(w, 442.0, 16.0, 26.7) -
		0.065 * lobe(w, 501.1, 20.4, 26.2),
	0.821 * lobe(w, 568.8, 46.9, 40.5) + 0.286 * lobe(w, 530.9, 16.3, 31.1),
	1.217 * lobe(w, 437.0, 11.8, 36.0) + 0.681 * lobe(w, 459.0, 26.0, 13.8)
];

/** Second radiation constant hc/k in nm K. CODATA 2018. */
const secondRadiationConstant = 1.438776877e7;

const encode = (linear: number) =>
	linear <= 0.0031308 ? 12.92 * linear : 1.055 * linear ** (1 / 2.4) - 0.055;

/**
 * Colour of a black body: Planck's spectrum through the matching functions into sRGB (IEC 61966-2-1
 * primaries), the strongest channel at 255.
 * @param temperature K @returns three bytes
 */
export function temperatureColour(temperature: number): [number, number, number] {
	let X = 0;
	let Y = 0;
	let Z = 0;
	for (let w = 380; w <= 780; w += 5) {
		const radiance = w ** -5 / Math.expm1(secondRadiationConstant / (w * temperature));
		const [x, y, z] = matching(w);
		X += x * radiance;
		Y += y * radiance;
		Z += z * radiance;
	}
	const linear = [
		3.2404542 * X - 1.5371385 * Y - 0.4985314 * Z,
		-0.969266 * X + 1.8760108 * Y + 0.041556 * Z,
		0.0556434 * X - 0.2040259 * Y + 1.0572252 * Z
	].map((c) => Math.max(0, c));
	const top = Math.max(...linear);
	const [r, g, b] = linear.map((c) => Math.round(255 * encode(c / top)));
	return [r, g, b];
}
