import type { JSX } from 'react';
import type { ForceState } from '../../../core/forces/model.ts';
import type { BarId } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showForce } from '../../../core/units/loads.ts';
import { ForceGlyph } from './ForceGlyph.tsx';

interface ForceCellProps {
  readonly states: readonly ForceState[];
  readonly bar: BarId;
  readonly units: UnitSystem;
}

/** Below this, N, a force is arithmetic. */
const NOTHING = 1;

/** Greatest force of a bar in the given states: pulled, squeezed, slack or nothing; a sign, a figure and words for those who do not see it. */
export function ForceCell({ states, bar, units }: ForceCellProps): JSX.Element {
  const known = states.filter(({ forces }) => forces.has(bar));
  if (known.length === 0) return <>–</>;
  const force = known.reduce((most, { forces }) => {
    const each = forces.get(bar) ?? 0;
    return Math.abs(each) > Math.abs(most) ? each : most;
  }, 0);
  if (Math.abs(force) < NOTHING && known.every(({ slack }) => slack.has(bar)))
    return (
      <span className="force slack">
        <ForceGlyph kind="slack" /> slack
      </span>
    );
  if (Math.abs(force) < NOTHING) return <span className="force">0</span>;
  const kind = force > 0 ? 'pulled' : 'squeezed';
  return (
    <span className="force">
      <ForceGlyph kind={kind} />
      <span className="unseen">{kind} </span>
      {showForce(Math.abs(force), units, 'bare')}
    </span>
  );
}
