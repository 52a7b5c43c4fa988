import type { LengthOverride, UnitSystem } from '../project/model.ts';
import { figure, spokenLength } from './figures.ts';

/** "y: 4.00 m × 0.85, because the column sheeting holds it": a length or factor set by hand, with its reason. */
export function overrideWords({ axis, length, factor, reason }: LengthOverride, units: UnitSystem): string {
  const taken = length === null ? 'length as found' : spokenLength(length, units);
  const times = factor === 1 ? '' : ` × ${figure(factor, 2)}`;
  return `${axis}: ${taken}${times}, because ${reason}`;
}
