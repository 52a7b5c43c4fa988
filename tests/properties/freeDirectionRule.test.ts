/** The free-direction rule against a brute force over spans and the bound for mixed holds, written afresh from METHODS.md §3. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Held } from '../../core/restraint/model.ts';
import { freeDirectionRule, type RuleStation } from '../../core/restraint/rule.ts';
import { propertiesOf } from '../unit/assess/given/catalogues.ts';
import { type BruteStation, bruteRule, type Hold, radiusAlong } from './given/bruteRule.ts';
import { runs } from './given/runs.ts';

const SECTIONS = ['70x70x6', '125x75x8', '200x100x10', '50x50x5', '80x60x7'].map(propertiesOf);
const section = fc.constantFrom(...SECTIONS);

/** Two summations in different order over at most ten stations: a few units in the last place. */
const ARITHMETIC = 1e-9;

function held(hold: Hold): Held {
  if (hold === null) return { ways: 0 };
  if (hold === 'both') return { ways: 2 };
  const angle = (hold * Math.PI) / 180;
  return { ways: 1, direction: [Math.cos(angle), Math.sin(angle)] };
}

const asked = (stations: readonly BruteStation[]): readonly RuleStation[] =>
  stations.map(({ at, hold }) => ({ at, held: held(hold) }));

const bar = (length: number, interior: readonly BruteStation[]): readonly BruteStation[] => [
  { at: 0, hold: 'both' },
  ...[...interior].sort((p, q) => p.at - q.at),
  { at: length, hold: 'both' },
];

/** Bars of 1 to 12 m with up to seven stations between, in steps of 50 mm so that some fall on one place. */
const barHolding = (hold: fc.Arbitrary<Hold>) =>
  fc
    .tuple(
      fc.integer({ min: 1000, max: 12_000 }),
      fc.array(fc.tuple(fc.integer({ min: 1, max: 19 }), hold), { maxLength: 7 }),
    )
    .map(([length, marks]) =>
      bar(
        length,
        marks.map(([share, each]) => ({ at: (length * share) / 20, hold: each })),
      ),
    );

/** Directions that are equal, square to each other, or well over 10° from both: what the rule speaks of without doubt. */
const SQUARE: readonly Hold[] = [0, 90, 'both', null];
const OBLIQUE: readonly Hold[] = [0, 90, 25, 115, 62, 'both', null];

describe('the rule against a brute force', () => {
  it.each([
    ['holds of one direction in the leg', [0, null]],
    ['holds of one oblique direction', [37, null]],
    ['holds in one direction, and some that hold both ways', [90, 'both', null]],
    ['holds in two perpendicular directions', SQUARE],
    ['holds in oblique directions as well', OBLIQUE],
  ] as const)('agrees for %s', (_, holds) => {
    fc.assert(
      fc.property(section, barHolding(fc.constantFrom<Hold>(...holds)), (angle, stations) => {
        const expected = bruteRule(angle, stations);
        const found = freeDirectionRule(angle, asked(stations));
        expect(found.slenderness / expected.slenderness).toBeCloseTo(1, 9);
        const spans = Math.max(...found.spans.map((span) => span.slenderness));
        expect(Math.abs(spans / expected.spans - 1)).toBeLessThan(ARITHMETIC);
        expect(found.bound === null).toBe(expected.bound === null);
        if (found.bound && expected.bound !== null)
          expect(Math.abs(found.bound.slenderness / expected.bound - 1)).toBeLessThan(ARITHMETIC);
      }),
      runs(400),
    );
  });

  it('does not mind two stations at one place', () => {
    fc.assert(
      fc.property(
        section,
        fc.constantFrom<Hold>(...OBLIQUE),
        fc.constantFrom<Hold>(...OBLIQUE),
        (angle, p, q) => {
          const both = bar(6000, [
            { at: 2000, hold: p },
            { at: 2000, hold: q },
          ]);
          const expected = bruteRule(angle, both);
          const found = freeDirectionRule(angle, asked(both));
          expect(found.slenderness / expected.slenderness).toBeCloseTo(1, 9);
          // A span of no length says nothing, and must not be there to be divided.
          for (const span of found.spans) expect(span.to).toBeGreaterThan(span.from);
        },
      ),
      runs(100),
    );
  });
});

describe('the rule by hand', () => {
  const angle = propertiesOf('70x70x6');
  // METHODS.md §1: I_x = 368 840, I_v = 152 679, A = 812.69, so r_x = 21.304 and r_v = 13.707.
  // Tolerance: the seventh figure of those inputs.
  const [RX, RV] = [Math.sqrt(368_840 / 812.69), Math.sqrt(152_679 / 812.69)];
  const rule = (length: number, ...interior: readonly BruteStation[]) =>
    freeDirectionRule(angle, asked(bar(length, interior)));

  it('takes all the length over r_v with nothing between', () => {
    expect(rule(6000).slenderness).toBeCloseTo(6000 / RV, 2);
    expect(rule(6000).bound).toBeNull();
  });

  it('takes all the length over the geometric radius when only the plane is held at mid-length', () => {
    // Half over r_v is 3000/13.707 = 218.9; all over r_x is 6000/21.304 = 281.6: the geometric axis governs.
    expect(rule(6000, { at: 3000, hold: 90 }).slenderness).toBeCloseTo(6000 / RX, 2);
  });

  it('takes the longer part over r_v when mid-length is held both ways', () => {
    expect(rule(6000, { at: 2500, hold: 'both' }).slenderness).toBeCloseTo(3500 / RV, 2);
  });

  it('is above the exact figure for thirds held one way each, where the spans alone are not', () => {
    // METHODS.md §3: "thirds at 0° and 90°: exact 144.8, spans alone 123.6", the length that gives those spans found from them:
    // a span of two thirds with one direction held inside, over r_x.
    const length = (123.6 * RX * 3) / 2;
    const found = rule(length, { at: length / 3, hold: 0 }, { at: (2 * length) / 3, hold: 90 });
    expect(Math.max(...found.spans.map((span) => span.slenderness))).toBeCloseTo(123.6, 1);
    expect(found.slenderness).toBeGreaterThan(144.8);
    // (b): two thirds over r_v; (a): all the length over r_x, or two thirds over r_v, the larger. Both give 123.6 × 3/2 = 185.4 or 192.1.
    const byHand = Math.min(Math.max(length / RX, (2 * length) / 3 / RV), (2 * length) / 3 / RV);
    expect(found.slenderness).toBeCloseTo(byHand, 2);
  });

  it('takes the free direction of a hold that follows no axis', () => {
    // Held at 30° from the shorter leg all along: free at 120°.
    const found = rule(6000, { at: 2000, hold: 30 }, { at: 4000, hold: 30 });
    const expected = Math.max(6000 / radiusAlong(angle, 120), 2000 / RV);
    expect(found.slenderness).toBeCloseTo(expected, 6);
  });
});

describe('directions that are nearly one', () => {
  const any = fc.double({ min: 0, max: 180, noNaN: true, maxExcluded: true });
  const near = fc.integer({ min: 0, max: 179 });
  const hold: fc.Arbitrary<Hold> = fc.oneof(
    { weight: 4, arbitrary: near },
    { weight: 2, arbitrary: any },
    { weight: 3, arbitrary: fc.constantFrom<Hold>(0, 6, 12, 18, 90, 96, 84) },
    { weight: 1, arbitrary: fc.constantFrom<Hold>('both', null) },
  );

  it('gives the same from either end of the bar', () => {
    fc.assert(
      fc.property(section, barHolding(hold), (angle, stations) => {
        const length = stations.at(-1)?.at ?? 0;
        const reversed = [...stations]
          .reverse()
          .map(({ at, hold: each }) => ({ at: length - at, hold: each }));
        const there = freeDirectionRule(angle, asked(stations)).slenderness;
        const back = freeDirectionRule(angle, asked(reversed)).slenderness;
        expect(back / there).toBeCloseTo(1, 9);
      }),
      runs(2000),
    );
  });

  it('never gives more for a hold added', () => {
    fc.assert(
      fc.property(
        section,
        barHolding(hold),
        fc.integer({ min: 1, max: 19 }),
        hold,
        (angle, stations, share, more) => {
          const length = stations.at(-1)?.at ?? 0;
          const added = bar(length, [...stations.slice(1, -1), { at: (length * share) / 20, hold: more }]);
          const before = freeDirectionRule(angle, asked(stations)).slenderness;
          const after = freeDirectionRule(angle, asked(added)).slenderness;
          expect(after).toBeLessThanOrEqual(before * (1 + ARITHMETIC));
        },
      ),
      runs(4000),
    );
  });

  it('does not take three holds of nearly one direction for holds of every way', () => {
    // 0°, −8° and 8°, each within 10° of the first: the bound by that one direction leaves the whole bar free square to it,
    // over the stiffest of the three radii at best.
    const angle = propertiesOf('70x70x6');
    const found = freeDirectionRule(
      angle,
      asked(
        bar(8000, [
          { at: 2000, hold: 0 },
          { at: 4000, hold: 172 },
          { at: 6000, hold: 8 },
        ]),
      ),
    );
    const stiffest = Math.max(...[90, 82, 98].map((free) => radiusAlong(angle, free)));
    expect(found.slenderness).toBeGreaterThanOrEqual((8000 / stiffest) * (1 - ARITHMETIC));
  });
});
