import { compressionResistances } from '../resistance/compression/compressionResistances.ts';
import { governingCompression } from '../resistance/compression/governingCompression.ts';
import { steelFor, usualGrades } from '../resistance/grades.ts';
import type { Resistance } from '../resistance/model.ts';
import { tensionResistances } from '../resistance/tension/tensionResistances.ts';
import { demandsOn } from './demands.ts';
import type { CheckedBar, CheckInput } from './input.ts';
import type { BarChecks, Check, Demand } from './model.ts';
import { compressionQuestion, tensionQuestion } from './questions.ts';

/** From this share of a resistance on, a bar is near it. */
const NEAR = 0.85;

/** All that a diagonal and its ends resist, against what acts. */
export function barChecks(input: CheckInput, checked: CheckedBar): BarChecks {
  const { project, practice, forces } = input;
  const { bar, angle, restraint } = checked;
  const demands = forces ? demandsOn(forces, bar.id) : { tension: null, compression: null, slackIn: [] };
  const blank = { bar: bar.id, steel: null, ...demands, checks: [], governing: null, compressionBy: null };
  const unknown = (why: string): BarChecks => ({ ...blank, status: 'unknown', unknown: why });
  if (!angle.stock) return unknown(`${angle.spec.section} is in no stock list.`);
  if (!restraint) return unknown(`The ends of ${bar.mark} leave no steel between them.`);
  const steel = steelFor(
    practice.id,
    angle.spec.grade,
    angle.stock.outline.thickness,
    practice.steel.E,
    practice.steel.G,
    project.settings.ownGrades ?? [],
  );
  if (!steel)
    return unknown(
      `Nothing is known of steel "${angle.spec.grade}". Choose one of ${usualGrades(practice.id).join(', ')}, or give its yield stress and strength in the settings.`,
    );
  const question = tensionQuestion(input, checked, angle.stock, steel);
  const pulled = tensionResistances(question).map((each) => checkOf(each, demands.tension));
  const squeezes = angle.spec.countedOn === 'both' || demands.compression !== null;
  const inCompression = squeezes
    ? compressionResistances(compressionQuestion(question, checked, restraint))
    : [];
  const compressionBy = squeezes ? governingCompression(inCompression) : null;
  const squeezed = inCompression.map((each) =>
    checkOf(each, each.kind === compressionBy?.kind ? demands.compression : null),
  );
  // Bolts and welds know no sign.
  const greater = greaterOf(demands.tension, demands.compression);
  const checks = [
    ...pulled.map((each) =>
      each.resistance.against === 'either' ? checkOf(each.resistance, greater) : each,
    ),
    ...squeezed,
  ];
  const governing = governingOf(checks);
  return {
    ...blank,
    steel,
    checks,
    governing,
    compressionBy,
    status: statusOf(governing, forces !== null && greater !== null),
    unknown: null,
  };
}

function checkOf(resistance: Resistance, demand: Demand | null): Check {
  const { resistance: most } = resistance;
  return {
    resistance,
    demand,
    utilisation: demand !== null && most !== null && most > 0 ? demand.force / most : null,
  };
}

function greaterOf(a: Demand | null, b: Demand | null): Demand | null {
  if (!a || !b) return a ?? b;
  return b.force > a.force ? b : a;
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

function statusOf(governing: Check | null, loaded: boolean): BarChecks['status'] {
  if (!loaded) return 'no load';
  const utilisation = governing?.utilisation;
  if (utilisation == null) return 'unknown';
  return utilisation > 1 ? 'over' : utilisation >= NEAR ? 'near' : 'within';
}
