import type { Load } from '../../../core/project/actions.ts';
import type { Project } from '../../../core/project/model.ts';

export const LOAD_KINDS: readonly { readonly kind: Load['kind']; readonly label: string }[] = [
  { kind: 'gable', label: 'wind on a gable' },
  { kind: 'side', label: 'wind on a wall' },
  { kind: 'bowed', label: 'rafters not straight' },
  { kind: 'node', label: 'force on a node' },
  { kind: 'line', label: 'load along a bar' },
  { kind: 'shortened', label: 'bar drawn tight' },
];

/** Whether the project has anything that such a load could act on. */
export function hasPlaceFor(kind: Load['kind'], { bays }: Project): boolean {
  switch (kind) {
    case 'gable':
    case 'bowed':
      return bays.some(({ recipe }) => recipe.kind === 'roof');
    case 'side':
      return bays.some(({ recipe }) => recipe.kind === 'wall');
    default:
      return bays.length > 0;
  }
}

/** A load to begin with, on the first thing that it could act on; null where there is none. */
export function firstLoad(kind: Load['kind'], id: string, { bays }: Project): Load | null {
  const of = (recipe: string) => bays.find((bay) => bay.recipe.kind === recipe)?.id;
  const [first] = bays;
  if (!first) return null;
  switch (kind) {
    case 'gable': {
      const bay = of('roof');
      return bay === undefined ? null : { kind, id, bay, pressure: 0.5, rafter: 1, ground: 0 };
    }
    case 'bowed': {
      const bay = of('roof');
      return bay === undefined ? null : { kind, id, bay, squeeze: 100, rafters: 2, gives: 1000 };
    }
    case 'side': {
      const bay = of('wall');
      return bay === undefined ? null : { kind, id, bay, pressure: 0.5, width: 6000 };
    }
    case 'node':
      return { kind, id, node: `${first.id}/${firstNode(first.recipe.kind)}`, force: [10, 0, 0] };
    case 'line':
      return { kind, id, bar: `${first.id}/${firstMember(first)}`, perMetre: [0, 0, -1] };
    case 'shortened':
      return { kind, id, bar: `${first.id}/${firstMember(first)}`, by: 2 };
    default:
      return kind satisfies never;
  }
}

const firstNode = (kind: Project['bays'][number]['recipe']['kind']): string =>
  kind === 'roof' ? 'a.L1' : kind === 'wall' ? 'L1' : 'n1';

function firstMember({ recipe }: Project['bays'][number]): string {
  if (recipe.kind === 'wall') return `${recipe.tiers[0]?.id ?? 't1'}.rise`;
  if (recipe.kind === 'roof')
    return `${recipe.slopes[0]?.id ?? 'a'}.${recipe.slopes[0]?.panels[0]?.id ?? 'p1'}.rise`;
  return recipe.kind === 'free' ? (recipe.bars[0]?.id ?? 'b1') : 'k1';
}
