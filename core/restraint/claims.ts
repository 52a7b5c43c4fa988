/** What each mark at a crossing claims to hold of one bar, and whether the claim counts. METHODS.md, "What a mark holds". */
import { dot, scale, subtract, unit2, type Vec2, type Vec3 } from '../geometry/vector.ts';
import type { AngleBar, Bar, Crossing, Layout } from '../layout/model.ts';
import type { JoinKind } from '../project/model.ts';
import type { BayHolding, Holdings } from './heldNodes.ts';
import type { Claim, HoldDirection, HoldReason, TrailStep } from './model.ts';
import { labelOf, lineHolding, trailFromNode } from './trails.ts';

/** Holds weaker than this share of a direction are none: sin 10°. */
export const HOLDS_FROM = Math.sin((10 * Math.PI) / 180);

export interface ClaimContext {
  readonly layout: Layout;
  readonly holdings: Holdings;
}

/** Direction in space as seen in the section plane of a bar; shorter than 1 where it runs partly along the bar. */
export function inSection(angle: Pick<AngleBar, 'placement'>, direction: Vec3): Vec2 {
  return [dot(direction, angle.placement.x), dot(direction, angle.placement.y)];
}

export function claimsAt(
  context: ClaimContext,
  crossing: Crossing,
  bar: Bar,
  angle: AngleBar,
): readonly Claim[] {
  const partner = context.layout.bars.get(crossing.a === bar.id ? crossing.b : crossing.a);
  if (!partner) return [];
  const join = crossing.join?.kind ?? 'none';
  const base = { source: crossing.id, join, holder: partner.id } as const;
  const across = acrossOf(bar, angle, partner);
  const outwards = unit2(inSection(angle, angle.placement.outOfPlane));
  const along = crossing.kind === 'diagonals' ? 'in plane' : 'along holder';

  const reason = whyUnjoined(crossing, partner);
  if (reason) {
    return [
      claim(base, along, across, notHeld(reason)),
      claim(base, 'out of plane', outwards, notHeld(reason)),
    ];
  }
  return crossing.kind === 'diagonals'
    ? partnerClaims(context, base, partner, join, across, outwards)
    : lineClaims(context, base, crossing, partner, across, outwards);
}

/** Why a crossing is not joined at all; null where it is. */
function whyUnjoined({ join, gap, tooFarApart }: Crossing, partner: Bar): HoldReason | null {
  if (join === null || join.kind === 'none')
    return { kind: 'not joined', partner: partner.mark, marked: join !== null };
  if (join.kind === 'hung') return { kind: 'hung', line: partner.mark };
  return tooFarApart ? { kind: 'too far apart', partner: partner.mark, gap } : null;
}

type Base = Pick<Claim, 'source' | 'join' | 'holder'>;
type HeldSo = Pick<Claim, 'counted' | 'reason' | 'trail'>;

/** Written out: there are thousands, and an object spread into another takes several times its room. */
function claim(base: Base, direction: HoldDirection, vector: Vec2 | null, held: HeldSo): Claim {
  const { source, join, holder } = base;
  const { counted, reason, trail } = held;
  return { source, join, holder, direction, vector, counted, reason, trail };
}

const notHeld = (reason: HoldReason): HeldSo => ({ counted: false, reason, trail: [] });

/** Across the bar, in the way that the holder runs: what is left of its direction square to the bar. Null when it runs along the bar. */
function acrossOf(bar: Bar, angle: AngleBar, holder: Bar): Vec2 | null {
  const square = subtract(holder.direction, scale(bar.direction, dot(holder.direction, bar.direction)));
  const seen = inSection(angle, square);
  return Math.hypot(seen[0], seen[1]) >= HOLDS_FROM ? unit2(seen) : null;
}

function partnerClaims(
  context: ClaimContext,
  base: Base,
  partner: Bar,
  join: JoinKind,
  across: Vec2 | null,
  outwards: Vec2 | null,
): readonly Claim[] {
  const holding = context.holdings.get(partner.bay);
  const outOfPlane = claim(
    base,
    'out of plane',
    outwards,
    notHeld({ kind: join === 'cut' ? 'single plate hinges' : 'partner only bends', partner: partner.mark }),
  );
  if (!across || !holding)
    return [
      claim(base, 'in plane', across, notHeld({ kind: 'nearly along the bar', holder: partner.mark })),
      outOfPlane,
    ];
  const free = [partner.i, partner.j].find((node) => !holding.held.has(node));
  const inPlane = claim(base, 'in plane', across, {
    counted: free === undefined,
    reason:
      free === undefined
        ? { kind: 'partner end-on', partner: partner.mark, join }
        : { kind: 'partner half free', partner: partner.mark, node: labelOf(context.layout, free) },
    trail: partnerTrail(context.layout, holding, partner, free ?? null),
  });
  return [inPlane, outOfPlane];
}

function partnerTrail(
  layout: Layout,
  holding: BayHolding,
  partner: Bar,
  free: string | null,
): readonly TrailStep[] {
  const start: TrailStep = {
    text: `${partner.mark}, end-on through both halves`,
    bar: partner.id,
    node: null,
    state: 'on the way',
  };
  if (free) return [start, ...trailFromNode(layout, holding, free)];
  return [start, ...trailFromNode(layout, holding, partner.i), ...trailFromNode(layout, holding, partner.j)];
}

function lineClaims(
  context: ClaimContext,
  base: Base,
  crossing: Crossing,
  holder: Bar,
  across: Vec2 | null,
  outwards: Vec2 | null,
): readonly Claim[] {
  const { layout, holdings } = context;
  const name = holder.line ? holder.mark : `the ${holder.role}`;
  const claims = [
    claim(
      base,
      'along holder',
      across,
      across
        ? heldAlong(layout, holdings, holder, name)
        : notHeld({ kind: 'nearly along the bar', holder: name }),
    ),
    claim(base, 'out of plane', outwards, heldAcross(context, holder, name)),
  ];
  if (crossing.join?.kind === 'purlin' && crossing.join.boltsAcross === 2)
    claims.push(
      claim(base, 'twist', null, { counted: true, reason: { kind: 'twist held', line: name }, trail: [] }),
    );
  return claims;
}

/** Purlins and rails lie on rafters and columns, which carry them; a member of the framing holds across itself if both its ends are held. */
function heldAcross({ layout, holdings }: ClaimContext, holder: Bar, name: string): HeldSo {
  const bending: TrailStep = {
    text: `${name}, bending between its supports`,
    bar: holder.id,
    node: null,
    state: 'on the way',
  };
  const holding = holdings.get(holder.bay);
  const free = holder.line ? undefined : [holder.i, holder.j].find((node) => !holding?.held.has(node));
  if (free !== undefined)
    return {
      counted: false,
      reason: { kind: 'line end free', line: name, node: labelOf(layout, free) },
      trail: holding ? [bending, ...trailFromNode(layout, holding, free)] : [],
    };
  const ends = `${labelOf(layout, holder.i)}; ${labelOf(layout, holder.j)}`;
  return {
    counted: true,
    reason: { kind: 'line stiff across', line: name },
    trail: [bending, { text: ends, bar: null, node: holder.i, state: 'held' }],
  };
}

function heldAlong(layout: Layout, holdings: Holdings, holder: Bar, name: string): HeldSo {
  if (holder.line) {
    const line = lineHolding(layout, holdings, holder);
    return {
      counted: line.held,
      reason: line.held
        ? { kind: 'line held along itself', line: name, by: line.by }
        : { kind: 'line free along itself', line: name, why: line.by },
      trail: line.trail,
    };
  }
  // A member of the bay's own framing is held along itself by either of its ends.
  const holding = holdings.get(holder.bay);
  const end = [holder.i, holder.j].find((node) => holding?.held.has(node));
  if (!holding || end === undefined)
    return {
      counted: false,
      reason: { kind: 'line free along itself', line: name, why: 'neither of its ends is held' },
      trail: holding ? trailFromNode(layout, holding, holder.i) : [],
    };
  return {
    counted: true,
    reason: { kind: 'line held along itself', line: name, by: labelOf(layout, end) },
    trail: trailFromNode(layout, holding, end),
  };
}
