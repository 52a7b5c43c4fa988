import { describe, expect, it } from 'vitest';
import { CROSSED, projectFile, run } from './given.ts';

const BOLTED = [...CROSSED, '--crossings', 'bolted'];
/** Diagonals of 5 m in 70x70x6; SANS 10162 takes E = 200 000. */
const HALF = 2500;

async function pushed(at: string | number, words: readonly string[] = BOLTED, bar = 'D1') {
  const { code, out } = await run(
    'push',
    await projectFile(words),
    '--bar',
    bar,
    '--at',
    String(at),
    '-f',
    'json',
  );
  expect(code).toBe(0);
  return JSON.parse(out);
}

describe('push', () => {
  it('gives the stiffness at a place, and what the rest offers where something is joined', async () => {
    const at = await pushed(HALF);
    expect(at).toMatchObject({ bar: 'W1/t1.rise', bay: 'W1', mark: 'D1', section: '70x70x6', at: HALF });
    expect(at.length).toBeCloseTo(5000, 9);
    // An unloaded partner that runs through: 48EI/L³ out of the plane (METHODS.md), I about x of 70x70x6; its columns and beam give a little.
    expect(at.offered.outOfPlane / ((48 * 200_000 * 368_840) / 5000 ** 3)).toBeCloseTo(1, 2);
    // With the bar in place its own bending adds as much.
    expect(at.inPlace.outOfPlane / at.offered.outOfPlane).toBeCloseTo(2, 1);
    expect(at.inPlace.inPlane).toBeGreaterThan(1000 * at.inPlace.outOfPlane);
    for (const each of [at.inPlace, at.offered]) {
      expect(each.stiff).toBeGreaterThanOrEqual(each.inPlane);
      expect(each.soft).toBeLessThanOrEqual(each.outOfPlane);
      // Longer leg in the plane, so the stiff way is along y.
      expect(each.stiffWayDegrees).toBeCloseTo(90, 1);
    }
  });

  it('offers nothing where nothing is joined, and less the farther from the crossing', async () => {
    const quarter = await pushed(1250);
    expect(quarter.offered).toBeNull();
    expect(quarter.inPlace.inPlane).toBeLessThan((await pushed(HALF)).inPlace.inPlane / 10);
  });

  it('holds nothing at a crossing that is not joined: the bar alone bends', async () => {
    const alone = await pushed(HALF, CROSSED);
    expect(alone.offered).toBeNull();
    // Clamped in the plane by stiff gussets, hinged out of it: between 48 and 192 EI/L³ both.
    const unit = 200_000 / 5000 ** 3;
    expect(alone.inPlace.outOfPlane).toBeGreaterThan(48 * unit * 152_679);
    expect(alone.inPlace.inPlane).toBeLessThan(192 * unit * 585_001);
  });

  it('shows a table, and takes lengths with their unit', async () => {
    const file = await projectFile(BOLTED);
    const { code, out } = await run('push', file, '--bar', 'D1', '--at', '2.5 m');
    expect(code).toBe(0);
    expect(out).toContain('D1 of W1, 70x70x6');
    expect(out).toMatch(/bar in place .*°/);
    expect(out).toMatch(/offered by the rest .*°/);
    const elsewhere = await run('push', file, '--bar', 'D1', '--at', '1 m');
    expect(elsewhere.out).toContain('Nothing is joined to it there');
  });

  it('says in which units the table is: those of the project, while JSON keeps N/mm', async () => {
    const us = (text: string): string => {
      const project = JSON.parse(text);
      return JSON.stringify({ ...project, settings: { ...project.settings, units: 'us' } });
    };
    const [metric, american] = [await projectFile(BOLTED), await projectFile(BOLTED, us)];
    const push = async (file: string) => (await run('push', file, '--bar', 'D1', '--at', '2500')).out;
    const outOfPlane = (out: string): number =>
      Number(/bar in place +\S+(?: \S+)? +([\d.]+) /.exec(out.replace(/[\u2009\u202f]/g, ''))?.[1]);
    const [first, second] = [await push(metric), await push(american)];
    expect(first).toMatch(/^N\/mm /m);
    expect(second).toMatch(/^kip\/in /m);
    // 1 kip = 4 448.22 N, 1 in = 25.4 mm; to the three figures shown.
    expect(outOfPlane(second) / (outOfPlane(first) * (25.4 / 4448.22))).toBeCloseTo(1, 2);
    const json = JSON.parse((await run('push', american, '--bar', 'D1', '--at', '2500', '-f', 'json')).out);
    expect(json.inPlace.outOfPlane).toBeCloseTo((await pushed(HALF)).inPlace.outOfPlane, 9);
  });

  it('knows a bar by mark, by bay and mark, and by id', async () => {
    const file = await projectFile(BOLTED);
    const all = await Promise.all(
      ['D1', 'W1/D1', 'W1/t1.rise'].map((bar) => run('push', file, '--bar', bar, '--at', '2500')),
    );
    for (const { code, out } of all) expect({ code, out }).toEqual({ code: 0, out: all[0]?.out });
  });

  it.each([
    ['an unknown mark', ['--bar', 'D9', '--at', '2500'], ['no diagonal D9', 'W1/D1, W1/D2']],
    ['a column', ['--bar', 'W1/t1.column-left', '--at', '2500'], ['no diagonal', 'W1/D1']],
    ['a place past the end', ['--bar', 'D1', '--at', '5001'], ['5001 mm is not on D1', 'between 1 and 4999']],
    ['a place at the end', ['--bar', 'D1', '--at', '0.5'], ['0.5 mm is not on D1', '--at']],
    ['no place', ['--bar', 'D1'], ['--at']],
    ['a length that is none', ['--bar', 'D1', '--at', 'there'], ['--at']],
  ])('refuses %s with 2 and what to do', async (_, words, told) => {
    const { code, out, err } = await run('push', await projectFile(BOLTED), ...words);
    expect({ code, out }).toEqual({ code: 2, out: '' });
    for (const each of told) expect(err).toContain(each);
  });

  it('refuses a bar whose section is in no list', async () => {
    const file = await projectFile(BOLTED, (text) => text.replace('"70x70x6"', '"71x71x6"'));
    const { code, err } = await run('push', file, '--bar', 'D1', '--at', '2500');
    expect(code).toBe(2);
    expect(err).toContain('71x71x6');
  });

  it('asks for bay and mark where several bars have one mark', async () => {
    const twice = (text: string): string => {
      const project = JSON.parse(text);
      const [first] = project.bays;
      const marked = { ...first, bars: { 't1.rise': { mark: 'X' } } };
      return JSON.stringify({ ...project, bays: [marked, { ...marked, id: 'W2' }] });
    };
    const file = await projectFile(BOLTED, twice);
    const { code, err } = await run('push', file, '--bar', 'X', '--at', '2500');
    expect(code).toBe(2);
    expect(err).toContain('more than one');
    expect((await run('push', file, '--bar', 'W2/X', '--at', '2500')).code).toBe(0);
  });
});
