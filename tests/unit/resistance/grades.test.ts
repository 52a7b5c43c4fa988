/** Steels by name. Figures: EN 10025-2, AS/NZS 3679.1, ASTM, CSA G40.21, SANS 1431 and IS 2062 as practice-facts H4 has them (from memory unless said there). */
import { describe, expect, it } from 'vitest';
import { steelFor, usualGrades } from '../../../core/resistance/grades.ts';
import { PRACTICES } from '../../published/tensionGiven.ts';

const E = 200_000;
const G = 77_000;
const figures = (practice: (typeof PRACTICES)[number], grade: string, t = 10): string => {
  const steel = steelFor(practice, grade, t, E, G);
  return steel ? `${steel.fy}/${steel.fu}` : 'unknown';
};

describe('a grade as people write it', () => {
  it('is known for every usual grade of every practice, at an angle’s thickness', () => {
    for (const practice of PRACTICES)
      for (const grade of usualGrades(practice)) expect(figures(practice, grade), grade).not.toBe('unknown');
  });

  it('is read with its suffixes, spaces, dashes and capitals', () => {
    for (const typed of [
      'S355',
      'S355JR',
      's355j2+n',
      'S 355 K2',
      'S355-JR',
      'EN 10025-2 S355J0',
      'SANS 50025 S355JR',
    ])
      expect(figures('en1993', typed), typed).toBe('355/470');
    for (const typed of ['A572 Gr 50', 'A572-50', 'ASTM A572 Gr. 50', 'a572 grade 50', 'A572M Gr 345'])
      expect(figures('aisc360', typed), typed).toBe('345/450');
    for (const typed of ['A529-50', 'A529 Gr 50']) expect(figures('aisc360', typed), typed).toBe('345/450');
    for (const typed of ['A36', 'ASTM A36/A36M']) expect(figures('aisc360', typed), typed).toBe('250/400');
    for (const typed of ['300', 'Grade 300', 'G300', '300PLUS', 'AS/NZS 3679.1-300'])
      expect(figures('as4100', typed), typed).toBe('320/440');
    for (const typed of ['E250', 'E 250 (Fe 410W) A', 'E250BR'])
      expect(figures('is800', typed), typed).toBe('250/410');
  });

  it('is unknown when it names another grade of the same standard, or nothing', () => {
    for (const typed of [
      'A572 Gr 42',
      'A572-65',
      'A529 Gr 55',
      'A360',
      'S460',
      'S3550',
      '3500',
      'E3500',
      'steel',
      '',
    ])
      expect(figures('aisc360', typed), typed).toBe('unknown');
  });

  it('means by 300W the steel of the practice: 440 in Canada, 450 in South Africa', () => {
    expect(figures('csaS16', '300W')).toBe('300/440');
    expect(figures('sans10162', '300W')).toBe('300/450');
    expect(figures('csaS16', '350W')).toBe('350/450');
    expect(figures('sans10162', '350WA')).toBe('350/480');
  });
});

describe('thickness', () => {
  it('steps European yield at 16, 40 and 63 mm, each step in the thinner range', () => {
    const at = (t: number) => figures('en1993', 'S355JR', t);
    expect([16, 16.1, 40, 40.1, 63, 63.1, 80, 80.1].map(at)).toEqual([
      '355/470',
      '345/470',
      '345/470',
      '335/470',
      '335/470',
      '325/470',
      '325/470',
      'unknown',
    ]);
    expect(figures('en1993', 'S275', 20)).toBe('265/410');
    expect(figures('en1993', 'S235', 10)).toBe('235/360');
  });

  it('steps Australian yield at 11 and 17 mm, each step in the thicker range', () => {
    const at = (t: number) => figures('as4100', '300', t);
    expect([10.9, 11, 16.9, 17].map(at)).toEqual(['320/440', '300/440', '300/440', '280/440']);
    expect([9.5, 12, 20].map((t) => figures('as4100', '350', t))).toEqual(['360/480', '340/480', '330/480']);
  });

  it('steps Indian yield at 20 and 40 mm', () => {
    expect([19.9, 20, 40, 41].map((t) => figures('is800', 'E250', t))).toEqual([
      '250/410',
      '240/410',
      '240/410',
      '230/410',
    ]);
  });
});

describe('the user’s own grades', () => {
  const own = [{ grade: 'Mill 420', fy: 420, fu: 520 }];

  it('come first, however they are typed', () => {
    expect(steelFor('en1993', 'mill-420', 10, E, G, own)).toMatchObject({ fy: 420, fu: 520, E, G });
    expect(steelFor('en1993', 'S355', 10, E, G, [{ grade: 'S355', fy: 350, fu: 490 }])?.fu).toBe(490);
  });

  it('are named as given in the project', () => {
    expect(steelFor('en1993', 'Mill 420', 10, E, G, own)?.source).toBe('as given in the project');
  });
});

it('every steel says where its figures come from', () => {
  for (const practice of PRACTICES)
    for (const grade of usualGrades(practice)) {
      const steel = steelFor(practice, grade, 10, E, G);
      expect(steel?.source.length, grade).toBeGreaterThan(5);
    }
});
