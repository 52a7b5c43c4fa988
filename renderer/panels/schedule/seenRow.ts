import type { Bowing } from '../../../core/bowing/model.ts';
import type { ScheduleRow } from '../../../core/schedule/model.ts';
import type { Status } from '../../glyphs/StatusGlyph.tsx';

/** A row of the schedule with how it stands. */
export interface SeenRow {
  readonly row: ScheduleRow;
  readonly status: Status;
  /** Slenderness over limit of the verdict that the practice asks for. */
  readonly ratio: number | null;
  /** Null where it is not assessed. */
  readonly bowing: Bowing | null;
}
