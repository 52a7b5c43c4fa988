import type { Forces } from '../forces/model.ts';
import { type PartnerShare, partnerShare } from '../forces/partnerShare.ts';
import { bayFrame } from '../frame/bayFrame.ts';
import type { Mechanism } from '../frame/model.ts';
import { offeredTo } from '../frame/push.ts';
import { FrameSolver } from '../frame/solver.ts';
import { isJoined } from '../layout/joined.ts';
import type { BarId, BayLayout, Crossing, Layout } from '../layout/model.ts';
import type { Bay, EndFixity } from '../project/model.ts';
import type { Restraint } from '../restraint/model.ts';
import type { RestraintContext } from '../restraint/restraint.ts';
import type { BowingBar, Steel } from './barProblems.ts';
import { bowingOf, type Partner } from './bowing.ts';
import { namedMechanism } from './mechanismNames.ts';
import type { Bowing, NamedMechanism } from './model.ts';

export interface BowingInput {
  readonly layout: Layout;
  readonly context: RestraintContext;
  readonly restraints: ReadonlyMap<BarId, Restraint>;
  readonly steel: Steel;
  /** How the ends of diagonals turn. */
  readonly ends: EndFixity;
  /** Forces of every combination, where actions are given: they say how taut a partner is. */
  readonly forces: Forces | null;
}

export interface BayBowings {
  readonly bowings: ReadonlyMap<BarId, Bowing>;
  readonly movable: readonly NamedMechanism[];
}

/** One bay's frame with the bars that bow in it. */
export interface BayBowing {
  readonly solver: FrameSolver;
  readonly mechanisms: readonly Mechanism[];
  readonly bars: ReadonlyMap<BarId, BowingBar>;
  readonly partners: ReadonlyMap<BarId, Partner>;
}

/** Levels 2 and 3 for every diagonal of a bay. Where the frame is a mechanism, what it offers is left out and the bars say why. */
export function bayBowings(input: BowingInput, layout: BayLayout, bay: Bay): BayBowings {
  const prepared = bayBowing(input, layout, bay);
  const bowings = new Map(
    [...prepared.bars.values()].flatMap((bar) => {
      const bowing = bowingOf(bar, prepared.partners.get(bar.bar.id) ?? null, input.steel);
      const moving = prepared.mechanisms.some(({ bars }) => bars.includes(bar.bar.id));
      const unsupported = moving
        ? 'The bay can move without resistance, so the framing holds nothing.'
        : null;
      // A bar that its marks leave free to turn has no critical load; the finding says so.
      if (!(bowing.real.N > 0 && bowing.rigid.N > 0)) return [];
      return [[bar.bar.id, { ...bowing, unsupported }] as const];
    }),
  );
  return {
    bowings,
    movable: prepared.mechanisms.map((mechanism) => namedMechanism(prepared.solver.frame, layout, mechanism)),
  };
}

export function bayBowing(input: BowingInput, layout: BayLayout, bay: Bay): BayBowing {
  const { context, steel } = input;
  const frame = bayFrame(input.layout, context.holdings, layout, {
    ...steel,
    ends: input.ends,
    tension: new Map(),
  });
  const solver = new FrameSolver(frame);
  const bars = new Map<BarId, BowingBar>();
  for (const id of layout.diagonals) {
    const bar = input.layout.bars.get(id);
    const restraint = input.restraints.get(id);
    const angle = bar?.angle;
    if (!bar || !angle?.stock || !restraint) continue;
    const offered = offeredTo(solver, id, angle.placement) ?? [];
    bars.set(id, { bar, angle, section: angle.stock.properties, restraint, offered, ends: input.ends });
  }
  return { solver, mechanisms: solver.mechanisms(), bars, partners: partnersOf(input, bay, bars) };
}

/** Of each bar the one partner whose own bowing is followed: at the joined crossing nearest its middle where nothing else is joined. */
function partnersOf(
  input: BowingInput,
  bay: Bay,
  bars: ReadonlyMap<BarId, BowingBar>,
): ReadonlyMap<BarId, Partner> {
  const partners = new Map<BarId, Partner>();
  for (const [id, { bar }] of bars) {
    const joined = (input.context.crossingsOf.get(id) ?? []).filter(isJoined);
    const place = (crossing: Crossing): number => (crossing.a === id ? crossing.onA : crossing.onB);
    const alone = joined.filter(
      (crossing) =>
        crossing.kind === 'diagonals' &&
        joined.every((other) => other === crossing || Math.abs(place(other) - place(crossing)) > 1.5),
    );
    const nearest = alone.sort(
      (a, b) => Math.abs(place(a) - bar.length / 2) - Math.abs(place(b) - bar.length / 2),
    )[0];
    const other = nearest && bars.get(nearest.a === id ? nearest.b : nearest.a);
    if (!nearest || !other) continue;
    const found = shareAt(input, id, nearest);
    partners.set(id, {
      bar: other,
      crossing: nearest,
      tensionShare: found?.share ?? bay.tensionShares?.[nearest.key] ?? 0,
      shareFrom: found ? { kind: 'combination', state: found.state } : { kind: 'assumed' },
    });
  }
  return partners;
}

/** What the forces say of a crossing's other bar while this one is squeezed; null where no combination squeezes it. */
export function shareAt({ forces }: BowingInput, bar: BarId, crossing: Crossing): PartnerShare | null {
  return forces && partnerShare(forces, bar, crossing.a === bar ? crossing.b : crossing.a);
}
