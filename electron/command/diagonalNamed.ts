import type { Assessment } from '../../core/assessment.ts';
import type { AngleBar, Bar } from '../../core/layout/model.ts';
import type { Attempt } from './trouble.ts';

/** A bar of angle whose section is in stock. */
export interface DiagonalBar extends Bar {
  readonly angle: AngleBar & { readonly stock: NonNullable<AngleBar['stock']> };
}

/** The one diagonal that is meant by a mark ("D1"), by a bay and a mark ("W1/D1"), or by an id ("W1/t1.rise"). */
export function diagonalNamed({ layout }: Assessment, typed: string): Attempt<DiagonalBar> {
  const diagonals = layout.bays.flatMap((bay) => bay.diagonals.flatMap((id) => layout.bars.get(id) ?? []));
  const found = diagonals.filter(
    ({ id, mark, bay }) => typed === id || typed === mark || typed === `${bay}/${mark}`,
  );
  const [bar, another] = found;
  const names = (bars: readonly Bar[]) => bars.map(({ bay, mark }) => `${bay}/${mark}`).join(', ');
  if (!bar)
    return refused(
      `There is no diagonal ${typed}.`,
      diagonals.length > 0 ? `Give --bar as one of ${names(diagonals)}.` : 'The project has none.',
    );
  if (another)
    return refused(`There is more than one diagonal ${typed}.`, `Give --bar as one of ${names(found)}.`);
  const { angle } = bar;
  const stock = angle?.stock;
  if (!angle || !stock)
    return refused(
      `The section of ${typed}, “${angle?.spec.section ?? ''}”, is in no stock list.`,
      "Choose one of the list, or add it to the project's own list.",
    );
  return { ok: true, value: { ...bar, angle: { ...angle, stock } } };
}

const refused = (what: string, todo: string): Attempt<never> => ({
  ok: false,
  trouble: { kind: 'bad value', what, todo },
});
