import { compressionResistances } from '../resistance/compression/compressionResistances.ts';
import { governingCompression } from '../resistance/compression/governingCompression.ts';
import type { Resistance, TensionQuestion } from '../resistance/model.ts';
import { tensionResistances } from '../resistance/tension/tensionResistances.ts';
import type { Demands } from './demands.ts';
import type { CheckInput } from './input.ts';
import type { BarChecks, Check, Demand } from './model.ts';
import type { PlacedSection } from './placedSection.ts';
import { compressionQuestion, tensionQuestion } from './questions.ts';

/** Every check of a section in its place, and the one that is used most. */
export function sectionChecks(
  input: CheckInput,
  placed: PlacedSection,
  demands: Pick<Demands, 'tension' | 'compression'>,
): Pick<BarChecks, 'checks' | 'governing' | 'compressionBy'> {
  const question = tensionQuestion(input, placed);
  const squeezes = placed.angle.spec.countedOn === 'both' || demands.compression !== null;
  const inCompression = squeezes ? compressionResistances(compressionQuestion(question, placed, input)) : [];
  const compressionBy = squeezes ? governingCompression(inCompression) : null;
  // Bolts and welds know no sign.
  const greater = greaterOf(demands.tension, demands.compression);
  const checks = [
    ...inTension(input, placed, question).map((each) =>
      checkOf(each, each.against === 'either' ? greater : demands.tension),
    ),
    ...inCompression.map((each) =>
      checkOf(each, each.kind === compressionBy?.kind ? demands.compression : null),
    ),
  ];
  return { checks, governing: governingOf(checks), compressionBy };
}

/** Alike bars share one list: it is the same, and found once. */
function inTension(
  { tensions }: CheckInput,
  { angle, steel }: PlacedSection,
  question: TensionQuestion,
): readonly Resistance[] {
  if (!tensions) return tensionResistances(question);
  const { spec, placement, ends } = angle;
  const key = JSON.stringify([
    question.section.designation,
    spec.legInPlane,
    spec.gusset,
    placement.gauge,
    steel.grade,
    ends,
  ]);
  const known = tensions.get(key);
  if (known) return known;
  const found = tensionResistances(question);
  tensions.set(key, found);
  return found;
}

/** Nothing resists, or next to nothing. */
export const MOST_USED = 999;

const usedOf = (force: number, resistance: number): number =>
  resistance > 0 ? Math.min(MOST_USED, force / resistance) : MOST_USED;

/** A resistance with what acts against it. */
export function checkOf(resistance: Resistance, demand: Demand | null): Check {
  const { resistance: most } = resistance;
  return {
    resistance,
    demand,
    utilisation: demand !== null && most !== null ? usedOf(demand.force, most) : null,
  };
}

export function greaterOf(a: Demand | null, b: Demand | null): Demand | null {
  if (!a || !b) return a ?? b;
  return b.force > a.force ? b : a;
}

/** Checks that what acts calls for and that give no figure: what they are to show is not shown. */
export function silentChecks({
  checks,
  tension,
  compression,
  compressionBy,
}: Pick<BarChecks, 'checks' | 'tension' | 'compression' | 'compressionBy'>): readonly Check[] {
  const noFigure = compression !== null && (compressionBy?.resistance ?? null) === null;
  return checks.filter(({ resistance: { against, resistance } }) => {
    if (resistance !== null) return false;
    switch (against) {
      case 'tension':
        return tension !== null;
      case 'compression':
        return noFigure;
      case 'either':
        return tension !== null || compression !== null;
      default:
        return against satisfies never;
    }
  });
}

/** The most used; of what nothing acts on, the weakest in tension. */
function governingOf(checks: readonly Check[]): Check | null {
  const used = checks.filter(({ utilisation }) => utilisation !== null);
  if (used.length > 0)
    return used.reduce((most, each) => ((each.utilisation ?? 0) > (most.utilisation ?? 0) ? each : most));
  const known = checks.filter(
    ({ resistance }) => resistance.resistance !== null && resistance.against !== 'compression',
  );
  return known.reduce<Check | null>(
    (least, each) =>
      least === null || (each.resistance.resistance ?? 0) < (least.resistance.resistance ?? 0) ? each : least,
    null,
  );
}
