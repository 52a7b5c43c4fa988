import type { EndConnection, PracticeId } from '../project/model.ts';
import { normalHole } from './holes.ts';
import type { ResistingEnd } from './model.ts';

/** What an end is fixed to. mm. */
export interface EndPlace {
  readonly practice: PracticeId;
  /** Outside length of the leg against the gusset. */
  readonly leg: number;
  /** Heel to the first row. */
  readonly gauge: number;
  readonly gusset: number;
}

/** An end as marked, with what is not said filled in. */
export function resistingEnd(
  end: 'i' | 'j',
  connection: EndConnection,
  { practice, leg, gauge, gusset }: EndPlace,
): ResistingEnd {
  const rows = connection.rows ?? 1;
  const line = connection.gauge ?? gauge;
  const rowSpacing = rows === 2 ? (connection.rowSpacing ?? 2.5 * connection.boltDiameter) : 0;
  return {
    end,
    kind: connection.kind,
    bolts: connection.bolts,
    rows,
    staggered: rows === 2 && (connection.staggered ?? false),
    boltDiameter: connection.boltDiameter,
    hole: normalHole(practice, connection.boltDiameter),
    pitch: connection.pitch,
    endDistance: connection.endDistance,
    gauge: line,
    rowSpacing,
    edgeDistance: leg - line - rowSpacing,
    legs: connection.legs,
    boltGrade: connection.boltGrade ?? (practice === 'aisc360' || practice === 'csaS16' ? 'A325' : '8.8'),
    threadsInShear: connection.threadsInShear ?? true,
    weldLength: connection.weldLength,
    weldSize: connection.weldSize ?? 6,
    gusset,
  };
}
