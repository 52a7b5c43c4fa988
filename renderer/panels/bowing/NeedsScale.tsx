import type { JSX } from 'react';
import type { HoldGrip } from '../../../core/bowing/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { StationNeed } from '../../../core/study/model.ts';
import { showStiffness } from '../../../core/units/loads.ts';
import { useSize } from '../../controls/useSize.ts';
import { stiffnessPart, TENS } from '../../glyphs/stiffnessScale.ts';

interface NeedsScaleProps {
  readonly hold: HoldGrip;
  readonly need: StationNeed | null;
  readonly units: UnitSystem;
}

const HEIGHT = 22;
const BAR = 9;

/** What one way offers, as a bar by tens, against the two needs: of the planar bar, and of this bar for 95 % and for all of its load. */
export function NeedsScale({ hold, need, units }: NeedsScaleProps): JSX.Element {
  const [ref, size] = useSize<HTMLDivElement>();
  const width = size?.width ?? 0;
  const x = (stiffness: number): number => 1 + stiffnessPart(stiffness) * (width - 2);
  const marks = marksOf(hold, need);
  return (
    <div className="needs">
      <div ref={ref} className="needs-bar">
        <svg width={width} height={HEIGHT} role="img" aria-label={spoken(hold, need, units)}>
          {width > 0 && (
            <>
              {TENS.map((ten) => (
                <path key={ten} className="needs-ten" d={`M${x(ten)} 0v${BAR + 3}`} />
              ))}
              <rect className="needs-trough" x="1" y="1" width={width - 2} height={BAR} />
              <rect
                className={hold.grip === null ? 'needs-offered left-out' : 'needs-offered'}
                x="1"
                y="1"
                width={Math.max(1, x(hold.offered) - 1)}
                height={BAR}
              />
              {marks.map(({ kind, stiffness }) => (
                <NeedMark key={kind} kind={kind} x={x(stiffness)} />
              ))}
            </>
          )}
        </svg>
      </div>
      <p className="needs-words">
        {marks.map(({ kind, stiffness, says }) => (
          <span key={kind}>
            <NeedSign kind={kind} /> {says} <b>{showStiffness(stiffness, units, 'bare')}</b>
          </span>
        ))}
      </p>
    </div>
  );
}

type NeedKind = 'ideal' | 'most' | 'all';

interface Mark {
  readonly kind: NeedKind;
  readonly stiffness: number;
  readonly says: string;
}

function marksOf(hold: HoldGrip, need: StationNeed | null): readonly Mark[] {
  return [
    { kind: 'ideal', stiffness: hold.ideal, says: 'full hold' },
    ...(need === null
      ? []
      : [{ kind: 'most', stiffness: need.needed.for95, says: 'for 95 %' } satisfies Mark]),
    ...(need?.needed.forAll == null
      ? []
      : [{ kind: 'all', stiffness: need.needed.forAll, says: 'for all' } satisfies Mark]),
  ];
}

function NeedMark({ kind, x }: { readonly kind: NeedKind; readonly x: number }): JSX.Element {
  return (
    <path
      className={`needs-mark ${kind}`}
      d={kind === 'ideal' ? `M${x} -2v${BAR + 6}` : `M${x} ${BAR + 4}l-3.5 6h7Z`}
    />
  );
}

function NeedSign({ kind }: { readonly kind: NeedKind }): JSX.Element {
  return (
    <svg className="glyph" width="8" height="9" viewBox="0 0 8 9" aria-hidden="true">
      <path className={`needs-mark ${kind}`} d={kind === 'ideal' ? 'M4 0v9' : 'M4 1 .8 7h6.4Z'} />
    </svg>
  );
}

function spoken(hold: HoldGrip, need: StationNeed | null, units: UnitSystem): string {
  const marks = marksOf(hold, need).map(
    ({ says, stiffness }) => `${says} ${showStiffness(stiffness, units)}`,
  );
  return `${hold.direction}: ${showStiffness(hold.offered, units)} offered; ${marks.join(', ')}`;
}
