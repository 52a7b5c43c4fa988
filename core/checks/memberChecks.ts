import { memberPlates } from '../frame/memberPlates.ts';
import type { Bar } from '../layout/model.ts';
import { limitInForce } from '../practice/limit.ts';
import type { Member } from '../project/model.ts';
import { compressionResistances } from '../resistance/compression/compressionResistances.ts';
import type { CompressionQuestion, Condition, Resistance, ResistingSection } from '../resistance/model.ts';
import { statusOf, steelOf } from './barChecks.ts';
import { demandsOn } from './demands.ts';
import type { CheckInput } from './input.ts';
import { memberResisting } from './memberResisting.ts';
import type { MemberChecks, MemberLengths } from './model.ts';
import { resistanceOptions } from './questions.ts';
import { checkOf } from './sectionChecks.ts';

/** Bending below this, N·mm, is arithmetic. */
const NO_BENDING = 1e5;

/** What a strut or beam resists in compression, K = 1 between what holds it, against what squeezes it. */
export function memberChecks(
  input: CheckInput,
  bar: Bar,
  member: Member,
  lengths: MemberLengths,
  grade: string,
): MemberChecks {
  const { forces } = input;
  const demands = forces ? demandsOn(forces, bar.id) : { tension: null, compression: null };
  const plates = memberPlates(member);
  const blank = {
    bar: bar.id,
    member,
    plates,
    lengths,
    grade,
    tension: demands.tension,
    compression: demands.compression,
    moment: greatestMoment(input, bar),
  };
  const unknown = (why: string): MemberChecks => ({
    ...blank,
    steel: null,
    slenderness: null,
    limit: null,
    check: null,
    status: demands.compression === null ? 'no load' : 'unknown',
    unknown: why,
  });
  const section = memberResisting(member);
  if (!section)
    return unknown('A zed is thin and cold-formed: its maker’s tables say what it carries along itself.');
  const steel = steelOf(input, grade, Math.max(plates.flange, plates.web));
  if (!steel) return unknown(`Nothing is known of steel "${grade}".`);
  const unbraced = unbracedOf(section, lengths);
  const { rx, ry } = section.properties;
  const slenderness = Math.max(unbraced.x / rx, unbraced.y / ry);
  const { practice, project } = input;
  const limit = limitInForce(practice, project.settings, 'both');
  const conditions: readonly Condition[] = [
    {
      says: 'its thicknesses are given',
      met: !plates.assumed,
      found: plates.assumed ? `taken as ${platesInWords(member)}` : null,
    },
    {
      says: `L/r not above ${limit.limit}, for a bar in compression`,
      met: slenderness <= limit.limit,
      found: slenderness <= limit.limit ? null : slenderness.toFixed(0),
    },
  ];
  const question: CompressionQuestion = {
    practice: practice.id,
    section,
    steel,
    ends: [],
    options: resistanceOptions(project.settings.resistance ?? {}),
    length: bar.length,
    unbraced,
    twistLength: lengths.outOfPlane,
    criticalLoad: null,
    system: 'planar',
    joinedBetween: false,
    loadedAcross:
      blank.moment > 0 ||
      (project.actions?.cases ?? []).some(({ loads }) =>
        loads.some((load) => load.kind === 'line' && load.bar === bar.id),
      ),
  };
  const check = checkOf(withConditions(byLengths(question), conditions), demands.compression);
  return {
    ...blank,
    steel,
    slenderness,
    limit: limit.limit,
    check,
    status: statusOf(check, demands.compression !== null, false),
    unknown: null,
  };
}

/** About x the depth moves, about y the width. */
function unbracedOf(
  { properties }: ResistingSection,
  { inPlane, outOfPlane, onEdge }: MemberLengths,
): CompressionQuestion['unbraced'] {
  const [x, y] = onEdge ? [inPlane, outOfPlane] : [outOfPlane, inPlane];
  const upright = properties.Ixx >= properties.Iyy;
  return { x, y, u: upright ? x : y, v: upright ? y : x };
}

function byLengths(question: CompressionQuestion): Resistance {
  const found = compressionResistances(question).find(
    ({ kind }) => kind === 'compression, lengths by the practice',
  );
  if (!found) throw new Error(`no rule for compression over lengths in ${question.practice}`);
  return found;
}

function withConditions(resistance: Resistance, conditions: readonly Condition[]): Resistance {
  const all = [...conditions, ...resistance.conditions];
  return { ...resistance, conditions: all, applies: all.every(({ met }) => met) };
}

/** "web 5.1 mm and flange 8.1 mm", "wall 4.6 mm". */
export function platesInWords(member: Member): string {
  const { flange, web } = memberPlates(member);
  const mm = (t: number): string => `${Number(t.toFixed(1))} mm`;
  return member.shape === 'tube' || member.shape === 'zed'
    ? `wall ${mm(web)}`
    : `web ${mm(web)} and flange ${mm(flange)}`;
}

function greatestMoment({ forces }: CheckInput, bar: Bar): number {
  const most = (forces?.states ?? []).reduce(
    (top, { use, moments }) => (use === 'strength' ? Math.max(top, Math.abs(moments.get(bar.id) ?? 0)) : top),
    0,
  );
  return most > NO_BENDING ? most : 0;
}
