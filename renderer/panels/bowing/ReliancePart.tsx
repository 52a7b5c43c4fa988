import type { JSX } from 'react';
import type { Assessment } from '../../../core/assessment.ts';
import type { Bar } from '../../../core/layout/model.ts';
import type { Reliance } from '../../../core/study/model.ts';
import { showSlenderness } from '../../../core/units/quantity.ts';
import { JoinGlyph } from '../../glyphs/JoinGlyph.tsx';
import { NearnessChip } from '../../glyphs/NearnessChip.tsx';
import { ArrowSign } from '../../glyphs/signs.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { latestReliance } from '../../store/closer.ts';
import type { Trial } from '../../store/trying.ts';
import { TryButton } from '../findings/TryButton.tsx';

/** Each join of the bay by what it costs to leave it out, worst first, to be taken away on trial. */
export function ReliancePart({
  bar,
  assessment,
}: {
  readonly bar: Bar;
  readonly assessment: Assessment;
}): JSX.Element {
  const list = useWindow(latestReliance);
  const base = useWindow((state) => state.assessing.base?.assessment ?? assessment);
  return (
    <section className="bowing-part bowing-reliance" aria-label={`What ${bar.bay} leans on`}>
      <div className="bowing-head">
        <h3>What {bar.bay} leans on</h3>
        <span className="bowing-note">if it is missing</span>
      </div>
      {list === null ? (
        <p className="bowing-none" role="status">
          Taking each join away in turn…
        </p>
      ) : list.length === 0 ? (
        <p className="bowing-none">No join of {bar.bay} holds anything.</p>
      ) : (
        <ol className="reliance">
          {list.map((each) => (
            <RelianceRow key={each.crossing} reliance={each} chosen={bar} base={base} />
          ))}
        </ol>
      )}
    </section>
  );
}

interface RelianceRowProps {
  readonly reliance: Reliance;
  readonly chosen: Bar;
  readonly base: Assessment;
}

function RelianceRow({ reliance, chosen, base }: RelianceRowProps): JSX.Element {
  const actions = useActions();
  const selected = useWindow((state) => state.selection.crossing === reliance.crossing);
  const { before, after, limit, opens } = reliance;
  const crossing = base.layout.crossings.get(reliance.crossing);
  const mark = base.layout.bars.get(reliance.bar)?.mark ?? reliance.bar;
  const name = `Take ${reliance.says.split(',')[0]} away`;
  return (
    <li className="reliance-row" data-chosen={selected || undefined}>
      <JoinGlyph join={crossing?.join?.kind ?? 'unmarked'} />
      <span>
        <button
          type="button"
          className="reliance-words"
          onClick={() => actions.selectCrossing(reliance.crossing)}
        >
          {reliance.says}
        </button>
        <span className="reliance-figures">
          <span>{mark}</span>
          <span className="effect-before">{showSlenderness(before, limit)}</span>
          <ArrowSign />
          <NearnessChip ratio={after / limit} />
          <b>{showSlenderness(after, limit)}</b>
          {opens.length > 0 && (
            <span
              className="effect-opens"
              title={`Opens ${opens.length} ${opens.length === 1 ? 'finding' : 'findings'}`}
            >
              +{opens.length}
              <span className="unseen"> findings opened</span>
            </span>
          )}
        </span>
      </span>
      <TryButton name={name} id={trialId(reliance)} trial={() => withoutJoin(reliance, name, chosen, base)} />
    </li>
  );
}

const trialId = ({ crossing }: Reliance): string => `without ${crossing}`;

/** The join taken away on trial, read on the chosen bar when it is one of the two, else on the one that loses most. */
function withoutJoin(reliance: Reliance, label: string, chosen: Bar, base: Assessment): Trial {
  const crossing = base.layout.crossings.get(reliance.crossing);
  const passes = crossing?.a === chosen.id || crossing?.b === chosen.id;
  return {
    id: trialId(reliance),
    label,
    where: '',
    edits: [{ kind: 'join', crossings: [reliance.crossing], join: { kind: 'none' } }],
    bar: passes ? chosen.id : reliance.bar,
  };
}
