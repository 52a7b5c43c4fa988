/** A few words beside each join, on how it is built. */
import type { Crossing } from '../../../core/layout/model.ts';
import type { JoinKind, UnitSystem } from '../../../core/project/model.ts';
import { showLength } from '../../../core/units/quantity.ts';

/** mm below which the legs touch. */
const TOUCH = 0.5;

export function howBuilt(kind: JoinKind, crossing: Crossing, units: UnitSystem): string {
  const gap = showLength(Math.max(0, crossing.gap), units, 'small');
  const apart = crossing.gap > TOUCH;
  switch (kind) {
    case 'none':
      return crossing.kind === 'diagonals' ? 'they slide past each other' : 'passes clear';
    case 'bolted':
      return apart ? `bends both to close ${gap}` : 'leg to leg';
    case 'packed':
      return apart ? `packed ${gap}, none bends` : 'nothing to pack';
    case 'cut':
      return 'hinged out of plane';
    case 'welded':
      return 'on site; twist stays free';
    case 'purlin':
      return 'in plane only if it is itself held';
    case 'hung':
      return 'carries sag, holds nothing';
    default:
      return kind satisfies never;
  }
}
