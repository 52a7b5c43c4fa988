/** Blocks that may tear out, by hand from practice-facts C and the two blocks that an open CSA teaching example works out for two rows. */
import { describe, expect, it } from 'vitest';
import { blocksOf } from '../../../core/resistance/tension/blocks.ts';
import {
  angleOf,
  boltedEnd,
  checkOf,
  flatOf,
  kN,
  printedAngle,
  questionOf,
} from '../../published/tensionGiven.ts';

const S350 = { fy: 350, fu: 450 };

describe('the blocks of an end', () => {
  it('of one row in a leg: along it and out to the toe', () => {
    // EN deducts the hole: A_nt = (45 − 11) 10, A_gv = (40 + 2 × 70) 10, A_nv = (180 − 2.5 × 22) 10.
    const blocks = blocksOf(
      questionOf('en1993', angleOf(100, 100, 10, 12), S350, boltedEnd(100, { bolts: 3 })),
      boltedEnd(100, { bolts: 3 }),
    );
    expect(blocks).toEqual([
      {
        name: 'along the row and out to the toe',
        netTension: 340,
        grossTension: 450,
        netShear: 1250,
        grossShear: 1800,
        even: false,
      },
    ]);
  });

  it('of two rows: the teaching example’s case 1 (977.9 and 3302 mm²) and case 2 (711.2 and 6604 mm²)', () => {
    const end = boltedEnd(178, {
      bolts: 8,
      rows: 2,
      boltDiameter: 19.05,
      pitch: 75,
      endDistance: 35,
      gauge: 65,
      rowSpacing: 80,
    });
    const blocks = blocksOf(questionOf('csaS16', printedAngle(178, 102, 12.7, 3390, 25), S350, end), end);
    if (typeof blocks === 'string') throw new Error(blocks);
    expect(blocks.map(({ netTension, grossShear }) => [netTension, grossShear])).toEqual([
      [expect.closeTo(977.9, 1), expect.closeTo(3302, 6)],
      [expect.closeTo(711.2, 1), expect.closeTo(6604, 6)],
    ]);
    // Its resistance of case 2, 1333 kN: 0.75 (0.6 × 711.2 × 450 + 0.6 × 6604 × 400).
    const [, second] = blocks;
    const caseTwo = 0.75 * (0.6 * (second?.netTension ?? 0) * 450 + 0.6 * (second?.grossShear ?? 0) * 400);
    expect(Math.abs(caseTwo / 1000 - 1333)).toBeLessThanOrEqual(0.5);
  });

  it('of two staggered rows: the slanting stretch adds s²t/(4g) to the tension', () => {
    // Pitch 80, rows 60 apart, t 12: s = 40, s²/(4g) = 6.67.
    const given = { bolts: 6, rows: 2, rowSpacing: 60, pitch: 80, gauge: 55 } as const;
    const section = angleOf(150, 150, 12, 16);
    const [straight, staggered] = [false, true].map((stagger) => {
      const end = boltedEnd(150, { ...given, staggered: stagger });
      const blocks = blocksOf(questionOf('en1993', section, S350, end), end);
      return typeof blocks === 'string' ? undefined : blocks[0];
    });
    expect((staggered?.netTension ?? 0) - (straight?.netTension ?? 0)).toBeCloseTo(12 * (1600 / 240), 9);
    expect(staggered?.grossShear).toBe(straight?.grossShear);
  });

  it('of both legs: the two toes, or what lies around the heel', () => {
    // Four bolts, two in each leg, gauge 55 in both: around the heel 55 + 55 − 10 = 100 less a hole.
    const end = boltedEnd(100, { bolts: 4, legs: 'both' });
    const blocks = blocksOf(questionOf('en1993', angleOf(100, 100, 10, 12), S350, end), end);
    if (typeof blocks === 'string') throw new Error(blocks);
    expect(
      blocks.map(({ name, netTension, netShear, even }) => ({ name, netTension, netShear, even })),
    ).toEqual([
      {
        name: 'along both rows and out to both toes',
        netTension: 680,
        netShear: 2 * (110 - 33) * 10,
        even: true,
      },
      {
        name: 'along both rows and around the heel',
        netTension: 780,
        netShear: 2 * (110 - 33) * 10,
        even: true,
      },
    ]);
  });

  it('of a pair back to back: twice those of one angle', () => {
    const end = boltedEnd(100, { bolts: 3 });
    const one = questionOf('sans10162', angleOf(100, 100, 10, 12), S350, end);
    const pair = { ...one, section: { ...one.section, shape: 'angles back to back' as const } };
    expect(kN(pair, 'block shear') / kN(one, 'block shear')).toBeCloseTo(2, 12);
  });

  it('of a flat: out to the nearer edge', () => {
    const end = boltedEnd(90, { bolts: 2, gauge: 40 });
    const blocks = blocksOf(questionOf('en1993', flatOf(90, 8), S350, end), end);
    if (typeof blocks === 'string') throw new Error(blocks);
    expect(blocks.map(({ grossTension }) => grossTension)).toEqual([320, 400]);
  });
});

describe('block shear that is not worked out', () => {
  it('says so of a channel', () => {
    const question = questionOf('en1993', angleOf(100, 100, 10, 12), S350, boltedEnd(100, {}));
    const check = checkOf({ ...question, section: { ...question.section, shape: 'channel' } }, 'block shear');
    expect(check.resistance).toBeNull();
    expect(check.conditions).toEqual([
      {
        says: 'a block that is worked out here: bolts inside one leg, both, or a flat',
        met: false,
        found: 'no block is worked out for a channel',
      },
    ]);
  });

  it('says so of a hole that breaks its edge', () => {
    const question = questionOf('en1993', angleOf(100, 100, 10, 12), S350, boltedEnd(100, { gauge: 90 }));
    expect(checkOf(question, 'block shear').conditions[0]?.found).toBe('a hole breaks its edge');
    expect(checkOf(question, 'net rupture').resistance).toBeNull();
  });
});

it('names the block that counts, and of how many it is the least', () => {
  const end = boltedEnd(150, { bolts: 4, rows: 2, rowSpacing: 60, gauge: 55 });
  const check = checkOf(questionOf('csaS16', angleOf(150, 150, 12, 16), S350, end), 'block shear');
  const netTension = check.steps.find(({ symbol }) => symbol === 'A_nt');
  expect(netTension?.formula).toBe('along the first row and out to the toe: the least of 3; holes out');
});

it('shows the steel’s stresses in the working of every practice, ahead of what is worked out with them', () => {
  const end = boltedEnd(100, { bolts: 3 });
  const section = angleOf(100, 100, 10, 12);
  for (const [practice, letter] of [
    ['aisc360', 'F'],
    ['csaS16', 'F'],
    ['en1993', 'f'],
    ['as4100', 'f'],
    ['is800', 'f'],
    ['sans10162', 'f'],
  ] as const) {
    const { steps } = checkOf(questionOf(practice, section, S350, end), 'block shear');
    expect(steps.slice(0, 2).map(({ symbol, value }) => [symbol, value])).toEqual([
      [`${letter}_y`, 350],
      [`${letter}_u`, 450],
    ]);
  }
});

it('CSA also lets a row tear out along both its sides where the toe is far', () => {
  // L200x200x10, one bolt 25 from the end on gauge 60: to the toe 0.75 (0.6 (140 − 12) 10 × 450 + 0.6 × 250 × 400) = 304.2 kN;
  // both sides 0.75 × 0.6 × 2 × 250 × 400 = 90 kN.
  const end = boltedEnd(200, { bolts: 1, endDistance: 25, gauge: 60 });
  const check = checkOf(questionOf('csaS16', angleOf(200, 200, 10, 18), S350, end), 'block shear');
  expect((check.resistance ?? 0) / 1000).toBeCloseTo(90, 9);
});
