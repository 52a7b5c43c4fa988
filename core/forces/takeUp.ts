import type { AngleBar, Bar } from '../layout/model.ts';
import type { PracticeId } from '../project/model.ts';
import { normalHole } from '../resistance/holes.ts';

/** N/mm³. */
const WEIGHT = 77e-6;

export interface TakeUp {
  /** Slip until bolts bear, both ends, mm: hole less bolt at each bolted end. Common practice, no source: bolts stand in the middle of their holes. */
  readonly holes: number;
  /** Stretch that straightens the sag under own weight, 8f²/3L, mm. */
  readonly sag: number;
}

/** What a bar must stretch before it works, mm. */
export function takeUpOf(bar: Bar, angle: AngleBar, practice: PracticeId, E: number): TakeUp {
  const clearance = [angle.ends.i, angle.ends.j].reduce(
    (sum, end) =>
      end.kind === 'bolted' ? sum + normalHole(practice, end.boltDiameter) - end.boltDiameter : sum,
    0,
  );
  return { holes: clearance, sag: sagStretch(bar, angle, E) };
}

function sagStretch(bar: Bar, angle: AngleBar, E: number): number {
  const section = angle.stock?.properties;
  if (!section) return 0;
  const level = Math.hypot(bar.direction[0], bar.direction[1]);
  const I = (2 * section.Iu * section.Iv) / (section.Iu + section.Iv);
  const f = (5 * WEIGHT * section.area * level * bar.length ** 4) / (384 * E * I);
  return (8 * f * f) / (3 * bar.length);
}
