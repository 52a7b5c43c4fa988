/** Bays to test with, every figure stated here, so that expected values can be worked by hand from this page. */
import type { Vec3 } from '../../../../core/geometry/vector.ts';
import type {
  Bay,
  DiagonalSpec,
  EndConnection,
  FreeBar,
  FreeNode,
  FreeRecipe,
  KneeRecipe,
  Line,
  Member,
  Pattern,
  Project,
  Recipe,
  RoofRecipe,
  Settings,
  WallRecipe,
} from '../../../../core/project/model.ts';

export const COLUMN: Member = { name: 'column', shape: 'I', depth: 250, width: 150 };
export const BEAM: Member = { name: 'beam', shape: 'I', depth: 200, width: 130 };
export const RAFTER: Member = { name: 'rafter', shape: 'I', depth: 300, width: 160 };
export const STRUT: Member = { name: 'strut', shape: 'tube', depth: 114, width: 114 };
export const PURLIN: Member = { name: 'purlin', shape: 'channel', depth: 150, width: 65 };

/** Two M16 at 60 mm, set-back 350 to the nearest bolt, end distance 40: steel begins 310 from the set-out point. */
export const ENDS: EndConnection = {
  kind: 'bolted',
  bolts: 2,
  boltDiameter: 16,
  pitch: 60,
  endDistance: 40,
  gauge: null,
  legs: 'one',
  setBack: 350,
  weldLength: 0,
};

export const DIAGONALS: DiagonalSpec = {
  section: '70x70x6',
  grade: 'S355JR',
  countedOn: 'tension',
  legInPlane: 'longer',
  heel: 'up',
  arrangement: 'opposite',
  gusset: 10,
  ends: ENDS,
};

export const SETTINGS: Settings = {
  practice: 'sans10162',
  memberClass: null,
  ownLimit: null,
  catalogue: 'en',
  units: 'metric',
  sagRatio: null,
  lengthBasis: 'set-out',
};

export function project(bays: readonly Bay[], settings: Partial<Settings> = {}): Project {
  return {
    format: 'tautline-project',
    version: 1,
    name: 'a shed',
    settings: { ...SETTINGS, ...settings },
    ownStock: [],
    bays,
  };
}

type BayRest = Partial<Omit<Bay, 'recipe' | 'diagonals'>> & { readonly diagonals?: Partial<DiagonalSpec> };

export function bay(recipe: Recipe, rest: BayRest = {}): Bay {
  return {
    id: 'B',
    name: 'a bay',
    place: { origin: [0, 0, 0], turn: 0 },
    numberOff: 1,
    bars: {},
    joins: {},
    ...rest,
    recipe,
    diagonals: { ...DIAGONALS, ...rest.diagonals },
  };
}

/** Tiers t1, t2, … from the ground up, each [height, pattern]. */
export function wall(
  width: number,
  tiers: readonly (readonly [number, Pattern])[],
  lines: readonly Line[] = [],
): WallRecipe {
  return {
    kind: 'wall',
    width,
    tiers: tiers.map(([height, pattern], index) => ({ id: `t${index + 1}`, height, pattern })),
    columns: COLUMN,
    beams: BEAM,
    lines,
    lineMember: PURLIN,
  };
}

/** A slope "a" of panels p1, p2, …; a second slope "b" alike but for its own lines, when those are given. */
export function roof(
  width: number,
  pitch: number,
  panels: readonly (readonly [number, Pattern])[],
  lines: readonly Line[] = [],
  linesB: readonly Line[] | null = null,
): RoofRecipe {
  const made = panels.map(([height, pattern], index) => ({ id: `p${index + 1}`, height, pattern }));
  const slopes = [{ id: 'a', pitch, panels: made, lines }];
  return {
    kind: 'roof',
    width,
    slopes: linesB === null ? slopes : [...slopes, { id: 'b', pitch, panels: made, lines: linesB }],
    rafters: RAFTER,
    struts: STRUT,
    purlin: PURLIN,
    eavesStrut: true,
    ridgeStrut: true,
  };
}

export function knee(change: Partial<KneeRecipe> = {}): KneeRecipe {
  return {
    kind: 'knee',
    count: 2,
    spacing: 1500,
    drop: 1200,
    angle: 45,
    sides: 'both',
    chord: BEAM,
    purlin: PURLIN,
    ...change,
  };
}

export const line = (id: string, at: number, heldBy: Line['heldBy'] = { kind: 'nothing' }): Line => ({
  id,
  at,
  heldBy,
});

export const vouched = { kind: 'vouched', reason: 'tied by the sheeting' } as const;

/** Bars as [id, from, to] or [id, from, to, role]; nodes named in `free` are held by nothing. */
export function free(
  nodes: Readonly<Record<string, Vec3>>,
  bars: readonly (readonly [string, string, string] | readonly [string, string, string, FreeBar['role']])[],
  options: { readonly free?: readonly string[]; readonly normal?: Vec3 | null } = {},
): FreeRecipe {
  return {
    kind: 'free',
    nodes: Object.entries(nodes).map(
      ([id, at]): FreeNode => ({ id, at, support: !(options.free ?? []).includes(id) }),
    ),
    bars: bars.map(([id, from, to, role = 'diagonal']) => ({ id, from, to, role, member: null })),
    normal: options.normal === undefined ? [0, -1, 0] : options.normal,
  };
}
