import type { Actions, Combination } from '../project/actions.ts';
import type { CombinationState } from './model.ts';

/** With more cases than this that act either way, not every choice of them is turned round. */
export const MOST_IN_EVERY_CHOICE = 5;

/** Every combination with every way of turning round the cases that act either way, so that no direction is forgotten. */
export function combinationStates(actions: Actions): readonly CombinationState[] {
  return actions.combinations.flatMap((combination) => statesOf(combination, actions));
}

/** Combinations of which not every choice of turnings is looked at. */
export function turnedInPart(actions: Actions): readonly Combination[] {
  return actions.combinations.filter(
    (combination) =>
      actingIn(combination, actions).filter(({ reverses }) => reverses).length > MOST_IN_EVERY_CHOICE,
  );
}

const actingIn = ({ factors }: Combination, { cases }: Actions): Actions['cases'] =>
  cases.filter(({ id }) => (factors[id] ?? 0) !== 0);

function statesOf(combination: Combination, actions: Actions): readonly CombinationState[] {
  const acting = actingIn(combination, actions);
  const either = acting.filter((each) => each.reverses).map(({ id }) => id);
  const named =
    combination.name.trim() ||
    acting.map(({ id }) => `${String(combination.factors[id] ?? 0)} ${id}`).join(' + ');
  return turnings(either).flatMap((turned) =>
    leanings(combination).map((leaning): CombinationState => {
      const says = [
        ...(turned.length > 0 ? [`${turned.join(' and ')} turned round`] : []),
        ...(leaning === 0 ? [] : [leaning > 0 ? 'leaning on' : 'leaning back']),
      ];
      const marks = [...turned.map((id) => `-${id}`), ...(leaning < 0 ? ['-lean'] : [])];
      return {
        id: [combination.id, ...marks].join(' '),
        combination: combination.id,
        name: [named, ...says].join(', '),
        use: combination.use,
        factors: Object.fromEntries(
          acting.map(({ id }) => [id, (combination.factors[id] ?? 0) * (turned.includes(id) ? -1 : 1)]),
        ),
        leaning,
        turned,
      };
    }),
  );
}

/** As given, and turned round in every choice of them; of many, all together, each by itself, and all but each. */
function turnings(either: readonly string[]): readonly (readonly string[])[] {
  if (either.length > MOST_IN_EVERY_CHOICE)
    return [
      [],
      either,
      ...either.map((id) => [id]),
      ...either.map((id) => either.filter((other) => other !== id)),
    ];
  return either.reduce<readonly (readonly string[])[]>(
    (found, id) => found.flatMap((turned) => [turned, [...turned, id]]),
    [[]],
  );
}

/** What is out of plumb may lean with any load and against it: towards greater X or Y, and back. */
const leanings = ({ leaning }: Combination): readonly CombinationState['leaning'][] =>
  leaning ? [1, -1] : [0];
