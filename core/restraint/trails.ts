/** The way from a hold to a support, step by step, for the screen and the checker. */
import { cross, length, subtract } from '../geometry/vector.ts';
import type { Bar, BarId, Layout, NodeSupport } from '../layout/model.ts';
import type { Arm, BayHolding, Holdings } from './heldNodes.ts';
import type { TrailStep } from './model.ts';

/** From a node down to a support. Ends in a step that is held, or free: every node on the way stands on nodes held before it. */
export function trailFromNode(layout: Layout, holding: BayHolding, node: string): readonly TrailStep[] {
  const known = holding.trails.get(node);
  if (known) return known;
  const trail = followed(layout, holding, node);
  holding.trails.set(node, trail);
  return trail;
}

function followed(layout: Layout, holding: BayHolding, node: string): readonly TrailStep[] {
  const label = labelOf(layout, node);
  const how = holding.held.get(node);
  if (!how) {
    const below = holding.freeBelow.get(node);
    const text = below ? `${label}: ${below} below does not hold it` : `${label}: nothing holds it`;
    return [{ text, bar: null, node, state: 'free' }];
  }
  if (how.kind === 'support')
    return [
      { text: `${label}: ${supportText(how.support.kind, how.below)}`, bar: null, node, state: 'held' },
    ];
  const down = shorterArm(holding, how.by);
  return [
    {
      text: `${label}, held by ${barName(layout, how.by[0].bar)} and ${barName(layout, how.by[1].bar)}`,
      bar: null,
      node,
      state: 'on the way',
    },
    { text: `along ${barName(layout, down.bar)}`, bar: down.bar, node: null, state: 'on the way' },
    ...trailFromNode(layout, holding, down.node),
  ];
}

function shorterArm(holding: BayHolding, by: readonly [Arm, Arm]): Arm {
  const depth = (arm: Arm) => {
    const how = holding.held.get(arm.node);
    return how?.kind === 'bars' ? how.depth : 0;
  };
  return depth(by[1]) < depth(by[0]) ? by[1] : by[0];
}

function supportText(kind: NodeSupport['kind'], below: string | null): string {
  switch (kind) {
    case 'foundation':
      return 'on its foundation';
    case 'standing':
    case 'eaves':
      return below ? `held by ${below} below` : 'taken as carried down by what stands below';
    case 'vouched':
      return 'taken as held, as vouched for';
    default:
      return kind satisfies never;
  }
}

export const labelOf = (layout: Layout, node: string): string => layout.nodes.get(node)?.label ?? node;

export function barName(layout: Layout, id: BarId): string {
  const bar = layout.bars.get(id);
  if (!bar) return id;
  return bar.angle || bar.line ? bar.mark : `the ${bar.role}`;
}

/** What holds a purlin or rail along itself, or why nothing does. */
export interface LineHolding {
  readonly held: boolean;
  /** What holds it, or why it is free, in a few words. */
  readonly by: string;
  readonly trail: readonly TrailStep[];
}

/** How far a panel point may lie off a purlin's line and still be met by it, mm (common practice, no source). */
const ON_THE_LINE = 50;

export function lineHolding(layout: Layout, holdings: Holdings, bar: Bar): LineHolding {
  const info = bar.line;
  const own = holdings.get(bar.bay);
  if (!info || !own) return { held: false, by: 'tied to nothing', trail: [] };
  const along: TrailStep = { text: `along ${info.id}`, bar: bar.id, node: null, state: 'on the way' };
  const fail = (why: string, node: string | null): LineHolding => ({
    held: false,
    by: why,
    trail: [along, { text: why, bar: node ? null : bar.id, node, state: 'free' }],
  });
  const through = (holding: BayHolding, node: string, of: string): LineHolding => {
    const trail = [along, ...trailFromNode(layout, holding, node)];
    const name = `${labelOf(layout, node)}${of}`;
    return holding.held.has(node)
      ? { held: true, by: name, trail }
      : { held: false, by: `${name} is itself free`, trail };
  };

  // Its own panel point counts only where the bracing holds it; else what the project says of the line may still do.
  if (info.ownPanelPoint && own.held.has(info.ownPanelPoint)) return through(own, info.ownPanelPoint, '');
  switch (info.heldBy.kind) {
    case 'nothing':
      return info.ownPanelPoint ? through(own, info.ownPanelPoint, '') : fail('tied to nothing', null);
    case 'vouched':
      return {
        held: true,
        by: `what is vouched for: ${info.heldBy.reason}`,
        trail: [along, { text: `vouched for: ${info.heldBy.reason}`, bar: null, node: null, state: 'held' }],
      };
    case 'bay': {
      const other = info.heldBy.bay;
      const holding = holdings.get(other);
      if (!holding) return fail(`${other} is not in this project`, null);
      if (other === bar.bay) return fail(`${other} is its own bay and has no panel point on this line`, null);
      const points = holding.bay.diagonals.flatMap((id) => {
        const diagonal = layout.bars.get(id);
        return diagonal ? [diagonal.i, diagonal.j] : [];
      });
      const met = points.find((node) => isOnLine(layout, bar, node));
      return met === undefined
        ? fail(`${other} has no panel point on this line`, null)
        : through(holding, met, ` of ${other}`);
    }
    default:
      return info.heldBy satisfies never;
  }
}

function isOnLine(layout: Layout, bar: Bar, node: string): boolean {
  const at = layout.nodes.get(node)?.at;
  if (!at) return false;
  return length(cross(subtract(at, bar.from), bar.direction)) <= ON_THE_LINE;
}
