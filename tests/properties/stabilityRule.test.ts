/** The free-direction rule and its bound for mixed holds against exact loads with the same holds rigid, on random bars. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Held } from '../../core/restraint/model.ts';
import { freeDirectionRule, type RuleResult, type RuleStation } from '../../core/restraint/rule.ts';
import type { SectionProperties } from '../../core/section/model.ts';
import { criticalLoad } from '../../core/stability/criticalLoad.ts';
import { type Hold, PINNED } from '../../core/stability/model.ts';
import { CATALOGUES, propertiesOf } from '../unit/assess/given/catalogues.ts';
import { direction, E } from './given/barProblems.ts';
import { runs } from './given/runs.ts';

const L = 5000;
type Way = number | 'both';
interface Mark {
  readonly at: number;
  readonly way: Way;
}

const held = (way: Way): Held => (way === 'both' ? { ways: 2 } : { ways: 1, direction: direction(way) });

function rule(section: SectionProperties, marks: readonly Mark[]): RuleResult {
  const stations: readonly RuleStation[] = [
    { at: 0, held: { ways: 2 } },
    ...[...marks].sort((a, b) => a.at - b.at).map(({ at, way }) => ({ at, held: held(way) })),
    { at: L, held: { ways: 2 } },
  ];
  return freeDirectionRule(section, stations);
}

function exact(section: SectionProperties, marks: readonly Mark[]): number {
  const holds = marks.flatMap(({ at, way }): Hold[] =>
    (way === 'both' ? [0, 90] : [way]).map((degrees) => ({
      at,
      direction: direction(degrees),
      stiffness: 'rigid',
    })),
  );
  const axial = [{ from: 0, to: L, share: 1 }];
  const { N } = criticalLoad(
    { E, length: L, section, holds, axial, endI: PINNED, endJ: PINNED, twist: null },
    { second: false },
  );
  return Math.PI * Math.sqrt((E * section.area) / (N ?? 0));
}

const section = fc.constantFrom(
  ...[...CATALOGUES.en.angles, ...CATALOGUES.au.angles].map(({ properties }) => properties),
);
/** At places that are all different: two marks at one place hold together, which is another matter. */
const marksOf = (way: fc.Arbitrary<Way>, most = 4): fc.Arbitrary<readonly Mark[]> =>
  fc
    .uniqueArray(fc.integer({ min: 1, max: 49 }), { minLength: 1, maxLength: most })
    .chain((places) =>
      fc.tuple(...places.map((place) => way.map((each): Mark => ({ at: (place * L) / 50, way: each })))),
    );

describe('holds of a single direction', () => {
  // Over all angles shipped, places and directions one hold falls short by up to 4.9 % along a leg, and 5.3 % at an odd angle.
  it.each([
    ['along the shorter leg', [0], 1.05],
    ['along the longer leg', [90], 1.05],
    ['at any angle', [0, 15, 30, 50, 70, 84, 90, 110, 127, 150], 1.055],
  ] as const)('%s put the rule no more than that below the exact slenderness', (_, ways, most) => {
    const one = fc.constantFrom<number>(...ways).chain((way) => marksOf(fc.constant<Way>(way)));
    fc.assert(
      fc.property(section, one, (angle, marks) => {
        const found = rule(angle, marks);
        expect(found.bound).toBeNull();
        expect(exact(angle, marks) / found.slenderness).toBeLessThan(most);
      }),
      runs(400),
    );
  });

  it('put it below by 4.5 % at 0.23 of the length of 150x90x10, and never by more along a leg of that angle', () => {
    // METHODS.md, "The free-direction rule": 0.916 in load, so 1/√0.916 in slenderness.
    const angle = propertiesOf('150x90x10');
    const short = (share: number): number => {
      const marks = [{ at: share * L, way: 90 }];
      return exact(angle, marks) / rule(angle, marks).slenderness;
    };
    expect(short(0.23)).toBeCloseTo(1 / Math.sqrt(0.916), 3);
    for (let k = 2; k <= 98; k++) expect(short(k / 100)).toBeLessThan(1.046);
  });

  it('with some that hold both ways do no worse', () => {
    const some = fc
      .constantFrom<number>(0, 90)
      .chain((way) => marksOf(fc.oneof(fc.constant<Way>(way), fc.constant<Way>('both'))));
    fc.assert(
      fc.property(section, some, (angle, marks) => {
        expect(exact(angle, marks) / rule(angle, marks).slenderness).toBeLessThan(1.05);
      }),
      runs(300),
    );
  });
});

describe('mixed holds', () => {
  const legs = marksOf(fc.constantFrom<Way>(0, 90, 0, 90, 'both'), 5);
  const apart = fc
    .tuple(fc.integer({ min: 0, max: 179 }), fc.integer({ min: 25, max: 155 }))
    .chain(([first, turn]) => marksOf(fc.constantFrom<Way>(first, (first + turn) % 180), 5));

  it.each([
    ['along the legs', legs],
    ['in two directions well apart', apart],
  ] as const)('%s: the bound is not below the exact slenderness', (_, marks) => {
    let mixed = 0;
    fc.assert(
      fc.property(section, marks, (angle, each) => {
        const { bound, slenderness } = rule(angle, each);
        if (!bound) return;
        mixed += 1;
        const real = exact(angle, each);
        expect(real / bound.slenderness).toBeLessThanOrEqual(1 + 1e-9);
        expect(slenderness).toBeGreaterThanOrEqual(bound.slenderness);
      }),
      runs(600),
    );
    expect(mixed).toBeGreaterThan(200);
  });

  it('are bounded but for what the rule for one direction falls short by', () => {
    // Route (a) is that rule with the other holds left out. A second hold that hardly helps leaves its shortfall: here 0.13 %.
    const angle = CATALOGUES.us.angles.find(({ designation }) => designation === 'L3X2X3/16')?.properties;
    if (!angle) throw new Error('L3X2X3/16 is not in the list');
    const marks = [
      { at: 0.5 * L, way: 0 },
      { at: 0.53 * L, way: 90 },
    ];
    const { bound } = rule(angle, marks);
    expect(bound?.route).toBe('a');
    expect(exact(angle, marks) / (bound?.slenderness ?? 0)).toBeLessThan(1.05);
  });
});
