/** Each kind of finding is there when, and only when, its cause is. */
import { describe, expect, it } from 'vitest';
import type { Finding, FindingKind } from '../../../core/findings/model.ts';
import type { Bay, DiagonalSpec, Join, Line, Pattern, Settings } from '../../../core/project/model.ts';
import { newFreeBay, newKneeBay, newRoofBay, newWallBay } from '../../../core/project/newBay.ts';
import { bay, ENDS, free, knee, line, roof, vouched, wall } from '../assess/given/bays.ts';
import { assessed } from '../assess/given/reading.ts';

const KEY = 't1.fall+t1.rise';
const L = Math.sqrt(52_000_000);
// METHODS.md §1, 70 × 70 × 6: r_x = 21.304, r_v = 13.707, r_u = 26.830.
const RX = Math.sqrt(368_840 / 812.69);
const RV = Math.sqrt(152_679 / 812.69);

const found = (
  bays: Bay | readonly Bay[],
  kind: FindingKind,
  settings: Partial<Settings> = {},
): readonly Finding[] => assessed(bays, settings).findings.filter((finding) => finding.kind === kind);
const one = (bays: Bay | readonly Bay[], kind: FindingKind, settings: Partial<Settings> = {}): Finding => {
  const [finding, ...more] = found(bays, kind, settings);
  if (!finding || more.length > 0)
    throw new Error(`${found(bays, kind, settings).length} findings of ${kind}`);
  return finding;
};
const crossed = (join: Join | null = null, rest: Parameters<typeof bay>[1] = {}) =>
  bay(wall(6000, [[4000, 'crossed']]), { joins: join ? { [KEY]: join } : {}, ...rest });
const tier = (pattern: Pattern, diagonals: Partial<DiagonalSpec> = {}, width = 6000) =>
  bay(wall(width, [[4000, pattern]]), { diagonals });

describe('too slender in service', () => {
  it('is found once for bars of one cause, with the figure and the limit', () => {
    const finding = one(crossed({ kind: 'none' }), 'too slender in service');
    expect(finding.bars).toEqual(['B/t1.rise', 'B/t1.fall']);
    expect(finding.value).toBeCloseTo(L / RV, 2);
    expect(finding.limit).toBe(300);
    expect(finding.quantity).toBe('slenderness');
    expect(finding.severity).toBe('must fix');
    expect(finding.breaksLimit).toBe(true);
  });

  it('is not found within the limit, nor at it', () => {
    const at = (length: number) =>
      found(bay(free({ n1: [0, 0, 0], n2: [length, 0, 0] }, [['b1', 'n1', 'n2']])), 'too slender in service')
        .length;
    expect(at(300 * RV - 1)).toBe(0);
    expect(at(300 * RV + 1)).toBe(1);
  });

  it('follows an own limit', () => {
    expect(found(crossed({ kind: 'none' }), 'too slender in service', { ownLimit: 530 })).toEqual([]);
    expect(one(crossed({ kind: 'none' }), 'too slender in service', { ownLimit: 520 }).limit).toBe(520);
  });

  it('takes the limit of compression for a bar counted on in compression too', () => {
    const made = tier('rising', { countedOn: 'both', section: '150x150x15' });
    // 7211 over r_v = 29.3 (SCI P363: 2.93 cm) is 246: within 300, over 200.
    expect(one(made, 'too slender in service').limit).toBe(200);
    expect(found(tier('rising', { section: '150x150x15' }), 'too slender in service')).toEqual([]);
  });

  it('is something to look into where the practice only advises, and breaks the limit all the same', () => {
    const finding = one(crossed({ kind: 'none' }), 'too slender in service', { practice: 'aisc360' });
    expect(finding.severity).toBe('look into');
    expect(finding.breaksLimit).toBe(true);
  });

  it('is told apart for bars that bow otherwise', () => {
    const made = bay(
      wall(6000, [
        [4000, 'crossed'],
        [3000, 'crossed'],
      ]),
      { joins: { [KEY]: { kind: 'bolted' } } },
    );
    const all = found(made, 'too slender in service');
    expect(all.map((finding) => finding.bars)).toEqual([
      ['B/t1.rise', 'B/t1.fall'],
      ['B/t2.rise', 'B/t2.fall'],
    ]);
    expect(all[0]?.value).toBeCloseTo(L / RX, 2);
    expect(all[1]?.value).toBeCloseTo(Math.sqrt(45_000_000) / RV, 2);
  });
});

describe('too slender to handle', () => {
  it('is found for the length as fabricated over the least radius, joined or not, and is a note', () => {
    for (const join of [{ kind: 'none' }, { kind: 'bolted' }] as const) {
      const finding = one(crossed(join), 'too slender to handle');
      expect(finding.value).toBeCloseTo((L - 620) / RV, 2);
      expect(finding.severity).toBe('note');
      expect(finding.breaksLimit).toBe(false);
    }
  });

  it('is not found for a bar short enough', () => {
    // 4112 + 620 is where the steel between its ends is 300 r_v.
    const at = (length: number) =>
      found(bay(free({ n1: [0, 0, 0], n2: [length, 0, 0] }, [['b1', 'n1', 'n2']])), 'too slender to handle')
        .length;
    expect(at(300 * RV + 620 - 1)).toBe(0);
    expect(at(300 * RV + 620 + 1)).toBe(1);
  });

  it('looks at the pieces of a cut bar', () => {
    const finding = one(crossed({ kind: 'cut', cutBar: 't1.fall' }), 'too slender to handle');
    expect(finding.bars).toEqual(['B/t1.rise']);
  });
});

describe('a crossing that is unmarked', () => {
  it('is found between diagonals, one by one, and leads to its place in the file', () => {
    const finding = one(crossed(), 'crossing unmarked');
    expect(finding).toMatchObject({
      severity: 'look into',
      crossing: `B/${KEY}`,
      path: `bays[0].joins.${KEY}`,
      breaksLimit: false,
    });
  });

  it('names a strut as a member, not as a purlin or rail', () => {
    const passed = (role: 'strut' | 'diagonal') =>
      free({ n1: [0, 0, 0], n2: [4000, 0, 4000], n3: [0, 0, 2000], n4: [4000, 0, 2000] }, [
        ['b1', 'n1', 'n2'],
        ['b2', 'n3', 'n4', role],
      ]);
    expect(one(bay(passed('strut')), 'crossing unmarked').title).toBe(
      '1 crossing with struts or other members is unmarked',
    );
    expect(one(bay(passed('diagonal')), 'crossing unmarked').title).toBe('D1 × D2 is unmarked');
  });

  it.each<Join>([{ kind: 'none' }, { kind: 'bolted' }, { kind: 'welded' }])(
    'is not found when marked $kind',
    (join) => {
      expect(found(crossed(join), 'crossing unmarked')).toEqual([]);
    },
  );

  it('is found once for all purlins and rails of a bay, as a note, until the last is marked', () => {
    const made = (joins: Bay['joins']) =>
      bay(wall(6000, [[4000, 'rising']], [line('G1', 1000), line('G2', 2500)]), { joins });
    const finding = one(made({}), 'crossing unmarked');
    expect(finding.severity).toBe('note');
    expect(finding.value).toBe(2);
    expect(one(made({ 'G1+t1.rise': { kind: 'none' } }), 'crossing unmarked').value).toBe(1);
    expect(
      found(made({ 'G1+t1.rise': { kind: 'none' }, 'G2+t1.rise': { kind: 'hung' } }), 'crossing unmarked'),
    ).toEqual([]);
  });
});

describe('a clash', () => {
  it('is found for crossed bars on one side, joined or not, and must be fixed', () => {
    for (const join of [null, { kind: 'bolted' }] as const) {
      const finding = one(crossed(join, { diagonals: { arrangement: 'same side' } }), 'clash');
      expect(finding).toMatchObject({
        severity: 'must fix',
        crossing: `B/${KEY}`,
        bars: ['B/t1.rise', 'B/t1.fall'],
      });
      expect(finding.value).toBeGreaterThan(0);
    }
  });

  it('is not found on opposite faces, nor when one bar is cut', () => {
    expect(found(crossed(), 'clash')).toEqual([]);
    expect(
      found(
        crossed({ kind: 'cut', cutBar: 't1.rise' }, { diagonals: { arrangement: 'same side' } }),
        'clash',
      ),
    ).toEqual([]);
  });
});

describe('bars too far apart to be joined', () => {
  /** Two crossing bars of 70 × 70 × 6 in planes `apart` mm from each other; between their legs a gusset of 10 more. */
  const askew = (apart: number, join: Join | null) =>
    bay(
      free({ a: [0, 0, 0], b: [4000, 0, 4000], c: [4000, apart, 0], d: [0, apart, 4000] }, [
        ['b1', 'a', 'b'],
        ['b2', 'c', 'd'],
      ]),
      { joins: join ? { 'b1+b2': join } : {}, bars: { b1: { side: 'near' }, b2: { side: 'far' } } },
    );
  const lengthAboutV = (made: Bay) => assessed(made).diagonals.get('B/b1')?.restraint?.lanes.v.unbraced;

  // Near is −Y: the legs stand away from each other, so the clear distance is the distance of the planes and the gusset's 10.
  it.each<Join>([
    { kind: 'bolted' },
    { kind: 'welded' },
    { kind: 'packed', packer: null },
    { kind: 'cut', cutBar: 'b2' },
  ])('are found past 60 mm when $kind, and hold each other nowhere', (join) => {
    expect(one(askew(51, join), 'too far apart to join')).toMatchObject({
      severity: 'look into',
      crossing: 'B/b1+b2',
      limit: 60,
      quantity: 'length',
    });
    expect(one(askew(51, join), 'too far apart to join').value).toBeCloseTo(61, 6);
    expect(lengthAboutV(askew(51, join))).toBeCloseTo(Math.sqrt(32_000_000), 6);
  });

  it('are not found up to 60 mm, where the join holds, nor where nothing is joined', () => {
    expect(found(askew(49, { kind: 'bolted' }), 'too far apart to join')).toEqual([]);
    expect(lengthAboutV(askew(49, { kind: 'bolted' }))).toBeCloseTo(Math.sqrt(32_000_000) / 2, 6);
    for (const join of [null, { kind: 'none' }] as const)
      expect(found(askew(300, join), 'too far apart to join')).toEqual([]);
  });
});

describe('entries of the file that name what is not there', () => {
  const KIND = 'names what is not there';
  const rails = (heldBy: Line['heldBy']) => bay(wall(6000, [[4000, 'rising']], [line('G1', 1000, heldBy)]));

  it.each<[string, Bay, string]>([
    ['a bar', crossed(null, { bars: { 't9.rise': { mark: 'X' } } }), 'bays[0].bars.t9.rise'],
    [
      'a bar that is no diagonal',
      crossed(null, { bars: { 't1.beam': { mark: 'X' } } }),
      'bays[0].bars.t1.beam',
    ],
    ['a crossing', crossed(null, { joins: { 'a+b': { kind: 'bolted' } } }), 'bays[0].joins.a+b'],
    ['a bar to be cut', crossed({ kind: 'cut', cutBar: 't2.rise' }), `bays[0].joins.${KEY}.cutBar`],
    ['a join of another kind of crossing', crossed({ kind: 'hung' }), `bays[0].joins.${KEY}`],
    ['a bay', rails({ kind: 'bay', bay: 'Z' }), 'bays[0].recipe.lines[0].heldBy.bay'],
    ['its own bay', rails({ kind: 'bay', bay: 'B' }), 'bays[0].recipe.lines[0].heldBy.bay'],
    ['a crossing with a force', crossed(null, { tensionShares: { 'a+b': 1 } }), 'bays[0].tensionShares.a+b'],
  ])('are noted for %s, with the place', (_what, made, path) => {
    const finding = one(made, KIND);
    expect(finding).toMatchObject({ severity: 'note', breaksLimit: false, path });
    expect(finding.detail).toContain(path);
    expect(finding.detail).toMatch(/take it out, or correct the name\.$/);
  });

  it('are to be looked into for a class of member that the practice does not have', () => {
    expect(one(crossed(), KIND, { memberClass: 'no such' })).toMatchObject({
      severity: 'look into',
      path: 'settings.memberClass',
    });
  });

  it('are told together for one bay, and not where all is there', () => {
    const both = crossed(null, { bars: { x: { mark: 'X' } }, joins: { 'a+b': { kind: 'none' } } });
    expect(one(both, KIND).title).toBe('2 entries of B name what is not there');
    expect(
      found(crossed({ kind: 'cut', cutBar: 't1.rise' }, { bars: { 't1.rise': { mark: 'X' } } }), KIND),
    ).toEqual([]);
    expect(
      found([rails({ kind: 'bay', bay: 'C' }), bay(wall(6000, [[4000, 'crossed']]), { id: 'C' })], KIND),
    ).toEqual([]);
  });
});

describe('a mark given twice', () => {
  const named = (bars: Bay['bars']) => crossed({ kind: 'bolted' }, { bars });

  it('is found where a bar is called as another is by its place, with both bars', () => {
    expect(one(named({ 't1.rise': { mark: 'D2' } }), 'mark given twice')).toMatchObject({
      severity: 'look into',
      bars: ['B/t1.rise', 'B/t1.fall'],
      path: 'bays[0].bars.t1.rise.mark',
    });
  });

  it('is found across bays, and not where all marks differ', () => {
    const bays = ['B', 'C'].map((id) =>
      bay(wall(6000, [[4000, 'rising']]), { id, bars: { 't1.rise': { mark: 'X' } } }),
    );
    expect(one(bays, 'mark given twice').bars).toEqual(['B/t1.rise', 'C/t1.rise']);
    expect(found(named({ 't1.rise': { mark: 'X' } }), 'mark given twice')).toEqual([]);
  });
});

describe('a clash of bars along each other', () => {
  const doubled = (arrangement: 'same side' | 'opposite') =>
    bay(
      free({ n1: [0, 0, 0], n2: [4000, 0, 3000] }, [
        ['b1', 'n1', 'n2'],
        ['b2', 'n1', 'n2'],
      ]),
      { diagonals: { arrangement } },
    );

  it('is found between the same nodes on one side of the gusset, and not on both', () => {
    expect(one(doubled('same side'), 'clash')).toMatchObject({
      severity: 'must fix',
      bars: ['B/b1', 'B/b2'],
      title: 'D1 and D2 lie in one place',
    });
    expect(found(doubled('opposite'), 'clash')).toEqual([]);
  });

  it('is found once for two bays in one place', () => {
    const bays = ['B', 'C'].map((id) => bay(wall(6000, [[4000, 'crossed']]), { id }));
    expect(one(bays, 'clash')).toMatchObject({ title: 'B and C stand in one place', path: 'bays[1].place' });
  });
});

describe('a packer that differs', () => {
  const kinds = (join: Join, gusset = 10) =>
    found(crossed(join, { diagonals: { gusset } }), 'packer differs');

  it('is found where bars a gusset apart are bolted straight through', () => {
    const [finding] = kinds({ kind: 'bolted' });
    expect(finding).toMatchObject({ severity: 'note', value: 10, quantity: 'length' });
    expect(kinds({ kind: 'bolted' }, 2)).toEqual([]);
    expect(kinds({ kind: 'bolted' }, 3)).toHaveLength(1);
  });

  it('is found for a packer more than 2 mm off the gap, not for one that fills it', () => {
    expect(kinds({ kind: 'packed', packer: 15 })[0]).toMatchObject({ value: 15, limit: 10 });
    for (const packer of [5, 7.5, 12.5]) expect(kinds({ kind: 'packed', packer })).toHaveLength(1);
    for (const packer of [null, 8, 10, 12]) expect(kinds({ kind: 'packed', packer })).toEqual([]);
  });
});

describe('a hold without a holder', () => {
  const under = (heldBy: Parameters<typeof line>[2], join: Join = { kind: 'purlin', boltsAcross: 1 }) =>
    bay(roof(6000, 8, [[4000, 'rising']], [line('P1', 1000, heldBy)]), { joins: { 'P1+a.p1.rise': join } });

  it('is a note for a purlin said to be tied to nothing', () => {
    const finding = one(under({ kind: 'nothing' }), 'hold without a holder');
    expect(finding).toMatchObject({ severity: 'note', bars: ['B/a.p1.rise'], crossing: 'B/P1+a.p1.rise' });
  });

  it('is something to look into where a holder is named that does not hold', () => {
    const finding = one(under({ kind: 'bay', bay: 'nowhere' }), 'hold without a holder');
    expect(finding.severity).toBe('look into');
    expect(finding.detail).toContain('nowhere');
  });

  it('is not found for a purlin vouched for, nor for one that the bar only hangs from', () => {
    expect(found(under(vouched), 'hold without a holder')).toEqual([]);
    expect(found(under({ kind: 'nothing' }, { kind: 'hung' }), 'hold without a holder')).toEqual([]);
  });

  it('must be fixed where a partner stands over an open tier; each diagonal is the other’s', () => {
    const made = (patterns: readonly Pattern[]) =>
      bay(
        wall(
          6000,
          patterns.map((pattern) => [3000, pattern] as const),
        ),
        { joins: { 't2.fall+t2.rise': { kind: 'bolted' } } },
      );
    const all = found(made(['open', 'crossed']), 'hold without a holder');
    expect(all.map((finding) => finding.severity)).toEqual(['must fix', 'must fix']);
    expect(all.flatMap((finding) => finding.bars).sort()).toEqual(['B/t2.fall', 'B/t2.rise']);
    expect(found(made(['crossed', 'crossed']), 'hold without a holder')).toEqual([]);
  });

  it('is found for a knee whose far end is free, not for one that is held', () => {
    const made = (loose: readonly string[]) =>
      bay(
        free(
          { n1: [0, 0, 0], n2: [3000, 0, 0], n3: [1500, 0, 0], n4: [1500, 0, 1500] },
          [
            ['b1', 'n1', 'n2'],
            ['k1', 'n3', 'n4', 'knee'],
          ],
          { free: ['n3', ...loose] },
        ),
        { diagonals: { ends: { ...ENDS, setBack: 100 } } },
      );
    expect(one(made(['n4']), 'hold without a holder').bars).toEqual(['B/b1']);
    expect(found(made([]), 'hold without a holder')).toEqual([]);
  });

  it('is found for a member of the framing with an end in the air', () => {
    const made = (loose: readonly string[]) =>
      bay(
        free(
          { n1: [0, 0, 0], n2: [3000, 0, 0], n3: [1500, 0, -1000], n4: [1500, 0, 1000] },
          [
            ['b1', 'n1', 'n2'],
            ['m1', 'n3', 'n4', 'beam'],
          ],
          { free: loose },
        ),
        { joins: { 'b1+m1': { kind: 'purlin', boltsAcross: 1 } } },
      );
    expect(one(made(['n4']), 'hold without a holder')).toMatchObject({
      severity: 'look into',
      bars: ['B/b1'],
    });
    expect(found(made([]), 'hold without a holder')).toEqual([]);
  });
});

describe('tension only', () => {
  it.each(['rising', 'falling'] as const)('with no partner is found in a %s tier', (pattern) => {
    expect(one(tier(pattern), 'no partner')).toMatchObject({ severity: 'look into', breaksLimit: false });
  });

  it('with a partner, or counted on in compression too, is not found', () => {
    expect(found(tier('crossed'), 'no partner')).toEqual([]);
    expect(found(tier('rising', { countedOn: 'both' }), 'no partner')).toEqual([]);
  });

  it('finds no partner in another tier', () => {
    const made = bay(
      wall(6000, [
        [4000, 'rising'],
        [4000, 'falling'],
      ]),
    );
    expect(found(made, 'no partner').map((finding) => finding.bars)).toEqual([['B/t1.rise'], ['B/t2.fall']]);
  });

  it('looks in a bay drawn freely at which way its bars lean', () => {
    const nodes = { n1: [0, 0, 0], n2: [4000, 0, 0], n3: [4000, 0, 4000], n4: [0, 0, 4000] } as const;
    expect(
      found(
        bay(
          free(nodes, [
            ['b1', 'n1', 'n3'],
            ['b2', 'n2', 'n4'],
          ]),
        ),
        'no partner',
      ),
    ).toEqual([]);
    expect(found(bay(free(nodes, [['b1', 'n1', 'n3']])), 'no partner')).toHaveLength(1);
  });

  it.each(['peaked', 'vee'] as const)('in a %s tier pulls on the beam, which must be fixed', (pattern) => {
    expect(one(tier(pattern), 'beam takes the pull')).toMatchObject({
      severity: 'must fix',
      bars: ['B/t1.left', 'B/t1.right'],
    });
    expect(found(tier(pattern), 'no partner')).toEqual([]);
    expect(found(tier(pattern, { countedOn: 'both' }), 'beam takes the pull')).toEqual([]);
  });

  it.each(['crossed', 'rising'] as const)('in a %s tier does not', (pattern) => {
    expect(found(tier(pattern), 'beam takes the pull')).toEqual([]);
  });

  it('is found of knees on one side, unless they are pressed too, and not of pairs', () => {
    const oneSided = knee({ sides: 'one' });
    expect(found(bay(oneSided), 'no partner').map(({ bars }) => bars)).toEqual([
      ['B/k1.knee-a'],
      ['B/k2.knee-a'],
    ]);
    expect(found(bay(oneSided, { diagonals: { countedOn: 'both' } }), 'no partner')).toEqual([]);
    expect(found(bay(knee()), 'no partner')).toEqual([]);
  });

  it('asks nothing of the slope of knees', () => {
    expect(found(bay(knee({ angle: 20 })), 'steep or flat')).toEqual([]);
  });

  it('is found of no bay as it is begun', () => {
    for (const made of [
      newWallBay('B', 'b'),
      newRoofBay('B', 'b'),
      newKneeBay('B', 'b'),
      newFreeBay('B', 'b'),
    ])
      expect(found(made, 'no partner')).toEqual([]);
    expect(newKneeBay('B', 'b').diagonals.countedOn).toBe('both');
  });
});

describe('a steep or flat diagonal', () => {
  it.each([
    // atan(4000/8000) = 26.6°, atan(4000/2000) = 63.4°; atan(4000/6000) = 33.7° and atan(4000/2500) = 58.0° are usual.
    ['flat', 8000, 1],
    ['usual', 6000, 0],
    ['usual', 2500, 0],
    ['steep', 2000, 1],
  ] as const)('is found when it is not between 30° and 60°: %s at a width of %i', (word, width, count) => {
    const all = found(tier('rising', {}, width), 'steep or flat');
    expect(all).toHaveLength(count);
    for (const finding of all) {
      expect(finding.severity).toBe('note');
      expect(finding.title).toContain(word);
      expect(finding.value).toBeCloseTo((Math.atan2(4000, width) * 180) / Math.PI, 6);
      expect(finding.limit).toBe(word === 'flat' ? 30 : 60);
    }
  });
});

describe('sag', () => {
  const level = (length: number, section: string, roll = 0, joins: Bay['joins'] = {}) =>
    bay(
      free({ n1: [0, 0, 0], n2: [length, 0, 0], n3: [length / 2, 0, -2000], n4: [length / 2, 0, 2000] }, [
        ['b1', 'n1', 'n2'],
        ['b2', 'n3', 'n4'],
      ]),
      { bars: { b1: { roll } }, joins, diagonals: { section } },
    );
  const ratio = (made: Bay) => one(made, 'sag', { sagRatio: 5000 }).value ?? Number.NaN;

  it('is 5wL⁴/384EI of a bar that bends about v: practice-facts G4, 100 × 100 × 10 over 6 m sags 17.05 mm', () => {
    // Unrolled, the leg in the plane hangs down from the heel and the other points away, to +Y. Rolled by −45° about the bar, which runs
    // along +X, both legs hang 45° to either side, and the weight bends the bar about v. Tolerance: the last printed digit.
    expect(Math.abs(6000 / ratio(level(6000, '100x100x10', -45)) - 17.05)).toBeLessThanOrEqual(0.01);
    // Rolled the other way the legs point up and down towards +Y, and it bends about u: 17.05 × 0.7301/2.8035.
    expect(6000 / ratio(level(6000, '100x100x10', 45))).toBeCloseTo((17.05 * 0.7301) / 2.8035, 2);
  });

  it('takes 2 Iu Iv/(Iu + Iv) for an equal angle with its legs upright and level', () => {
    // practice-facts G4 and H1: Iu 2.8035e6, Iv 0.7301e6, w 0.1475 N/mm: 5 w L⁴/(384 E I). Tolerance: the four figures of these.
    const I = (2 * 2.8035e6 * 0.7301e6) / (2.8035e6 + 0.7301e6);
    const expected = (5 * 0.1475 * 6000 ** 4) / (384 * 200_000 * I);
    expect(6000 / ratio(level(6000, '100x100x10')) / expected).toBeCloseTo(1, 3);
  });

  it('is about L/246 for a slenderness of 300 over 9 m about the axis of vertical bending', () => {
    // METHODS.md §8: sag/L ≈ 5.0 × 10⁻¹² L λ²; here for 120 × 120 × 10, whose λ about v is not 300 but known.
    const about = 9000 / 23.6; // SCI P363: r_v of 120 × 120 × 10 is 2.36 cm.
    const expected = 1 / (5.0e-12 * 9000 * about ** 2);
    const ratios = [45, -45].map((roll) => ratio(level(9000, '120x120x10', roll)));
    expect(Math.min(...ratios) / expected).toBeCloseTo(1, 1);
    expect(1 / (5.0e-12 * 9000 * 300 ** 2)).toBeCloseTo(247, 0);
  });

  it('of a bar on a slope counts only the weight square to it', () => {
    // Over the same length, and bending about the same axes, cos α of the level one; α = atan(3/4).
    const slope = bay(free({ n1: [0, 0, 0], n2: [4800, 0, 3600] }, [['b1', 'n1', 'n2']]), {
      diagonals: { section: '100x100x10' },
    });
    expect(ratio(slope)).toBeCloseTo(ratio(level(6000, '100x100x10')) / 0.8, 3);
  });

  it('is found below the ratio that the project allows, above it not, and not at all where it does not ask', () => {
    const made = level(6000, '100x100x10', 45);
    const worst = Math.min(ratio(made), ratio(level(6000, '100x100x10', -45)));
    const soft = ratio(made) === worst ? made : level(6000, '100x100x10', -45);
    expect(found(soft, 'sag', { sagRatio: Math.ceil(worst) })).toHaveLength(1);
    expect(found(soft, 'sag', { sagRatio: Math.floor(worst) })).toEqual([]);
    expect(found(soft, 'sag', { sagRatio: null })).toEqual([]);
    expect(one(soft, 'sag', { sagRatio: 400 })).toMatchObject({
      severity: 'look into',
      limit: 400,
      quantity: 'ratio',
      breaksLimit: false,
    });
  });

  it('of a bar held in its upright plane at mid-length is that of the half: an eighth of the ratio', () => {
    const joined = level(6000, '100x100x10', 0, { 'b1+b2': { kind: 'bolted' } });
    // Half the length, a sixteenth of the sag, so eight times the ratio.
    expect(ratio(joined) / ratio(level(6000, '100x100x10'))).toBeCloseTo(8, 6);
  });

  it('is stopped by a hanger, which holds nothing else', () => {
    const recipe = roof(6000, 0, [[4000, 'rising']], [line('P1', 2000)]);
    const at = (join: Join) =>
      one(bay(recipe, { joins: { 'P1+a.p1.rise': join } }), 'sag', { sagRatio: 5000 }).value ?? 0;
    expect(at({ kind: 'hung' }) / at({ kind: 'none' })).toBeCloseTo(8, 6);
  });

  it('of a bar that stands upright is none', () => {
    const made = bay(free({ n1: [0, 0, 0], n2: [0, 0, 9000] }, [['b1', 'n1', 'n2']]));
    expect(found(made, 'sag', { sagRatio: 5000 })).toEqual([]);
  });
});

describe('a section that no list has', () => {
  it('is found once for all bars of it, must be fixed, and names what is near', () => {
    const finding = one(crossed(null, { diagonals: { section: '71x71x6' } }), 'section unknown');
    expect(finding).toMatchObject({
      severity: 'must fix',
      path: 'bays[0].diagonals.section',
      bars: ['B/t1.rise', 'B/t1.fall'],
    });
    expect(finding.detail).toContain('70x70x6');
    expect(found(crossed(null, { diagonals: { section: '71x71x6' } }), 'too slender in service')).toEqual([]);
  });

  it('leads to the mark of the bar where it stands there', () => {
    const finding = one(crossed(null, { bars: { 't1.rise': { section: 'pipe' } } }), 'section unknown');
    expect(finding).toMatchObject({ path: 'bays[0].bars.t1.rise.section', bars: ['B/t1.rise'] });
  });
});

describe('a bar with no length left', () => {
  it('is found when the set-backs take all of it, must be fixed, and the bar is judged no further', () => {
    const made = crossed(null, { diagonals: { ends: { ...ENDS, setBack: 4000 } } });
    const all = found(made, 'no length left');
    expect(all.map((finding) => finding.bars)).toEqual([['B/t1.rise'], ['B/t1.fall']]);
    expect(all[0]?.severity).toBe('must fix');
    expect(assessed(made).diagonals.get('B/t1.rise')).toMatchObject({
      restraint: null,
      inService: null,
      status: 'unknown',
    });
  });

  it('is not found for a bar that has a little', () => {
    expect(
      found(crossed(null, { diagonals: { ends: { ...ENDS, setBack: 3400 } } }), 'no length left'),
    ).toEqual([]);
  });
});

describe('all findings', () => {
  const made = assessed(
    [
      crossed(null, { id: 'A', diagonals: { arrangement: 'same side' } }),
      bay(wall(6000, [[4000, 'peaked']]), { id: 'C', place: { origin: [0, 9000, 0], turn: 0 } }),
      crossed(null, {
        id: 'D',
        place: { origin: [0, 18_000, 0], turn: 0 },
        diagonals: { section: 'none such' },
      }),
    ],
    { sagRatio: 200 },
  );

  it('stand in order: what must be fixed first, and bay by bay within', () => {
    const rank = { 'must fix': 0, 'look into': 1, note: 2 } as const;
    const order = made.findings.map(
      (finding) => rank[finding.severity] * 10 + ['A', 'C', 'D'].indexOf(finding.bay),
    );
    expect(order).toEqual([...order].sort((p, q) => p - q));
    expect(new Set(made.findings.map((finding) => finding.severity)).size).toBe(3);
  });

  it('have ids of their own, and are named by the bars that they name', () => {
    const ids = made.findings.map((finding) => finding.id);
    expect(new Set(ids).size).toBe(ids.length);
    for (const finding of made.findings)
      for (const bar of finding.bars) expect(made.diagonals.get(bar)?.findings).toContain(finding.id);
  });

  it('are counted by severity', () => {
    for (const severity of ['must fix', 'look into', 'note'] as const)
      expect(made.counts[severity]).toBe(
        made.findings.filter((finding) => finding.severity === severity).length,
      );
  });

  it('are none for a bay that is in order', () => {
    // 4000 by 3000, a 3-4-5 panel: 5 m, joined with a packer; 80 × 80 × 8: 2500/15.6 and 5000/24.3 are within 300, 4380/15.6 = 281 to handle.
    const good = bay(wall(4000, [[3000, 'crossed']]), {
      joins: { [KEY]: { kind: 'packed', packer: null } },
      diagonals: { section: '80x80x8' },
    });
    const { findings, breaksLimit } = assessed(good, { sagRatio: 200 });
    expect(findings).toEqual([]);
    expect(breaksLimit).toBe(false);
  });
});

describe('a drawn diagonal that ends where nothing holds', () => {
  const NODES = { a: [0, 0, 0], b: [3000, 0, 0], d: [3000, 0, 3000], e: [5000, 0, 4000] } as const;
  const drawn = (bars: readonly (readonly [string, string, string])[], loose: readonly string[]) =>
    bay(free({ ...NODES }, bars, { free: loose }));

  it('is found, breaks the run, and names the place', () => {
    expect(one(drawn([['b1', 'a', 'd']], ['d']), 'end held by nothing')).toMatchObject({
      severity: 'must fix',
      breaksLimit: true,
      bars: ['B/b1'],
      title: 'D1 ends where nothing holds: node d',
    });
  });

  it('is found of two that lie in one line, and of a chain that leads nowhere', () => {
    expect(
      found(
        bay(
          free(
            { a: [0, 0, 0], m: [1500, 0, 1500], d: [3000, 0, 3000] },
            [
              ['b1', 'a', 'm'],
              ['b2', 'd', 'm'],
            ],
            { free: ['m'] },
          ),
        ),
        'end held by nothing',
      ),
    ).toHaveLength(1);
    expect(
      one(
        drawn(
          [
            ['b1', 'a', 'd'],
            ['b2', 'd', 'e'],
          ],
          ['d', 'e'],
        ),
        'end held by nothing',
      ).bars,
    ).toEqual(['B/b1', 'B/b2']);
  });

  it('is found on a bar that nothing holds either', () => {
    const tee = (loose: readonly string[]) =>
      bay(
        free(
          { a: [0, 0, 0], c: [0, 0, 3000], d: [3000, 0, 3000], m: [1500, 0, 3000] },
          [
            ['beam', 'c', 'd', 'beam'],
            ['b1', 'a', 'm'],
          ],
          { free: ['m', ...loose] },
        ),
      );
    expect(found(tee([]), 'end held by nothing')).toEqual([]);
    expect(one(tee(['c', 'd']), 'end held by nothing').bars).toEqual(['B/b1']);
  });

  it('is not found where two bars from held places meet, at a support, on another bar, or in a bay with a frame of its own', () => {
    expect(
      found(
        drawn(
          [
            ['b1', 'a', 'd'],
            ['b2', 'b', 'd'],
          ],
          ['d'],
        ),
        'end held by nothing',
      ),
    ).toEqual([]);
    expect(found(drawn([['b1', 'a', 'd']], []), 'end held by nothing')).toEqual([]);
    const onBeam = bay(
      free(
        { a: [0, 0, 0], c: [0, 0, 3000], d: [3000, 0, 3000], m: [1500, 0, 3000] },
        [
          ['beam', 'c', 'd'],
          ['b1', 'a', 'm'],
        ],
        { free: ['m'] },
      ),
    );
    expect(found(onBeam, 'end held by nothing')).toEqual([]);
    expect(found(crossed(), 'end held by nothing')).toEqual([]);
  });
});

describe('a drawn diagonal out of the plane of its bay', () => {
  const NODES = {
    a: [0, 0, 0],
    b: [5000, 0, 4000],
    c: [5000, 0, 0],
    d: [0, 0, 4000],
    e: [0, 5000, 4000],
  } as const;
  const drawn = (
    more: readonly (readonly [string, string, string, 'knee'] | readonly [string, string, string])[],
  ) => bay(free({ ...NODES }, [['b1', 'a', 'b'], ['b2', 'c', 'd'], ...more]));

  it('is found, with its true slope, and a knee is let be', () => {
    expect(one(drawn([['b3', 'a', 'e']]), 'out of the plane')).toMatchObject({
      bars: ['B/b3'],
      severity: 'look into',
    });
    // 4000 up over 5000: 38.7°, as usual as the others.
    expect(found(drawn([['b3', 'a', 'e']]), 'steep or flat')).toEqual([]);
    expect(found(drawn([['k1', 'a', 'e', 'knee']]), 'out of the plane')).toEqual([]);
    expect(found(drawn([]), 'out of the plane')).toEqual([]);
  });
});
