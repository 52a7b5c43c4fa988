import { steelFor, usualGrades } from '../resistance/grades.ts';
import type { Steel } from '../resistance/model.ts';
import { type Demands, demandsOn } from './demands.ts';
import type { CheckedBar, CheckInput } from './input.ts';
import type { BarChecks, Check } from './model.ts';
import { greaterOf, sectionChecks, silentChecks } from './sectionChecks.ts';

/** From this share of a resistance on, a bar is near it. */
const NEAR = 0.85;

const NO_DEMANDS: Demands = { tension: null, compression: null, slackIn: [] };

/** All that a diagonal and its ends resist, against what acts. */
export function barChecks(input: CheckInput, checked: CheckedBar): BarChecks {
  const { practice, forces } = input;
  const { bar, angle, restraint, turns, bowing } = checked;
  const { stock } = angle;
  const demands = forces ? demandsOn(forces, bar.id) : NO_DEMANDS;
  const blank = { bar: bar.id, steel: null, ...demands, checks: [], governing: null, compressionBy: null };
  const unknown = (why: string): BarChecks => ({ ...blank, status: 'unknown', unknown: why });
  if (!stock) return unknown(`${angle.spec.section} is in no stock list.`);
  if (turns) return unknown(`${bar.mark} turns without resistance, its ends being marked as they are.`);
  if (!restraint) return unknown(`The ends of ${bar.mark} leave no steel between them.`);
  const steel = steelOf(input, angle.spec.grade, stock.outline.thickness);
  if (!steel)
    return unknown(
      `Nothing is known of steel "${angle.spec.grade}". Choose one of ${usualGrades(practice.id).join(', ')}, or give its yield stress and strength in the settings.`,
    );
  const criticalLoad = bowing && bowing.unsupported === null && bowing.real.N > 0 ? bowing.real.N : null;
  const found = sectionChecks(input, { bar, angle, stock, steel, restraint, criticalLoad }, demands);
  const loaded = greaterOf(demands.tension, demands.compression) !== null;
  const silent = silentChecks({ ...demands, ...found }).length > 0;
  return { ...blank, ...found, steel, status: statusOf(found.governing, loaded, silent), unknown: null };
}

/** The steel that a grade names under the project's practice; null when it names none. */
export function steelOf({ practice, project }: CheckInput, grade: string, thickness: number): Steel | null {
  const { E, G } = practice.steel;
  return steelFor(practice.id, grade, thickness, E, G, project.settings.ownGrades ?? []);
}

/** How a bar stands whose most used check is this. */
export function statusOf(governing: Check | null, loaded: boolean, silent: boolean): BarChecks['status'] {
  if (!loaded) return 'no load';
  const utilisation = governing?.utilisation;
  if (utilisation == null) return 'unknown';
  if (utilisation > 1) return 'over';
  return silent ? 'unknown' : utilisation >= NEAR ? 'near' : 'within';
}
