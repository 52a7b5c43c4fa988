import { type JSX, useId } from 'react';
import type { UnitSystem } from '../../core/project/model.ts';
import {
  exactBehind,
  type LengthStyle,
  lengthProblemText,
  parseLength,
  showLength,
} from '../../core/units/quantity.ts';
import { Row } from './Row.tsx';
import { SteppedInput } from './SteppedInput.tsx';
import { type Reading, useDraft } from './useDraft.ts';

export interface LengthFieldProps {
  readonly label: string;
  readonly mm: number;
  readonly units: UnitSystem;
  /** Least and greatest allowed, mm; the least itself is allowed. */
  readonly least?: number;
  readonly most?: number;
  /** Of the arrow keys, mm; in US units the nearest inch or quarter inch. */
  readonly step?: number;
  /** For set-backs, gussets and gauges: inches without feet in US units. */
  readonly small?: boolean;
  /** Without a label beside it, inside a row or a table that names it. */
  readonly bare?: boolean;
  onChange(mm: number): string | null;
}

export function LengthField(props: LengthFieldProps): JSX.Element {
  const { label, mm, units, small = false, bare = false, onChange } = props;
  const id = useId();
  const messageId = `${id}-message`;
  const shown = shownLength(mm, units, small);
  const draft = useDraft(shown, (text) => readLength(text, props), onChange);
  const step = (steps: number): void => {
    if (draft.editing) draft.commit(false);
    const next = stepped(mm, steps, props);
    if (next !== mm) draft.refuse(onChange(next));
  };
  const input = (
    <SteppedInput
      id={id}
      {...(bare ? { name: label } : {})}
      draft={draft}
      unit={units === 'us' ? '' : 'mm'}
      value={mm}
      valueText={showLength(mm, units, small ? 'tape' : 'full')}
      title={units === 'us' ? exactBehind(mm, shown) : null}
      messageId={messageId}
      onStep={step}
    />
  );
  if (!bare)
    return (
      <Row label={label} htmlFor={id} message={draft.message} messageId={messageId}>
        {input}
      </Row>
    );
  return (
    <div className="bare-field">
      {input}
      {draft.message !== null && (
        <p className="row-message" id={messageId} role="alert">
          {draft.message}
        </p>
      )}
    </div>
  );
}

function shownLength(mm: number, units: UnitSystem, small: boolean): string {
  const style: LengthStyle = small ? 'tape' : 'bare';
  const text = showLength(mm, units, style);
  return units === 'metric' ? text.replace(/ ?mm$/, '') : text;
}

function readLength(text: string, { units, least = 0, most = 1e6 }: LengthFieldProps): Reading<number> {
  const parsed = parseLength(text, units);
  if (!parsed.ok) return { ok: false, message: lengthProblemText(parsed.problem, units) };
  if (parsed.mm < least) return { ok: false, message: `At least ${showLength(least, units)} is needed.` };
  if (parsed.mm > most) return { ok: false, message: `At most ${showLength(most, units)} makes sense here.` };
  return { ok: true, value: parsed.mm };
}

/** On whole steps, so that 6 030 goes to 6 100 and not to 6 130. */
function stepped(
  mm: number,
  steps: number,
  { units, step = 100, least = 0, most = 1e6 }: LengthFieldProps,
): number {
  const one = units === 'us' ? usStep(step) : step;
  const from = steps > 0 ? Math.floor(mm / one + 1e-9) : Math.ceil(mm / one - 1e-9);
  return Math.min(most, Math.max(least, (from + steps) * one));
}

const INCH = 25.4;

/** The US step nearest in spirit: 3 in for 100 mm, 1 in for 10 to 50 mm, a sixteenth for less. */
function usStep(step: number): number {
  if (step >= 100) return 3 * INCH;
  return step >= 10 ? INCH : INCH / 16;
}
