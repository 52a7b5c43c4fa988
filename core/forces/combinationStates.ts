import type { Actions, Combination } from '../project/actions.ts';
import type { CombinationState } from './model.ts';

/** With more cases than this that act either way, they are turned round together only. */
const MOST_TURNED_SINGLY = 3;

/** Every combination with every way of turning round the cases that act either way, so that no direction is forgotten. */
export function combinationStates(actions: Actions): readonly CombinationState[] {
  return actions.combinations.flatMap((combination) => statesOf(combination, actions));
}

function statesOf(combination: Combination, actions: Actions): readonly CombinationState[] {
  const acting = actions.cases.filter(({ id }) => (combination.factors[id] ?? 0) !== 0);
  const either = acting.filter((each) => each.reverses).map(({ id }) => id);
  const named =
    combination.name.trim() ||
    acting.map(({ id }) => `${String(combination.factors[id] ?? 0)} ${id}`).join(' + ');
  return turnings(either).flatMap((turned) =>
    leanings(combination, either, turned).map((leaning): CombinationState => {
      const says = [
        ...(turned.length > 0 ? [`${turned.join(' and ')} turned round`] : []),
        ...(combination.leaning && either.length === 0 ? [`leaning ${leaning > 0 ? 'right' : 'left'}`] : []),
      ];
      const marks = [
        ...turned.map((id) => `-${id}`),
        ...(leaning < 0 && either.length === 0 ? ['-lean'] : []),
      ];
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

/** As given, and turned round in every choice of them. */
function turnings(either: readonly string[]): readonly (readonly string[])[] {
  if (either.length > MOST_TURNED_SINGLY) return [[], either];
  return either.reduce<readonly (readonly string[])[]>(
    (found, id) => found.flatMap((turned) => [turned, [...turned, id]]),
    [[]],
  );
}

/** What leans goes with the first of the cases that turn; alone it leans both ways. */
function leanings(
  combination: Combination,
  either: readonly string[],
  turned: readonly string[],
): readonly CombinationState['leaning'][] {
  if (!combination.leaning) return [0];
  const [first] = either;
  if (first === undefined) return [1, -1];
  return [turned.includes(first) ? -1 : 1];
}
