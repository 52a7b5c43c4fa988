import type { JSX } from 'react';
import type { OfferedStation } from '../../../core/bowing/model.ts';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showStiffness } from '../../../core/units/loads.ts';
import { seenSection } from '../card/sectionGeometry.ts';
import { StiffnessFigure } from './StiffnessFigure.tsx';

interface PushFigureProps {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly offered: OfferedStation;
  readonly label: string;
  readonly units: UnitSystem;
}

/** Beside the pushed place: what the framing offers there by itself, to be compared with the push, which bends the bar too. */
export function PushFigure({ bar, angle, offered, label, units }: PushFigureProps): JSX.Element | null {
  if (angle.stock === null) return null;
  const soft = offered.holds.reduce<number>((least, { offered: each }) => Math.min(least, each), Infinity);
  return (
    <figure className="push-figure">
      <StiffnessFigure
        name={`What ${label} offers ${bar.mark}`}
        offered={offered}
        seen={seenSection(bar, angle, angle.stock)}
        scale="tens"
        axis="soft"
        size={148}
        wanted={offered.holds
          .filter((hold) => hold.offered === soft)
          .map(({ ideal }) => ({ stiffness: ideal, kind: 'ideal' }))}
      />
      <figcaption>
        <b>
          {label} offers, {bar.mark} left out
        </b>
        {offered.holds.map((hold) => (
          <span key={hold.direction}>
            {hold.direction} {showStiffness(hold.offered, units)}
          </span>
        ))}
      </figcaption>
    </figure>
  );
}
