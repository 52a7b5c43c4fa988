import { writeFile } from 'node:fs/promises';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { BAR, PAIR, TWISTING } from '../cases/given.ts';
import { folder, run } from './given.ts';

const PUBLISHED = 'tests/published/data/stability-cases.json';

async function fileOf(text: string): Promise<string> {
  const file = path.join(await folder(), 'cases.json');
  await writeFile(file, text);
  return file;
}
const casesFile = (...cases: readonly unknown[]): Promise<string> => fileOf(JSON.stringify({ cases }));

describe('bow', () => {
  it('solves all published cases, and says each in a row and a line', async () => {
    const { code, out, err } = await run('bow', PUBLISHED);
    expect({ code, err }).toEqual({ code: 0, err: '' });
    const lines = out.split('\n');
    // A head, a rule, twenty rows, an empty line, twenty shapes, and the last line feed.
    expect(lines).toHaveLength(2 + 20 + 1 + 20 + 1);
    expect(lines.filter((line) => line.startsWith('open-03'))).toHaveLength(2);
    // N_cr 47 314.7 and 1.0 % of the rule on the unsafe side.
    expect(lines.find((line) => line.startsWith('open-03'))).toMatch(/47\u202f315.*187\.8 {2}x +\+1\.0 %$/);
    expect(out).toContain('crossing moves');
  });

  it('gives the documented fields of a bar as JSON', async () => {
    const { code, out } = await run('bow', await casesFile(BAR), '--format', 'json');
    expect(code).toBe(0);
    const [solved, ...others] = JSON.parse(out);
    expect(others).toEqual([]);
    const axes = {
      xx: expect.any(Number),
      yy: expect.any(Number),
      u: expect.any(Number),
      v: expect.any(Number),
    };
    expect(solved).toEqual({
      id: 'one',
      type: 'bar',
      N_cr: expect.any(Number),
      lambda_cr: expect.any(Number),
      N_second: expect.any(Number),
      lambda_second: expect.any(Number),
      L_eff_mm: axes,
      K: axes,
      slenderness: expect.any(Number),
      mode: expect.stringContaining('1 half-wave'),
      mode_data: {
        half_waves: 1,
        symmetry: 'symmetric',
        bending_energy_about_v: expect.any(Number),
        bending_energy_about_u: expect.any(Number),
        z_max_over_L: 0.5,
        dir_at_max_deg: expect.any(Number),
      },
      rule: {
        unbraced: { x: 4000, y: 2000, u: 2000, v: 2000 },
        slenderness: expect.any(Number),
        axis: 'x',
        basis: 'span',
        N: expect.any(Number),
        difference_percent: expect.any(Number),
      },
    });
    // The published case open-03 is this very bar: 47314.7 N, K 1.0049.
    expect(Math.abs(solved.N_cr - 47_314.7)).toBeLessThan(0.1);
    expect(Math.abs(solved.K.xx - 1.0049)).toBeLessThan(0.00005);
    expect(solved.rule.difference_percent).toBeCloseTo((solved.rule.N / solved.N_cr - 1) * 100, 9);
    expect(solved.slenderness).toBeCloseTo(Math.PI * Math.sqrt((210_000 * 812.691701) / solved.N_cr), 9);
  });

  it('gives those of a pair, and of a bar that twists', async () => {
    const { out } = await run('bow', await casesFile(PAIR, { ...TWISTING, id: 'twisting' }), '-f', 'json');
    const [pair, twisting] = JSON.parse(out);
    expect(Object.keys(pair)).toEqual([
      'id',
      'type',
      'N_cr',
      'lambda_cr',
      'N_second',
      'lambda_second',
      'L_eff_mm',
      'K',
      'mode',
    ]);
    // K = 0.712818 for a slack partner that runs through (published case open-17).
    expect(Math.abs(pair.K - 0.712818)).toBeLessThan(1e-6);
    expect(twisting.ratio).toBeCloseTo(twisting.N_cr / twisting.N_cr_flexural_only, 12);
    expect(twisting.ratio).toBeLessThan(1);
  });

  it('takes the list itself, and a file that begins with a byte order mark', async () => {
    const { code, out } = await run('bow', await fileOf(`\uFEFF${JSON.stringify([BAR])}`), '-f', 'json');
    expect(code).toBe(0);
    expect(JSON.parse(out)).toHaveLength(1);
  });

  it('solves the others when a case cannot be understood, says which and why, and ends with 2', async () => {
    const file = await casesFile(
      BAR,
      { ...BAR, id: 'two', E: -1, stations: [{ z: 2000, direction_deg: 0 }] },
      PAIR,
    );
    const { code, out, err } = await run('bow', file, '-f', 'json');
    expect(code).toBe(2);
    expect(JSON.parse(out).map(({ id }: { id: string }) => id)).toEqual(['one', 'pair']);
    expect(err.trim().split('\n')).toEqual([
      expect.stringMatching(/two: E: -1 is not a number, above zero\. Give a number, above zero\.$/),
      expect.stringMatching(
        /two: stations\[0\]\.k: It is not given\. Give a number, zero or more, or “rigid”\.$/,
      ),
    ]);
    expect(err).toContain(file);
  });

  it.each([
    ['a file that is not there', null, 'cannot be read (no such file or folder)'],
    ['no JSON', '{ "cases": [', 'is no JSON'],
    ['JSON without cases', '{ "bars": [] }', 'There is no list of cases.'],
  ])('ends with 2 for %s, and says what to do', async (_, text, told) => {
    const file = text === null ? '/no-such-folder/cases.json' : await fileOf(text);
    const { code, out, err } = await run('bow', file);
    expect({ code, out }).toEqual({ code: 2, out: '' });
    expect(err).toContain(file);
    expect(err).toContain(told);
  });

  it('has nothing to say of an empty list', async () => {
    expect(await run('bow', await fileOf('[]'))).toMatchObject({ code: 0, out: 'No case was solved.\n' });
    expect((await run('bow', await fileOf('[]'), '-f', 'json')).out).toBe('[]\n');
  });

  it('writes to a file in place of the terminal', async () => {
    const file = await casesFile(BAR);
    const { code, out, err } = await run('bow', file, '-o', `${file}.txt`);
    expect({ code, out }).toEqual({ code: 0, out: '' });
    expect(err).toContain('written');
  });

  it('never shows what is not a number', async () => {
    const slack = { ...BAR, id: 'slack', axial: [{ z0: 0, z1: 4000, p: -1 }] };
    const hinged = { L: 5000, EI: 3e10, at_crossing: 'cut' };
    const chain = { ...PAIR, id: 'chain', considered: hinged, partner: hinged };
    for (const format of ['table', 'json']) {
      const { out } = await run('bow', await casesFile(slack, chain), '-f', format);
      expect(out).not.toMatch(/NaN|Infinity|undefined/);
    }
  });
});
