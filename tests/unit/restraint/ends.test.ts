/** Ends that are marked as holding less than both ways: lengths by hand, the finding where too little is left, and what answers it. */
import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import { scheduleCsv } from '../../../core/documents/scheduleCsv.ts';
import { scheduleTable } from '../../../core/documents/scheduleTable.ts';
import { applyEdit, editLabel } from '../../../core/project/applyEdit.ts';
import type { BarMark, Bay, EndHolds } from '../../../core/project/model.ts';
import { readProject } from '../../../core/project/readProject.ts';
import { writeProject } from '../../../core/project/writeProject.ts';
import { remediesFor } from '../../../core/remedies/remedies.ts';
import { bay, line, project, roof, vouched, wall } from '../assess/given/bays.ts';
import { CATALOGUES, propertiesOf } from '../assess/given/catalogues.ts';
import { assessed, restraintIn } from '../assess/given/reading.ts';

const endJ = (holds: EndHolds): BarMark => ({ endJ: { holds } });

/** One diagonal of a level roof, 6 m wide and 8 m up the slope: 10 m long, with a purlin vouched for at 4 m along it. */
const PURLIN_KEY = 'P1+a.p1.rise';
const underPurlin = (mark: BarMark, pitch = 0): Bay =>
  bay(roof(6000, pitch, [[8000, 'rising']], [line('P1', 3200, vouched)]), {
    joins: { [PURLIN_KEY]: { kind: 'purlin', boltsAcross: 1 } },
    bars: { 'a.p1.rise': mark },
  });
const RISE = 'B/a.p1.rise';

describe('a bar held by a purlin at 4 m of 10 m', () => {
  it('has its longest part of 6 m counted with ends that hold', () => {
    const { lanes } = restraintIn(assessed(underPurlin({})), RISE);
    for (const axis of ['x', 'y', 'u', 'v'] as const) expect(lanes[axis].found).toBeCloseTo(6000, 6);
  });

  it('counts the 4 m span and twice the 6 m beyond where end j lets go', () => {
    const { lanes } = restraintIn(assessed(underPurlin(endJ('nothing'))), RISE);
    for (const axis of ['x', 'y', 'u', 'v'] as const) {
      expect(lanes[axis].found).toBeCloseTo(4000 + 2 * 6000, 6);
      expect(lanes[axis].endsStop).toEqual([true, false]);
    }
  });

  it('does so for the way alone that end j lets go, and for neither of the slanting axes', () => {
    // The longer leg in the plane: bending about x moves the bar in the plane, about y out of it; u and v move it both ways, and any hold stops them.
    const inPlane = restraintIn(assessed(underPurlin(endJ('in plane only'))), RISE).lanes;
    const outOfPlane = restraintIn(assessed(underPurlin(endJ('out of plane only'))), RISE).lanes;
    expect(inPlane.y.found).toBeCloseTo(16_000, 6);
    expect(outOfPlane.x.found).toBeCloseTo(16_000, 6);
    for (const found of [inPlane.x, inPlane.u, inPlane.v, outOfPlane.y, outOfPlane.u, outOfPlane.v])
      expect(found.found).toBeCloseTo(6000, 6);
  });

  it('reads its exact slenderness in service, with the bound over the least radius beside it', () => {
    const { inService } = assessed(underPurlin(endJ('in plane only'))).diagonals.get(RISE) ?? {};
    const { rv } = propertiesOf('70x70x6');
    expect(inService?.bound).toBeCloseTo(16_000 / rv, 4);
    expect(inService?.slenderness).toBeLessThan(16_000 / rv);
    // No less than the 6 m part over the least radius, which it has with an end that holds.
    expect(inService?.slenderness).toBeGreaterThan(6000 / rv);
  });

  it('says in its reason what the end holds', () => {
    const { reason } = assessed(underPurlin(endJ('in plane only'))).diagonals.get(RISE) ?? {};
    expect(reason).toMatch(/^End j holds in the plane only, as marked, so D1 swings out/);
  });

  it('has less of a critical load with each hold that an end lets go, by the marks and with stiffness', () => {
    const loads = (holds: EndHolds) => {
      const { bowing } = assess(project([underPurlin(endJ(holds))]), CATALOGUES).diagonals.get(RISE) ?? {};
      if (!bowing) throw new Error('no critical load');
      return [bowing.rigid.N, bowing.real.N] as const;
    };
    const [both, one, none] = [loads('both'), loads('out of plane only'), loads('nothing')];
    for (const k of [0, 1] as const) {
      expect(one[k]).toBeLessThan(both[k]);
      expect(none[k]).toBeLessThanOrEqual(one[k]);
    }
  });

  it('sags over the length that counts, where the end carries no weight', () => {
    const sagging = (mark: BarMark) => {
      const { findings } = assessed(underPurlin(mark, 30), { sagRatio: 5000 });
      return findings.find(({ kind }) => kind === 'sag')?.detail ?? '';
    };
    // The words name the length that sags: 6 m to the end, or 4 m and twice 6 m.
    expect(sagging({})).toContain('over 6.00 m');
    expect(sagging(endJ('nothing'))).toContain('over 16.00 m');
  });
});

describe('a crossed pair with an end that lets go', () => {
  const KEY = 't1.fall+t1.rise';
  const crossed = (mark: BarMark) =>
    bay(wall(6000, [[4000, 'crossed']]), { joins: { [KEY]: { kind: 'bolted' } }, bars: { 't1.rise': mark } });

  it('can move out of the plane, since its partner holds it in the plane alone: must fix, and a limit broken', () => {
    const assessment = assessed(crossed(endJ('in plane only')));
    const bar = assessment.diagonals.get('B/t1.rise');
    expect(bar).toMatchObject({ restraint: null, turns: ['out of plane'], inService: null, status: 'over' });
    expect(bar?.handling).not.toBeNull();
    expect(bar?.reason).toContain('end j holds in the plane only');
    expect(assessment.breaksLimit).toBe(true);
    expect(assessment.findings.filter(({ kind }) => kind === 'bar can move')).toMatchObject([
      {
        id: 'turns:B/t1.rise',
        severity: 'must fix',
        breaksLimit: true,
        path: 'bays[0].bars.t1.rise.endJ.holds',
      },
    ]);
    expect(assessment.findings.some(({ kind }) => kind === 'no length left')).toBe(false);
  });

  it('stays assessed where the hold let go is the one its partner gives', () => {
    const { lanes } = restraintIn(assessed(crossed(endJ('out of plane only'))), 'B/t1.rise');
    const L = Math.hypot(6000, 4000);
    // In the plane: half of it to the partner, and twice the half beyond.
    expect(lanes.x.found).toBeCloseTo(1.5 * L, 6);
    expect(lanes.y.found).toBeCloseTo(L, 6);
  });

  it('is answered by holding the end, which closes the finding and leaves what else the end has', () => {
    const mark: BarMark = { endJ: { holds: 'nothing', bolts: 3 } };
    const before = assess(project([crossed(mark)]), CATALOGUES);
    const finding = before.findings.find(({ kind }) => kind === 'bar can move');
    if (!finding) throw new Error('no finding');
    const [remedy] = remediesFor(before, finding, CATALOGUES);
    expect(remedy?.label).toBe('Hold the end');
    const after = (remedy?.edits ?? []).reduce(applyEdit, before.project);
    expect(after.bays[0]?.bars['t1.rise']?.endJ).toEqual({ holds: 'both', bolts: 3 });
    expect(assess(after, CATALOGUES).findings.some(({ kind }) => kind === 'bar can move')).toBe(false);
  });

  it('is told in the schedule, whatever its form', () => {
    const { schedule } = assessed(crossed(endJ('in plane only')));
    const row = schedule.find(({ bar }) => bar === 'B/t1.rise');
    expect(row?.endsHold).toEqual({ i: 'both', j: 'in plane only' });
    expect(scheduleTable(schedule, 'metric')).toContain('marked: end j holds in the plane only');
    expect(scheduleCsv(schedule, 'metric')).toContain('end j holds in the plane only');
  });
});

describe('the mark in the project', () => {
  it('is written and read back, and no file needs it', () => {
    const made = project([underPurlin(endJ('nothing'))]);
    expect(readProject(writeProject(made))).toMatchObject({ ok: true, project: made });
  });

  it('has an edit with a name of its own', () => {
    expect(editLabel({ kind: 'bars', bars: [RISE], change: endJ('nothing') })).toBe(
      `Change end j of ${RISE}`,
    );
  });
});
