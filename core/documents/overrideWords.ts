import type { LengthOverride, UnitSystem } from '../project/model.ts';
import { showLength } from '../units/quantity.ts';

/** "y: 4.00 m × 0.85, because the column sheeting holds it": a length or factor set by hand, with its reason. */
export function overrideWords({ axis, length, factor, reason }: LengthOverride, units: UnitSystem): string {
  const taken = length === null ? 'length as found' : showLength(length, units, 'spoken');
  const times = factor === 1 ? '' : ` × ${factorText(factor)}`;
  return `${axis}: ${taken}${times}, because ${reason}`;
}

/** An effective length factor with the decimals it was given, three at most. */
export function factorText(factor: number): string {
  return String(Number(factor.toFixed(3)));
}
