import type { Assessment, DiagonalAssessment } from '../../assessment.ts';
import type { AngleBar, Bar, BayLayout } from '../../layout/model.ts';
import { endsHoldOf, endsMarkedFree } from '../../restraint/endWords.ts';
import { numberedClaims } from '../claimNumbers.ts';

export interface SheetSubject {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly diagonal: DiagonalAssessment;
}

/**
 * The diagonals of a bay, those together whose sheets would differ only in where the bar stands: nothing meets them between their ends,
 * nothing was found of them or set by hand, and they are made alike. All others stand alone.
 */
export function groupedAlike(assessment: Assessment, bay: BayLayout): readonly (readonly SheetSubject[])[] {
  const groups = new Map<string, SheetSubject[]>();
  for (const id of bay.diagonals) {
    const bar = assessment.layout.bars.get(id);
    const diagonal = assessment.diagonals.get(id);
    if (!bar?.angle || !diagonal) continue;
    const subject = { bar, angle: bar.angle, diagonal };
    const key = lookOf(subject) ?? id;
    groups.set(key, [...(groups.get(key) ?? []), subject]);
  }
  return [...groups.values()];
}

/** All that a sheet says but the names; null for a bar that has a story of its own. */
function lookOf({ bar, angle, diagonal }: SheetSubject): string | null {
  const { restraint, findings } = diagonal;
  const hasStory = restraint === null || numberedClaims(restraint).length > 0 || findings.length > 0;
  if (
    hasStory ||
    (angle.mark.overrides ?? []).length > 0 ||
    endsMarkedFree({ endsHold: endsHoldOf(angle) }).length > 0
  )
    return null;
  const { spec, side, ends, cut } = angle;
  const { roll = 0 } = angle.mark;
  const { tension = null, compression = null } = diagonal.checks ?? {};
  return JSON.stringify([
    spec,
    side,
    roll,
    ends,
    Math.round(bar.length),
    Math.round(cut.total),
    tension,
    compression,
  ]);
}
