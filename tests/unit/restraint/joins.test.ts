/** What each kind of join holds, METHODS.md §4. The bar is one of a crossed pair of 6 m by 4 m, its longer leg in the plane. */
import { describe, expect, it } from 'vitest';
import type { Bay, Join, Line } from '../../../core/project/model.ts';
import type { Station } from '../../../core/restraint/model.ts';
import { bay, free, line, roof, vouched, wall } from '../assess/given/bays.ts';
import { assessed, between, claimOf, middleOf, restraintIn } from '../assess/given/reading.ts';

const KEY = 't1.fall+t1.rise';
const crossed = (join: Join | null): Bay =>
  bay(wall(6000, [[4000, 'crossed']]), { joins: join ? { [KEY]: join } : {} });
const stationOf = (join: Join | null, id = 'B/t1.rise'): Station =>
  middleOf(restraintIn(assessed(crossed(join)), id));

/** The leg in the plane is the longer, which is y of the section; of a hold, either way along it is the same. */
function expectHeldInPlane(station: Station): void {
  expect(station.held.ways).toBe(1);
  if (station.held.ways !== 1) return;
  expect(Math.abs(station.held.direction[0])).toBeCloseTo(0, 9);
  expect(Math.abs(station.held.direction[1])).toBeCloseTo(1, 9);
}

function expectHeldOutOfPlane(station: Station): void {
  expect(station.held.ways).toBe(1);
  if (station.held.ways !== 1) return;
  expect(Math.abs(station.held.direction[0])).toBeCloseTo(1, 9);
  expect(Math.abs(station.held.direction[1])).toBeCloseTo(0, 9);
}

describe('two diagonals that cross', () => {
  it('and are unmarked hold each other nowhere, and it is said that nobody marked them', () => {
    const station = stationOf(null);
    expect(station.held).toEqual({ ways: 0 });
    for (const claim of station.claims) {
      expect(claim.counted).toBe(false);
      expect(claim.reason).toMatchObject({ kind: 'not joined', marked: false });
    }
  });

  it('and are marked as not joined hold each other nowhere', () => {
    const station = stationOf({ kind: 'none' });
    expect(station.held).toEqual({ ways: 0 });
    expect(station.claims[0]?.reason).toMatchObject({ kind: 'not joined', marked: true });
  });

  it.each<Join>([{ kind: 'bolted' }, { kind: 'packed', packer: null }, { kind: 'welded' }])(
    'and are $kind hold each other in the plane only, and do not stop twist',
    (join) => {
      for (const id of ['B/t1.rise', 'B/t1.fall']) {
        const station = stationOf(join, id);
        expectHeldInPlane(station);
        expect(station.twistHeld).toBe(false);
        expect(claimOf(station, 'in plane').reason.kind).toBe('partner end-on');
        expect(claimOf(station, 'out of plane')).toMatchObject({
          counted: false,
          reason: { kind: 'partner only bends' },
        });
      }
    },
  );

  it.each(['t1.rise', 't1.fall'])(
    'of which %s is cut and plated hold each other in the plane, and a single plate is a hinge out of it',
    (cutBar) => {
      for (const id of ['B/t1.rise', 'B/t1.fall']) {
        const station = stationOf({ kind: 'cut', cutBar }, id);
        expectHeldInPlane(station);
        expect(station.twistHeld).toBe(false);
        expect(claimOf(station, 'out of plane')).toMatchObject({
          counted: false,
          reason: { kind: 'single plate hinges' },
        });
      }
    },
  );

  it('stand at the place along the bar where they cross, under the partner’s mark', () => {
    const station = stationOf({ kind: 'bolted' });
    expect(station.at).toBeCloseTo(Math.sqrt(52_000_000) / 2, 6);
    expect(station.label).toBe('D2');
    expect(station.crossings).toEqual([`B/${KEY}`]);
  });

  it('at less than 10° hold nothing across each other; at more they do', () => {
    // Slopes ±h/8000 over 8 m: the angle between them is 2 atan(h/8000). 4.9° each way makes 9.8°, 5.2° makes 10.4°.
    const at = (degrees: number) => {
      const h = 8000 * Math.tan((degrees * Math.PI) / 180);
      const made = bay(
        free({ n1: [0, 0, 0], n2: [8000, 0, h], n3: [0, 0, h], n4: [8000, 0, 0] }, [
          ['b1', 'n1', 'n2'],
          ['b2', 'n3', 'n4'],
        ]),
        { joins: { 'b1+b2': { kind: 'bolted' } } },
      );
      return middleOf(restraintIn(assessed(made), 'B/b1'));
    };
    expect(at(4.9).held).toEqual({ ways: 0 });
    expect(claimOf(at(4.9), 'in plane').reason.kind).toBe('nearly along the bar');
    expectHeldInPlane(at(5.2));
  });
});

describe('a diagonal under a purlin', () => {
  const under = (join: Join | null, held: Line['heldBy']) =>
    middleOf(
      restraintIn(
        assessed(
          bay(roof(6000, 8, [[4000, 'rising']], [line('P1', 1000, held)]), {
            joins: join ? { 'P1+a.p1.rise': join } : {},
          }),
        ),
        'B/a.p1.rise',
      ),
    );

  it.each<[string, Join | null]>([
    ['unmarked', null],
    ['not joined', { kind: 'none' }],
    ['hung from it', { kind: 'hung' }],
  ])('%s is held nowhere, even by a purlin that is held itself', (_, join) => {
    expect(under(join, vouched).held).toEqual({ ways: 0 });
  });

  it('bolted to it with one bolt, the purlin tied to nothing, is held out of the plane only', () => {
    const station = under({ kind: 'purlin', boltsAcross: 1 }, { kind: 'nothing' });
    expectHeldOutOfPlane(station);
    expect(station.twistHeld).toBe(false);
    expect(claimOf(station, 'along holder')).toMatchObject({
      counted: false,
      reason: { kind: 'line free along itself' },
    });
    expect(claimOf(station, 'out of plane').reason.kind).toBe('line stiff across');
  });

  it('bolted to it, the purlin held along itself, is held both ways', () => {
    const station = under({ kind: 'purlin', boltsAcross: 1 }, vouched);
    expect(station.held).toEqual({ ways: 2 });
    expect(claimOf(station, 'along holder').reason).toMatchObject({ kind: 'line held along itself' });
  });

  it('bolted to it with two bolts across is held in twist too, whether the purlin is tied or not', () => {
    expect(under({ kind: 'purlin', boltsAcross: 2 }, { kind: 'nothing' }).twistHeld).toBe(true);
    expect(under({ kind: 'purlin', boltsAcross: 2 }, vouched).twistHeld).toBe(true);
  });

  it('is held along the purlin, not square to itself: what the purlin’s direction leaves across the bar, which is in the plane', () => {
    const station = under({ kind: 'purlin', boltsAcross: 1 }, vouched);
    const { vector } = claimOf(station, 'along holder');
    expect(Math.abs(vector?.[1] ?? 0)).toBeCloseTo(1, 9);
  });
});

describe('several marks at one place', () => {
  it('make one station: a partner in the plane and a free purlin out of it hold both ways together', () => {
    const made = bay(wall(6000, [[4000, 'crossed']], [line('G1', 2000)]), {
      joins: { [KEY]: { kind: 'bolted' }, 'G1+t1.rise': { kind: 'purlin', boltsAcross: 1 } },
    });
    const station = middleOf(restraintIn(assessed(made), 'B/t1.rise'));
    expect(station.held).toEqual({ ways: 2 });
    expect([...station.crossings].sort()).toEqual(['B/G1+t1.rise', `B/${KEY}`]);
    // The partner is not bolted to the rail.
    expectHeldInPlane(middleOf(restraintIn(assessed(made), 'B/t1.fall')));
  });

  it('of three bars in one plane through one point hold in the plane only', () => {
    const made = bay(
      free(
        {
          n1: [0, 0, 0],
          n2: [4000, 0, 0],
          n3: [4000, 0, 4000],
          n4: [0, 0, 4000],
          n5: [2000, 0, 0],
          n6: [2000, 0, 4000],
        },
        [
          ['b1', 'n1', 'n3'],
          ['b2', 'n2', 'n4'],
          ['b3', 'n5', 'n6'],
        ],
      ),
      { joins: { 'b1+b2': { kind: 'bolted' }, 'b1+b3': { kind: 'bolted' }, 'b2+b3': { kind: 'bolted' } } },
    );
    for (const id of ['B/b1', 'B/b2', 'B/b3']) expectHeldInPlane(middleOf(restraintIn(assessed(made), id)));
  });

  it('are told apart from 1 mm on', () => {
    // Rails 2 mm apart in height are 2 × 7211/4000 = 3.6 mm apart along the bar.
    const made = bay(
      wall(6000, [[4000, 'rising']], [line('G1', 1000), line('G2', 1002), line('G3', 1002.4)]),
    );
    const at = between(restraintIn(assessed(made), 'B/t1.rise')).map((station) => station.label);
    expect(at).toEqual(['G1', 'G2·G3']);
  });
});

describe('a bar that ends on another', () => {
  const held = (at: readonly [number, number, number], options: { readonly free?: readonly string[] } = {}) =>
    middleOf(
      restraintIn(
        assessed(
          bay(
            free(
              { n1: [0, 0, 0], n2: [8000, 0, 0], n3: [4000, 0, 0], n4: at },
              [
                ['b1', 'n1', 'n2'],
                ['k1', 'n3', 'n4', 'knee'],
              ],
              { free: ['n3', ...(options.free ?? [])] },
            ),
          ),
        ),
        'B/b1',
      ),
    );

  it('holds it as its geometry gives: in the plane, out of it, or between', () => {
    expectHeldInPlane(held([4000, 0, 3000]));
    expectHeldOutOfPlane(held([4000, 3000, 0]));
    // 45° between: not along either leg.
    const skew = held([4000, 2000, 2000]);
    expect(skew.held.ways).toBe(1);
    if (skew.held.ways === 1) expect(Math.abs(skew.held.direction[0])).toBeCloseTo(Math.SQRT1_2, 9);
  });

  it('that leans along the bar holds across it, as long as it is 10° off', () => {
    expectHeldInPlane(held([7000, 0, 3000]));
    // atan(400/3000) = 7.6°.
    const along = held([7000, 0, 400]);
    expect(along.held).toEqual({ ways: 0 });
    expect(along.claims[0]?.reason.kind).toBe('nearly along the bar');
  });

  it('whose other end is free holds nothing', () => {
    const station = held([4000, 0, 3000], { free: ['n4'] });
    expect(station.held).toEqual({ ways: 0 });
    expect(station.claims[0]).toMatchObject({
      counted: false,
      reason: { kind: 'bar ends here, itself free' },
    });
  });
});

describe('a point in the middle of a straight run of bars', () => {
  /** A knee from the studied bar up to the middle of two bars in line, whose far ends are held. */
  const under = (role: 'beam' | 'tie') =>
    middleOf(
      restraintIn(
        assessed(
          bay(
            free(
              {
                n1: [0, 0, 0],
                n2: [8000, 0, 0],
                n3: [4000, 0, 0],
                n4: [4000, 0, 3000],
                n5: [0, 0, 3000],
                n6: [8000, 0, 3000],
              },
              [
                ['b1', 'n1', 'n2'],
                ['k1', 'n3', 'n4', 'knee'],
                ['m1', 'n5', 'n4', role],
                ['m2', 'n4', 'n6', role],
              ],
              { free: ['n3', 'n4'] },
            ),
          ),
        ),
        'B/b1',
      ),
    );

  it('is held by a beam that runs straight through, by its bending', () => {
    expectHeldInPlane(under('beam'));
  });

  it('is not held by two ties in line, which hold nothing across themselves', () => {
    expect(under('tie').held).toEqual({ ways: 0 });
  });
});

describe('the ends of a bar', () => {
  it('hold every way, twist included', () => {
    const { stations } = restraintIn(assessed(crossed(null)), 'B/t1.rise');
    for (const end of [stations[0], stations.at(-1)]) {
      expect(end?.held).toEqual({ ways: 2 });
      expect(end?.twistHeld).toBe(true);
    }
  });
});
