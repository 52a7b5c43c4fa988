import { deductedWidth } from '../holes.ts';
import type { ResistingEnd, ResistingSection, TensionQuestion } from '../model.ts';
import type { Working } from '../working.ts';
import { type ChainHole, deductionOf, straightDeductionOf } from './netArea.ts';

/** Thicknesses that a bolt goes through beside the gusset: a pair of angles has a leg on either side. */
export function pliesOf({ shape }: ResistingSection): 1 | 2 {
  return shape === 'angles back to back' || shape === 'starred angles' ? 2 : 1;
}

/** One line of bolts along the bar. mm. */
export interface BoltRow {
  readonly bolts: number;
  /** From the end of the bar to the bolt nearest to it. */
  readonly start: number;
  /** From the heel over the flattened section; below zero in the leg off the gusset. */
  readonly across: number;
}

/**
 * The rows of an end. All bolts are shared out over them, the first row taking what is left over.
 * With both legs bolted half of them go through the other leg, on the same gauge, side by side with the first.
 */
export function rowsOf(end: ResistingEnd, { thickness }: ResistingSection): readonly BoltRow[] {
  const inLeg = Array.from({ length: end.rows }, (_, k) => ({
    start: end.endDistance + (k === 1 && end.staggered ? end.pitch / 2 : 0),
    across: end.gauge + k * end.rowSpacing,
  }));
  // Flattened, the distance across the heel is the sum of both gauges less the thickness.
  const places =
    end.legs === 'both'
      ? [...inLeg, ...inLeg.map(({ start, across }) => ({ start, across: thickness - across }))]
      : inLeg;
  const least = Math.floor(end.bolts / places.length);
  const over = end.bolts - least * places.length;
  return places
    .map((place, k) => ({ ...place, bolts: least + (k < over ? 1 : 0) }))
    .filter(({ bolts }) => bolts > 0);
}

/** Bolts in the longest row. */
export const boltsInLine = (end: ResistingEnd, section: ResistingSection): number =>
  Math.max(0, ...rowsOf(end, section).map(({ bolts }) => bolts));

/** Lines of bolts across the force: bolts of one row, staggered rows counted apart. */
export function boltLines(end: ResistingEnd, section: ResistingSection): number {
  return new Set(holesOf(end, section, 0).map(({ along }) => along)).size;
}

/** From the first bolt to the last along the force, mm. */
export function boltedLength(end: ResistingEnd, section: ResistingSection): number {
  const along = holesOf(end, section, 0).map((hole) => hole.along);
  return Math.max(...along) - Math.min(...along);
}

/** All holes of an end, along from the end of the bar. */
export function holesOf(end: ResistingEnd, section: ResistingSection, width: number): readonly ChainHole[] {
  return rowsOf(end, section).flatMap(({ bolts, start, across }) =>
    Array.from({ length: bolts }, (_, k) => ({ along: start + k * end.pitch, across, width })),
  );
}

/** Net area with its working, both plies of a pair. mm². */
export function netArea(question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const { section } = question;
  const gross = working.given('gross area', 'A_g', section.properties.area, 'area');
  return netOf(gross, 'A_g', question, end, working);
}

/** Holes lie inside what is bolted, or there is no net section to speak of. Tees and channels are not drawn well enough to tell. */
export function holesLieInside(section: ResistingSection, end: ResistingEnd, working: Working): boolean {
  if (section.shape === 'tee' || section.shape === 'channel') return true;
  const least = Math.min(end.edgeDistance, end.gauge) - end.hole / 2;
  // Said only when it fails: it is no rule of a standard.
  return least > 0 || working.requires('every hole lies inside the leg', false, 'a hole breaks its edge');
}

/** What holes leave of a given area. */
export function netOf(
  gross: number,
  symbol: string,
  question: TensionQuestion,
  end: ResistingEnd,
  working: Working,
): number {
  const { section, practice, options } = question;
  holesLieInside(section, end, working);
  const { width, formula } = deductedWidth(practice, end, options.punchedHoles);
  working.given('thickness', 't', section.thickness, 'length');
  working.step('width deducted for a hole', 'd_h', formula, width, 'length');
  const plies = pliesOf(section);
  const holes = holesOf(end, section, width);
  const straight = plies * straightDeductionOf(holes, section.thickness);
  const each = plies === 2 ? '2 ' : '';
  const cut = working.step('taken by a straight cut', 'ΔA_1', `${each}Σd_h t`, straight, 'area');
  if (!end.staggered) return left(gross - cut, `${symbol} − ΔA_1`, working);
  const zigzag = working.step(
    'taken by the worst chain of holes',
    'ΔA_2',
    `${each}(Σd_h t − Σs²t/(4g))`,
    plies * deductionOf(holes, section.thickness),
    'area',
  );
  return left(gross - Math.max(cut, zigzag), `${symbol} − max(ΔA_1, ΔA_2)`, working);
}

function left(area: number, formula: string, working: Working): number {
  if (area <= 0) working.requires('the holes leave some of the section', false, 'nothing is left of it');
  return working.step('net area', 'A_n', formula, area, 'area');
}
