import type { ResistingEnd, ResistingSection } from '../model.ts';
import type { Working } from '../working.ts';

/** CSA S16 12.3.3.3 (SANS 10162-1 alike, from memory, verify): area that two welds along the leg bring into play, mm². Continuous at L = w and L = 2w. */
export function weldedArea(section: ResistingSection, end: ResistingEnd, working: Working): number {
  const t = section.thickness;
  const w = working.given('connected leg', 'w', section.connectedLeg, 'length');
  const L = working.given('length of the welds', 'L', end.weldLength, 'length');
  const connected = L >= 2 * w ? w * t : L >= w ? 0.5 * w * t + 0.25 * L * t : 0.75 * L * t;
  working.step(
    'area through the connected leg',
    'A_n2',
    L >= 2 * w ? 'w t' : L >= w ? '0.50 w t + 0.25 L t' : '0.75 L t',
    connected,
    'area',
  );
  const out = section.outstandingLeg - t;
  const off = out / 2;
  const outstanding = L >= out ? (1 - off / L) * out * t : 0.5 * L * t;
  working.step(
    'area through the outstanding leg',
    'A_n3',
    L >= out ? '(1 − x̄/L) w₂ t' : '0.50 L t',
    outstanding,
    'area',
  );
  return working.step(
    'effective area',
    'A′_ne',
    'A_n2 + A_n3',
    Math.min(connected + outstanding, section.properties.area),
    'area',
  );
}
