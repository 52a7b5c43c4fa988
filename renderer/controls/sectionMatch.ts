import type { SectionChoice } from '../assessing/assessApi.ts';

/** Enough to fill the list; who wants more types on. */
const MOST = 60;

/** The angles that what was typed could mean: those that begin so first, then those that hold it. All of them for nothing typed. */
export function matchingSections(choices: readonly SectionChoice[], typed: string): readonly SectionChoice[] {
  const wanted = plain(typed);
  if (wanted === '') return choices;
  const begin = choices.filter(({ designation }) => plain(designation).startsWith(wanted));
  const hold = choices.filter(({ designation }) => {
    const text = plain(designation);
    return !text.startsWith(wanted) && text.includes(wanted);
  });
  return [...begin, ...hold].slice(0, MOST);
}

/** The one angle that was meant: the one whose name was typed in full, or the only one that fits. */
export function onlySection(fitting: readonly SectionChoice[], typed: string): SectionChoice | undefined {
  const wanted = plain(typed);
  const whole = fitting.find(({ designation }) => plain(designation) === wanted);
  return whole ?? (fitting.length === 1 ? fitting[0] : undefined);
}

/** "L 70 × 70 × 6" → "70x70x6": as people type, without what does not tell angles apart. */
function plain(text: string): string {
  return text.toLowerCase().replace(/[×*]/g, 'x').replace(/\s+/g, '').replace(/^l/, '');
}
