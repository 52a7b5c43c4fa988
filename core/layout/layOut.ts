import type { Stock } from '../catalogue/model.ts';
import { cross, distance, dot, scale, subtract, type Vec3 } from '../geometry/vector.ts';
import type { Bay, Project } from '../project/model.ts';
import { type AngleDraft, angleDraft, legInPlaneOf } from './angleBar.ts';
import type { CrossingBar } from './between.ts';
import { crossingOf, withSharedPoints } from './crossings.ts';
import { cutLengthOf, handOf } from './cutLength.ts';
import { gussetsOf } from './gussets.ts';
import { meetingsIn } from './meetings.ts';
import { NodeRegister } from './mergedNodes.ts';
import type {
  AngleBar,
  Bar,
  BarId,
  BayLayout,
  Crossing,
  CrossingId,
  Layout,
  LineInfo,
  Plane,
} from './model.ts';
import { placedSketch } from './placed.ts';
import type { BaySketch, SketchBar } from './sketch.ts';
import { withFeetOnBays } from './standing.ts';

/** Sets a project out: every bay placed, nodes merged, bars with their sections, crossings found with their marks. */
export function layOut(project: Project, stock: Stock): Layout {
  const register = new NodeRegister();
  const bars = new Map<BarId, Bar>();
  const crossings = new Map<CrossingId, Crossing>();
  const nextMark = numbering();
  const bays = project.bays.map((bay): BayLayout => {
    const set = setOut(bay, stock, register, nextMark);
    for (const bar of set.bars) bars.set(bar.id, bar);
    for (const crossing of set.crossings) crossings.set(crossing.id, crossing);
    return set.layout;
  });
  return { bays, nodes: withFeetOnBays(register.all(), bays), bars, crossings };
}

/** D1, D2, … by place. A bar with a mark of its own keeps its place in the count, so that naming it renames no other. */
function numbering(): () => string {
  let number = 0;
  return () => {
    number += 1;
    return `D${number}`;
  };
}

interface Drafted {
  readonly sketch: SketchBar;
  readonly plane: Plane;
  readonly from: Vec3;
  readonly to: Vec3;
  readonly i: string;
  readonly j: string;
  readonly length: number;
  readonly direction: Vec3;
  readonly angle: AngleDraft | null;
}

interface BaySet {
  readonly layout: BayLayout;
  readonly bars: readonly Bar[];
  readonly crossings: readonly Crossing[];
}

function setOut(bay: Bay, stock: Stock, register: NodeRegister, nextMark: () => string): BaySet {
  const sketch = placedSketch(bay);
  const planes = new Map(sketch.planes.map((plane) => [plane.id, plane]));
  const nodes = placedNodes(bay, sketch, register);
  const drafts = draftsOf(bay, sketch, planes, stock, nodes);
  const crossings = crossingsOf(bay, sketch.planes, drafts);
  const touching = crossingsByKey(crossings);

  const bars = [...drafts.values()].map((draft): Bar => {
    const { sketch: drawn } = draft;
    const byPlace = draft.angle ? nextMark() : drawn.key;
    return {
      id: `${bay.id}/${drawn.key}`,
      bay: bay.id,
      key: drawn.key,
      role: drawn.role,
      mark: draft.angle?.mark.mark ?? byPlace,
      plane: draft.plane.id,
      i: draft.i,
      j: draft.j,
      from: draft.from,
      to: draft.to,
      length: draft.length,
      direction: draft.direction,
      angle: draft.angle
        ? angleBarOf(draft, draft.angle, touching.get(drawn.key) ?? [], drafts, bay.id)
        : null,
      member: drawn.member,
      offset: drawn.offset,
      line: drawn.line ? lineInfo(drawn.line, draft, drafts) : null,
    };
  });

  return {
    layout: {
      id: bay.id,
      name: bay.name,
      kind: bay.recipe.kind,
      numberOff: bay.numberOff,
      planes: sketch.planes,
      bars: bars.map((bar) => bar.id),
      diagonals: bars.filter((bar) => bar.angle).map((bar) => bar.id),
      crossings: crossings.map((crossing) => crossing.id),
      nodes: [...new Set([...drafts.values()].flatMap((draft) => [draft.i, draft.j]))],
      nodeOf: new Map([...nodes].map(([key, { id }]) => [key, id])),
      gussets: bars.flatMap((bar) => gussetsOf(bar, planeOf(planes, bar.plane))),
      dimensions: sketch.dimensions,
    },
    bars,
    crossings,
  };
}

function planeOf(planes: ReadonlyMap<string, Plane>, id: string): Plane {
  const plane = planes.get(id);
  if (!plane) throw new Error(`no plane ${id}`);
  return plane;
}

interface PlacedNode {
  readonly at: Vec3;
  readonly id: string;
}

function placedNodes(bay: Bay, sketch: BaySketch, register: NodeRegister): ReadonlyMap<string, PlacedNode> {
  return new Map(sketch.nodes.map((node) => [node.key, { at: node.at, id: register.add(bay.id, node) }]));
}

function draftsOf(
  bay: Bay,
  sketch: BaySketch,
  planes: ReadonlyMap<string, Plane>,
  stock: Stock,
  nodes: ReadonlyMap<string, PlacedNode>,
): ReadonlyMap<string, Drafted> {
  const node = (key: string) => {
    const found = nodes.get(key);
    if (!found) throw new Error(`no node ${key} in ${bay.id}`);
    return found;
  };
  return new Map(
    sketch.bars.map((bar) => {
      const [i, j] = [node(bar.i), node(bar.j)];
      const plane = planeOf(planes, bar.plane);
      const length = distance(i.at, j.at);
      const direction = scale(subtract(j.at, i.at), 1 / length);
      const angled = bar.role === 'diagonal' || bar.role === 'knee' || bar.role === 'tie';
      const draft: Drafted = {
        sketch: bar,
        plane,
        from: i.at,
        to: j.at,
        i: i.id,
        j: j.id,
        length,
        direction,
        angle: angled ? angleDraft(bay, bar, direction, plane, stock) : null,
      };
      return [bar.key, draft];
    }),
  );
}

function crossingsOf(
  bay: Bay,
  planes: readonly Plane[],
  drafts: ReadonlyMap<string, Drafted>,
): readonly Crossing[] {
  const bars: ReadonlyMap<string, CrossingBar> = drafts;
  const found = planes.flatMap((plane) => {
    const segments = [...drafts.values()]
      .filter((draft) => draft.plane === plane)
      .map((draft) => ({
        id: draft.sketch.key,
        from: draft.from,
        to: draft.to,
        i: draft.i,
        j: draft.j,
        isDiagonal: draft.angle !== null,
        isLine: draft.sketch.line !== null,
      }));
    return meetingsIn(plane, segments).flatMap((meeting) => crossingOf(bay, plane, meeting, bars) ?? []);
  });
  return withSharedPoints(found);
}

function crossingsByKey(crossings: readonly Crossing[]): ReadonlyMap<string, readonly Crossing[]> {
  const byKey = new Map<string, Crossing[]>();
  for (const crossing of crossings)
    for (const id of [crossing.a, crossing.b]) {
      const key = id.slice(crossing.bay.length + 1);
      const list = byKey.get(key);
      if (list) list.push(crossing);
      else byKey.set(key, [crossing]);
    }
  return byKey;
}

function angleBarOf(
  draft: Drafted,
  angle: AngleDraft,
  crossings: readonly Crossing[],
  drafts: ReadonlyMap<string, Drafted>,
  bay: string,
): AngleBar {
  const { key } = draft.sketch;
  const id = `${bay}/${key}`;
  const onThis = (crossing: Crossing): number => (crossing.a === id ? crossing.onA : crossing.onB);
  const isCut = (crossing: Crossing): boolean =>
    crossing.join?.kind === 'cut' && crossing.join.cutBar === key;
  const cut = cutLengthOf({
    length: draft.length,
    ends: angle.ends,
    reach: reachOf(angle),
    cuts: crossings.filter(isCut).map((crossing) => {
      const other = drafts.get((crossing.a === id ? crossing.b : crossing.a).slice(bay.length + 1))?.angle;
      return {
        at: onThis(crossing),
        throughReach: other ? reachOf(other) : 0,
        angle: crossing.angle,
      };
    }),
    holes: crossings
      .filter((crossing) => takesAHole(crossing) && !isCut(crossing))
      .map((crossing) => ({ crossing: crossing.id, at: onThis(crossing) }))
      .sort((p, q) => p.at - q.at),
  });
  const { placement, spec } = angle;
  const [leg, standing] =
    spec.legInPlane === 'longer' ? [placement.y, placement.x] : [placement.x, placement.y];
  return {
    ...angle,
    cut,
    mass: angle.stock ? (angle.stock.massPerMetre * cut.total) / 1000 : null,
    hand: handOf(cut, angle.ends, dot(cross(draft.direction, leg), standing)),
  };
}

/** Farthest that the leg in the plane lies to one side of the line of bolts: to the heel, or to the toe. */
function reachOf({ stock, spec, placement }: AngleDraft): number {
  if (!stock) return 0;
  return Math.max(placement.gauge, legInPlaneOf(stock, spec.legInPlane) - placement.gauge);
}

function takesAHole(crossing: Crossing): boolean {
  const kind = crossing.join?.kind;
  return kind === 'bolted' || kind === 'packed' || kind === 'cut' || kind === 'purlin';
}

/** How far a purlin may pass from a panel point and still run through it, mm (common practice, no source). */
const THROUGH_POINT = 50;

function lineInfo(
  line: NonNullable<SketchBar['line']>,
  draft: Drafted,
  drafts: ReadonlyMap<string, Drafted>,
): LineInfo {
  const mine = [draft.from, draft.to];
  for (const other of drafts.values()) {
    if (!other.angle || other.plane !== draft.plane) continue;
    for (const [id, at] of [
      [other.i, other.from],
      [other.j, other.to],
    ] as const)
      if (mine.some((end) => distance(end, at) <= THROUGH_POINT)) return { ...line, ownPanelPoint: id };
  }
  return { ...line, ownPanelPoint: null };
}
