import type { MergedSteel, Range } from './mergedSteel.ts';

/** One draw call on the merged steel. */
export interface Draw {
  readonly what: 'solids' | 'edges' | 'fineEdges';
  /** The bay in hand, drawn plainly, or the rest of the project, drawn faint behind it. */
  readonly as: 'subject' | 'context';
  readonly range: Range;
}

/**
 * The draw calls for a project with one bay in hand, or with all of it where there is none: at most seven, whatever the number of bars.
 * The context comes first and without fine lines. What is selected and hovered over adds `OVERLAY_DRAWS` at most.
 */
export function drawPlan(merged: MergedSteel, bay: string | null): readonly Draw[] {
  const all = {
    solids: { start: 0, count: merged.triangles.length },
    edges: { start: 0, count: merged.edges.length / 3 },
    fineEdges: { start: 0, count: merged.fineEdges.length / 3 },
  };
  const subject = bay === null ? all : merged.bays.get(bay);
  const context = (['solids', 'edges'] as const).flatMap((what): readonly Draw[] =>
    subject === undefined
      ? [{ what, as: 'context', range: all[what] }]
      : around(all[what], subject[what]).map((range) => ({ what, as: 'context', range })),
  );
  const front = (['solids', 'edges', 'fineEdges'] as const).flatMap((what): readonly Draw[] =>
    subject === undefined ? [] : [{ what, as: 'subject', range: subject[what] }],
  );
  return [...context, ...front].filter((draw) => draw.range.count > 0);
}

/** Halo, solids, edges and fine edges of the selected bar; the same of the bar under the pointer. */
export const OVERLAY_DRAWS = 8;

function around(all: Range, part: Range): readonly Range[] {
  const end = part.start + part.count;
  return [
    { start: all.start, count: part.start - all.start },
    { start: end, count: all.start + all.count - end },
  ];
}
