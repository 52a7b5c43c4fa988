import type { Bowing } from '../bowing/model.ts';
import type { Forces } from '../forces/model.ts';
import type { AngleBar, Bar } from '../layout/model.ts';
import type { Practice } from '../practice/model.ts';
import type { Project } from '../project/model.ts';
import type { Restraint } from '../restraint/model.ts';

export interface CheckInput {
  readonly project: Project;
  readonly practice: Practice;
  readonly forces: Forces | null;
}

export interface CheckedBar {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly restraint: Restraint | null;
  readonly bowing: Bowing | null;
}
