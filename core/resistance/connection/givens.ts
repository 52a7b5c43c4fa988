/** What every first check of bolts and welds starts from, told as steps. */
import type { ResistingEnd, TensionQuestion } from '../model.ts';
import type { Working } from '../working.ts';
import { bearingThickness, boltStrength, rootArea, shankArea, shearPlanes, stressArea } from './fasteners.ts';

/** Shear planes of all bolts together. */
export function sheared({ section }: TensionQuestion, end: ResistingEnd, working: Working): number {
  const n = working.given('bolts', 'n', end.bolts, 'count');
  const m = working.given('planes of shear', 'm', shearPlanes(section), 'count');
  return n * m;
}

export const boltSteel = ({ practice }: TensionQuestion, end: ResistingEnd, working: Working): number =>
  working.given(`strength of ${end.boltGrade}`, 'f_ub', boltStrength(practice, end.boltGrade), 'stress');

export const shank = (end: ResistingEnd, working: Working): number =>
  working.step('area of the shank', 'A_b', 'πd²/4', shankArea(end.boltDiameter), 'area');

/** Stress area where the thread is sheared, else the shank. */
export const shearedArea = (end: ResistingEnd, working: Working): number =>
  end.threadsInShear
    ? working.step('stress area', 'A_s', 'π/4 (d − 0.9382 p)²', stressArea(end.boltDiameter), 'area')
    : shank(end, working);

/** Area at the root where the thread is sheared, else the shank. */
export const shearedCore = (end: ResistingEnd, working: Working): number =>
  end.threadsInShear
    ? working.step('area at the root', 'A_c', 'π/4 (d − 1.2269 p)²', rootArea(end.boltDiameter), 'area')
    : shank(end, working);

/** t, d and f_u of what the bolts bear on. */
export function borneOn(
  { section, steel }: TensionQuestion,
  end: ResistingEnd,
  working: Working,
): { readonly t: number; readonly d: number; readonly fu: number } {
  return {
    t: working.given('thickness borne on', 't', bearingThickness(section), 'length'),
    d: working.given('bolt', 'd', end.boltDiameter, 'length'),
    fu: working.given('tensile strength', 'f_u', steel.fu, 'stress'),
  };
}

/** Throat of a fillet weld with equal legs over its leg. */
export const THROAT = Math.SQRT1_2;

/** Throats of both welds along a leg; a pair of angles has two legs, and an angle by both legs likewise. mm². */
export function throats(
  { section }: TensionQuestion,
  end: ResistingEnd,
  share: number,
  working: Working,
): number {
  const pair = section.shape === 'angles back to back' || section.shape === 'starred angles';
  const legs = pair || (section.shape === 'angle' && end.legs === 'both') ? 2 : 1;
  const s = working.given('size of the weld', 's', end.weldSize, 'length');
  const l = working.given('length of each weld', 'l', end.weldLength, 'length');
  return working.step(
    'area of the throats',
    'A_w',
    `${2 * legs} × ${share.toFixed(share === THROAT ? 3 : 2)} s l`,
    2 * legs * share * s * l,
    'area',
  );
}

/** 1 − (L_j − 15d)/(200d) between 0.75 and 1: EN 1993-1-8 3.8, IS 800 10.3.3.1. */
export function longJoint(length: number, bolt: number): number {
  return Math.min(1, Math.max(0.75, 1 - (length - 15 * bolt) / (200 * bolt)));
}
