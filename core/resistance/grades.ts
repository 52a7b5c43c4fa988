/** Structural steels by the names that people write. N/mm². From practice-facts H4 and common handbooks. */
import type { Confidence } from '../practice/model.ts';
import type { OwnGrade, PracticeId } from '../project/model.ts';
import type { Steel } from './model.ts';

interface Band {
  /** Thickness up to which it holds, mm. */
  readonly upTo: number;
  readonly fy: number;
  readonly fu: number;
}

interface Grade {
  /** Tells the grade from what is typed, in capitals without spaces and dashes. */
  readonly names: RegExp;
  readonly bands: readonly Band[];
  readonly source: string;
  readonly confidence: Confidence;
}

const ANY = Number.POSITIVE_INFINITY;
const en = (names: RegExp, fy: readonly [number, number, number], fu: number): Grade => ({
  names,
  bands: [
    { upTo: 16, fy: fy[0], fu },
    { upTo: 40, fy: fy[1], fu },
    { upTo: 63, fy: fy[2], fu },
  ],
  source: 'EN 10025-2',
  confidence: 'from memory, sure',
});
const plain = (names: RegExp, fy: number, fu: number, source: string, confidence: Confidence): Grade => ({
  names,
  bands: [{ upTo: ANY, fy, fu }],
  source,
  confidence,
});

/** As EN 1993-1-1:2005 has them in Table 3.1, where fu of S355 is 490 and thickness steps at 40. */
const GRADES: readonly Grade[] = [
  en(/^S?235/, [235, 225, 215], 360),
  en(/^S?275/, [275, 265, 255], 410),
  en(/^S?355/, [355, 345, 335], 470),
  plain(/^300WA?$/, 300, 450, 'SANS 1431, handbook', 'from memory, verify'),
  plain(/^350WA$/, 350, 480, 'SANS 1431, handbook', 'from memory, verify'),
  plain(/^G40\.?21?300W$|^CSA300W$/, 300, 440, 'CSA G40.21', 'from memory, sure'),
  plain(/^(G40\.?21)?350W$/, 350, 450, 'CSA G40.21', 'read in a source'),
  plain(/^(ASTM)?A36/, 250, 400, 'ASTM A36', 'from memory, sure'),
  plain(/^(ASTM)?A572(GR(ADE)?)?\.?50/, 345, 450, 'ASTM A572', 'from memory, sure'),
  plain(/^(ASTM)?A572/, 345, 450, 'ASTM A572, grade 50', 'from memory, sure'),
  plain(/^(ASTM)?A529/, 345, 450, 'ASTM A529, grade 50', 'from memory, sure'),
  {
    names: /^(GRADE|GR|G)?300(PLUS)?$/,
    bands: [
      { upTo: 10.999, fy: 320, fu: 440 },
      { upTo: 16.999, fy: 300, fu: 440 },
      { upTo: ANY, fy: 280, fu: 440 },
    ],
    source: 'AS/NZS 3679.1',
    confidence: 'from memory, sure',
  },
  {
    names: /^(GRADE|GR|G)?350$/,
    bands: [
      { upTo: 10.999, fy: 360, fu: 480 },
      { upTo: 16.999, fy: 340, fu: 480 },
      { upTo: ANY, fy: 330, fu: 480 },
    ],
    source: 'AS/NZS 3679.1',
    confidence: 'from memory, sure',
  },
  plain(/^E250/, 250, 410, 'IS 2062', 'from memory, sure'),
  plain(/^E350/, 350, 490, 'IS 2062', 'from memory, sure'),
];

const USUAL: Readonly<Record<PracticeId, readonly string[]>> = {
  sans10162: ['S355JR', '300WA', '350WA'],
  csaS16: ['300W', '350W'],
  aisc360: ['A36', 'A572 Gr 50', 'A529 Gr 50'],
  en1993: ['S235', 'S275', 'S355'],
  as4100: ['300', '350'],
  is800: ['E250', 'E350'],
};

/** Grades that a designer of that practice names most. */
export const usualGrades = (practice: PracticeId): readonly string[] => USUAL[practice];

/**
 * The steel that a grade names; null when it names none. The user's own grades come first.
 *
 * @param thickness mm, of the thickest part
 */
export function steelFor(
  practice: PracticeId,
  grade: string,
  thickness: number,
  E: number,
  G: number,
  own: readonly OwnGrade[] = [],
): Steel | null {
  const typed = plainName(grade);
  const mine = own.find((each) => plainName(each.grade) === typed);
  if (mine)
    return {
      grade,
      fy: mine.fy,
      fu: mine.fu,
      E,
      G,
      source: 'as given in the project',
      confidence: 'read in a source',
    };
  const found = named(practice, typed);
  const band = found?.bands.find(({ upTo }) => thickness <= upTo);
  if (!found || !band) return null;
  const { fy, fu } = practice === 'en1993' ? tableThreeOne(typed, thickness, band) : band;
  return { grade, fy, fu, E, G, source: found.source, confidence: found.confidence };
}

function named(practice: PracticeId, typed: string): Grade | undefined {
  // "300W" is Canadian or South African steel, by the practice.
  if (practice === 'csaS16' && typed === '300W')
    return plain(/^/, 300, 440, 'CSA G40.21', 'from memory, sure');
  return GRADES.find(({ names }) => names.test(typed));
}

/** EN 1993-1-1:2005 Table 3.1 as corrected: S355 490; steps at 40 mm. The safer of it and the product standard is taken. */
function tableThreeOne(typed: string, thickness: number, band: Band): { fy: number; fu: number } {
  const table = /355/.test(typed) ? 490 : /275/.test(typed) ? 430 : 360;
  return { fy: band.fy, fu: thickness <= 40 ? Math.min(table, band.fu) : band.fu };
}

const plainName = (typed: string): string => typed.toUpperCase().replaceAll(/[\s_-]/g, '');
