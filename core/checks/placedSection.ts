import type { StockAngle } from '../catalogue/model.ts';
import type { AngleBar, Bar } from '../layout/model.ts';
import type { Steel } from '../resistance/model.ts';
import type { Restraint } from '../restraint/model.ts';

/** A section in the place of a bar, with what holds it there. */
export interface PlacedSection {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly stock: StockAngle;
  readonly steel: Steel;
  readonly restraint: Restraint;
  /** N; null where it is not known. */
  readonly criticalLoad: number | null;
}
