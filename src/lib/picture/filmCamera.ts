import { domeProjection } from '../dome/projection';
import type { DomeGeometry } from '../dome/types';
import { makeCamera, setCamera } from './camera';
import type { View } from './frame';

/**
 * The camera turned into the frame of the dome's axis, so that a star goes to the film without a
 * second rotation. Rows: right, toward the film's bottom, along the axis.
 */
export class FilmCamera {
	readonly matrix = new Float64Array(9);
	/** kpc: the galaxy's centre as seen from the eye. */
	readonly shift = new Float64Array(3);
	/** Half the aperture, radians. */
	rim = Math.PI / 2;
	readonly #room = makeCamera();

	set(view: View, geometry: DomeGeometry): void {
		const { rim, cosTilt, sinTilt } = domeProjection(geometry);
		const { matrix, shift } = setCamera(view, this.#room);
		for (let k = 0; k < 3; k++) {
			this.matrix[k] = matrix[k];
			this.matrix[3 + k] = matrix[3 + k] * cosTilt - matrix[6 + k] * sinTilt;
			this.matrix[6 + k] = matrix[3 + k] * sinTilt + matrix[6 + k] * cosTilt;
		}
		this.shift[0] = shift[0];
		this.shift[1] = shift[1] * cosTilt - shift[2] * sinTilt;
		this.shift[2] = shift[1] * sinTilt + shift[2] * cosTilt;
		this.rim = rim;
	}
}
