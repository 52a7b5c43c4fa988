/** A hold is real only if the holder is held: every trail leads to a support, and a holder that is itself free is caught. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import type { Bay, Line, Pattern } from '../../../core/project/model.ts';
import type { Claim } from '../../../core/restraint/model.ts';
import { anyProject } from '../../properties/given/projects.ts';
import { runs } from '../../properties/given/runs.ts';
import { bay, free, line, roof, vouched, wall } from '../assess/given/bays.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';
import { assessed, between, claimOf, middleOf, restraintIn } from '../assess/given/reading.ts';

const bolted = { kind: 'bolted' } as const;
const ENDS_HELD = (claim: Claim) => claim.trail.at(-1)?.state;

/** A stack of tiers of 3 m, with the crossing of the one asked for bolted. */
function inTier(patterns: readonly Pattern[], tier: string): Claim {
  const made = bay(
    wall(
      6000,
      patterns.map((pattern) => [3000, pattern] as const),
    ),
    { joins: { [`${tier}.fall+${tier}.rise`]: bolted } },
  );
  return claimOf(middleOf(restraintIn(assessed(made), `B/${tier}.rise`)), 'in plane');
}

describe('the partner at a crossing', () => {
  it.each<[readonly Pattern[], string]>([
    [['crossed'], 't1'],
    [['crossed', 'crossed'], 't2'],
    [['rising', 'crossed'], 't2'],
    [['falling', 'rising', 'crossed'], 't3'],
    [['peaked', 'crossed'], 't2'],
    [['vee', 'crossed'], 't2'],
    [['crossed', 'open'], 't1'],
  ])('in tiers %j holds in %s: braced all the way down', (patterns, tier) => {
    const claim = inTier(patterns, tier);
    expect(claim.counted).toBe(true);
    expect(ENDS_HELD(claim)).toBe('held');
    expect(claim.trail.at(-1)?.text).toContain('foundation');
  });

  it.each<[readonly Pattern[], string]>([
    [['open', 'crossed'], 't2'],
    [['crossed', 'open', 'crossed'], 't3'],
    [['open', 'crossed', 'crossed'], 't3'],
    [['open', 'peaked', 'crossed'], 't3'],
  ])('in tiers %j holds nothing in %s: the tier below it is open, and sways', (patterns, tier) => {
    const claim = inTier(patterns, tier);
    expect(claim.counted).toBe(false);
    expect(claim.reason.kind).toBe('partner half free');
    expect(ENDS_HELD(claim)).toBe('free');
  });

  it('has a trail down to the ground in a wall of thirty tiers as well', () => {
    const claim = inTier(
      Array.from({ length: 30 }, () => 'crossed' as const),
      't30',
    );
    expect(claim.counted).toBe(true);
    expect(ENDS_HELD(claim)).toBe('held');
  });

  it('that one end of which is not held holds nothing, in a bay drawn freely', () => {
    const made = (loose: readonly string[]) =>
      bay(
        free(
          { n1: [0, 0, 0], n2: [4000, 0, 0], n3: [4000, 0, 4000], n4: [0, 0, 4000] },
          [
            ['b1', 'n1', 'n3'],
            ['b2', 'n2', 'n4'],
          ],
          { free: loose },
        ),
        { joins: { 'b1+b2': bolted } },
      );
    const counted = (loose: readonly string[], id: string) =>
      claimOf(middleOf(restraintIn(assessed(made(loose)), id)), 'in plane').counted;
    expect(counted([], 'B/b1')).toBe(true);
    expect(counted(['n4'], 'B/b1')).toBe(false);
    // b2 loses an end; b1, which holds b2, has both.
    expect(counted(['n4'], 'B/b2')).toBe(true);
  });
});

describe('a purlin', () => {
  const P1 = 'P1+a.p1.rise';
  const bolt = { kind: 'purlin', boltsAcross: 1 } as const;
  /** A roof of one panel of 4 m with P1 1 m up, and other bays. */
  const along = (heldBy: Line['heldBy'], ...others: readonly Bay[]): Claim => {
    const made = bay(roof(6000, 8, [[4000, 'crossed']], [line('P1', 1000, heldBy)]), {
      id: 'R',
      joins: { [P1]: bolt },
    });
    const station = between(restraintIn(assessed([made, ...others]), 'R/a.p1.rise')).find(
      (each) => each.label === 'P1',
    );
    if (!station) throw new Error('P1 is not on the bar');
    return claimOf(station, 'along holder');
  };
  /** The roof bay next to it, to the right of the second rafter or the left of the first. */
  const next = (x: number, panels: readonly (readonly [number, Pattern])[]) =>
    bay(roof(6000, 8, panels), { id: 'N', place: { origin: [x, 0, 0], turn: 0 } });

  it('tied to nothing does not hold along itself', () => {
    const claim = along({ kind: 'nothing' });
    expect(claim.counted).toBe(false);
    expect(claim.reason).toMatchObject({ kind: 'line free along itself', line: 'P1' });
    expect(ENDS_HELD(claim)).toBe('free');
  });

  it('vouched for holds, and the reason given is in the trail', () => {
    const claim = along(vouched);
    expect(claim.counted).toBe(true);
    expect(claim.trail.at(-1)).toMatchObject({ state: 'held' });
    expect(claim.trail.at(-1)?.text).toContain(vouched.reason);
  });

  it.each([
    ['right', 6000],
    ['left', -6000],
    ['right, a bay farther on', 12_000],
  ])('run on to a panel point of the bay on the %s holds, and its trail ends at a support there', (_, x) => {
    const claim = along(
      { kind: 'bay', bay: 'N' },
      next(x, [
        [1000, 'crossed'],
        [3000, 'crossed'],
      ]),
    );
    expect(claim.counted).toBe(true);
    expect(claim.reason).toMatchObject({ kind: 'line held along itself' });
    expect(ENDS_HELD(claim)).toBe('held');
  });

  it.each([
    // On the right, the diagonal that ends 1 m up ends at the shared rafter when it falls; on the left, when it rises.
    ['right', 6000, 'falling', 'rising'],
    ['left', -6000, 'rising', 'falling'],
  ] as const)(
    'run on to a panel point on the very rafter that it shares with the bay on the %s holds',
    (_, x, lower, upper) => {
      const claim = along(
        { kind: 'bay', bay: 'N' },
        next(x, [
          [1000, lower],
          [3000, upper],
        ]),
      );
      expect(claim.counted).toBe(true);
    },
  );

  it('claimed to run on to a bay that has no panel point there is caught', () => {
    const claim = along({ kind: 'bay', bay: 'N' }, next(6000, [[4000, 'crossed']]));
    expect(claim.counted).toBe(false);
    expect(claim.reason).toMatchObject({ kind: 'line free along itself' });
    if (claim.reason.kind === 'line free along itself')
      expect(claim.reason.why).toContain('N has no panel point');
    expect(ENDS_HELD(claim)).toBe('free');
  });

  it('claimed to run on to a bay whose panel point is itself free is caught', () => {
    // Next door the lower panel is open, so nothing holds its head, although the upper diagonals begin there.
    const claim = along(
      { kind: 'bay', bay: 'N' },
      next(6000, [
        [1000, 'open'],
        [3000, 'crossed'],
      ]),
    );
    expect(claim.counted).toBe(false);
    if (claim.reason.kind === 'line free along itself') expect(claim.reason.why).toContain('free');
    expect(ENDS_HELD(claim)).toBe('free');
  });

  it('claimed to be held by a bay that is not in the project, or by its own, is caught', () => {
    for (const name of ['nowhere', 'R']) {
      const claim = along({ kind: 'bay', bay: name });
      expect(claim.counted, name).toBe(false);
      if (claim.reason.kind === 'line free along itself') expect(claim.reason.why, name).toContain(name);
    }
  });

  it('through a panel point of its own bay is held there, whatever is said of it', () => {
    // 30 mm past the panel point 4 m up: through it, and crossing the diagonals of the next panel near their feet.
    const made = bay(
      roof(
        6000,
        8,
        [
          [4000, 'crossed'],
          [4000, 'crossed'],
        ],
        [line('P5', 4030)],
      ),
      { id: 'R', joins: { 'P5+a.p2.rise': bolt } },
    );
    const station = between(restraintIn(assessed(made), 'R/a.p2.rise')).find((each) => each.label === 'P5');
    if (!station) throw new Error('P5 is not on the bar');
    expect(claimOf(station, 'along holder').counted).toBe(true);
    expect(station.held).toEqual({ ways: 2 });
  });

  it('through a panel point that nothing holds is free, unless something else holds it', () => {
    const with_ = (heldBy: Line['heldBy']) => {
      const made = bay(
        roof(
          6000,
          8,
          [
            [4000, 'open'],
            [4000, 'crossed'],
          ],
          [line('P5', 4030, heldBy)],
        ),
        { id: 'R', joins: { 'P5+a.p2.rise': bolt } },
      );
      const station = between(restraintIn(assessed(made), 'R/a.p2.rise')).find((each) => each.label === 'P5');
      if (!station) throw new Error('P5 is not on the bar');
      return claimOf(station, 'along holder').counted;
    };
    expect(with_({ kind: 'nothing' })).toBe(false);
    expect(with_(vouched)).toBe(true);
  });
});

describe('a member of the framing that a diagonal is bolted to', () => {
  const on = (loose: readonly string[]) =>
    middleOf(
      restraintIn(
        assessed(
          bay(
            free(
              { n1: [0, 0, 0], n2: [8000, 0, 0], n3: [4000, 0, -2000], n4: [4000, 0, 2000] },
              [
                ['b1', 'n1', 'n2'],
                ['m1', 'n3', 'n4', 'beam'],
              ],
              { free: loose },
            ),
            { joins: { 'b1+m1': { kind: 'purlin', boltsAcross: 1 } } },
          ),
        ),
        'B/b1',
      ),
    );

  it('holds both ways when its ends are held', () => {
    expect(on([]).held).toEqual({ ways: 2 });
  });

  it('holds along itself by one end, but not across itself with the other in the air', () => {
    const station = on(['n4']);
    expect(claimOf(station, 'along holder').counted).toBe(true);
    expect(claimOf(station, 'out of plane')).toMatchObject({
      counted: false,
      reason: { kind: 'line end free' },
    });
    expect(ENDS_HELD(claimOf(station, 'out of plane'))).toBe('free');
  });

  it('holds nothing with both ends in the air', () => {
    expect(on(['n3', 'n4']).held).toEqual({ ways: 0 });
  });
});

describe('a roof on walls', () => {
  const joins = { 'a.p1.fall+a.p1.rise': bolted };
  const above = (pattern: Pattern | null) => {
    const made = bay(roof(6000, 8, [[4000, 'crossed']]), {
      id: 'R',
      place: { origin: [0, 0, 3000], turn: 0 },
      joins,
    });
    const below = pattern ? [bay(wall(6000, [[3000, pattern]]), { id: 'W' })] : [];
    return claimOf(middleOf(restraintIn(assessed([made, ...below]), 'R/a.p1.rise')), 'in plane');
  };

  it('is taken as carried by what stands below when the project shows nothing there, and says so', () => {
    const claim = above(null);
    expect(claim.counted).toBe(true);
    expect(claim.trail.at(-1)?.text).toContain('taken as');
  });

  it('is held by a braced wall below, which is named', () => {
    const claim = above('crossed');
    expect(claim.counted).toBe(true);
    expect(claim.trail.some((step) => step.text.includes('W'))).toBe(true);
  });

  it('is not held by a wall below that has no bracing', () => {
    const claim = above('open');
    expect(claim.counted).toBe(false);
    expect(ENDS_HELD(claim)).toBe('free');
    expect(claim.trail.at(-1)?.text).toContain('W');
  });

  it('does not mind in which order the bays stand in the project', () => {
    const R = bay(roof(6000, 8, [[4000, 'crossed']]), {
      id: 'R',
      place: { origin: [0, 0, 3000], turn: 0 },
      joins,
    });
    const W = bay(wall(6000, [[3000, 'open']]), { id: 'W' });
    for (const bays of [
      [R, W],
      [W, R],
    ])
      expect(claimOf(middleOf(restraintIn(assessed(bays), 'R/a.p1.rise')), 'in plane').counted).toBe(false);
  });
});

describe('every trail', () => {
  it('of a hold that counts ends at a support and passes nothing free; of one whose holder is free, ends at what is free', () => {
    fc.assert(
      fc.property(anyProject, (made) => {
        for (const { restraint } of assess(made, CATALOGUES).diagonals.values())
          for (const station of restraint?.stations ?? [])
            for (const claim of station.claims) {
              if (claim.source === 'end' || claim.direction === 'twist') continue;
              const { kind } = claim.reason;
              if (claim.counted) {
                expect(claim.trail.at(-1)?.state).toBe('held');
                expect(claim.trail.some((step) => step.state === 'free')).toBe(false);
              } else if (
                kind === 'partner half free' ||
                kind === 'line free along itself' ||
                kind === 'line end free' ||
                kind === 'bar ends here, itself free'
              )
                expect(claim.trail.at(-1)?.state).toBe('free');
            }
      }),
      runs(200),
    );
  });
});
