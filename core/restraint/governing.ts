import { dot2, type Vec2 } from '../geometry/vector.ts';
import { motionAbout } from '../section/direction.ts';
import { AXES, type Axis, type Radii } from '../section/model.ts';
import { squareTo } from './directions.ts';
import type { Governing, Lane, MixedBound, Piece, SpanCheck } from './model.ts';
import type { RuleResult } from './rule.ts';

/** A direction this near to an axis's motion is called by the axis: half a degree. */
const NAMED = Math.cos((0.5 * Math.PI) / 180);

/** The largest slenderness of the spans, the bound for mixed holds, and the user's own lengths where they stand in for these. */
export function governingOf(
  section: Radii,
  rule: RuleResult,
  lanes: Readonly<Record<Axis, Lane>>,
  barLength: number,
): Governing {
  const overridden = AXES.map((axis) => lanes[axis]).filter((lane) => lane.override);
  if (overridden.length === 0) return byTheRule(section, rule, barLength);
  const candidates = rule.spans.map((span) => ofSpan(section, span));
  if (rule.bound) candidates.push(ofBound(section, rule.bound, barLength));
  const standing = candidates.filter((each) => !overridden.some((lane) => lane.axis === each.axis));
  // A span that is named by an overridden axis falls away, and the other axes it also stood for must not fall with it.
  const alone = AXES.map((axis) => lanes[axis])
    .filter((lane) => !lane.override)
    .map((lane) => ofLane(lane, longestPiece(lane), 'span'));
  const own = overridden.map((lane) => ofLane(lane, { from: 0, to: barLength }, 'override'));
  return [...standing, ...alone, ...own].reduce((worst, each) => (isWorse(each, worst) ? each : worst));
}

/** Two figures nearer than this are one: which of them governs must not be left to rounding. */
const TIE = 1e-9;

/** Without lengths of the user's own, the worst span or the bound is found before it is put into words. */
function byTheRule(section: Radii, { spans, bound }: RuleResult, barLength: number): Governing {
  const worst = spans.reduce((most, span) => (span.slenderness > most.slenderness * (1 + TIE) ? span : most));
  return bound && bound.slenderness > worst.slenderness * (1 + TIE)
    ? ofBound(section, bound, barLength)
    : ofSpan(section, worst);
}

function ofSpan(section: Radii, { from, to, freeDirection, radius, slenderness }: SpanCheck): Governing {
  const { axis, angle } = named(section, freeDirection);
  return { axis, angle, length: to - from, radius, slenderness, from, to, basis: 'span', freeDirection };
}

function ofBound(section: Radii, bound: MixedBound, barLength: number): Governing {
  const { length, radius, slenderness, freeDirection } = bound;
  const { axis, angle } = named(section, freeDirection);
  const basis = 'mixed bound';
  return { axis, angle, length, radius, slenderness, from: 0, to: barLength, basis, freeDirection };
}

function ofLane(lane: Lane, { from, to }: Pick<Piece, 'from' | 'to'>, basis: Governing['basis']): Governing {
  const { axis, unbraced: length, radius, slenderness } = lane;
  const freeDirection = axis === 'v' ? null : lane.motion;
  return { axis, angle: null, length, radius, slenderness, from, to, basis, freeDirection };
}

const longestPiece = (lane: Lane): Piece =>
  lane.pieces.reduce((most, piece) => (piece.counts > most.counts ? piece : most));

/** Ties go to the bowing that names an axis parallel to a leg, which is the one a reader can see. */
function isWorse(each: Governing, worst: Governing): boolean {
  const least = worst.slenderness * TIE;
  if (each.slenderness > worst.slenderness + least) return true;
  return (
    each.slenderness > worst.slenderness - least && worst.basis === 'mixed bound' && each.basis === 'span'
  );
}

function named(section: Radii, free: Vec2 | null): Pick<Governing, 'axis' | 'angle'> {
  if (free === null) return { axis: 'v', angle: null };
  for (const axis of AXES)
    if (Math.abs(dot2(free, motionAbout(section, axis))) >= NAMED) return { axis, angle: null };
  const bending = squareTo(free);
  const degrees = (Math.atan2(bending[1], bending[0]) * 180) / Math.PI;
  return { axis: 'free', angle: degrees > 90 ? degrees - 180 : degrees <= -90 ? degrees + 180 : degrees };
}
