/** Answers at the nodes of a freely drawn bay. */
import type { Assessment } from '../assessment.ts';
import type { Finding } from '../findings/model.ts';
import { holdingsOf } from '../restraint/heldNodes.ts';
import { looseNodes } from '../restraint/looseNodes.ts';
import { barsOf } from './places.ts';
import type { Proposal } from './proposal.ts';

/** The ends that nothing holds become supports, which the user vouches for. */
export function vouchForTheNodes(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const bay = assessment.project.bays.find(({ id }) => id === finding.bay);
  if (bay?.recipe.kind !== 'free') return [];
  const { recipe } = bay;
  const { layout } = assessment;
  const laidOut = layout.bays.find(({ id }) => id === bay.id);
  if (!laidOut) return [];
  const loose = looseNodes(laidOut, layout, holdingsOf(layout));
  const ends = new Set(barsOf(assessment, finding.bars).flatMap(({ i, j }) => [i, j]));
  const free = recipe.nodes.filter(({ id }) => {
    const node = laidOut.nodeOf.get(id);
    return node !== undefined && loose.has(node) && ends.has(node);
  });
  return [
    {
      label: free.length === 1 ? `Mark node ${free[0]?.id} as a support` : 'Mark these nodes as supports',
      detail: 'you vouch that something holds it',
      edits: [
        {
          kind: 'recipe',
          bay: bay.id,
          what: 'supports',
          recipe: {
            ...recipe,
            nodes: recipe.nodes.map((node) => (free.includes(node) ? { ...node, support: true } : node)),
          },
        },
      ],
    },
  ];
}
