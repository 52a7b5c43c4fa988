import type { Bowing } from '../bowing/model.ts';
import type { Forces } from '../forces/model.ts';
import type { AngleBar, Bar } from '../layout/model.ts';
import type { Practice } from '../practice/model.ts';
import type { Project } from '../project/model.ts';
import type { Resistance } from '../resistance/model.ts';
import type { Restraint } from '../restraint/model.ts';
import type { FreeWays } from '../restraint/movable.ts';

export interface CheckInput {
  readonly project: Project;
  readonly practice: Practice;
  readonly forces: Forces | null;
  /** What bars of one size, grade and ends resist in tension, found once: by what tells them apart. Left out: found each time. */
  readonly tensions?: Map<string, readonly Resistance[]>;
}

export interface CheckedBar {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly restraint: Restraint | null;
  /** The ways in which it turns freely; null for a bar that is kept in place. */
  readonly turns: FreeWays | null;
  readonly bowing: Bowing | null;
}
