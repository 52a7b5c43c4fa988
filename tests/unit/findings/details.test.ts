import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import type { Assessment } from '../../../core/assessment.ts';
import type { DiagonalSpec, Settings } from '../../../core/project/model.ts';
import { remediesFor } from '../../../core/remedies/remedies.ts';
import { bay, project, wall } from '../assess/given/bays.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';

const assessed = (diagonals: Partial<DiagonalSpec>, settings: Partial<Settings> = {}): Assessment =>
  assess(project([bay(wall(6000, [[4000, 'crossed']]), { diagonals })], settings), CATALOGUES);
const found = ({ findings }: Assessment, kind: string) => findings.filter((each) => each.kind === kind);

describe('a single bolt at an end', () => {
  const { ends } = bay(wall(6000, [[4000, 'crossed']])).diagonals;

  it('is told of as against common practice, and a second answers it', () => {
    const assessment = assessed({ ends: { ...ends, bolts: 1 } });
    const [finding] = found(assessment, 'one bolt at an end');
    expect(finding?.severity).toBe('note');
    expect(finding?.bars).toHaveLength(2);
    expect(found(assessed({ ends: { ...ends, bolts: 2 } }), 'one bolt at an end')).toEqual([]);
    const [remedy] = finding ? remediesFor(assessment, finding, CATALOGUES) : [];
    expect(remedy?.effect.answers).toBe(true);
  });

  it('is no matter for a rod, which has its nut, nor for a weld', () => {
    expect(found(assessed({ section: 'ROD 20', ends: { ...ends, bolts: 1 } }), 'one bolt at an end')).toEqual(
      [],
    );
    const welded = { ...ends, kind: 'welded' as const, bolts: 1, weldLength: 100 };
    expect(found(assessed({ ends: welded }), 'one bolt at an end')).toEqual([]);
  });
});

describe('a pair of angles', () => {
  // SCI P363, L 70×70×6: i_v 1.37 cm; about 6.5 m of steel between the ends is 475 of it, half of that 238.
  const pair = { section: '2L 70x70x6/10' };

  it('is joined too seldom as a tie where one angle is more slender than 300 between battens (AISC 360 D4, from memory)', () => {
    const none = assessed(pair);
    const [finding] = found(none, 'battens too far apart');
    expect(finding?.limit).toBe(300);
    expect(finding?.value ?? 0).toBeGreaterThan(450);
    expect(found(assessed({ ...pair, battens: 1 }), 'battens too far apart')).toEqual([]);
    const [remedy] = finding ? remediesFor(none, finding, CATALOGUES) : [];
    expect(remedy?.label).toBe('One batten');
    expect(remedy?.effect.answers).toBe(true);
  });

  it('is held closer where it is counted on in compression: 15 i_min back to back, 70 i_min starred by EN 1993-1-1 (from memory)', () => {
    const limit = (section: string) =>
      found(
        assessed({ section, countedOn: 'both', battens: 1 }, { practice: 'en1993' }),
        'battens too far apart',
      )[0]?.limit;
    expect(limit('2L 70x70x6/10')).toBe(15);
    expect(limit('2L 70x70x6/10 STAR')).toBe(70);
  });

  it('is a matter of pairs alone', () => {
    expect(found(assessed({ section: '70x70x6' }), 'battens too far apart')).toEqual([]);
  });
});
