/** Bays to add: with the next free id, standing clear of those that are there. */

import type { Bay, Place, Project, RecipeKind } from '../../core/project/model.ts';
import { newFreeBay, newKneeBay, newRoofBay, newWallBay } from '../../core/project/newBay.ts';

const LETTERS: Readonly<Record<RecipeKind, string>> = { wall: 'W', roof: 'R', knee: 'K', free: 'F' };
const NAMES: Readonly<Record<RecipeKind, string>> = {
  wall: 'wall',
  roof: 'roof',
  knee: 'knees',
  free: 'free',
};
/** mm between one bay's line and the next to begin with. */
const APART = 6000;

export function freshBay(project: Project, kind: RecipeKind): Bay {
  const id = nextBayId(project, LETTERS[kind]);
  const bay = made(kind, id, project);
  return { ...bay, place: { ...bay.place, origin: clearOrigin(project) } };
}

/** A copy under its own id, one line further; null when there is no such bay. */
export function duplicatedBay(project: Project, id: string): Bay | null {
  const bay = project.bays.find((each) => each.id === id);
  if (bay === undefined) return null;
  const letter = /^\p{L}+/u.exec(bay.id)?.[0] ?? LETTERS[bay.recipe.kind];
  return { ...bay, id: nextBayId(project, letter), place: { ...bay.place, origin: clearOrigin(project) } };
}

/** "W3" after W1 and W2. */
function nextBayId(project: Project, letter: string): string {
  const taken = new Set(project.bays.map(({ id }) => id));
  let number = 1;
  while (taken.has(`${letter}${number}`)) number += 1;
  return `${letter}${number}`;
}

function clearOrigin(project: Project): Place['origin'] {
  if (project.bays.length === 0) return [0, 0, 0];
  const furthest = Math.max(...project.bays.map(({ place }) => place.origin[1]));
  return [0, furthest + APART, 0];
}

function made(kind: RecipeKind, id: string, project: Project): Bay {
  const { catalogue } = project.settings;
  switch (kind) {
    case 'wall':
      return newWallBay(id, NAMES.wall, catalogue);
    case 'roof':
      return newRoofBay(id, NAMES.roof, catalogue);
    case 'knee':
      return newKneeBay(id, NAMES.knee, catalogue);
    case 'free':
      return newFreeBay(id, NAMES.free, catalogue);
    default:
      return kind satisfies never;
  }
}
