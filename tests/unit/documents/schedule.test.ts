import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import { scheduleCsv } from '../../../core/documents/scheduleCsv.ts';
import { scheduleTable } from '../../../core/documents/scheduleTable.ts';
import type { ScheduleRow } from '../../../core/schedule/model.ts';
import { bay, line, project, roof } from '../assess/given/bays.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';
import { crossedTier, RISE } from './given.ts';

// Radii of 70x70x6 from the areas and second moments of METHODS.md §1: A 812.69 mm², Ix 368 840, Iu 585 000, Iv 152 679 mm⁴.
const RX = Math.sqrt(368_840 / 812.69);
const RU = Math.sqrt(585_000 / 812.69);
const RV = Math.sqrt(152_679 / 812.69);
/** Half the last digit of 812.69 makes 6e-6 of a slenderness, and half of that of the second moments no more: below 0.001 in each. */
const DIGITS = 2;

function rowOf(assessment: ReturnType<typeof crossedTier>): ScheduleRow {
  const row = assessment.schedule.find(({ bar }) => bar === RISE);
  if (!row) throw new Error('the rising diagonal has no row');
  return row;
}

describe('the schedule of a crossed tier 3 m by 4 m, bolted through', () => {
  const row = rowOf(crossedTier({ join: { kind: 'bolted' }, numberOff: 3 }));

  // Three, four, five; steel begins 350 − 40 = 310 mm from each set-out point, and the hole lies 2500 − 310 mm from end A.
  it('gives set-out, cut length and hole by hand', () => {
    expect(row.setOutLength).toBeCloseTo(5000, 6);
    expect(row.cutLength).toBeCloseTo(5000 - 2 * 310, 6);
    expect(row.pieces).toHaveLength(1);
    expect(row.crossingHoles).toHaveLength(1);
    expect(row.crossingHoles[0]).toBeCloseTo(2190, 6);
  });

  // 6.38 kg/m, EN 10056-1 sizes in SCI P363.
  it('gives the mass of one and of all three', () => {
    expect(row.massEach).toBeCloseTo(4.38 * 6.38, 6);
    expect(row.mass).toBe(row.massEach);
    expect(row.massTotal).toBeCloseTo(3 * 4.38 * 6.38, 6);
    expect(row.numberOff).toBe(3);
  });

  // METHODS.md §3: held in the plane only, x, u and v are cut at the crossing, y runs the full length.
  it('gives the four lanes and the governing one by hand', () => {
    expect(row.unbraced).toEqual({ x: 2500, y: 5000, u: 2500, v: 2500 });
    expect(row.slenderness?.x).toBeCloseTo(2500 / RX, DIGITS);
    expect(row.slenderness?.y).toBeCloseTo(5000 / RX, DIGITS);
    expect(row.slenderness?.u).toBeCloseTo(2500 / RU, DIGITS);
    expect(row.slenderness?.v).toBeCloseTo(2500 / RV, DIGITS);
    expect(row.governing).toMatchObject({ axis: 'y', angle: null, length: 5000, basis: 'span' });
    expect(row.governing?.slenderness).toBeCloseTo(5000 / RX, DIGITS);
  });

  it('gives both verdicts, and which one is asked for', () => {
    expect(row.inService).toMatchObject({ limit: 300, ok: true, asked: true });
    expect(row.handling).toMatchObject({ limit: 300, ok: false, asked: false });
    expect(row.handling?.slenderness).toBeCloseTo(4380 / RV, DIGITS);
  });

  it('names what is done at the crossing, and its findings', () => {
    expect(row.joins).toEqual(['D2: bolted through']);
    expect(row.findings.map(({ kind }) => kind)).toContain('too slender to handle');
  });
});

describe('other joins in the schedule', () => {
  it('tells the cut bar from the one that runs through', () => {
    const { schedule } = crossedTier({ join: { kind: 'cut', cutBar: 't1.rise' } });
    expect(schedule.map(({ mark, joins }) => [mark, ...joins])).toEqual([
      ['D1', 'D2: cut and plated'],
      ['D2', 'D1: runs through, partner cut'],
    ]);
    expect(schedule[0]?.pieces).toHaveLength(2);
  });

  // Gusset 10 mm between the legs.
  it('takes the gap for a packer that was given no thickness', () => {
    expect(rowOf(crossedTier({ join: { kind: 'packed', packer: null } })).packer).toBeCloseTo(10, 6);
    expect(rowOf(crossedTier({ join: { kind: 'packed', packer: 8 } })).packer).toBe(8);
    expect(rowOf(crossedTier()).packer).toBeNull();
  });

  it('says that an unmarked crossing is taken as not joined', () => {
    expect(rowOf(crossedTier()).joins).toEqual(['D2: unmarked, taken as not joined']);
  });

  it('keeps a row without figures for a section that is in no list', () => {
    const row = rowOf(crossedTier({ diagonals: { section: '71x71x6' } }));
    expect(row).toMatchObject({
      section: '71x71x6',
      unbraced: null,
      radius: null,
      slenderness: null,
      governing: null,
      handling: null,
      inService: null,
      mass: null,
    });
    expect(row.setOutLength).toBeCloseTo(5000, 6);
  });

  it('shows a length set by hand with its reason', () => {
    const overrides = [{ axis: 'y', length: 2500, factor: 1, reason: 'tied back, see sketch 4' }] as const;
    const row = rowOf(crossedTier({ join: { kind: 'bolted' }, bars: { 't1.rise': { overrides } } }));
    expect(row.overrides).toEqual(overrides);
    expect(row.unbraced?.y).toBe(2500);
    expect(scheduleCsv([row], 'metric')).toContain('y: 2.50 m, because tied back, see sketch 4');
  });
});

describe('a bar with mixed holds in the schedule', () => {
  // Purlins at 1 and 3 m stop D1 out of the plane alone, its partner at 2 m in the plane alone.
  const lines = [line('P1', 1000), line('P2', 3000)];
  const joins = Object.fromEntries(
    lines.map(({ id }) => [`${id}+a.p1.rise`, { kind: 'purlin', boltsAcross: 1 } as const]),
  );
  const mixed = assess(
    project([
      bay(roof(3000, 10, [[4000, 'crossed']], lines), {
        joins: { 'a.p1.fall+a.p1.rise': { kind: 'bolted' }, ...joins },
      }),
    ]),
    CATALOGUES,
  );
  const row = mixed.schedule.find(({ bar }) => bar === 'B/a.p1.rise');

  it('is governed by the exact figure that its verdict rests on, with the bound beside it', () => {
    expect(row?.governing?.basis).toBe('exact');
    expect(row?.governing?.slenderness).toBe(row?.inService?.slenderness);
    expect(row?.bound?.slenderness).toBe(
      mixed.diagonals.get('B/a.p1.rise')?.restraint?.governing.slenderness,
    );
    expect(row?.bound?.slenderness).toBeGreaterThan(row?.governing?.slenderness ?? Infinity);
    // Length over radius is the slenderness, in the figures as in any other row. Rounding of one division.
    expect((row?.governing?.length ?? 0) / (row?.governing?.radius ?? 0)).toBeCloseTo(
      row?.governing?.slenderness ?? -1,
      9,
    );
  });

  it('says one figure throughout its line of the table and of the CSV', () => {
    const said = String(Math.round(row?.inService?.slenderness ?? 0));
    const told = scheduleTable(row ? [row] : [], 'metric').split('\n')[2] ?? '';
    expect(told).toMatch(new RegExp(`, exact +${said} +300 +${said} within`));
    expect(scheduleCsv(row ? [row] : [], 'metric')).toContain(
      `,exact,${row?.bound?.slenderness.toFixed(1)},`,
    );
  });

  it('has no bound where the holds are not mixed', () => {
    expect(rowOf(crossedTier({ join: { kind: 'bolted' } })).bound).toBeNull();
  });
});

describe('the schedule as CSV', () => {
  const { schedule } = crossedTier({ join: { kind: 'bolted' } });
  const cell = (units: 'metric' | 'us', head: string): string | undefined => {
    const [heads, first] = scheduleCsv(schedule, units)
      .split('\r\n')
      .map((line) => line.split(','));
    return first?.[heads?.indexOf(head) ?? -1];
  };

  it('has one line of heads, one a bar, each as long as the other', () => {
    const lines = scheduleCsv(schedule, 'metric').split('\r\n');
    expect(lines).toHaveLength(1 + schedule.length + 1);
    expect(lines[0]?.split(',')).toContain('cut length (mm)');
  });

  it('gives mm and kg, or inches and pounds, as its heads say', () => {
    expect(cell('metric', 'set-out length (mm)')).toBe('5000');
    expect(cell('metric', 'mass each (kg)')).toBe('27.94');
    // 5000 / 25.4 = 196.85 in; 27.9444 / 0.45359237 = 61.6 lb.
    expect(cell('us', 'set-out length (in)')).toBe('196.85');
    expect(cell('us', 'mass each (lb)')).toBe('61.6');
  });

  it('lets no mark or grade of the project become a formula', () => {
    const { schedule: rows } = crossedTier({ bars: { 't1.rise': { mark: '=cmd()', grade: '@x' } } });
    const text = scheduleCsv(rows, 'metric');
    expect(text).toContain("'=cmd()");
    expect(text).toContain("'@x");
  });
});

describe('the schedule as a table', () => {
  it('lines up its columns and ends with the mass of all', () => {
    const { schedule } = crossedTier({ join: { kind: 'bolted' }, numberOff: 2 });
    const lines = scheduleTable(schedule, 'metric').split('\n');
    expect(lines[0]).toMatch(/^bay +mark +off +section/);
    expect(lines[2]).toMatch(
      /^B +D1 +2 +70x70x6 +5\.00 +4\.38 +27\.9 +2\.50 +5\.00 +2\.50 +2\.50 +y +235 +300 +235 within/,
    );
    // Two diagonals, two off.
    expect(lines).toContain('4 pieces, 111.8 kg in all');
  });

  it('puts what the practice does not ask for in brackets', () => {
    const { schedule } = crossedTier({ join: { kind: 'bolted' } });
    expect(scheduleTable(schedule, 'metric')).toContain('(320 OVER)');
  });

  it('marks a length set by hand, and gives axis, length, factor and reason below', () => {
    const overrides = [{ axis: 'y', length: 2500, factor: 0.9, reason: 'tied back, see sketch 4' }] as const;
    const { schedule } = crossedTier({ join: { kind: 'bolted' }, bars: { 't1.rise': { overrides } } });
    const lines = scheduleTable(schedule, 'metric').split('\n');
    // 2500 × 0.9 = 2250 mm about y; the other three, and the other bar, are as found.
    expect(lines.find((line) => /^B +D1 /.test(line))).toMatch(/ 2\.50 +2\.25\* +2\.50 +2\.50 /);
    expect(lines.find((line) => /^B +D2 /.test(line))).not.toContain('*');
    expect(lines).toContain('* B D1, set by hand: y: 2.50 m × 0.9, because tied back, see sketch 4');
  });

  it('gives US lengths in feet and inches to the sixteenth, as they are cut', () => {
    const { schedule } = crossedTier({ join: { kind: 'bolted' } });
    const lines = scheduleTable(schedule, 'us').split('\n');
    expect(lines[0]).toMatch(/set-out ft-in +cut ft-in/);
    // 5000/25.4 = 196.850 in = 16 ft 4 27.2/32 → 16'-4 7/8"; 4380/25.4 = 172.441 in = 14 ft 4 7.06/16 in.
    expect(lines[2]).toContain('16\'-4 7/8"  14\'-4 7/16"');
  });

  it('says when there is nothing to list', () => {
    expect(scheduleTable([], 'metric')).toBe('No diagonals.\n');
  });

  it('keeps control characters of the project out of the terminal', () => {
    const { schedule } = crossedTier({ bars: { 't1.rise': { mark: 'D1\u001b[31m' } } });
    expect(scheduleTable(schedule, 'metric')).not.toContain('\u001b');
  });
});
