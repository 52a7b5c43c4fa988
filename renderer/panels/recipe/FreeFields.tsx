import type { JSX } from 'react';
import type { Bay, FreeBar, FreeNode, FreeRecipe, UnitSystem } from '../../../core/project/model.ts';
import { firstMember } from '../../../core/project/newBay.ts';
import { IconButton } from '../../controls/IconButton.tsx';
import { LengthField } from '../../controls/LengthField.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { CloseSign } from '../../glyphs/signs.tsx';
import { FreeMembers } from './FreeMembers.tsx';
import { ROLES } from './roles.ts';
import { freeId } from './tiers.ts';
import { useRecipeEdit } from './useRecipeEdit.ts';

interface FieldsProps {
  readonly bay: Bay;
  readonly recipe: FreeRecipe;
  readonly units: UnitSystem;
}

/** Nodes by their coordinates in the bay's own axes, and bars between them. */
export function FreeFields({ bay, recipe, units }: FieldsProps): JSX.Element {
  return (
    <>
      <NodeTable bay={bay} recipe={recipe} units={units} />
      <BarTable bay={bay} recipe={recipe} units={units} />
      <FreeMembers bay={bay} recipe={recipe} units={units} />
    </>
  );
}

const COORDINATES = ['X', 'Y', 'Z'] as const;

function NodeTable({ bay, recipe, units }: FieldsProps): JSX.Element {
  const edit = useRecipeEdit<FreeRecipe>(bay);
  const setNode = (node: FreeNode, what: string): string | null =>
    edit({ ...recipe, nodes: recipe.nodes.map((each) => (each.id === node.id ? node : each)) }, what);
  const setAt = (node: FreeNode, index: number, mm: number): string | null => {
    const at = node.at.map((old, place) => (place === index ? mm : old));
    const [x = 0, y = 0, z = 0] = at;
    return setNode({ ...node, at: [x, y, z] }, `node ${node.id}`);
  };
  const isUsed = (id: string): boolean => recipe.bars.some(({ from, to }) => from === id || to === id);
  return (
    <div className="free">
      <div className="free-head free-node" aria-hidden="true">
        <span>Node</span>
        {COORDINATES.map((name) => (
          <span key={name}>{name}</span>
        ))}
        <span>held</span>
        <span />
      </div>
      {recipe.nodes.map((node) => (
        <div key={node.id} className="free-node">
          <b>{node.id}</b>
          {COORDINATES.map((name, index) => (
            <LengthField
              key={name}
              bare
              label={`${name} of ${node.id}`}
              mm={node.at[index] ?? 0}
              units={units}
              least={-1e6}
              onChange={(mm) => setAt(node, index, mm)}
            />
          ))}
          <input
            className="pick"
            type="checkbox"
            aria-label={`${node.id} is held in place`}
            checked={node.support}
            onChange={(event) => setNode({ ...node, support: event.target.checked }, `node ${node.id}`)}
          />
          <IconButton
            label={`Remove ${node.id}`}
            tip={isUsed(node.id) ? 'A bar ends here: remove the bar first' : `Remove ${node.id}`}
            disabled={isUsed(node.id)}
            onClick={() =>
              edit({ ...recipe, nodes: recipe.nodes.filter(({ id }) => id !== node.id) }, 'nodes')
            }
          >
            <CloseSign />
          </IconButton>
        </div>
      ))}
      <div className="recipe-add">
        <button
          type="button"
          className="link-button"
          onClick={() => edit({ ...recipe, nodes: [...recipe.nodes, nodeBeside(recipe.nodes)] }, 'nodes')}
        >
          Add a node
        </button>
      </div>
    </div>
  );
}

function BarTable({ bay, recipe }: FieldsProps): JSX.Element {
  const edit = useRecipeEdit<FreeRecipe>(bay);
  const nodes = recipe.nodes.map(({ id }) => ({ value: id, label: id }));
  const setBar = (bar: FreeBar): string | null =>
    edit({ ...recipe, bars: recipe.bars.map((each) => (each.id === bar.id ? bar : each)) }, `bar ${bar.id}`);
  const [first, second] = recipe.nodes;
  return (
    <div className="free">
      <div className="free-head free-bar" aria-hidden="true">
        <span>Bar</span>
        <span>from</span>
        <span>to</span>
        <span>is a</span>
        <span />
      </div>
      {recipe.bars.map((bar) => (
        <div key={bar.id} className="free-bar">
          <b>{bar.id}</b>
          <SelectField
            bare
            label={`Start of ${bar.id}`}
            value={bar.from}
            options={nodes.filter(({ value }) => value !== bar.to)}
            onChange={(from) => setBar({ ...bar, from })}
          />
          <SelectField
            bare
            label={`End of ${bar.id}`}
            value={bar.to}
            options={nodes.filter(({ value }) => value !== bar.from)}
            onChange={(to) => setBar({ ...bar, to })}
          />
          <SelectField
            bare
            label={`Kind of ${bar.id}`}
            value={bar.role}
            options={ROLES}
            onChange={(role) => setBar({ ...bar, role, member: firstMember(role) })}
          />
          <IconButton
            label={`Remove ${bar.id}`}
            onClick={() => edit({ ...recipe, bars: recipe.bars.filter(({ id }) => id !== bar.id) }, 'bars')}
          >
            <CloseSign />
          </IconButton>
        </div>
      ))}
      <div className="recipe-add">
        <button
          type="button"
          className="link-button"
          disabled={first === undefined || second === undefined}
          onClick={() => {
            if (first === undefined || second === undefined) return;
            const [from, to] = unjoined(recipe) ?? [first.id, second.id];
            const bar: FreeBar = { id: freeId(recipe.bars, 'b'), from, to, role: 'diagonal', member: null };
            edit({ ...recipe, bars: [...recipe.bars, bar] }, 'bars');
          }}
        >
          Add a bar
        </button>
      </div>
    </div>
  );
}

/** A new node beside the last, where it coincides with none. */
function nodeBeside(nodes: readonly FreeNode[]): FreeNode {
  const last = nodes.at(-1)?.at ?? [0, 0, 0];
  return { id: freeId(nodes, 'n'), at: [last[0] + 1000, last[1], last[2]], support: false };
}

/** Two nodes that no bar joins yet; null when all are joined. */
function unjoined({ nodes, bars }: FreeRecipe): readonly [string, string] | null {
  for (const a of nodes)
    for (const b of nodes) {
      const joined = bars.some(
        ({ from, to }) => (from === a.id && to === b.id) || (from === b.id && to === a.id),
      );
      if (a.id < b.id && !joined) return [a.id, b.id];
    }
  return null;
}
