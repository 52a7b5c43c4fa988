import { describe, expect, it } from 'vitest';
import { dot, subtract, type Vec3 } from '../../../core/geometry/vector.ts';
import { anglePrisms } from '../../../renderer/scene/geometry/angleParts.ts';
import { drawPlan, OVERLAY_DRAWS } from '../../../renderer/scene/geometry/drawPlan.ts';
import { mergedSteel } from '../../../renderer/scene/geometry/mergedSteel.ts';
import { gussetPrism } from '../../../renderer/scene/geometry/plateParts.ts';
import { type Prism, pointOf } from '../../../renderer/scene/geometry/prism.ts';
import { steelwork } from '../../../renderer/scene/geometry/steelwork.ts';
import { crossedWall, laidOut, roof, walls } from './given/bays.ts';

const OUT: readonly [number, number, number] = [0, -1, 0];

/** How far a solid reaches out of the wall at the origin, nearest and farthest, mm. */
function reachOut(prism: Prism): readonly [number, number] {
  const distances = prism.outline.map((p) => dot(pointOf(prism, p, prism.from), OUT));
  return [Math.min(...distances), Math.max(...distances)];
}

describe('the steel of a wall bay', () => {
  const layout = laidOut(crossedWall());
  const bar = (key: string) => {
    const found = layout.bars.get(`W1/${key}`);
    if (!found?.angle) throw new Error(`no angle ${key}`);
    return { bar: found, angle: found.angle };
  };
  const solid = (key: string, scale: 'true' | 'doubled'): Prism => {
    const { bar: one, angle } = bar(key);
    const [first] = anglePrisms(one, angle, scale);
    if (!first) throw new Error(`no steel ${key}`);
    return first;
  };

  it('lays back-to-back diagonals on either face of a 10 mm gusset, legs standing out', () => {
    // By hand: faces at ±5 mm; 70×70×6 stands out 70 mm from its face.
    expect(reachOut(solid('t1.fall', 'true'))).toEqual([expect.closeTo(5, 6), expect.closeTo(75, 6)]);
    expect(reachOut(solid('t1.rise', 'true'))).toEqual([expect.closeTo(-75, 6), expect.closeTo(-5, 6)]);
  });

  it('keeps doubled angles on their faces of the gusset', () => {
    expect(reachOut(solid('t1.fall', 'doubled'))).toEqual([expect.closeTo(5, 6), expect.closeTo(145, 6)]);
  });

  it('keeps the line of bolts on the set-out line at either size', () => {
    for (const scale of ['true', 'doubled'] as const) {
      const { bar: one, angle } = bar('t1.fall');
      const prism = solid('t1.fall', scale);
      const heel = dot(subtract(prism.origin, one.from), angle.placement.inPlane);
      // The heel is the gauge away from the set-out line, twice that when doubled.
      expect(Math.abs(heel)).toBeCloseTo(angle.placement.gauge * (scale === 'doubled' ? 2 : 1), 6);
    }
  });

  it('draws a cut bar in two pieces with a plate that laps both', () => {
    const cut = laidOut(crossedWall('W1', { kind: 'cut', cutBar: 't1.rise' }));
    const before = steelwork(layout, 'true');
    const after = steelwork(cut, 'true');
    expect(after.filter((part) => part.bar === 'W1/t1.rise')).toHaveLength(2);
    const plates = (parts: typeof after) => parts.filter((part) => part.paint === 'plate').length;
    expect(plates(after)).toBe(plates(before) + 1);
  });

  it('draws a packer as thick as the gap between the legs', () => {
    const packed = laidOut(crossedWall('W1', { kind: 'packed', packer: null }));
    const packer = steelwork(packed, 'true').find(
      (part) =>
        part.paint === 'plate' && part.prism.to - part.prism.from < 50 && part.prism.outline.length === 4,
    );
    const crossing = packed.crossings.get('W1/t1.fall+t1.rise');
    expect((packer?.prism.to ?? 0) - (packer?.prism.from ?? 0)).toBeCloseTo(crossing?.gap ?? -1, 6);
  });

  it('leaves out the steel of a bar whose section is not in stock', () => {
    const wall = crossedWall();
    const unknown = laidOut({ ...wall, diagonals: { ...wall.diagonals, section: 'no such angle' } });
    expect(steelwork(unknown, 'true').filter((part) => part.paint === 'diagonal')).toEqual([]);
  });
});

describe('a plate whose corners say too little', () => {
  const plate = (corners: readonly Vec3[]) => ({
    node: 'n',
    plane: 'p',
    thickness: 10,
    normal: [0, -1, 0] as const,
    corners,
  });

  it('is drawn from its first corners that lie apart', () => {
    const prism = gussetPrism(
      plate([
        [0, 0, 0],
        [0, 0, 0],
        [100, 0, 0],
        [100, 0, 100],
      ]),
    );
    expect(prism?.x).toEqual([1, 0, 0]);
  });

  it('is left out where none do', () => {
    expect(
      gussetPrism(
        plate([
          [0, 0, 0],
          [0, 0, 0],
          [0, 0, 0],
        ]),
      ),
    ).toBeNull();
  });
});

describe('the draw calls of a project', () => {
  it('are at most seven for the steel, whatever the number of bars', () => {
    for (const count of [1, 3, 20]) {
      const merged = mergedSteel(steelwork(laidOut(...walls(count, 2)), 'true'));
      expect(drawPlan(merged, `W${Math.ceil(count / 2)}`).length).toBeLessThanOrEqual(7);
      expect(drawPlan(merged, null)).toHaveLength(3);
    }
  });

  it('stay under twenty with a bar selected and another under the pointer', () => {
    const merged = mergedSteel(steelwork(laidOut(...walls(5, 4)), 'doubled'));
    expect(drawPlan(merged, 'W3').length + OVERLAY_DRAWS).toBeLessThan(20);
  });

  it('draw every triangle and every line once, as subject or as context, but fine lines of the subject alone', () => {
    const merged = mergedSteel(steelwork(laidOut(...walls(4, 1), roof()), 'true'));
    for (const bay of ['W1', 'W3', 'R1', 'no such bay', null]) {
      const plan = drawPlan(merged, bay);
      const sum = (what: 'solids' | 'edges') =>
        plan.filter((draw) => draw.what === what).reduce((total, draw) => total + draw.range.count, 0);
      expect(sum('solids')).toBe(merged.triangles.length);
      expect(sum('edges')).toBe(merged.edges.length / 3);
    }
  });
});
