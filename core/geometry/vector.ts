/** Vectors in the plane of a section and in space. Plain tuples, never changed in place. */
export type Vec2 = readonly [number, number];
export type Vec3 = readonly [number, number, number];

export const add = (a: Vec3, b: Vec3): Vec3 => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
export const subtract = (a: Vec3, b: Vec3): Vec3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
export const scale = (a: Vec3, k: number): Vec3 => [a[0] * k, a[1] * k, a[2] * k];
export const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
export const cross = (a: Vec3, b: Vec3): Vec3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
/** By the root of the squares: lengths of buildings are far from where `Math.hypot`, many times slower, would be needed. */
export const length = (a: Vec3): number => Math.sqrt(a[0] * a[0] + a[1] * a[1] + a[2] * a[2]);
export const distance = (a: Vec3, b: Vec3): number => length(subtract(a, b));
/** The point a + k·(direction). */
export const along = (a: Vec3, direction: Vec3, k: number): Vec3 => [
  a[0] + direction[0] * k,
  a[1] + direction[1] * k,
  a[2] + direction[2] * k,
];

/** Unit vector; throws on a vector of no length, which the schema keeps out. */
export function unit(a: Vec3): Vec3 {
  const l = length(a);
  if (!(l > 0)) throw new Error('a direction of no length');
  return scale(a, 1 / l);
}

/** The unit vector turned about a unit axis by an angle, rad (Rodrigues' formula). */
export function turned(a: Vec3, axis: Vec3, angle: number): Vec3 {
  const c = Math.cos(angle);
  const s = Math.sin(angle);
  return add(add(scale(a, c), scale(cross(axis, a), s)), scale(axis, dot(axis, a) * (1 - c)));
}

export const dot2 = (a: Vec2, b: Vec2): number => a[0] * b[0] + a[1] * b[1];

/** Unit vector in the plane; null for a vector of no length. */
export function unit2(a: Vec2): Vec2 | null {
  const l = Math.hypot(a[0], a[1]);
  return l > 0 ? [a[0] / l, a[1] / l] : null;
}

/** Angle of an undirected line in the plane from the first axis towards the second, degrees, in [0, 180). */
export function degreesOf(a: Vec2): number {
  const degrees = (Math.atan2(a[1], a[0]) * 180) / Math.PI;
  const positive = degrees < 0 ? degrees + 180 : degrees;
  // A hair below 180 is 0 with rounding.
  return positive > 180 - 1e-9 ? 0 : positive;
}
