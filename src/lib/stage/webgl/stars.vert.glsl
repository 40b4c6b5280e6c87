precision highp float;
precision highp sampler2D;

// Partner of picture/layerPainter.ts: the same numbers in the same order, one star a vertex.
in vec3 position;
in float ring;
in vec2 arm;
in float light;
in vec3 colour;
in float size;
in float population;

// Two texels a ring: (cos, sin, arm cos, arm sin) and (share of the speed scale, 0, 0, 0).
uniform sampler2D ringTable;
// 256 x populations, picture/starLight.ts.
uniform sampler2D lightTable;
uniform sampler2D speedRamp;
uniform mat3 cameraMatrix;
uniform vec3 cameraShift;
uniform float rim;
uniform float filmSize;
// picture/viewLight.ts: light by population, and what lies behind the dust.
uniform float gains[4];
uniform vec2 lean;
uniform float faceZ;
uniform float side;
uniform float reach2;
uniform float screen;
uniform float reference2;
uniform float spriteScale;
uniform float dimmest;
uniform float spotShare;
uniform bool bySpeed;
// -1 left, 0 whole, 1 right.
uniform int halfOfDome;

flat out vec2 centre;
flat out float radius;
flat out vec3 glow;

const vec4 nowhere = vec4(2.0, 2.0, 2.0, 1.0);

void main() {
	gl_Position = nowhere;
	gl_PointSize = 1.0;
	centre = vec2(0.0);
	radius = 1.0;
	glow = vec3(0.0);

	int k = int(ring);
	vec4 turn = texelFetch(ringTable, ivec2(k, 0), 0);
	vec3 place = vec3(position.x * turn.x - position.y * turn.y, position.x * turn.y + position.y * turn.x, position.z);
	vec3 seen = cameraMatrix * place + cameraShift;
	float across = length(seen.xy);
	float theta = atan(across, seen.z);
	if (theta > rim) return;
	float middle = filmSize * 0.5;
	float scale = across == 0.0 ? 0.0 : theta / rim * middle / across;
	vec2 film = vec2(middle) + seen.xy * scale;
	if (halfOfDome < 0 && film.x >= middle) return;
	if (halfOfDome > 0 && film.x < middle) return;
	if (film.x < 1.0 || film.y < 1.0 || film.x >= filmSize - 1.0 || film.y >= filmSize - 1.0) return;

	float cosine = arm.x * turn.z - arm.y * turn.w;
	float sine = arm.y * turn.z + arm.x * turn.w;
	int index = min(127, int((cosine + 1.0) * 64.0)) + (sine < 0.0 ? 128 : 0);
	float wave = texelFetch(lightTable, ivec2(index, int(population)), 0).r;
	float L = gains[int(population)] * light * min(4.0, reference2 / dot(seen, seen)) * wave;
	float depth = faceZ - place.z;
	vec2 crossing = place.xy + lean * depth;
	if (depth * side > 0.0 && dot(crossing, crossing) < reach2) L *= screen;
	if (L < dimmest) return;

	radius = max(1.0, size * spriteScale);
	if (radius >= 1.5) {
		L *= spotShare;
		float reach = radius + 1.0;
		if (film.x < reach || film.y < reach || film.x > filmSize - reach || film.y > filmSize - reach) return;
	}
	vec3 shade = colour;
	if (bySpeed) {
		float share = texelFetch(ringTable, ivec2(k, 1), 0).r;
		shade = texelFetch(speedRamp, ivec2(int(share * 255.0 + 0.5), 0), 0).rgb;
	}
	glow = shade * L;
	// The film counts rows from the top, the drawing buffer from the bottom.
	centre = vec2(film.x, filmSize - film.y);
	gl_PointSize = 2.0 * ceil(radius) + 1.0;
	gl_Position = vec4(centre / middle - 1.0, 0.0, 1.0);
}
