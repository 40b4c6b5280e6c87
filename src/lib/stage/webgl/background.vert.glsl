precision highp float;

// Partner of dome/projection.ts: a direction of the room straight to the film.
in vec3 position;
in float light;
in vec3 colour;

uniform float rim;
uniform float cosTilt;
uniform float sinTilt;
uniform float filmSize;
uniform float gain;

flat out vec2 centre;
flat out float radius;
flat out vec3 glow;

void main() {
	float ahead = position.y * cosTilt - position.z * sinTilt;
	float axial = position.y * sinTilt + position.z * cosTilt;
	vec2 flatPart = vec2(position.x, ahead);
	float across = length(flatPart);
	float r = atan(across, axial) / rim;
	vec2 film = across == 0.0 ? vec2(0.0) : flatPart / across * r;
	radius = 1.0;
	glow = colour * light * gain;
	bool inside = dot(film, film) < 0.999;
	vec2 place = (film + 1.0) * 0.5 * filmSize;
	centre = vec2(place.x, filmSize - place.y);
	gl_PointSize = 3.0;
	gl_Position = inside ? vec4(centre / (filmSize * 0.5) - 1.0, 0.0, 1.0) : vec4(2.0, 2.0, 2.0, 1.0);
}
