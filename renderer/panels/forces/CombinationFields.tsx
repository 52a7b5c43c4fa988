import type { JSX } from 'react';
import { LEANING } from '../../../core/forces/leaning.ts';
import { combinationSet, startingCombinations } from '../../../core/forces/startingCombinations.ts';
import { practiceFor } from '../../../core/practice/practices.ts';
import { type Combination, NO_ACTIONS } from '../../../core/project/actions.ts';
import type { Project } from '../../../core/project/model.ts';
import { IconButton } from '../../controls/IconButton.tsx';
import { NumberField } from '../../controls/NumberField.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { CloseSign } from '../../glyphs/signs.tsx';
import { useActions } from '../../shell/services.tsx';
import { refusalText } from '../recipe/useRecipeEdit.ts';
import { freshId } from './freshId.ts';

/** Combinations as a grid: one row each, one factor a case. */
export function CombinationFields({ project }: { readonly project: Project }): JSX.Element {
  const actions = useActions();
  const { cases, combinations } = project.actions ?? NO_ACTIONS;
  const set = combinationSet(project.settings.practice, project.settings.resistance?.method);
  const leaning = LEANING[project.settings.practice];
  const edit = (combination: Combination, change: Partial<Combination>): string | null =>
    refusalText(
      actions.edit({ kind: 'combination', id: combination.id, combination: { ...combination, ...change } }),
    );
  const add = (): void => {
    const id = freshId(
      'C1',
      combinations.map((each) => each.id),
    ).replace(/^C1(?=\d)/, 'C');
    const factors = Object.fromEntries(cases.map((each) => [each.id, 1]));
    actions.edit({
      kind: 'combination',
      id,
      combination: { id, name: '', use: 'strength', factors, leaning: true },
    });
  };
  return (
    <section className="loads-combinations" aria-label="Combinations">
      <div className="loads-head">
        <h3>Combinations</h3>
        <span className="loads-add">
          <button type="button" className="link-button" onClick={add} disabled={cases.length === 0}>
            Add one
          </button>
          <button
            type="button"
            className="button"
            disabled={cases.length === 0}
            onClick={() =>
              actions.edit(
                { kind: 'combinations', combinations: startingCombinations(set, cases) },
                'Take the practice’s combinations',
              )
            }
          >
            Take those of {practiceFor(project.settings.practice).name}
          </button>
        </span>
      </div>
      <p className="second">
        Factors of {set.source} <span className="verify">({set.confidence})</span>. Out of plumb:{' '}
        {leaning.share} of the vertical loads, {leaning.clause}{' '}
        <span className="verify">({leaning.confidence})</span>. Every case that acts either way is turned
        round in every combination.
      </p>
      {combinations.length > 0 && (
        <table className="factors">
          <thead>
            <tr>
              <th className="l">Combination</th>
              <th className="l">for</th>
              {cases.map(({ id, name }) => (
                <th key={id} title={name}>
                  {id}
                </th>
              ))}
              <th>out of plumb</th>
              <th>
                <span className="unseen">Remove</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {combinations.map((combination) => (
              <tr key={combination.id}>
                <th scope="row" className="l">
                  {combination.id}
                </th>
                <td>
                  <SelectField
                    bare
                    label={`Use of ${combination.id}`}
                    value={combination.use}
                    options={[
                      { value: 'strength', label: 'strength' },
                      { value: 'service', label: 'service' },
                    ]}
                    onChange={(use) => edit(combination, { use })}
                  />
                </td>
                {cases.map(({ id }) => (
                  <td key={id}>
                    <NumberField
                      bare
                      label={`Factor of ${id} in ${combination.id}`}
                      value={combination.factors[id] ?? 0}
                      least={-20}
                      most={20}
                      step={0.1}
                      decimals={2}
                      onChange={(factor) =>
                        edit(combination, { factors: { ...combination.factors, [id]: factor } })
                      }
                    />
                  </td>
                ))}
                <td className="factor-check">
                  <input
                    type="checkbox"
                    aria-label={`Out of plumb in ${combination.id}`}
                    checked={combination.leaning}
                    onChange={(event) => edit(combination, { leaning: event.target.checked })}
                  />
                </td>
                <td>
                  <IconButton
                    label={`Remove combination ${combination.id}`}
                    onClick={() =>
                      actions.edit({ kind: 'combination', id: combination.id, combination: null })
                    }
                  >
                    <CloseSign />
                  </IconButton>
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </section>
  );
}
