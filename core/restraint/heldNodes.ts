/**
 * Which nodes the bracing holds in place, bay by bay: grown from the supports the way a simple truss is, so that every
 * held node knows what holds it. By the marks only: whether a bar is strong or stiff enough is not asked here.
 */
import { cross, dot, length } from '../geometry/vector.ts';
import type { Bar, BarId, BayLayout, Layout, NodeSupport } from '../layout/model.ts';
import type { TrailStep } from './model.ts';

export type NodeHolding =
  | { readonly kind: 'support'; readonly support: NodeSupport; readonly below: string | null }
  /** Two bars at an angle, each from a held node; or a straight member running through between two held nodes. */
  | { readonly kind: 'bars'; readonly by: readonly [Arm, Arm]; readonly depth: number };

export interface Arm {
  readonly bar: BarId;
  readonly node: string;
}

export interface BayHolding {
  readonly bay: BayLayout;
  readonly held: ReadonlyMap<string, NodeHolding>;
  /** Eaves and feet whose bay below does not hold them: node to that bay. */
  readonly freeBelow: ReadonlyMap<string, string>;
  /** Trails from nodes, kept as they are followed: hundreds of holds lead down the same few. */
  readonly trails: Map<string, readonly TrailStep[]>;
}

export type Holdings = ReadonlyMap<string, BayHolding>;

/** Below this angle two bars count as one direction. */
const SAME_DIRECTION = Math.sin((10 * Math.PI) / 180);

/** From the lowest up, and roofs last: what stands on another bay is held as that one holds it. */
export function holdingsOf(layout: Layout): Holdings {
  const standsOn = baysBelow(layout);
  const holdings = new Map<string, BayHolding>();
  const lowest = new Map(
    layout.bays.map((bay) => [
      bay.id,
      bay.nodes.reduce(
        (least, id) => Math.min(least, layout.nodes.get(id)?.at[2] ?? least),
        Number.POSITIVE_INFINITY,
      ),
    ]),
  );
  const order = [...layout.bays].sort(
    (a, b) =>
      Number(a.kind === 'roof') - Number(b.kind === 'roof') ||
      (lowest.get(a.id) ?? 0) - (lowest.get(b.id) ?? 0),
  );
  for (const bay of order) holdings.set(bay.id, grown(bay, layout, standsOn, holdings));
  return holdings;
}

function baysBelow(layout: Layout): ReadonlyMap<string, readonly string[]> {
  const below = new Map<string, string[]>();
  for (const bay of layout.bays) {
    if (bay.kind === 'roof') continue;
    for (const node of bay.nodes) {
      const list = below.get(node);
      if (list) list.push(bay.id);
      else below.set(node, [bay.id]);
    }
  }
  return below;
}

function grown(
  bay: BayLayout,
  layout: Layout,
  standsOn: ReadonlyMap<string, readonly string[]>,
  holdings: Holdings,
): BayHolding {
  const held = new Map<string, NodeHolding>();
  const freeBelow = new Map<string, string>();
  const arms = armsOf(bay, layout);
  const waiting: string[] = [];
  const hold = (node: string, holding: NodeHolding) => {
    held.set(node, holding);
    waiting.push(node);
  };
  for (const id of bay.nodes) {
    const support = layout.nodes.get(id)?.supports[bay.id];
    if (!support) continue;
    const onBays = support.kind === 'eaves' || support.kind === 'standing';
    const bays = onBays ? (standsOn.get(id) ?? []).filter((other) => other !== bay.id) : [];
    const holder = bays.find((other) => holdings.get(other)?.held.has(id));
    if (bays.length > 0 && holder === undefined) freeBelow.set(id, bays[0] ?? '');
    else hold(id, { kind: 'support', support, below: holder ?? null });
  }
  for (let next = waiting.shift(); next !== undefined; next = waiting.shift())
    for (const { node } of arms.get(next) ?? []) {
      if (held.has(node)) continue;
      const by = twoArms(node, arms.get(node) ?? [], held, layout);
      if (by)
        hold(node, { kind: 'bars', by, depth: 1 + Math.max(depthOf(held, by[0]), depthOf(held, by[1])) });
    }
  return { bay, held, freeBelow, trails: new Map() };
}

function depthOf(held: ReadonlyMap<string, NodeHolding>, arm: Arm): number {
  const holding = held.get(arm.node);
  return holding?.kind === 'bars' ? holding.depth : 0;
}

/** For each node, the bars that leave it and where they lead. Purlins and rails lie on top and hold no node. */
function armsOf(bay: BayLayout, layout: Layout): ReadonlyMap<string, readonly Arm[]> {
  const arms = new Map<string, Arm[]>();
  const put = (node: string, arm: Arm) => {
    const list = arms.get(node);
    if (list) list.push(arm);
    else arms.set(node, [arm]);
  };
  for (const id of bay.bars) {
    const bar = layout.bars.get(id);
    if (!bar || bar.line) continue;
    put(bar.i, { bar: id, node: bar.j });
    put(bar.j, { bar: id, node: bar.i });
  }
  return arms;
}

function twoArms(
  node: string,
  arms: readonly Arm[],
  held: ReadonlyMap<string, NodeHolding>,
  layout: Layout,
): readonly [Arm, Arm] | null {
  const reaching = arms.filter((arm) => held.has(arm.node));
  for (let p = 0; p < reaching.length; p++)
    for (let q = p + 1; q < reaching.length; q++) {
      const [a, b] = [reaching[p], reaching[q]];
      const [barA, barB] = [a && layout.bars.get(a.bar), b && layout.bars.get(b.bar)];
      if (a && b && barA && barB && holdTogether(barA, barB, node)) return [a, b];
    }
  return null;
}

function holdTogether(a: Bar, b: Bar, node: string): boolean {
  if (length(cross(a.direction, b.direction)) >= SAME_DIRECTION) return true;
  // In line: only a member that runs straight through holds its own middle, by its bending.
  const away = (bar: Bar) => (bar.i === node ? 1 : -1);
  const opposite = dot(a.direction, b.direction) * away(a) * away(b) < 0;
  return opposite && a.angle === null && b.angle === null;
}
