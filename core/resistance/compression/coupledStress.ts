/**
 * Elastic stress at which a pinned bar bows and twists at once: the smallest root of
 * (F − F_u)(F − F_v)(F − F_z) − F²(F − F_v)p − F²(F − F_u)q = 0, with p = (u₀/r̄₀)² and q = (v₀/r̄₀)². N/mm².
 *
 * Divided by (F_u − F)(F_v − F) the left side is h(F) = F_z − F − pF²/(F_u − F) − qF²/(F_v − F) but for its sign. Between 0 and the lesser of F_u and F_v
 * every term of h falls as F grows, so there is one root at most, and halving finds it; where there is none the lesser of F_u and F_v is the smallest root.
 *
 * @param Fz may be infinite: the bar cannot twist
 * @param p and @param q together below 1, as shares of a squared polar radius are
 * @returns above 0, never above F_u, F_v or F_z
 */
export function coupledStress(Fu: number, Fv: number, Fz: number, p: number, q: number): number {
  const h = (F: number): number => Fz - F - share(p, F, Fu) - share(q, F, Fv);
  const least = Math.min(Fu, Fv);
  let low = 0;
  let high = least;
  for (;;) {
    const middle = (low + high) / 2;
    // Nothing is left between the two.
    if (middle <= low || middle >= high) return Math.min(high, least, Fz);
    if (h(middle) > 0) low = middle;
    else high = middle;
  }
}

/** Without an offset bowing about that axis takes no part. */
const share = (part: number, F: number, own: number): number => (part === 0 ? 0 : (part * F * F) / (own - F));
