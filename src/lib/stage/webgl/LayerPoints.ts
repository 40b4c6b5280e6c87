import {
	AdditiveBlending,
	DataTexture,
	FloatType,
	GLSL3,
	Matrix3,
	NearestFilter,
	Points,
	RawShaderMaterial,
	RedFormat,
	RGBAFormat,
	UnsignedByteType,
	Vector2,
	Vector3,
	type BufferGeometry
} from 'three';
import type { FilmCamera } from '$lib/picture/filmCamera';
import type { Frame, StarLayer } from '$lib/picture/frame';
import { speedIndex, speedRamp } from '$lib/picture/speedRamp';
import {
	dimmestLight,
	lightTables,
	spotShare,
	spriteRadius,
	tableSize
} from '$lib/picture/starLight';
import { makeViewLight, setViewLight } from '$lib/picture/viewLight';
import { populations, type GalaxyLook } from '$lib/starfield/types';
import fragmentShader from './stars.frag.glsl?raw';
import vertexShader from './stars.vert.glsl?raw';

/** The speed ramp as a texture of 256 texels; opaque. */
function rampTexture(): DataTexture {
	const bytes = new Uint8Array(256 * 4).fill(255);
	for (let i = 0; i < 256; i++) bytes.set(speedRamp.subarray(3 * i, 3 * i + 3), 4 * i);
	const texture = new DataTexture(bytes, 256, 1, RGBAFormat, UnsignedByteType);
	texture.needsUpdate = true;
	return texture;
}

const sides = { left: -1, whole: 0, right: 1 } as const;

/** One star layer as a three object: the star list stays on the GPU, a frame sends its rings. */
export class LayerPoints {
	readonly points: Points<BufferGeometry, RawShaderMaterial>;
	readonly #rings: Float32Array;
	readonly #ringTexture: DataTexture;
	readonly #ramp = rampTexture();
	readonly #light = makeViewLight();
	#lightTexture: DataTexture | null = null;
	#look: GalaxyLook | null = null;

	constructor(geometry: BufferGeometry, ringCount: number) {
		this.#rings = new Float32Array(ringCount * 2 * 4);
		this.#ringTexture = new DataTexture(this.#rings, ringCount, 2, RGBAFormat, FloatType);
		this.#ringTexture.minFilter = this.#ringTexture.magFilter = NearestFilter;
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
				ringTable: { value: this.#ringTexture },
				lightTable: { value: null },
				speedRamp: { value: this.#ramp },
				cameraMatrix: { value: new Matrix3() },
				cameraShift: { value: new Vector3() },
				rim: { value: 1 },
				filmSize: { value: 1 },
				gains: { value: this.#light.gains },
				lean: { value: new Vector2() },
				faceZ: { value: 0 },
				side: { value: 1 },
				reach2: { value: 0 },
				screen: { value: 1 },
				reference2: { value: 1 },
				spriteScale: { value: 1 },
				dimmest: { value: dimmestLight },
				spotShare: { value: spotShare },
				bySpeed: { value: false },
				halfOfDome: { value: 0 }
			}
		});
		this.points = new Points(geometry, material);
		this.points.frustumCulled = false;
	}

	set(filmSize: number, camera: FilmCamera, frame: Frame, layer: StarLayer): void {
		if (layer.look !== this.#look) this.#setLook(layer.look);
		this.#setRings(frame, layer);
		const { uniforms } = this.points.material;
		const [a, b, c, d, e, f, g, h, i] = camera.matrix;
		uniforms.cameraMatrix.value.set(a, b, c, d, e, f, g, h, i);
		uniforms.cameraShift.value.set(camera.shift[0], camera.shift[1], camera.shift[2]);
		uniforms.rim.value = camera.rim;
		uniforms.filmSize.value = filmSize;
		const light = setViewLight(camera, frame, layer, filmSize, this.#light);
		uniforms.lean.value.set(light.leanX, light.leanY);
		uniforms.faceZ.value = light.faceZ;
		uniforms.side.value = light.side;
		uniforms.reach2.value = light.reach2;
		uniforms.screen.value = light.screen;
		uniforms.reference2.value = (2 * layer.look.outerRadius) ** 2;
		uniforms.spriteScale.value = spriteRadius(1000, filmSize) / 1000;
		uniforms.bySpeed.value = frame.colour === 'speed';
		uniforms.halfOfDome.value = sides[layer.half];
	}

	dispose(): void {
		this.points.material.dispose();
		this.#ringTexture.dispose();
		this.#ramp.dispose();
		this.#lightTexture?.dispose();
	}

	#setLook(look: GalaxyLook): void {
		this.#look = look;
		this.#lightTexture?.dispose();
		this.#lightTexture = new DataTexture(
			lightTables(look),
			tableSize,
			populations.length,
			RedFormat,
			FloatType
		);
		this.#lightTexture.minFilter = this.#lightTexture.magFilter = NearestFilter;
		this.#lightTexture.needsUpdate = true;
		this.points.material.uniforms.lightTable.value = this.#lightTexture;
	}

	#setRings(frame: Frame, { rings, look, patternAngle }: StarLayer): void {
		const count = rings.radii.length;
		for (let k = 0; k < count; k++) {
			const angle = rings.phase[k];
			const armAngle = look.spiral.arms * (angle - patternAngle);
			this.#rings[4 * k] = Math.cos(angle);
			this.#rings[4 * k + 1] = Math.sin(angle);
			this.#rings[4 * k + 2] = Math.cos(armAngle);
			this.#rings[4 * k + 3] = Math.sin(armAngle);
			const speed = rings.omega[k] * rings.radii[k];
			this.#rings[4 * (count + k)] = speedIndex(speed, frame.speedRange) / 255;
		}
		this.#ringTexture.needsUpdate = true;
	}
}
