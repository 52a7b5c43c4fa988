import { angleProperties } from '../section/angleProperties.ts';
import type { AngleOutline } from '../section/model.ts';
import { type OutlineProblem, outlineProblem } from '../section/outlineProblem.ts';
import type { OwnAngle, StockAngle } from './model.ts';

/** kg/m for each mm² of steel: 7850 kg/m³. */
export const STEEL_PER_METRE = 7.85e-3;

export type OwnStockAngle =
  | { readonly ok: true; readonly angle: StockAngle }
  | { readonly ok: false; readonly problem: OutlineProblem };

/** An own angle ready to use, its properties from its dimensions; or why its dimensions make no angle. */
export function ownStockAngle(own: OwnAngle): OwnStockAngle {
  const { designation, ...outline } = own;
  const problem = outlineProblem(outline);
  return problem
    ? { ok: false, problem }
    : { ok: true, angle: computedAngle(designation, 'own', outline, null) };
}

/** A stock angle whose properties come from its outline; its mass too where the list prints none. */
export function computedAngle(
  designation: string,
  catalogue: StockAngle['catalogue'],
  outline: AngleOutline,
  massPerMetre: number | null,
): StockAngle {
  const properties = angleProperties(outline);
  return {
    designation,
    catalogue,
    kind: outline.longLeg === outline.shortLeg ? 'equal' : 'unequal',
    outline,
    properties,
    basis: 'computed',
    massPerMetre: massPerMetre ?? properties.area * STEEL_PER_METRE,
  };
}
