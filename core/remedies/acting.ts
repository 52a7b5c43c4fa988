/** Answers to what the loads show. */
import type { Assessment } from '../assessment.ts';
import type { Finding } from '../findings/model.ts';
import type { Proposal } from './proposal.ts';

/** Takes away the load, or the carry, that the finding's path names. */
export function takeAway(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const { actions } = assessment.project;
  const load = /^actions\.cases\[(\d+)\]\.loads\[(\d+)\]$/.exec(finding.path ?? '');
  const loadCase = actions?.cases[Number(load?.[1])];
  const named = loadCase?.loads[Number(load?.[2])];
  if (loadCase && named)
    return [
      {
        label: 'Take the load away',
        detail: `out of ${loadCase.name || loadCase.id}`,
        edits: [{ kind: 'load', loadCase: loadCase.id, id: named.id, load: null }],
      },
    ];
  const factor = /^actions\.combinations\[(\d+)\]\.factors\.(.+)$/.exec(finding.path ?? '');
  const combination = actions?.combinations[Number(factor?.[1])];
  if (actions && combination && factor?.[2] !== undefined) {
    const { [factor[2]]: _idle, ...factors } = combination.factors;
    return [
      {
        label: 'Take the factor away',
        detail: `${factor[2]} out of ${combination.id}`,
        edits: [
          {
            kind: 'combinations',
            combinations: actions.combinations.map((each) =>
              each === combination ? { ...each, factors } : each,
            ),
          },
        ],
      },
    ];
  }
  const carry = actions?.carries[Number(/^actions\.carries\[(\d+)\]$/.exec(finding.path ?? '')?.[1])];
  return carry
    ? [
        {
          label: 'Carry nothing on',
          detail: `the eaves of ${carry.from} then hand their forces to the ground`,
          edits: [{ kind: 'carry', from: carry.from, eaves: carry.eaves, to: null }],
        },
      ]
    : [];
}
