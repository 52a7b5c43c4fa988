/** What the loads of a case come to on nodes and bars. */

import { memberSection } from '../frame/memberSection.ts';
import { add, scale, type Vec3 } from '../geometry/vector.ts';
import type { Bar, BarId, BayLayout, Layout } from '../layout/model.ts';
import type { Load, LoadCase } from '../project/actions.ts';
import { bowForces } from './bowForces.ts';
import { gableForces } from './gableForces.ts';
import type { ActionProblem } from './model.ts';
import { sideForces } from './sideForces.ts';
import { structuralMember } from './structuralMember.ts';

/** N for each kN. */
const KILO = 1000;
/** N for each kg. */
const GRAVITY = 9.806_65;
/** kg/mm³. */
const STEEL = 7.85e-6;

export interface CaseLoads {
  /** N, by node id. */
  readonly nodes: ReadonlyMap<string, Vec3>;
  /** mm that a bar is made too short, by bar id. */
  readonly shortened: ReadonlyMap<BarId, number>;
  readonly problems: readonly ActionProblem[];
}

/** @param path of the case in the project file */
export function caseLoads(loadCase: LoadCase, layout: Layout, path: string): CaseLoads {
  const nodes = new Map<string, Vec3>();
  const shortened = new Map<BarId, number>();
  const problems: ActionProblem[] = [];
  const put = (node: string, force: Vec3): void => {
    const known = nodes.get(node);
    nodes.set(node, known ? add(known, force) : force);
  };
  if (loadCase.selfWeight) for (const bar of layout.bars.values()) putAlong(put, bar, [0, 0, -weightOf(bar)]);
  loadCase.loads.forEach((load, index) => {
    const what = place(load, layout, put, shortened);
    if (what !== null)
      problems.push({
        path: `${path}.loads[${index}]`,
        what: `${loadCase.name || loadCase.id}: ${what}`,
        todo: 'Place it anew, or take it away.',
      });
  });
  return { nodes, shortened, problems };
}

/** Puts a load where it acts; returns what is wrong with it, or null. */
function place(
  load: Load,
  layout: Layout,
  put: (node: string, force: Vec3) => void,
  shortened: Map<BarId, number>,
): string | null {
  switch (load.kind) {
    case 'node': {
      const node = nodeCalled(load.node, layout);
      if (node === null) return `a force is on ${load.node}, and no node there belongs to the framing.`;
      put(node, scale(load.force, KILO));
      return null;
    }
    case 'line': {
      const bar = layout.bars.get(load.bar);
      if (!bar || bar.line) return `a load runs along ${load.bar}, which is no bar of the framing.`;
      putAlong(put, bar, scale(load.perMetre, bar.length));
      return null;
    }
    case 'shortened': {
      const bar = layout.bars.get(load.bar);
      if (!bar?.angle) return `${load.bar} is made short, and is no diagonal.`;
      shortened.set(load.bar, (shortened.get(load.bar) ?? 0) + load.by);
      return null;
    }
    case 'gable': {
      const bay = bayCalled(load.bay, layout);
      if (bay?.kind !== 'roof') return `a gable leans on ${load.bay}, which is no roof bay.`;
      for (const [node, force] of gableForces(load, bay, layout)) put(node, force);
      return null;
    }
    case 'side': {
      const bay = bayCalled(load.bay, layout);
      if (bay?.kind !== 'wall') return `a wall leans on ${load.bay}, which is no wall bay.`;
      for (const [node, force] of sideForces(load, bay, layout)) put(node, force);
      return null;
    }
    case 'bowed': {
      const bay = bayCalled(load.bay, layout);
      if (bay?.kind !== 'roof') return `bowed rafters lean on ${load.bay}, which is no roof bay.`;
      for (const [node, force] of bowForces(load, bay, layout)) put(node, force);
      return null;
    }
    default:
      return load satisfies never;
  }
}

/** By statics: half at each end. */
function putAlong(put: (node: string, force: Vec3) => void, bar: Bar, whole: Vec3): void {
  if (bar.line) return;
  put(bar.i, scale(whole, 0.5));
  put(bar.j, scale(whole, 0.5));
}

function weightOf(bar: Bar): number {
  if (bar.angle) return (bar.angle.mass ?? 0) * GRAVITY;
  return memberSection(structuralMember(bar)).area * bar.length * STEEL * GRAVITY;
}

const bayCalled = (id: string, layout: Layout): BayLayout | undefined =>
  layout.bays.find((bay) => bay.id === id);

/** The node that a bay's node goes by: its own, or the one of another bay that it has merged with. */
function nodeCalled(id: string, layout: Layout): string | null {
  const slash = id.indexOf('/');
  const bay = bayCalled(id.slice(0, slash), layout);
  const merged = bay?.nodeOf.get(id.slice(slash + 1)) ?? null;
  if (merged === null || !bay) return null;
  const framed = bay.bars.some((each) => {
    const bar = layout.bars.get(each);
    return bar !== undefined && !bar.line && (bar.i === merged || bar.j === merged);
  });
  return framed ? merged : null;
}
