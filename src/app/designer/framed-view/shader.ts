/** One oversized triangle covers the view; no attribute but its corners. */
export const VERTEX = /* glsl */ `
out vec2 plane;
uniform vec2 halfSize;
void main() {
  vec2 corner = vec2(position.xy);
  plane = corner * halfSize;
  gl_Position = vec4(corner, 0.0, 1.0);
}
`;

/**
 * The framed picture: each pixel's direction by the inverse of the general perspective (one square root, no
 * trigonometry), turned into the source, looked up in the equirectangular plate.
 *
 * The level of detail comes from the change of the *direction* between pixels, which is smooth where longitude is not:
 * so neither the ±180° column nor the poles show. Half a level sharper than the measure, as trilinear filtering softens.
 */
export const FRAGMENT = /* glsl */ `
precision highp float;
in vec2 plane;
out vec4 colour;
uniform sampler2D plate;
uniform vec4 orientation;
uniform float eye;
uniform float texelsPerRadian;
const float INV_PI = 0.3183098861837907;

vec3 turn(vec4 q, vec3 v) {
  vec3 t = 2.0 * cross(q.xyz, v);
  return v + q.w * t + cross(q.xyz, t);
}

// The graphics language promises no precision for its own atan; this is good to 2e-8 (Abramowitz & Stegun, 4.4.49).
float arcTangent(float y, float x) {
  float a = min(abs(x), abs(y)) / max(max(abs(x), abs(y)), 1e-20);
  float s = a * a;
  float r = ((((((((0.0028662257 * s - 0.0161657367) * s + 0.0429096138) * s - 0.0752896400) * s + 0.1065626393) * s
    - 0.1420889944) * s + 0.1999355085) * s - 0.3333314528) * s + 1.0) * a;
  r = abs(y) > abs(x) ? 1.57079632679 - r : r;
  r = x < 0.0 ? 3.14159265359 - r : r;
  return y < 0.0 ? -r : r;
}

void main() {
  float a = 1.0 + eye;
  float squared = dot(plane, plane);
  float t = (eye * a + sqrt(a * a + squared * (1.0 - eye * eye))) / (squared + a * a);
  vec3 n = turn(orientation, vec3(t * plane, eye - t * a));
  vec3 across = dFdx(n);
  vec3 down = dFdy(n);
  float step = max(dot(across, across), dot(down, down));
  float level = 0.5 * log2(max(step, 1e-20)) + log2(texelsPerRadian) - 0.5;
  vec2 at = vec2(arcTangent(n.x, -n.z) * 0.5 * INV_PI + 0.5, 0.5 - arcTangent(n.y, length(n.xz)) * INV_PI);
  colour = vec4(textureLod(plate, at, max(level, 0.0)).rgb, 1.0);
}
`;
