/**
 * Exact stiffness of a straight bar under a constant axial force, for displacement and slope at its ends.
 * Compression gives circular functions, tension hyperbolic ones. Source: the classical stability functions, e.g. Livesley and Chandler
 * (1956), here in the form of sums and differences of the two end slopes, which loses no digits for small forces.
 */

/** Four numbers make the stiffness; slopes and displacements at ends 1 and 2: see `assembly.ts`. */
export interface MemberStiffness {
  /** Force per displacement, N/mm. */
  force: number;
  /** Moment per displacement, and force per slope, N. */
  cross: number;
  /** Moment per slope at the near end, N·mm. */
  near: number;
  /** Moment per slope at the far end, N·mm. */
  far: number;
}

/** Below this |N L²/EI| the series is more exact than the closed form. */
const SMALL = 0.02;

/** Fills `into` for bending stiffness EI (N·mm²), force N (compression positive) and length (mm). */
export function memberStiffness(EI: number, N: number, length: number, into: MemberStiffness): void {
  const x = (N * length * length) / EI;
  // r: both ends turned one way; q: turned against each other. In units of EI/length.
  let r: number;
  let q: number;
  if (Math.abs(x) < SMALL) {
    r = 6 - x * (1 / 10 + x * (1 / 1400 + x / 126000));
    q = 2 - x * (1 / 6 + x * (1 / 360 + x / 15120));
  } else if (x > 0) {
    const phi = Math.sqrt(x);
    const h = phi / 2;
    const s = Math.sin(h);
    const c = Math.cos(h);
    r = (x * s) / (2 * (s - h * c));
    q = (phi * c) / s;
  } else {
    const phi = Math.sqrt(-x);
    const h = phi / 2;
    const t = Math.tanh(h);
    r = (-x * t) / (2 * (h - t));
    q = phi / t;
  }
  const k = EI / length;
  into.force = ((2 * r - x) * k) / (length * length);
  into.cross = (r * k) / length;
  into.near = ((r + q) * k) / 2;
  into.far = ((r - q) * k) / 2;
}

/**
 * How many critical loads of the piece with both its ends clamped lie below N: sin h = 0 or tan h = h, with 2h = L√(N/EI).
 * The part of the Wittrick–Williams count that the end displacements do not see.
 */
export function clampedLoadsBelow(EI: number, N: number, length: number): number {
  if (N <= 0) return 0;
  const h = (length * Math.sqrt(N / EI)) / 2;
  const whole = Math.floor(h / Math.PI);
  if (whole === 0) return 0;
  const rest = h - whole * Math.PI;
  // Between whole·π and (whole + ½)π lies one root of tan h = h; past it tan h > h.
  const passed = rest >= Math.PI / 2 || Math.tan(rest) > h ? 1 : 0;
  return whole + (whole - 1) + passed;
}
