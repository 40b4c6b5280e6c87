precision highp float;

// Partner of picture/splat.ts: a point shared among four pixels by area, or a soft round spot.
flat in vec2 centre;
flat in float radius;
flat in vec3 glow;

out vec4 pixel;

void main() {
	vec2 d = gl_FragCoord.xy - centre;
	float weight;
	if (radius < 1.5) {
		vec2 share = max(vec2(0.0), 1.0 - abs(d));
		weight = share.x * share.y;
	} else {
		float fall = max(0.0, 1.0 - dot(d, d) / (radius * radius));
		weight = fall * fall;
	}
	pixel = vec4(glow * weight, 1.0);
}
