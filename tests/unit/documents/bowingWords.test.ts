import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import type { Assessment } from '../../../core/assessment.ts';
import type { Bowing } from '../../../core/bowing/model.ts';
import { type NeedAt, type ThreeReadings, threeReadings } from '../../../core/documents/bowingWords.ts';
import { applyEdit } from '../../../core/project/applyEdit.ts';
import type { UnitSystem } from '../../../core/units/unitSystem.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';
import { crossedTier, RISE } from './given.ts';

interface Given {
  readonly bowing?: Partial<Bowing>;
  readonly needs?: readonly NeedAt[];
  readonly units?: UnitSystem;
}

function read(assessment: Assessment, { bowing = {}, needs, units = 'metric' }: Given = {}): ThreeReadings {
  const bar = assessment.layout.bars.get(RISE);
  const diagonal = assessment.diagonals.get(RISE);
  if (!bar || !diagonal?.bowing) throw new Error('the tier has no such bar');
  const found = threeReadings({
    bar,
    diagonal: { ...diagonal, bowing: { ...diagonal.bowing, ...bowing } },
    practice: assessment.practice,
    units,
    needs: needs ?? null,
    markOf: (id) => assessment.layout.bars.get(id)?.mark ?? id,
  });
  if (!found) throw new Error('nothing to read');
  return found;
}

const figures = ({ readings }: ThreeReadings): readonly string[] => readings.map(({ figure }) => figure);
const bolted = crossedTier({ join: { kind: 'bolted' } });
const withShare = (share: number, join: 'bolted' | 'cut' = 'bolted'): Assessment =>
  assess(
    applyEdit(
      crossedTier({ join: join === 'cut' ? { kind: 'cut', cutBar: 't1.fall' } : { kind: 'bolted' } }).project,
      { kind: 'tension share', bay: 'B', crossing: 't1.fall+t1.rise', share },
    ),
    CATALOGUES,
  );

describe('the three readings of a bar', () => {
  // 70×70×6 over 5 m, E = 200 000 (SANS 10162-1), I = 368 840: 48EI/L³ = 28.3 N/mm offered, 16π²EI/L³ = 93.2 wanted (METHODS.md, "The push test");
  // 5000 / 21.3 = 235; two half-waves about v: 4π²·E·152 679/L² = 48.2 kN, π√(EA/N) with A = 812.69: 182.4.
  it('stand side by side with their units and what they are of', () => {
    const { readings } = read(bolted);
    expect(readings.map(({ name }) => name)).toEqual(['by the marks', 'by stiffness', 'by critical load']);
    expect(figures({ readings } as ThreeReadings)).toEqual(['235', '28.3 N/mm', '48.2 kN']);
    expect(readings.map(({ says }) => says)).toEqual([
      'about y, over 5.00 m',
      'of 93.2 wanted, out of plane at D2',
      'reads 182, 1.66 of the marks’ load',
    ]);
    expect(readings.map(({ stateSays }) => stateSays)).toEqual([
      'within 300',
      'too soft to count',
      'within 300',
    ]);
  });

  // 28.3 N/mm is 0.162 kip/in (1 kip/in is 175.127 N/mm), 48.2 kN is 10.8 kip (4.44822 kN each).
  it('are told in kips and inches too', () => {
    expect(figures(read(bolted, { units: 'us' })).slice(1)).toEqual(['0.162 kip/in', '10.8 kip']);
  });

  it('name the marks as worst where they leave out what helps, and say by how much', () => {
    const { worst, difference } = read(bolted);
    expect(worst).toBe('by the marks');
    // 1 − 182.4/234.7.
    expect(difference).toMatch(/D2 gives 28\.3 N\/mm out of plane, too little .* safe side by 22 %/);
  });

  it('say how little is needed once someone has looked closer', () => {
    const needs: readonly NeedAt[] = [
      { station: 1, direction: 'out of plane', needed: { planarIdeal: 93.2, for95: 17.6, forAll: 20.3 } },
    ];
    expect(read(bolted, { needs }).difference).toContain('needs only 20.3 N/mm to bow in shorter waves');
  });

  it('agree where nothing is joined', () => {
    const { worst, difference, readings } = read(crossedTier({ join: { kind: 'none' } }));
    expect(worst).toBeNull();
    expect(difference).toContain('Nothing is joined');
    expect(readings[1]?.state).toBe('nothing');
  });

  it('speak of a taut partner whose stiffness alone would not do', () => {
    const { difference, worst } = read(withShare(1, 'cut'));
    expect(worst).toBe('by the marks');
    expect(difference).toContain('D2, taut,');
  });

  it('turn round where the partner is squeezed as hard', () => {
    const { difference, worst } = read(withShare(-1, 'cut'));
    expect(worst).toBe('by critical load');
    expect(difference).toMatch(/D2 is squeezed too.*unsafe side/);
  });

  it('blame a weak hold by name', () => {
    const { stations, real } = bowingOf(bolted);
    const weak = stations.map((station) => ({
      ...station,
      holds: station.holds.map((hold) => (hold.grip === null ? hold : { ...hold, grip: 0.4, offered: 12 })),
    }));
    const { worst, difference, readings } = read(bolted, {
      bowing: { stations: weak, real: { ...real, N: 10_000, slenderness: 400 } },
    });
    expect(worst).toBe('by stiffness');
    expect(readings[1]).toMatchObject({ figure: '12.0 N/mm', state: 'weak', stateSays: 'grips 40 %' });
    expect(difference).toMatch(/D2 gives only 12\.0 N\/mm in plane and keeps 40 %/);
  });

  it('say that twist is in the figure, and by how much', () => {
    const twist = { ratio: 0.93, governs: true };
    const safe = read(bolted, { bowing: { twist } });
    expect(safe.difference).toContain('takes 7.0 % of the load');
    expect(safe.readings[2]?.says).toContain('with twist');
    const { real } = bowingOf(bolted);
    const unsafe = read(bolted, { bowing: { twist, real: { ...real, N: 20_000, slenderness: 283 } } });
    expect(unsafe.difference).toMatch(/^Bowing and twisting together take 7\.0 %/);
  });

  it('trust no hold of a bay that can move', () => {
    const { worst, difference, readings } = read(bolted, { bowing: { unsupported: 'The bay can move.' } });
    expect(worst).toBe('by stiffness');
    expect(readings[1]?.figure).toBe('–');
    expect(difference).toMatch(/^The bay can move\. .*leans on holds that are not there/);
  });

  it('keep the bound beside an exact reading of mixed holds', () => {
    const diagonal = bolted.diagonals.get(RISE);
    const bar = bolted.layout.bars.get(RISE);
    if (!bar || !diagonal?.inService) throw new Error('the tier has no such bar');
    const found = threeReadings({
      bar,
      diagonal: { ...diagonal, inService: { ...diagonal.inService, slenderness: 223, bound: 309 } },
      practice: bolted.practice,
      units: 'metric',
      needs: null,
      markOf: String,
    });
    expect(found?.readings[0]).toMatchObject({ figure: '223', says: 'exact; bound 309' });
  });
});

function bowingOf(assessment: Assessment): Bowing {
  const bowing = assessment.diagonals.get(RISE)?.bowing;
  if (!bowing) throw new Error('the tier has no such bar');
  return bowing;
}
