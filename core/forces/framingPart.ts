/**
 * Bays that share nodes, as one framework: bars pull and push along themselves; members that run through bend in the plane of their bay; supports are fixed; and
 * whatever no bay at a node resists, square to its plane as a rule, the rest of the building holds.
 */

import { memberSection } from '../frame/memberSection.ts';
import { cross, dot, length, scale, subtract, unit, type Vec3 } from '../geometry/vector.ts';
import type { Bar, BarId, BayLayout, Layout, NodeSupport, Plane } from '../layout/model.ts';
import { rafterPoints } from './gableForces.ts';
import type { AxialBar } from './model.ts';
import { structuralMember } from './structuralMember.ts';

export interface FramingPart {
  readonly bays: readonly BayLayout[];
  /** Node ids; unknown 3k + c is displacement c of node k. */
  readonly nodes: readonly string[];
  readonly indexOf: ReadonlyMap<string, number>;
  /** Node of each turning unknown. Turns are counted in mm at `TURN_ARM`. */
  readonly turns: readonly number[];
  readonly fixed: ReadonlySet<number>;
  /** Nodes that stand on something outside: fixed, or held as the eaves of a roof are. */
  readonly standing: ReadonlySet<number>;
  /** Diagonals, and members between the nodes on them. */
  readonly pieces: readonly Piece[];
  readonly holds: readonly Hold[];
  /** Both eaves of a frame, which keeps them from spreading. */
  readonly ties: readonly Tie[];
  /** By node, the level directions along which its bays are braced: what acts square to them is for the frames. */
  readonly braced: readonly (readonly Vec3[])[];
}

/** A straight run of a bar between two nodes. */
export interface Piece {
  readonly bar: BarId;
  readonly axial: AxialBar;
  readonly isDiagonal: boolean;
  /** Bending in the plane of the bay; null for bars that only pull and push. */
  readonly bending: Bending | null;
}

export interface Bending {
  /** N·mm². */
  readonly EI: number;
  /** Unit vector in the plane, square to the piece. */
  readonly across: Vec3;
  /** Turning unknowns at the ends, counted from 0; null where it is hinged. */
  readonly turnI: number | null;
  readonly turnJ: number | null;
}

export interface Hold {
  readonly node: number;
  readonly direction: Vec3;
  /** At the eaves of a roof that is held on two lines: the frames take there what is loaded in their own plane, and do not keep the roof from turning in plan. */
  readonly ofFrames: boolean;
}

export interface Tie {
  readonly i: number;
  readonly j: number;
  readonly direction: Vec3;
}

/** A node at the eaves of a roof that walls or supports hold along two lines. */
interface Eaves {
  readonly node: number;
  /** On a support of the roof's own, and not on a wall. */
  readonly onSupport: boolean;
  /** Unit vector along the building. */
  readonly along: Vec3;
}

/** A turn of 1 in these units moves a point this far away, mm, by 1 mm: keeps turns and displacements alike in size. */
export const TURN_ARM = 1000;
/** Stiffness with which the rest of the building holds a node, N/mm: gives a thousandth of a millimetre under 10 kN. */
export const HELD_BY_THE_BUILDING = 1e7;
/** What is left of it against a roof that turns in plan, N/mm: enough to tell where it stands, too little to share in what walls carry. */
export const YIELDING = 10;

/** Walls at least so far apart are two lines, mm. */
const TWO_LINES = 100;

/** A wall lies along a roof's eaves within 45°, and is a wall if its plane leans no more than 60° from upright. */
const ALONG = Math.SQRT1_2;
const UPRIGHT = Math.sin(Math.PI / 3);

/** Within this angle two members run through, rad. */
const IN_LINE = Math.sin(Math.PI / 180);

/** Groups of bays that share a node of the framing. */
export function framingParts(layout: Layout, E: number): readonly FramingPart[] {
  const groups = connected(layout);
  return groups.map((bays) => new PartBuilder(layout, bays, E).part());
}

function connected(layout: Layout): readonly (readonly BayLayout[])[] {
  const leader = new Map<string, string>();
  const root = (id: string): string => {
    let at = id;
    for (let next = leader.get(at); next !== undefined && next !== at; next = leader.get(at)) at = next;
    return at;
  };
  const firstAt = new Map<string, string>();
  for (const bay of layout.bays) {
    leader.set(bay.id, bay.id);
    for (const id of bay.bars) {
      const bar = layout.bars.get(id);
      if (!bar || bar.line) continue;
      for (const node of [bar.i, bar.j]) {
        const first = firstAt.get(node);
        if (first === undefined) firstAt.set(node, bay.id);
        else if (first !== bay.id) {
          const [a, b] = [root(first), root(bay.id)];
          if (a !== b) leader.set(b, a);
        }
      }
    }
  }
  const groups = new Map<string, BayLayout[]>();
  for (const bay of layout.bays) {
    const group = groups.get(root(bay.id));
    if (group) group.push(bay);
    else groups.set(root(bay.id), [bay]);
  }
  return [...groups.values()];
}

interface Draft {
  readonly bar: Bar;
  readonly plane: Plane;
  readonly from: number;
  readonly to: number;
}

/** Members that meet in line at a node and turn together there. */
interface Joint {
  readonly plane: string;
  readonly direction: Vec3;
  ends: number;
  turn: number | null;
}

class PartBuilder {
  readonly #layout: Layout;
  readonly #bays: readonly BayLayout[];
  readonly #E: number;
  readonly #nodes: string[] = [];
  readonly #indexOf = new Map<string, number>();
  readonly #turns: number[] = [];

  constructor(layout: Layout, bays: readonly BayLayout[], E: number) {
    this.#layout = layout;
    this.#bays = bays;
    this.#E = E;
  }

  part(): FramingPart {
    const drafts = this.#bays.flatMap((bay) => this.#draftsOf(bay));
    const joints = this.#jointsOf(drafts);
    const pieces = drafts.map((draft) => this.#pieceOf(draft, joints));
    const supports = this.#supports();
    const eaves = this.#eavesByStatics(supports);
    const holds = this.#holds(drafts, eaves);
    return {
      bays: this.#bays,
      nodes: this.#nodes,
      indexOf: this.#indexOf,
      turns: this.#turns,
      fixed: new Set(
        [...supports]
          .filter((node) => !eaves.has(node))
          .flatMap((node) => [3 * node, 3 * node + 1, 3 * node + 2]),
      ),
      standing: supports,
      pieces,
      holds,
      ties: this.#ties(holds),
      braced: this.#braced(drafts),
    };
  }

  #node(id: string): number {
    const known = this.#indexOf.get(id);
    if (known !== undefined) return known;
    this.#nodes.push(id);
    this.#indexOf.set(id, this.#nodes.length - 1);
    return this.#nodes.length - 1;
  }

  #at(node: number): Vec3 {
    return this.#layout.nodes.get(this.#nodes[node] ?? '')?.at ?? [0, 0, 0];
  }

  #draftsOf(bay: BayLayout): readonly Draft[] {
    const planes = new Map(bay.planes.map((plane) => [plane.id, plane]));
    const bars = bay.bars.flatMap((id) => {
      const bar = this.#layout.bars.get(id);
      const plane = bar && planes.get(bar.plane);
      // Purlins and rails lie on top; a bar of an unknown section is not there.
      return bar && plane && !bar.line && (!bar.angle || bar.angle.stock) ? [{ bar, plane }] : [];
    });
    for (const { bar } of bars) {
      this.#node(bar.i);
      this.#node(bar.j);
    }
    return bars.flatMap(({ bar, plane }) => {
      const stops = bay.kind === 'free' && !bar.angle ? this.#nodesOn(bar, bay) : [];
      const run = [this.#node(bar.i), ...stops, this.#node(bar.j)];
      return run.slice(1).map((to, k) => ({ bar, plane, from: run[k] ?? to, to }));
    });
  }

  /** In a bay drawn freely other bars may end on a member between its ends. */
  #nodesOn(bar: Bar, bay: BayLayout): readonly number[] {
    return [...new Set(bay.nodes)]
      .flatMap((id) => {
        const node = this.#indexOf.get(id);
        const at = this.#layout.nodes.get(id)?.at;
        if (node === undefined || !at || id === bar.i || id === bar.j) return [];
        const s = dot(subtract(at, bar.from), bar.direction);
        const off = length(subtract(subtract(at, bar.from), scale(bar.direction, s)));
        return s > 1 && s < bar.length - 1 && off <= 1 ? [{ node, s }] : [];
      })
      .sort((a, b) => a.s - b.s)
      .map(({ node }) => node);
  }

  #jointsOf(drafts: readonly Draft[]): ReadonlyMap<number, readonly Joint[]> {
    const joints = new Map<number, Joint[]>();
    for (const { bar, plane, from, to } of drafts) {
      if (bar.angle) continue;
      for (const node of [from, to]) {
        const here = joints.get(node) ?? [];
        joints.set(node, here);
        const known = here.find((joint) => joint.plane === planeKey(bar, plane) && inLine(joint, bar));
        if (known) known.ends += 1;
        else here.push({ plane: planeKey(bar, plane), direction: bar.direction, ends: 1, turn: null });
      }
    }
    for (const [node, here] of joints)
      for (const joint of here)
        if (joint.ends > 1) {
          joint.turn = this.#turns.length;
          this.#turns.push(node);
        }
    return joints;
  }

  #pieceOf({ bar, plane, from, to }: Draft, joints: ReadonlyMap<number, readonly Joint[]>): Piece {
    const between = subtract(this.#at(to), this.#at(from));
    const span = length(between);
    const direction = scale(between, 1 / span);
    const section = bar.angle?.stock?.properties;
    const shared = { id: bar.id, i: from, j: to, direction, length: span } as const;
    if (bar.angle && section)
      return {
        bar: bar.id,
        axial: {
          ...shared,
          EA: this.#E * section.area,
          tensionOnly: bar.angle.spec.countedOn === 'tension',
          preset: 0,
        },
        isDiagonal: true,
        bending: null,
      };
    const member = memberSection(structuralMember(bar));
    const turnAt = (node: number): number | null =>
      joints.get(node)?.find((joint) => joint.plane === planeKey(bar, plane) && inLine(joint, bar))?.turn ??
      null;
    const [turnI, turnJ] = [turnAt(from), turnAt(to)];
    const across = cross(plane.normal, direction);
    const bends = (turnI !== null || turnJ !== null) && length(across) > 1e-6;
    // Beams and chords stand on edge in the plane; the other members have their depth square to it.
    const onEdge = bar.role === 'beam' || bar.role === 'chord';
    return {
      bar: bar.id,
      axial: { ...shared, EA: this.#E * member.area, tensionOnly: false, preset: 0 },
      isDiagonal: false,
      bending: bends
        ? {
            EI: this.#E * (onEdge ? member.Imajor : member.Iminor),
            across: unit(across),
            turnI,
            turnJ,
          }
        : null,
    };
  }

  /** Nodes that stand on something outside this part. */
  #supports(): ReadonlySet<number> {
    const supports = new Set<number>();
    const own = new Set(this.#bays.map(({ id }) => id));
    const standing = new Set(this.#bays.filter(({ kind }) => kind !== 'roof').flatMap(({ nodes }) => nodes));
    this.#nodes.forEach((id, k) => {
      const kinds = Object.entries(this.#layout.nodes.get(id)?.supports ?? {});
      const holds = (kind: NodeSupport['kind']): boolean =>
        kind === 'eaves' ? !standing.has(id) : kind !== 'standing';
      if (kinds.some(([bay, { kind }]) => own.has(bay) && holds(kind))) supports.add(k);
    });
    return supports;
  }

  /** What no plane at a node takes. The eaves of a roof give it no hold up the slope: frames hold them across the building. */
  #holds(drafts: readonly Draft[], eaves: ReadonlyMap<number, Eaves>): readonly Hold[] {
    const taken = new Map<number, Vec3[]>();
    const roofs = new Set(this.#bays.filter(({ kind }) => kind === 'roof').map(({ id }) => id));
    for (const { bar, plane, from, to } of drafts)
      for (const node of [from, to]) {
        const here = taken.get(node) ?? [];
        taken.set(node, here);
        const atEaves =
          roofs.has(bar.bay) && this.#layout.nodes.get(this.#nodes[node] ?? '')?.supports[bar.bay];
        here.push(...(atEaves ? [plane.right] : [plane.right, plane.up]));
      }
    return [...taken].flatMap(([node, directions]) => {
      const byStatics = eaves.get(node);
      if (byStatics?.onSupport) return supportHolds(node, byStatics.along);
      return leftOver(directions).map((direction) => ({
        node,
        direction,
        ofFrames: byStatics !== undefined,
      }));
    });
  }

  /** Rafters that run from eaves to eaves over a ridge push them apart: what takes that is the frame, not the bracing. */
  #ties(holds: readonly Hold[]): readonly Tie[] {
    const ofFrames = new Map(holds.flatMap((hold) => (hold.ofFrames ? [[hold.node, hold] as const] : [])));
    return this.#bays
      .filter(({ kind }) => kind === 'roof')
      .flatMap((bay) =>
        ([1, 2] as const).flatMap((rafter) => {
          const points = rafterPoints(bay, this.#layout, rafter);
          const [i, j] = [points[0], points.at(-1)].map((point) => this.#indexOf.get(point?.id ?? ''));
          // One end may stand in a wall across the building, which holds it by itself.
          const hold = ofFrames.get(i ?? -1) ?? ofFrames.get(j ?? -1);
          const overARidge = bay.planes.length > 1;
          return hold && overARidge && i !== undefined && j !== undefined && i !== j
            ? [{ i, j, direction: hold.direction }]
            : [];
        }),
      );
  }

  /**
   * Eaves of roofs that are held along the building on two lines or more, by walls or by supports that the project vouches for. Such a roof is kept from
   * turning in plan by statics: each line takes its share by lever arms, whatever its stiffness, and the frames keep it across the building
   * without clamping it. On one line alone only the frames can keep it from turning: there they have all their stiffness.
   */
  #eavesByStatics(supports: ReadonlySet<number>): ReadonlyMap<number, Eaves> {
    const found = new Map<number, Eaves>();
    for (const bay of this.#bays) {
      const along = bay.planes[0]?.right;
      if (bay.kind !== 'roof' || !along) continue;
      const braced = this.#nodesBracedAlong(along);
      const heldAlong = bay.nodes.flatMap((id): Eaves[] => {
        const node = this.#indexOf.get(id);
        if (node === undefined) return [];
        const onSupport = supports.has(node) && !braced.has(id);
        return onSupport || braced.has(id) ? [{ node, onSupport, along }] : [];
      });
      const across = heldAlong.map(({ node }) => {
        const [x, y] = this.#at(node);
        return y * along[0] - x * along[1];
      });
      if (Math.max(...across) - Math.min(...across) < TWO_LINES) continue;
      for (const each of heldAlong)
        if (this.#layout.nodes.get(this.#nodes[each.node] ?? '')?.supports[bay.id])
          found.set(each.node, each);
    }
    return found;
  }

  /** Nodes of walls, drawn freely or not, that lie along a direction. */
  #nodesBracedAlong(along: Vec3): ReadonlySet<string> {
    return new Set(
      this.#bays
        .filter(
          ({ kind, planes }) =>
            (kind === 'wall' || kind === 'free') &&
            planes.some(
              ({ right, normal }) => Math.abs(dot(right, along)) > ALONG && Math.abs(normal[2]) < UPRIGHT,
            ),
        )
        .flatMap(({ nodes }) => nodes),
    );
  }

  #braced(drafts: readonly Draft[]): readonly (readonly Vec3[])[] {
    const ways = this.#nodes.map((): Vec3[] => []);
    for (const { plane, from, to } of drafts)
      for (const node of [from, to]) {
        const here = ways[node];
        if (here && !here.some((known) => length(cross(known, plane.right)) < 1e-3)) here.push(plane.right);
      }
    return ways;
  }
}

const planeKey = (bar: Bar, plane: Plane): string => `${bar.bay} ${plane.id}`;
const inLine = (joint: Joint, bar: Bar): boolean => length(cross(joint.direction, bar.direction)) < IN_LINE;

/** Held upright and along the building; across it by the frames. */
function supportHolds(node: number, along: Vec3): readonly Hold[] {
  const upright: Vec3 = [0, 0, 1];
  return [
    { node, direction: along, ofFrames: false },
    { node, direction: upright, ofFrames: false },
    { node, direction: cross(upright, along), ofFrames: true },
  ];
}

/** Unit vectors square to each other and to all of the given. */
function leftOver(directions: readonly Vec3[]): readonly Vec3[] {
  const taken: Vec3[] = [];
  const rest = (v: Vec3): Vec3 =>
    taken.reduce<Vec3>((left, known) => subtract(left, scale(known, dot(left, known))), v);
  for (const direction of directions) {
    const left = rest(direction);
    if (length(left) > 1e-3) taken.push(unit(left));
  }
  const free: Vec3[] = [];
  const [a, b] = taken;
  if (taken.length === 2 && a && b) return [unit(cross(a, b))];
  for (const axis of [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ] as const) {
    const left = rest(axis);
    if (length(left) > 0.5) {
      taken.push(unit(left));
      free.push(unit(left));
    }
  }
  return free;
}
