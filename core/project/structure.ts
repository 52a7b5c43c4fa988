import type { Vec3 } from '../geometry/vector.ts';
import type { Bay, FreeBar, FreeNode, FreeRecipe, Project, RoofRecipe, WallRecipe } from './model.ts';
import type { ProjectProblem } from './problem.ts';

/** What a schema cannot say: names that must differ, ends that must exist, heights that must fit. */
export function structureProblems(project: Project): readonly ProjectProblem[] {
  const problems: ProjectProblem[] = [];
  repeated(project.bays.map((bay) => bay.id)).forEach(({ index, value }) => {
    problems.push({
      path: `bays[${index}].id`,
      what: `Two bays are called "${value}".`,
      todo: 'Give each bay a name of its own.',
    });
  });
  repeated(project.ownStock.map((row) => row.designation.toLowerCase())).forEach(({ index, value }) => {
    problems.push({
      path: `ownStock[${index}].designation`,
      what: `The own stock list has "${value}" twice.`,
      todo: 'Keep one of them.',
    });
  });
  project.ownStock.forEach((row, index) => {
    if (row.thickness >= row.shortLeg || row.shortLeg > row.longLeg)
      problems.push({
        path: `ownStock[${index}]`,
        what: `${row.designation} is no angle: legs ${row.longLeg} and ${row.shortLeg} with thickness ${row.thickness}.`,
        todo: 'Give the longer leg first and a thickness below the shorter leg.',
      });
  });
  problems.push(...actionProblems(project));
  project.bays.forEach((bay, index) => {
    problems.push(...bayProblems(bay, `bays[${index}].recipe`), ...markProblems(bay, `bays[${index}].bars`));
  });
  return problems;
}

/** Two cases, combinations or loads under one name could not be told apart. */
function actionProblems({ actions }: Project): readonly ProjectProblem[] {
  if (!actions) return [];
  return [
    ...sameIds(actions.cases, 'actions.cases'),
    ...sameIds(actions.combinations, 'actions.combinations'),
    ...actions.cases.flatMap(({ loads }, index) => sameIds(loads, `actions.cases[${index}].loads`)),
  ];
}

function bayProblems(bay: Bay, path: string): readonly ProjectProblem[] {
  switch (bay.recipe.kind) {
    case 'wall':
      return wallProblems(bay.recipe, path);
    case 'roof':
      return roofProblems(bay.recipe, path);
    case 'knee':
      return [];
    case 'free':
      return freeProblems(bay.recipe, path);
    default:
      return bay.recipe satisfies never;
  }
}

/** Of two overrides of one axis only one could be in force. */
function markProblems(bay: Bay, path: string): readonly ProjectProblem[] {
  return Object.entries(bay.bars).flatMap(([key, mark]) =>
    repeated((mark.overrides ?? []).map((override) => override.axis)).map(({ index, value }) => ({
      path: `${path}.${key}.overrides[${index}].axis`,
      what: `The length about ${value} is set twice for ${key}.`,
      todo: 'Keep one of them.',
    })),
  );
}

function wallProblems(recipe: WallRecipe, path: string): ProjectProblem[] {
  const height = recipe.tiers.reduce((sum, tier) => sum + tier.height, 0);
  return [...sameIds(recipe.tiers, `${path}.tiers`), ...lineProblems(recipe.lines, height, path)];
}

function roofProblems(recipe: RoofRecipe, path: string): ProjectProblem[] {
  const slopes = sameIds(recipe.slopes, `${path}.slopes`);
  // Lines of both slopes share the bay's names.
  const lines = sameIdsAt(
    recipe.slopes.flatMap((slope, s) =>
      slope.lines.map((line, k) => ({ id: line.id, at: `${path}.slopes[${s}].lines[${k}].id` })),
    ),
  );
  const each = recipe.slopes.flatMap((slope, index) => {
    const length = slope.panels.reduce((sum, panel) => sum + panel.height, 0);
    const at = `${path}.slopes[${index}]`;
    return [...sameIds(slope.panels, `${at}.panels`), ...tooFar(slope.lines, length, at)];
  });
  return [...slopes, ...lines, ...each];
}

function freeProblems(recipe: FreeRecipe, path: string): ProjectProblem[] {
  const problems = [...sameIds(recipe.nodes, `${path}.nodes`), ...sameIds(recipe.bars, `${path}.bars`)];
  const nodes = new Map(recipe.nodes.map((node) => [node.id, node]));
  recipe.bars.forEach((bar, index) => {
    for (const end of ['from', 'to'] as const)
      if (!nodes.has(bar[end]))
        problems.push({
          path: `${path}.bars[${index}].${end}`,
          what: `Bar ${bar.id} goes to node "${bar[end]}", which is not there.`,
          todo: 'Add the node, or name one that exists.',
        });
    const a = nodes.get(bar.from)?.at;
    const b = nodes.get(bar.to)?.at;
    if (a && b && Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]) < 10)
      problems.push({
        path: `${path}.bars[${index}]`,
        what: `Bar ${bar.id} has no length to speak of.`,
        todo: 'Move one of its nodes at least 10 mm away.',
      });
  });
  if (recipe.normal && Math.hypot(...recipe.normal) < 1e-6)
    problems.push({
      path: `${path}.normal`,
      what: 'The normal has no direction.',
      todo: 'Give a vector that is not zero, or null.',
    });
  else if (recipe.normal) problems.push(...alongTheNormal(recipe, recipe.normal, nodes, path));
  return problems;
}

/** A diagonal within this of its plane's normal has no plane to lie in: the sine of half a degree. */
const ALONG = 0.0087;

/** A bar of angle along the normal has no "in plane" of its own. One among others may stand so; where all do, there is no plane. */
function alongTheNormal(
  recipe: FreeRecipe,
  [x, y, z]: Vec3,
  nodes: ReadonlyMap<string, FreeNode>,
  path: string,
): ProjectProblem[] {
  const angles = recipe.bars.filter(({ role }) => role === 'diagonal' || role === 'knee' || role === 'tie');
  const isAlong = ({ from, to }: FreeBar): boolean => {
    const [a, b] = [nodes.get(from)?.at, nodes.get(to)?.at];
    if (!a || !b) return false;
    const [u, v, w] = [b[0] - a[0], b[1] - a[1], b[2] - a[2]];
    const across = Math.hypot(v * z - w * y, w * x - u * z, u * y - v * x);
    return across <= ALONG * Math.hypot(u, v, w) * Math.hypot(x, y, z);
  };
  const [first] = angles;
  return first !== undefined && angles.every(isAlong)
    ? [
        {
          path: `${path}.normal`,
          what: `The normal lies along bar ${first.id}, so that no plane holds the bar.`,
          todo: 'Give the direction square to the plane of the bars, or null to have it found.',
        },
      ]
    : [];
}

type Named = { readonly id: string };

const sameIds = (things: readonly Named[], path: string): ProjectProblem[] =>
  sameIdsAt(things.map((thing, index) => ({ id: thing.id, at: `${path}[${index}].id` })));

function sameIdsAt(things: readonly (Named & { readonly at: string })[]): ProjectProblem[] {
  return repeated(things.map((thing) => thing.id)).map(({ index, value }) => ({
    path: things[index]?.at ?? '',
    what: `"${value}" is used twice.`,
    todo: 'Give each its own name.',
  }));
}

function lineProblems(
  lines: readonly (Named & { at: number })[],
  most: number,
  path: string,
): ProjectProblem[] {
  return [...sameIds(lines, `${path}.lines`), ...tooFar(lines, most, path)];
}

/** Sums of heights, and sizes that were typed in inches, come out a shade off, mm. */
const ROUNDING = 0.1;

function tooFar(lines: readonly (Named & { at: number })[], most: number, path: string): ProjectProblem[] {
  return lines.flatMap((line, index) =>
    line.at > most + ROUNDING
      ? [
          {
            path: `${path}.lines[${index}].at`,
            what: `${line.id} is at ${line.at} mm, beyond the end of the bay at ${most} mm.`,
            todo: `Give at most ${most}.`,
          },
        ]
      : [],
  );
}

function repeated(values: readonly string[]): { index: number; value: string }[] {
  const seen = new Set<string>();
  return values.flatMap((value, index) => {
    if (seen.has(value)) return [{ index, value }];
    seen.add(value);
    return [];
  });
}
