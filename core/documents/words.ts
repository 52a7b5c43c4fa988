/** The words that every document and screen uses for joins, statuses and reasons. Chosen here once. */
import type { CatalogueId } from '../catalogue/model.ts';
import { JOIN_NAMES } from '../project/joinNames.ts';
import type { Claim, HoldDirection, HoldReason, TrailStep } from '../restraint/model.ts';

/** A designation as it is printed: "70×70×6" for "70x70x6". */
export function designationText(designation: string): string {
  return designation.replace(/(?<=\d)x(?=\d)/gi, '×');
}

/** The same for what a claim stands on, which may also be an end of the bar or another bar that ends on it. */
export function joinKindName(join: Claim['join']): string {
  if (join === 'end') return 'end connection';
  return join === 'bar end' ? 'end of another bar' : JOIN_NAMES[join];
}

export type Status = 'over' | 'near' | 'within' | 'unknown';

export const STATUS_NAMES: Readonly<Record<Status, string>> = {
  over: 'over the limit',
  near: 'near the limit',
  within: 'within the limit',
  unknown: 'not assessed',
};

export const DIRECTION_NAMES: Readonly<Record<HoldDirection, string>> = {
  'in plane': 'in the plane, across',
  'out of plane': 'out of the plane',
  'along holder': 'along the holder',
  twist: 'twist',
};

export const CATALOGUE_NAMES: Readonly<Record<CatalogueId, string>> = {
  en: 'EN 10056-1',
  us: 'ASTM A6 (US)',
  au: 'AS/NZS 3679.1',
};

/** Why a hold counts or does not, as one sentence. */
export function reasonText(reason: HoldReason): string {
  switch (reason.kind) {
    case 'end':
      return 'The end connection holds every way.';
    case 'end marked free':
      return `End ${reason.end} is marked as not holding this way.`;
    case 'partner end-on':
      return `${reason.partner} is met end-on, and both its halves reach held points.`;
    case 'partner half free':
      return `${reason.partner} is met end-on, but the half of it that ends at ${reason.node} reaches nothing held.`;
    case 'partner only bends':
      return `${reason.partner} offers only its bending, which holds nothing by the marks.`;
    case 'single plate hinges':
      return `The single plate on ${reason.partner} is a hinge, and holds nothing out of the plane.`;
    case 'not joined':
      return reason.marked
        ? `Not joined to ${reason.partner}.`
        : `The crossing with ${reason.partner} is unmarked, and is taken as not joined.`;
    case 'too far apart':
      return `${reason.partner} lies too far from it for any join: nothing is taken from the mark.`;
    case 'hung':
      return `Hung from ${reason.line}: that stops sag, and holds nothing.`;
    case 'line held along itself':
      return `${reason.line} is itself held along its length by ${reason.by}.`;
    case 'line free along itself':
      return `${reason.line} is free to move along itself: ${reason.why}.`;
    case 'line stiff across':
      return `${reason.line} is stiff across itself, out of the plane of the bay.`;
    case 'line end free':
      return `${reason.line} is stiff across itself, but its end at ${reason.node} is held by nothing.`;
    case 'bar ends here':
      return `${reason.bar} ends here and holds along itself.`;
    case 'bar ends here, itself free':
      return `${reason.bar} ends here, but its other end at ${reason.node} is itself free.`;
    case 'twist held':
      return `Two bolts across ${reason.line} hold the twist.`;
    case 'nearly along the bar':
      return `${reason.holder} runs within 10° of the bar, and holds nothing across it.`;
    default:
      return reason satisfies never;
  }
}

/**
 * The steps from a hold to a support, or to what turned out to be free: "D1, end-on through both halves → left foot: on its foundation
 * (held)". A trail that forks comes to an end more than once; each way is told apart by a semicolon.
 */
export function trailText(trail: readonly TrailStep[]): string {
  const told = trail.map(({ text, state }) =>
    state === 'on the way' ? `${text} → ` : `${text} (${state}); `,
  );
  return told.join('').replace(/( → |; )$/, '');
}
