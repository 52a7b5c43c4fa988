import type { JSX } from 'react';
import type { Load, LoadCase } from '../../../core/project/actions.ts';
import type { Project } from '../../../core/project/model.ts';
import { IconButton } from '../../controls/IconButton.tsx';
import { LengthField } from '../../controls/LengthField.tsx';
import { NumberField } from '../../controls/NumberField.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { CloseSign } from '../../glyphs/signs.tsx';
import { useActions } from '../../shell/services.tsx';
import { refusalText } from '../recipe/useRecipeEdit.ts';
import { loadUnits } from './loadUnits.ts';
import { usePlaces } from './usePlaces.ts';

interface LoadFieldsProps {
  readonly load: Load;
  readonly loadCase: LoadCase;
  readonly project: Project;
}

const AXES = ['X', 'Y', 'Z'] as const;

/** One load: what it acts on, and how much. Directions are those of the project, Z up. */
export function LoadFields({ load, loadCase, project }: LoadFieldsProps): JSX.Element {
  const actions = useActions();
  const { units } = project.settings;
  const places = usePlaces();
  const set = (changed: Load): string | null =>
    refusalText(actions.edit({ kind: 'load', loadCase: loadCase.id, id: load.id, load: changed }));
  const name = `${load.id} of ${loadCase.id}`;
  const { force, perLength, pressure } = loadUnits(units);
  const bays = (kind: 'roof' | 'wall') =>
    project.bays
      .filter((bay) => bay.recipe.kind === kind)
      .map((bay) => ({ value: bay.id, label: bay.name === '' ? bay.id : `${bay.id} ${bay.name}` }));
  const fields = (): JSX.Element => {
    switch (load.kind) {
      case 'node':
        return (
          <>
            <SelectField
              bare
              label={`Node of ${name}`}
              value={load.node}
              options={withOwn(places.nodes, load.node)}
              onChange={(node) => set({ ...load, node })}
            />
            {AXES.map((axis, k) => (
              <NumberField
                key={axis}
                bare
                label={`Force along ${axis} of ${name}, ${force.unit}`}
                unit={axis}
                value={(load.force[k] ?? 0) * force.shown}
                least={-100000}
                most={100000}
                step={force.step}
                decimals={2}
                onChange={(value) => set({ ...load, force: replaced(load.force, k, value / force.shown) })}
              />
            ))}
          </>
        );
      case 'line':
        return (
          <>
            <SelectField
              bare
              label={`Bar of ${name}`}
              value={load.bar}
              options={withOwn(places.members, load.bar)}
              onChange={(bar) => set({ ...load, bar })}
            />
            {AXES.map((axis, k) => (
              <NumberField
                key={axis}
                bare
                label={`Load along ${axis} of ${name}, ${perLength.unit}`}
                unit={axis}
                value={(load.perMetre[k] ?? 0) * perLength.shown}
                least={-10000}
                most={10000}
                step={perLength.step}
                decimals={3}
                onChange={(value) =>
                  set({ ...load, perMetre: replaced(load.perMetre, k, value / perLength.shown) })
                }
              />
            ))}
          </>
        );
      case 'shortened':
        return (
          <>
            <SelectField
              bare
              label={`Bar of ${name}`}
              value={load.bar}
              options={withOwn(places.diagonals, load.bar)}
              onChange={(bar) => set({ ...load, bar })}
            />
            <NumberField
              bare
              label={`Shorter than its place, ${name}, mm`}
              unit="mm short"
              value={load.by}
              least={-200}
              most={200}
              step={0.5}
              decimals={2}
              onChange={(by) => set({ ...load, by })}
            />
          </>
        );
      case 'gable':
        return (
          <>
            <SelectField
              bare
              label={`Roof bay of ${name}`}
              value={load.bay}
              options={withOwn(bays('roof'), load.bay)}
              onChange={(bay) => set({ ...load, bay })}
            />
            <NumberField
              bare
              label={`Pressure of ${name}, ${pressure.unit}`}
              unit={pressure.unit}
              value={load.pressure * pressure.shown}
              least={-50 * pressure.shown}
              most={50 * pressure.shown}
              step={pressure.step}
              decimals={pressure.decimals}
              onChange={(value) => set({ ...load, pressure: value / pressure.shown })}
            />
            <SelectField
              bare
              label={`Rafter of ${name}`}
              value={String(load.rafter)}
              options={[
                { value: '1', label: 'on rafter 1' },
                { value: '2', label: 'on rafter 2' },
              ]}
              onChange={(rafter) => set({ ...load, rafter: rafter === '2' ? 2 : 1 })}
            />
            <LengthField
              bare
              label={`Ground level of ${name}`}
              mm={load.ground}
              units={units}
              least={-1000000}
              most={1000000}
              onChange={(ground) => set({ ...load, ground })}
            />
          </>
        );
      case 'side':
        return (
          <>
            <SelectField
              bare
              label={`Wall bay of ${name}`}
              value={load.bay}
              options={withOwn(bays('wall'), load.bay)}
              onChange={(bay) => set({ ...load, bay })}
            />
            <NumberField
              bare
              label={`Pressure of ${name}, ${pressure.unit}`}
              unit={pressure.unit}
              value={load.pressure * pressure.shown}
              least={-50 * pressure.shown}
              most={50 * pressure.shown}
              step={pressure.step}
              decimals={pressure.decimals}
              onChange={(value) => set({ ...load, pressure: value / pressure.shown })}
            />
            <LengthField
              bare
              label={`Width of wall of ${name}`}
              mm={load.width}
              units={units}
              most={1000000}
              onChange={(width) => set({ ...load, width })}
            />
          </>
        );
      default:
        return load satisfies never;
    }
  };
  return (
    <li className="load" data-kind={load.kind}>
      <span className="load-word">
        {WORDS[load.kind]}
        {load.kind === 'node' && <small>{force.unit}</small>}
        {load.kind === 'line' && <small>{perLength.unit}</small>}
      </span>
      {fields()}
      <IconButton
        label={`Remove load ${name}`}
        onClick={() => actions.edit({ kind: 'load', loadCase: loadCase.id, id: load.id, load: null })}
      >
        <CloseSign />
      </IconButton>
    </li>
  );
}

const WORDS: Readonly<Record<Load['kind'], string>> = {
  node: 'force on',
  line: 'along',
  shortened: 'draws tight',
  gable: 'gable at',
  side: 'wall at',
};

/** A place that is not there any more stays in the list, so that nothing changes unasked. */
const withOwn = (
  options: readonly { readonly value: string; readonly label: string }[],
  own: string,
): readonly { readonly value: string; readonly label: string }[] =>
  options.some(({ value }) => value === own)
    ? options
    : [{ value: own, label: `${own} (not there)` }, ...options];

function replaced(
  [x, y, z]: readonly [number, number, number],
  k: number,
  value: number,
): readonly [number, number, number] {
  return [k === 0 ? value : x, k === 1 ? value : y, k === 2 ? value : z];
}
