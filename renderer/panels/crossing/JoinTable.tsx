import { type JSX, useId } from 'react';
import type { BarId, Crossing } from '../../../core/layout/model.ts';
import { JOIN_NAMES } from '../../../core/project/joinNames.ts';
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
    <div className="joins" role="radiogroup" aria-label="Join" data-twist={twist || undefined}>
      <div className="joins-head" aria-hidden="true">
        <span>{crossing.join === null ? 'unmarked, taken as not joined' : 'join'}</span>
        <span>in plane</span>
        <span>out of plane</span>
        {twist && <span>twist</span>}
        <span>{readMark} reads</span>
      </div>
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
    </div>
  );
}

interface JoinRowProps extends JoinTableProps {
  readonly kind: JoinKind;
  readonly group: string;
  readonly reading: JoinReading | null;
  readonly bar: BarReading | null;
  readonly twist: boolean;
}

function JoinRow(props: JoinRowProps): JSX.Element {
  const { kind, group, crossing, reading, bar, readMark, twist, units, onJoin } = props;
  const id = useId();
  const reads = bar?.slenderness == null ? null : showSlenderness(bar.slenderness, bar.limit);
  const built = howBuilt(kind, crossing, units);
  return (
    <label className="join-row">
      <input
        className="unseen"
        type="radio"
        name={group}
        checked={crossing.join?.kind === kind}
        disabled={reading === null}
        aria-label={JOIN_NAMES[kind]}
        aria-describedby={id}
        onChange={() => {
          if (reading !== null) onJoin(reading.join);
        }}
      />
      <JoinGlyph join={kind} />
      <span className="join-name">
        {JOIN_NAMES[kind]}
        <em>{built}</em>
      </span>
      {bar === null ? <span /> : <HoldMark hold={bar.inPlane} />}
      {bar === null ? <span /> : <HoldMark hold={bar.outOfPlane} />}
      {twist && (bar === null ? <span /> : <HoldMark hold={bar.twist} />)}
      <span className="joins-reads" data-over={bar?.status === 'over' || undefined}>
        {reads ?? '…'}
      </span>
      <span id={id} className="unseen">
        {bar === null
          ? built
          : `${built}; in plane ${spoken(bar.inPlane)}, out of plane ${spoken(bar.outOfPlane)}; ${readMark} would read ${reads ?? 'nothing'}`}
      </span>
    </label>
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
