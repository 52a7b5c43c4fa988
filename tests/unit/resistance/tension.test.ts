/** Tension by hand: welded ends, unequal angles, both legs, flats, rods, and what the rules do not speak of. */
import { describe, expect, it } from 'vitest';
import type { SectionShape } from '../../../core/resistance/model.ts';
import { tensionResistances } from '../../../core/resistance/tension/tensionResistances.ts';
import {
  angleOf,
  boltedEnd,
  checkOf,
  flatOf,
  kN,
  PRACTICES,
  printedAngle,
  questionOf,
  rodOf,
  stepOf,
  weldedEnd,
} from '../../published/tensionGiven.ts';

/** Half a newton in a kilonewton: hand figures are kept to one decimal. */
const HAND = 0.05;

function within(value: number, hand: number, tolerance = HAND): void {
  expect(Math.abs(value - hand), `${value} beside ${hand}`).toBeLessThanOrEqual(tolerance);
}

describe('a welded angle by one leg', () => {
  // L100x75x8 by its longer leg, A 1350 as printed, 18.7 to the centroid; two welds of 120 mm. S275: 275/410.
  const section = printedAngle(100, 75, 8, 1350, 18.7);
  const steel = { fy: 275, fu: 410 };
  const end = weldedEnd(100, 120);

  it('by SANS and CSA counts 0.50 w t + 0.25 L t of the leg and (1 − x̄/L) w t of the other', () => {
    // 0.5 × 100 × 8 + 0.25 × 120 × 8 = 640; (1 − 33.5/120) 67 × 8 = 386.4; together 1026.4 mm².
    const csa = checkOf(questionOf('csaS16', section, steel, end), 'net rupture');
    within(stepOf(csa, 'A_n2,1'), 640);
    within(stepOf(csa, 'A_n3'), 386.4);
    within((csa.resistance ?? 0) / 1000, (0.75 * 1026.4 * 410) / 1000);
    within(kN(questionOf('sans10162', section, steel, end), 'net rupture'), (0.765 * 1026.4 * 410) / 1000);
  });

  it('by AISC takes case 4', () => {
    // 3 × 120²/(3 × 120² + 100²) (1 − 18.7/120) = 0.8120 × 0.8442 = 0.6855. 0.75 × 410 × 1350 × 0.6855 = 284.6 kN.
    const check = checkOf(questionOf('aisc360', section, steel, end), 'net rupture');
    within(stepOf(check, 'U_4'), 0.6855, 0.00005);
    within((check.resistance ?? 0) / 1000, 284.6);
  });

  it('by AISC asks for welds of four times their size', () => {
    const check = checkOf(questionOf('aisc360', section, steel, weldedEnd(100, 20)), 'net rupture');
    expect(check.resistance).toBeNull();
    expect(check.conditions[0]).toEqual({
      says: 'each weld at least four times its size, 24 mm',
      met: false,
      found: '20 mm',
    });
  });

  it('by EN counts the gross area, and of the smaller leg an equal angle of it', () => {
    within(kN(questionOf('en1993', section, steel, end), 'net rupture'), (1350 * 275) / 1000);
    const short = { ...section, connectedLeg: 75, outstandingLeg: 100 };
    // 1350 − (100 − 75) 8 = 1150 mm².
    within(kN(questionOf('en1993', short, steel, weldedEnd(75, 120)), 'net rupture'), (1150 * 275) / 1000);
  });

  it('by AS takes k_t 0.85, and 0.75 by the short leg', () => {
    within(
      kN(questionOf('as4100', section, steel, end), 'net rupture'),
      (0.9 * 0.85 * 0.85 * 1350 * 410) / 1000,
    );
    const short = { ...section, connectedLeg: 75, outstandingLeg: 100 };
    within(
      kN(questionOf('as4100', short, steel, weldedEnd(75, 120)), 'net rupture'),
      (0.9 * 0.85 * 0.75 * 1350 * 410) / 1000,
    );
  });

  it('by IS takes b_s = w and L_c the weld', () => {
    // β = 1.4 − 0.076 (75/8)(275/410)(75/120) = 1.1013; A_c = 96 × 8 = 768, A_go = 71 × 8 = 568.
    // 0.9 × 768 × 410/1.25 + 1.1013 × 568 × 275/1.1 = 226.7 + 156.4 = 383.1 kN.
    const check = checkOf(questionOf('is800', section, steel, end), 'net rupture');
    within(stepOf(check, 'β'), 1.1013, 0.00005);
    within((check.resistance ?? 0) / 1000, 383.1);
  });
});

describe('an unequal angle bolted by its smaller leg', () => {
  it('counts in EN as an equal angle of that leg', () => {
    // L120x80x12 by the 80 leg, A 2270: 2270 − 40 × 12 = 1790; less 22 × 12 = 1526. Three M20 at 70: β 0.5545. 0.5545 × 1526 × 360/1.25 = 243.7 kN.
    const section = { ...printedAngle(120, 80, 12, 2270, 40), connectedLeg: 80, outstandingLeg: 120 };
    const end = boltedEnd(80, { bolts: 3, gauge: 45 });
    const check = checkOf(questionOf('en1993', section, { fy: 235, fu: 360 }, end), 'net rupture');
    within(stepOf(check, 'A_n'), 1526, 1e-9);
    within((check.resistance ?? 0) / 1000, 243.7);
  });
});

describe('two rows in one leg', () => {
  const section = angleOf(150, 150, 12, 16);
  const two = { bolts: 6, rows: 2, rowSpacing: 60, gauge: 55, pitch: 80 } as const;

  it('take two holes out where they stand side by side, and less where they are staggered', () => {
    // EN, A 3480.6: 2 × 22 × 12 = 528; staggered 528 − 40² × 12/(4 × 60) = 448.
    const at = (staggered: boolean) =>
      checkOf(
        questionOf('as4100', section, { fy: 320, fu: 440 }, boltedEnd(150, { ...two, staggered })),
        'net rupture',
      );
    within(section.properties.area - stepOf(at(false), 'A_n'), 528, 1e-9);
    within(section.properties.area - stepOf(at(true), 'A_n'), 448, 1e-9);
  });

  it('are beyond 3.10.3 of EN, which says so', () => {
    const check = checkOf(
      questionOf('en1993', section, { fy: 355, fu: 470 }, boltedEnd(150, two)),
      'net rupture',
    );
    expect(check.resistance).toBeNull();
    expect(check.conditions).toEqual([
      { says: 'one row of bolts: 3.10.3 speaks of no more', met: false, found: 'two rows' },
    ]);
  });

  it('count each staggered bolt as a line of its own by CSA', () => {
    const share = (staggered: boolean) => {
      const check = checkOf(
        questionOf('csaS16', section, { fy: 350, fu: 450 }, boltedEnd(150, { ...two, staggered })),
        'net rupture',
      );
      return [stepOf(check, 'n'), stepOf(check, 'A′_ne') / stepOf(check, 'A_n')];
    };
    expect(share(false)).toEqual([3, expect.closeTo(0.6, 12)]);
    expect(share(true)).toEqual([6, expect.closeTo(0.8, 12)]);
  });

  it('share an odd number of bolts, the first row taking the last', () => {
    const check = checkOf(
      questionOf(
        'aisc360',
        section,
        { fy: 345, fu: 450 },
        boltedEnd(150, { ...two, bolts: 5, staggered: true }),
      ),
      'net rupture',
    );
    // Three and two: the first row reaches 160, the second from 40 to 120.
    expect(stepOf(check, 'l')).toBe(160);
  });
});

describe('both legs bolted', () => {
  it('have no shear lag, with a hole out of each leg', () => {
    // L100x100x10, four M20: A_n = 1915.45 − 2 × 22 × 10 = 1475.45 in EN. 0.9 × 1475.45 × 470/1.25 = 499.3 kN.
    const question = questionOf(
      'en1993',
      angleOf(100, 100, 10, 12),
      { fy: 355, fu: 470 },
      boltedEnd(100, { bolts: 4, legs: 'both' }),
    );
    within(kN(question, 'net rupture'), 499.3);
    expect(checkOf(question, 'net rupture').clause).toBe('6.2.3(2)b, (6.7)');
  });
});

describe('a flat', () => {
  it('is connected wholly: A_n by each practice', () => {
    // 90x8, one row of M20: EN 0.9 (720 − 176) 360/1.25 = 141.0; AISC 0.75 × 400 (720 − 192) = 158.4; IS 0.9 (720 − 176) 410/1.25 = 160.6 kN.
    const end = boltedEnd(90, { bolts: 2, gauge: 45 });
    within(kN(questionOf('en1993', flatOf(90, 8), { fy: 235, fu: 360 }, end), 'net rupture'), 141.0);
    within(kN(questionOf('aisc360', flatOf(90, 8), { fy: 250, fu: 400 }, end), 'net rupture'), 158.4);
    within(kN(questionOf('is800', flatOf(90, 8), { fy: 250, fu: 410 }, end), 'net rupture'), 160.6);
  });

  it('welded along its edges has AISC case 4 with nothing standing off', () => {
    // 3 × 120²/(3 × 120² + 90²) = 0.8421.
    const check = checkOf(
      questionOf('aisc360', flatOf(90, 8), { fy: 250, fu: 400 }, weldedEnd(90, 120)),
      'net rupture',
    );
    within(stepOf(check, 'U_4'), 0.8421, 0.00005);
  });
});

describe('a threaded rod', () => {
  it('of 20 mm ruptures at its thread', () => {
    // A_s 244.8, A_b 314.16, f_u 400. EN 0.9 × 400 × 244.8/1.25 = 70.5; AISC 0.75 × 0.75 × 400 × 314.16 = 70.7; CSA 0.75 × 0.80 × 400 × 314.16 = 75.4;
    // AS 0.80 × 244.8 × 400 = 78.3; IS min(0.9 × 400 × 244.8/1.25, 250 × 314.16/1.1) = min(70.5, 71.4) = 70.5 kN.
    const of = (practice: (typeof PRACTICES)[number]) =>
      kN(questionOf(practice, rodOf(20), { fy: 250, fu: 400 }, boltedEnd(20, {})), 'net rupture');
    within(of('en1993'), 70.5);
    within(of('aisc360'), 70.7);
    within(of('csaS16'), 75.4);
    within(of('sans10162'), 75.4);
    within(of('as4100'), 78.3);
    within(of('is800'), 70.5);
  });

  it('has no bolts to check: yield once, and its thread at each end', () => {
    const question = questionOf('en1993', rodOf(20), { fy: 250, fu: 400 }, boltedEnd(20, {}));
    expect(tensionResistances(question).map(({ kind, end }) => [kind, end])).toEqual([
      ['gross yield', null],
      ['net rupture', 'i'],
      ['net rupture', 'j'],
    ]);
  });
});

describe('what the rules held here do not speak of', () => {
  const refused = (practice: (typeof PRACTICES)[number], shape: SectionShape): boolean => {
    const question = questionOf(
      practice,
      angleOf(100, 100, 10, 12),
      { fy: 300, fu: 440 },
      boltedEnd(100, { bolts: 3 }),
    );
    const check = checkOf({ ...question, section: { ...question.section, shape } }, 'net rupture');
    expect(check.conditions.some(({ met }) => !met)).toBe(check.resistance === null);
    return check.resistance === null;
  };

  it('gives no rupture of a bolted tube by any practice', () => {
    for (const practice of PRACTICES) {
      expect(refused(practice, 'round tube'), practice).toBe(true);
      expect(refused(practice, 'square tube'), practice).toBe(true);
    }
  });

  it('gives a pair of angles by SANS, CSA and AISC, and back to back by AS', () => {
    expect(PRACTICES.filter((practice) => !refused(practice, 'angles back to back'))).toEqual([
      'sans10162',
      'csaS16',
      'aisc360',
      'as4100',
    ]);
    expect(PRACTICES.filter((practice) => !refused(practice, 'starred angles'))).toEqual([
      'sans10162',
      'csaS16',
      'aisc360',
    ]);
  });

  it('gives a channel by SANS, CSA, AISC and AS, a tee by the first three', () => {
    expect(PRACTICES.filter((practice) => !refused(practice, 'channel'))).toEqual([
      'sans10162',
      'csaS16',
      'aisc360',
      'as4100',
    ]);
    expect(PRACTICES.filter((practice) => !refused(practice, 'tee'))).toEqual([
      'sans10162',
      'csaS16',
      'aisc360',
    ]);
  });

  it('says what is there', () => {
    const question = questionOf(
      'en1993',
      angleOf(100, 100, 10, 12),
      { fy: 300, fu: 440 },
      boltedEnd(100, {}),
    );
    const check = checkOf({ ...question, section: { ...question.section, shape: 'tee' } }, 'net rupture');
    expect(check.conditions).toEqual([
      {
        says: 'a flat, or a single angle: what the rules held here speak of',
        met: false,
        found: 'a tee, bolted',
      },
    ]);
  });

  it('gives no rupture of one bolt by IS 6.3.3, which needs a length', () => {
    const question = questionOf(
      'is800',
      angleOf(100, 100, 10, 12),
      { fy: 250, fu: 410 },
      boltedEnd(100, { bolts: 1 }),
    );
    expect(checkOf(question, 'net rupture').conditions).toEqual([
      { says: 'two bolts in line at least, or a weld', met: false, found: 'one bolt' },
    ]);
  });
});
