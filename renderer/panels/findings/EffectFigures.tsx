import type { JSX } from 'react';
import type { Finding } from '../../../core/findings/model.ts';
import type { RemedyEffect } from '../../../core/remedies/model.ts';
import { showSlenderness } from '../../../core/units/quantity.ts';
import { NearnessChip } from '../../glyphs/NearnessChip.tsx';
import { ArrowSign } from '../../glyphs/signs.tsx';

/** What a remedy is predicted to do: slenderness before and after, or that it closes the finding. */
export function EffectFigures({
  effect,
  finding,
}: {
  readonly effect: RemedyEffect;
  readonly finding: Finding;
}): JSX.Element {
  const { before, after, limit, answers, opens } = effect;
  const isSlenderness =
    finding.quantity === 'slenderness' && before !== null && after !== null && limit !== null;
  const more = opens.length > 0 ? `, opens ${opens.length}` : '';
  if (!isSlenderness)
    return (
      <span className="effect effect-words">{answers ? `closes it${more}` : `does not close it${more}`}</span>
    );
  return (
    <span className="effect">
      <span className="effect-before">{showSlenderness(before, limit)}</span>
      <ArrowSign />
      <NearnessChip ratio={after / limit} />
      <span>{showSlenderness(after, limit)}</span>
      {opens.length > 0 && (
        <span
          className="effect-opens"
          title={`Opens ${opens.length} other ${opens.length === 1 ? 'finding' : 'findings'}`}
        >
          +{opens.length}
          <span className="unseen"> findings opened</span>
        </span>
      )}
    </span>
  );
}
