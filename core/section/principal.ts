import type { AngleOutline } from './model.ts';

/** Largest and least value of a quadratic form over all axes, and the angle from axis x to the axis of the largest, rad. */
export interface Principal {
  readonly major: number;
  readonly minor: number;
  /** In (−π/2, π/2]. */
  readonly alpha: number;
}

/**
 * Principal values from the values about x and y and the product (mm⁴, or mm² for squares of radii).
 * About an axis at angle a from x the value is aboutX cos²a + aboutY sin²a − 2 product sin a cos a, so the largest lies at tan 2a = −2 product/(aboutX − aboutY).
 * Source: Mohr's circle.
 */
export function principal(aboutX: number, aboutY: number, product: number): Principal {
  const middle = (aboutX + aboutY) / 2;
  const radius = Math.hypot((aboutX - aboutY) / 2, product);
  const alpha = Math.atan2(-2 * product, aboutX - aboutY) / 2;
  // The axis at −π/2 is the axis at π/2. A product of −0 or 0 must not decide which name it gets.
  return {
    major: middle + radius,
    minor: middle - radius,
    alpha: alpha <= -Math.PI / 2 ? Math.PI / 2 : alpha,
  };
}

/**
 * Torsion and warping constants of two thin legs along their centre lines: J = Σbt³/3, mm⁴, and Iw = Σb³t³/36, mm⁶. Fillets are left out.
 * Source: METHODS.md §1.
 */
export function centreLineConstants(outline: AngleOutline): { readonly J: number; readonly Iw: number } {
  const t = outline.thickness;
  const long = outline.longLeg - t / 2;
  const short = outline.shortLeg - t / 2;
  return { J: ((long + short) * t ** 3) / 3, Iw: ((long ** 3 + short ** 3) * t ** 3) / 36 };
}
