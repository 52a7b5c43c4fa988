import { describe, expect, it } from 'vitest';
import type { SectionChoice } from '../../../renderer/assessing/assessApi.ts';
import { matchingSections, onlySection } from '../../../renderer/controls/sectionMatch.ts';
import { isWhole, scoreOf } from '../../../renderer/shell/find/fuzzy.ts';

describe('finding by a few letters', () => {
  const better = (typed: string, good: string, worse: string): boolean =>
    (scoreOf(typed, good) ?? -1) > (scoreOf(typed, worse) ?? -1);

  it('prefers the whole, then a beginning, then a word, then any place, then letters in order', () => {
    expect(better('d1', 'D1', 'D12')).toBe(true);
    expect(better('save', 'Save as', 'Autosave')).toBe(true);
    expect(better('as', 'Save as', 'Phase')).toBe(true);
    expect(better('sav', 'Autosave', 'Set a value')).toBe(true);
  });

  it('puts a mark that was typed whole before those that begin so', () => {
    expect(better('d1', 'D1 W1, 90×90×7 and a long name', 'D12 W1, 70×70×6')).toBe(true);
    expect(isWhole('d1', 'D1')).toBe(true);
    expect(isWhole('d1', 'D10')).toBe(false);
    expect(isWhole(' ', '')).toBe(false);
  });

  it('wants every word that was typed', () => {
    expect(scoreOf('d1 w2', 'D1 W1')).toBe(null);
    expect(scoreOf('d1 w1', 'D1 W1')).not.toBe(null);
  });

  it('takes × and x alike', () => {
    expect(scoreOf('70x70', '70×70×6')).not.toBe(null);
  });
});

describe('narrowing the stock list', () => {
  const choices = ['70x70x6', '100x70x8', 'L3X3X1/4'].map(
    (designation): SectionChoice => ({ designation, kind: 'equal', own: false, massPerMetre: 1 }),
  );
  const names = (typed: string): readonly string[] =>
    matchingSections(choices, typed).map(({ designation }) => designation);

  it('puts those that begin so before those that hold it', () => {
    expect(names('70')).toEqual(['70x70x6', '100x70x8']);
  });

  it('takes the ways people type', () => {
    expect(names('L 70 × 70 × 6')).toEqual(['70x70x6']);
    expect(names('3x3x1/4')).toEqual(['L3X3X1/4']);
  });

  it('gives all for nothing and nothing for nonsense', () => {
    expect(names('  ')).toHaveLength(3);
    expect(names('zzz')).toEqual([]);
  });

  it('takes a name typed in full, or the only one that fits, and nothing in doubt', () => {
    expect(onlySection(choices, '70x70x6')?.designation).toBe('70x70x6');
    expect(onlySection(matchingSections(choices, '100'), '100')?.designation).toBe('100x70x8');
    expect(onlySection(matchingSections(choices, '70'), '70')).toBe(undefined);
  });
});
