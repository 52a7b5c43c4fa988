/** Structural steels by the names that people write. N/mm². From practice-facts H4 and common handbooks. */
import type { Confidence } from '../practice/model.ts';
import type { OwnGrade, PracticeId } from '../project/model.ts';
import type { Steel } from './model.ts';

/** Strength of one range of thicknesses, from where the one before ends. */
interface Band {
  /** mm. */
  readonly limit: number;
  /** Whether the limit itself still belongs to it: "t ≤ 16" or "t < 11". */
  readonly with: boolean;
  readonly fy: number;
  readonly fu: number;
}

interface Grade {
  /** Tells the grade from what is typed, in capitals without spaces, dashes, dots, slashes and brackets. */
  readonly names: RegExp;
  /** Practices that mean this steel by the name, where the name has two meanings. */
  readonly meantBy?: readonly PracticeId[];
  /** From thin to thick; thicker is unknown. */
  readonly bands: readonly Band[];
  readonly source: string;
  readonly confidence: Confidence;
}

const anyThickness = (fy: number, fu: number): readonly Band[] => [
  { limit: Number.POSITIVE_INFINITY, with: true, fy, fu },
];

/** Steps at 16, 40, 63 and 80 mm, each in the thinner range. */
const european = (
  fy16: number,
  fy40: number,
  fy63: number,
  fy80: number,
  fu: number,
): Pick<Grade, 'bands' | 'source' | 'confidence'> => ({
  bands: [
    { limit: 16, with: true, fy: fy16, fu },
    { limit: 40, with: true, fy: fy40, fu },
    { limit: 63, with: true, fy: fy63, fu },
    { limit: 80, with: true, fy: fy80, fu },
  ],
  // EN 1993-1-1:2005 Table 3.1 has f_u 430 and 490 for S275 and S355 up to 40 mm, and steps in f_y at 40 only. Many national annexes send
  // to the product standard, whose figures are never above those of the table: they are taken.
  source: 'EN 10025-2, least of the range; nowhere above EN 1993-1-1:2005 Table 3.1',
  confidence: 'from memory, sure',
});

/** Steps at 11 and 17 mm, each in the thicker range. */
const australian = (
  thin: number,
  middle: number,
  thick: number,
  fu: number,
): Pick<Grade, 'bands' | 'source' | 'confidence'> => ({
  bands: [
    { limit: 11, with: false, fy: thin, fu },
    { limit: 17, with: false, fy: middle, fu },
    { limit: Number.POSITIVE_INFINITY, with: true, fy: thick, fu },
  ],
  source: 'AS/NZS 3679.1',
  confidence: 'from memory, sure',
});

/** Steps at 20 mm, in the thicker range, and 40 mm, in the thinner. The steps are less sure than the first figure. */
const indian = (
  thin: number,
  middle: number,
  thick: number,
  fu: number,
): Pick<Grade, 'bands' | 'source'> => ({
  bands: [
    { limit: 20, with: false, fy: thin, fu },
    { limit: 40, with: true, fy: middle, fu },
    { limit: Number.POSITIVE_INFINITY, with: true, fy: thick, fu },
  ],
  source: 'IS 2062',
});

const SUFFIX = '(JR|J0|J2|K2|N|NL|M|ML|W|G[1-4]|\\+|AR)*';
const EN_STANDARD = '(SANS50025|BSEN10025|EN10025)?(2)?';

const GRADES: readonly Grade[] = [
  { names: new RegExp(`^${EN_STANDARD}S?235${SUFFIX}$`), ...european(235, 225, 215, 215, 360) },
  { names: new RegExp(`^${EN_STANDARD}S?275${SUFFIX}$`), ...european(275, 265, 255, 245, 410) },
  { names: new RegExp(`^${EN_STANDARD}S?355${SUFFIX}$`), ...european(355, 345, 335, 325, 470) },
  {
    names: /^(SANS1431)?300WA?$/,
    meantBy: ['sans10162'],
    bands: anyThickness(300, 450),
    source: 'SANS 1431, as handbooks give it; no steps of thickness',
    confidence: 'from memory, verify',
  },
  {
    names: /^(SANS1431)?300WA$/,
    bands: anyThickness(300, 450),
    source: 'SANS 1431, as handbooks give it; no steps of thickness',
    confidence: 'from memory, verify',
  },
  {
    names: /^(SANS1431)?350WA$/,
    bands: anyThickness(350, 480),
    source: 'SANS 1431, as handbooks give it; no steps of thickness',
    confidence: 'from memory, verify',
  },
  {
    // 450 in older prints.
    names: /^(CSA)?(G4021)?300W$/,
    bands: anyThickness(300, 440),
    source: 'CSA G40.21',
    confidence: 'from memory, sure',
  },
  {
    names: /^(CSA)?(G4021)?350W$/,
    bands: anyThickness(350, 450),
    source: 'CSA G40.21, as a teaching example gives it',
    confidence: 'read in a source',
  },
  {
    names: /^(ASTM)?A36(M|A36M)?$/,
    bands: anyThickness(250, 400),
    source: 'ASTM A36 (36 and 58 ksi)',
    confidence: 'from memory, sure',
  },
  {
    names: /^(ASTM)?A572(M|A572M)?((GRADE|GR)?(50|345))?$/,
    bands: anyThickness(345, 450),
    source: 'ASTM A572, grade 50',
    confidence: 'from memory, sure',
  },
  {
    names: /^(ASTM)?A529(M|A529M)?((GRADE|GR)?(50|345))?$/,
    bands: anyThickness(345, 450),
    source: 'ASTM A529, grade 50',
    confidence: 'from memory, sure',
  },
  {
    names: /^(ASNZS36791)?(GRADE|GR|G)?300(PLUS)?(S0|L0|L15)?$/,
    ...australian(320, 300, 280, 440),
  },
  {
    names: /^(ASNZS36791)?(GRADE|GR|G)?350(PLUS)?(S0|L0|L15)?$/,
    ...australian(360, 340, 330, 480),
  },
  {
    names: /^(IS2062)?E250(FE410W?)?(A|BR|B0|C)?$/,
    ...indian(250, 240, 230, 410),
    confidence: 'from memory, sure',
  },
  {
    names: /^(IS2062)?E350(FE490)?(A|BR|B0|C)?$/,
    ...indian(350, 330, 320, 490),
    confidence: 'from memory, sure',
  },
];

const USUAL: Readonly<Record<PracticeId, readonly string[]>> = {
  sans10162: ['S355JR', '300WA', '350WA'],
  csaS16: ['300W', '350W'],
  aisc360: ['A36', 'A572 Gr 50', 'A529 Gr 50'],
  en1993: ['S235', 'S275', 'S355'],
  as4100: ['300', '350'],
  is800: ['E250', 'E350'],
};

/** Grades that a designer of that practice names most. Every one of them is known to `steelFor`. */
export const usualGrades = (practice: PracticeId): readonly string[] => USUAL[practice];

/**
 * The steel that a grade names; null when it names none, or is thicker than its list goes. The user's own grades come first.
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
  const found = GRADES.find(
    ({ names, meantBy }) => names.test(typed) && (meantBy === undefined || meantBy.includes(practice)),
  );
  const band = found?.bands.find((each) => thickness < each.limit || (each.with && thickness === each.limit));
  if (!found || !band) return null;
  return { grade, fy: band.fy, fu: band.fu, E, G, source: found.source, confidence: found.confidence };
}

const plainName = (typed: string): string => typed.toUpperCase().replaceAll(/[\s_\-–./()]/g, '');
