/** What a project file is refused for: always with the place in the file, what is wrong there, and what to do. */
import { describe, expect, it } from 'vitest';
import type { ProjectProblem } from '../../../core/project/problem.ts';
import { readProject } from '../../../core/project/readProject.ts';
import { writeProject } from '../../../core/project/writeProject.ts';
import { bay, free, knee, line, project, roof, wall } from '../assess/given/bays.ts';

const sound = () => project([bay(wall(6000, [[4000, 'crossed']], [line('G1', 1500)]), { id: 'W1' })]);

/** The file as data, to be spoilt. */
function fileOf(made = sound()): Record<string, unknown> {
  return JSON.parse(writeProject(made)) as Record<string, unknown>;
}

/** Sets "bays.0.recipe.width" and the like. */
function spoilt(data: Record<string, unknown>, path: string, value: unknown): string {
  const names = path.split('.');
  const last = names.pop() ?? '';
  const owner = names.reduce<Record<string, unknown>>(
    (at, name) => at[name] as Record<string, unknown>,
    data,
  );
  owner[last] = value;
  return JSON.stringify(data);
}

function refusal(text: string): readonly ProjectProblem[] {
  const read = readProject(text);
  expect(read.ok).toBe(false);
  const problems = read.ok ? [] : read.problems;
  expect(problems.length).toBeGreaterThan(0);
  for (const { what, todo } of problems) {
    // A sentence each, that begins as one and ends as one.
    expect(what).toMatch(/\S.*[.)]$/s);
    expect(todo).toMatch(/^[A-Z].*\.$/s);
    expect(what).not.toMatch(/undefined|\[object|ZodError|Invalid input/);
  }
  return problems;
}

const first = (text: string): ProjectProblem => refusal(text)[0] ?? { path: '?', what: '', todo: '' };

describe('a file that an editor has put a byte-order mark before', () => {
  it('opens as the same without', () => {
    const text = writeProject(sound());
    expect(readProject(`\uFEFF${text}`)).toEqual(readProject(text));
  });
});

describe('a file that is no project', () => {
  it('is refused when it is not JSON', () => {
    const problem = first('{ "format": "tautline-project", ');
    expect(problem.path).toBe('');
    expect(problem.what).toContain('JSON');
    expect(problem.todo).toContain('copy');
  });

  it('is refused when a number is written as NaN or Infinity, which JSON does not have', () => {
    const text = writeProject(sound()).replace('"width": 6000', '"width": NaN');
    expect(first(text).what).toContain('JSON');
    expect(first(text.replace('NaN', 'Infinity')).what).toContain('JSON');
  });

  it.each(['[]', 'null', '"a text"', '7'])('is refused when it holds %s', (text) => {
    expect(first(text).path).toBe('');
  });

  it('is refused for another format, naming what it says', () => {
    const problem = first(spoilt(fileOf(), 'format', 'someone-elses-bracing'));
    expect(problem.path).toBe('format');
    expect(problem.what).toContain('someone-elses-bracing');
  });

  it('is refused for no format at all', () => {
    expect(first('{}').path).toBe('format');
  });
});

describe('a file of another version', () => {
  it('is refused when newer, with the way out, and nothing changed', () => {
    const problem = first(spoilt(fileOf(), 'version', 2));
    expect(problem.path).toBe('version');
    expect(problem.what).toContain('2');
    expect(problem.todo).toContain('newer');
  });

  it.each([0, -1, 1.5, '1', null])('is refused for the version %j', (version) => {
    expect(first(spoilt(fileOf(), 'version', version)).path).toBe('version');
  });
});

describe('a value that cannot be', () => {
  it.each([
    ['a text for a number', 'bays.0.recipe.width', '6000', 'bays[0].recipe.width'],
    ['"NaN" for a number', 'bays.0.recipe.width', 'NaN', 'bays[0].recipe.width'],
    ['"Infinity" for a number', 'bays.0.recipe.tiers.0.height', 'Infinity', 'bays[0].recipe.tiers[0].height'],
    ['nothing for a number', 'bays.0.recipe.width', null, 'bays[0].recipe.width'],
    ['a list for a group', 'bays.0.recipe', [], 'bays[0].recipe'],
    ['a group for a list', 'bays', {}, 'bays'],
    ['a number for a text', 'name', 7, 'name'],
    ['half a bolt', 'bays.0.diagonals.ends.bolts', 1.5, 'bays[0].diagonals.ends.bolts'],
    ['no bolt', 'bays.0.diagonals.ends.bolts', 0, 'bays[0].diagonals.ends.bolts'],
    ['no bay of a kind', 'bays.0.numberOff', 0, 'bays[0].numberOff'],
    ['a bay as wide as a county', 'bays.0.recipe.width', 1e9, 'bays[0].recipe.width'],
    ['a bay of no width', 'bays.0.recipe.width', 0, 'bays[0].recipe.width'],
    ['a width below zero', 'bays.0.recipe.width', -6000, 'bays[0].recipe.width'],
    ['a place beyond the horizon', 'bays.0.place.origin', [0, 1e300, 0], 'bays[0].place.origin[1]'],
    ['a place of two numbers', 'bays.0.place.origin', [0, 0], 'bays[0].place.origin'],
    ['no tier', 'bays.0.recipe.tiers', [], 'bays[0].recipe.tiers'],
    ['a pattern nobody knows', 'bays.0.recipe.tiers.0.pattern', 'zigzag', 'bays[0].recipe.tiers[0].pattern'],
    ['a practice nobody knows', 'settings.practice', 'din4114', 'settings.practice'],
    ['a section without a name', 'bays.0.diagonals.section', '', 'bays[0].diagonals.section'],
    ['a limit below what can be built', 'settings.ownLimit', 1, 'settings.ownLimit'],
    ['an id with a space', 'bays.0.id', 'W 1', 'bays[0].id'],
    ['an id with a slash, which parts bays from bars', 'bays.0.id', 'W/1', 'bays[0].id'],
    ['an id that every plain object has', 'bays.0.id', 'constructor', 'bays[0].id'],
    [
      'a vouching without a reason',
      'bays.0.recipe.lines.0.heldBy',
      { kind: 'vouched', reason: '  ' },
      'bays[0].recipe.lines[0].heldBy.reason',
    ],
  ] as const)('is refused: %s', (_, path, value, said) => {
    const problems = refusal(spoilt(fileOf(), path, value));
    expect(problems.map((problem) => problem.path)).toContain(said);
  });

  it.each([
    ['bays.0.recipe.kind', 'dome', 'bays[0].recipe'],
    ['bays.0.joins', { 't1.fall+t1.rise': { kind: 'glued' } }, 'bays[0].joins.t1.fall+t1.rise'],
    ['bays.0.recipe.lines.0.heldBy', { kind: 'hope' }, 'bays[0].recipe.lines[0].heldBy'],
  ] as const)('is refused when %s is of no known kind', (path, value, said) => {
    expect(first(spoilt(fileOf(), path, value)).path.startsWith(said)).toBe(true);
  });

  it('is refused when it is missing, saying what to give', () => {
    const data = fileOf();
    delete (data.settings as Record<string, unknown>).practice;
    const problem = first(JSON.stringify(data));
    expect(problem.path).toBe('settings.practice');
  });

  it('is refused when its name is not known, so that a slip of spelling is not lost', () => {
    const problem = first(spoilt(fileOf(), 'bays.0.diagonals.secton', '70x70x6'));
    expect(problem.path).toBe('bays[0].diagonals');
    expect(problem.what).toContain('secton');
    expect(problem.todo).toContain('spelling');
  });

  it('is refused for an override without a reason, and without a sound factor', () => {
    const override = { axis: 'y', length: 3000, factor: 1, reason: '' };
    const bars = { 't1.rise': { overrides: [override] } };
    expect(first(spoilt(fileOf(), 'bays.0.bars', bars)).path).toBe(
      'bays[0].bars.t1.rise.overrides[0].reason',
    );
    const none = { 't1.rise': { overrides: [{ ...override, reason: 'tested', factor: 0 }] } };
    expect(first(spoilt(fileOf(), 'bays.0.bars', none)).path).toBe(
      'bays[0].bars.t1.rise.overrides[0].factor',
    );
  });

  it('is refused for two overrides of one axis, of which only one could be in force', () => {
    const override = { axis: 'y', length: 3000, factor: 1, reason: 'tested' };
    const bars = { 't1.rise': { overrides: [override, { ...override, length: 4000 }] } };
    expect(first(spoilt(fileOf(), 'bays.0.bars', bars)).path).toBe('bays[0].bars.t1.rise.overrides[1].axis');
  });

  it('says at most twenty things, however much is wrong', () => {
    const data = fileOf(
      project(Array.from({ length: 40 }, (_, k) => bay(wall(6000, [[4000, 'crossed']]), { id: `W${k}` }))),
    );
    for (const each of data.bays as Record<string, Record<string, unknown>>[])
      if (each.recipe) each.recipe.width = -1;
    expect(refusal(JSON.stringify(data)).length).toBe(20);
  });
});

describe('names and places that do not fit together', () => {
  it('refuses two bays of one id', () => {
    const [made] = sound().bays;
    if (!made) throw new Error('no bay');
    const problem = first(writeProject(project([made, made])));
    expect(problem.path).toBe('bays[1].id');
    expect(problem.what).toContain('W1');
  });

  it.each([
    [
      'tiers',
      wall(6000, [
        [3000, 'crossed'],
        [3000, 'crossed'],
      ]),
      'tiers.1.id',
      't1',
      'bays[0].recipe.tiers[1].id',
    ],
    [
      'lines',
      wall(6000, [[3000, 'crossed']], [line('G1', 500), line('G2', 900)]),
      'lines.1.id',
      'G1',
      'bays[0].recipe.lines[1].id',
    ],
    [
      'panels',
      roof(6000, 8, [
        [3000, 'crossed'],
        [3000, 'crossed'],
      ]),
      'slopes.0.panels.1.id',
      'p1',
      'bays[0].recipe.slopes[0].panels[1].id',
    ],
    ['slopes', roof(6000, 8, [[3000, 'crossed']], [], []), 'slopes.1.id', 'a', 'bays[0].recipe.slopes[1].id'],
    [
      'nodes',
      free({ n1: [0, 0, 0], n2: [4000, 0, 0] }, [['b1', 'n1', 'n2']]),
      'nodes.1.id',
      'n1',
      'bays[0].recipe.nodes[1].id',
    ],
    [
      'bars',
      free({ n1: [0, 0, 0], n2: [4000, 0, 0] }, [
        ['b1', 'n1', 'n2'],
        ['b2', 'n1', 'n2'],
      ]),
      'bars.1.id',
      'b1',
      'bays[0].recipe.bars[1].id',
    ],
  ] as const)('refuses %s of one id', (_, recipe, path, id, said) => {
    const text = spoilt(fileOf(project([bay(recipe)])), `bays.0.recipe.${path}`, id);
    const problem = refusal(text).find((each) => each.path === said);
    expect(problem?.what).toContain(id);
  });

  it('refuses purlins of one id on the two slopes of a roof, at the second of them', () => {
    const recipe = roof(6000, 8, [[3000, 'crossed']], [line('P1', 500), line('P2', 900)], [line('P2', 500)]);
    expect(first(writeProject(project([bay(recipe)]))).path).toBe('bays[0].recipe.slopes[1].lines[0].id');
  });

  it('refuses a bar that goes to a node that is not there', () => {
    const recipe = free({ n1: [0, 0, 0], n2: [4000, 0, 0] }, [['b1', 'n1', 'n9']]);
    const problem = first(writeProject(project([bay(recipe)])));
    expect(problem.path).toBe('bays[0].recipe.bars[0].to');
    expect(problem.what).toContain('n9');
  });

  it('refuses a bar from a node to itself, and one of 9 mm, but takes one of 10', () => {
    const one = (to: number, id: string) =>
      writeProject(project([bay(free({ n1: [0, 0, 0], n2: [to, 0, 0] }, [['b1', 'n1', id]]))]));
    expect(first(one(4000, 'n1')).path).toBe('bays[0].recipe.bars[0]');
    expect(first(one(9, 'n2')).path).toBe('bays[0].recipe.bars[0]');
    expect(readProject(one(10, 'n2')).ok).toBe(true);
  });

  it('refuses a normal that lies along a diagonal, however long, and takes one across it', () => {
    const along = (normal: readonly [number, number, number], role: 'diagonal' | 'strut' = 'diagonal') =>
      writeProject(
        project([bay(free({ n1: [0, 0, 0], n2: [4000, 0, 3000] }, [['b1', 'n1', 'n2', role]], { normal }))]),
      );
    for (const normal of [
      [4, 0, 3],
      [-4000, 0, -3000],
    ] as const) {
      const problem = first(along(normal));
      expect(problem.path).toBe('bays[0].recipe.normal');
      expect(problem.what).toContain('b1');
    }
    expect(readProject(along([0, -1, 0])).ok).toBe(true);
    expect(readProject(along([4, 0, 3], 'strut')).ok).toBe(true);
  });

  it('counts in good grammar what is to be given', () => {
    expect(first(spoilt(fileOf(), 'bays.0.recipe.tiers', [])).todo).toBe('Give at least 1 entry.');
    expect(first(spoilt(fileOf(), 'bays.0.diagonals.section', '')).todo).toBe('Give at least 1 character.');
    expect(first(spoilt(fileOf(), 'bays.0.diagonals.section', 'x'.repeat(61))).todo).toBe(
      'Give at most 60 characters.',
    );
  });

  it('refuses a normal without direction', () => {
    const recipe = free({ n1: [0, 0, 0], n2: [4000, 0, 0] }, [['b1', 'n1', 'n2']], { normal: [0, 0, 0] });
    expect(first(writeProject(project([bay(recipe)]))).path).toBe('bays[0].recipe.normal');
  });

  it('refuses a rail above the bay, and a purlin beyond its slope', () => {
    const high = wall(6000, [[3000, 'crossed']], [line('G1', 3001)]);
    expect(first(writeProject(project([bay(high)]))).path).toBe('bays[0].recipe.lines[0].at');
    const far = roof(6000, 8, [[3000, 'crossed']], [line('P1', 3001)]);
    expect(first(writeProject(project([bay(far)]))).path).toBe('bays[0].recipe.slopes[0].lines[0].at');
  });

  it('takes a rail at the very head of the bay, where the heights do not add up exactly', () => {
    // 1066.1 + 1066.1 + 1066.1 is 3198.2999999999997 in binary arithmetic, and the rail is typed at 3198.3.
    const recipe = wall(
      6000,
      [
        [1066.1, 'crossed'],
        [1066.1, 'crossed'],
        [1066.1, 'crossed'],
      ],
      [line('G1', 3198.3)],
    );
    expect(1066.1 + 1066.1 + 1066.1).toBeLessThan(3198.3);
    expect(readProject(writeProject(project([bay(recipe)]))).ok).toBe(true);
  });

  it('refuses an own angle that is none', () => {
    const own = { designation: 'own', longLeg: 60, shortLeg: 80, thickness: 6, rootRadius: 6, toeRadius: 3 };
    const text = (row: object) => JSON.stringify({ ...fileOf(), ownStock: [row] });
    expect(first(text(own)).path).toBe('ownStock[0]');
    expect(first(text({ ...own, longLeg: 80, thickness: 80 })).path).toBe('ownStock[0]');
    expect(readProject(text({ ...own, longLeg: 80 })).ok).toBe(true);
  });

  it('refuses an own designation twice, however it is written', () => {
    const own = { designation: 'Own', longLeg: 80, shortLeg: 60, thickness: 6, rootRadius: 6, toeRadius: 3 };
    const text = JSON.stringify({ ...fileOf(), ownStock: [own, { ...own, designation: 'own' }] });
    expect(first(text).path).toBe('ownStock[1].designation');
  });
});

describe('what is not refused', () => {
  it('opens a file with a section that no list has, so that it can be mended', () => {
    const made = project([bay(wall(6000, [[4000, 'crossed']]), { diagonals: { section: 'pipe 60' } })]);
    expect(readProject(writeProject(made)).ok).toBe(true);
  });

  it('opens a file with marks on bars and crossings that are not there just now', () => {
    const made = project([
      bay(wall(6000, [[4000, 'open']]), {
        bars: { 't1.rise': { section: '80x80x8' } },
        joins: { 't1.fall+t1.rise': { kind: 'bolted' } },
      }),
    ]);
    const read = readProject(writeProject(made));
    expect(read).toEqual({ ok: true, project: made, migratedFrom: null });
  });

  it('opens a project without bays, and a knee bay of one knee', () => {
    expect(readProject(writeProject(project([]))).ok).toBe(true);
    expect(readProject(writeProject(project([bay(knee({ count: 1, sides: 'one' }))]))).ok).toBe(true);
  });
});
