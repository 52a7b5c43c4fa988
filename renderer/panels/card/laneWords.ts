/** What the chips on the lanes say: why a station cuts a lane, or why it does not. */
import type { JoinKind } from '../../../core/project/model.ts';
import type { Claim, LaneCut, Station } from '../../../core/restraint/model.ts';
import { isRefusedHold } from '../../assessing/refusedHold.ts';

const CUT_BY: Readonly<Record<JoinKind | 'end' | 'bar end', string>> = {
  none: 'not joined',
  bolted: 'bolted through',
  packed: 'bolted with packer',
  cut: 'cut and plated',
  welded: 'welded',
  purlin: 'bolted',
  hung: 'hung',
  end: 'end',
  'bar end': 'ends here',
};

export interface ChipText {
  readonly long: string;
  /** Where there is no room for the long one. */
  readonly short: string;
  /** A mark claims this hold, and it does not count. */
  readonly claimed: boolean;
}

export function chipText(cut: LaneCut, station: Station): ChipText {
  const { label } = station;
  if (cut.stops) {
    const join = cut.claim?.join;
    return { long: join === undefined ? label : `${label} ${CUT_BY[join]}`, short: label, claimed: false };
  }
  const short = `${label}: no cut`;
  const claim = cut.claim ?? refusedClaim(station);
  const why = claim === null ? null : whyNot(claim);
  return {
    long: why === null ? `${label} stops nothing this way: no cut` : `${label} ${why}: no cut`,
    short,
    claimed: claim !== null && isRefusedHold(claim),
  };
}

/** A claim that would stop something, had it counted. */
function refusedClaim({ claims }: Station): Claim | null {
  return claims.find((claim) => !claim.counted && isWholeJoin(claim)) ?? null;
}

/** Reasons that belong to the whole join, whatever the direction. */
function isWholeJoin({ reason }: Claim): boolean {
  return reason.kind === 'not joined' || reason.kind === 'hung' || reason.kind === 'too far apart';
}

function whyNot({ reason }: Claim): string | null {
  switch (reason.kind) {
    case 'not joined':
      return reason.marked ? 'is not joined' : 'is unmarked';
    case 'too far apart':
      return 'lies too far away';
    case 'hung':
      return 'only hangs it';
    case 'line free along itself':
      return 'claimed, is itself free';
    case 'partner half free':
      return 'claimed, half of it is free';
    case 'line end free':
      return 'claimed, an end of it is free';
    case 'bar ends here, itself free':
      return 'ends here, is itself free';
    case 'nearly along the bar':
      return 'runs nearly along it';
    case 'end':
    case 'end marked free':
    case 'partner end-on':
    case 'partner only bends':
    case 'single plate hinges':
    case 'line held along itself':
    case 'line stiff across':
    case 'bar ends here':
    case 'twist held':
      return null;
    default:
      return reason satisfies never;
  }
}
