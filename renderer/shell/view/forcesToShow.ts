import type { Vec3 } from '../../../core/geometry/vector.ts';
import type { BayLayout, Layout } from '../../../core/layout/model.ts';
import type { LoadCase } from '../../../core/project/actions.ts';
import type { ForcesShown, Placing } from '../../scene/forces/forcesShown.ts';
import { presentProject, shownAssessment } from '../../store/shown.ts';
import { shownForceState, shownForces } from '../../store/shownForces.ts';
import type { WindowState } from '../../store/windowState.ts';

/** Forces as they are to be drawn; null while they are not wanted. Without combinations there are only nodes to put arrows on. */
export function forcesToShow(state: WindowState): ForcesShown | null {
  const assessment = shownAssessment(state);
  if (!state.view.forces || assessment === null) return null;
  const forces = shownForces(state);
  const one = shownForceState(state);
  const bay = assessment.layout.bays.find(({ id }) => id === state.selection.bay);
  return {
    states: one ? [one] : (forces?.states ?? []),
    given: one && forces ? givenIn(one.factors, forces.caseLoads) : new Map(),
    placing: bay && state.trying === null ? placingIn(state, bay, assessment.layout) : null,
  };
}

/** The case that arrows go into; null where there is none. */
export function caseForArrows(state: WindowState): LoadCase | null {
  const cases = presentProject(state).actions?.cases ?? [];
  return (
    cases.find(({ id }) => id === state.view.loadCase) ??
    cases.find(({ kind }) => kind === 'wind') ??
    cases[0] ??
    null
  );
}

/** Loads as the combination has them, N: what is drawn is what core found for each case, times its factor. */
function givenIn(
  factors: Readonly<Record<string, number>>,
  caseLoads: ReadonlyMap<string, ReadonlyMap<string, Vec3>>,
): ReadonlyMap<string, Vec3> {
  const given = new Map<string, Vec3>();
  for (const [id, factor] of Object.entries(factors))
    for (const [node, [x, y, z]] of caseLoads.get(id) ?? []) {
      const [a, b, c] = given.get(node) ?? [0, 0, 0];
      given.set(node, [a + factor * x, b + factor * y, c + factor * z]);
    }
  return given;
}

function placingIn(state: WindowState, bay: BayLayout, layout: Layout): Placing | null {
  const loadCase = caseForArrows(state);
  if (loadCase === null) return null;
  const framed = new Set(
    bay.bars.flatMap((id) => {
      const bar = layout.bars.get(id);
      return bar && !bar.line ? [bar.i, bar.j] : [];
    }),
  );
  return {
    loadCase: loadCase.id,
    nodes: [...bay.nodeOf].flatMap(([key, id]) => {
      const node = layout.nodes.get(id);
      const place = `${bay.id}/${key}`;
      return node && framed.has(id) && node.supports[bay.id]?.kind !== 'foundation'
        ? [{ id, place, label: node.label, force: forceOn(loadCase, place) }]
        : [];
    }),
  };
}

function forceOn({ loads }: LoadCase, place: string): Vec3 {
  const load = loads.find((each) => each.kind === 'node' && each.node === place);
  return load?.kind === 'node' ? load.force : [0, 0, 0];
}
