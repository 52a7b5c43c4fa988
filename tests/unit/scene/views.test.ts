import { describe, expect, it } from 'vitest';
import { along, cross, dot } from '../../../core/geometry/vector.ts';
import { newKneeBay } from '../../../core/project/newBay.ts';
import { bare, fitOf, pointsToShow } from '../../../renderer/scene/view/fit.ts';
import { cameraAngles, namedView, type ViewName } from '../../../renderer/scene/view/namedView.ts';
import { onSheet } from '../../../renderer/scene/view/sheetView.ts';
import { crossedWall, laidOut, roof } from './given/bays.ts';

const VIEWS: readonly ViewName[] = ['elevation', 'plan', 'side', 'axonometric'];
const layout = laidOut(
  { ...crossedWall(), place: { origin: [0, 0, 0], turn: 30 } },
  { ...roof(), place: { origin: [0, 9000, 5000], turn: 0 } },
);

describe('the named views', () => {
  for (const bay of layout.bays) {
    it(`of ${bay.name} are square and right-handed, with the upright upright`, () => {
      for (const name of VIEWS) {
        const { right, up, towards } = namedView(name, bay);
        const product = cross(right, up);
        // Unit vectors computed in doubles: rounding alone.
        for (const axis of [0, 1, 2] as const) expect(product[axis]).toBeCloseTo(towards[axis], 12);
        expect(right[2]).toBeCloseTo(0, 12);
        expect(up[2]).toBeGreaterThanOrEqual(0);
      }
    });

    it(`of ${bay.name}: the elevation looks square at the plane, the side along it, the plan down`, () => {
      const plane = bay.planes[0];
      if (!plane) throw new Error('no plane');
      expect(dot(namedView('elevation', bay).towards, plane.normal)).toBeCloseTo(1, 12);
      expect(dot(namedView('side', bay).towards, plane.right)).toBeCloseTo(1, 12);
      expect(namedView('plan', bay).towards).toEqual([0, 0, 1]);
    });

    it(`of ${bay.name}: the axonometric sees the near side from above, the width running to the right`, () => {
      const plane = bay.planes[0];
      if (!plane) throw new Error('no plane');
      const view = namedView('axonometric', bay);
      expect(dot(view.towards, plane.normal)).toBeGreaterThan(0);
      expect(view.towards[2]).toBeGreaterThan(0);
      expect(dot(view.right, plane.right)).toBeGreaterThan(0.5);
    });
  }

  it('give the camera its turn about the upright and its angle from it', () => {
    // A wall along X is looked at from −Y, level: no turn, a right angle from the upright.
    const { azimuth, polar } = cameraAngles(namedView('elevation', laidOut(crossedWall()).bays[0] ?? null));
    expect(azimuth).toBeCloseTo(0, 12);
    expect(polar).toBeCloseTo(Math.PI / 2, 12);
  });
});

describe('fitting a bay to the sheet', () => {
  const sheet = { width: 700, height: 500 };
  const margins = { left: 60, right: 20, top: 20, bottom: 40 };
  const bay = layout.bays[0] ?? null;
  const points = pointsToShow(layout, bay);

  it('keeps every point within the margins and fills one direction', () => {
    for (const name of VIEWS) {
      const view = namedView(name, bay);
      const found = fitOf(bare(points), view, sheet, margins, []);
      if (!found) throw new Error('nothing to fit');
      const placed = points.map((point) => onSheet({ ...view, ...found, ...sheet }, point));
      const xs = placed.map(([x]) => x);
      const ys = placed.map(([, y]) => y);
      // The scale is found by halving to well under a thousandth of a px.
      expect(Math.min(...xs)).toBeGreaterThan(60 - 1e-3);
      expect(Math.max(...xs)).toBeLessThan(680 + 1e-3);
      expect(Math.min(...ys)).toBeGreaterThan(20 - 1e-3);
      expect(Math.max(...ys)).toBeLessThan(460 + 1e-3);
      const fillsX = Math.max(...xs) - Math.min(...xs) > 620 - 1;
      const fillsY = Math.max(...ys) - Math.min(...ys) > 440 - 1;
      expect(fillsX || fillsY).toBe(true);
    }
  });

  it('leaves room for what stands beside a point at any scale', () => {
    const view = namedView('elevation', bay);
    const beside = points.map((at) => ({ at, beside: [-80, 0] as const }));
    const found = fitOf([...bare(points), ...beside], view, sheet, margins, []);
    if (!found) throw new Error('nothing to fit');
    for (const point of points)
      expect(onSheet({ ...view, ...found, ...sheet }, point)[0] - 80).toBeGreaterThan(60 - 1e-3);
  });

  it('raises the view out of a corner that is taken', () => {
    const view = namedView('elevation', bay);
    const taken = { left: 0, top: 420, width: 700, height: 80 };
    const found = fitOf(bare(points), view, sheet, margins, [taken]);
    if (!found) throw new Error('nothing to fit');
    for (const point of points) expect(onSheet({ ...view, ...found, ...sheet }, point)[1]).toBeLessThan(420);
  });

  it('keeps a long bar out of a corner that only its middle would cross, with its depth', () => {
    const knees = laidOut(newKneeBay('K1', 'knees'));
    const made = knees.bays[0] ?? null;
    const view = namedView('axonometric', made);
    const taken = { left: 400, top: 400, width: 300, height: 100 };
    const found = fitOf(bare(pointsToShow(knees, made)), view, sheet, margins, [taken]);
    if (!found) throw new Error('nothing to fit');
    for (const bar of knees.bars.values())
      for (let share = 0; share <= 1; share += 0.01) {
        const [x, y] = onSheet(
          { ...view, ...found, ...sheet },
          along(bar.from, bar.direction, share * bar.length),
        );
        expect(x > taken.left && y > taken.top).toBe(false);
      }
  });

  it('says so when there is nothing to fit', () => {
    expect(fitOf([], namedView('plan', null), sheet, margins, [])).toBeNull();
  });
});
