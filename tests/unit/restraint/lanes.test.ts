/** The four lanes, what governs, lengths set by hand: worked by hand. */
import { describe, expect, it } from 'vitest';
import type { BarMark, Bay, LengthOverride } from '../../../core/project/model.ts';
import { radiusAlong } from '../../properties/given/bruteRule.ts';
import { bay, ENDS, free, line, roof, vouched, wall } from '../assess/given/bays.ts';
import { propertiesOf } from '../assess/given/catalogues.ts';
import { assessed, restraintIn } from '../assess/given/reading.ts';

const L = Math.sqrt(52_000_000);
const bolted = { 't1.fall+t1.rise': { kind: 'bolted' } } as const;
const RISE = 'B/t1.rise';
const crossed = (mark: BarMark = {}, joins: Bay['joins'] = bolted) =>
  bay(wall(6000, [[4000, 'crossed']]), { joins, bars: { 't1.rise': mark } });
// METHODS.md §1 for 70 × 70 × 6: to six figures, hence four decimals or better in what is divided by them.
const RX = Math.sqrt(368_840 / 812.69);
const RV = Math.sqrt(152_679 / 812.69);
const RU = Math.sqrt(585_000 / 812.69);

describe('the lanes of an equal angle', () => {
  it('not joined run the whole length on every axis', () => {
    const { lanes, governing } = restraintIn(assessed(crossed({}, {})), RISE);
    for (const axis of ['x', 'y', 'u', 'v'] as const) expect(lanes[axis].unbraced).toBeCloseTo(L, 6);
    expect(lanes.x.slenderness).toBeCloseTo(L / RX, 2);
    expect(lanes.y.slenderness).toBeCloseTo(L / RX, 2);
    expect(lanes.u.slenderness).toBeCloseTo(L / RU, 2);
    expect(lanes.v.slenderness).toBeCloseTo(L / RV, 2);
    expect(governing).toMatchObject({ axis: 'v', angle: null, basis: 'span', from: 0 });
    expect(governing.slenderness).toBeCloseTo(L / RV, 2);
  });

  it('joined at mid-length in the plane: x, u and v are cut there, and y, which bows out of the plane, is not', () => {
    // METHODS.md §3: "x (say), u and v are cut at the crossing and the remaining geometric axis runs the full length."
    const { lanes, governing } = restraintIn(assessed(crossed()), RISE);
    for (const axis of ['x', 'u', 'v'] as const) {
      expect(lanes[axis].unbraced).toBeCloseTo(L / 2, 6);
      expect(lanes[axis].pieces).toHaveLength(2);
    }
    expect(lanes.y.unbraced).toBeCloseTo(L, 6);
    expect(lanes.y.pieces).toHaveLength(1);
    expect(governing.axis).toBe('y');
    expect(governing.slenderness).toBeCloseTo(L / RX, 2);
  });

  it('may then reach 300 r_y instead of 300 r_v', () => {
    // The limit of 300 is met up to 300 × 21.30 = 6391 mm; without the join up to 300 × 13.71 = 4112 mm.
    const at = (length: number, joins: Bay['joins']) =>
      restraintIn(
        assessed(
          bay(
            free(
              { n1: [0, 0, 0], n2: [length, 0, 0], n3: [length / 2, 0, -2000], n4: [length / 2, 0, 2000] },
              [
                ['b1', 'n1', 'n2'],
                ['b2', 'n3', 'n4'],
              ],
            ),
            { joins },
          ),
        ),
        'B/b1',
      ).governing.slenderness;
    expect(at(300 * RX - 1, { 'b1+b2': { kind: 'bolted' } })).toBeLessThan(300);
    expect(at(300 * RX + 1, { 'b1+b2': { kind: 'bolted' } })).toBeGreaterThan(300);
    expect(at(300 * RV - 1, {})).toBeLessThan(300);
    expect(at(300 * RV + 1, {})).toBeGreaterThan(300);
  });

  it('give a reason for every cut and for every place where there is none', () => {
    const { lanes } = restraintIn(assessed(crossed()), RISE);
    expect(lanes.x.cuts).toHaveLength(1);
    expect(lanes.x.cuts[0]).toMatchObject({ stops: true, claim: { direction: 'in plane', counted: true } });
    expect(lanes.y.cuts[0]).toMatchObject({
      stops: false,
      claim: { direction: 'out of plane', counted: false },
    });
  });

  it('pieces add up to the bar, in order', () => {
    const made = bay(
      roof(6000, 8, [[4000, 'rising']], [line('P1', 1000, vouched), line('P2', 3000, vouched)]),
      {
        joins: {
          'P1+a.p1.rise': { kind: 'purlin', boltsAcross: 1 },
          'P2+a.p1.rise': { kind: 'purlin', boltsAcross: 1 },
        },
      },
    );
    for (const lane of Object.values(restraintIn(assessed(made), 'B/a.p1.rise').lanes)) {
      expect(lane.pieces.map((piece) => piece.to - piece.from)).toEqual([
        expect.closeTo(L / 4, 6),
        expect.closeTo(L / 2, 6),
        expect.closeTo(L / 4, 6),
      ]);
      expect(lane.unbraced).toBeCloseTo(L / 2, 6);
    }
  });
});

describe('an unequal angle, 125 × 75 × 8 over 9 m, held in the plane at mid-length', () => {
  const nineMetres = (legInPlane: 'longer' | 'shorter') =>
    restraintIn(
      assessed(
        bay(
          free({ n1: [0, 0, 0], n2: [9000, 0, 0], n3: [4500, 0, -3000], n4: [4500, 0, 3000] }, [
            ['b1', 'n1', 'n2'],
            ['b2', 'n3', 'n4'],
          ]),
          { joins: { 'b1+b2': { kind: 'bolted' } }, diagonals: { section: '125x75x8', legInPlane } },
        ),
      ),
      'B/b1',
    );

  // METHODS.md §2: "431 with the long leg in the plane (L/r_y), 276 with it standing out ((L/2)/r_v)"; radii 2.09 and 1.63 cm as in
  // SCI P363, printed to 0.01 cm: 9000/20.95 to 9000/20.85, and 4500/16.35 to 4500/16.25.
  it('bows about y over the whole with the longer leg in the plane: about 431', () => {
    const { governing } = nineMetres('longer');
    expect(governing.axis).toBe('y');
    expect(governing.length).toBeCloseTo(9000, 6);
    expect(governing.slenderness).toBeGreaterThan(9000 / 20.95);
    expect(governing.slenderness).toBeLessThan(9000 / 20.85);
  });

  it('bows about v over the half with the shorter leg in the plane: about 276', () => {
    const { governing } = nineMetres('shorter');
    expect(governing.axis).toBe('v');
    expect(governing.length).toBeCloseTo(4500, 6);
    expect(governing.slenderness).toBeGreaterThan(4500 / 16.35);
    expect(governing.slenderness).toBeLessThan(4500 / 16.25);
  });
});

describe('a rolled bar', () => {
  const P = propertiesOf('125x75x8');
  const rolled = (roll: number) => {
    const made = crossed({ roll });
    return restraintIn(assessed({ ...made, diagonals: { ...made.diagonals, section: '125x75x8' } }), RISE);
  };

  it('has all four lanes cut at the crossing, and still bows over its whole length in a direction that is none of theirs', () => {
    const { lanes, governing } = rolled(40);
    for (const axis of ['x', 'y', 'u', 'v'] as const) expect(lanes[axis].unbraced).toBeCloseTo(L / 2, 6);
    expect(governing.axis).toBe('free');
    expect(governing.length).toBeCloseTo(L, 6);
    // Rolled by 40° the hold in the plane lies 40° beyond the longer leg, at 130° from the shorter, so the bar is free at 40° (or 220°)
    // and bends about the axis square to that: 130°, which is −50°.
    expect(governing.slenderness).toBeCloseTo(L / radiusAlong(P, 40), 6);
    expect(governing.angle).toBeCloseTo(-50, 6);
  });

  it('by 90° is as with the other leg in the plane: free along the longer leg over the whole, and about v over the half', () => {
    const { governing, spans } = rolled(90);
    const whole = spans.find((span) => span.to - span.from > L - 1);
    expect(whole?.radius).toBeCloseTo(P.rx, 6);
    // L/2 over r_v, 3606/16.3 = 221, is more than L over r_x, 7211/40 = 180.
    expect(governing).toMatchObject({ axis: 'v', angle: null });
    expect(governing.slenderness).toBeCloseTo(L / 2 / P.rv, 6);
  });

  it('by a whole turn is as it was', () => {
    expect(rolled(360).governing.slenderness).toBeCloseTo(rolled(0).governing.slenderness, 6);
  });
});

describe('mixed holds', () => {
  it('of a roof, a partner in the plane and free purlins out of it, take the bound and say so', () => {
    // Crossing at L/2 in the plane; P1 and P3 at L/4 and 3L/4, out of it. Spans alone: L/2 with one direction inside, over r_x,
    // twice; 3L/4 has two. (b): the longest gap of either direction is L/2, over r_v; (a) is L over r_x or L/2 over r_v at the least.
    const made = bay(roof(6000, 8, [[4000, 'crossed']], [line('P1', 1000), line('P3', 3000)]), {
      joins: {
        'a.p1.fall+a.p1.rise': { kind: 'bolted' },
        'P1+a.p1.rise': { kind: 'purlin', boltsAcross: 1 },
        'P3+a.p1.rise': { kind: 'purlin', boltsAcross: 1 },
      },
    });
    const { governing, bound, spans } = restraintIn(assessed(made), 'B/a.p1.rise');
    expect(bound?.slenderness).toBeCloseTo(L / 2 / RV, 2);
    expect(bound?.route).toBe('b');
    // From P1 to P3 the crossing lies between: L/2 over r_x. Next to each other: L/4 over r_v, which is more: 131.5 against 169.2, the latter.
    expect(Math.max(...spans.map((span) => span.slenderness))).toBeCloseTo(L / 2 / RX, 2);
    expect(governing.basis).toBe('mixed bound');
    expect(governing.slenderness).toBeCloseTo(L / 2 / RV, 2);
  });
});

describe('lengths between connections', () => {
  it('run from the centre of one group of bolts to that of the other', () => {
    // 350 to the nearest bolt, two at 60: the centre is 380 from the set-out point.
    const { lanes, stations } = restraintIn(assessed(crossed(), { lengthBasis: 'connections' }), RISE);
    expect(stations[0]?.at).toBeCloseTo(380, 6);
    expect(stations.at(-1)?.at).toBeCloseTo(L - 380, 6);
    expect(lanes.y.unbraced).toBeCloseTo(L - 760, 6);
    expect(lanes.x.unbraced).toBeCloseTo(L / 2 - 380, 6);
  });

  it('run from the middle of a weld', () => {
    const ends = { ...ENDS, kind: 'welded', setBack: 150, weldLength: 120 } as const;
    const { lanes } = restraintIn(
      assessed(crossed({ endI: ends, endJ: ends }), { lengthBasis: 'connections' }),
      RISE,
    );
    expect(lanes.y.unbraced).toBeCloseTo(L - 420, 6);
  });

  it('leave out a mark that lies within the connection', () => {
    // A rail 100 up is 180 along the bar: inside the 380.
    const made = bay(wall(6000, [[4000, 'rising']], [line('G1', 100, vouched)]), {
      joins: { 'G1+t1.rise': { kind: 'purlin', boltsAcross: 1 } },
    });
    expect(restraintIn(assessed(made, { lengthBasis: 'connections' }), RISE).stations).toHaveLength(2);
    expect(restraintIn(assessed(made), RISE).stations).toHaveLength(3);
  });
});

describe('a length set by hand', () => {
  const override = (change: Partial<LengthOverride> = {}): LengthOverride => ({
    axis: 'y',
    length: null,
    factor: 1,
    reason: 'measured on site',
    ...change,
  });
  const withOverrides = (...overrides: readonly LengthOverride[]) => assessed(crossed({ overrides }));

  it('stands in for the length found, which stays in sight', () => {
    const { lanes } = restraintIn(withOverrides(override({ length: 3000 })), RISE);
    expect(lanes.y.unbraced).toBe(3000);
    expect(lanes.y.found).toBeCloseTo(L, 6);
    expect(lanes.y.slenderness).toBeCloseTo(3000 / RX, 2);
    expect(lanes.y.override?.reason).toBe('measured on site');
    for (const axis of ['x', 'u', 'v'] as const) expect(lanes[axis].override).toBeNull();
  });

  it('as a factor multiplies the length found; as both, the length given', () => {
    expect(restraintIn(withOverrides(override({ factor: 0.8 })), RISE).lanes.y.unbraced).toBeCloseTo(
      0.8 * L,
      6,
    );
    expect(
      restraintIn(withOverrides(override({ factor: 0.5, length: 5000 })), RISE).lanes.y.unbraced,
    ).toBeCloseTo(2500, 6);
  });

  it('governs when it is the largest, and not when another axis is', () => {
    const large = restraintIn(withOverrides(override({ length: 9000 })), RISE).governing;
    expect(large).toMatchObject({ axis: 'y', basis: 'override', length: 9000 });
    // With y at 1 m, v over the half, L/2 over r_v, is the largest of the rest.
    const small = restraintIn(withOverrides(override({ length: 1000 })), RISE).governing;
    expect(small.axis).toBe('v');
    expect(small.slenderness).toBeCloseTo(L / 2 / RV, 2);
  });

  it('about v of a bar that is joined nowhere does not hide that it bows about the others', () => {
    // Half a length about v: 3606/13.71 = 263, within 300; all of it about y: 7211/21.30 = 338, and not.
    const made = assessed(crossed({ overrides: [override({ axis: 'v', length: L / 2 })] }, {}));
    const { governing } = restraintIn(made, RISE);
    expect(governing.slenderness).toBeCloseTo(L / RX, 2);
    expect(made.diagonals.get(RISE)?.inService?.ok).toBe(false);
  });

  it('shows in the schedule and as a finding, with its reason', () => {
    const made = withOverrides(override({ length: 3000, factor: 0.9 }));
    const row = made.schedule.find((each) => each.bar === RISE);
    expect(row?.overrides).toEqual([{ axis: 'y', length: 3000, factor: 0.9, reason: 'measured on site' }]);
    expect(row?.unbraced?.y).toBeCloseTo(2700, 6);
    const finding = made.findings.find((each) => each.kind === 'override in force');
    expect(finding?.detail).toContain('measured on site');
    expect(finding?.bars).toEqual([RISE]);
  });
});
