/**
 * Twenty bars, crossed pairs and twisting bars solved independently of this program (data/stability-cases.json says how): loads, second
 * loads, effective lengths and shapes, read from the file as anyone's cases are.
 */
import { describe, expect, it } from 'vitest';
import type { SolvedBar, SolvedCase, SolvedPair } from '../../core/cases/model.ts';
import { readCases } from '../../core/cases/readCases.ts';
import { solveCase } from '../../core/cases/solveCase.ts';
import published from './data/stability-cases.json' with { type: 'json' };

/** Asked of bowing and of twist: shares of the load. The file's own figures are good to half of the sixth figure. */
const BOWING = 0.0005;
const TWIST = 0.002;

interface Expected {
  readonly N_cr: number;
  readonly lambda_cr?: number;
  readonly lambda_second?: number;
  readonly N_second?: number;
  readonly N_cr_flexural_only?: number;
  readonly ratio?: number;
  readonly L_eff_mm?: Readonly<Record<'xx' | 'yy' | 'u' | 'v', number>>;
  readonly K?: number | Readonly<Record<'xx' | 'yy' | 'u' | 'v', number>>;
  readonly mode?: string;
  readonly mode_data?: {
    readonly symmetry: string;
    readonly bending_energy_about_v: number;
    readonly bending_energy_about_u: number;
    readonly z_max_over_L: number;
    readonly dir_at_max_deg: number;
    readonly sign_changes_weak: number;
    readonly sign_changes_strong: number;
  };
}

const CASES = published.cases.map(({ id, title, type, result }) => ({
  id,
  title,
  type,
  expected: result as Expected,
}));
const OF_BARS = CASES.filter(({ type }) => type === 'bar');
const OF_PAIRS = CASES.filter(({ type }) => type === 'xbrace-planar');

const read = readCases(published);
const SOLVED = new Map(
  (read.ok ? read.cases : []).flatMap((each) => (each.ok ? [[each.case.id, solveCase(each.case)]] : [])),
);

function solvedCase(id: string): SolvedCase {
  const solved = SOLVED.get(id);
  if (!solved) throw new Error(`${id} was not read`);
  return solved;
}

function solvedBar(id: string): SolvedBar {
  const solved = solvedCase(id);
  if (solved.type === 'xbrace-planar') throw new Error(`${id} is no bar`);
  return solved;
}

function solvedPair(id: string): SolvedPair {
  const solved = solvedCase(id);
  if (solved.type !== 'xbrace-planar') throw new Error(`${id} is no pair`);
  return solved;
}

function expectWithin(actual: number | undefined | null, expected: number, share: number): void {
  expect(Math.abs((actual ?? Number.NaN) / expected - 1), `${actual} against ${expected}`).toBeLessThan(
    share,
  );
}

it('takes all twenty', () => {
  expect([...SOLVED.keys()]).toEqual(CASES.map(({ id }) => id));
  expect(SOLVED.size).toBe(20);
});

describe('bars', () => {
  it.each(OF_BARS)('$id, $title: the first and the second load', ({ id, expected }) => {
    const { critical } = solvedBar(id);
    expectWithin(critical?.N, expected.N_cr, BOWING);
    expectWithin(critical?.factor, expected.lambda_cr ?? 0, BOWING);
    expectWithin(critical?.secondFactor, expected.lambda_second ?? 0, BOWING);
    // Well within what is asked: as near as the printed figures go.
    expectWithin(critical?.N, expected.N_cr, 4e-6);
  });

  it.each(OF_BARS)('$id, $title: effective lengths, and those over the length', ({ id, expected }) => {
    const { critical, length } = solvedBar(id);
    for (const [axis, name] of [
      ['x', 'xx'],
      ['y', 'yy'],
      ['u', 'u'],
      ['v', 'v'],
    ] as const) {
      const effective = critical?.effectiveLength[axis] ?? Number.NaN;
      expectWithin(effective, expected.L_eff_mm?.[name] ?? 0, BOWING);
      // Printed to five figures; half of the last, the least of which is 0.5 × 10⁻⁴ on about 1.
      const K = typeof expected.K === 'object' ? expected.K[name] : Number.NaN;
      expect(Math.abs(effective / length - K)).toBeLessThan(1e-4);
    }
  });

  it.each(OF_BARS)('$id, $title: how it bows', ({ id, expected }) => {
    const { mode } = solvedBar(id);
    const data = expected.mode_data;
    if (!mode || !data) throw new Error('no mode');
    // Printed to four figures.
    expect(Math.abs(mode.energyAboutV - data.bending_energy_about_v)).toBeLessThan(1e-4);
    expect(Math.abs(mode.energyAboutU - data.bending_energy_about_u)).toBeLessThan(1e-4);
    expect(mode.energyAboutV + mode.energyAboutU).toBeCloseTo(1, 12);
    const leading = data.bending_energy_about_v > 0.5 ? data.sign_changes_weak : data.sign_changes_strong;
    expect(mode.halfWaves).toBe(leading + 1);
    // 'n/a' stands for a bar that is not the same from both ends: it cannot be symmetric.
    expect(mode.symmetry).toBe(data.symmetry === 'n/a' ? 'unsymmetric' : data.symmetry);
    // The published place is that of the largest of about thirty nodes, so it is off by up to half their spacing. Of two like crests either is right.
    const crests =
      mode.symmetry === 'antisymmetric' ? [mode.largestAt, 1 - mode.largestAt] : [mode.largestAt];
    expect(Math.min(...crests.map((at) => Math.abs(at - data.z_max_over_L)))).toBeLessThan(0.5 / 24);
    // The direction turns slowly there; half a spacing turns it by a tenth of a degree.
    const turn = Math.abs(mode.largestDirection - data.dir_at_max_deg) % 180;
    expect(Math.min(turn, 180 - turn)).toBeLessThan(0.1);
  });

  it.each(OF_BARS)('$id, $title: the words agree with the figures', ({ id }) => {
    const { says, mode } = solvedBar(id);
    expect(says).toContain(`${mode?.halfWaves} half-wave`);
    expect(says).toContain(`${mode?.largestAt.toFixed(3)} L, ${mode?.largestDirection.toFixed(1)}° from x`);
    if (mode && mode.energyAboutV > 0.9995) expect(says).toContain('about v alone');
    if (mode && mode.energyAboutU > 0.9995) expect(says).toContain('about u alone');
  });
});

describe('crossed pairs', () => {
  it.each(OF_PAIRS)('$id, $title', ({ id, expected }) => {
    const { N, K, says } = solvedPair(id);
    expectWithin(N, expected.N_cr, 4e-6);
    // Printed to six figures.
    expect(Math.abs((K ?? 0) - Number(expected.K))).toBeLessThan(1e-6);
    expect(says).toContain(expected.mode);
  });

  it('buckles next with the crossing at rest, both halves of either bar pinned', () => {
    // The antisymmetric shape does not feel the crossing: 4π²EI/L², whatever the partner does.
    for (const { id } of OF_PAIRS)
      expectWithin(solvedPair(id).secondN, (4 * Math.PI ** 2 * 3e10) / 5000 ** 2, 1e-8);
  });
});

describe('a bar that twists', () => {
  const [twisting] = CASES.filter(({ type }) => type === 'bar-flexural-torsional');
  const expected = twisting?.expected;
  const solved = solvedBar(twisting?.id ?? '');

  it('has the published first and second load, and the load without twist', () => {
    expectWithin(solved.critical?.N, expected?.N_cr ?? 0, TWIST);
    expectWithin(solved.critical?.secondN, expected?.N_second ?? 0, TWIST);
    expectWithin(solved.bowingOnly, expected?.N_cr_flexural_only ?? 0, BOWING);
    // Printed to five figures, its own mesh good to 2e-8.
    expect(
      Math.abs((solved.critical?.N ?? 0) / (solved.bowingOnly ?? 1) - (expected?.ratio ?? 0)),
    ).toBeLessThan(1e-5);
  });

  it('says by how much it turns', () => {
    expect(solved.says).toMatch(/twists by up to 0\.\d\d° for each mm/);
  });
});

describe('the rule beside the exact figure', () => {
  it('is there for bars whose holds are all rigid, and for no others', () => {
    const without = CASES.filter(({ id }) => {
      const solved = solvedCase(id);
      return solved.type !== 'xbrace-planar' && solved.rule === null;
    });
    expect(without.map(({ id }) => id)).toEqual(['open-12', 'open-13']);
  });

  // By hand from A, I and the lengths of the file: what is held where, the longest gap about each axis, and the largest length over radius.
  const [A, IXX, IV] = [812.691701, 368839.682, 152679.162];
  it.each([
    ['open-01', { x: 4000, y: 4000, u: 4000, v: 4000 }, 'v', 4000 / Math.sqrt(IV / A)],
    ['open-02', { x: 2000, y: 2000, u: 2000, v: 2000 }, 'v', 2000 / Math.sqrt(IV / A)],
    // Held along x, which stops bending about y, u and v, and leaves bending about x.
    ['open-03', { x: 4000, y: 2000, u: 2000, v: 2000 }, 'x', 4000 / Math.sqrt(IXX / A)],
    ['open-04', { x: 2750, y: 5500, u: 2750, v: 2750 }, 'y', 5500 / Math.sqrt(IXX / A)],
    // Held along the weak motion: u is left.
    ['open-05', { x: 2000, y: 2000, u: 4000, v: 2000 }, 'u', 4000 / Math.sqrt(585000.201 / A)],
    ['open-06', { x: 2000, y: 2000, u: 2000, v: 4000 }, 'v', 4000 / Math.sqrt(IV / A)],
    // Longer leg along y: bending about y is over the smaller of the two radii.
    ['open-08', { x: 2000, y: 4000, u: 2000, v: 2000 }, 'y', 4000 / Math.sqrt(640796.944 / 1346.7305)],
    ['open-14', { x: 5000, y: 3250, u: 3250, v: 3250 }, 'v', 3250 / Math.sqrt(IV / A)],
  ] as const)('%s', (id, unbraced, axis, slenderness) => {
    const { rule } = solvedBar(id);
    expect(rule?.unbraced).toEqual(unbraced);
    expect(rule?.axis).toBe(axis);
    expectWithin(rule?.slenderness, slenderness, 1e-9);
  });
});
