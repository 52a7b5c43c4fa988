import { MM_PER_INCH } from '../units/unitSystem.ts';

/** What a designation says of an angle, mm. The thickness is the nominal one. */
export interface DesignatedSizes {
  readonly longLeg: number;
  readonly shortLeg: number;
  readonly thickness: number;
  /** Whether it was written in inches. */
  readonly inches: boolean;
}

/** Legs up to this number can only be inches: no metric list goes so small, and no US one above. */
const LARGEST_IN_INCHES = 12;

/** The same text for designations that differ only in case, spaces and the sign between the sizes. */
export function designationKey(text: string): string {
  return text.toUpperCase().replace(/[×*]/g, 'X').replace(/[−–—]/g, '-').replace(/\s+/g, '');
}

/**
 * Sizes from a designation as people type it: "70x70x6", "L70×70×6", "RSA 70 X 70 X 6", "EQ 70x70x6", "70x6" (equal legs), "70 70 6", "70,70,6", "L70-70-6", "70/70/6",
 * "90*90*8EA", "L3x3x1/4", "3 x 3 x 0.25", "6 x 3 1/2 x 5/16", "L3½x3x¼", "L31/2X3X1/4". Legs in either order. Null when it does not read as an
 * angle.
 */
export function designatedSizes(text: string): DesignatedSizes | null {
  const [first, second, third, ...more] = numbersIn(text) ?? [];
  if (first === undefined || second === undefined || more.length > 0) return null;
  const [legs, thickness] = third === undefined ? [[first, first], second] : [[first, second], third];
  const longLeg = Math.max(...legs);
  const shortLeg = Math.min(...legs);
  if (!(thickness > 0 && thickness < shortLeg)) return null;
  const { inches, mm } = scaleOf(longLeg);
  return { longLeg: longLeg * mm, shortLeg: shortLeg * mm, thickness: thickness * mm, inches };
}

/** The legs alone, mm, of a designation that stops before the thickness ("70x70", "L3x3x"); null when there are none. */
export function designatedLegs(text: string): Omit<DesignatedSizes, 'thickness'> | null {
  const [first, second = first] = numbersIn(text.replace(/[xX×*\s]+$/, '')) ?? [];
  if (first === undefined || second === undefined) return null;
  const longLeg = Math.max(first, second);
  const { inches, mm } = scaleOf(longLeg);
  return { longLeg: longLeg * mm, shortLeg: Math.min(first, second) * mm, inches };
}

function scaleOf(longLeg: number): { readonly inches: boolean; readonly mm: number } {
  const inches = longLeg <= LARGEST_IN_INCHES;
  return { inches, mm: inches ? MM_PER_INCH : 1 };
}

/** The numbers between the multiplication signs, in order, without the letters before and after; null when some part is no number above zero. */
function numbersIn(text: string): readonly number[] | null {
  const body = withPlainFractions(text)
    .toUpperCase()
    .replace(/[×*]/g, 'X')
    .replace(/[−–—]/g, '-')
    .replace(/MM|IN\b|["″”]/g, ' ')
    .trim()
    .replace(/^(?:RSA|ISA|ANGLE|EQ(?:UAL)?|UNEQ(?:UAL)?|EA|UA|LL?|∟|∠)[\s:]*/, '')
    .replace(/\s*(?:EA|UA|L)$/, '')
    .trim();
  const sizes = partsOf(body).map(sizeOf);
  const numbers = sizes.filter((size): size is number => size !== null && size > 0);
  return numbers.length === sizes.length ? numbers : null;
}

/** Between multiplication signs; of three sizes without any, between spaces, commas or semicolons, and of three metric ones between dashes or strokes. */
function partsOf(body: string): readonly string[] {
  if (!body.includes('X')) {
    const listed = body.split(/\s*[,;]\s*|\s+/);
    if (listed.length === 3) return listed;
    const dashed = /^(\d{2,3})([-/])(\d{2,3})\2(\d+(?:\.\d+)?)$/.exec(body);
    if (dashed && Number(dashed[1]) > LARGEST_IN_INCHES)
      return [dashed[1] ?? '', dashed[3] ?? '', dashed[4] ?? ''];
  }
  return body.split(/\s*X\s*/);
}

/** "3½" as "3 1/2". */
function withPlainFractions(text: string): string {
  return text.replace(/[¼½¾⅐-⅞]/g, (sign) => ` ${sign.normalize('NFKC').replace('⁄', '/')}`);
}

/** "6", "4.5", "4,5", "1/4", "3-1/2", "3 1/2", "31/2". */
function sizeOf(text: string): number | null {
  const fraction = closedUp(text) ?? /^(?:(\d+)[\s-]+)?(\d+)\s*\/\s*(\d+)$/.exec(text);
  if (fraction) {
    const value = Number(fraction[1] ?? 0) + Number(fraction[2]) / Number(fraction[3]);
    return Number.isFinite(value) ? value : null;
  }
  return /^(?:\d+(?:[.,]\d*)?|[.,]\d+)$/.test(text) ? Number(text.replace(',', '.')) : null;
}

/**
 * The whole, top and bottom of a number whose space was lost, "31/2" for 3 1/2 and "511/16" for 5 11/16: no size is written with more in the
 * top than in the bottom. Of several ways to part it the one with the least whole. Null where it is no such number.
 */
function closedUp(text: string): readonly [string, string, string, string] | null {
  const [, digits = '', bottom = ''] = /^(\d+)\/(\d+)$/.exec(text) ?? [];
  if (Number(digits) < Number(bottom)) return null;
  for (let cut = 1; cut < digits.length; cut++) {
    const top = digits.slice(cut);
    if (Number(top) > 0 && Number(top) < Number(bottom)) return [text, digits.slice(0, cut), top, bottom];
  }
  return null;
}
