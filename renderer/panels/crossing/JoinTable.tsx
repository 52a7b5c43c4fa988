import { type JSX, useId } from 'react';
import { JOIN_NAMES } from '../../../core/documents/words.ts';
import type { BarId, Crossing } from '../../../core/layout/model.ts';
import type { Join, JoinKind, UnitSystem } from '../../../core/project/model.ts';
import { showSlenderness } from '../../../core/units/quantity.ts';
import type { BarReading, HoldReading, JoinReading } from '../../assessing/assessApi.ts';
import { JoinGlyph } from '../../glyphs/JoinGlyph.tsx';
import { LookSign, TickSign } from '../../glyphs/signs.tsx';
import { howBuilt } from './joinWords.ts';

interface JoinTableProps {
  readonly crossing: Crossing;
  readonly readings: readonly JoinReading[] | null;
  /** The bar whose slenderness is told. */
  readonly readBar: BarId;
  readonly readMark: string;
  readonly units: UnitSystem;
  onJoin(join: Join): void;
}

/** The joins that make sense here, one to be chosen, each with what it holds and what the bar would read. */
export function JoinTable(props: JoinTableProps): JSX.Element {
  const { crossing, readings, readBar, readMark } = props;
  const name = useId();
  const twist = (readings ?? []).some(({ bars }) => bars.some((bar) => bar.twist === 'held'));
  return (
    <table className="joins" role="radiogroup" aria-label="Join">
      <thead>
        <tr role="presentation">
          <th className="joins-name" role="presentation">
            {crossing.join === null ? 'unmarked, taken as not joined' : 'join'}
          </th>
          <th role="presentation">in plane</th>
          <th role="presentation">out of plane</th>
          {twist && <th role="presentation">twist</th>}
          <th role="presentation">{readMark} reads</th>
        </tr>
      </thead>
      <tbody role="presentation">
        {crossing.choices.map((kind) => {
          const reading = readings?.find(({ join }) => join.kind === kind) ?? null;
          return (
            <JoinRow
              key={kind}
              {...props}
              kind={kind}
              group={name}
              reading={reading}
              bar={reading?.bars.find(({ bar }) => bar === readBar) ?? null}
              twist={twist}
            />
          );
        })}
      </tbody>
    </table>
  );
}

interface JoinRowProps extends JoinTableProps {
  readonly kind: JoinKind;
  readonly group: string;
  readonly reading: JoinReading | null;
  readonly bar: BarReading | null;
  readonly twist: boolean;
}

function JoinRow({
  kind,
  group,
  crossing,
  reading,
  bar,
  readMark,
  twist,
  units,
  onJoin,
}: JoinRowProps): JSX.Element {
  const id = useId();
  const chosen = crossing.join?.kind === kind;
  const reads = bar?.slenderness == null ? null : showSlenderness(bar.slenderness, bar.limit);
  return (
    <tr data-chosen={chosen || undefined} role="presentation">
      <td className="joins-name" role="presentation">
        <input
          id={id}
          className="unseen"
          type="radio"
          name={group}
          checked={chosen}
          disabled={reading === null}
          aria-label={JOIN_NAMES[kind]}
          aria-describedby={`${id}-says`}
          onChange={() => {
            if (reading !== null) onJoin(reading.join);
          }}
        />
        <label htmlFor={id}>
          <JoinGlyph join={kind} />
          <span>
            {JOIN_NAMES[kind]}
            <em>{howBuilt(kind, crossing, units)}</em>
          </span>
        </label>
        <span id={`${id}-says`} className="unseen">
          {bar === null
            ? ''
            : `${howBuilt(kind, crossing, units)}; in plane ${spoken(bar.inPlane)}, out of plane ${spoken(bar.outOfPlane)}; ${readMark} would read ${reads ?? 'nothing'}`}
        </span>
      </td>
      <td role="presentation">{bar !== null && <HoldMark hold={bar.inPlane} />}</td>
      <td role="presentation">{bar !== null && <HoldMark hold={bar.outOfPlane} />}</td>
      {twist && <td role="presentation">{bar !== null && <HoldMark hold={bar.twist} />}</td>}
      <td role="presentation" className="joins-reads" data-over={bar?.status === 'over' || undefined}>
        {reads ?? '…'}
      </td>
    </tr>
  );
}

function HoldMark({ hold }: { readonly hold: HoldReading }): JSX.Element {
  switch (hold) {
    case 'held':
      return <TickSign />;
    case 'claimed':
      return (
        <span title="Claimed, but it does not count: what would hold is itself free">
          <LookSign />
        </span>
      );
    case 'nothing':
      return <span className="second">–</span>;
    default:
      return hold satisfies never;
  }
}

function spoken(hold: HoldReading): string {
  return hold === 'claimed' ? 'claimed but not counted' : hold === 'held' ? 'held' : 'not held';
}
