import { describe, expect, it } from 'vitest';
import { readCases } from '../../../core/cases/readCases.ts';
import { BAR, PAIR, problemsOf, SECTION_70, TWISTING } from './given.ts';

describe('a file of cases', () => {
  it('is an object with the list, or the list', () => {
    for (const data of [[BAR, PAIR], { description: 'two', cases: [BAR, PAIR] }]) {
      const read = readCases(data);
      expect(read.ok && read.cases.map((each) => each.ok && each.case.id)).toEqual(['one', 'pair']);
    }
    expect(readCases([])).toEqual({ ok: true, cases: [] });
  });

  it.each([[null], [7], ['text'], [{}], [{ cases: 'none' }], [BAR]])('is not %j', (data) => {
    const read = readCases(data);
    expect(read.ok).toBe(false);
    expect(!read.ok && read.problem.todo).toContain('cases');
  });

  it('keeps the good cases when others cannot be understood, each named by its id or its place', () => {
    const read = readCases([BAR, { ...BAR, id: 'bad', L: -1 }, { type: 'bar' }, 5, PAIR]);
    if (!read.ok) throw new Error('no list');
    expect(read.cases.map((each) => (each.ok ? each.case.id : `not ${each.id}`))).toEqual([
      'one',
      'not bad',
      'not cases[2]',
      'not cases[3]',
      'pair',
    ]);
  });

  it('takes the first of two cases of one id, and says that the other cannot be told from it', () => {
    const read = readCases([BAR, { ...PAIR, id: 'one' }, PAIR]);
    if (!read.ok) throw new Error('no list');
    expect(
      read.cases.map((each) => (each.ok ? each.case.type : `not ${each.id}: ${each.problems[0]?.what}`)),
    ).toEqual(['bar', 'not one: Another case before this one has the same id.', 'xbrace-planar']);
  });

  it('takes numbers for ids, and passes over results, checks and whatever else is there', () => {
    const read = readCases([{ ...BAR, id: 7, result: { N_cr: 'nonsense' }, check: [], remarks: {} }]);
    expect(read.ok && read.cases[0]?.ok && read.cases[0].case.id).toBe('7');
  });
});

describe('what is wrong with a case is said with its place', () => {
  it.each([
    ['no type', { ...BAR, type: undefined }, ['type: The case has no type.']],
    ['another type', { ...BAR, type: 'beam' }, ['type: "beam" is no type of case.']],
    ['no length', { ...BAR, L: undefined }, ['L: It is not given.']],
    ['a modulus in words', { ...BAR, E: 'steel' }, ['E: "steel" is not a number, above zero.']],
    ['no section', { ...BAR, section: undefined }, ['section: What is there is not a section']],
    [
      'half a section',
      { ...BAR, section: { A: 800, Ixx: 4e5 } },
      ['section.Iyy: It is not given.', 'section.Ixy: It is not given.'],
    ],
    [
      'a section that is none',
      { ...BAR, section: { ...SECTION_70, Ixy: -4e5 } },
      ['section: Its Ixx, Iyy and Ixy give'],
    ],
    [
      'an outline that is none',
      { ...BAR, section: { geometry: { h: 70, b: 70, t: 80, root_radius: 9, toe_radius: 4 } } },
      ['section.geometry: No angle has these dimensions'],
    ],
    [
      'an outline without radii',
      { ...BAR, section: { geometry: { h: 70, b: 70, t: 6 } } },
      ['section.geometry.root_radius: It is not given.', 'section.geometry.toe_radius: It is not given.'],
    ],
    ['stations that are no list', { ...BAR, stations: {} }, ['stations: {} is not a list.']],
    [
      'a station past the end',
      { ...BAR, stations: [{ z: 4001, direction_deg: 0, k: 1 }] },
      ['stations[0].z: 4001 is past the end'],
    ],
    [
      'a station before the start',
      { ...BAR, stations: [{ z: -1, direction_deg: 0, k: 1 }] },
      ['stations[0].z: -1 is not a number, zero or more.'],
    ],
    [
      'a stiffness below zero',
      { ...BAR, stations: [{ z: 1, direction_deg: 0, k: -2 }] },
      ['stations[0].k: -2 is no stiffness.'],
    ],
    [
      'a stiffness in other words',
      { ...BAR, stations: [{ z: 1, direction_deg: 0, k: 'stiff' }] },
      ['stations[0].k: "stiff" is no stiffness.'],
    ],
    ['no direction', { ...BAR, stations: [{ z: 1, k: 2 }] }, ['stations[0].direction_deg: It is not given.']],
    [
      'one hold of several wrong',
      { ...BAR, stations: [{ z: 1, holds: [{ direction_deg: 0, k: 1 }, { direction_deg: 90 }] }] },
      ['stations[0].holds[1].k: It is not given.'],
    ],
    [
      'a gap in the force',
      {
        ...BAR,
        axial: [
          { z0: 0, z1: 1000, p: 1 },
          { z0: 2000, z1: 4000, p: 1 },
        ],
      },
      ['axial: After 1000 the next piece begins at 2000'],
    ],
    [
      'a force that ends early',
      { ...BAR, axial: [{ z0: 0, z1: 3000, p: 1 }] },
      ['axial: After 3000 the next piece begins at 4000, or the bar ends there.'],
    ],
    [
      'ends in other words',
      { ...BAR, ends: { translation: 'one end free' } },
      ['ends.translation: "one end free" is not understood.'],
    ],
    [
      'a rotational spring below zero',
      { ...BAR, ends: { rotational_springs: { z0: { on_slope_ux: -5 } } } },
      ['ends.rotational_springs.z0.on_slope_ux: -5 is no stiffness.'],
    ],
    ['no shear modulus', { ...TWISTING, G: undefined }, ['G: It is not given.']],
    [
      'no torsion constant and no geometry',
      { ...TWISTING, section: SECTION_70 },
      ['section.J: It is not given.', 'section.Iw: It is not given.'],
    ],
    [
      'a grip that is no point',
      { ...TWISTING, stations: [{ z: 1, direction_deg: 0, k: 1, point_rel_centroid: [1] }] },
      ['stations[0].point_rel_centroid: It is not a point.'],
    ],
    ['a pair without a partner', { ...PAIR, partner: undefined }, ['partner: What is there is not a bar']],
    ['a pair without a state', { ...PAIR, T_over_C: undefined }, ['T_over_C: It is not given.']],
    [
      'a bar neither through nor cut',
      { ...PAIR, partner: { ...PAIR.partner, at_crossing: 'maybe' } },
      ['partner.at_crossing: "maybe" says neither.'],
    ],
    [
      'a crossing past the end',
      { ...PAIR, crossing_at: { considered: 5000, partner: 2500 } },
      ['crossing_at.considered: 5000 is not on the bar'],
    ],
    [
      'a crossing in words only',
      { ...PAIR, crossing: 'at a third' },
      ['crossing: "at a third" does not say “mid”'],
    ],
  ])('%s', (_, given, expected) => {
    const found = problemsOf(given);
    for (const begin of expected)
      expect(
        found.some((each) => each.startsWith(begin)),
        `${begin} in ${found.join(' | ')}`,
      ).toBe(true);
  });

  it('all at once', () => {
    expect(
      problemsOf({ ...BAR, E: null, stations: [{ z: 1, direction_deg: 0, k: null }], axial: 5 }),
    ).toHaveLength(4);
  });

  it('with what to do', () => {
    const read = readCases([{ ...BAR, E: 0 }]);
    const [first] = read.ok ? read.cases : [];
    expect(first && !first.ok && first.problems).toEqual([
      { path: 'E', what: '0 is not a number, above zero.', todo: 'Give a number, above zero.' },
    ]);
  });
});
