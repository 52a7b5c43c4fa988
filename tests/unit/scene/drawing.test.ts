import { describe, expect, it } from 'vitest';
import { distance, dot } from '../../../core/geometry/vector.ts';
import { bowedPoint } from '../../../renderer/scene/drawing/bowShape.ts';
import { scaleInk } from '../../../renderer/scene/drawing/cornerInk.ts';
import { dimensionInk } from '../../../renderer/scene/drawing/dimensionInk.ts';
import { lineNamesInk } from '../../../renderer/scene/drawing/lineNamesInk.ts';
import { crossingPlaces } from '../../../renderer/scene/overlay/crossingPlaces.ts';
import { growth } from '../../../renderer/scene/overlay/useBowGrowth.ts';
import { namedView, type ViewName } from '../../../renderer/scene/view/namedView.ts';
import type { SheetView } from '../../../renderer/scene/view/sheetView.ts';
import { crossedWall, laidOut, roof } from './given/bays.ts';

const layout = laidOut(crossedWall());
const bay = layout.bays[0];
if (!bay) throw new Error('no bay');

const sheet = (name: ViewName): SheetView => ({
  ...namedView(name, bay),
  centre: [3000, 0, 2000],
  pxPerMm: 0.1,
  width: 900,
  height: 700,
});

const figures = (name: ViewName, units: 'metric' | 'us'): readonly string[] =>
  dimensionInk(sheet(name), bay, units).flatMap((ink) => (ink.kind === 'words' ? [ink.text] : []));

describe('the dimensions of a bay', () => {
  it('give width and height of a wall in its elevation, in the units in use', () => {
    // Between groups of three digits stands a narrow space that does not break.
    expect(figures('elevation', 'metric')).toEqual(['6\u202f000', '4\u202f000']);
    // 6000/304.8 = 19 ft 8.22 in, 4000/304.8 = 13 ft 1.48 in, to the sixteenth.
    expect(figures('elevation', 'us')).toEqual(['19\'-8 1/4"', '13\'-1 1/2"']);
  });

  it('leave out what is seen end on', () => {
    // From the side a wall along X has no width; from above no height, and nowhere for its width to stand off to.
    expect(figures('side', 'metric')).not.toContain('6\u202f000');
    expect(figures('plan', 'metric')).toEqual([]);
  });
});

const NO_LEGEND = { width: 0, height: 0 };

describe('the names of purlins', () => {
  const made = laidOut(roof());
  const names = (pxPerMm: number) =>
    lineNamesInk({ ...sheet('elevation'), pxPerMm }, made, made.bays[0] ?? bay).length;

  it('stand at each where there is room, and never on one another', () => {
    // Five purlins 1500 mm apart up a slope of 8°, seen along it: 209 mm apart in height, 2.1 px at 0.01.
    expect(names(0.1)).toBe(5);
    expect(names(0.01)).toBeLessThan(5);
    expect(names(0.01)).toBeGreaterThan(0);
  });
});

describe('the scale', () => {
  it('keeps out of the legend: above the triad where that reaches its place, and gone where it reaches that too', () => {
    const leftOf = (width: number) => {
      const [first] = scaleInk({ ...sheet('elevation'), width: 480 }, 'metric', { width, height: 90 });
      return first?.kind === 'path' ? Number(/M(-?[\d.]+)/.exec(first.d)?.[1]) : null;
    };
    // Two parts of 50 px and the figure's 62 px: from 96 it ends at 258, and the legend's edge is 480 − 14 − its width.
    expect(leftOf(200)).toBe(96);
    expect(leftOf(230)).toBe(20);
    expect(leftOf(300)).toBeNull();
  });

  it('is true to the view: two parts of a metre at 0.1 px a millimetre are 200 px', () => {
    const filled = scaleInk(sheet('elevation'), 'metric', NO_LEGEND).find(
      (ink) => ink.key === 'scale filled',
    );
    // 0.5 m is the first step of at least 36 px: 50 px.
    expect(filled?.kind === 'path' && filled.d).toContain('L146.0');
    const words = scaleInk(sheet('elevation'), 'metric', NO_LEGEND).flatMap((ink) =>
      ink.kind === 'words' ? [ink.text] : [],
    );
    expect(words).toEqual(['0', '0.5', '1 m']);
  });

  it('says that it measures uprights where they are foreshortened', () => {
    const words = scaleInk(sheet('axonometric'), 'us', NO_LEGEND).flatMap((ink) =>
      ink.kind === 'words' ? [ink.text] : [],
    );
    expect(words.at(-1)).toMatch(/ ft upright$/);
  });
});

describe('the bow of a bar', () => {
  const bar = layout.bars.get('W1/t1.rise');
  if (!bar) throw new Error('no bar');
  const bow = { from: 0, to: bar.length, direction: [0, -1, 0] as const, rise: 100 };

  it('begins and ends on the bar and is highest in the middle', () => {
    expect(distance(bowedPoint(bar, bow, 0, 1), bar.from)).toBeCloseTo(0, 9);
    expect(distance(bowedPoint(bar, bow, 1, 1), bar.to)).toBeCloseTo(0, 6);
    expect(dot(bowedPoint(bar, bow, 0.5, 1), bow.direction)).toBeCloseTo(100, 9);
  });

  it('grows, breathes and comes to rest within five seconds', () => {
    expect(growth(0)).toBe(0);
    expect(growth(5)).toBe(1);
    for (let t = 0.6; t < 5; t += 0.05) expect(Math.abs(growth(t) - 1)).toBeLessThan(0.1);
  });
});

describe('glyphs of crossings', () => {
  it('stand apart where three bars meet at one point, the diagonals in their place', () => {
    const wall = crossedWall();
    const recipe = wall.recipe.kind === 'wall' ? wall.recipe : null;
    if (!recipe) throw new Error('no wall');
    const railed = laidOut({
      ...wall,
      recipe: { ...recipe, lines: [{ id: 'G1', at: 2000, heldBy: { kind: 'nothing' } }] },
    });
    const crossings = [...railed.crossings.values()];
    expect(crossings).toHaveLength(3);
    const view = sheet('elevation');
    const places = [...crossingPlaces(view, railed, crossings)];
    for (const [index, [, a]] of places.entries())
      for (const [, b] of places.slice(index + 1))
        expect(Math.hypot(a[0] - b[0], a[1] - b[1])).toBeGreaterThan(22);
    // The diagonals cross in the middle of the wall, which is the middle of the sheet.
    const own = places.find(([id]) => id === 'W1/t1.fall+t1.rise')?.[1];
    expect(own?.[0]).toBeCloseTo(450, 6);
    expect(own?.[1]).toBeCloseTo(350, 6);
  });

  it('stand apart where crossings lie behind each other: all tiers of a wall seen from above', () => {
    const wall = crossedWall();
    const { recipe } = wall;
    if (recipe.kind !== 'wall') throw new Error('no wall');
    const tiers = ['t1', 't2', 't3', 't4'].map((id) => ({ id, height: 3000, pattern: 'crossed' as const }));
    const high = laidOut({ ...wall, recipe: { ...recipe, tiers } });
    const crossings = [...high.crossings.values()];
    expect(crossings).toHaveLength(4);
    const places = [...crossingPlaces(sheet('plan'), high, crossings).values()];
    for (const [index, a] of places.entries())
      for (const b of places.slice(index + 1))
        expect(Math.hypot(a[0] - b[0], a[1] - b[1])).toBeGreaterThan(22);
  });
});
