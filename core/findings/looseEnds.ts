import type { BayLayout } from '../layout/model.ts';
import { looseNodes } from '../restraint/looseNodes.ts';
import { labelOf } from '../restraint/trails.ts';
import type { Finding } from './model.ts';
import { bayPath, type FindingSubject, isAre, type Judged, judgedIn, marksInWords } from './subject.ts';

/** More places than this are counted, not named. */
const NAMED = 4;

/**
 * Diagonals of a freely drawn bay that end at a node which is marked as no support and which nothing holds: no two bars from held places,
 * no bar that runs through. Of the other kinds of bay the framing is known, and what can move is found from it.
 */
export function looseEndFindings(subject: FindingSubject): readonly Finding[] {
  return subject.layout.bays.flatMap((bay) => (bay.kind === 'free' ? (looseEnds(subject, bay) ?? []) : []));
}

function looseEnds(subject: FindingSubject, bay: BayLayout): Finding | null {
  const nowhere = looseNodes(bay, subject.layout, subject.holdings);
  const isLoose = (node: string): boolean => nowhere.has(node);
  const loose = judgedIn(subject, bay).filter(({ bar }) => isLoose(bar.i) || isLoose(bar.j));
  if (loose.length === 0) return null;
  const nodes = [...new Set(loose.flatMap(({ bar }) => [bar.i, bar.j].filter(isLoose)))];
  return looseEnd(subject, bay, loose, nodes);
}

function looseEnd(
  subject: FindingSubject,
  bay: BayLayout,
  loose: readonly Judged[],
  nodes: readonly string[],
): Finding {
  const labels = nodes.slice(0, NAMED).map((node) => labelOf(subject.layout, node));
  const where =
    nodes.length > NAMED ? `${labels.join(', ')} and ${nodes.length - NAMED} more` : labels.join(', ');
  const one = loose.length === 1;
  return {
    id: `loose-ends:${bay.id}`,
    kind: 'end held by nothing',
    severity: 'must fix',
    breaksLimit: true,
    bay: bay.id,
    bars: loose.map(({ bar }) => bar.id),
    crossing: null,
    title: `${marksInWords(loose)} ${isAre(loose) === 'is' ? 'ends' : 'end'} where nothing holds: ${where}`,
    detail: `Lengths are taken between ends that stay in place, and nothing holds ${where}: no support is marked there, and no two bars lead from it to places that are held. So no figure of ${one ? 'this bar' : 'these bars'} stands. Draw what holds the place, or mark it as a support, which you then vouch for.`,
    value: null,
    limit: null,
    quantity: 'none',
    path: `${bayPath(subject, bay.id)}.recipe.nodes`,
  };
}
