import type { JSX } from 'react';
import type { Bay, FreeBar, FreeRecipe, Member, Role, UnitSystem } from '../../../core/project/model.ts';
import { firstMember } from '../../../core/project/newBay.ts';
import { MemberFields } from './MemberFields.tsx';
import { ROLES } from './roles.ts';
import { useRecipeEdit } from './useRecipeEdit.ts';

interface FreeMembersProps {
  readonly bay: Bay;
  readonly recipe: FreeRecipe;
  readonly units: UnitSystem;
}

/** Sizes of the bars that are no diagonals, alike ones together. */
export function FreeMembers({ bay, recipe, units }: FreeMembersProps): JSX.Element | null {
  const edit = useRecipeEdit<FreeRecipe>(bay);
  const give = (bars: readonly FreeBar[], member: Member): string | null =>
    edit(
      { ...recipe, bars: recipe.bars.map((bar) => (bars.includes(bar) ? { ...bar, member } : bar)) },
      `size of ${idsOf(bars)}`,
    );
  const groups = alikeMembers(recipe.bars);
  if (groups.length === 0) return null;
  return (
    <>
      {groups.map(({ role, member, bars }) => {
        const first = firstMember(role);
        const word = `${labelOf(role)} ${idsOf(bars)}`;
        return member ? (
          <MemberFields
            key={bars[0]?.id ?? word}
            word={word}
            member={member}
            units={units}
            checked={role === 'beam' || role === 'strut'}
            onChange={(changed) => give(bars, changed)}
          />
        ) : (
          <div key={word} className="recipe-add">
            <button type="button" className="link-button" onClick={() => first && give(bars, first)}>
              Give {word} a size
            </button>
          </div>
        );
      })}
    </>
  );
}

interface AlikeMembers {
  readonly role: Role;
  readonly member: Member | null;
  readonly bars: readonly FreeBar[];
}

function alikeMembers(bars: readonly FreeBar[]): readonly AlikeMembers[] {
  const groups = new Map<string, { role: Role; member: Member | null; bars: FreeBar[] }>();
  for (const bar of bars) {
    if (firstMember(bar.role) === null) continue;
    const key = JSON.stringify([bar.role, bar.member]);
    const group = groups.get(key);
    if (group) group.bars.push(bar);
    else groups.set(key, { role: bar.role, member: bar.member, bars: [bar] });
  }
  return [...groups.values()];
}

const labelOf = (role: Role): string => ROLES.find(({ value }) => value === role)?.label ?? role;

function idsOf(bars: readonly FreeBar[]): string {
  const ids = bars.map(({ id }) => id);
  return ids.length > 3 ? `${ids[0]} to ${ids.at(-1)}` : ids.join(', ');
}
