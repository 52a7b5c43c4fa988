/** What lies between bars that pass each other: from leg to leg where a join takes hold, and whether their steel runs into each other. */
import { describe, expect, it } from 'vitest';
import type { Crossing } from '../../../core/layout/model.ts';
import type { BarMark, Bay, Join } from '../../../core/project/model.ts';
import { bay, free, wall } from '../assess/given/bays.ts';
import { assessed } from '../assess/given/reading.ts';

// Near is −Y. Bars of 70 × 70 × 6 on a gusset of 10: the leg in the plane takes 5…11 mm from the plane, the standing leg 5…75.
type Sides = readonly [NonNullable<BarMark['side']>, NonNullable<BarMark['side']>];
const planes = (apart: number, [first, second]: Sides, join: Join | null = { kind: 'bolted' }): Bay =>
  bay(
    free({ a: [0, 0, 0], b: [6000, 0, 4000], c: [6000, apart, 0], d: [0, apart, 4000] }, [
      ['b1', 'a', 'b'],
      ['b2', 'c', 'd'],
    ]),
    { joins: join ? { 'b1+b2': join } : {}, bars: { b1: { side: first }, b2: { side: second } } },
  );
const crossingOf = (made: Bay): Crossing => {
  const [crossing, ...more] = [...assessed(made).layout.crossings.values()];
  if (!crossing || more.length > 0) throw new Error('one crossing is wanted');
  return crossing;
};
const lengthAboutV = (made: Bay) => assessed(made).diagonals.get('B/b1')?.restraint?.lanes.v.unbraced;
const whole = Math.sqrt(52_000_000);

describe('between two diagonals of planes that lie apart', () => {
  it.each<[string, number, Sides, number]>([
    // Back to back on one gusset: its thickness.
    ['near and far in one plane', 0, ['near', 'far'], 10],
    // The leg of b1 ends 11 behind its own plane, that of b2 begins 11 before its own.
    ['far and near, 210 apart', 210, ['far', 'near'], 210 - 22],
    // Both legs 5…11 from their own planes.
    ['near and near, 100 apart', 100, ['near', 'near'], 100 - 6],
    ['far and far, 100 apart', 100, ['far', 'far'], 100 - 6],
    ['near and far, 40 apart', 40, ['near', 'far'], 40 + 10],
  ])('%s: from leg to leg', (_, apart, sides, gap) => {
    const crossing = crossingOf(planes(apart, sides));
    expect(crossing.gap).toBeCloseTo(gap, 9);
    expect(crossing.clash).toBe(false);
    expect(crossing.tooFarApart).toBe(gap > 60);
    expect(lengthAboutV(planes(apart, sides))).toBeCloseTo(gap > 60 ? whole : whole / 2, 6);
  });

  it('is a clash where standing legs run into each other, by their overlap', () => {
    // b1 takes 5…75 behind its plane, b2 75…5 before its own, 100 farther: 25…95.
    expect(crossingOf(planes(100, ['far', 'near']))).toMatchObject({ clash: true, gap: -50 });
    expect(crossingOf(planes(0, ['near', 'near']))).toMatchObject({ clash: true, gap: -70 });
  });
});

describe('shapes with the gusset through their middle', () => {
  const crossed = (section: string, join: Join | null = null) =>
    crossingOf(
      bay(wall(6000, [[4000, 'crossed']]), {
        diagonals: { section },
        joins: join ? { 't1.fall+t1.rise': join } : {},
      }),
    );
  it('run into each other when they are stiff, whichever side is marked', () => {
    expect(crossed('CHS 76.1x3.2')).toMatchObject({ clash: true, gap: -76.1 });
    expect(crossed('CHS 76.1x3.2', { kind: 'cut', cutBar: 't1.rise' }).clash).toBe(false);
    expect(crossed('2L 70x70x6/10').clash).toBe(true);
  });
  it('bend past each other when they are rods (common practice, no source)', () => {
    expect(crossed('ROD 20')).toMatchObject({ clash: false, gap: 0 });
  });
  it('lie against the gusset when they are flats', () => {
    expect(crossed('FL 80x8')).toMatchObject({ clash: false, gap: 10 });
  });
});

describe('between a diagonal and a purlin drawn by itself', () => {
  const beside = (apart: number): Bay =>
    bay(
      free({ a: [0, 0, 0], d: [6000, 0, 4000], p: [0, apart, 2000], q: [6000, apart, 2000] }, [
        ['d1', 'a', 'd'],
        ['P', 'p', 'q', 'purlin'],
      ]),
      { joins: { 'P+d1': { kind: 'purlin', boltsAcross: 1 } }, bars: { d1: { side: 'near' } } },
    );
  const held = (made: Bay) => assessed(made).diagonals.get('B/d1')?.restraint?.lanes.v.unbraced;

  it('a cleat bridges up to 400 mm (common practice, no source)', () => {
    expect(crossingOf(beside(0)).gap).toBeCloseTo(5, 9);
    expect(crossingOf(beside(390)).gap).toBeCloseTo(395, 9);
    expect(held(beside(390))).toBeCloseTo(whole / 2, 6);
  });
  it('beyond that the mark holds nothing, and a finding says so', () => {
    expect(crossingOf(beside(500))).toMatchObject({ tooFarApart: true });
    expect(held(beside(500))).toBeCloseTo(whole, 6);
    const [finding] = assessed(beside(500)).findings.filter(({ kind }) => kind === 'too far apart to join');
    expect(finding).toMatchObject({ limit: 400, crossing: 'B/P+d1', severity: 'look into' });
  });
});
