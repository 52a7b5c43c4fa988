/** Demands against resistances, and what is found of them. */
import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import type { Assessment } from '../../../core/assessment.ts';
import type { Actions } from '../../../core/project/actions.ts';
import type { DiagonalSpec, Settings } from '../../../core/project/model.ts';
import { remediesFor } from '../../../core/remedies/remedies.ts';
import { bay, project, wall } from '../assess/given/bays.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';

/** Pushed at its head, 5 m wide and 4 m high. */
function pushed(
  kN: number,
  diagonals: Partial<DiagonalSpec> = {},
  settings: Partial<Settings> = {},
): Assessment {
  const actions: Actions = {
    cases: [
      {
        id: 'W',
        name: 'wind',
        kind: 'wind',
        selfWeight: false,
        reverses: true,
        loads: [{ kind: 'node', id: 'f', node: 'B/L1', force: [kN, 0, 0] }],
      },
    ],
    combinations: [{ id: 'C', name: 'wind alone', use: 'strength', factors: { W: 1 }, leaning: false }],
    carries: [],
  };
  const given = project([bay(wall(5000, [[4000, 'crossed']]), { diagonals })], settings);
  return assess({ ...given, actions }, CATALOGUES);
}

const checksOf = (assessment: Assessment) => {
  const checks = assessment.diagonals.get('B/t1.rise')?.checks;
  if (!checks) throw new Error('no checks');
  return checks;
};
const kinds = (assessment: Assessment) => assessment.findings.map(({ kind }) => kind);

describe('a diagonal that is pulled', () => {
  it('is used by its force over the least of what resists', () => {
    // Statics: 40 kN × √41/5 = 51.2 kN.
    const checks = checksOf(pushed(40));
    expect(checks.tension?.force).toBeCloseTo((40_000 * Math.sqrt(41)) / 5, 2);
    const least = Math.min(
      ...checks.checks.flatMap(({ resistance }) =>
        resistance.against === 'compression' || resistance.resistance === null ? [] : [resistance.resistance],
      ),
    );
    expect(checks.governing?.resistance.resistance).toBe(least);
    expect(checks.governing?.utilisation).toBeCloseTo((checks.tension?.force ?? 0) / least, 12);
  });

  it('is found too weak, and a remedy makes it strong enough', () => {
    const assessment = pushed(100);
    const finding = assessment.findings.find(({ kind }) => kind === 'resistance exceeded');
    expect(finding?.breaksLimit).toBe(true);
    expect(assessment.breaksLimit).toBe(true);
    const remedies = finding ? remediesFor(assessment, finding, CATALOGUES) : [];
    expect(remedies.some(({ effect }) => effect.answers)).toBe(true);
  });

  it('is not called checked while its steel is unknown', () => {
    const assessment = pushed(10, { grade: 'best iron' });
    expect(checksOf(assessment).status).toBe('unknown');
    expect(kinds(assessment)).toContain('not checked');
  });

  it('is not called checked where a rule gives no figure', () => {
    // EN 1993-1-8, 3.10.3 speaks of one row of bolts.
    const { ends } = bay(wall(5000, [[4000, 'crossed']])).diagonals;
    const assessment = pushed(
      10,
      { section: '150x150x12', ends: { ...ends, rows: 2, rowSpacing: 60, gauge: 50, bolts: 4 } },
      { practice: 'en1993' },
    );
    expect(kinds(assessment)).toContain('not checked');
    // Other checks pass; the bar is not called within for that, nor is the command content.
    expect(checksOf(assessment).status).toBe('unknown');
    expect(assessment.breaksLimit).toBe(true);
    const row = assessment.schedule.find(({ bar }) => bar === 'B/t1.rise');
    expect(row?.utilisation).toBeNull();
    expect(row?.governingCheck).toContain('not checked');
  });

  it('is over where nothing resists: a weld without length', () => {
    const { ends } = bay(wall(5000, [[4000, 'crossed']])).diagonals;
    const assessment = pushed(10, { ends: { ...ends, kind: 'welded', weldLength: 0 } });
    const checks = checksOf(assessment);
    expect(checks.governing?.resistance.resistance).toBe(0);
    expect(checks.governing?.utilisation).toBe(999);
    expect(checks.status).toBe('over');
    expect(assessment.findings.find(({ kind }) => kind === 'resistance exceeded')?.title).toContain(
      'nothing to speak of resists',
    );
    expect(assessment.breaksLimit).toBe(true);
  });

  it('uses as much in US units as in metric ones', () => {
    const metric = checksOf(pushed(40));
    const us = checksOf(pushed(40, {}, { units: 'us' }));
    expect(us.governing?.utilisation).toBe(metric.governing?.utilisation);
  });

  it('uses as much in every check under every practice, whichever units are shown', () => {
    for (const practice of ['sans10162', 'csaS16', 'aisc360', 'en1993', 'as4100', 'is800'] as const) {
      const used = (units: 'metric' | 'us') =>
        checksOf(pushed(40, { countedOn: 'both', section: '100x100x10' }, { practice, units })).checks.map(
          ({ utilisation }) => utilisation,
        );
      expect(used('us'), practice).toEqual(used('metric'));
      expect(used('metric').filter((each) => each !== null).length, practice).toBeGreaterThan(8);
    }
  });
});

describe('a diagonal counted on in compression too', () => {
  it('is found squeezed off its middle where the rule for one leg does not apply', () => {
    const { ends } = bay(wall(5000, [[4000, 'crossed']])).diagonals;
    const one = pushed(2, { countedOn: 'both', ends: { ...ends, bolts: 1 } }, { practice: 'en1993' });
    const finding = one.findings.find(({ kind }) => kind === 'squeezed off its middle');
    expect(finding?.severity).toBe('look into');
    expect(finding?.detail).toContain('BB.1.2');
    const two = pushed(2, { countedOn: 'both' }, { practice: 'en1993' });
    expect(kinds(two)).not.toContain('squeezed off its middle');
    // AS 4100 8.4.6 is not held here.
    const as = pushed(2, { countedOn: 'both', grade: '300' }, { practice: 'as4100' });
    expect(kinds(as)).toContain('squeezed off its middle');
  });

  it('is judged by no more than its critical load', () => {
    const assessment = pushed(2, { countedOn: 'both' });
    const checks = checksOf(assessment);
    const critical = assessment.diagonals.get('B/t1.rise')?.bowing?.real.N ?? 0;
    expect(checks.compression?.force).toBeGreaterThan(0);
    expect(checks.compressionBy?.resistance).toBeLessThan(critical);
  });
});
