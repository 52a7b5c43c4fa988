import { MM_PER_INCH } from './unitSystem.ts';

/** Inches in the way a tape reads: `0`, `3/8`, `11 15/16`, to the nearest 1/`parts`. */
export function tapeInches(inches: number, parts: number): string {
  return countOnTape(Math.round(inches * parts), parts);
}

/** `24'-0 3/8"` to the nearest 1/`parts` of an inch; below a foot only inches. Minus as a real sign. */
export function feetAndInches(mm: number, parts: number): string {
  const count = Math.round((Math.abs(mm) / MM_PER_INCH) * parts);
  const feet = Math.floor(count / (12 * parts));
  const inches = countOnTape(count - feet * 12 * parts, parts);
  // After feet a bare fraction gets its nought, so that the hyphen cannot be taken for a minus: 24'-0 3/8".
  const rest = feet > 0 && /^\d+\//.test(inches) ? `0 ${inches}` : inches;
  const sign = mm < 0 && count > 0 ? '−' : '';
  return feet === 0 ? `${sign}${rest}"` : `${sign}${feet}'-${rest}"`;
}

function countOnTape(count: number, parts: number): string {
  const whole = Math.floor(count / parts);
  let top = count - whole * parts;
  let bottom = parts;
  while (top > 0 && top % 2 === 0 && bottom % 2 === 0) {
    top /= 2;
    bottom /= 2;
  }
  if (top === 0) return String(whole);
  return whole === 0 ? `${top}/${bottom}` : `${whole} ${top}/${bottom}`;
}
