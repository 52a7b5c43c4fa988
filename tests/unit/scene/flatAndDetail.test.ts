import { describe, expect, it } from 'vitest';
import type { TrailStep } from '../../../core/restraint/model.ts';
import { crossingDetail, crossingToShow } from '../../../renderer/scene/detail/crossingDetail.ts';
import { DETAIL_RADIUS, detailPlace } from '../../../renderer/scene/detail/detailPlace.ts';
import { trailInk } from '../../../renderer/scene/drawing/trailInk.ts';
import { flatSteel } from '../../../renderer/scene/flat/flatSteel.ts';
import { steelwork } from '../../../renderer/scene/geometry/steelwork.ts';
import { namedView } from '../../../renderer/scene/view/namedView.ts';
import type { SheetView } from '../../../renderer/scene/view/sheetView.ts';
import { crossedWall, laidOut } from './given/bays.ts';

const layout = laidOut(crossedWall('W1', { kind: 'bolted' }));
const bay = layout.bays[0];
if (!bay) throw new Error('no bay');

const sheet: SheetView = {
  ...namedView('elevation', bay),
  centre: [3000, 0, 2000],
  pxPerMm: 0.1,
  width: 900,
  height: 700,
};

describe('the flat drawing of a bay', () => {
  it('paints the far diagonal first, then the members, then the near diagonal', () => {
    const order = flatSteel(sheet, steelwork(layout, 'true'), bay.planes).map((flat) => flat.part.bar);
    const far = order.indexOf('W1/t1.rise');
    const beam = order.indexOf('W1/t1.beam');
    const near = order.indexOf('W1/t1.fall');
    expect(far).toBeGreaterThanOrEqual(0);
    expect(far).toBeLessThan(beam);
    expect(beam).toBeLessThan(near);
  });

  it('is painted the other way round from behind', () => {
    const behind: SheetView = { ...sheet, right: [-1, 0, 0], towards: [0, 1, 0] };
    const order = flatSteel(behind, steelwork(layout, 'true'), bay.planes).map((flat) => flat.part.bar);
    expect(order.indexOf('W1/t1.fall')).toBeLessThan(order.indexOf('W1/t1.rise'));
  });

  it('shows no face that is turned away', () => {
    const beam = flatSteel(sheet, steelwork(layout, 'true'), bay.planes).find(
      (flat) => flat.part.bar === 'W1/t1.beam',
    );
    // An I section seen square on its web: two flange edges and the web.
    expect(beam?.faces).toHaveLength(3);
  });
});

describe('the detail of a crossing', () => {
  const crossing = crossingToShow(layout, bay, null, 'W1/t1.rise');

  it('is of the crossing of the selected bar, and of the selected crossing before all', () => {
    expect(crossing?.id).toBe('W1/t1.fall+t1.rise');
    expect(crossingToShow(layout, bay, null, null)).toBeNull();
    expect(crossingToShow(layout, bay, 'W1/t1.fall+t1.rise', null)?.id).toBe('W1/t1.fall+t1.rise');
  });

  it('shows both bars, the bolt outside them, and tells the gap', () => {
    if (!crossing) throw new Error('no crossing');
    const detail = crossingDetail(layout, crossing, 'W1/t1.rise', 'metric');
    expect(detail?.note).toBe('10 mm between the legs');
    const layers = (paint: string) =>
      (detail?.solids ?? []).filter((solid) => solid.paint === paint).map((solid) => solid.layer);
    // By hand: gusset 10, legs of 6 mm on either face end at ±11 mm; head and nut of 10 mm have their middles at ±16.
    expect(layers('member').toSorted((a, b) => a - b)).toEqual([
      expect.closeTo(-16, 6),
      expect.closeTo(16, 6),
    ]);
    expect(detail?.solids.filter((solid) => solid.selected)).toHaveLength(2);
  });

  it('finds a place clear of bars and words, keeps it, and gives up where there is none', () => {
    const bars = [[[100, 0] as const, [100, 700] as const] as const];
    const found = detailPlace(sheet, [450, 350], bars, [], null);
    if (!found) throw new Error('no place');
    expect(found.at[0]).toBeGreaterThan(100 + DETAIL_RADIUS);
    expect(detailPlace(sheet, [850, 20], bars, [], found.place)?.place).toBe(found.place);
    const everywhere = { left: 0, top: 0, width: 900, height: 700 };
    expect(detailPlace(sheet, [450, 350], [], [everywhere], null)).toBeNull();
  });
});

describe('a trail', () => {
  const step = (text: string, at: Partial<TrailStep>): TrailStep => ({
    text,
    bar: null,
    node: null,
    state: 'on the way',
    ...at,
  });
  const fall = layout.bars.get('W1/t1.fall');
  if (!fall) throw new Error('no bar');

  it('runs along both halves of the bar that holds, and stops where each ends held', () => {
    const ink = trailInk(
      sheet,
      layout,
      [
        step('through both halves', { bar: fall.id }),
        step('right foot', { node: fall.i, state: 'held' }),
        step('left head', { node: fall.j, state: 'held' }),
      ],
      'W1/t1.rise',
      [],
    );
    const keys = ink.map((one) => one.key);
    expect(keys.filter((key) => key.startsWith('trail line'))).toHaveLength(2);
    expect(keys.filter((key) => /^trail stop \d/.test(key))).toHaveLength(2);
    expect(keys.filter((key) => key.startsWith('trail step'))).toHaveLength(3);
  });

  it('ends in a double arrow where the holder is itself free', () => {
    const ink = trailInk(
      sheet,
      layout,
      [step('along it', { bar: fall.id }), step('tied to nothing', { bar: fall.id, state: 'free' })],
      'W1/t1.rise',
      [],
    );
    const keys = ink.map((one) => one.key);
    expect(keys.some((key) => key.startsWith('trail slide'))).toBe(true);
    expect(keys.some((key) => key.startsWith('trail stop'))).toBe(false);
  });
});
