/** Choosing an angle: tried in place, ranked by mass, and why each lighter one fails. */
import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import type { OwnAngle } from '../../../core/catalogue/model.ts';
import { applyEdit } from '../../../core/project/applyEdit.ts';
import type { Bay, Join, Project, Settings } from '../../../core/project/model.ts';
import type { Candidate, Shortlist, ShortlistOptions } from '../../../core/shortlist/model.ts';
import { shortlist } from '../../../core/shortlist/shortlist.ts';
import { bay, ENDS, free, project, wall } from '../assess/given/bays.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';

const AS_PLACED: ShortlistOptions = { placements: 'as placed' };
const BOTH: ShortlistOptions = { placements: 'both' };

function listFor(made: Project, bars: readonly string[], options: ShortlistOptions = AS_PLACED): Shortlist {
  return shortlist(assess(made, CATALOGUES, 'by the marks'), CATALOGUES, bars, options);
}

/** A tie of a length, crossed at its middle by another. */
const tie = (length: number, join: Join = { kind: 'none' }, rest: Parameters<typeof bay>[1] = {}): Bay =>
  bay(
    free({ n1: [0, 0, 0], n2: [length, 0, 0], n3: [length / 2, 0, -2000], n4: [length / 2, 0, 2000] }, [
      ['b1', 'n1', 'n2'],
      ['b2', 'n3', 'n4'],
    ]),
    { joins: { 'b1+b2': join }, ...rest },
  );
const of = (made: Bay, settings: Partial<Settings> = {}) => project([made], settings);
const named = (list: Shortlist, designation: string): Candidate => {
  const candidate = list.candidates.find((each) => each.designation === designation);
  if (!candidate) throw new Error(`${designation} is not on the list`);
  return candidate;
};

describe('the trade’s own fact: 4 m, a limit of 300, nothing held at mid-length (common practice)', () => {
  // Bolts M12, which fit a leg of 45 and more: bolts shall not decide here.
  const ends = { ...ENDS, boltDiameter: 12 };
  const made = of(tie(4000, { kind: 'none' }, { diagonals: { section: '50x50x5', ends } }));
  const list = listFor(made, ['B/b1']);

  it('needs a radius of 13.3 mm about v', () => {
    expect(list.neededRadius.v).toBeCloseTo(4000 / 300, 9);
    expect(list.neededRadius.v).toBeCloseTo(13.3, 1);
    expect(list.limit).toBe(300);
  });

  it('picks 70 × 70 × 6 from the European list, of the equal angles', () => {
    const equal = list.candidates.filter((candidate) => candidate.kind === 'equal' && candidate.passes);
    expect(equal[0]?.designation).toBe('70x70x6');
    // r_v 13.7 mm: 4000/13.7 = 292. Half the last digit: 13.65 to 13.75.
    expect(equal[0]?.slenderness).toBeGreaterThan(4000 / 13.75);
    expect(equal[0]?.slenderness).toBeLessThan(4000 / 13.65);
    expect(equal[0]?.axis).toBe('v');
  });

  it('finds no lighter angle of any kind that passes: its pick is 70 × 70 × 6', () => {
    expect(list.first?.designation).toBe('70x70x6');
  });

  it('says of each lighter one why it fails', () => {
    const lighter = list.candidates.filter((candidate) => candidate.massPerMetre < 6.38);
    expect(lighter.length).toBeGreaterThan(5);
    for (const candidate of lighter) {
      expect(candidate.passes, candidate.designation).toBe(false);
      // The bar, the division, and the limit.
      expect(candidate.why, candidate.designation).toMatch(/^D1 .*4000 \/ \d+\.\d = \d+(\.\d)?, over 300$/);
      expect(4000 / candidate.slenderness, candidate.designation).toBeLessThan(4000 / 300);
    }
  });
});

describe('the list', () => {
  const list = listFor(of(tie(6000)), ['B/b1']);

  it('ranks by mass, and by slenderness where the mass is the same', () => {
    list.candidates.slice(1).forEach((candidate, k) => {
      const before = list.candidates[k];
      if (!before) return;
      expect(candidate.massPerMetre).toBeGreaterThanOrEqual(before.massPerMetre);
      if (candidate.massPerMetre === before.massPerMetre)
        expect(candidate.slenderness).toBeGreaterThanOrEqual(before.slenderness);
    });
  });

  it('tries every angle of the chosen catalogue once as placed', () => {
    expect(list.candidates).toHaveLength(CATALOGUES.en.angles.length);
    expect(new Set(list.candidates.map((candidate) => candidate.designation)).size).toBe(
      CATALOGUES.en.angles.length,
    );
  });

  it('tries the unequal ones with either leg in the plane when asked, and the equal ones once', () => {
    const both = listFor(of(tie(6000)), ['B/b1'], BOTH);
    const unequal = CATALOGUES.en.angles.filter((angle) => angle.kind === 'unequal').length;
    expect(both.candidates).toHaveLength(CATALOGUES.en.angles.length + unequal);
  });

  it('marks the present one, with its leg as it lies', () => {
    expect(
      list.candidates.filter((candidate) => candidate.isPresent).map((candidate) => candidate.designation),
    ).toEqual(['70x70x6']);
    const unequal = of(
      tie(6000, { kind: 'none' }, { diagonals: { section: '125x75x8', legInPlane: 'shorter' } }),
    );
    const present = listFor(unequal, ['B/b1'], BOTH).candidates.filter((candidate) => candidate.isPresent);
    expect(present).toMatchObject([{ designation: '125x75x8', legInPlane: 'shorter' }]);
  });

  it('has as its first the lightest that passes and takes the bolts', () => {
    const first = list.candidates.find((candidate) => candidate.passes && candidate.fit === null);
    expect(list.first).toBe(first);
    expect(list.passing).toBe(list.candidates.filter((candidate) => candidate.passes).length);
  });

  it('is of the US list where the project’s is', () => {
    const us = listFor(of(tie(6000), { catalogue: 'us' }), ['B/b1']);
    expect(us.candidates).toHaveLength(CATALOGUES.us.angles.length);
    expect(us.candidates[0]?.designation).toMatch(/^L/);
  });

  it('is empty, with no limit, for bars that are not there', () => {
    const none = listFor(of(tie(6000)), ['B/ghost', 'no/such']);
    expect(none).toMatchObject({ bars: [], candidates: [], first: null, passing: 0, limit: 0 });
  });

  it('can be had for a bar whose present section is unknown', () => {
    const unknown = listFor(of(tie(6000, { kind: 'none' }, { diagonals: { section: 'pipe' } })), ['B/b1']);
    expect(unknown.first).not.toBeNull();
    // The radius wanted does not depend on a section that is not there: nothing is held between, so all axes want 6000/300.
    for (const axis of ['x', 'y', 'u', 'v'] as const) expect(unknown.neededRadius[axis]).toBeCloseTo(20, 9);
  });
});

describe('in place', () => {
  it('each angle is judged as `assess` would judge it', () => {
    for (const [join, roll] of [
      [{ kind: 'none' }, 0],
      [{ kind: 'bolted' }, 0],
      [{ kind: 'bolted' }, 30],
    ] as const) {
      const made = of(tie(7000, join, { bars: { b1: { roll } } }));
      for (const candidate of listFor(made, ['B/b1'], BOTH).candidates) {
        const chosen = applyEdit(made, {
          kind: 'bars',
          bars: ['B/b1'],
          change: { section: candidate.designation, legInPlane: candidate.legInPlane },
        });
        const diagonal = assess(chosen, CATALOGUES, 'by the marks').diagonals.get('B/b1');
        expect(candidate.slenderness, candidate.designation).toBeCloseTo(
          diagonal?.inService?.slenderness ?? 0,
          6,
        );
        expect(candidate.handling, candidate.designation).toBeCloseTo(
          diagonal?.handling?.slenderness ?? 0,
          6,
        );
        expect(candidate.passes, candidate.designation).toBe(diagonal?.inService?.ok);
        for (const axis of ['x', 'y', 'u', 'v'] as const)
          expect(candidate.bySlenderness[axis]).toBeCloseTo(
            diagonal?.restraint?.lanes[axis].slenderness ?? 0,
            6,
          );
      }
    }
  });

  it('an unequal angle held in the plane does better with its shorter leg there: 431 and 276 for 125 × 75 × 8 over 9 m', () => {
    // METHODS.md §2.
    const list = listFor(of(tie(9000, { kind: 'bolted' })), ['B/b1'], BOTH);
    const placed = list.candidates.filter((candidate) => candidate.designation === '125x75x8');
    const by = Object.fromEntries(placed.map((candidate) => [candidate.legInPlane, candidate]));
    expect(by.longer?.slenderness).toBeCloseTo(431, -1);
    expect(by.longer?.axis).toBe('y');
    expect(by.shorter?.slenderness).toBeCloseTo(276, -1);
    expect(by.shorter?.axis).toBe('v');
    expect(by.longer?.passes).toBe(false);
    expect(by.shorter?.passes).toBe(true);
  });

  it('joined in the plane at mid-length, half the radius is needed about v, and all of it about y', () => {
    const { neededRadius } = listFor(of(tie(6000, { kind: 'bolted' })), ['B/b1']);
    expect(neededRadius.v).toBeCloseTo(10, 9);
    expect(neededRadius.x).toBeCloseTo(10, 9);
    expect(neededRadius.y).toBeCloseTo(20, 9);
  });

  it('takes the limit of compression for a bar counted on in compression too', () => {
    const list = listFor(of(tie(6000, { kind: 'none' }, { diagonals: { countedOn: 'both' } })), ['B/b1']);
    expect(list.limit).toBe(200);
    expect(list.neededRadius.v).toBeCloseTo(30, 9);
  });
});

describe('a group that shares a size', () => {
  const made = of(
    bay(
      wall(6000, [
        [4000, 'rising'],
        [2500, 'rising'],
      ]),
      { bars: { 't2.rise': { countedOn: 'both' } } },
    ),
  );
  const group = ['B/t1.rise', 'B/t2.rise'];
  const list = listFor(made, group);

  it('is led by its worst bar, by slenderness over its own limit', () => {
    // 7211 over 300 is 24.04; 6500 over 200, for compression, is 32.5: the shorter bar asks for more.
    expect(list.bars).toEqual(group);
    expect(list.neededRadius.v).toBeCloseTo(32.5, 9);
    // In whatever order they are named.
    expect(listFor(made, [...group].reverse()).neededRadius.v).toBeCloseTo(32.5, 9);
    for (const candidate of list.candidates) expect(candidate.bar).toBe('B/t2.rise');
    expect(named(list, '150x150x15').limit).toBe(200);
  });

  it('passes what every bar of it passes', () => {
    const alone = group.map((bar) => listFor(made, [bar]));
    for (const candidate of list.candidates)
      expect(candidate.passes, candidate.designation).toBe(
        alone.every((each) => named(each, candidate.designation).passes),
      );
  });

  it('leaves out bars that are not there, and goes on with the rest', () => {
    expect(listFor(made, ['B/ghost', 'B/t1.rise']).bars).toEqual(['B/t1.rise']);
  });

  it('takes the bolts of every bar, not of the worst alone', () => {
    // M24 in the shorter bar, which is not the worst: the leg must take them all the same (back marks of practice-facts H2: 80 takes M20).
    const bolted = of(
      bay(
        wall(6000, [
          [4000, 'rising'],
          [2500, 'rising'],
        ]),
        { bars: { 't2.rise': { endI: { boltDiameter: 24 } } } },
      ),
    );
    const found = listFor(bolted, group);
    const candidate = named(found, '80x80x8');
    expect(candidate.bar).toBe('B/t1.rise');
    expect(candidate.fit).not.toBeNull();
    expect(found.first?.fit).toBeNull();
  });
});

describe('bolts', () => {
  it('that are too large for the leg rule an angle out as first, with the reason, though it is slender enough', () => {
    // A leg of 45 takes M12 at most, of 60 M16, of 65 to 80 M20 (practice-facts H2).
    const list = listFor(
      of(tie(3000, { kind: 'none' }, { diagonals: { ends: { ...ENDS, boltDiameter: 20 } } })),
      ['B/b1'],
    );
    const small = named(list, '60x60x5');
    expect(small.passes).toBe(true);
    expect(small.fit).toContain('20');
    expect(small.why).toBe(small.fit);
    expect(named(list, '70x70x6').fit).toBeNull();
    expect(list.first?.designation).not.toBe('60x60x5');
  });

  it('do not matter to welded ends', () => {
    const ends = { ...ENDS, kind: 'welded', boltDiameter: 36, setBack: 100, weldLength: 100 } as const;
    const list = listFor(of(tie(3000, { kind: 'none' }, { diagonals: { ends } })), ['B/b1']);
    for (const candidate of list.candidates) expect(candidate.fit).toBeNull();
  });
});

describe('the user’s own stock', () => {
  // 64 × 64 × 5, radii as usual: r_v about 0.196 of the leg, 12.5 mm; 4.9 kg/m, lighter than 70 × 70 × 6.
  const own: OwnAngle = {
    designation: 'shop 64',
    longLeg: 64,
    shortLeg: 64,
    thickness: 5,
    rootRadius: 8,
    toeRadius: 4,
  };
  const withOwn = (rows: readonly OwnAngle[], length: number): Project => ({
    ...of(tie(length)),
    ownStock: rows,
  });

  it('is tried beside the catalogue', () => {
    const list = listFor(withOwn([own], 3600), ['B/b1']);
    expect(list.candidates).toHaveLength(CATALOGUES.en.angles.length + 1);
    expect(named(list, 'shop 64').passes).toBe(true);
  });

  it('stands in for a catalogue angle of the same designation, since that is what choosing it would give', () => {
    const thin: OwnAngle = { ...own, designation: '70x70x6', longLeg: 70, shortLeg: 70, thickness: 4 };
    const made = withOwn([thin], 4000);
    const list = listFor(made, ['B/b1']);
    const same = list.candidates.filter((candidate) => candidate.designation === '70x70x6');
    expect(same).toHaveLength(1);
    const chosen = assess(made, CATALOGUES, 'by the marks').diagonals.get('B/b1');
    expect(same[0]?.slenderness).toBeCloseTo(chosen?.inService?.slenderness ?? 0, 6);
  });
});
