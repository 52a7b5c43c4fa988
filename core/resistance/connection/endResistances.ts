import type { PracticeId } from '../../project/model.ts';
import { leastDistances } from '../holes.ts';
import type { Resistance, ResistingEnd, TensionQuestion } from '../model.ts';
import { boltsInLine, rowsOf } from '../tension/boltRows.ts';
import { resistance, Working } from '../working.ts';
import { AISC_ENDS } from './aisc.ts';
import { AS_ENDS } from './as.ts';
import { EN_ENDS } from './en.ts';
import { shearPlanes } from './fasteners.ts';
import { IS_ENDS } from './is.ts';
import type { EndPack, EndRule } from './pack.ts';
import { CSA_ENDS, SANS_ENDS } from './sansAndCsa.ts';

const PACKS: Readonly<Record<PracticeId, EndPack>> = {
  sans10162: SANS_ENDS,
  csaS16: CSA_ENDS,
  aisc360: AISC_ENDS,
  en1993: EN_ENDS,
  as4100: AS_ENDS,
  is800: IS_ENDS,
};

/** For distances that were converted from inches or typed in whole millimetres, mm. */
const NEAR_ENOUGH = 0.01;

/**
 * Bolts or welds of one end, as a first check: shear, bearing on the bar, the weld itself, against a pull or a push. N.
 * The gusset, prying and the moment of an eccentric group are not looked at. Least distances are told as conditions: the figure stands without them.
 */
export function endResistances(question: TensionQuestion, end: ResistingEnd): readonly Resistance[] {
  const pack = PACKS[question.practice];
  return end.kind === 'bolted'
    ? [boltShear(pack, question, end), bearing(pack, question, end)]
    : [weld(pack, question, end)];
}

function checked(
  { standard }: EndPack,
  rule: EndRule,
  question: TensionQuestion,
  end: ResistingEnd,
  working: Working,
  said: Pick<Resistance, 'kind' | 'title' | 'note'>,
): Resistance {
  return resistance(
    {
      ...said,
      against: 'either',
      end: end.end,
      resistance: rule.of(question, end, working),
      standard,
      clause: rule.clause,
      confidence: rule.confidence,
    },
    working,
  );
}

const boltShear = (pack: EndPack, question: TensionQuestion, end: ResistingEnd): Resistance =>
  checked(pack, pack.boltShear, question, end, new Working(), {
    kind: 'bolt shear',
    title: shearPlanes(question.section) === 2 ? 'Bolts in double shear' : 'Bolts in single shear',
    note:
      end.bolts < 2
        ? 'One bolt holds this end: two at least are good practice (common practice, no source).'
        : null,
  });

function bearing(pack: EndPack, question: TensionQuestion, end: ResistingEnd): Resistance {
  const working = new Working();
  distances(question, end, working);
  return checked(pack, pack.bearing, question, end, working, {
    kind: 'bolt bearing',
    title: 'Bolts bearing on the bar',
    note: 'The gusset’s own bearing is not looked at.',
  });
}

/** End, edge, pitch and distance of rows against the least of the practice. */
function distances({ practice, section }: TensionQuestion, end: ResistingEnd, working: Working): void {
  const inLine = boltsInLine(end, section);
  const least = leastDistances(practice, end, inLine);
  const source = `${least.clause}${least.confidence === 'from memory, verify' ? '; from memory, verify' : ''}`;
  const limit = (what: string, is: number, atLeast: number): void =>
    working.limits(
      `${what} at least ${atLeast.toFixed(1)} mm (${source})`,
      is >= atLeast - NEAR_ENOUGH,
      `${is.toFixed(1)} mm`,
    );
  limit('end distance', end.endDistance, least.end);
  limit('edge distance', end.edgeDistance, least.edge);
  if (inLine > 1) limit('pitch', end.pitch, least.pitch);
  const [first, second] = rowsOf(end, section);
  if (end.rows === 2 && first && second)
    limit(
      'distance between bolts of the two rows',
      Math.hypot(second.across - first.across, second.start - first.start),
      least.pitch,
    );
}

function weld(pack: EndPack, question: TensionQuestion, end: ResistingEnd): Resistance {
  const working = new Working();
  const { sizes, length, clause } = pack.weld.least;
  const atLeast = Math.max(sizes * end.weldSize, length);
  working.limits(
    `each weld at least ${atLeast.toFixed(0)} mm long (${clause})`,
    end.weldLength >= atLeast - NEAR_ENOUGH,
    `${end.weldLength.toFixed(0)} mm`,
  );
  working.limits(
    'weld no larger than the leg is thick (common practice, no source)',
    end.weldSize <= question.section.thickness + NEAR_ENOUGH,
    `${end.weldSize.toFixed(1)} mm on ${question.section.thickness.toFixed(1)} mm`,
  );
  return checked(pack, pack.weld, question, end, working, {
    kind: 'weld',
    title: 'Fillet welds along the leg',
    note: null,
  });
}
