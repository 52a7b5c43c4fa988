/** What the shop cuts: lengths, holes, pieces, mass, hand, packers and clashes. Lengths mm, masses kg. */
import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import { layOut } from '../../../core/layout/layOut.ts';
import type { Layout } from '../../../core/layout/model.ts';
import type { Bay, EndConnection } from '../../../core/project/model.ts';
import { bay, DIAGONALS, ENDS, line, project, roof, wall } from '../assess/given/bays.ts';
import { CATALOGUES, stock } from '../assess/given/catalogues.ts';
import { expectNear } from '../assess/given/near.ts';

const layoutOf = (made: Bay): Layout => layOut(project([made]), stock());
const crossed = (rest: Parameters<typeof bay>[1] = {}, recipe = wall(6000, [[4000, 'crossed']])) =>
  bay(recipe, rest);
const KEY = 't1.fall+t1.rise';
const L = Math.sqrt(52_000_000);
const withEnds = (ends: Partial<EndConnection>) => ({ diagonals: { ends: { ...ENDS, ...ends } } });

describe('cut lengths', () => {
  const cutOf = (made: Bay, id = 'B/t1.rise') => layoutOf(made).bars.get(id)?.angle?.cut;

  it('leave at each end the set-back less the end distance: 350 − 40', () => {
    const cut = cutOf(crossed());
    expectNear(cut?.startsAt, 310);
    expectNear(cut?.endsBefore, 310);
    expectNear(cut?.total, L - 620);
    expect(cut?.pieces).toHaveLength(1);
    expect(cut?.holes).toEqual([]);
  });

  it('go past the set-out point where the end distance is more than the set-back', () => {
    expectNear(cutOf(crossed(withEnds({ setBack: 10 })))?.total, L + 60);
  });

  it('of a welded end begin at its set-back', () => {
    expectNear(cutOf(crossed(withEnds({ kind: 'welded', setBack: 150, weldLength: 120 })))?.total, L - 300);
  });

  it('follow the marks of one end alone', () => {
    const cut = cutOf(crossed({ bars: { 't1.rise': { endI: { setBack: 200 } } } }));
    expectNear(cut?.startsAt, 160);
    expectNear(cut?.endsBefore, 310);
    expectNear(cut?.total, L - 470);
  });

  it('come out at nothing, and never below, when the ends take more than there is', () => {
    const cut = cutOf(crossed(withEnds({ setBack: 5000 })));
    expect(cut?.total).toBeLessThanOrEqual(0);
    expect(
      layoutOf(crossed(withEnds({ setBack: 5000 }))).bars.get('B/t1.rise')?.angle?.mass,
    ).toBeLessThanOrEqual(0);
  });
});

describe('holes for a crossing', () => {
  const holesOf = (made: Bay, id: string) => layoutOf(made).bars.get(id)?.angle?.cut.holes;

  it.each(['bolted', 'packed'] as const)('are measured from the end of the steel when %s', (kind) => {
    const join = kind === 'packed' ? { kind, packer: null } : { kind };
    for (const id of ['B/t1.rise', 'B/t1.fall']) {
      const holes = holesOf(crossed({ joins: { [KEY]: join } }), id);
      expect(holes).toHaveLength(1);
      expectNear(holes?.[0]?.fromEndA, L / 2 - 310);
    }
  });

  it('are in the bar that runs through only, when the other is cut and plated', () => {
    const made = crossed({ joins: { [KEY]: { kind: 'cut', cutBar: 't1.fall' } } });
    expect(holesOf(made, 'B/t1.rise')).toHaveLength(1);
    expect(holesOf(made, 'B/t1.fall')).toEqual([]);
  });

  it.each(['none', 'welded'] as const)('are not drilled when %s', (kind) => {
    expect(holesOf(crossed({ joins: { [KEY]: { kind } } }), 'B/t1.rise')).toEqual([]);
  });

  it('are drilled for purlins that are bolted to, in order from end A, and not for those that it hangs from', () => {
    const recipe = roof(6000, 8, [[4000, 'rising']], [line('P3', 3000), line('P1', 1000), line('P2', 2000)]);
    const made = bay(recipe, {
      joins: {
        'P3+a.p1.rise': { kind: 'purlin', boltsAcross: 1 },
        'P1+a.p1.rise': { kind: 'purlin', boltsAcross: 2 },
        'P2+a.p1.rise': { kind: 'hung' },
      },
    });
    const holes = holesOf(made, 'B/a.p1.rise') ?? [];
    expect(holes.map((hole) => hole.crossing)).toEqual(['B/P1+a.p1.rise', 'B/P3+a.p1.rise']);
    expectNear(holes[0]?.fromEndA, L / 4 - 310);
    expectNear(holes[1]?.fromEndA, (3 * L) / 4 - 310);
  });
});

describe('a bar that is cut and plated', () => {
  const made = crossed({
    diagonals: { arrangement: 'same side' },
    joins: { [KEY]: { kind: 'cut', cutBar: 't1.fall' } },
  });
  const layout = layoutOf(made);
  const cut = layout.bars.get('B/t1.fall')?.angle?.cut;

  it('comes in two pieces that begin and end where the whole bar would', () => {
    expect(cut?.pieces).toHaveLength(2);
    expectNear(cut?.pieces[0]?.from, 310);
    expectNear(cut?.pieces[1]?.to, L - 310);
    const [first, second] = cut?.pieces ?? [];
    expectNear(cut?.total, (first?.to ?? 0) - (first?.from ?? 0) + (second?.to ?? 0) - (second?.from ?? 0));
  });

  it('clears the bar that runs through with the corners of its square-cut ends, by 10 mm, measured across that bar', () => {
    // Legs of 70 with the bolts 40 from the heel reach 40 to one side of the set-out line and 30 to the other. Bars cross at
    // θ = 67.38°. A corner that lies v off the line of the cut bar, s from the crossing, is |s| sin θ ± v cos θ off the through
    // bar's line. The heel is up on both, so above it is the toe corner (v = 30) against the heel (40), below the heel corner
    // (v = 40) against the toe (30).
    const theta = 2 * Math.atan2(4, 6);
    const clear = (s: number, corner: number, edge: number) =>
      s * Math.sin(theta) - corner * Math.cos(theta) - edge;
    const below = L / 2 - (cut?.pieces[0]?.to ?? 0);
    const above = (cut?.pieces[1]?.from ?? 0) - L / 2;
    // "Clear distance from the halves of a cut bar to the bar that runs through": 10, to a rounding.
    expect(clear(above, 30, 40)).toBeGreaterThanOrEqual(10 - 1e-9);
    expect(clear(below, 40, 30)).toBeGreaterThanOrEqual(10 - 1e-9);
    // And no more than it takes: the gap is the same both ways, so one side may have the 10 between heel and toe to spare.
    expect(clear(above, 30, 40)).toBeLessThanOrEqual(20 + 1e-9);
    expect(clear(below, 40, 30)).toBeLessThanOrEqual(20 + 1e-9);
  });

  it('leaves the other bar whole', () => {
    expect(layout.bars.get('B/t1.rise')?.angle?.cut.pieces).toHaveLength(1);
  });

  it('weighs what its pieces weigh', () => {
    // SCI P363: 70 × 70 × 6 weighs 6.38 kg/m.
    expectNear(layout.bars.get('B/t1.fall')?.angle?.mass ?? undefined, (6.38 * (cut?.total ?? 0)) / 1000);
  });

  it('is handled by its longer piece', () => {
    const off = crossed({
      joins: { [KEY]: { kind: 'cut', cutBar: 't1.fall' } },
      bars: { 't1.fall': { endI: { setBack: 900 } } },
    });
    const { diagonals, layout: set } = assess(project([off]), CATALOGUES);
    const pieces = set.bars.get('B/t1.fall')?.angle?.cut.pieces ?? [];
    const [short, long] = pieces.map((piece) => piece.to - piece.from);
    // The set-back of 900 takes 550 more from the first piece than 350 takes from the second.
    expectNear((long ?? 0) - (short ?? 0), 550);
    expectNear(diagonals.get('B/t1.fall')?.handling?.length, long ?? 0);
  });
});

describe('mass', () => {
  it('is the length of steel by the mass a metre of the table', () => {
    expectNear(layoutOf(crossed()).bars.get('B/t1.rise')?.angle?.mass ?? undefined, 6.38 * (L - 620) * 1e-3);
  });

  it('is unknown for a section that is not in stock', () => {
    const angle = layoutOf(crossed({ diagonals: { section: 'pipe 60' } })).bars.get('B/t1.rise')?.angle;
    expect(angle?.stock).toBeNull();
    expect(angle?.mass).toBeNull();
  });
});

describe('the gap at a crossing', () => {
  const crossingOf = (rest: Parameters<typeof bay>[1]) =>
    layoutOf(crossed(rest)).crossings.get(KEY ? `B/${KEY}` : '');

  it('is the gusset when the bars lie on opposite faces of it', () => {
    expectNear(crossingOf({})?.gap, 10);
    expectNear(crossingOf({ diagonals: { gusset: 16 } })?.gap, 16);
    expect(crossingOf({})?.clash).toBe(false);
  });

  it('makes the packer in the schedule, unless the user gives a thickness', () => {
    const packerOf = (packer: number | null) =>
      assess(project([crossed({ joins: { [KEY]: { kind: 'packed', packer } } })]), CATALOGUES).schedule.map(
        (row) => row.packer,
      );
    expect(packerOf(null)).toEqual([10, 10]);
    expect(packerOf(12)).toEqual([12, 12]);
  });

  it('is a clash when both lie on one side, unless one of them is cut', () => {
    const same = crossingOf({ diagonals: { arrangement: 'same side' } });
    expect(same?.clash).toBe(true);
    expect(same?.gap).toBeLessThan(0);
    const bolted = crossingOf({
      diagonals: { arrangement: 'same side' },
      joins: { [KEY]: { kind: 'bolted' } },
    });
    expect(bolted?.clash).toBe(true);
    const cut = crossingOf({
      diagonals: { arrangement: 'same side' },
      joins: { [KEY]: { kind: 'cut', cutBar: 't1.rise' } },
    });
    expect(cut?.clash).toBe(false);
  });

  it('goes when one bar is put on the other side', () => {
    expect(
      crossingOf({ diagonals: { arrangement: 'same side' }, bars: { 't1.rise': { side: 'far' } } })?.clash,
    ).toBe(false);
    expect(crossingOf({ bars: { 't1.rise': { side: 'near' } } })?.clash).toBe(true);
  });

  it('with a purlin is what the rafter leaves: on the far side of the gusset, below it', () => {
    // Purlin 225 above the plane, 150 deep: from 150 up. A single diagonal of a roof lies on the near face: 5 to 75. 75 between.
    const recipe = roof(6000, 8, [[4000, 'crossed']], [line('P1', 1000)]);
    const layout = layoutOf(bay(recipe));
    const near = layout.bars.get('B/a.p1.fall')?.angle?.side === 'near' ? 'fall' : 'rise';
    const far = near === 'fall' ? 'rise' : 'fall';
    expectNear(layout.crossings.get(`B/P1+a.p1.${near}`)?.gap, 75);
    expectNear(layout.crossings.get(`B/P1+a.p1.${far}`)?.gap, 155);
  });
});

describe('a join that does not fit its crossing', () => {
  it('counts as no mark', () => {
    const crossing = layoutOf(
      crossed({ joins: { [KEY]: { kind: 'purlin', boltsAcross: 1 } } }),
    ).crossings.get(`B/${KEY}`);
    expect(crossing?.join).toBeNull();
    expect(crossing?.choices).toEqual(['none', 'bolted', 'packed', 'cut', 'welded']);
    const recipe = wall(6000, [[4000, 'rising']], [line('G1', 1000)]);
    const onRail = layoutOf(bay(recipe, { joins: { 'G1+t1.rise': { kind: 'bolted' } } })).crossings.get(
      'B/G1+t1.rise',
    );
    expect(onRail?.join).toBeNull();
    expect(onRail?.choices).toEqual(['none', 'purlin', 'hung']);
  });
});

describe('hands', () => {
  const handsOf = (rest: Parameters<typeof bay>[1]) => {
    const layout = layoutOf(crossed(rest));
    return ['B/t1.rise', 'B/t1.fall'].map((id) => layout.bars.get(id)?.angle?.hand);
  };
  const unlike = { 't1.rise': { endI: { bolts: 3 } }, 't1.fall': { endI: { bolts: 3 } } } as const;

  it('are neither for a bar that reads the same from both ends', () => {
    expect(handsOf({})).toEqual(['either', 'either']);
    expect(handsOf({ joins: { [KEY]: { kind: 'bolted' } } })).toEqual(['either', 'either']);
  });

  it('are one and the same for bars on opposite faces: half a turn about the upright brings one onto the other', () => {
    const [rise, fall] = handsOf({ bars: unlike });
    expect(rise).toBe(fall);
    expect(rise).not.toBe('either');
  });

  it('are left and right for bars on one side, which are mirror images', () => {
    const hands = handsOf({ bars: unlike, diagonals: { arrangement: 'same side' } });
    expect([...hands].sort()).toEqual(['left', 'right']);
  });

  it('are told by a hole off the middle too', () => {
    const hands = handsOf({
      joins: { [KEY]: { kind: 'bolted' } },
      bars: { 't1.rise': { endI: { setBack: 400 } } },
    });
    expect(hands[0]).not.toBe('either');
    expect(hands[1]).toBe('either');
  });
});

describe('what a bay says of its diagonals', () => {
  it('holds for each, but for what its own mark says', () => {
    const layout = layoutOf(
      crossed({
        diagonals: { grade: 'S275' },
        bars: { 't1.fall': { section: '80x60x7', countedOn: 'both' } },
      }),
    );
    expect(layout.bars.get('B/t1.rise')?.angle?.spec).toEqual({ ...DIAGONALS, grade: 'S275' });
    expect(layout.bars.get('B/t1.fall')?.angle?.spec.section).toBe('80x60x7');
    expect(layout.bars.get('B/t1.fall')?.angle?.spec.countedOn).toBe('both');
    expect(layout.bars.get('B/t1.fall')?.angle?.stock?.designation).toBe('80x60x7');
  });

  it('looks sections up as people type them', () => {
    for (const section of ['L70×70×6', '70 x 70 x 6', 'l70x70x6'])
      expect(
        layoutOf(crossed({ diagonals: { section } })).bars.get('B/t1.rise')?.angle?.stock?.designation,
      ).toBe('70x70x6');
  });
});
