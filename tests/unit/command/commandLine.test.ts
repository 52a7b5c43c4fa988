import { readdir, readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { readProject } from '../../../core/project/readProject.ts';
import { CROSSED, folder, projectFile, run } from './given.ts';

/** A tie of 5 m joined at its middle: 5000 / 21.3 = 235 in service, within 300. */
const BOLTED = [...CROSSED, '--crossings', 'bolted'];
/** And not joined: 5000 / 13.7 = 365. */
const FREE = [...CROSSED, '--crossings', 'none'];

describe('exit codes', () => {
  it('ends with 0 when no limit is broken', async () => {
    expect(await run('schedule', await projectFile(BOLTED))).toMatchObject({ code: 0, err: '' });
    expect(await run('assess', await projectFile(BOLTED))).toMatchObject({ code: 0, err: '' });
  });

  it('ends with 1 when a finding breaks a limit, results on the output all the same', async () => {
    const scheduled = await run('schedule', await projectFile(FREE));
    expect(scheduled).toMatchObject({ code: 1, err: '' });
    expect(scheduled.out).toContain('365 OVER');
    expect((await run('assess', await projectFile(FREE))).code).toBe(1);
  });

  it.each([
    ['schedule', 'nowhere.json'],
    ['assess', 'nowhere.json'],
    ['report', 'nowhere.json', '-o', 'nowhere.html'],
  ])('ends with 2 when %s cannot read its file, and says which, why and what to do', async (...words) => {
    const { code, out, err } = await run(...words);
    expect({ code, out }).toEqual({ code: 2, out: '' });
    expect(err).toMatch(/^nowhere\.json: cannot be read \(no such file or folder\)\. Check the name/);
  });

  it('ends with 2 for a folder in place of a file', async () => {
    const { code, err } = await run('schedule', await folder());
    expect(code).toBe(2);
    expect(err).toContain('it is a folder');
  });

  it('ends with 2 for a file that is no project, with the path in the file', async () => {
    const notJson = await projectFile(BOLTED, () => 'not a project');
    expect(await run('schedule', notJson)).toMatchObject({ code: 2, out: '' });
    const narrow = await projectFile(BOLTED, (text) => text.replace('"width": 3000', '"width": -3'));
    const { code, err } = await run('schedule', narrow);
    expect(code).toBe(2);
    expect(err).toContain('bays[0].recipe.width');
  });

  it.each([
    [['schedule']],
    [['bogus']],
    [['section', '70x70x6', '--catalogue', 'xx']],
    [['schedule', 'x.json', '--format', 'pdf']],
    [['schedule', 'x.json', '--colour']],
    [['shortlist']],
    [['shortlist', '--length', 'long']],
    [['shortlist', '--length', '0']],
    [['shortlist', '--length', '4000', '--limit', '-1']],
    [['new', 'wall-bay']],
    [['new', 'wall-bay', '-o', 'x.json', '--tier', '4000:zigzag']],
  ])('ends with 2 for %j, says so on the error stream and gives no result', async (words) => {
    const { code, out, err } = await run(...words);
    expect({ code, out }).toEqual({ code: 2, out: '' });
    expect(err).not.toBe('');
  });

  it('ends with 0 for help, on the output', async () => {
    const { code, out } = await run('--help');
    expect(code).toBe(0);
    for (const command of ['schedule', 'assess', 'section', 'shortlist', 'new', 'report'])
      expect(out).toContain(command);
    expect(out).toMatch(/0 +fine/);
  });
});

describe('a section that is in no stock list', () => {
  const unknown = () =>
    projectFile(BOLTED, (text) =>
      text.replace('"bars": {}', '"bars": {"t1.rise": {"section": "71x71x6\\u001b[2J"}}'),
    );

  it('leaves the other rows, says where, what and what to do, and ends with 2', async () => {
    const { code, out, err } = await run('schedule', await unknown(), '--format', 'json');
    expect(code).toBe(2);
    const rows = JSON.parse(out);
    expect(rows.map((row: { slenderness: unknown }) => row.slenderness !== null)).toEqual([false, true]);
    expect(err).toMatch(
      /shed\.json: W1: D1: the section “71x71x6.*” is in no stock list\. Nearest: .*70x70x6.*Choose one/,
    );
  });

  it('lets no control character of the file through to the terminal', async () => {
    const { out, err } = await run('schedule', await unknown());
    // biome-ignore lint/suspicious/noControlCharactersInRegex: they are what is looked for.
    expect(out + err).not.toMatch(/\u001b/);
  });
});

describe('findings that name no bar', () => {
  /** A mark of a crossing that is not there: a note of the whole bay. */
  const idle = () =>
    projectFile(BOLTED, (text) =>
      text.replace('"joins": {', '"joins": {"t9.fall+t9.rise": {"kind": "bolted"},'),
    );

  it('stand below the schedule, and on the error stream where its rows have no place for them', async () => {
    const says = 'note: W1: An entry of W1 names what is not there';
    expect((await run('schedule', await idle())).out).toContain(says);
    for (const format of ['json', 'csv']) {
      const { out, err } = await run('schedule', await idle(), '--format', format);
      expect(err).toContain(says);
      expect(out).not.toContain(says);
    }
  });
});

describe('a length set by hand', () => {
  it('shows its reason in the checks, in the note of what is worked out with it', async () => {
    const reason = 'the sheeting holds it, drawing 7';
    const file = await projectFile(BOLTED, (text) =>
      text
        .replace('"countedOn": "tension"', '"countedOn": "both"')
        .replace(
          '"bars": {}',
          `"bars": {"t1.rise": {"overrides": [{"axis": "v", "length": 1200, "factor": 0.85, "reason": "${reason}"}]}}`,
        ),
    );
    const table = (await run('check', file)).out;
    expect(table).toContain(`D1, set by hand: v: 1.20 m × 0.85, because ${reason}`);
    expect(table).toMatch(/Compression over the unbraced lengths[^\n]* \*/);
    const { bars } = JSON.parse((await run('check', file, '-f', 'json')).out);
    expect(bars[0].overrides).toEqual([{ axis: 'v', length: 1200, factor: 0.85, reason }]);
    const byLengths = bars[0].checks.find(
      ({ kind }: { kind: string }) => kind === 'compression, lengths by the practice',
    );
    expect(byLengths.note).toContain(`the length about v is set by hand, because ${reason}`);
    expect(bars[1].overrides).toEqual([]);
  });
});

describe('schedule', () => {
  it('has every documented key, lengths in mm with nothing rounded', async () => {
    const { out } = await run('schedule', await projectFile(BOLTED), '--format', 'json');
    const [row] = JSON.parse(out);
    const axes = {
      x: expect.any(Number),
      y: expect.any(Number),
      u: expect.any(Number),
      v: expect.any(Number),
    };
    const verdict = { slenderness: expect.any(Number), limit: 300, ok: expect.any(Boolean) };
    expect(row).toMatchObject({
      mark: 'D1',
      bay: 'W1',
      section: '70x70x6',
      unbraced: axes,
      radius: axes,
      slenderness: axes,
      governing: { axis: 'y', angle: null },
      limit: 300,
      handling: verdict,
      inService: verdict,
      findings: expect.any(Array),
    });
    // Three, four, five; set-back 350 less the end distance of 40 at each end; 6.38 kg/m.
    expect(row.setOutLength).toBeCloseTo(5000, 9);
    expect(row.cutLength).toBeCloseTo(4380, 9);
    expect(row.mass).toBeCloseTo(4.38 * 6.38, 9);
    // METHODS.md §1: √(368 840 / 812.69), to the fifth figure of each.
    expect(row.governing.slenderness).toBeCloseTo(5000 / Math.sqrt(368_840 / 812.69), 2);
    expect(row.governing.slenderness).toBe(row.slenderness.y);
    expect(row.governing.slenderness).toBeCloseTo(row.governing.length / row.governing.radius, 9);
  });

  it('gives the angle of a free direction that is none of the four axes', async () => {
    const file = await projectFile(BOLTED, (text) =>
      text.replace('"bars": {}', '"bars": {"t1.rise": {"roll": 20}}'),
    );
    const [row] = JSON.parse((await run('schedule', file, '--format', 'json')).out);
    // Rolled by 20° from where y governs, it bends about an axis 20° from y.
    expect(row.governing.axis).toBe('free');
    expect(90 - Math.abs(row.governing.angle)).toBeCloseTo(20, 6);
  });

  it('writes CSV and tables, in the units asked for', async () => {
    const file = await projectFile(BOLTED);
    const csv = await run('schedule', file, '--format', 'csv');
    expect(csv.out).toMatch(/^mark,bay,.*cut length \(mm\).*\r\n/);
    const us = await run('schedule', file, '--format', 'csv', '--units', 'us');
    expect(us.out).toMatch(/cut length \(in\)/);
    expect((await run('schedule', file)).out).toMatch(/^bay +mark/);
  });

  it('writes to a file in place of the output, and leaves nothing beside it', async () => {
    const file = await projectFile(BOLTED);
    const csv = path.join(path.dirname(file), 'schedule.csv');
    await writeFile(csv, 'old');
    const { code, out, err } = await run('schedule', file, '--format', 'csv', '-o', csv);
    expect({ code, out }).toEqual({ code: 0, out: '' });
    expect(err).toContain('schedule.csv: written.');
    expect(await readFile(csv, 'utf8')).toMatch(/^\uFEFFmark,/);
    expect(await readdir(path.dirname(file))).toEqual(['schedule.csv', 'shed.json']);
  });

  it('ends with 2 when the file cannot be written', async () => {
    const { code, err } = await run('schedule', await projectFile(BOLTED), '-o', '/no-such-folder/x.csv');
    expect(code).toBe(2);
    expect(err).toContain('cannot be written');
  });
});

describe('assess', () => {
  it('gives the whole assessment as plain objects, findings with remedies and their effects', async () => {
    const { out } = await run('assess', await projectFile(FREE));
    const whole = JSON.parse(out);
    expect(whole).toMatchObject({ format: 'tautline-assessment', version: 1, breaksLimit: true });
    expect(Object.keys(whole.diagonals)).toEqual(['W1/t1.rise', 'W1/t1.fall']);
    expect(Object.keys(whole.layout.bars)).toContain('W1/t1.rise');
    expect(whole.diagonals['W1/t1.rise'].restraint.lanes.v.unbraced).toBe(5000);
    const slender = whole.findings.find(({ kind }: { kind: string }) => kind === 'too slender in service');
    expect(slender.remedies.length).toBeGreaterThan(0);
    for (const { effect } of slender.remedies) expect(effect.after).toBeLessThan(effect.before);
  });

  it('gives the same text each time', async () => {
    const file = await projectFile(FREE);
    expect((await run('assess', file)).out).toBe((await run('assess', file)).out);
  });
});

describe('section', () => {
  it('gives the documented properties, mm', async () => {
    const { code, out } = await run('section', '70x70x6', '--format', 'json');
    expect(code).toBe(0);
    const section = JSON.parse(out);
    expect(section).toMatchObject({ designation: '70x70x6', mass: 6.38, basis: 'computed' });
    // METHODS.md §1. Tolerance: half the last digit given there; Ixy is negative with the heel on the negative side of both axes.
    expect(Math.abs(section.area - 812.69)).toBeLessThan(0.005);
    expect(Math.abs(section.Ixx - 368_840)).toBeLessThan(5);
    expect(Math.abs(section.Iyy - 368_840)).toBeLessThan(5);
    expect(Math.abs(section.Ixy + 216_161)).toBeLessThan(0.5);
    expect(Math.abs(section.Iu - 585_000)).toBeLessThan(5);
    expect(Math.abs(section.Iv - 152_679)).toBeLessThan(0.5);
    // An equal angle is its own mirror image in the line at 45°.
    expect(section.alpha).toBeCloseTo(Math.PI / 4, 9);
    for (const [r, I] of [
      [section.rx, section.Ixx],
      [section.ry, section.Iyy],
      [section.ru, section.Iu],
      [section.rv, section.Iv],
    ])
      expect(r).toBeCloseTo(Math.sqrt(I / section.area), 9);
  });

  it.each([
    ['L70×70×6', '70x70x6', 'en'],
    ['70 x 70 x 6', '70x70x6', 'en'],
    ['L3x3x1/4', 'L3X3X1/4', 'us'],
    ['90x90x8EA', '90x90x8EA', 'au'],
  ])('knows %s as people type it', async (typed, designation, catalogue) => {
    const { code, out } = await run('section', typed, '--format', 'json');
    expect(code).toBe(0);
    expect(JSON.parse(out)).toMatchObject({ designation, catalogue });
  });

  it('carries US figures as published', async () => {
    const { out } = await run('section', 'L3x3x1/4', '--format', 'json');
    const section = JSON.parse(out);
    // AISC Shapes Database v15.0: A 1.44 in², r_z 0.585 in.
    expect(section).toMatchObject({ basis: 'published' });
    expect(section.area / 25.4 ** 2).toBeCloseTo(1.44, 9);
    expect(section.rv / 25.4).toBeCloseTo(0.585, 9);
  });

  it('refuses an unknown name with the nearest ones, and a known one in another list with which', async () => {
    const unknown = await run('section', '71x71x6');
    expect(unknown).toMatchObject({ code: 2, out: '' });
    expect(unknown.err).toContain('70x70x6');
    const elsewhere = await run('section', '90x90x8EA', '--catalogue', 'en');
    expect(elsewhere).toMatchObject({ code: 2, out: '' });
    expect(elsewhere.err).toContain('--catalogue au');
  });
});

describe('shortlist', () => {
  // Common practice: a 4 m tie limited to 300 with nothing at its middle needs r ≥ 13.3 mm, and 70x70x6 does it.
  it('picks 70x70x6 for a free tie of 4 m', async () => {
    const { code, out } = await run('shortlist', '--length', '4000', '--format', 'json');
    const list = JSON.parse(out);
    expect(code).toBe(0);
    expect(list.first.designation).toBe('70x70x6');
    expect(list.limit).toBe(300);
    for (const radius of Object.values(list.neededRadius)) expect(radius).toBeCloseTo(4000 / 300, 9);
  });

  it('takes lengths with their unit, and the limit asked for', async () => {
    const { out } = await run('shortlist', '--length', '4 m', '--limit', '250', '--format', 'json');
    expect(JSON.parse(out)).toMatchObject({ length: 4000, limit: 250 });
  });

  it('halves what is wanted in the plane when the crossing is joined', async () => {
    const { out } = await run(
      'shortlist',
      '--length',
      '9000',
      '--crossing',
      'joined',
      '--legs',
      'longer',
      '--format',
      'json',
    );
    const { neededRadius } = JSON.parse(out);
    expect(neededRadius.y).toBeCloseTo(30, 9);
    for (const axis of ['x', 'u', 'v']) expect(neededRadius[axis]).toBeCloseTo(15, 9);
  });

  it('tries only the leg asked for', async () => {
    const { out } = await run('shortlist', '--length', '6000', '--legs', 'shorter', '--format', 'json');
    const legs = new Set(
      JSON.parse(out).candidates.map(({ legInPlane }: { legInPlane: string }) => legInPlane),
    );
    expect([...legs]).toEqual(['shorter']);
  });

  it('shows as a table the first that passes and why lighter ones do not', async () => {
    const { out } = await run('shortlist', '--length', '4000');
    expect(out).toMatch(/First that passes: 70x70x6, 6\.38 kg\/m\./);
    expect(out).toMatch(/60x60x6 .*342 .*over 300/);
    expect(out).toMatch(/→ +70x70x6/);
  });

  it('ends with 1 when nothing passes, and with 2 for a length that no bay can have', async () => {
    const none = await run('shortlist', '--length', '100 m');
    expect(none.code).toBe(1);
    expect(none.err).toContain('No angle of the list passes');
    expect((await run('shortlist', '--length', '50')).code).toBe(2);
  });
});

describe('new', () => {
  it('writes a wall bay that reads back as told', async () => {
    const file = await projectFile([
      'wall-bay',
      '--width',
      '6 m',
      '--tier',
      '4200:crossed',
      '--tier',
      '3600:peaked',
      '--section',
      '90 x 90 x 7',
      '--practice',
      'csaS16',
      '--name',
      'line A',
      '--project',
      'Shed',
      '--crossings',
      'bolted',
    ]);
    const read = readProject(await readFile(file, 'utf8'));
    expect(read.ok && read.project).toMatchObject({
      name: 'Shed',
      settings: { practice: 'csaS16' },
      bays: [
        {
          id: 'W1',
          name: 'line A',
          recipe: {
            kind: 'wall',
            width: 6000,
            tiers: [
              { height: 4200, pattern: 'crossed' },
              { height: 3600, pattern: 'peaked' },
            ],
          },
          diagonals: { section: '90x90x7' },
          joins: { 't1.fall+t1.rise': { kind: 'bolted' } },
        },
      ],
    });
  });

  it('writes roof bays with purlins on both slopes, and knees', async () => {
    const roof = await projectFile([
      'roof-bay',
      '--pitch',
      '10',
      '--panel',
      '4500',
      '--purlin',
      '1500',
      '--purlin',
      '3 m',
      '--both-slopes',
    ]);
    const read = readProject(await readFile(roof, 'utf8'));
    expect(read.ok && read.project.bays[0]?.recipe).toMatchObject({
      slopes: [
        {
          pitch: 10,
          panels: [{ height: 4500, pattern: 'crossed' }],
          lines: [
            { id: 'P1', at: 1500 },
            { id: 'P2', at: 3000 },
          ],
        },
        {
          pitch: 10,
          lines: [
            { id: 'P3', at: 1500 },
            { id: 'P4', at: 3000 },
          ],
        },
      ],
    });
    const knees = await projectFile(['knee', '--count', '4', '--drop', '900', '--sides', 'one']);
    const rows = JSON.parse((await run('schedule', knees, '--format', 'json')).out);
    // At 45°: 900 √2.
    expect(rows).toHaveLength(4);
    expect(rows[0].setOutLength).toBeCloseTo(900 * Math.SQRT2, 9);
  });

  it('refuses to write over a file unless forced', async () => {
    const file = await projectFile(BOLTED);
    const before = await readFile(file, 'utf8');
    const refused = await run('new', 'knee', '-o', file);
    expect(refused.code).toBe(2);
    expect(refused.err).toContain('--force');
    expect(await readFile(file, 'utf8')).toBe(before);
    expect((await run('new', 'knee', '-o', file, '--force')).code).toBe(0);
    expect(await readFile(file, 'utf8')).not.toBe(before);
  });

  it.each([
    [['wall-bay', '--section', '71x71x6'], 'Nearest: '],
    [['roof-bay', '--panel', '3000', '--purlin', '9000'], 'past the top of the slope'],
    [['wall-bay', '--width', '1'], 'width'],
    [['wall-bay', '--id', 'no spaces here'], 'bays[0].id'],
  ])('refuses %j and writes nothing', async (words, told) => {
    const file = path.join(await folder(), 'x.json');
    const { code, err } = await run('new', ...words, '-o', file);
    expect(code).toBe(2);
    expect(err).toContain(told);
    expect(await readdir(path.dirname(file))).toEqual([]);
  });
});

describe('report', () => {
  it('writes one file that stands alone, with its typefaces in it', async () => {
    const file = await projectFile(FREE);
    const html = path.join(path.dirname(file), 'shed.html');
    const { code, out } = await run('report', file, '-o', html, '--date', '1 December 2026');
    expect({ code, out }).toEqual({ code: 1, out: '' });
    const text = await readFile(html, 'utf8');
    expect(text).toContain('@font-face');
    expect(text).toContain('1 December 2026');
    expect(text).toContain('Would answer it');
    expect(text).not.toMatch(/<script|https?:/);
  });
});
