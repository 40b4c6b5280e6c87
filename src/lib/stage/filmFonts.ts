const faces = [
	"16px 'Atkinson Hyperlegible'",
	"700 16px 'Atkinson Hyperlegible'",
	"16px 'Atkinson Hyperlegible Mono'"
];

/**
 * Settles when the faces of the drawings are there or could not be had: letters drawn before would stay
 * in the wrong one.
 */
export const filmFonts = (): Promise<unknown> =>
	Promise.allSettled(faces.map((face) => document.fonts.load(face)));
