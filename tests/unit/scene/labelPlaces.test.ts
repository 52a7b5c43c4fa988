import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type LabelWish, labelPlaces } from '../../../renderer/scene/overlay/labelPlaces.ts';
import { boxAbout, inside, overlap } from '../../../renderer/scene/view/box.ts';

const SHEET = { left: 6, top: 6, width: 788, height: 588 };
const NONE = new Map<string, number>();

const wish = (key: string, bar: LabelWish['bar'], must = false): LabelWish => ({
  key,
  width: 72,
  height: 20,
  bar,
  must,
});

const rise = wish('rise', [
  [200, 500],
  [600, 100],
]);
const fall = wish('fall', [
  [600, 500],
  [200, 100],
]);

describe('the labels of diagonals', () => {
  it('stand beside their bars with a short leader', () => {
    const place = labelPlaces([rise], [], [], SHEET, NONE).get('rise');
    if (!place) throw new Error('no place');
    // The bar runs along x + y = 700.
    expect(place.onBar[0] + place.onBar[1]).toBeCloseTo(700, 9);
    expect(Math.hypot(place.onBox[0] - place.onBar[0], place.onBox[1] - place.onBar[1])).toBe(16);
  });

  it('do not lie on one another, on glyphs, or over the edge', () => {
    const glyph = boxAbout([400, 300], 11);
    const places = [...labelPlaces([rise, fall], [glyph], [], SHEET, NONE).values()];
    expect(places).toHaveLength(2);
    for (const { box } of places) {
      expect(overlap(box, glyph)).toBe(0);
      expect(inside(box, SHEET)).toBe(true);
    }
    const [a, b] = places;
    if (!a || !b) throw new Error('no places');
    expect(overlap(a.box, b.box)).toBe(0);
  });

  it('keep their place while the view turns a little', () => {
    const before = labelPlaces([rise, fall], [], [], SHEET, NONE);
    const candidates = new Map([...before].map(([key, place]) => [key, place.candidate]));
    const turned = [rise, fall].map((one) => ({
      ...one,
      bar: [
        [one.bar[0][0] + 3, one.bar[0][1]],
        [one.bar[1][0] - 3, one.bar[1][1] + 2],
      ] as LabelWish['bar'],
    }));
    const after = labelPlaces(turned, [], [], SHEET, candidates);
    for (const [key, place] of after) expect(place.candidate).toBe(candidates.get(key));
  });

  it('give way, but for the one that must be shown, where there is no room', () => {
    const crowd = Array.from({ length: 40 }, (_, index) =>
      wish(
        `bar ${index}`,
        [
          [390, 290 + index / 10],
          [410, 310 + index / 10],
        ],
        index === 30,
      ),
    );
    const places = labelPlaces(crowd, [], [], SHEET, NONE);
    expect(places.has('bar 30')).toBe(true);
    expect(places.size).toBeLessThan(40);
  });

  it('never lie on one another, wherever the bars are, and leave the graver ones where there is no room for all', () => {
    const coordinate = fc.integer({ min: 100, max: 500 });
    const point = fc.tuple(coordinate, coordinate);
    fc.assert(
      fc.property(fc.array(fc.tuple(point, point), { minLength: 2, maxLength: 30 }), (bars) => {
        const wishes = bars.map((bar, index) => ({
          ...wish(`bar ${index}`, bar, index === 3),
          weight: index,
        }));
        const boxes = [...labelPlaces(wishes, [], [], SHEET, NONE).values()].map(({ box }) => box);
        return boxes.every((a, k) => boxes.slice(k + 1).every((b) => overlap(a, b) === 0));
      }),
      { seed: 3, numRuns: 200 },
    );
    const onOne = Array.from({ length: 40 }, (_, index) => ({
      ...wish(`bar ${index}`, [
        [390, 290],
        [410, 310],
      ]),
      weight: index === 25 ? 1 : 0,
    }));
    expect(labelPlaces(onOne, [], [], SHEET, NONE).has('bar 25')).toBe(true);
  });

  it('take a longer leader where the shorter finds no room', () => {
    // All that a leader of 16 px reaches beside the bar is covered.
    const covered = { left: 150, top: 270, width: 500, height: 60 };
    const level = wish('level', [
      [200, 300],
      [600, 300],
    ]);
    const place = labelPlaces([level], [covered], [], SHEET, NONE).get('level');
    if (!place) throw new Error('no place');
    expect(Math.hypot(place.onBox[0] - place.onBar[0], place.onBox[1] - place.onBar[1])).toBe(40);
    expect(overlap(place.box, covered)).toBe(0);
  });

  it('never leave the sheet, wherever the bars are', () => {
    const coordinate = fc.integer({ min: -200, max: 1000 });
    const point = fc.tuple(coordinate, coordinate);
    fc.assert(
      fc.property(fc.array(fc.tuple(point, point), { minLength: 1, maxLength: 12 }), (bars) => {
        const wishes = bars.map((bar, index) => wish(`bar ${index}`, bar, index === 0));
        for (const { box } of labelPlaces(wishes, [], [], SHEET, NONE).values())
          if (!inside(box, SHEET)) return false;
        return true;
      }),
      { seed: 2, numRuns: 300 },
    );
  });
});
