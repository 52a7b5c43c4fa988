import { along, cross, distance, dot, scale, subtract, unit, type Vec3 } from '../geometry/vector.ts';
import { isJoined } from '../layout/joined.ts';
import type { Bar, BarId, BayLayout, Crossing, Layout, Plane } from '../layout/model.ts';
import type { EndFixity } from '../project/model.ts';
import { endsHoldOf } from '../restraint/endWords.ts';
import type { Holdings } from '../restraint/heldNodes.ts';
import { endHolds } from '../restraint/stations.ts';
import { lineHolding } from '../restraint/trails.ts';
import { motionAbout } from '../section/direction.ts';
import { memberSection } from './memberSection.ts';
import type { Frame, FrameElement, FrameNode, FrameSpring, NodeAlong, Release } from './model.ts';

export interface FrameOptions {
  readonly E: number;
  readonly G: number;
  /** How a diagonal's end turns. */
  readonly ends: EndFixity;
  /** Axial forces already in the bars, tension positive, N. */
  readonly tension: ReadonlyMap<BarId, number>;
  /** Places on bars that get a node although nothing is joined there, mm from end i. */
  readonly extraPlaces?: ReadonlyMap<BarId, readonly number[]>;
}

/** Stiffness that stands in for "does not give", N/mm and N·mm/rad: a thousand times a short stocky bar's, well inside working accuracy. */
const UNYIELDING = 1e9;
const UNYIELDING_TURN = 1e12;

/** Places nearer than this along a bar are one, mm. */
const ONE_PLACE = 1;

/**
 * One bay as a frame: bars with their own sections, cut at every place where another is joined to them; joins as tied displacements; supports fixed; every node of
 * the framing held out of the plane of the bay by the building around it. Lines of bars meet as drawn; offsets at crossings are left out.
 */
export function bayFrame(layout: Layout, holdings: Holdings, bay: BayLayout, options: FrameOptions): Frame {
  const builder = new BayFrameBuilder(layout, holdings, bay, options);
  return builder.frame();
}

interface Place {
  readonly at: number;
  readonly node: number;
  /** A cut bar ends here twice: both halves hinge at the plate. */
  readonly cut: boolean;
}

class BayFrameBuilder {
  readonly #layout: Layout;
  readonly #holdings: Holdings;
  readonly #bay: BayLayout;
  readonly #options: FrameOptions;
  readonly #nodes: FrameNode[] = [];
  readonly #elements: FrameElement[] = [];
  readonly #springs: FrameSpring[] = [];
  readonly #along = new Map<BarId, readonly NodeAlong[]>();
  readonly #layoutNode = new Map<string, number>();
  readonly #places = new Map<BarId, Place[]>();

  constructor(layout: Layout, holdings: Holdings, bay: BayLayout, options: FrameOptions) {
    this.#layout = layout;
    this.#holdings = holdings;
    this.#bay = bay;
    this.#options = options;
  }

  frame(): Frame {
    // A bar of an unknown section is not there to be joined.
    const there = (id: BarId): boolean => isBuilt(this.#layout.bars.get(id));
    const crossings = this.#bay.crossings
      .flatMap((id) => this.#layout.crossings.get(id) ?? [])
      .filter((crossing) => isJoined(crossing) && there(crossing.a) && there(crossing.b));
    const joined = new Set(crossings.flatMap(({ a, b }) => [a, b]));
    const bars = this.#bay.bars
      .flatMap((id) => this.#layout.bars.get(id) ?? [])
      .filter((bar) => isBuilt(bar) && (!bar.line || joined.has(bar.id)));
    for (const bar of bars) {
      this.#places.set(bar.id, [
        { at: 0, node: this.#endOf(bar, 'i'), cut: false },
        { at: bar.length, node: this.#endOf(bar, 'j'), cut: false },
      ]);
    }
    this.#seatLines(bars);
    if (this.#bay.kind === 'free') this.#seatEnds(bars);
    for (const crossing of crossings) this.#join(crossing);
    for (const bar of bars) {
      for (const at of this.#options.extraPlaces?.get(bar.id) ?? [])
        if (at > ONE_PLACE && at < bar.length - ONE_PLACE)
          this.#placeAt(bar, at, false, along(bar.from, bar.direction, at));
      this.#lay(bar);
    }
    return { nodes: this.#nodes, elements: this.#elements, springs: this.#springs, along: this.#along };
  }

  #planeOf(bar: Bar): Plane {
    const plane = this.#bay.planes.find(({ id }) => id === bar.plane);
    if (!plane) throw new Error(`no plane ${bar.plane}`);
    return plane;
  }

  /** Solved for in the axes of the plane of the first bar that comes there. */
  #add(name: string, at: Vec3, fixed: boolean, bar: Bar): number {
    const index = this.#nodes.length;
    const { right, up, normal } = this.#planeOf(bar);
    this.#nodes.push({ name, at, movesWith: index, fixed, axes: [right, up, normal] });
    return index;
  }

  /** A node of the layout: fixed where it is a support, else held out of the plane of each bar that meets there. */
  #nodeOf(id: string, bar: Bar): number {
    const known = this.#layoutNode.get(id);
    if (known !== undefined) {
      if (!bar.line) this.#holdOutOfPlane(known, this.#planeOf(bar).normal);
      return known;
    }
    const node = this.#layout.nodes.get(id);
    const holding = this.#holdings.get(this.#bay.id)?.held.get(id);
    const index = this.#add(node?.label ?? id, node?.at ?? bar.from, holding?.kind === 'support', bar);
    this.#layoutNode.set(id, index);
    if (!bar.line) this.#holdOutOfPlane(index, this.#planeOf(bar).normal);
    return index;
  }

  /** An end that does not hold both ways has a node of its own, kept along the bar, against turning, and in the ways that it does hold. */
  #endOf(bar: Bar, end: 'i' | 'j'): number {
    const node = this.#nodeOf(end === 'i' ? bar.i : bar.j, bar);
    const marked = bar.angle ? endsHoldOf(bar.angle)[end] : 'both';
    if (!bar.angle || marked === 'both') return node;
    const { inPlane, outOfPlane } = bar.angle.placement;
    const own = this.#add(`end ${end} of ${bar.mark}`, end === 'i' ? bar.from : bar.to, false, bar);
    const tied: Vec3[] = [bar.direction];
    if (endHolds(marked, 'in plane')) tied.push(inPlane);
    if (endHolds(marked, 'out of plane')) tied.push(outOfPlane);
    for (const direction of tied)
      this.#springs.push({ node: own, other: node, kind: 'displacement', direction, stiffness: UNYIELDING });
    for (const direction of [bar.direction, inPlane, outOfPlane])
      this.#springs.push({
        node: own,
        other: node,
        kind: 'rotation',
        direction,
        stiffness: UNYIELDING_TURN,
      });
    return own;
  }

  #holdOutOfPlane(node: number, normal: Vec3): void {
    const known = this.#springs.some(
      (spring) =>
        spring.node === node && spring.other === null && Math.abs(dot(spring.direction, normal)) > 0.999,
    );
    if (!known && !this.#nodes[node]?.fixed)
      this.#springs.push({
        node,
        other: null,
        kind: 'displacement',
        direction: normal,
        stiffness: UNYIELDING,
      });
  }

  /** Purlins and rails sit on rafters or columns, which get a node there; where what holds a line along itself is not of this bay, it is held there. */
  #seatLines(bars: readonly Bar[]): void {
    for (const line of bars) {
      if (!line.line) continue;
      for (const end of [line.i, line.j]) {
        const at = end === line.i ? line.from : line.to;
        const node = this.#layoutNode.get(end);
        if (node === undefined) continue;
        const seat = bars.find((bar) => !bar.line && !bar.angle && passes(bar, at));
        if (seat)
          this.#places
            .get(seat.id)
            ?.push({ at: dot(subtract(at, seat.from), seat.direction), node, cut: false });
        else if (!bars.some((bar) => !bar.line && (bar.i === end || bar.j === end))) this.#fix(node);
      }
      const { heldBy, ownPanelPoint } = line.line;
      const elsewhere = heldBy.kind !== 'nothing' && lineHolding(this.#layout, this.#holdings, line).held;
      const node = this.#layoutNode.get(line.i);
      if (elsewhere && !ownPanelPoint && node !== undefined)
        this.#springs.push({
          node,
          other: null,
          kind: 'displacement',
          direction: line.direction,
          stiffness: UNYIELDING,
        });
    }
  }

  #fix(node: number): void {
    const known = this.#nodes[node];
    if (known) this.#nodes[node] = { ...known, fixed: true };
  }

  /** In a bay drawn freely a bar may end on another between its ends. */
  #seatEnds(bars: readonly Bar[]): void {
    for (const [id, node] of this.#layoutNode) {
      const at = this.#layout.nodes.get(id)?.at;
      if (!at) continue;
      for (const bar of bars)
        if (passes(bar, at))
          this.#places
            .get(bar.id)
            ?.push({ at: dot(subtract(at, bar.from), bar.direction), node, cut: false });
    }
  }

  /** Ties the displacements of both bars where they cross, and the turns that the join holds. */
  #join(crossing: Crossing): void {
    const { join } = crossing;
    const [a, b] = [this.#layout.bars.get(crossing.a), this.#layout.bars.get(crossing.b)];
    if (!join || !a || !b) return;
    const cutBar = join.kind === 'cut' ? join.cutBar : null;
    const first = this.#placeAt(a, crossing.onA, a.key === cutBar, crossing.at);
    const second = this.#placeAt(b, crossing.onB, b.key === cutBar, crossing.at);
    if (first === second) return;
    this.#tie(second, first);
    const turn = (direction: Vec3): void => {
      this.#springs.push({
        node: first,
        other: second,
        kind: 'rotation',
        direction,
        stiffness: UNYIELDING_TURN,
      });
    };
    const normal = this.#planeOf(a).normal;
    switch (join.kind) {
      case 'cut':
        // The plate is stiff in its own plane and a hinge out of it.
        turn(normal);
        break;
      case 'welded':
        turn(normal);
        turn(a.direction);
        turn(unit(cross(normal, a.direction)));
        break;
      case 'purlin':
        if (join.boltsAcross === 2) turn(a.direction);
        break;
      default:
        break;
    }
  }

  #placeAt(bar: Bar, at: number, cut: boolean, where: Vec3): number {
    const places = this.#places.get(bar.id);
    if (!places) throw new Error(`no bar ${bar.id} in the frame`);
    const known = places.find((place) => Math.abs(place.at - at) <= ONE_PLACE);
    if (known) {
      if (cut && !known.cut) places[places.indexOf(known)] = { ...known, cut };
      return known.node;
    }
    const node = this.#add(`${bar.mark} between its ends`, where, false, bar);
    places.push({ at, node, cut });
    return node;
  }

  #tie(node: number, to: number): void {
    const root = this.#rootOf(to);
    const own = this.#rootOf(node);
    if (own === root) return;
    // A fixed node leads, so that what is tied to it stays.
    const [leader, follower] = this.#nodes[own]?.fixed ? [own, root] : [root, own];
    const known = this.#nodes[follower];
    if (known) this.#nodes[follower] = { ...known, movesWith: leader };
  }

  #rootOf(node: number): number {
    let at = node;
    for (let next = this.#nodes[at]?.movesWith ?? at; next !== at; next = this.#nodes[at]?.movesWith ?? at)
      at = next;
    return at;
  }

  /** Elements of one bar between its places. */
  #lay(bar: Bar): void {
    const places = [...(this.#places.get(bar.id) ?? [])].sort((p, q) => p.at - q.at);
    this.#along.set(
      bar.id,
      places.map(({ at, node }) => ({ at, node })),
    );
    const stiffness = this.#stiffnessOf(bar);
    if (!stiffness) return;
    const [freeI, freeJ] = this.#endReleases(bar);
    const across = cross(this.#planeOf(bar).normal, bar.direction);
    const inPlane = Math.hypot(...across) > 1e-6 ? unit(across) : this.#planeOf(bar).right;
    places.slice(1).forEach((to, k) => {
      const from = places[k];
      if (!from || to.at - from.at < 1e-6) return;
      const releases: Release[] = [];
      if (k === 0) releases.push(...freeI.map((about) => ({ end: 'i', about }) as const));
      else if (from.cut) releases.push({ end: 'i', about: inPlane });
      if (k === places.length - 2) releases.push(...freeJ.map((about) => ({ end: 'j', about }) as const));
      else if (to.cut) releases.push({ end: 'j', about: inPlane });
      this.#elements.push({
        bar: bar.id,
        i: from.node,
        j: to.node,
        length: to.at - from.at,
        direction: bar.direction,
        ...stiffness,
        releases,
        tension: this.#options.tension.get(bar.id) ?? 0,
      });
    });
  }

  #stiffnessOf(bar: Bar): Pick<FrameElement, 'p' | 'q' | 'EIp' | 'EIq' | 'EA' | 'GJ'> | null {
    const { E, G } = this.#options;
    const section = bar.angle?.stock?.properties;
    if (bar.angle && section) {
      const { x, y } = bar.angle.placement;
      const way = (m: readonly [number, number]): Vec3 => [
        m[0] * x[0] + m[1] * y[0],
        m[0] * x[1] + m[1] * y[1],
        m[0] * x[2] + m[1] * y[2],
      ];
      const p = way(motionAbout(section, 'v'));
      return {
        p,
        q: cross(bar.direction, p),
        EIp: E * section.Iv,
        EIq: E * section.Iu,
        EA: E * section.area,
        GJ: G * section.J,
      };
    }
    if (!bar.member) return null;
    const member = memberSection(bar.member);
    const plane = this.#planeOf(bar);
    const deep =
      squared(upright(bar) ? plane.up : plane.normal, bar.direction) ?? squared(plane.right, bar.direction);
    if (!deep) return null;
    return {
      p: deep,
      q: cross(bar.direction, deep),
      EIp: E * member.Imajor,
      EIq: E * member.Iminor,
      EA: E * member.area,
      GJ: G * member.J,
    };
  }

  #endReleases(bar: Bar): readonly [readonly Vec3[], readonly Vec3[]] {
    const plane = this.#planeOf(bar);
    const across = cross(plane.normal, bar.direction);
    const inPlane = Math.hypot(...across) > 1e-6 ? unit(across) : plane.right;
    const outOfPlane = cross(bar.direction, inPlane);
    if (bar.angle) {
      const { ends } = this.#options;
      const hold = endsHoldOf(bar.angle);
      // An end that does not hold the bar in a way does not keep it from turning that way either.
      const freeAt = (end: 'i' | 'j'): readonly Vec3[] => [
        ...(ends.inPlane === 'hinged' || !endHolds(hold[end], 'in plane') ? [outOfPlane] : []),
        ...(ends.outOfPlane === 'hinged' || !endHolds(hold[end], 'out of plane') ? [inPlane] : []),
      ];
      return [freeAt('i'), freeAt('j')];
    }
    switch (bar.role) {
      case 'column':
      case 'rafter':
      case 'chord':
        return [[], []];
      default:
        return [
          [inPlane, outOfPlane],
          [inPlane, outOfPlane],
        ];
    }
  }
}

/** Members whose depth stands upright in the plane; the others have it square to the plane. */
const upright = (bar: Bar): boolean => bar.role === 'beam' || bar.role === 'chord';

function squared(direction: Vec3, bar: Vec3): Vec3 | null {
  const rest = subtract(direction, scale(bar, dot(direction, bar)));
  return Math.hypot(...rest) > 1e-6 ? unit(rest) : null;
}

const isBuilt = (bar: Bar | undefined): boolean =>
  bar?.angle ? bar.angle.stock !== null : (bar?.member ?? null) !== null;

function passes(bar: Bar, at: Vec3): boolean {
  const s = dot(subtract(at, bar.from), bar.direction);
  if (s <= ONE_PLACE || s >= bar.length - ONE_PLACE) return false;
  return distance(at, along(bar.from, bar.direction, s)) <= ONE_PLACE;
}
