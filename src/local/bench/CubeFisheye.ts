import {
	AdditiveBlending,
	BufferAttribute,
	BufferGeometry,
	Camera,
	CubeCamera,
	GLSL3,
	Matrix4,
	Mesh,
	PlaneGeometry,
	Points,
	RawShaderMaterial,
	Scene,
	WebGLCubeRenderTarget,
	type WebGLRenderer
} from 'three';
import { makeCamera, setCamera } from '../../lib/picture/camera';
import type { Frame } from '../../lib/picture/frame';

/**
 * The usual way to a fisheye with three: six square pictures by a CubeCamera, then one pass that looks
 * them up. Same stars, turned on the GPU from an angle a star; only here to be compared with.
 */
export class CubeFisheye {
	readonly #renderer: WebGLRenderer;
	readonly #stars = new Scene();
	readonly #film = new Scene();
	readonly #cube: CubeCamera;
	readonly #points: Points<BufferGeometry, RawShaderMaterial>;
	readonly #angles: Float32Array;
	readonly #frame: Frame;
	readonly #camera = new Camera();

	constructor(renderer: WebGLRenderer, size: number, frame: Frame) {
		this.#renderer = renderer;
		this.#frame = frame;
		renderer.setPixelRatio(1);
		renderer.setSize(size, size, false);
		const target = new WebGLCubeRenderTarget(size / 2, { generateMipmaps: false });
		this.#cube = new CubeCamera(0.1, 1000, target);
		const { stars } = frame.layers[0];
		const position = new Float32Array(3 * stars.count);
		const colour = new Float32Array(3 * stars.count);
		for (let i = 0; i < stars.count; i++) {
			position.set([stars.x0[i], stars.y0[i], stars.z[i]], 3 * i);
			for (let c = 0; c < 3; c++) {
				colour[3 * i + c] = (stars.colour[3 * i + c] / 255) * Math.min(1, stars.light[i] * 0.5);
			}
		}
		this.#angles = new Float32Array(stars.count);
		const geometry = new BufferGeometry();
		geometry.setAttribute('position', new BufferAttribute(position, 3));
		geometry.setAttribute('colour', new BufferAttribute(colour, 3));
		geometry.setAttribute('angle', new BufferAttribute(this.#angles, 1));
		this.#points = new Points(
			geometry,
			new RawShaderMaterial({
				glslVersion: GLSL3,
				blending: AdditiveBlending,
				transparent: true,
				depthTest: false,
				uniforms: { place: { value: new Matrix4() } },
				vertexShader: `
					in vec3 position; in vec3 colour; in float angle;
					uniform mat4 place; uniform mat4 viewMatrix; uniform mat4 projectionMatrix;
					out vec3 shade;
					void main() {
						float c = cos(angle), s = sin(angle);
						vec3 p = vec3(position.x * c - position.y * s, position.x * s + position.y * c, position.z);
						shade = colour;
						gl_PointSize = 3.0;
						gl_Position = projectionMatrix * viewMatrix * place * vec4(p, 1.0);
					}`,
				fragmentShader: `
					precision highp float;
					in vec3 shade; out vec4 pixel;
					void main() {
						vec2 d = 2.0 * gl_PointCoord - 1.0;
						pixel = vec4(shade * max(0.0, 1.0 - dot(d, d)), 1.0);
					}`
			})
		);
		this.#points.frustumCulled = false;
		this.#stars.add(this.#points);
		this.#film.add(
			new Mesh(
				new PlaneGeometry(2, 2),
				new RawShaderMaterial({
					glslVersion: GLSL3,
					depthTest: false,
					uniforms: { cube: { value: target.texture } },
					vertexShader: `
						in vec3 position; out vec2 film;
						void main() { film = position.xy; gl_Position = vec4(position.xy, 0.0, 1.0); }`,
					fragmentShader: `
						precision highp float;
						uniform samplerCube cube; in vec2 film; out vec4 pixel;
						void main() {
							float r = length(film);
							if (r > 1.0) { pixel = vec4(0.0, 0.0, 0.0, 1.0); return; }
							float theta = r * 1.5707963;
							vec2 across = r == 0.0 ? vec2(0.0) : film / r * sin(theta);
							pixel = texture(cube, vec3(-across.x, cos(theta), across.y));
						}`
				})
			)
		);
	}

	paint(): void {
		const { stars, rings } = this.#frame.layers[0];
		for (let i = 0; i < stars.count; i++) this.#angles[i] = rings.phase[stars.ring[i]];
		this.#points.geometry.getAttribute('angle').needsUpdate = true;
		const { matrix: m, shift: t } = setCamera(this.#frame.view, makeCamera());
		// The room's x right, y front, z up in three's x right, y up, z back.
		this.#points.material.uniforms.place.value.set(
			m[0],
			m[1],
			m[2],
			t[0],
			m[6],
			m[7],
			m[8],
			t[2],
			-m[3],
			-m[4],
			-m[5],
			-t[1],
			0,
			0,
			0,
			1
		);
		this.#cube.update(this.#renderer, this.#stars);
		this.#renderer.render(this.#film, this.#camera);
	}
}
