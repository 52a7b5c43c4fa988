import { dot2, type Vec2 } from '../geometry/vector.ts';
import { motionAbout } from '../section/direction.ts';
import { AXES, type Axis, type Radii } from '../section/model.ts';
import { squareTo } from './directions.ts';
import type { Governing, Lane, Piece } from './model.ts';
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
  const candidates: Governing[] = rule.spans.map((span) => ({
    ...named(section, span.freeDirection),
    length: span.to - span.from,
    radius: span.radius,
    slenderness: span.slenderness,
    from: span.from,
    to: span.to,
    basis: 'span',
    freeDirection: span.freeDirection,
  }));
  if (rule.bound)
    candidates.push({
      ...named(section, rule.bound.freeDirection),
      length: rule.bound.length,
      radius: rule.bound.radius,
      slenderness: rule.bound.slenderness,
      from: 0,
      to: barLength,
      basis: 'mixed bound',
      freeDirection: rule.bound.freeDirection,
    });
  const overridden = AXES.map((axis) => lanes[axis]).filter((lane) => lane.override);
  const standing = candidates.filter((each) => !overridden.some((lane) => lane.axis === each.axis));
  // A span that is named by an overridden axis falls away, and the other axes it also stood for must not fall with it.
  const others =
    overridden.length === 0 ? [] : AXES.map((axis) => lanes[axis]).filter((lane) => !lane.override);
  const alone = others.map(
    (lane): Governing => ({ ...longestPiece(lane), ...laneBowing(lane), basis: 'span' }),
  );
  const own = overridden.map(
    (lane): Governing => ({ from: 0, to: barLength, ...laneBowing(lane), basis: 'override' }),
  );
  return [...standing, ...alone, ...own].reduce((worst, each) => (isWorse(each, worst) ? each : worst));
}

const laneBowing = (lane: Lane) => ({
  axis: lane.axis,
  angle: null,
  length: lane.unbraced,
  radius: lane.radius,
  slenderness: lane.slenderness,
  freeDirection: lane.axis === 'v' ? null : lane.motion,
});

const longestPiece = (lane: Lane): Piece =>
  lane.pieces.reduce((most, piece) => (piece.to - piece.from > most.to - most.from ? piece : most));

/** Ties go to the bowing that names an axis parallel to a leg, which is the one a reader can see. */
function isWorse(each: Governing, worst: Governing): boolean {
  const least = worst.slenderness * 1e-9;
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
