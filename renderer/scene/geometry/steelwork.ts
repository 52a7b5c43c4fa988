import type { BarId, BayLayout, Layout } from '../../../core/layout/model.ts';
import { anglePrisms } from './angleParts.ts';
import { memberPrism } from './memberParts.ts';
import { basePlate, gussetPrism, joinPrisms } from './plateParts.ts';
import type { Prism } from './prism.ts';
import type { AngleScale, Paint, SteelPart } from './steelPart.ts';

/** Every solid of a project as set out: bars with their profiles, gussets, and what the joins add. Bay by bay, in the layout's order. */
export function steelwork(layout: Layout, scale: AngleScale): readonly SteelPart[] {
  return layout.bays.flatMap((bay) => bayParts(layout, bay, scale));
}

/** The solids of one bay. */
export function bayParts(layout: Layout, bay: BayLayout, scale: AngleScale): readonly SteelPart[] {
  const parts: SteelPart[] = [];
  const put = (prism: Prism, paint: Paint, plane: string, bar: BarId | null): void => {
    parts.push({ prism, paint, bay: bay.id, plane, bar });
  };
  for (const id of bay.bars) {
    const bar = layout.bars.get(id);
    if (!bar) continue;
    if (bar.angle) {
      for (const prism of anglePrisms(bar, bar.angle, scale)) put(prism, 'diagonal', bar.plane, id);
      continue;
    }
    const prism = memberPrism(layout, bay, bar);
    put(prism, 'member', bar.plane, id);
    const plate = basePlate(layout, bay, bar, prism);
    if (plate) put(plate, 'member', bar.plane, null);
  }
  for (const gusset of bay.gussets) {
    const prism = gussetPrism(gusset);
    if (prism) put(prism, 'plate', gusset.plane, null);
  }
  for (const id of bay.crossings) {
    const crossing = layout.crossings.get(id);
    const plane = crossing && layout.bars.get(crossing.a)?.plane;
    if (!crossing || plane === undefined) continue;
    for (const prism of joinPrisms(layout, crossing, scale)) put(prism, 'plate', plane, null);
  }
  return parts;
}
