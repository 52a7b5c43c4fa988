/** Ways in which one case can be told; what is solved is checked against published cases elsewhere. */
import { describe, expect, it } from 'vitest';
import { BAR, GEOMETRY_70, PAIR, SECTION_70, solvedBar, solvedPair, TWISTING } from './given.ts';

const load = (given: unknown): number => solvedBar(given).critical?.N ?? Number.NaN;
const expectSame = (a: unknown, b: unknown, places = 9): void =>
  expect(load(a) / load(b)).toBeCloseTo(1, places);

describe('stations', () => {
  const both = {
    ...BAR,
    stations: [
      { z: 2000, direction_deg: 0, k: 'rigid' },
      { z: 2000, direction_deg: 90, k: 20 },
    ],
  };

  it('may hold several ways: told one by one, as a list of holds, or as lists of directions and stiffnesses', () => {
    expectSame(both, {
      ...BAR,
      stations: [
        {
          z: 2000,
          holds: [
            { direction_deg: 0, k: 'rigid' },
            { direction_deg: 90, k: 20 },
          ],
        },
      ],
    });
    expectSame(both, { ...BAR, stations: [{ z: 2000, direction_deg: [0, 90], k: ['rigid', 20] }] });
    expectSame(
      { ...BAR, stations: [{ z: 2000, direction_deg: [0, 90], k: 'rigid' }] },
      {
        ...BAR,
        stations: [
          { z: 2000, direction_deg: 0, k: 'rigid' },
          { z: 2000, direction_deg: 90, k: 'rigid' },
        ],
      },
    );
  });

  it('at the ends change nothing', () => {
    expectSame(BAR, {
      ...BAR,
      stations: [
        ...BAR.stations,
        { z: 0, direction_deg: 0, k: 5 },
        { z: 4000, direction_deg: 90, k: 'rigid' },
      ],
    });
  });

  it('need not be there', () => {
    expectSame({ ...BAR, stations: [] }, { ...BAR, stations: undefined });
    expect(solvedBar({ ...BAR, stations: undefined }).critical?.effectiveLength.v).toBeCloseTo(4000, 5);
  });

  it('point the same way half a turn on', () => {
    for (const turned of [180, -180, 360, 720])
      expectSame(BAR, { ...BAR, stations: [{ z: 2000, direction_deg: turned, k: 'rigid' }] });
  });
});

describe('the force', () => {
  it('is one piece of compression when nothing is said', () => expectSame(BAR, { ...BAR, axial: undefined }));

  it('may be told in any order, and pull', () => {
    const pieces = [
      { z0: 0, z1: 1000, p: -0.5 },
      { z0: 1000, z1: 4000, p: 1 },
    ];
    expectSame({ ...BAR, axial: pieces }, { ...BAR, axial: [...pieces].reverse() });
    expect(load({ ...BAR, axial: pieces })).toBeGreaterThan(load(BAR));
  });

  it('gives the factor on what is told, and the largest compression', () => {
    const { critical } = solvedBar({ ...BAR, axial: [{ z0: 0, z1: 4000, p: 250 }] });
    expect(critical?.N ?? 0).toBeCloseTo(load(BAR), 3);
    expect((critical?.factor ?? 0) * 250).toBeCloseTo(load(BAR), 3);
    expect((critical?.secondFactor ?? 0) * 250).toBeCloseTo(critical?.secondN ?? 0, 6);
  });

  it('of pull alone makes nothing buckle', () => {
    const solved = solvedBar({ ...BAR, axial: [{ z0: 0, z1: 4000, p: -1 }] });
    expect(solved).toMatchObject({ critical: null, mode: null, rule: null });
    expect(solved.says).toContain('nothing presses it');
  });
});

describe('the section', () => {
  it('comes from its geometry when no figures are given', () => {
    // The given figures carry nine digits.
    expectSame(BAR, { ...BAR, section: { geometry: GEOMETRY_70 } }, 5);
  });

  it('is taken as given when both are', () => {
    expectSame(BAR, { ...BAR, section: { ...SECTION_70, geometry: { ...GEOMETRY_70, t: 10 } } });
    expectSame(BAR, { ...BAR, section: { ...SECTION_70, Iu: 1, Iv: 1, weak_displacement_dir_deg: 7 } });
  });

  it('may have its longer leg along x: h is along y whichever is longer', () => {
    const upright = {
      ...BAR,
      section: { geometry: { h: 150, b: 90, t: 10, root_radius: 12, toe_radius: 6 } },
    };
    const lying = { ...BAR, section: { geometry: { h: 90, b: 150, t: 10, root_radius: 12, toe_radius: 6 } } };
    const turned = { ...lying, stations: [{ z: 2000, direction_deg: 90, k: 'rigid' }] };
    expectSame(upright, turned);
    const [a, b] = [solvedBar(upright), solvedBar(turned)];
    // Its x and y change places, in lengths and in the rule; u and v stay.
    expect(b.critical?.effectiveLength.x).toBeCloseTo(a.critical?.effectiveLength.y ?? 0, 6);
    expect(b.critical?.effectiveLength.v).toBeCloseTo(a.critical?.effectiveLength.v ?? 0, 6);
    expect(a.rule?.unbraced).toEqual({ x: 4000, y: 2000, u: 2000, v: 2000 });
    expect(b.rule?.unbraced).toEqual({ x: 2000, y: 4000, u: 2000, v: 2000 });
    expect(b.rule?.slenderness).toBeCloseTo(a.rule?.slenderness ?? 0, 9);
    // Held along the longer leg instead, the lying one bows about its y: the smaller radius.
    expect(solvedBar(lying).rule?.axis).toBe('x');
    expect(solvedBar({ ...upright, stations: turned.stations }).rule?.axis).toBe('y');
  });

  it('gives torsion from its geometry where that is not given', () => {
    const given = load(TWISTING);
    const found = load({ ...TWISTING, section: { ...SECTION_70, geometry: GEOMETRY_70 } });
    expect(found / given).toBeCloseTo(1, 5);
  });

  it('may be without any warping stiffness: the limit of a small one', () => {
    const withIw = (Iw: number) => load({ ...TWISTING, section: { ...TWISTING.section, Iw } });
    expect(withIw(0) / withIw(100)).toBeCloseTo(1, 3);
    expect(withIw(0)).toBeLessThanOrEqual(withIw(100));
  });
});

describe('the ends', () => {
  it('are pinned when nothing is said, or what is said is that', () => {
    for (const ends of [
      { translation: 'both ends fixed in x and y' },
      { rotational_springs: { z0: { on_slope_ux: 0 }, zL: {} } },
      'x,y translation and twist fixed, rotations and warping free (fork); load through centroid',
    ])
      expectSame(BAR, { ...BAR, ends });
  });

  it('may turn against springs, or not at all', () => {
    const ends = (k: number | 'rigid') => ({
      ...BAR,
      ends: {
        rotational_springs: {
          z0: { on_slope_ux: k, on_slope_uy: k },
          zL: { on_slope_ux: k, on_slope_uy: k },
        },
      },
    });
    expect(load(ends(1e8))).toBeGreaterThan(load(BAR));
    expect(load(ends('rigid'))).toBeGreaterThan(load(ends(1e8)));
    expectSame(ends('rigid'), ends(1e16), 6);
  });
});

describe('twist', () => {
  it('held at the crossing gives some of it back', () => {
    const held = { ...TWISTING, twist_fixed_at: [2000] };
    expect(load(held)).toBeGreaterThan(load(TWISTING));
    expect(load(held)).toBeLessThan(solvedBar(TWISTING).bowingOnly ?? 0);
  });

  it('depends on where the hold grips; of a plain bar that is passed over', () => {
    const grip = (point: readonly number[], of: typeof TWISTING | typeof BAR) => ({
      ...of,
      stations: [{ z: 2000, direction_deg: 0, k: 'rigid', point_rel_centroid: point }],
    });
    expect(load(grip([0, 50], TWISTING))).toBeLessThan(0.95 * load(TWISTING));
    expectSame(grip([0, 50], BAR), BAR);
  });

  it('is told of a plain bar neither in loads nor in words', () => {
    expect(solvedBar(BAR).bowingOnly).toBeNull();
    expect(solvedBar(BAR).says).not.toContain('twist');
  });
});

describe('the rule', () => {
  it('takes holds within 10° at one place for one, and holds farther apart for both ways', () => {
    const at = (degrees: number) =>
      solvedBar({ ...BAR, stations: [{ z: 2000, direction_deg: [0, degrees], k: 'rigid' }] });
    expect(at(8).rule?.unbraced.x).toBe(4000);
    expect(at(30).rule?.unbraced).toEqual({ x: 2000, y: 2000, u: 2000, v: 2000 });
  });

  it('says when it is a bound for mixed holds', () => {
    const { rule, critical } = solvedBar({
      ...BAR,
      stations: [
        { z: 1300, direction_deg: 0, k: 'rigid' },
        { z: 2700, direction_deg: 90, k: 'rigid' },
      ],
    });
    expect(rule?.basis).toBe('mixed bound');
    expect(rule?.slenderness ?? 0).toBeGreaterThan(critical?.slenderness ?? 0);
    expect(rule?.difference ?? 0).toBeLessThan(0);
  });

  it('is left out for springs, though not for one of no stiffness', () => {
    expect(solvedBar({ ...BAR, stations: [{ z: 2000, direction_deg: 0, k: 10 }] }).rule).toBeNull();
    expect(solvedBar({ ...BAR, stations: [{ z: 2000, direction_deg: 0, k: 0 }] }).rule?.unbraced.v).toBe(
      4000,
    );
  });
});

describe('a pair', () => {
  const load = (change: object): number => solvedPair({ ...PAIR, ...change }).N;

  it('knows a cut bar by any of the usual words', () => {
    for (const word of ['cut', 'interrupted', 'hinged', 'Hinge', 'discontinuous'])
      expect(load({ T_over_C: 0.5, partner: { ...PAIR.partner, at_crossing: word } })).toBeCloseTo(
        19756.1,
        1,
      );
  });

  it('may cross anywhere, told with the bars or for the pair', () => {
    const third = load({ crossing: 'at a third', crossing_at: { considered: 5000 / 3, partner: 2500 } });
    expect(third).toBeCloseTo(load({ considered: { ...PAIR.considered, crossing_at: 5000 / 3 } }), 6);
    expect(load({ crossing_at: 5000 / 3 })).toBeCloseTo(
      load({ crossing_at: { considered: 5000 / 3, partner: (2 * 5000) / 3 } }),
      6,
    );
  });

  it('says who bows', () => {
    const says = (change: object): string => solvedPair({ ...PAIR, ...change }).says;
    expect(says({})).toContain('crossing moves');
    expect(says({ T_over_C: 1 })).toContain('the bar bows between its ends and the crossing');
    expect(
      says({
        T_over_C: -2,
        partner: { ...PAIR.partner, EI: 1e8 },
        considered: { ...PAIR.considered, EI: 3e13 },
      }),
    ).toContain('the partner bows by itself');
  });

  it('that is a chain of hinges carries nothing, and says so', () => {
    const hinged = { L: 5000, EI: 3e10, at_crossing: 'cut' };
    expect(solvedPair({ ...PAIR, considered: hinged, partner: hinged, T_over_C: 0.2 })).toMatchObject({
      N: 0,
      K: null,
      effectiveLength: null,
      says: expect.stringContaining('without resistance'),
    });
  });
});
