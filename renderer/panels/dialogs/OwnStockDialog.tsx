import { type JSX, useState } from 'react';
import type { OwnAngle } from '../../../core/catalogue/model.ts';
import { type OwnListProblem, readOwnList } from '../../../core/catalogue/ownList.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showLength } from '../../../core/units/quantity.ts';
import { shownSection } from '../../controls/figures.ts';
import { useServices, useWindow } from '../../shell/services.tsx';
import { presentProject } from '../../store/shown.ts';
import { DialogFrame } from './DialogFrame.tsx';

interface Imported {
  readonly name: string;
  readonly rows: readonly OwnAngle[];
  readonly problems: readonly OwnListProblem[];
}

/** The project's own angles: read from a file of dimensions, bad rows listed and kept out. */
export function OwnStockDialog(): JSX.Element {
  const { actions, host } = useServices();
  const own = useWindow((state) => presentProject(state).ownStock);
  const units = useWindow((state) => presentProject(state).settings.units);
  const trying = useWindow((state) => state.trying !== null);
  const [imported, setImported] = useState<Imported | null>(null);

  const read = async (): Promise<void> => {
    const picked = await host.importText(['csv', 'txt']);
    if (picked === null) return;
    if (!picked.ok) {
      actions.openDialog({ kind: 'host problem', doing: 'read the list', problem: picked.problem });
      return;
    }
    const { name, text } = picked.value;
    const list = readOwnList(text);
    setImported({ name, ...list });
    if (list.rows.length > 0)
      actions.edit(
        { kind: 'own stock', rows: merged(own, list.rows) },
        `Read ${name} into the own stock list`,
      );
  };

  return (
    <DialogFrame title="Own stock list" wide onClose={actions.closeDialog}>
      <p>
        Angles of your own, kept in the project so that its file stands alone; they come before those of the
        stock list. A file of comma-separated values needs the columns long leg and thickness; short leg,
        designation, root radius and toe radius may be there too. Lengths in mm.
      </p>
      <div className="stock-buttons">
        <button
          type="button"
          className="button main"
          data-first
          disabled={trying}
          onClick={() => void read()}
        >
          Read a file…
        </button>
        {own.length > 0 && (
          <button
            type="button"
            className="button"
            disabled={trying}
            onClick={() => actions.edit({ kind: 'own stock', rows: [] }, 'Empty the own stock list')}
          >
            Empty the list
          </button>
        )}
      </div>
      {imported !== null && <ImportResult imported={imported} />}
      {own.length === 0 ? (
        <p className="second">The list is empty.</p>
      ) : (
        <StockTable
          rows={own}
          units={units}
          disabled={trying}
          onRemove={(designation) =>
            actions.edit(
              { kind: 'own stock', rows: own.filter((row) => row.designation !== designation) },
              `Take ${designation} off the own stock list`,
            )
          }
        />
      )}
    </DialogFrame>
  );
}

function ImportResult({ imported }: { readonly imported: Imported }): JSX.Element {
  const { name, rows, problems } = imported;
  return (
    <div role="status">
      <p>
        {rows.length} {rows.length === 1 ? 'angle was' : 'angles were'} read from {name}
        {problems.length > 0 &&
          `, ${problems.length} ${problems.length === 1 ? 'row was' : 'rows were'} kept out`}
        .
      </p>
      {problems.length > 0 && (
        <ul className="problems" aria-label="Rows kept out">
          {problems.map(({ line, what }) => (
            <li key={`${line} ${what}`}>
              <code>line {line}</code> {what}
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}

interface StockTableProps {
  readonly rows: readonly OwnAngle[];
  readonly units: UnitSystem;
  readonly disabled: boolean;
  onRemove(designation: string): void;
}

function StockTable({ rows, units, disabled, onRemove }: StockTableProps): JSX.Element {
  const size = (mm: number): string => showLength(mm, units, 'small');
  return (
    <table className="stock-table" aria-label="Own angles">
      <thead>
        <tr>
          <th scope="col">Designation</th>
          <th scope="col">longer leg</th>
          <th scope="col">shorter leg</th>
          <th scope="col">thickness</th>
          <th scope="col">root radius</th>
          <th scope="col">toe radius</th>
          <th scope="col">
            <span className="unseen">Remove</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.designation}>
            <th scope="row">{shownSection(row.designation)}</th>
            <td>{size(row.longLeg)}</td>
            <td>{size(row.shortLeg)}</td>
            <td>{size(row.thickness)}</td>
            <td>{size(row.rootRadius)}</td>
            <td>{size(row.toeRadius)}</td>
            <td>
              <button
                type="button"
                className="link-button"
                disabled={disabled}
                aria-label={`Remove ${row.designation}`}
                onClick={() => onRemove(row.designation)}
              >
                Remove
              </button>
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** A row that is read again takes the place of the old one. */
function merged(own: readonly OwnAngle[], read: readonly OwnAngle[]): readonly OwnAngle[] {
  const fresh = new Set(read.map(({ designation }) => designation));
  return [...own.filter(({ designation }) => !fresh.has(designation)), ...read];
}
