import { deductedWidth } from '../holes.ts';
import type { ResistingEnd, ResistingSection, TensionQuestion } from '../model.ts';
import type { Working } from '../working.ts';
import { type ChainHole, deductionOf } from './netArea.ts';

/** Lines of bolts across the force: bolts of one row, staggered rows counted apart. */
export function boltLines({ bolts, rows, staggered }: ResistingEnd): number {
  return staggered ? bolts : Math.ceil(bolts / rows);
}

/** From the first bolt to the last along the force, mm. */
export function boltedLength(end: ResistingEnd): number {
  const inRow = Math.ceil(end.bolts / end.rows);
  return (inRow - 1) * end.pitch + (end.staggered ? end.pitch / 2 : 0);
}

/** All holes of an end, across counted from the heel over the flattened leg. With both legs bolted the other leg has its own row, on the far side of the heel. */
export function holesOf(end: ResistingEnd, section: ResistingSection, width: number): readonly ChainHole[] {
  const rows = Array.from({ length: end.rows }, (_, row) => ({
    across: end.gauge + row * end.rowSpacing,
    shift: row === 1 && end.staggered ? end.pitch / 2 : 0,
  }));
  // Legs flattened: across the heel the distance is the sum of the gauges less the thickness.
  const other = end.legs === 'both' ? [{ across: -(end.gauge - section.thickness), shift: 0 }] : [];
  return [...rows, ...other].flatMap(({ across, shift }) =>
    Array.from({ length: Math.ceil(end.bolts / end.rows) }, (_, k) => ({
      along: k * end.pitch + shift,
      across,
      width,
    })),
  );
}

/** Net area with its working. mm². */
export function netArea(question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const { section, practice, options } = question;
  const gross = working.given('gross area', 'A_g', section.properties.area, 'area');
  const width = working.step(
    'width deducted for a hole',
    'd_h',
    practice === 'aisc360' || practice === 'sans10162' || practice === 'csaS16'
      ? 'hole + 2 mm'
      : options.punchedHoles && practice !== 'en1993'
        ? 'hole + 2 mm, punched'
        : 'hole',
    deductedWidth(practice, end.hole, options.punchedHoles),
    'length',
  );
  working.given('thickness', 't', section.thickness, 'length');
  const taken = deductionOf(holesOf(end, section, width), section.thickness);
  return working.step(
    'net area',
    'A_n',
    end.rows === 2 || end.legs === 'both' ? 'A_g − Σd_h t + Σs²t/(4g)' : 'A_g − d_h t',
    gross - taken,
    'area',
  );
}

export interface Block {
  /** Tension along the end line, net and gross; shear along the rows, net and gross. mm². */
  readonly netTension: number;
  readonly grossTension: number;
  readonly netShear: number;
  readonly grossShear: number;
}

/** The block that may tear out of the leg: across from the first row to the toe, along that row. Practice-facts C. */
export function blockOf(question: TensionQuestion, end: ResistingEnd, working: Working): Block {
  const { section, practice, options } = question;
  const t = working.given('thickness', 't', section.thickness, 'length');
  const d = deductedWidth(practice, end.hole, options.punchedHoles);
  const across = end.edgeDistance + end.rowSpacing;
  const stagger = end.staggered ? end.pitch / 2 : 0;
  const along = end.endDistance + boltedLength(end) - stagger;
  const inRow = Math.ceil(end.bolts / end.rows);
  const slanted = end.staggered && end.rowSpacing > 0 ? (stagger * stagger * t) / (4 * end.rowSpacing) : 0;
  const block = {
    grossTension: across * t,
    netTension: (across - (end.rows - 0.5) * d) * t + slanted,
    grossShear: along * t,
    netShear: (along - (inRow - 0.5) * d) * t,
  };
  working.step(
    'net area in tension',
    'A_nt',
    'from the first row to the toe, holes out',
    block.netTension,
    'area',
  );
  working.step('gross area in tension', 'A_gt', 'from the first row to the toe', block.grossTension, 'area');
  working.step(
    'net area in shear',
    'A_nv',
    'along the first row to the end, holes out',
    block.netShear,
    'area',
  );
  working.step('gross area in shear', 'A_gv', 'along the first row to the end', block.grossShear, 'area');
  return block;
}
