import { AdditiveBlending, GLSL3, Points, RawShaderMaterial, type BufferGeometry } from 'three';
import { domeProjection } from '$lib/dome/projection';
import type { Frame } from '$lib/picture/frame';
import { backgroundBrightness } from '$lib/picture/starLight';
import type { BackgroundSky } from '$lib/starfield/types';
import vertexShader from './background.vert.glsl?raw';
import { backgroundGeometry } from './starGeometry';
import fragmentShader from './stars.frag.glsl?raw';

/** The faint sky behind the galaxy as a three object. */
export class BackgroundPoints {
	readonly points: Points<BufferGeometry, RawShaderMaterial>;

	constructor(readonly sky: BackgroundSky) {
		const material = new RawShaderMaterial({
			glslVersion: GLSL3,
			vertexShader,
			fragmentShader,
			blending: AdditiveBlending,
			premultipliedAlpha: true,
			transparent: true,
			depthTest: false,
			depthWrite: false,
			uniforms: {
				rim: { value: 1 },
				cosTilt: { value: 1 },
				sinTilt: { value: 0 },
				filmSize: { value: 1 },
				gain: { value: 0 }
			}
		});
		this.points = new Points(backgroundGeometry(sky), material);
		this.points.frustumCulled = false;
	}

	set(filmSize: number, { geometry, exposure }: Frame): void {
		const { uniforms } = this.points.material;
		const { rim, cosTilt, sinTilt } = domeProjection(geometry);
		uniforms.rim.value = rim;
		uniforms.cosTilt.value = cosTilt;
		uniforms.sinTilt.value = sinTilt;
		uniforms.filmSize.value = filmSize;
		uniforms.gain.value = (backgroundBrightness * exposure) / 255;
	}

	dispose(): void {
		this.points.geometry.dispose();
		this.points.material.dispose();
	}
}
