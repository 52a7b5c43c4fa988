import { add, type Vec3 } from '../../../core/geometry/vector.ts';
import type { Bar, BayLayout, Crossing } from '../../../core/layout/model.ts';
import type { BayViewProps } from '../bayViewProps.ts';
import { type CrossingDetail, crossingDetail, crossingToShow } from '../detail/crossingDetail.ts';
import { type BowShape, bowShape } from '../drawing/bowShape.ts';
import { forceLabel } from '../forces/forceLabel.ts';
import { type BarLabel, barLabel } from './barLabel.ts';

/** What lies over the steel, before it takes its place on the sheet. */
export interface OverlayContent {
  readonly bay: BayLayout | null;
  readonly diagonals: readonly { readonly bar: Bar; readonly label: BarLabel }[];
  readonly crossings: readonly Crossing[];
  readonly selected: Bar | null;
  readonly bow: BowShape | null;
  readonly detail: CrossingDetail | null;
  /** Every bar of the bay as a line in space, mm. */
  readonly steelLines: readonly (readonly [Vec3, Vec3])[];
}

/** Glyphs and labels of the bay in hand, and the bow of the selected bar where it is wanted and known. */
export function overlayContent({
  assessment,
  bay: bayId,
  selectedBar,
  selectedCrossing,
  units,
  bow: bowWanted,
  forces,
}: Pick<
  BayViewProps,
  'assessment' | 'bay' | 'selectedBar' | 'selectedCrossing' | 'units' | 'bow' | 'forces'
>): OverlayContent {
  const { layout } = assessment;
  const bay = layout.bays.find((one) => one.id === bayId) ?? null;
  const bars = (bay?.diagonals ?? []).flatMap((id) => layout.bars.get(id) ?? []);
  const crossings = (bay?.crossings ?? []).flatMap((id) => layout.crossings.get(id) ?? []);
  const selected = (selectedBar === null ? undefined : layout.bars.get(selectedBar)) ?? null;
  const restraint = selected === null ? null : (assessment.diagonals.get(selected.id)?.restraint ?? null);
  const plane = layout.bays
    .find((one) => one.id === selected?.bay)
    ?.planes.find((one) => one.id === selected?.plane);
  const shownLarge = crossingToShow(layout, bay, selectedCrossing, selectedBar);
  return {
    bay,
    diagonals: bars.map((bar) => ({
      bar,
      label:
        forces !== null && forces.states.length > 0
          ? forceLabel(assessment, bar, forces, units)
          : barLabel(assessment, bar),
    })),
    crossings,
    selected,
    bow:
      bowWanted && selected?.angle && restraint ? bowShape(selected, selected.angle, restraint, plane) : null,
    steelLines: (bay?.bars ?? []).flatMap((id) => {
      const bar = layout.bars.get(id);
      return bar ? [[add(bar.from, bar.offset), add(bar.to, bar.offset)] as const] : [];
    }),
    detail: shownLarge === null ? null : crossingDetail(layout, shownLarge, selectedBar, units),
  };
}
