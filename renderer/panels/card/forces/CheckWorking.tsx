import type { JSX } from 'react';
import type { Check } from '../../../../core/checks/model.ts';
import { workingLines } from '../../../../core/documents/workingLines.ts';
import type { UnitSystem } from '../../../../core/project/model.ts';
import { showForce, showUse } from '../../../../core/units/loads.ts';
import { SymbolText } from './SymbolText.tsx';

interface CheckWorkingProps {
  readonly check: Check;
  readonly governs: boolean;
  /** Whether the bar is judged by it: of the rules for compression one is, the others stand beside it. */
  readonly judged: boolean;
  readonly units: UnitSystem;
}

/** One check: clause, how sure it is, each step with its values, what must hold for it. */
export function CheckWorking({ check, governs, judged, units }: CheckWorkingProps): JSX.Element {
  const { resistance, demand, utilisation } = check;
  const unmet = resistance.conditions.filter(({ met }) => !met);
  return (
    <section className="working" data-governs={governs || undefined} data-beside={!judged || undefined}>
      <div className="working-head">
        <b>
          {resistance.title}
          {resistance.end === null ? '' : `, end ${resistance.end}`}
        </b>
        <span className="working-tag">{resistance.confidence}</span>
      </div>
      <p className="working-clause">
        {resistance.standard} {resistance.clause}
        {!resistance.ownRule && ', borrowed'}
        {!judged && ' · for comparison'}
      </p>
      <table>
        <tbody>
          {workingLines(resistance, units).map((line) => (
            <tr key={`${line.symbol} ${line.name} ${line.result}`}>
              <th scope="row">{line.name}</th>
              <td className="working-formula">
                <SymbolText text={line.formula === null ? line.symbol : `${line.symbol} = ${line.formula}`} />
                {line.values !== null && (
                  <span className="working-values">
                    <SymbolText text={line.values} />
                  </span>
                )}
              </td>
              <td>{line.result}</td>
            </tr>
          ))}
          <tr className="working-end">
            <th scope="row">{utilisation === null ? 'used' : `used in ${demand?.name ?? ''}`}</th>
            <td className="working-formula">
              {demand !== null && resistance.resistance !== null
                ? `${showForce(demand.force, units)} / ${showForce(resistance.resistance, units)}`
                : ''}
            </td>
            <td>{showUse(utilisation)}</td>
          </tr>
        </tbody>
      </table>
      {unmet.map(({ says, found }) => (
        <p key={says} className="working-unmet">
          Not met: {says}
          {found === null || found === '' ? '' : ` (${found})`}.
        </p>
      ))}
      {resistance.note !== null && <p className="working-note">{resistance.note}</p>}
    </section>
  );
}
