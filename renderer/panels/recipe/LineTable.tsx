import type { JSX } from 'react';
import type { Line, LineHolder, UnitSystem } from '../../../core/project/model.ts';
import { IconButton } from '../../controls/IconButton.tsx';
import { LengthField } from '../../controls/LengthField.tsx';
import { TextField } from '../../controls/TextField.tsx';
import { CloseSign } from '../../glyphs/signs.tsx';
import { HolderField } from './HolderField.tsx';
import { withLineAdded, withLineChanged } from './tiers.ts';

interface LineTableProps {
  /** "Purlin" or "Rail". */
  readonly word: string;
  readonly letter: string;
  readonly lines: readonly Line[];
  readonly units: UnitSystem;
  /** Length of the slope or height of the wall, mm. */
  readonly total: number;
  readonly bay: string;
  onChange(lines: readonly Line[], what: string): string | null;
}

/** Purlins of a slope, or rails of a wall: where each lies, and what holds it along itself. */
export function LineTable({ word, letter, lines, units, total, bay, onChange }: LineTableProps): JSX.Element {
  const lower = word.toLowerCase();
  const setHolder = (line: Line, heldBy: LineHolder): string | null =>
    onChange(withLineChanged(lines, line.id, { heldBy }), `what holds ${line.id}`);
  return (
    <div className="lines">
      {lines.length > 0 && (
        <div className="lines-head" aria-hidden="true">
          <span>{word}</span>
          <span>at</span>
          <span>held along itself by</span>
        </div>
      )}
      {lines.map((line) => (
        <div key={line.id} className="line">
          <b>{line.id}</b>
          <LengthField
            bare
            label={`Place of ${line.id}`}
            mm={line.at}
            units={units}
            most={total}
            onChange={(at) => onChange(withLineChanged(lines, line.id, { at }), `place of ${line.id}`)}
          />
          <HolderField
            line={line.id}
            bay={bay}
            heldBy={line.heldBy}
            onChange={(heldBy) => setHolder(line, heldBy)}
          />
          <IconButton
            label={`Remove ${lower} ${line.id}`}
            onClick={() =>
              onChange(
                lines.filter(({ id }) => id !== line.id),
                `${lower}s`,
              )
            }
          >
            <CloseSign />
          </IconButton>
          {line.heldBy.kind === 'vouched' && (
            <div className="line-reason">
              <TextField
                bare
                label={`Why ${line.id} is held`}
                placeholder="why it is held: shown in every output"
                value={line.heldBy.reason}
                check={(text) => (text === '' ? 'Say what holds it: the checker will ask.' : null)}
                onChange={(reason) => setHolder(line, { kind: 'vouched', reason })}
              />
            </div>
          )}
        </div>
      ))}
      <div className="recipe-add">
        <button
          type="button"
          className="link-button"
          onClick={() => onChange(withLineAdded(lines, total, letter), `${lower}s`)}
        >
          Add a {lower}
        </button>
      </div>
    </div>
  );
}
