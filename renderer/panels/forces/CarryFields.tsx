import type { JSX } from 'react';
import type { Carry } from '../../../core/project/actions.ts';
import type { Project } from '../../../core/project/model.ts';
import { SelectField } from '../../controls/SelectField.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { shownAssessment } from '../../store/shown.ts';

/** Which wall bay takes what a roof bay's eaves push with, for eaves that no wall bay shares. */
export function CarryFields({ project }: { readonly project: Project }): JSX.Element | null {
  const actions = useActions();
  const layout = useWindow((state) => shownAssessment(state)?.layout ?? null);
  const walls = project.bays.filter(({ recipe }) => recipe.kind === 'wall');
  const open = project.bays.flatMap((bay) => {
    if (bay.recipe.kind !== 'roof') return [];
    const laid = layout?.bays.find(({ id }) => id === bay.id);
    return bay.recipe.slopes.flatMap((slope, k) => {
      const node = laid?.nodeOf.get(`${slope.id}.L0`);
      const shared = layout?.bays.some(
        (other) => other.kind !== 'roof' && node !== undefined && other.nodes.includes(node),
      );
      return shared ? [] : [{ bay: bay.id, eaves: (k === 0 ? 1 : 2) as Carry['eaves'] }];
    });
  });
  if (open.length === 0 || walls.length === 0) return null;
  return (
    <section className="case" aria-label="Handed on">
      <h3>Handed on by eaves that stand on nothing drawn</h3>
      {open.map(({ bay, eaves }) => {
        const to =
          project.actions?.carries.find((carry) => carry.from === bay && carry.eaves === eaves)?.to ?? '';
        return (
          <SelectField
            key={`${bay} ${eaves}`}
            label={`${bay}, ${eaves === 1 ? 'first' : 'second'} eaves`}
            value={to}
            options={[
              { value: '', label: 'to the ground' },
              ...walls.map(({ id, name }) => ({ value: id, label: `to ${id} ${name}` })),
            ]}
            onChange={(chosen) =>
              actions.edit({ kind: 'carry', from: bay, eaves, to: chosen === '' ? null : chosen })
            }
          />
        );
      })}
    </section>
  );
}
