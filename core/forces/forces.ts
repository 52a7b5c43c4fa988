/** Every combination on every bay: who carries what, what goes slack, how far it moves. */
import { add, dot, scale, type Vec3 } from '../geometry/vector.ts';
import type { BarId, BayLayout, Layout } from '../layout/model.ts';
import type { Practice } from '../practice/model.ts';
import type { Actions, Carry } from '../project/actions.ts';
import { type CaseLoads, caseLoads } from './caseLoads.ts';
import { combinationStates } from './combinationStates.ts';
import { driftsOf, type LevelDrift } from './drifts.ts';
import { framingParts } from './framingPart.ts';
import { LEANING, leaningForces } from './leaning.ts';
import type { ActionProblem, CombinationState, ForceState, Forces, NoWay } from './model.ts';
import {
  type PartAnswer,
  type PartLoads,
  type PartStiffness,
  partEquilibrium,
  partStiffness,
} from './partEquilibrium.ts';
import { takeUpOf } from './takeUp.ts';

/**
 * Equilibrium of all parts under all combinations, each with every way of turning round the cases that act either way.
 * N, mm; tension positive.
 */
export function forcesOf(actions: Actions, layout: Layout, practice: Practice): Forces {
  const cases = new Map(
    actions.cases.map(
      (each, index) => [each.id, caseLoads(each, layout, `actions.cases[${index}]`)] as const,
    ),
  );
  const problems = [...[...cases.values()].flatMap((each) => each.problems), ...factorProblems(actions)];
  const parts = framingParts(layout, practice.steel.E).map(partStiffness);
  const { order, carries } = inOrder(parts, actions.carries, layout, problems);
  const takeUp = takeUps(layout, practice);
  const starts = new Map<PartStiffness, Float64Array>();
  const states = combinationStates(actions).map((state): ForceState => {
    const loads = combined(state, cases);
    const found = solved({ state, loads, order, carries, layout, practice, starts });
    const slackened =
      state.use === 'service'
        ? solved({
            state,
            loads: { ...loads, shortened: lessTakeUp(loads.shortened, takeUp) },
            order,
            carries,
            layout,
            practice,
            starts,
          })
        : null;
    const bothWays =
      state.use === 'strength' && found.answers.some(({ slack }) => slack.length > 0)
        ? solved({ state, loads, order, carries, layout, practice, starts: new Map() }, 'all both ways')
        : null;
    return stateOf(state, found, slackened, bothWays, layout);
  });
  return {
    states,
    problems,
    caseLoads: new Map([...cases].map(([id, { nodes }]) => [id, nodes])),
  };
}

/** A factor for a case that is not there would leave the load out without a word. */
function factorProblems({ cases, combinations }: Actions): readonly ActionProblem[] {
  const known = new Set(cases.map(({ id }) => id));
  return combinations.flatMap(({ id, factors }, index) =>
    Object.keys(factors)
      .filter((named) => !known.has(named))
      .map((named) => ({
        path: `actions.combinations[${index}].factors.${named}`,
        what: `Combination ${id} has a factor for ${named}, and no case is called so.`,
        todo: `Name one of ${cases.map((each) => each.id).join(', ') || 'the cases, once there are any'}.`,
      })),
  );
}

/** Parts in the order in which they hand their forces on. */
function inOrder(
  parts: readonly PartStiffness[],
  carries: readonly Carry[],
  layout: Layout,
  problems: ActionProblem[],
): { readonly order: readonly PartStiffness[]; readonly carries: readonly Carry[] } {
  const partOf = new Map(parts.flatMap((each) => each.part.bays.map((bay) => [bay.id, each] as const)));
  const kept = carries.filter((carry, index) => {
    const say = (what: string): false => {
      problems.push({
        path: `actions.carries[${index}]`,
        what,
        todo: 'Choose a wall bay that carries it, or none.',
      });
      return false;
    };
    const kinds = [carry.from, carry.to].map((id) => layout.bays.find((bay) => bay.id === id)?.kind);
    if (kinds[0] !== 'roof' || kinds[1] !== 'wall')
      return say(
        `${carry.from} is to hand its forces to ${carry.to}, which is no wall bay under a roof bay.`,
      );
    if (partOf.get(carry.from) === partOf.get(carry.to))
      return say(`${carry.from} and ${carry.to} share nodes: the forces find their own way.`);
    return true;
  });
  const order: PartStiffness[] = [];
  const waiting = new Set(parts);
  while (waiting.size > 0) {
    const next =
      [...waiting].find(
        (each) =>
          !kept.some(
            ({ from, to }) =>
              partOf.get(to) === each && waiting.has(partOf.get(from) ?? each) && partOf.get(from) !== each,
          ),
      ) ?? [...waiting][0];
    if (!next) break;
    waiting.delete(next);
    order.push(next);
  }
  return { order, carries: kept };
}

function combined(state: CombinationState, cases: ReadonlyMap<string, CaseLoads>): PartLoads {
  const nodes = new Map<string, Vec3>();
  const shortened = new Map<BarId, number>();
  for (const [id, factor] of Object.entries(state.factors)) {
    const own = cases.get(id);
    if (!own) continue;
    for (const [node, force] of own.nodes)
      nodes.set(node, add(nodes.get(node) ?? [0, 0, 0], scale(force, factor)));
    // A bar is as short as it was made, whichever way the wind blows.
    for (const [bar, by] of own.shortened)
      shortened.set(bar, (shortened.get(bar) ?? 0) + by * Math.abs(factor));
  }
  return { nodes, shortened };
}

function takeUps(layout: Layout, practice: Practice): ReadonlyMap<BarId, number> {
  const found = new Map<BarId, number>();
  for (const bar of layout.bars.values()) {
    if (!bar.angle?.stock) continue;
    const { holes, sag } = takeUpOf(bar, bar.angle, practice.id, practice.steel.E);
    found.set(bar.id, holes + sag);
  }
  return found;
}

function lessTakeUp(
  shortened: ReadonlyMap<BarId, number>,
  takeUp: ReadonlyMap<BarId, number>,
): ReadonlyMap<BarId, number> {
  const less = new Map(shortened);
  for (const [bar, by] of takeUp) less.set(bar, (less.get(bar) ?? 0) - by);
  return less;
}

interface Solving {
  readonly state: CombinationState;
  readonly loads: PartLoads;
  readonly order: readonly PartStiffness[];
  readonly carries: readonly Carry[];
  readonly layout: Layout;
  readonly practice: Practice;
  readonly starts: Map<PartStiffness, Float64Array>;
}

interface Solved {
  readonly answers: readonly PartAnswer[];
  readonly noWay: readonly NoWay[];
}

function solved(
  { state, loads, order, carries, layout, practice, starts }: Solving,
  bars: 'as counted on' | 'all both ways' = 'as counted on',
): Solved {
  const answers: PartAnswer[] = [];
  const noWay: NoWay[] = [];
  const nodes = new Map(loads.nodes);
  const put = (node: string, force: Vec3): void => {
    nodes.set(node, add(nodes.get(node) ?? [0, 0, 0], force));
  };
  if (state.leaning !== 0)
    for (const [node, force] of leaningForces(
      loads.nodes,
      layout.bays,
      layout,
      LEANING[practice.id].share,
      state.leaning,
    ))
      put(node, force);
  for (const stiffness of order) {
    const found = partEquilibrium(
      stiffness,
      { nodes, shortened: loads.shortened },
      starts.get(stiffness) ?? null,
      bars,
    );
    if (!('kind' in found)) {
      noWay.push(found);
      continue;
    }
    starts.set(stiffness, found.state);
    answers.push(found);
    for (const carry of carries) {
      const from = stiffness.part.bays.find(({ id }) => id === carry.from);
      const to = layout.bays.find(({ id }) => id === carry.to);
      if (from && to) handOn(from, to, carry.eaves, found, put);
    }
  }
  return { answers, noWay };
}

/** The roof's push on its eaves, along the wall below, half on either side of the wall's top. */
function handOn(
  from: BayLayout,
  to: BayLayout,
  eaves: Carry['eaves'],
  found: PartAnswer,
  put: (node: string, force: Vec3) => void,
): void {
  const slope = from.planes[eaves - 1]?.id;
  const right = to.planes[0]?.right;
  if (slope === undefined || !right) return;
  let along = 0;
  for (const key of [`${slope}.L0`, `${slope}.R0`, `${slope}.M0`]) {
    const reaction = found.reactions.get(from.nodeOf.get(key) ?? '');
    if (reaction) along -= dot(reaction, right);
  }
  let top = 0;
  while (to.nodeOf.has(`L${top + 1}`)) top += 1;
  for (const key of [`L${top}`, `R${top}`]) {
    const node = to.nodeOf.get(key);
    if (node !== undefined) put(node, scale(right, along / 2));
  }
}

function stateOf(
  state: CombinationState,
  { answers, noWay }: Solved,
  slackened: Solved | null,
  bothWays: Solved | null,
  layout: Layout,
): ForceState {
  const merged = <T>(of: (answer: PartAnswer) => ReadonlyMap<string, T>): ReadonlyMap<string, T> =>
    new Map(answers.flatMap((answer) => [...of(answer)]));
  const slack = new Set(answers.flatMap((answer) => answer.slack));
  const displacements = merged((answer) => answer.displacements);
  const after = slackened && new Map(slackened.answers.flatMap((answer) => [...answer.displacements]));
  return {
    ...state,
    forces: merged((answer) => answer.forces),
    moments: merged((answer) => answer.moments),
    elongations: merged((answer) => answer.elongations),
    slack,
    attracted: attractedBy(slack, bothWays),
    displacements,
    reactions: merged((answer) => answer.reactions),
    drifts: layout.bays.flatMap((bay) => {
      const elastic = driftsOf(bay, layout, displacements);
      const taken: readonly LevelDrift[] = after ? driftsOf(bay, layout, after) : [];
      return elastic.map(({ drift, ...level }) => ({
        ...level,
        elastic: drift,
        withTakeUp: taken.find((each) => each.level === level.level)?.drift ?? null,
      }));
    }),
    noWay,
    residual: answers.reduce((most, { residual }) => Math.max(most, residual), 0),
  };
}

function attractedBy(slack: ReadonlySet<BarId>, bothWays: Solved | null): ReadonlyMap<BarId, number> {
  const found = new Map<BarId, number>();
  for (const answer of bothWays?.answers ?? [])
    for (const bar of slack) {
      const squeezed = -(answer.forces.get(bar) ?? 0);
      if (squeezed > 0) found.set(bar, squeezed);
    }
  return found;
}
